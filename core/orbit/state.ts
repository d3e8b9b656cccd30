/**
 * Osculating elements ↔ position and velocity, regular at e = 0, i = 0 and i = 180°.
 *
 * Frame: inertial equatorial. Source: Vallado, Fundamentals of Astrodynamics and Applications, 4th ed.,
 * algorithms 9 and 10 (from memory), in vector form so that no angle is taken where it has no meaning.
 */
import { combine, cross, dot, norm, scale, type Vec3 } from '../numerics/vectors';
import type { KeplerianElements, OsculatingElements, StateVector } from './elements';
import { eccentricFromMean } from './kepler';
import { elementsFromFrame, frameFromElements, type OrbitFrame } from './orbitFrame';

/** Position (km) and velocity (km/s) of the two-body orbit of these elements. */
export function stateFromElements(muKm3PerS2: number, elements: KeplerianElements): StateVector {
  return stateFromFrame(muKm3PerS2, frameFromElements(elements));
}

export type StateProblem = 'notFinite' | 'zero' | 'rectilinear' | 'hyperbolic';

export type ElementsResult<T> =
  | { readonly ok: true; readonly elements: T }
  | { readonly ok: false; readonly reason: StateProblem; readonly message: string };

/** Angular momentum below this share of r·v: the motion is a straight line for every purpose here. */
const rectilinearShare = 1e-8;

/** Osculating elements (km, rad) of a state (km, km/s), or the reason why there is no ellipse. */
export function elementsFromState(muKm3PerS2: number, state: StateVector): ElementsResult<OsculatingElements> {
  const frame = frameFromState(muKm3PerS2, state);
  if (!frame.ok) return frame;
  return { ok: true, elements: { ...elementsFromFrame(frame.elements), kind: 'osculating' } };
}

/** The same as an orbit frame, which keeps every digit at e = 0 and in the equator. */
export function frameFromState(muKm3PerS2: number, state: StateVector): ElementsResult<OrbitFrame> {
  const { positionKm: position, velocityKmPerS: velocity } = state;
  const r = norm(position);
  const v = norm(velocity);
  const problem = stateProblem(muKm3PerS2, r, v, norm(cross(position, velocity)));
  if (problem) return problem;
  const momentum = cross(position, velocity);
  const a = 1 / (2 / r - (v * v) / muKm3PerS2);
  const radial = scale(position, 1 / r);
  const normal = scale(momentum, 1 / norm(momentum));
  const transverse = cross(normal, radial);
  // e cos E and e sin E, from r = a(1 − e cos E) and r·v = √(μa) e sin E.
  const eCosE = 1 - r / a;
  const eSinE = dot(position, velocity) / Math.sqrt(muKm3PerS2 * a);
  const e2 = eCosE * eCosE + eSinE * eSinE;
  if (!(e2 < 1)) return failure('rectilinear', 'position and velocity point along one line: that is no orbit');
  // E − M = e sin E; true minus eccentric anomaly without dividing by e.
  const eta = Math.sqrt(1 - e2);
  const trueMinusEccentric = 2 * Math.atan2(eSinE, 1 + eta - eCosE);
  const trueMinusMean = trueMinusEccentric + eSinE;
  const cd = Math.cos(trueMinusMean);
  const sd = Math.sin(trueMinusMean);
  const ce = Math.cos(eSinE);
  const se = Math.sin(eSinE);
  return {
    ok: true,
    elements: {
      semiMajorAxisKm: a,
      eCosM: eCosE * ce + eSinE * se,
      eSinM: eSinE * ce - eCosE * se,
      along: combine(cd, radial, -sd, transverse),
      ahead: combine(sd, radial, cd, transverse),
      normal,
    },
  };
}

function stateProblem(mu: number, r: number, v: number, momentum: number): ElementsResult<never> | null {
  if (!(Number.isFinite(r) && Number.isFinite(v))) return failure('notFinite', 'position and velocity must be finite');
  if (r === 0 || v === 0)
    return failure('zero', `${r === 0 ? 'the position' : 'the velocity'} is zero: that is no orbit`);
  if (momentum < rectilinearShare * r * v) {
    return failure('rectilinear', 'position and velocity point along one line: that is no orbit');
  }
  const escapeKmPerS = Math.sqrt((2 * mu) / r);
  if (v >= escapeKmPerS) {
    return failure(
      'hyperbolic',
      `${v.toFixed(3)} km/s is at or above the escape speed ${escapeKmPerS.toFixed(3)} km/s at ${r.toFixed(1)} km: the orbit does not close`,
    );
  }
  return null;
}

function failure(reason: StateProblem, message: string): ElementsResult<never> {
  return { ok: false, reason, message };
}

/** State of an orbit frame, by way of its eccentric longitude; regular everywhere. */
export function stateFromFrame(muKm3PerS2: number, frame: OrbitFrame): StateVector {
  const e = Math.hypot(frame.eCosM, frame.eSinM);
  const meanAnomaly = e === 0 ? 0 : Math.atan2(frame.eSinM, frame.eCosM);
  const perigee: Vec3 = combine(Math.cos(meanAnomaly), frame.along, -Math.sin(meanAnomaly), frame.ahead);
  const aheadOfPerigee = cross(frame.normal, perigee);
  const anomaly = eccentricFromMean(meanAnomaly, e);
  const c = Math.cos(anomaly);
  const s = Math.sin(anomaly);
  const eta = Math.sqrt((1 - e) * (1 + e));
  const a = frame.semiMajorAxisKm;
  const speed = Math.sqrt(muKm3PerS2 / a) / (1 - e * c);
  return {
    positionKm: combine(a * (c - e), perigee, a * eta * s, aheadOfPerigee),
    velocityKmPerS: combine(-speed * s, perigee, speed * eta * c, aheadOfPerigee),
  };
}
