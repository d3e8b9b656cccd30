/**
 * Numbers as people type them: decimal point or comma, thousands separators, true minus signs.
 *
 * A lone point is always decimal. A lone comma is decimal too, except where it could as well
 * separate thousands ("1,234"): then the reader is asked, with both readings spelt out.
 */

export interface NumberReading {
  /** The reading written so that it can be taken one way only. */
  readonly text: string;
  readonly value: number;
}

export type NumberResult =
  | { readonly ok: true; readonly value: number }
  | {
      readonly ok: false;
      readonly problem: 'empty' | 'notANumber' | 'ambiguous' | 'tooLarge';
      readonly message: string;
      readonly readings?: readonly NumberReading[];
    };

/** Longer than any number that a person types; a paste beyond it is not looked at. */
const longestText = 80;

/** Reads one number. Never throws; each refusal says what was expected. */
export function readNumber(text: string): NumberResult {
  if (text.length > longestText) {
    return notANumber(`This text of ${text.length} characters is not a number. Type one number, such as 97.4.`);
  }
  const clean = plainSigns(text);
  if (clean === '')
    return { ok: false, problem: 'empty', message: 'Nothing is typed yet. Type a number, such as 97.4.' };
  const parts = /^([+-]?)([\d.,' ]*\d[\d.,' ]*?)(?:e([+-]?\d+))?$/i.exec(clean);
  if (!parts) return notANumber(`“${text.trim()}” is not a number. Type digits, such as 97.4 or 97,4.`);
  const sign = parts[1] === '-' ? '-' : '';
  const exponent = parts[3] === undefined ? '' : `e${Number(parts[3])}`;
  const digits = parts[2] ?? '';
  if (/^[1-9]\d{0,2},\d{3}$/.test(digits)) return ambiguous(text.trim(), sign, digits, exponent);
  const plain = plainDigits(digits);
  if (plain === null) {
    return notANumber(`“${text.trim()}” is not a number: its separators do not stand before groups of three digits.`);
  }
  return finite(`${sign}${plain}${exponent}`);
}

/** One kind of minus, space and apostrophe; “× 10^” as an exponent; no space after a sign. */
function plainSigns(text: string): string {
  return text
    .trim()
    .replace(/[\u2010-\u2013\u2212\ufe63\uff0d]/g, '-')
    .replace(/[\s\u00a0\u2007\u2009\u202f]+/g, ' ')
    .replace(/[\u2018\u2019\u02bc]/g, "'")
    .replace(/ ?[×*·] ?10 ?\^ ?/g, 'e')
    .replace(/^([+-]) /, '$1');
}

/** Digits with a decimal point only, or null where the separators contradict each other. */
function plainDigits(digits: string): string | null {
  const decimal = decimalMark(digits);
  const cut = decimal === null ? digits.length : digits.lastIndexOf(decimal);
  const whole = digits.slice(0, cut);
  const fraction = digits.slice(cut + 1);
  const groupMark = /[.,' ]/.exec(whole)?.[0];
  if (groupMark !== undefined) {
    if (groupMark === decimal || !isGrouped(whole, groupMark)) return null;
  }
  // After the decimal mark only spaces are used to group, as in 0.123 456.
  if (!/^\d*$/.test(fraction) && !/^\d{3}( \d{3})* \d{1,3}$/.test(fraction)) return null;
  const wholeDigits = whole.replace(/\D/g, '');
  return `${wholeDigits === '' ? '0' : wholeDigits}.${fraction.replaceAll(' ', '')}0`;
}

/** Of point and comma, the last; a mark that occurs twice separates thousands. */
function decimalMark(digits: string): '.' | ',' | null {
  const last = /[.,](?=[^.,]*$)/.exec(digits)?.[0];
  if (last !== '.' && last !== ',') return null;
  return digits.indexOf(last) === digits.lastIndexOf(last) ? last : null;
}

function isGrouped(whole: string, mark: string): boolean {
  const [first = '', ...groups] = whole.split(mark);
  return /^\d{1,3}$/.test(first) && groups.every((group) => /^\d{3}$/.test(group));
}

function ambiguous(typed: string, sign: string, digits: string, exponent: string): NumberResult {
  const texts = [digits.replace(',', '.'), digits.replace(',', '')].map((form) => `${sign}${form}${exponent}`);
  return {
    ok: false,
    problem: 'ambiguous',
    message: `“${typed}” can be read as ${texts.join(' or as ')}. Which is meant?`,
    readings: texts.map((form) => ({ text: form, value: Number(form) })),
  };
}

function finite(plain: string): NumberResult {
  const value = Number(plain);
  if (Number.isFinite(value)) return { ok: true, value: value + 0 };
  return { ok: false, problem: 'tooLarge', message: 'This number is too large to compute with. Type one below 1e308.' };
}

function notANumber(message: string): NumberResult {
  return { ok: false, problem: 'notANumber', message };
}
