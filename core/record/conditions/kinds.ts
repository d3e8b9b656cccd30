/** The conditions as a user states them: words, fields, which element each settles, and what it asks of the solver. */
import type { OrbitCondition } from '../../design/conditions/registry';
import { radPerDeg, secondsPerDay } from '../../numerics/angles';
import type { OrbitEntry } from '../candidate';
import { kmPerLengthUnit } from '../entry/shape';
import type { FieldReader } from '../readFields';

/** Elements that a condition can settle. A frozen orbit settles the perigee with the eccentricity. */
export const settledElements = ['semiMajorAxisKm', 'eccentricity', 'inclinationRad'] as const;
export type SettledElement = (typeof settledElements)[number];

/** For the middle of a sentence. */
export const elementNames: Readonly<Record<SettledElement, string>> = {
  semiMajorAxisKm: 'the semi-major axis',
  eccentricity: 'the eccentricity',
  inclinationRad: 'the inclination',
};

/** Every text field that some kind of condition has. */
export const conditionFields = ['revolutions', 'days', 'rate', 'altitude', 'period', 'of'] as const;
export type ConditionField = (typeof conditionFields)[number];

/** A wish as typed; lies in `Candidate.conditions`. */
export interface ConditionEntry {
  readonly kind: OrbitCondition['kind'];
  readonly settles: SettledElement;
  readonly texts: Readonly<Partial<Record<ConditionField, string>>>;
}

export interface ConditionFieldWords {
  readonly field: ConditionField;
  readonly label: string;
  /** Unit shown; `length` stands for the entry's unit of lengths. */
  readonly unit: '' | 'length' | '°/day' | 'min' | 'd';
  readonly expected: string;
  readonly stepSize?: number;
  readonly signed?: boolean;
}

export interface ConditionWords {
  readonly label: string;
  /** What is settled unless the user says otherwise. */
  readonly settles: SettledElement;
  readonly fields: readonly ConditionFieldWords[];
  /** The solver's condition, or null with a message left at the field. */
  readonly read: (reader: FieldReader<ConditionField>, entry: OrbitEntry) => OrbitCondition | null;
}

const rateField: ConditionFieldWords = {
  field: 'rate',
  label: 'Rate',
  unit: '°/day',
  expected: 'degrees a day, such as −5.2',
  stepSize: 0.01,
  signed: true,
};
const altitudeField: ConditionFieldWords = {
  field: 'altitude',
  label: 'Altitude',
  unit: 'length',
  expected: 'a height above the equator, such as 560',
  stepSize: 1,
  signed: true,
};
const counted = (field: 'revolutions' | 'days', label: string): ConditionFieldWords => ({
  field,
  label,
  unit: '',
  expected: 'a whole number, 1 or more',
  stepSize: 1,
});

const radPerSFromDegPerDay = radPerDeg / secondsPerDay;

function readNumber(reader: FieldReader<ConditionField>, words: ConditionFieldWords): number | null {
  const { field, label, expected } = words;
  return reader.number({ field, label, expected });
}

function readRate(reader: FieldReader<ConditionField>): number | null {
  const degPerDay = readNumber(reader, rateField);
  return degPerDay === null ? null : degPerDay * radPerSFromDegPerDay;
}

const altitudeKind = (kind: 'perigeeAltitude' | 'apogeeAltitude', label: string): ConditionWords => ({
  label,
  settles: kind === 'perigeeAltitude' ? 'semiMajorAxisKm' : 'eccentricity',
  fields: [altitudeField],
  read: (reader, entry) => {
    const altitude = readNumber(reader, altitudeField);
    return altitude === null ? null : { kind, km: altitude * kmPerLengthUnit(entry) };
  },
});

const revolutionsField = counted('revolutions', 'Revolutions');
const daysField = counted('days', 'Days');
const periodField: ConditionFieldWords = {
  field: 'period',
  label: 'Nodal period',
  unit: 'min',
  expected: 'minutes above 0, such as 96.5',
  stepSize: 0.1,
};

export const conditionWords: Readonly<Record<OrbitCondition['kind'], ConditionWords>> = {
  sunSynchronous: {
    label: 'Sun-synchronous',
    settles: 'inclinationRad',
    fields: [],
    read: () => ({ kind: 'sunSynchronous' }),
  },
  repeat: {
    label: 'Repeat ground track',
    settles: 'semiMajorAxisKm',
    fields: [revolutionsField, daysField],
    read: (reader) => {
      const revolutions = readNumber(reader, revolutionsField);
      const days = readNumber(reader, daysField);
      return revolutions === null || days === null ? null : { kind: 'repeat', revolutions, days };
    },
  },
  frozen: { label: 'Frozen', settles: 'eccentricity', fields: [], read: () => ({ kind: 'frozen' }) },
  perigeeStationary: {
    label: 'Perigee stationary (critical inclination)',
    settles: 'inclinationRad',
    fields: [],
    read: () => ({ kind: 'perigeeStationary' }),
  },
  nodeRate: {
    label: 'Node rate',
    settles: 'inclinationRad',
    fields: [rateField],
    read: (reader) => {
      const radPerS = readRate(reader);
      return radPerS === null ? null : { kind: 'nodeRate', radPerS };
    },
  },
  sameNodeRate: {
    label: 'Same node rate as',
    settles: 'inclinationRad',
    fields: [rateField],
    read: (reader) => {
      const radPerS = readRate(reader);
      return radPerS === null ? null : { kind: 'sameNodeRate', radPerS, label: reader.text('of') || 'the other orbit' };
    },
  },
  perigeeRate: {
    label: 'Perigee rate',
    settles: 'inclinationRad',
    fields: [rateField],
    read: (reader) => {
      const radPerS = readRate(reader);
      return radPerS === null ? null : { kind: 'perigeeRate', radPerS };
    },
  },
  perigeeAltitude: altitudeKind('perigeeAltitude', 'Perigee altitude'),
  apogeeAltitude: altitudeKind('apogeeAltitude', 'Apogee altitude'),
  nodalPeriod: {
    label: 'Nodal period',
    settles: 'semiMajorAxisKm',
    fields: [periodField],
    read: (reader) => {
      const minutes = readNumber(reader, periodField);
      return minutes === null ? null : { kind: 'nodalPeriod', s: minutes * 60 };
    },
  },
};
