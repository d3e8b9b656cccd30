/**
 * Rates of the mean elements averaged over one revolution: the averaged level's right-hand side.
 *
 * Oblateness in closed form (J2, or J2 and J2²) plus Gauss's equations averaged for every force given. J2 is not
 * averaged numerically, because its square, which an average along the mean orbit cannot see, matters as much as J3.
 * Products of J2 with other forces are left out (about a thousandth of those forces) unless `coupling` brings them.
 */
import type { Body } from '../bodies/body';
import type { Force } from '../forces/force';
import type { Sense } from './equinoctial';
import { gaussAverage } from './gaussAverage';
import { type AddOblateness, type OblatenessOrder, oblateness } from './oblateness';

export interface AveragedModel {
  readonly body: Body;
  /** Of the equinoctial elements; keep the one chosen at the start over a whole history. */
  readonly sense: Sense;
  /** Closed-form oblateness; `none` where J2 is among the forces. */
  readonly oblateness: OblatenessOrder | 'none';
  /** Everything but J2, unless `oblateness` is `none`. */
  readonly forces: readonly Force[];
  /** Secular rates by products of J2 with the higher zonals. */
  readonly coupling?: AddOblateness | undefined;
}

/**
 * Fills `rates` with the time derivatives of the equinoctial elements `values` at `jd` (UTC): km/s, 1/s four times and
 * rad/s; the last contains the mean motion. Makes no garbage inside the revolution.
 */
export type AveragedRates = (rates: Float64Array, values: Float64Array, jd: number) => void;

/** Elements that are no closed orbit. */
export class NotAnOrbitError extends Error {
  constructor(values: Float64Array) {
    super(`averaged rates need a > 0, e < 1 and finite elements, got ${Array.from(values).join(', ')}`);
    this.name = 'NotAnOrbitError';
  }
}

/** The rates of a model. The call throws a NotAnOrbitError for e outside [0, 1), a ≤ 0 or elements that are not finite. */
export function averagedRates({ body, sense, oblateness: order, forces, coupling }: AveragedModel): AveragedRates {
  const addAverage = gaussAverage(body.muKm3PerS2, forces, sense);
  const addOblateness = order === 'none' ? null : oblateness(body, order, sense);
  return (rates, values, jd) => {
    const a = values[0] as number;
    const e2 = (values[1] as number) ** 2 + (values[2] as number) ** 2;
    if (!(a > 0 && e2 < 1 && Number.isFinite(a + (values[3] as number) + (values[4] as number)))) {
      throw new NotAnOrbitError(values);
    }
    rates.fill(0);
    rates[5] = Math.sqrt(body.muKm3PerS2 / a) / a;
    addOblateness?.(rates, values);
    coupling?.(rates, values);
    addAverage(rates, values, jd);
  };
}
