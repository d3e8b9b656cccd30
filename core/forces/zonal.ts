/**
 * Acceleration by zonals: the gradient of U = −(μ/r) Σ J_n (R/r)^n P_n(z/r).
 *
 * With s = z/r and (n + 1) P_n + s P_n' = P'_{n+1},
 *   acceleration = (μ/r²) Σ J_n (R/r)^n (P'_{n+1} r̂ − P'_n ẑ),
 * so that the derivatives alone are needed. They follow n P'_{n+1} = (2n + 1) s P'_n − (n + 1) P'_{n−1}, which is stable
 * for |s| ≤ 1 and knows no pole.
 *
 * Sources: Kaula, Theory of Satellite Geodesy (1966), §1, for U; Abramowitz and Stegun, 22.7.3 with α = 3/2, for the
 * recursion.
 */
import type { Body } from '../bodies/body';
import { averagingPoints } from './averagingPoints';
import type { Force } from './force';

/** Degrees from first to last, both included. */
export interface ZonalDegrees {
  readonly from: number;
  readonly to: number;
}

/** Highest degree that the three levels use. */
export const highestZonalDegree = 14;

/**
 * The zonals of the body within the range; degrees that its gravity set lacks do not act.
 *
 * @throws Error where the range is not whole numbers with 2 ≤ from ≤ to.
 */
export function zonalForce(body: Body, { from, to }: ZonalDegrees): Force {
  if (!(Number.isInteger(from) && Number.isInteger(to) && from >= 2 && to >= from)) {
    throw new Error(`zonals need whole degrees with 2 ≤ from ≤ to, got ${from} to ${to}`);
  }
  const { muKm3PerS2: mu, radiusKm } = body;
  const degree = Math.min(to, body.zonals.length - 1);
  const zonals = Float64Array.from({ length: degree + 1 }, (_, n) => (n < from ? 0 : (body.zonals[n] ?? 0)));
  const rising = Float64Array.from({ length: degree + 1 }, (_, n) => (2 * n + 1) / n);
  const falling = Float64Array.from({ length: degree + 1 }, (_, n) => (n + 1) / n);
  const add = (sum: Float64Array, motion: Float64Array): void => {
    const x = motion[0] as number;
    const y = motion[1] as number;
    const z = motion[2] as number;
    const r2 = x * x + y * y + z * z;
    const r = Math.sqrt(r2);
    const s = z / r;
    const ratio = radiusKm / r;
    let power = ratio;
    let below = 1;
    let slope = 3 * s;
    let radial = 0;
    let axial = 0;
    for (let n = 2; n <= degree; n += 1) {
      const above = (rising[n] as number) * s * slope - (falling[n] as number) * below;
      power *= ratio;
      const size = power * (zonals[n] as number);
      radial += size * above;
      axial += size * slope;
      below = slope;
      slope = above;
    }
    const scale = mu / r2;
    const outward = (scale * radial) / r;
    sum[0] = (sum[0] as number) + outward * x;
    sum[1] = (sum[1] as number) + outward * y;
    sum[2] = (sum[2] as number) + outward * z - scale * axial;
  };
  return {
    id: 'zonals',
    add,
    averagingPoints: (_, eccentricity) => averagingPoints(Math.max(degree, 2), eccentricity),
  };
}
