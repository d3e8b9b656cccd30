/** What the list of repeat tracks is asked: the texts of its fields read into a search and a filter, with a message at each. */
import {
  type Body,
  type Cycle,
  type FieldErrors,
  type FieldReader,
  fieldReader,
  type RepeatProblem,
  type RepeatRequest,
  radPerDeg,
  readCycle,
} from '../../../core/index';

export const trackFields = [
  'lowest',
  'highest',
  'longest',
  'swath',
  'latitude',
  'shortest',
  'narrowest',
  'widest',
  'cycle',
] as const;
export type TrackField = (typeof trackFields)[number];
export type TrackTexts = Readonly<Record<TrackField, string>>;
type FieldError = NonNullable<FieldErrors[keyof FieldErrors]>;
export type TrackErrors = Partial<Record<TrackField, FieldError>>;

export type TrackInclinationKind = 'sunSynchronous' | 'fixed';

/** Which of the tracks found are listed. */
export interface TrackFilter {
  readonly swathKm: number | null;
  /** Where the swath has to close the gaps, rad. */
  readonly latitudeRad: number;
  /** Days of the shortest cycle. */
  readonly shortestDays: number;
  /** Along the equator. */
  readonly narrowestKm: number;
  readonly widestKm: number;
  /** This one alone, where it was asked for by name. */
  readonly cycle: Cycle | null;
}

export interface TrackQuestion {
  readonly texts: TrackTexts;
  readonly inclination: TrackInclinationKind;
  readonly kmPerUnit: number;
  readonly body: Body;
  readonly eccentricity: number;
  readonly inclinationRad: number;
}

export interface TrackWishes {
  /** Null while a field of it cannot be read. */
  readonly request: RepeatRequest | null;
  readonly filter: TrackFilter | null;
  readonly errors: TrackErrors;
  /** Says that a cycle asked for was brought to lowest terms. */
  readonly note: string | null;
}

export function readWishes(question: TrackQuestion): TrackWishes {
  const reader = fieldReader<TrackField>(question.texts);
  const request = readRequest(reader, question);
  const { cycle, note } = readNamedCycle(reader);
  const filter = readFilter(reader, question.kmPerUnit, cycle);
  return { request, filter, errors: reader.errors, note };
}

function readRequest(reader: FieldReader<TrackField>, question: TrackQuestion): RepeatRequest | null {
  const { kmPerUnit, body, inclination } = question;
  const lowest = reader.number({ field: 'lowest', label: 'Lowest altitude', expected: 'a height, such as 500' });
  const highest = reader.number({ field: 'highest', label: 'Highest altitude', expected: 'a height, such as 700' });
  const longest = reader.number({
    field: 'longest',
    label: 'Longest cycle',
    expected: 'a whole number of days from 1 to 400',
  });
  if (lowest === null || highest === null || longest === null) return null;
  return {
    body,
    theory: 'second',
    // To what the list shows, so that rounding in the entry's own texts starts no new search.
    eccentricity: Number(question.eccentricity.toFixed(6)),
    inclination:
      inclination === 'sunSynchronous' ? { kind: inclination } : { kind: inclination, rad: rounded(question) },
    minAltitudeKm: lowest * kmPerUnit,
    maxAltitudeKm: highest * kmPerUnit,
    maxDays: longest,
  };
}

function rounded({ inclinationRad }: TrackQuestion): number {
  return Math.min(Math.PI, Number((inclinationRad / radPerDeg).toFixed(4)) * radPerDeg);
}

const filterFields = ['swath', 'shortest', 'narrowest', 'widest', 'cycle'] as const;

function readFilter(reader: FieldReader<TrackField>, kmPerUnit: number, cycle: Cycle | null): TrackFilter | null {
  const swath = positive(reader, { field: 'swath', label: 'Swath', expected: 'a width, such as 290' });
  const shortest = positive(reader, { field: 'shortest', label: 'Shortest cycle', expected: 'days, such as 3' });
  const narrowest = positive(reader, {
    field: 'narrowest',
    label: 'Narrowest spacing',
    expected: 'a width, such as 200',
  });
  const widest = positive(reader, { field: 'widest', label: 'Widest spacing', expected: 'a width, such as 200' });
  const latitude = readLatitude(reader);
  if (latitude === null || filterFields.some((field) => reader.errors[field])) return null;
  return {
    swathKm: swath === undefined ? null : swath * kmPerUnit,
    latitudeRad: latitude * radPerDeg,
    shortestDays: shortest ?? 1,
    narrowestKm: (narrowest ?? 0) * kmPerUnit,
    widestKm: (widest ?? Number.POSITIVE_INFINITY) * kmPerUnit,
    cycle,
  };
}

interface Words {
  readonly field: TrackField;
  readonly label: string;
  readonly expected: string;
}

/** Undefined where nothing is asked or, with a message left, what is asked makes no sense. */
function positive(reader: FieldReader<TrackField>, words: Words): number | undefined {
  const value = reader.optionalNumber(words);
  if (value === undefined || value === null) return undefined;
  if (value > 0) return value;
  reader.fail(words.field, `${words.label} has to be above 0; type ${words.expected}, or leave it empty.`);
  return undefined;
}

function readLatitude(reader: FieldReader<TrackField>): number | null {
  const words: Words = { field: 'latitude', label: 'Latitude', expected: 'degrees from −90 to 90, such as 0' };
  const value = reader.optionalNumber(words);
  if (value === undefined) return 0;
  if (value === null) return null;
  if (Math.abs(value) <= 90) return value;
  return reader.fail('latitude', 'Latitude has to be from −90° to 90°.');
}

const cyclePattern = /^\s*([+\-−]?[\d.,]+)\s*(?:\/|:|in)\s*([+\-−]?[\d.,]+)\s*$/;

function readNamedCycle(reader: FieldReader<TrackField>): { cycle: Cycle | null; note: string | null } {
  const text = reader.text('cycle');
  if (text === '') return { cycle: null, note: null };
  const parts = cyclePattern.exec(text);
  const number = (part: string | undefined) => Number(part?.replace('−', '-').replace(',', '.'));
  const read = parts ? readCycle({ revolutions: number(parts[1]), days: number(parts[2]) }) : null;
  if (read?.ok) return { cycle: read.cycle, note: read.note };
  reader.fail('cycle', read?.message ?? 'A cycle is written as revolutions/days; type it such as 181/12.');
  return { cycle: null, note: null };
}

const fieldOfProblem: Partial<Record<RepeatProblem['field'], TrackField>> = {
  minAltitudeKm: 'lowest',
  maxAltitudeKm: 'highest',
  maxDays: 'longest',
};

/** The field at which what a search refused is said; null where it lies with the body or the orbit. */
export function fieldOf({ field }: RepeatProblem): TrackField | null {
  return fieldOfProblem[field] ?? null;
}
