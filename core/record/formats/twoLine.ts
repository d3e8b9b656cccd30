import { daysInYear, julianDateOfMidnight } from '../../bodies/calendar';
import { isoFromJulianDate } from '../../bodies/julianDate';
import { radPerDeg, secondsPerDay, twoPi, wrapTwoPi } from '../../numerics/angles';
import type { MeanElements } from '../../orbit/elements';
import { brouwerFromKozai } from '../../orbit/kozai';
import { checksumOf, findLines, lineLength } from './twoLineColumns';
import {
  catalogNumberOf,
  fieldTexts,
  impliedPointValue,
  lengthError,
  line1Fields,
  line2Fields,
  type TwoLineError,
} from './twoLineFields';

export interface TwoLineElements {
  readonly ok: true;
  /** Julian date, UTC. */
  readonly epochJd: number;
  /** The same to 1 s. */
  readonly epochIso: string;
  /** Brouwer's size under WGS 72; SGP4's mean elements otherwise as given; frame TEME of the epoch. */
  readonly elements: MeanElements;
  readonly kind: 'mean';
  readonly theory: 'SGP4';
  readonly frame: 'TEME';
  readonly name?: string;
  readonly catalogNumber: number;
  readonly meanMotionKozaiRadPerMin: number;
  /** Drag term B*, per Earth radius. */
  readonly bstar: number;
}

export type TwoLineResult = TwoLineElements | { readonly ok: false; readonly errors: readonly TwoLineError[] };

/** A set takes 140 characters, a name line and stray spaces some more. */
const longestPaste = 2000;

/**
 * Two-line elements, with or without a name line above: Hoots and Roehrich, Spacetrack Report
 * no. 3 (1980), with the two-digit year (57 to 99 is 19xx) and the alpha-5 catalogue numbers in
 * use since. Every refusal says what was expected, by line and column; it never throws.
 */
export function parseTle(text: string): TwoLineResult {
  if (text.length > longestPaste) {
    return refuse(`This paste has ${text.length} characters; expected two lines of ${lineLength}. Paste one set.`);
  }
  const { name, line1, line2, surplus } = findLines(text);
  if (line1 === null || line2 === null) return refuse(missingMessage(line1));
  if (surplus > 0) return refuse('There are more lines than one set has. Paste one name line at most, line 1, line 2.');
  if (line1.startsWith('2 ') && line2.startsWith('1 ')) {
    return refuse('The two lines are swapped: the line that begins with 1 comes first.');
  }
  const frameErrors = [...lineErrors(line1, 1), ...lineErrors(line2, 2)];
  if (frameErrors.length > 0) return { ok: false, errors: frameErrors };
  const first = fieldTexts(line1, 1, line1Fields);
  const second = fieldTexts(line2, 2, line2Fields);
  const errors = [...first.errors, ...second.errors, ...catalogErrors(line1, line2), ...dayErrors(first)];
  if (errors.length > 0) return { ok: false, errors };
  const epochJd = epochOf(first.texts.year, first.texts.day);
  return {
    ok: true,
    epochJd,
    epochIso: isoFromJulianDate(epochJd),
    ...orbitOf(second.texts),
    kind: 'mean',
    theory: 'SGP4',
    frame: 'TEME',
    ...(name === null ? {} : { name }),
    catalogNumber: catalogNumberOf(line1) ?? 0,
    bstar: impliedPointValue(first.texts.drag),
  };
}

function refuse(message: string): TwoLineResult {
  return { ok: false, errors: [{ message }] };
}

function missingMessage(line1: string | null): string {
  const expected = `expected two lines of ${lineLength} characters, the first beginning with 1, the second with 2`;
  if (line1 === null) return `There are no two-line elements here; ${expected}.`;
  return `Only one line of the set is here; ${expected}.`;
}

/** Line number, length, checksum: without these the columns mean nothing. */
function lineErrors(line: string, number: 1 | 2): readonly TwoLineError[] {
  if (!line.startsWith(`${number} `)) {
    return [{ line: number, message: `Line ${number} begins with “${line.slice(0, 2)}”; expected “${number} ”.` }];
  }
  const length = lengthError(line, number);
  if (length) return [length];
  const written = line.charAt(lineLength - 1);
  const found = checksumOf(line);
  if (written === String(found)) return [];
  const message = `Line ${number}, column ${lineLength}: the checksum reads “${written}”, but the line adds up to ${found}; a character is mistyped or lost.`;
  return [{ line: number, message }];
}

function catalogErrors(line1: string, line2: string): readonly TwoLineError[] {
  const expected = 'expected five digits, or a letter and four digits (not I or O)';
  for (const [line, number] of [
    [line1, 1],
    [line2, 2],
  ] as const) {
    if (catalogNumberOf(line) === null) {
      const text = line.slice(2, 7);
      return [{ line: number, message: `Line ${number}, columns 3 to 7: the number reads “${text}”; ${expected}.` }];
    }
  }
  if (catalogNumberOf(line1) === catalogNumberOf(line2)) return [];
  const message = `The lines belong to different objects: ${line1.slice(2, 7)} in line 1, ${line2.slice(2, 7)} in line 2.`;
  return [{ line: 2, message }];
}

interface EpochTexts {
  readonly texts: { readonly year: string; readonly day: string };
  readonly errors: readonly TwoLineError[];
}

function dayErrors({ texts, errors }: EpochTexts): readonly TwoLineError[] {
  if (errors.length > 0) return [];
  const year = fullYear(texts.year);
  const days = daysInYear(year);
  const day = Number(texts.day);
  if (day >= 1 && day < days + 1) return [];
  const message = `Line 1, columns 21 to 32: there is no day ${texts.day} in ${year}; expected 1 to ${days}, and a fraction.`;
  return [{ line: 1, message }];
}

/** Two digits, 57 to 99 in the 1900s, since the first satellite flew in 1957. */
function fullYear(twoDigits: string): number {
  const year = Number(twoDigits);
  return year < 57 ? 2000 + year : 1900 + year;
}

function epochOf(year: string, day: string): number {
  return julianDateOfMidnight({ year: fullYear(year), month: 1, day: 1 }) + Number(day) - 1;
}

function orbitOf(
  texts: Readonly<Record<keyof typeof line2Fields, string>>,
): Pick<TwoLineElements, 'elements' | 'meanMotionKozaiRadPerMin'> {
  const eccentricity = Number(`0.${texts.eccentricity}`);
  const inclinationRad = Number(texts.inclination) * radPerDeg;
  const meanMotionKozaiRadPerS = (Number(texts.motion) * twoPi) / secondsPerDay;
  return {
    elements: {
      kind: 'mean',
      semiMajorAxisKm: brouwerFromKozai({ meanMotionKozaiRadPerS, eccentricity, inclinationRad }).semiMajorAxisKm,
      eccentricity,
      inclinationRad,
      nodeRad: wrapTwoPi(Number(texts.node) * radPerDeg),
      perigeeRad: wrapTwoPi(Number(texts.perigee) * radPerDeg),
      meanAnomalyRad: wrapTwoPi(Number(texts.anomaly) * radPerDeg),
    },
    meanMotionKozaiRadPerMin: meanMotionKozaiRadPerS * 60,
  };
}
