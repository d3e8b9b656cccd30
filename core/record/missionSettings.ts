/**
 * What a mission is computed with, as typed: forces, the air's density, the box of local time. Lies in
 * `Candidate.plans.drift` with whatever else a later version put there, which is kept.
 */
import { ballisticKgPerM2, type DragInput, type DragShape } from '../forces/drag';
import { highestZonalDegree } from '../forces/zonal';
import type { HistoryForces } from '../mission/historyRequest';
import type { Candidate } from './candidate';
import { type FieldReader, fieldReader } from './readFields';
import type { FieldError } from './resolved';
import { formatNumber } from './units';

export const missionFields = [
  'zonalDegree',
  'massKg',
  'areaM2',
  'dragCoefficient',
  'ballisticKgPerM2',
  'densityFactor',
  'boxMinutes',
] as const;
export type MissionField = (typeof missionFields)[number];

export const densityChoices = ['low', 'mean', 'high', 'factor'] as const;
export type DensityChoice = (typeof densityChoices)[number];

/** As typed and chosen. */
export interface MissionEntry {
  readonly sun: boolean;
  readonly moon: boolean;
  readonly drag: boolean;
  readonly dragForm: 'parts' | 'ballistic';
  readonly density: DensityChoice;
  readonly texts: Readonly<Record<MissionField, string>>;
}

export interface MissionSettings {
  readonly entry: MissionEntry;
  /** Null while a field of the forces is in error. */
  readonly forces: HistoryForces | null;
  /** Null while the field is in error. */
  readonly boxMinutes: number | null;
  readonly errors: Partial<Record<MissionField, FieldError>>;
  /** What is taken as typed, and should be looked at. */
  readonly cautions: Partial<Record<MissionField, string>>;
}

const startingTexts: Readonly<Record<MissionField, string>> = {
  zonalDegree: String(highestZonalDegree),
  massKg: '500',
  areaM2: '3',
  dragCoefficient: '2.2',
  ballisticKgPerM2: '75',
  densityFactor: '1',
  boxMinutes: '15',
};

/** The entry of a candidate; what it lacks, or cannot be, is as a new candidate starts. */
export function missionEntry(plans: Candidate['plans']): MissionEntry {
  const stored = recordOf(plans['drift']);
  const texts = recordOf(stored['texts']);
  const flag = (key: string, otherwise: boolean) => (typeof stored[key] === 'boolean' ? stored[key] : otherwise);
  const density = densityChoices.find((choice) => choice === stored['density']);
  return {
    sun: flag('sun', true),
    moon: flag('moon', true),
    drag: flag('drag', false),
    dragForm: stored['dragForm'] === 'ballistic' ? 'ballistic' : 'parts',
    density: density ?? 'mean',
    texts: Object.fromEntries(
      missionFields.map((field) => [field, typeof texts[field] === 'string' ? texts[field] : startingTexts[field]]),
    ) as Record<MissionField, string>,
  };
}

export interface MissionChange extends Partial<Omit<MissionEntry, 'texts'>> {
  readonly texts?: Partial<Record<MissionField, string>>;
}

/** The plans with some of the mission's settings changed; all other keys stay as they are. */
export function changedPlans(plans: Candidate['plans'], { texts, ...tags }: MissionChange): Candidate['plans'] {
  const stored = recordOf(plans['drift']);
  return { ...plans, drift: { ...stored, ...tags, texts: { ...recordOf(stored['texts']), ...texts } } };
}

function recordOf(value: unknown): Readonly<Record<string, unknown>> {
  const isRecord = typeof value === 'object' && value !== null && !Array.isArray(value);
  return isRecord ? (value as Readonly<Record<string, unknown>>) : {};
}

/** Forces and box in numbers, or a message at each field that is in the way. */
export function readMissionSettings(plans: Candidate['plans']): MissionSettings {
  const entry = missionEntry(plans);
  const reader = fieldReader<MissionField>(entry.texts);
  const cautions: Partial<Record<MissionField, string>> = {};
  const zonalDegree = readDegree(reader);
  const drag = entry.drag ? readDrag(entry, reader, cautions) : undefined;
  const boxMinutes = readBox(reader);
  const { sun, moon } = entry;
  const forces = zonalDegree === null || drag === null ? null : { zonalDegree, sun, moon, ...(drag && { drag }) };
  return { entry, forces, boxMinutes, errors: reader.errors, cautions };
}

