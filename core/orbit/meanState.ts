/**
 * Mean elements ↔ osculating state, both ways with Brouwer's first-order short-period J2 terms.
 *
 * The inverse is the exact inverse of the forward map, found by iteration, so a round trip returns its
 * start; what the first-order theory itself leaves out (about 13 m in a, median, in low orbit) is the
 * same both ways.
 */
import type { Body } from '../bodies/body';
import { add, cross, dot, norm, rotateBy, scale, type Vec3 } from '../numerics/vectors';
import type { KeplerianElements, MeanElements, StateVector } from './elements';
import { elementsFromFrame, frameFromElements, type OrbitFrame } from './orbitFrame';
import { osculatingFrame, shortPeriodVariation } from './shortPeriod';
import { frameFromState, type StateProblem, stateFromFrame } from './state';

/** Osculating state (km, km/s) of mean elements (km, rad), inertial equatorial frame. */
export function stateFromMean(body: Body, mean: MeanElements): StateVector {
  return stateFromFrame(body.muKm3PerS2, osculatingOf(body, frameFromElements(mean)));
}

function osculatingOf(body: Body, mean: OrbitFrame): OrbitFrame {
  const osculating = osculatingFrame(body, mean);
  if (!(osculating.semiMajorAxisKm > 0 && Math.hypot(osculating.eCosM, osculating.eSinM) < 1)) {
    throw new Error(`no osculating ellipse belongs to mean a ${mean.semiMajorAxisKm} km: J2 terms are too large there`);
  }
  return osculating;
}

export type ConversionProblem = StateProblem | 'notConverged';

export type MeanResult =
  | { readonly ok: true; readonly mean: MeanElements; readonly iterations: number }
  | { readonly ok: false; readonly reason: ConversionProblem; readonly message: string };

/** Why a state has no mean elements. */
export class ConversionError extends Error {
  constructor(
    readonly reason: ConversionProblem,
    message: string,
  ) {
    super(message);
    this.name = 'ConversionError';
  }
}

const maxIterations = 60;

/** Residual at which the iteration stops, relative to a and in rad: about 0.1 µm in low orbit. */
const tolerance = 2e-14;

/**
 * Mean elements (km, rad) of an osculating state (km, km/s), inertial equatorial frame.
 *
 * @throws ConversionError for a state without an ellipse, or where the iteration does not converge.
 */
export function meanFromState(body: Body, state: StateVector): MeanElements {
  const result = tryMeanFromState(body, state);
  if (!result.ok) throw new ConversionError(result.reason, result.message);
  return result.mean;
}

/** As `meanFromState`, with the failure as a result. */
export function tryMeanFromState(body: Body, state: StateVector): MeanResult {
  const osculating = frameFromState(body.muKm3PerS2, state);
  return osculating.ok ? meanFromFrame(body, osculating.elements) : osculating;
}

/** Mean elements (km, rad) of osculating elements (km, rad). */
export function tryMeanFromOsculating(body: Body, osculating: KeplerianElements): MeanResult {
  return meanFromFrame(body, frameFromElements(osculating));
}

/** Fixed-point iteration: move the mean orbit by what its osculating orbit misses the target. */
function meanFromFrame(body: Body, target: OrbitFrame): MeanResult {
  let mean = target;
  let best = Number.POSITIVE_INFINITY;
  for (let iterations = 1; iterations <= maxIterations; iterations += 1) {
    const variation = shortPeriodVariation(body, mean);
    const miss = missOf(target, mean, variation.rotation);
    const axis = target.semiMajorAxisKm - mean.semiMajorAxisKm - variation.semiMajorAxisKm;
    const eCosM = target.eCosM - mean.eCosM - variation.eCosM;
    const eSinM = target.eSinM - mean.eSinM - variation.eSinM;
    const size = Math.max(Math.abs(axis) / target.semiMajorAxisKm, Math.abs(eCosM), Math.abs(eSinM), norm(miss));
    // Stop at the tolerance, or where rounding keeps it from falling further.
    if (size <= tolerance || (size < 1e-12 && size >= best)) {
      return { ok: true, mean: { ...elementsFromFrame(mean), kind: 'mean' }, iterations };
    }
    best = Math.min(best, size);
    mean = moved(mean, axis, eCosM, eSinM, miss);
    if (!(mean.semiMajorAxisKm > 0 && Math.hypot(mean.eCosM, mean.eSinM) < 1)) break;
  }
  return {
    ok: false,
    reason: 'notConverged',
    message: `no mean elements found in ${maxIterations} steps: the short-period J2 terms are too large on this orbit`,
  };
}

/** Rotation vector (rad) that takes the osculating frame of `mean` to the target's. */
function missOf(target: OrbitFrame, mean: OrbitFrame, rotation: Vec3): Vec3 {
  const twist = add(
    add(cross(rotateBy(mean.along, rotation), target.along), cross(rotateBy(mean.ahead, rotation), target.ahead)),
    cross(rotateBy(mean.normal, rotation), target.normal),
  );
  return scale(twist, 0.5);
}

function moved(mean: OrbitFrame, axis: number, eCosM: number, eSinM: number, rotation: Vec3): OrbitFrame {
  const along = rotateBy(mean.along, rotation);
  const turned = rotateBy(mean.normal, rotation);
  // Keep the frame orthonormal against the drift of many small turns.
  const straight = add(turned, scale(along, -dot(turned, along)));
  const normal = scale(straight, 1 / norm(straight));
  const unit = scale(along, 1 / norm(along));
  return {
    semiMajorAxisKm: mean.semiMajorAxisKm + axis,
    eCosM: mean.eCosM + eCosM,
    eSinM: mean.eSinM + eSinM,
    along: unit,
    ahead: cross(normal, unit),
    normal,
  };
}
