/**
 * Six numbers of a state vector out of a paste in any layout, a mail with other numbers in it among them: labels,
 * brackets, separators, an epoch and the name of the axes anywhere. Numbers stay the texts they are; `readNumber`
 * reads them field by field.
 */
import type { InputFrame } from '../candidate';
import { epochIn } from './pastedEpoch';
import { frameIn } from './pastedFrame';
import { sixNumbersIn } from './pastedNumbers';

export type StateTextResult =
  | {
      readonly ok: true;
      /** Position and velocity components, as typed. */
      readonly numbers: readonly string[];
      /** An ISO 8601 date or date and time, from the date found in the paste. */
      readonly epochText?: string;
      /** From units written beside the numbers, else from the size of the numbers. */
      readonly unitGuess?: 'km' | 'm';
      /** The axes, where the paste names one frame and no other. */
      readonly frameGuess?: InputFrame;
    }
  | { readonly ok: false; readonly message: string };

const longestPaste = 10_000;

const expected = 'expected six numbers: position x, y, z and velocity vx, vy, vz';

/** Reads a paste of up to 10 kB; refusals say what was expected. */
export function readStateText(text: string): StateTextResult {
  if (text.length > longestPaste) {
    return refuse(`This paste has ${text.length} characters; ${expected}, in ${longestPaste} characters at most.`);
  }
  const { frame, rest } = frameIn(tidied(text));
  const dated = epochIn(rest);
  if (!dated.ok) return refuse(dated.message);
  const found = sixNumbersIn(dated.rest);
  if (!found.ok) return refuse(found.severalStates ? severalMessage : countMessage(found.count));
  const unitGuess = writtenUnit(found.among) ?? writtenUnit(dated.rest) ?? unitFromSize(found.numbers);
  return {
    ok: true,
    numbers: found.numbers,
    ...(dated.epoch === null ? {} : { epochText: dated.epoch }),
    ...(unitGuess === null ? {} : { unitGuess }),
    ...(frame === null ? {} : { frameGuess: frame }),
  };
}

/** One kind of minus; long gaps short, so that no pattern has to walk them again and again. */
function tidied(text: string): string {
  return text
    .replace(/[\u2010-\u2013\u2212]/g, '-')
    .replace(/\s{2,}/g, (gap) => (/[\r\n\u2028\u2029]/.test(gap) ? '\n' : '  '));
}

function refuse(message: string): StateTextResult {
  return { ok: false, message };
}

const severalMessage = `There is more than one state vector here; ${expected}. Paste one of them.`;

function countMessage(count: number): string {
  if (count === 0) return `There are no numbers here; ${expected}.`;
  const label = count > 6 ? ', each behind its label where there are others' : '';
  return `There ${count === 1 ? 'is 1 number' : `are ${count} numbers`} here; ${expected}${label}.`;
}

/** Null where both units are written: an altitude in km beside a state in m. */
function writtenUnit(text: string): 'km' | 'm' | null {
  const isKm = /(?<![\p{L}'’])km(?!\p{L})/iu.test(text);
  const isM = /(?<![\p{L}'’])(?:m|meters?|metres?)(?!\p{L})/iu.test(text);
  if (isKm === isM) return null;
  return isKm ? 'km' : 'm';
}

/** No orbit is 100 km from a centre of the Earth, nor moves at 100 km/s: speed tells km/s from m/s. */
function unitFromSize(numbers: readonly string[]): 'km' | 'm' | null {
  const values = numbers.map((number) => Number(number.replace(',', '.')));
  const speed = Math.hypot(...values.slice(3));
  const distance = Math.hypot(...values.slice(0, 3));
  if (speed > 100 && distance > 1e6) return 'm';
  return speed < 100 && speed > 0 && distance < 1e6 ? 'km' : null;
}
