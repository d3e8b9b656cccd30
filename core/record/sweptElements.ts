/** The elements that a reading can be swept against: what each changes, where it exists, where a sweep of it starts. */
import { radPerDeg, twoPi } from '../numerics/angles';
import type { MeanElements } from '../orbit/elements';
import { apogeeAltitudeKm, largestRadiusKm, perigeeAltitudeKm } from './entry/shape';
import type { ReadingPoint } from './readings/reading';
import type { Quantity } from './units';

export const sweptElements = [
  'inclination',
  'meanAltitude',
  'perigeeAltitude',
  'eccentricity',
  'perigee',
  'node',
] as const;
export type SweptElement = (typeof sweptElements)[number];

type Changes = Partial<Pick<MeanElements, ElementKey>>;
type ElementKey = 'semiMajorAxisKm' | 'eccentricity' | 'inclinationRad' | 'nodeRad' | 'perigeeRad';

/** In core units (km, rad). */
interface Ends {
  readonly from: number;
  readonly to: number;
}

export interface SweptWords {
  /** Begins a label; in a sentence it is written small. */
  readonly label: string;
  readonly quantity: Extract<Quantity, 'length' | 'angle' | 'ratio'>;
  /** The mean elements that it changes. */
  readonly changes: readonly ElementKey[];
  readonly valueOf: (point: ReadingPoint) => number;
  readonly with: (point: ReadingPoint, value: number) => Changes;
  /** Where it exists, both ends included. */
  readonly domain: (point: ReadingPoint) => Ends;
  /** Half the width of a sweep that starts around the orbit. */
  readonly reach: (point: ReadingPoint) => number;
}

/** An ellipse closer to a parabola than this is past what a rate means. */
const greatestEccentricity = 0.99;
const turn: SweptWords['domain'] = () => ({ from: 0, to: twoPi });
const around = (km: number) => Math.max(100, Math.min(300, 0.25 * km));

export const sweptWords: Readonly<Record<SweptElement, SweptWords>> = {
  inclination: {
    label: 'Inclination',
    quantity: 'angle',
    changes: ['inclinationRad'],
    valueOf: ({ mean }) => mean.inclinationRad,
    with: (_, value) => ({ inclinationRad: value }),
    domain: () => ({ from: 0, to: Math.PI }),
    reach: () => 5 * radPerDeg,
  },
  meanAltitude: {
    label: 'Mean altitude',
    quantity: 'length',
    changes: ['semiMajorAxisKm'],
    valueOf: ({ body, mean }) => mean.semiMajorAxisKm - body.equatorialRadiusKm,
    with: ({ body }, value) => ({ semiMajorAxisKm: body.equatorialRadiusKm + value }),
    domain: () => ({ from: 0, to: largestRadiusKm / 10 }),
    reach: ({ body, mean }) => around(mean.semiMajorAxisKm - body.equatorialRadiusKm),
  },
  perigeeAltitude: {
    label: 'Perigee altitude',
    quantity: 'length',
    changes: ['semiMajorAxisKm', 'eccentricity'],
    valueOf: ({ body, mean }) => perigeeAltitudeKm(body, mean),
    with: perigeeAtHeldApogee,
    domain: ({ body, mean }) => ({ from: 0, to: apogeeAltitudeKm(body, mean) }),
    reach: ({ body, mean }) => around(perigeeAltitudeKm(body, mean)),
  },
  eccentricity: {
    label: 'Eccentricity',
    quantity: 'ratio',
    changes: ['eccentricity'],
    valueOf: ({ mean }) => mean.eccentricity,
    with: (_, value) => ({ eccentricity: value }),
    domain: () => ({ from: 0, to: greatestEccentricity }),
    reach: ({ mean }) => Math.max(0.01, 0.5 * Math.min(mean.eccentricity, 1 - mean.eccentricity)),
  },
  perigee: {
    label: 'Argument of perigee',
    quantity: 'angle',
    changes: ['perigeeRad'],
    valueOf: ({ mean }) => mean.perigeeRad,
    with: (_, value) => ({ perigeeRad: value }),
    domain: turn,
    reach: () => twoPi,
  },
  node: {
    label: 'Node',
    quantity: 'angle',
    changes: ['nodeRad'],
    valueOf: ({ mean }) => mean.nodeRad,
    with: (_, value) => ({ nodeRad: value }),
    domain: turn,
    reach: () => twoPi,
  },
};

function perigeeAtHeldApogee({ body, mean }: ReadingPoint, value: number): Changes {
  const perigeeKm = body.equatorialRadiusKm + value;
  const apogeeKm = mean.semiMajorAxisKm * (1 + mean.eccentricity);
  return {
    semiMajorAxisKm: (perigeeKm + apogeeKm) / 2,
    eccentricity: Math.max(0, (apogeeKm - perigeeKm) / (apogeeKm + perigeeKm)),
  };
}

/** What an orbit's elements become with the element at a value (km, rad). */
export function sweptChanges(point: ReadingPoint, element: SweptElement, value: number): Changes {
  return sweptWords[element].with(point, value);
}

/** The mean elements with the element at a value (km, rad); null outside where it exists. */
export function meanWith(point: ReadingPoint, element: SweptElement, value: number): MeanElements | null {
  const { from, to } = sweptWords[element].domain(point);
  const slack = 1e-12 * Math.max(1, Math.abs(to));
  if (!(value >= from - slack && value <= to + slack)) return null;
  return { ...point.mean, ...sweptChanges(point, element, value) };
}

/** A range around the orbit, its ends round in a unit that is `perCore` times the core unit. */
export function startingRange(point: ReadingPoint, element: SweptElement, perCore: number): Ends {
  const words = sweptWords[element];
  const [middle, half] = [words.valueOf(point), words.reach(point)];
  const grain = 10 ** Math.floor(Math.log10(half * perCore)) / perCore;
  const { from, to } = words.domain(point);
  const low = Math.max(from, Math.round((middle - half) / grain) * grain);
  return { from: low, to: Math.max(low + grain, Math.min(to, Math.round((middle + half) / grain) * grain)) };
}
