/**
 * What zonals add to the potential: U = −(μ/r) Σ J_n (R/r)^n P_n(z/r), km²/s²; the acceleration is its gradient.
 *
 * Source: Kaula, Theory of Satellite Geodesy (1966), §1; recursion n P_n = (2n − 1) s P_{n−1} − (n − 1) P_{n−2},
 * Abramowitz and Stegun, 22.7.10.
 */
import type { Body } from '../bodies/body';
import type { Vec3 } from '../numerics/vectors';
import type { ZonalDegrees } from './zonal';

/** The potential at a position (km, equatorial axes) by the zonals within the range that the body has. */
export function zonalPotential(body: Body, { from, to }: ZonalDegrees): (position: Vec3) => number {
  const { muKm3PerS2: mu, radiusKm, zonals } = body;
  const last = Math.min(to, zonals.length - 1);
  return ([x, y, z]) => {
    const r = Math.sqrt(x * x + y * y + z * z);
    const s = z / r;
    let power = radiusKm / r;
    let before = 1;
    let here = s;
    let sum = 0;
    for (let n = 2; n <= last; n += 1) {
      const next = ((2 * n - 1) * s * here - (n - 1) * before) / n;
      power *= radiusKm / r;
      if (n >= from) sum += (zonals[n] ?? 0) * power * next;
      before = here;
      here = next;
    }
    return (-mu / r) * sum;
  };
}
