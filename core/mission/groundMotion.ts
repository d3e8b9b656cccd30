/** Where a mean orbit stands over the ground, by its argument of latitude u = ω + f. */
import type { Body } from '../bodies/body';
import { wrapTwoPi } from '../numerics/angles';
import type { MeanElements, Theory } from '../orbit/elements';
import { meanFromTrue, trueFromMean } from '../orbit/kepler';
import { stateFromMean } from '../orbit/meanState';
import { type SecularRates, secularRates } from '../orbit/secularRates';
import { stateFromElements } from '../orbit/state';

export interface GroundPoint {
  /** East, body-fixed, rad; not wrapped. */
  readonly longitudeRad: number;
  /** Geodetic, rad. */
  readonly latitudeRad: number;
}

export interface MotionRequest {
  readonly body: Body;
  readonly theory: Theory;
  readonly mean: MeanElements;
  readonly shortPeriod?: boolean;
}

export interface TrackMotion {
  readonly rates: SecularRates;
  /** At the epoch, in [0, 2π). */
  readonly startLatitudeArgumentRad: number;
  /** Argument of latitude so many seconds after the epoch, rising without wrapping. */
  readonly latitudeArgumentRad: (timeS: number) => number;
  /** Seconds after the epoch at which the (unwrapped) argument of latitude is reached. */
  readonly timeS: (latitudeArgumentRad: number) => number;
  /** The point below, the body having turned so far (rad) at the epoch. */
  readonly point: (latitudeArgumentRad: number, turnedAtEpochRad: number) => GroundPoint;
}

/** A start this close to the node is on it: rounding of ω + f. */
const onNodeRad = 1e-9;
const maxSteps = 60;

/** Needs a body with a known rotation; errors as `secularRates`. */
export function trackMotion({ body, theory, mean, shortPeriod = false }: MotionRequest): TrackMotion {
  const rates = secularRates(body, mean, theory);
  const { eccentricity: e, perigeeRad, meanAnomalyRad } = mean;
  const raw = perigeeRad + trueFromMean(meanAnomalyRad, e);
  const wrapped = wrapTwoPi(raw + onNodeRad) - onNodeRad;
  const turns = raw - wrapped;
  const elementsAt = (timeS: number): MeanElements => ({
    ...mean,
    nodeRad: mean.nodeRad + rates.nodeRadPerS * timeS,
    perigeeRad: perigeeRad + rates.perigeeRadPerS * timeS,
    meanAnomalyRad: meanAnomalyRad + rates.meanAnomalyRadPerS * timeS,
  });
  const latitudeArgumentRad = (timeS: number) => {
    const at = elementsAt(timeS);
    return at.perigeeRad + trueFromMean(at.meanAnomalyRad, e) - turns;
  };
  const timeAt = (latitudeArgument: number) => {
    let timeS = 0;
    // Perigee moves a thousandth as fast as the orbit turns: each step gains about three digits.
    for (let step = 0; step < maxSteps; step += 1) {
      const trueAnomaly = latitudeArgument + turns - perigeeRad - rates.perigeeRadPerS * timeS;
      const next = (meanFromTrue(trueAnomaly, e) - meanAnomalyRad) / rates.meanAnomalyRadPerS;
      const change = Math.abs(next - timeS);
      timeS = next;
      if (change <= 1e-15 * Math.abs(timeS) + 1e-9) break;
    }
    return timeS;
  };
  const point = (latitudeArgument: number, turnedAtEpochRad: number) => {
    const timeS = timeAt(latitudeArgument);
    const elements = elementsAt(timeS);
    const state = shortPeriod ? stateFromMean(body, elements) : stateFromElements(body.muKm3PerS2, elements);
    return pointBelow(body, state.positionKm, turnedAtEpochRad + (body.rotationRadPerS ?? Number.NaN) * timeS);
  };
  return {
    rates,
    startLatitudeArgumentRad: Math.abs(wrapped) <= onNodeRad ? 0 : wrapped,
    latitudeArgumentRad,
    timeS: timeAt,
    point,
  };
}

/**
 * Source: Bowring, Survey Review 23, 323 (1976), from memory: one step from the reduced latitude, good to 1e-8 rad
 * at any height on an ellipsoid as flat as the Earth's.
 */
function pointBelow(body: Body, [x, y, z]: readonly [number, number, number], turnedRad: number): GroundPoint {
  const equatorKm = body.equatorialRadiusKm;
  const poleKm = equatorKm * (1 - body.flattening);
  const e2 = body.flattening * (2 - body.flattening);
  const across = Math.hypot(x, y);
  const reduced = Math.atan2(z * equatorKm, across * poleKm);
  const north = z + (e2 / (1 - e2)) * poleKm * Math.sin(reduced) ** 3;
  const outward = across - e2 * equatorKm * Math.cos(reduced) ** 3;
  return { longitudeRad: Math.atan2(y, x) - turnedRad, latitudeRad: Math.atan2(north, outward) };
}
