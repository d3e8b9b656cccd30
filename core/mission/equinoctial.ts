/**
 * Equinoctial elements: regular at e = 0 and, with the sense chosen to suit, at i = 0 or i = 180°.
 *
 * Six numbers in a `Float64Array`, so that steps over a mission make no garbage:
 *   0 a (km), 1 h = e sin ϖ, 2 k = e cos ϖ, 3 p = t sin Ω, 4 q = t cos Ω, 5 λ = M + ϖ (rad),
 * with ϖ = ω + sense·Ω, t = tan(i/2) for sense 1 and cot(i/2) for sense −1.
 *
 * Frame: inertial equatorial. Source: Broucke and Cefola, Celest. Mech. 5, 303 (1972), with the retrograde factor as
 * sense (from memory).
 */
import { wrapTwoPi } from '../numerics/angles';
import type { KeplerianElements, MeanElements } from '../orbit/elements';

/** 1 is singular at i = 180° only, −1 at i = 0 only. */
export type Sense = 1 | -1;

/** The sense that keeps farthest from its singularity. */
export function senseOf(inclinationRad: number): Sense {
  return Math.cos(inclinationRad) >= 0 ? 1 : -1;
}

/** Equinoctial elements of Keplerian ones (km, rad). */
export function equinoctialFromElements(elements: KeplerianElements, sense: Sense): Float64Array {
  const { semiMajorAxisKm, eccentricity, inclinationRad, nodeRad, perigeeRad, meanAnomalyRad } = elements;
  const perigeeLongitude = perigeeRad + sense * nodeRad;
  const half = 0.5 * inclinationRad;
  const tilt = sense > 0 ? Math.tan(half) : Math.cos(half) / Math.sin(half);
  return Float64Array.of(
    semiMajorAxisKm,
    eccentricity * Math.sin(perigeeLongitude),
    eccentricity * Math.cos(perigeeLongitude),
    tilt * Math.sin(nodeRad),
    tilt * Math.cos(nodeRad),
    meanAnomalyRad + perigeeLongitude,
  );
}

/** Mean elements (km, rad) of equinoctial ones; node 0 where the plane is the equator, perigee 0 where e = 0. */
export function elementsFromEquinoctial(values: Float64Array, sense: Sense): MeanElements {
  const [a = Number.NaN, h = Number.NaN, k = Number.NaN, p = Number.NaN, q = Number.NaN, longitude = Number.NaN] =
    values;
  const tilt = Math.hypot(p, q);
  const nodeRad = tilt === 0 ? 0 : wrapTwoPi(Math.atan2(p, q));
  const eccentricity = Math.hypot(h, k);
  const perigeeRad = eccentricity === 0 ? 0 : wrapTwoPi(Math.atan2(h, k) - sense * nodeRad);
  return {
    semiMajorAxisKm: a,
    eccentricity,
    inclinationRad: sense > 0 ? 2 * Math.atan(tilt) : Math.PI - 2 * Math.atan(tilt),
    nodeRad,
    perigeeRad,
    meanAnomalyRad: wrapTwoPi(longitude - perigeeRad - sense * nodeRad),
  };
}
