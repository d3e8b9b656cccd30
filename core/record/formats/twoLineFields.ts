import { lineLength } from './twoLineColumns';

/** Reads the columns of one line and gathers what is wrong, in plain words with line and columns. */

export interface TwoLineError {
  readonly line?: 1 | 2;
  readonly message: string;
}

/** One field: its columns counted from 1, both ends included, and what it should look like. */
export interface FieldLayout {
  readonly name: string;
  readonly from: number;
  readonly to: number;
  readonly pattern: RegExp;
  readonly expected: string;
  /** Bounds of the value, both included. */
  readonly least?: number;
  readonly greatest?: number;
}

const decimal = /^\d+\.\d*$/;
const withSign = /^[+-]?\d*\.\d+$/;
const shortExponent = /^([+-]?\d{5}[+ -]\d|)$/;
const countOrBlank = /^\d*$/;
const implied = 'five digits and a power of ten, such as 10270-3';

export const line1Fields = {
  year: { name: 'epoch year', from: 19, to: 20, pattern: /^\d{2}$/, expected: 'two digits, such as 27' },
  day: { name: 'epoch day', from: 21, to: 32, pattern: decimal, expected: 'a day of the year, such as 080.43750000' },
  slope: { name: 'change of mean motion', from: 34, to: 43, pattern: withSign, expected: 'a number such as .00016717' },
  curve: { name: 'second change of mean motion', from: 45, to: 52, pattern: shortExponent, expected: implied },
  drag: { name: 'drag term', from: 54, to: 61, pattern: shortExponent, expected: implied },
  type: { name: 'ephemeris type', from: 63, to: 63, pattern: countOrBlank, expected: 'a digit' },
  count: { name: 'element set number', from: 65, to: 68, pattern: countOrBlank, expected: 'digits' },
} as const satisfies Record<string, FieldLayout>;

const turn = {
  pattern: decimal,
  least: 0,
  greatest: 360,
  expected: 'degrees from 0 to 360, such as 208.9163',
} as const;

export const line2Fields = {
  inclination: {
    name: 'inclination',
    from: 9,
    to: 16,
    pattern: decimal,
    least: 0,
    greatest: 180,
    expected: 'degrees from 0 to 180, such as 51.6400',
  },
  node: { name: 'right ascension of the node', from: 18, to: 25, ...turn },
  eccentricity: {
    name: 'eccentricity',
    from: 27,
    to: 33,
    pattern: /^\d{7}$/,
    expected: 'seven digits without a point, such as 0006703 for 0.0006703',
  },
  perigee: { name: 'argument of perigee', from: 35, to: 42, ...turn },
  anomaly: { name: 'mean anomaly', from: 44, to: 51, ...turn },
  motion: {
    name: 'mean motion',
    from: 53,
    to: 63,
    pattern: decimal,
    least: 1e-8,
    greatest: 99,
    expected: 'revolutions a day above 0, such as 15.49560830',
  },
  revolution: { name: 'revolution number', from: 64, to: 68, pattern: countOrBlank, expected: 'digits' },
} as const satisfies Record<string, FieldLayout>;

/** Trimmed text of each field; errors name line and columns. */
export function fieldTexts<Names extends string>(
  line: string,
  number: 1 | 2,
  layouts: Readonly<Record<Names, FieldLayout>>,
): { readonly texts: Readonly<Record<Names, string>>; readonly errors: readonly TwoLineError[] } {
  const entries = Object.entries<FieldLayout>(layouts).map(([key, layout]) => {
    const text = line.slice(layout.from - 1, layout.to).trim();
    return { key, text, error: fieldError(text, number, layout) };
  });
  return {
    texts: Object.fromEntries(entries.map(({ key, text }) => [key, text])) as Record<Names, string>,
    errors: entries.flatMap(({ error }) => (error ? [error] : [])),
  };
}

function fieldError(text: string, line: 1 | 2, layout: FieldLayout): TwoLineError | null {
  const value = Number(text);
  const inside = !(value < (layout.least ?? Number.NEGATIVE_INFINITY)) && !(value > (layout.greatest ?? Infinity));
  if (layout.pattern.test(text) && inside) return null;
  const columns = layout.from === layout.to ? `column ${layout.from}` : `columns ${layout.from} to ${layout.to}`;
  return {
    line,
    message: `Line ${line}, ${columns}: the ${layout.name} reads “${text}”; expected ${layout.expected}.`,
  };
}

/**
 * Catalogue number from columns 3 to 7, or null. In the alpha-5 scheme the first digit is a letter,
 * A for 10 to Z for 33, without I and O, which look like digits.
 */
export function catalogNumberOf(line: string): number | null {
  const text = line.slice(2, 7).trim();
  if (/^\d{1,5}$/.test(text)) return Number(text);
  if (!/^[A-HJ-NP-Z]\d{4}$/.test(text)) return null;
  return (10 + 'ABCDEFGHJKLMNPQRSTUVWXYZ'.indexOf(text.charAt(0))) * 10_000 + Number(text.slice(1));
}

/** A number with an implied leading point and a power of ten: ` 10270-3` is 0.10270e-3. Blank is 0. */
export function impliedPointValue(text: string): number {
  const match = /^([+-]?)(\d{5})([+ -])(\d)$/.exec(text);
  if (!match) return 0;
  const sign = match[1] === '-' ? -1 : 1;
  const power = match[3] === '-' ? `-${match[4]}` : match[4];
  return sign * Number(`0.${match[2]}e${power}`);
}

export function lengthError(line: string, number: 1 | 2): TwoLineError | null {
  if (line.length === lineLength) return null;
  const kind = line.length < lineLength ? 'is cut short or has lost spaces' : 'is too long';
  return {
    line: number,
    message: `Line ${number} ${kind}: it has ${line.length} characters, expected ${lineLength}.`,
  };
}
