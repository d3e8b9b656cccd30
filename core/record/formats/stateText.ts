/**
 * Six numbers of a state vector out of a paste in any layout: labels, brackets, separators, an
 * epoch anywhere. Numbers stay the texts they are; `readNumber` reads them field by field.
 */

export type StateTextResult =
  | {
      readonly ok: true;
      /** Position and velocity components, as typed. */
      readonly numbers: readonly string[];
      /** An ISO 8601 date or date and time found in the paste. */
      readonly epochText?: string;
      /** From units written beside the numbers, else from the size of the numbers. */
      readonly unitGuess?: 'km' | 'm';
    }
  | { readonly ok: false; readonly message: string };

const longestPaste = 10_000;

const expected = 'expected six numbers: position x, y, z and velocity vx, vy, vz';

const epochPattern =
  /\d{4}-\d{2}-\d{2}(?:[T ]\d{2}:\d{2}(?::\d{2}(?:[.,]\d+)?)?(?:\s?Z\b|\s?UTC\b|[+-]\d{2}:?\d{2}\b)?)?/i;

/** Reads a paste of up to 10 kB; refusals say what was expected. */
export function readStateText(text: string): StateTextResult {
  if (text.length > longestPaste) {
    return refuse(`This paste has ${text.length} characters; ${expected}, in ${longestPaste} characters at most.`);
  }
  const plain = text.replace(/[\u2010-\u2013\u2212]/g, '-');
  const epoch = epochPattern.exec(plain)?.[0];
  const rest = epoch === undefined ? plain : plain.replace(epoch, ' ; ');
  const numbers = numbersIn(rest);
  if (numbers.length !== 6) return refuse(countMessage(numbers.length));
  const unitGuess = writtenUnit(rest) ?? unitFromSize(numbers);
  return {
    ok: true,
    numbers,
    ...(epoch === undefined ? {} : { epochText: isoText(epoch) }),
    ...(unitGuess === null ? {} : { unitGuess }),
  };
}

function refuse(message: string): StateTextResult {
  return { ok: false, message };
}

function countMessage(count: number): string {
  if (count === 0) return `There are no numbers here; ${expected}.`;
  return `There ${count === 1 ? 'is 1 number' : `are ${count} numbers`} here; ${expected}.`;
}

function isoText(epoch: string): string {
  return epoch.replace(/\s?UTC$/i, 'Z');
}

const pointNumber = /[+-]?(?:\d+\.?\d*|\.\d+)(?:[eEdD][+-]?\d+)?/g;
const commaNumber = /[+-]?(?:\d+(?:,\d+)?|,\d+)(?:[eEdD][+-]?\d+)?/g;

function numbersIn(text: string): readonly string[] {
  const bare = withoutLabels(text)
    .replace(/,(?=\s|$)/g, ' ')
    .replace(/([+-])\s+(?=[\d.,])/g, '$1');
  const pattern = hasDecimalCommas(bare) ? commaNumber : pointNumber;
  return (bare.match(pattern) ?? []).map((number) => number.replace(/d/i, 'e'));
}

/** Names and units out of the way, digits in them included: `r_1 =`, `X2:`, `km/s`, `km/s^2`. */
function withoutLabels(text: string): string {
  return text
    .replace(/k?m\s*\/\s*s(?:ec)?\b|k?m\s*[·*]?\s*s(?:\^?-1|⁻¹)/gi, ' ')
    .replace(/[[(]\s*\d\s*[\])]\s*(?=[=:])/g, ' ')
    .replace(/(^|[^\d.,\p{L}])\p{L}[\p{L}\d_]*(?:\s*\([^()\d]*\))?/gu, '$1 ')
    .replace(/(\d)\s*(?![eEdD][+-]?\d)\p{L}+/gu, '$1 ');
}

/**
 * Commas are decimal where no point is and each comma stands between two digits, with something
 * else to separate the numbers. "1,2,3" without a space is a list.
 */
function hasDecimalCommas(text: string): boolean {
  if (text.includes('.')) return false;
  const commas = text.match(/,/g)?.length ?? 0;
  const between = text.match(/\d,\d/g)?.length ?? 0;
  return commas > 0 && commas === between && (text.match(commaNumber) ?? []).length === 6 && !/\d,\d+,/.test(text);
}

function writtenUnit(text: string): 'km' | 'm' | null {
  if (/(?<!\p{L})km(?!\p{L})/iu.test(text)) return 'km';
  return /(?<!\p{L})(?:m|meters?|metres?)(?!\p{L})/iu.test(text) ? 'm' : null;
}

/** No orbit is 100 km from a centre of the Earth, nor moves at 100 km/s: speed tells km/s from m/s. */
function unitFromSize(numbers: readonly string[]): 'km' | 'm' | null {
  const values = numbers.map((number) => Number(number.replace(',', '.')));
  const speed = Math.hypot(...values.slice(3));
  const distance = Math.hypot(...values.slice(0, 3));
  if (speed > 100 && distance > 1e6) return 'm';
  return speed < 100 && speed > 0 && distance < 1e6 ? 'km' : null;
}
