import { secondsPerDay } from '../numerics/angles';
import { dateFromMidnight, daysInMonth, julianDateOfMidnight } from './calendar';

/** The span over which the series for Sun, sidereal time, precession and ΔT are checked: 1950 to 2100. */
export const seriesSpan = {
  firstJd: julianDateOfMidnight({ year: 1950, month: 1, day: 1 }),
  lastJd: julianDateOfMidnight({ year: 2101, month: 1, day: 1 }),
} as const;

export type JulianDateResult =
  | { readonly ok: true; readonly jd: number }
  | { readonly ok: false; readonly message: string };

const expected = 'write a UTC date and time such as 2027-03-21T10:30:00Z';

const isoPattern =
  /^(\d{4})-(\d{2})-(\d{2})(?:[T ](\d{2}):(\d{2})(?::(\d{2})(?:[.,](\d+))?)?\s*(Z|[+-]\d{2}(?::?\d{2})?)?)?$/;

/**
 * Julian date, UTC, from ISO 8601: a date (then 0 h UTC), or a date and time with an optional
 * fraction of a second and an optional `Z` or numeric offset; without either it is UTC.
 *
 * A leap second (:60 in the last minute of an hour) is accepted and becomes the first second of
 * the next day, since a Julian date has no room for it. Resolution of the number: 0.04 ms.
 */
export function julianDateFromIso(text: string): JulianDateResult {
  const clean = text.trim().replaceAll('\u2212', '-').toUpperCase();
  if (clean === '') return refuse(`The epoch is empty: ${expected}.`);
  const match = isoPattern.exec(clean);
  if (!match) return refuse(`This is not a date that can be read: ${expected}.`);
  const part = (index: number) => Number(match[index] ?? 0);
  const date = { year: part(1), month: part(2), day: part(3) };
  const time = { hour: part(4), minute: part(5), second: part(6) };
  const problem = dateProblem(date) ?? timeProblem(time);
  if (problem) return refuse(`${problem}: ${expected}.`);
  const offset = offsetMinutes(match[8]);
  if (offset === null) return refuse(`The offset from UTC must lie between -23:59 and +23:59: ${expected}.`);
  const fraction = match[7] === undefined ? 0 : Number(`0.${match[7]}`);
  const seconds = time.hour * 3600 + (time.minute - offset) * 60 + time.second + fraction;
  return { ok: true, jd: julianDateOfMidnight(date) + seconds / secondsPerDay };
}

/** ISO 8601 in UTC, rounded to the second: `2027-03-21T10:30:00Z`. Needs a finite Julian date. */
export function isoFromJulianDate(jdUtc: number): string {
  if (!Number.isFinite(jdUtc)) throw new Error(`isoFromJulianDate: expected a finite Julian date, got ${jdUtc}`);
  // Whole days and the rest are taken apart before rounding, so that 23:59:59.6 becomes the next day.
  const midnight = Math.floor(jdUtc + 0.5) - 0.5;
  const second = Math.round((jdUtc - midnight) * secondsPerDay);
  const carried = second >= secondsPerDay ? 1 : 0;
  const { year, month, day } = dateFromMidnight(midnight + carried);
  const rest = second - carried * secondsPerDay;
  const clock = [Math.floor(rest / 3600), Math.floor(rest / 60) % 60, rest % 60].map((value) => pad(value, 2));
  return `${pad(year, 4)}-${pad(month, 2)}-${pad(day, 2)}T${clock.join(':')}Z`;
}

function refuse(message: string): JulianDateResult {
  return { ok: false, message };
}

function dateProblem({ year, month, day }: { year: number; month: number; day: number }): string | null {
  if (month < 1 || month > 12) return `There is no month ${month}`;
  const last = daysInMonth(year, month);
  if (day < 1 || day > last)
    return `There is no day ${day} in ${pad(year, 4)}-${pad(month, 2)}, which has ${last} days`;
  return null;
}

function timeProblem({ hour, minute, second }: { hour: number; minute: number; second: number }): string | null {
  if (hour > 23) return `Hours go from 00 to 23, not ${hour}`;
  if (minute > 59) return `Minutes go from 00 to 59, not ${minute}`;
  if (second > 59 && !(second === 60 && minute === 59)) return `Seconds go from 00 to 59, not ${second}`;
  return null;
}

/** Minutes east of UTC, or null where it is out of range. */
function offsetMinutes(text: string | undefined): number | null {
  if (text === undefined || text === 'Z') return 0;
  const digits = text.slice(1).replace(':', '');
  const hours = Number(digits.slice(0, 2));
  const minutes = Number(digits.slice(2) || '0');
  if (hours > 23 || minutes > 59) return null;
  return (text.startsWith('-') ? -1 : 1) * (hours * 60 + minutes);
}

function pad(value: number, width: number): string {
  return String(value).padStart(width, '0');
}
