/**
 * The semi-major axis that a state keeps, from its Brouwer mean elements.
 *
 * Mean elements have only the first-order terms of J2 taken out. What J3 and above, and J2², do within a revolution is
 * still in them: up to 60 m of a in low orbit, or 0.015° of a Sun-synchronous node after a year. Energy tells how much: it
 * is the same all along a true orbit, while along the states of one set of mean elements it swings by just that amount.
 * What the orbit keeps is a + (2a²/μ)(energy at this mean anomaly − its average over the revolution).
 *
 * For orbits that came from a state. Mean elements that were typed as a design's own are averages already.
 */
import type { Body } from '../bodies/body';
import { averagingPoints } from '../forces/averagingPoints';
import { zonalPotential } from '../forces/zonalPotential';
import type { MeanElements, StateVector } from '../orbit/elements';
import { stateFromMean } from '../orbit/meanState';

/** Mean elements (km, rad) with the a that the orbit keeps, in a field of zonals to a degree. */
export function steadyMean(body: Body, mean: MeanElements, zonalDegree: number): MeanElements {
  const potential = zonalPotential(body, { from: 2, to: zonalDegree });
  const energy = ({ positionKm, velocityKmPerS: [vx, vy, vz] }: StateVector): number => {
    const central = body.muKm3PerS2 / Math.hypot(...positionKm);
    return 0.5 * (vx * vx + vy * vy + vz * vz) - central - potential(positionKm);
  };
  const { semiMajorAxisKm: a, eccentricity: e } = mean;
  const points = 2 * averagingPoints(zonalDegree, e);
  let average = 0;
  for (let point = 0; point < points; point += 1) {
    const eccentric = (2 * Math.PI * point) / points;
    const meanAnomalyRad = eccentric - e * Math.sin(eccentric);
    const share = (1 - e * Math.cos(eccentric)) / points;
    average += share * energy(stateFromMean(body, { ...mean, meanAnomalyRad }));
  }
  const excess = energy(stateFromMean(body, mean)) - average;
  return { ...mean, semiMajorAxisKm: a + (2 * a * a * excess) / body.muKm3PerS2 };
}

/**
 * The other way: Brouwer mean elements whose state keeps the a given. An integration that is to follow a design's mean
 * elements, which are averages, starts from the state of these.
 */
export function meanOfSteady(body: Body, steady: MeanElements, zonalDegree: number): MeanElements {
  // The shift follows a by less than 1e-4 of itself: one step is enough.
  const shifted = steadyMean(body, steady, zonalDegree).semiMajorAxisKm;
  return { ...steady, semiMajorAxisKm: 2 * steady.semiMajorAxisKm - shifted };
}
