/**
 * A reading: one number about an orbit that knows its unit, the method that made it and what the
 * inputs' errors do to it. Its working is `workingOf`, apart, since few readings are asked for it.
 */
import type { Body } from '../../bodies/body';
import type { MeanElements, Theory } from '../../orbit/elements';
import type { Quantity } from '../units';
import type { Doubt } from './doubt';

export type ReadingLevel = 'geometry' | 'first' | 'second';
/** What the reading is about, for hue and mark. */
export type ReadingMark = 'node' | 'perigee' | 'none';

/** What the reading changes by, in its core unit. */
export interface Sensitivities {
  /** For 1 km of semi-major axis. */
  readonly perKm: number;
  /** For 0.01° of inclination. */
  readonly perHundredthDegree: number;
  /** For 0.001 of eccentricity. */
  readonly perThousandth: number;
}

/** The same reading said another way. */
export interface Alternate {
  readonly label: string;
  readonly quantity: Quantity;
  readonly value: number;
  /** The display unit it is meant in, where the quantity has several. */
  readonly unit?: string;
}

export interface Reading {
  readonly id: ReadingId;
  readonly label: string;
  readonly symbol: string;
  readonly quantity: Quantity;
  /** In core units: km, s, rad, and hours for a local time. */
  readonly value: number;
  readonly level: ReadingLevel;
  readonly mark: ReadingMark;
  /** The reading by first and by second order; null where the orders do not differ by nature. */
  readonly orders: { readonly first: number; readonly second: number } | null;
  /** Null where the elements have no part in it. Worked out when asked for. */
  readonly sensitivities: () => Sensitivities | null;
  readonly alternates: readonly Alternate[];
  /** How wrong the method may be, as a rate now; null where no honest figure is known. */
  readonly doubt: Doubt | null;
  /** What has to be said beside the number. */
  readonly remark?: string;
}

/** What readings are worked out from. */
export interface ReadingPoint {
  readonly body: Body;
  readonly mean: MeanElements;
  readonly epochJd: number | null;
}

/** How one reading is worked out; the registry turns it into a `Reading`. */
export interface ReadingSpec {
  readonly id: ReadingId;
  readonly label: string;
  readonly symbol: string;
  readonly quantity: Quantity;
  readonly mark: ReadingMark;
  /** Whether the secular rates, and with them the order, come in. */
  readonly ordered: boolean;
  /** Why the reading cannot be given for this orbit, or null. */
  readonly missing?: (point: ReadingPoint) => string | null;
  readonly evaluate: (point: ReadingPoint, theory: Theory) => number;
  /** What to take differences of, where that costs less than the reading and has the same slope. */
  readonly slopeOf?: (point: ReadingPoint) => (point: ReadingPoint) => number;
  readonly alternates?: (point: ReadingPoint, value: number) => readonly Alternate[];
  readonly remark?: (point: ReadingPoint, value: number) => string | undefined;
  /** False where the elements a, i, e have no part. */
  readonly sensitive?: false;
}

export type ReadingId =
  | 'semiMajorAxis'
  | 'eccentricity'
  | 'inclination'
  | 'nodeAtEpoch'
  | 'perigeeAltitude'
  | 'apogeeAltitude'
  | 'leastHeight'
  | 'greatestHeight'
  | 'eCos'
  | 'eSin'
  | 'speedAtPerigee'
  | 'keplerianPeriod'
  | 'anomalisticPeriod'
  | 'nodalPeriod'
  | 'revolutionsPerDay'
  | 'revolutionsPerNodalDay'
  | 'westwardShift'
  | 'nodeRate'
  | 'perigeeRate'
  | 'apsidalPeriod'
  | 'localTimeDrift'
  | 'localTimeAscending'
  | 'localTimeDescending';
