/**
 * The periods of an orbit and of the ground below it.
 *
 * Source: Vallado, Fundamentals of Astrodynamics and Applications, 4th ed., section 11.4 (from memory);
 * rates from `secularRates`.
 */
import type { Body } from '../bodies/body';
import { twoPi } from '../numerics/angles';
import type { MeanElements, Theory } from './elements';
import { secularRates } from './secularRates';

export interface Periods {
  /** 2π/n: the two-body period of the mean semi-major axis. */
  readonly keplerianS: number;
  /** Perigee to perigee: 2π/Ṁ. */
  readonly anomalisticS: number;
  /** Ascending node to ascending node: 2π/(Ṁ + ω̇). */
  readonly nodalS: number;
  /** One turn of the body under the orbit plane: 2π/|ω_body − Ω̇|; null where the rotation is unknown. */
  readonly nodalDayS: number | null;
}

/** Periods in s of mean elements (km, rad). Errors as `secularRates`. */
export function periods(body: Body, mean: MeanElements, theory: Theory): Periods {
  const rates = secularRates(body, mean, theory);
  const a = mean.semiMajorAxisKm;
  return {
    keplerianS: twoPi * a * Math.sqrt(a / body.muKm3PerS2),
    anomalisticS: twoPi / rates.meanAnomalyRadPerS,
    nodalS: twoPi / (rates.meanAnomalyRadPerS + rates.perigeeRadPerS),
    nodalDayS: body.rotationRadPerS === null ? null : twoPi / Math.abs(body.rotationRadPerS - rates.nodeRadPerS),
  };
}
