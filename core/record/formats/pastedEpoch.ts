/** Dates in a paste, and which of them is the epoch. A date that reads two ways is asked about, never guessed. */

import { dateFromMidnight, julianDateOfMidnight } from '../../bodies/calendar';

export type EpochFound =
  | {
      readonly ok: true;
      /** ISO 8601, or null where there is no date. */
      readonly epoch: string | null;
      /** The text with dates and clock times taken out. */
      readonly rest: string;
    }
  | { readonly ok: false; readonly message: string };

const zones = 'UTC|UT1|UT|GMT|TAI|TDB|TDT|TT|GPS|CES?T|EES?T|WES?T|BST|IST|JST|MSK|[ECMP][SD]T';
const time = '\\d{1,2}:\\d{2}(?::\\d{2}(?:[.,]\\d+)?)?';
const zone = `\\s?(Z(?![A-Za-z])|[+-]\\d{2}:?\\d{2}|\\(?(?:${zones})(?![A-Za-z])\\)?)`;
const clock = `(?:(?:T|,?\\s+(?:at\\s+)?)(${time})(?:${zone})?)?`;
const month = '(Jan|Feb|Mar|Apr|May|Jun|Jul|Aug|Sep|Oct|Nov|Dec)[a-z]*\\.?';
/** Each with the order of its parts: year, month, day, number of the day in the year; `?` where day and month cannot be told apart. */
const shapes: readonly (readonly [RegExp, string])[] = [
  [new RegExp(`\\b(\\d{4})[-/](\\d{2})[-/](\\d{2})${clock}`, 'gi'), 'ymd'],
  [new RegExp(`\\b(\\d{4})-(\\d{3})(?=T\\d)()${clock}`, 'gi'), 'yn'],
  [new RegExp(`\\b(\\d{1,2})(?:st|nd|rd|th)?[ -]${month}[ ,-] ?(\\d{4})${clock}`, 'gi'), 'dmy'],
  [new RegExp(`\\b${month} (\\d{1,2})(?:st|nd|rd|th)?,? (\\d{4})${clock}`, 'gi'), 'mdy'],
  [new RegExp(`\\b(\\d{1,2})\\.(\\d{1,2})\\.(\\d{4})\\b${clock}`, 'gi'), 'dmy'],
  [new RegExp(`\\b(\\d{1,2})[/-](\\d{1,2})[/-](\\d{4})\\b${clock}`, 'gi'), '??y'],
];

interface DateFound {
  readonly text: string;
  readonly at: number;
  readonly iso: string;
  readonly problem: string | null;
}

/** The only date, or the one called epoch. */
export function epochIn(text: string): EpochFound {
  let rest = text;
  const dates: DateFound[] = [];
  for (const [pattern, order] of shapes) {
    rest = rest.replace(pattern, (...found) => {
      const [whole, first, second, third, time, zone, at] = found as [
        string,
        string,
        string,
        string,
        string,
        string,
        number,
      ];
      dates.push({ text: whole, at, ...dateOf({ parts: [first, second, third], order, time, zone }) });
      return ';'.padEnd(whole.length);
    });
  }
  const named = dates.filter(({ at }) => /epoch[^\d;]{0,24}$/i.test(text.slice(0, at)));
  const meant = named.length > 0 ? named : dates;
  const [only, ...others] = meant.filter(({ iso }, index) => meant.findIndex((date) => date.iso === iso) === index);
  if (others.length > 0) {
    const both = meant.map((date) => `“${date.text.trim()}”`).join(' and ');
    return { ok: false, message: `There are several dates here, ${both}; leave the one of the epoch.` };
  }
  if (only?.problem) return { ok: false, message: only.problem };
  return { ok: true, epoch: only?.iso ?? null, rest: rest.replace(/\b\d{1,2}:\d{2}(?::\d{2}(?:\.\d+)?)?\b/g, ' ; ') };
}

interface DateParts {
  readonly parts: readonly [string, string, string];
  readonly order: string;
  readonly time: string | undefined;
  readonly zone: string | undefined;
}

function dateOf({ parts, order, time, zone }: DateParts): Pick<DateFound, 'iso' | 'problem'> {
  const known = order === '??y' ? orderOfDay(parts) : order;
  const part = (name: string) => parts[known.indexOf(name)] ?? '';
  const written = (day: string, monthText: string) => `${part('y')}-${two(monthNumber(monthText))}-${two(day)}`;
  if (known === '??y') {
    const [first, second] = parts;
    const readings = `${written(first, second)} or ${written(second, first)}`;
    return { iso: parts.join('/'), problem: `The date ${parts.join('/')} can be read as ${readings}. Write it so.` };
  }
  const date = known === 'yn' ? dateOfDay(Number(part('y')), Number(part('n'))) : written(part('d'), part('m'));
  const name = zone?.replace(/[()]/g, '') ?? '';
  const isUtc = /^(?:|Z|UTC?|UT1|GMT|[+-].*)$/i.test(name);
  const offset = /^[Z+-]/i.test(name) ? name.toUpperCase() : isUtc && name !== '' ? 'Z' : '';
  return {
    iso: date + (time === undefined ? '' : `T${time.replace(/^\d:/, '0$&')}${offset}`),
    problem: isUtc ? null : `The epoch is given in ${name}; it is read in UTC here. Turn it into UTC first.`,
  };
}

function dateOfDay(year: number, dayOfYear: number): string {
  const date = dateFromMidnight(julianDateOfMidnight({ year, month: 1, day: 1 }) + dayOfYear - 1);
  return `${date.year}-${two(String(date.month))}-${two(String(date.day))}`;
}

/** A part above 12 is a day. */
function orderOfDay([first, second]: readonly [string, string, string]): string {
  if (Number(first) > 12) return 'dmy';
  if (Number(second) > 12) return 'mdy';
  return first === second ? 'dmy' : '??y';
}

const two = (text: string): string => text.padStart(2, '0');

function monthNumber(text: string): string {
  const index = 'janfebmaraprmayjunjulaugsepoctnovdec'.indexOf(text.slice(0, 3).toLowerCase());
  return /\d/.test(text) ? text : String(index / 3 + 1);
}
