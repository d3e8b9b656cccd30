/**
 * What a wish comes to: a number that the orbit has, the number it should have, and how to say both.
 *
 * The residual (measure − target)/scale is all that solving needs. `family` and the hints after it only say how a
 * condition is settled quickest; a new kind is one file beside this one, and one line in the registry.
 */
import type { Body } from '../../bodies/body';
import type { Theory } from '../../orbit/elements';
import type { ShapeRates } from '../shapeRates';

/**
 * What the condition turns on: the `node` or `perigee` rate (settled by inclination), a `period` (settled by a), an
 * `altitude` (a relation of a and e), or the `frozen` eccentricity.
 */
export type Family = 'node' | 'perigee' | 'period' | 'altitude' | 'frozen';

export interface Condition {
  readonly kind: string;
  /** For sentences: starts with a capital, no full stop. */
  readonly label: string;
  /** What has to hold, in the trade's symbols. */
  readonly formula: string;
  readonly family: Family;
  readonly target: number;
  /** The quantity of an orbit with θ = cos i, in the target's unit. */
  readonly measure: (shape: ShapeRates, theta: number) => number;
  /** What a residual is counted in, > 0, in the target's unit. */
  readonly scale: (shape: ShapeRates, theta: number) => number;
  /** The quantity with its unit, as read; on request with more digits than usual. */
  readonly write: (value: number, more?: number) => string;
  /** The quantity's name in the middle of a sentence. */
  readonly quantity: string;
  /** What was changed in reading the wish, in words. */
  readonly notes: readonly string[];
  /** `altitude`: the a (km) that meets it at an eccentricity, and the e at a semi-major axis (negative where none does). */
  readonly axisKmAt?: (eccentricity: number) => number;
  readonly eccentricityAt?: (semiMajorAxisKm: number) => number;
  /** `period`: a of the two-body orbit with it, km. */
  readonly axisGuessKm?: number;
  /** `frozen`: the eccentricity and perigee that hold at a and i, or why none does. */
  readonly settle?: (semiMajorAxisKm: number, inclinationRad: number) => Settled;
}

export type Settled =
  | {
      readonly ok: true;
      readonly eccentricity: number;
      readonly perigeeRad: number;
      /** How it came about, and what makes it less sure, as sentences. */
      readonly notes: readonly string[];
    }
  /** `converged`: it is known that there is none. */
  | { readonly ok: false; readonly converged: boolean; readonly text: string };

export interface ConditionContext {
  readonly body: Body;
  readonly theory: Theory;
}

export type Prepared =
  | { readonly ok: true; readonly condition: Condition }
  /** `badInput`: a number makes no sense; `missing`: the body lacks a constant. */
  | { readonly ok: false; readonly kind: 'badInput' | 'missing'; readonly text: string };

export function residualOf(condition: Condition, shape: ShapeRates, theta: number): number {
  return (condition.measure(shape, theta) - condition.target) / condition.scale(shape, theta);
}