function readDegree(reader: FieldReader<MissionField>): number | null {
  const expected = `a whole number from 2 to ${highestZonalDegree}, or 0 for none`;
  const degree = reader.number({ field: 'zonalDegree', label: 'Highest zonal', expected });
  if (degree === null) return null;
  const isDegree = degree === 0 || (Number.isInteger(degree) && degree >= 2 && degree <= highestZonalDegree);
  return isDegree ? degree : reader.fail('zonalDegree', `Highest zonal: type ${expected}.`);
}

const longestBoxMinutes = 720;

function readBox(reader: FieldReader<MissionField>): number | null {
  const expected = `minutes to either side, above 0 and at most ${longestBoxMinutes}`;
  const minutes = reader.number({ field: 'boxMinutes', label: 'Box of local time', expected, unit: 'min' });
  if (minutes === null) return null;
  const isBox = minutes > 0 && minutes <= longestBoxMinutes;
  return isBox ? minutes : reader.fail('boxMinutes', `Box of local time: type ${expected}.`);
}

/** kg/m²: balloons lie below, solid metal spheres of a metre above. */
const usualBallistic = { least: 1, most: 2000 } as const;

function readDrag(
  entry: MissionEntry,
  reader: FieldReader<MissionField>,
  cautions: Partial<Record<MissionField, string>>,
): DragInput | null {
  const shape = entry.dragForm === 'ballistic' ? readBallistic(reader) : readParts(reader);
  const density = entry.density === 'factor' ? readFactor(reader) : entry.density;
  if (shape === null || density === null) return null;
  const ballistic = ballisticKgPerM2(shape);
  if (ballistic < usualBallistic.least || ballistic > usualBallistic.most) {
    const digits = Math.max(0, Math.min(6, 2 - Math.floor(Math.log10(ballistic))));
    const size = `m/(Cd·A) is ${formatNumber(ballistic, { digits })} kg/m²`;
    const usual = `satellites lie between ${usualBallistic.least} and ${usualBallistic.most}`;
    cautions[entry.dragForm === 'ballistic' ? 'ballisticKgPerM2' : 'massKg'] = `${size}; ${usual}. Check the units.`;
  }
  return { ...shape, density };
}

function readBallistic(reader: FieldReader<MissionField>): DragShape | null {
  const words = { label: 'Ballistic coefficient m/(Cd·A)', expected: 'kg/m² above 0, such as 75' } as const;
  const ballisticKgPerM2 = above0(reader, { field: 'ballisticKgPerM2', ...words });
  return ballisticKgPerM2 === null ? null : { ballisticKgPerM2 };
}

function readParts(reader: FieldReader<MissionField>): DragShape | null {
  const massKg = above0(reader, { field: 'massKg', label: 'Mass', expected: 'kg above 0, such as 500' });
  const areaM2 = above0(reader, { field: 'areaM2', label: 'Drag area', expected: 'm² above 0, such as 3' });
  const words = { label: 'Drag coefficient', expected: 'a number above 0, such as 2.2' } as const;
  const dragCoefficient = above0(reader, { field: 'dragCoefficient', ...words });
  return massKg === null || areaM2 === null || dragCoefficient === null ? null : { massKg, areaM2, dragCoefficient };
}

function readFactor(reader: FieldReader<MissionField>): number | null {
  const words = { label: 'Density factor', expected: 'a factor above 0 on the table, such as 1.5' } as const;
  return above0(reader, { field: 'densityFactor', ...words });
}

interface Words {
  readonly field: MissionField;
  readonly label: string;
  readonly expected: string;
}

function above0(reader: FieldReader<MissionField>, words: Words): number | null {
  const value = reader.number(words);
  if (value === null || value > 0) return value;
  return reader.fail(words.field, `${words.label} must be above 0; type ${words.expected}.`);
}
