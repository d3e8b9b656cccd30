/**
 * Heights above the ellipsoid good enough to shade a chart by: a hundredth of the work of `heightsAlongOrbit`.
 *
 * Radius of the mean ellipse with the first-order short-period J2 term of the radius (Brouwer 1959, from memory), less the
 * radius of the ellipsoid at that latitude. Good to 0.7 km on near-circular low orbits and to 2 km at
 * e = 0.7 (compared with `heightsAlongOrbit` in the tests).
 */
import type { Body } from '../bodies/body';
import { twoPi } from '../numerics/angles';
import type { MeanElements } from './elements';
import type { HeightRange } from './heights';

/** Even in the true anomaly, so that perigee and apogee are among them. */
const samples = 36;
const directions = Array.from({ length: samples }, (_, index) => {
  const angle = (index * twoPi) / samples;
  return { cos: Math.cos(angle), sin: Math.sin(angle) };
});

/** Least and greatest height (km) over one revolution, roughly. */
export function roughHeights(body: Body, mean: MeanElements): HeightRange {
  const { semiMajorAxisKm: a, eccentricity: e, inclinationRad, perigeeRad } = mean;
  const eta = Math.sqrt(1 - e * e);
  const p = a * (1 - e * e);
  const sin2I = Math.sin(inclinationRad) ** 2;
  const [cosW, sinW] = [Math.cos(perigeeRad), Math.sin(perigeeRad)];
  const j2Km = ((body.zonals[2] ?? 0) * body.radiusKm * body.radiusKm) / (4 * p);
  let leastKm = Number.POSITIVE_INFINITY;
  let greatestKm = Number.NEGATIVE_INFINITY;
  for (const { cos, sin } of directions) {
    const sinU = sin * cosW + cos * sinW;
    const bracket = (2 * eta) / (1 + e * cos) + (e * cos) / (1 + eta) + 1;
    const shortPeriodKm = j2Km * (sin2I * (1 - 2 * sinU * sinU) - (2 - 3 * sin2I) * bracket);
    const ellipsoidKm = body.equatorialRadiusKm * (1 - body.flattening * sin2I * sinU * sinU);
    const heightKm = p / (1 + e * cos) + shortPeriodKm - ellipsoidKm;
    if (heightKm < leastKm) leastKm = heightKm;
    if (heightKm > greatestKm) greatestKm = heightKm;
  }
  return { leastKm, greatestKm };
}
