/**
 * How fast the ground turns under an orbit, along a line of orbits of growing a.
 *
 * The track closes after N revolutions and D nodal days where N nodal periods fill D nodal days, that is where the number
 * of nodal days in a revolution (ω_body − Ω̇)/(Ṁ + ω̇) is D/N, or −D/N on a retrograde rotator. The number is kept with its
 * sign, so that it stays smooth where the node keeps up with the body. Source: Vallado, Fundamentals of Astrodynamics and
 * Applications, 4th ed., section 11.4.2 (from memory).
 */
import type { Body } from '../bodies/body';
import { secondsPerDay, twoPi } from '../numerics/angles';
import type { Theory } from '../orbit/elements';
import { type SecularRates, secularRates } from '../orbit/secularRates';
import type { TrackInclination } from './repeatProblem';

export interface TrackPoint {
  readonly semiMajorAxisKm: number;
  readonly inclinationRad: number;
  /** Nodal days in a nodal period, negative where the ground moves west under the orbit plane. */
  readonly daysPerRevolution: number;
}

/** The orbit of this a (km) on the line, or null where there is none. */
export type TrackCurve = (semiMajorAxisKm: number) => TrackPoint | null;

export interface CurveRequest {
  readonly body: Body;
  readonly theory: Theory;
  readonly eccentricity: number;
  readonly inclination: TrackInclination;
}

/** Needs a body with a rotation, and with a year where the inclination is Sun-synchronous. */
export function trackCurve(request: CurveRequest): TrackCurve {
  const { body, inclination } = request;
  const rotationRadPerS = body.rotationRadPerS ?? Number.NaN;
  return (semiMajorAxisKm) => {
    const inclinationRad =
      inclination.kind === 'fixed' ? inclination.rad : sunSynchronousAt(request, semiMajorAxisKm).inclinationRad;
    if (inclinationRad === null) return null;
    const rates = ratesAt(request, semiMajorAxisKm, inclinationRad);
    const latitudeRadPerS = rates.meanAnomalyRadPerS + rates.perigeeRadPerS;
    if (!(latitudeRadPerS > 0)) return null;
    const daysPerRevolution = (rotationRadPerS - rates.nodeRadPerS) / latitudeRadPerS;
    return { semiMajorAxisKm, inclinationRad, daysPerRevolution };
  };
}

type RateRequest = Pick<CurveRequest, 'body' | 'theory' | 'eccentricity'>;

function ratesAt({ body, theory, eccentricity }: RateRequest, a: number, inclinationRad: number): SecularRates {
  const mean = { semiMajorAxisKm: a, eccentricity, inclinationRad, nodeRad: 0, perigeeRad: 0, meanAnomalyRad: 0 };
  return secularRates(body, mean, theory);
}

export interface SunSynchronous {
  /** null where no inclination turns the node fast enough. */
  readonly inclinationRad: number | null;
  /** The cosine that would be needed; beyond ±1 where there is none. */
  readonly cosine: number;
}

/**
 * The Sun-synchronous inclination at a (km), the one nearest to polar.
 *
 * The closed form's node rate is c₁θ + c₃θ³ in θ = cos i, in either order, so two inclinations give all of it. Beyond the θ
 * at which it is fastest (short of the equator only where J4 rivals J2) there may be a second orbit, left out here.
 */
export function sunSynchronousAt(request: RateRequest, semiMajorAxisKm: number): SunSynchronous {
  const wanted = twoPi / ((request.body.yearDays ?? Number.NaN) * secondsPerDay);
  const equator = ratesAt(request, semiMajorAxisKm, 0).nodeRadPerS;
  // cos 60° = ½
  const half = ratesAt(request, semiMajorAxisKm, Math.PI / 3).nodeRadPerS;
  const cubic = (equator - 2 * half) / 0.75;
  const linear = equator - cubic;
  const sign = linear < 0 ? -1 : 1;
  const size = solveRising({ linear: sign * linear, cubic: sign * cubic, wanted });
  return { inclinationRad: size <= 1 ? Math.acos(sign * size) : null, cosine: sign * size };
}

interface Rising {
  readonly linear: number;
  readonly cubic: number;
  readonly wanted: number;
}

const newtonSteps = 60;

/** x ≥ 0 with linear x + cubic x³ = wanted; past its reach, how many times too slow the fastest is (> 1). */
function solveRising({ linear, cubic, wanted }: Rising): number {
  const end = linear + 3 * cubic >= 0 ? 1 : Math.sqrt(-linear / (3 * cubic));
  const fastest = end * (linear + cubic * end * end);
  if (!(fastest >= wanted)) return fastest > 0 ? wanted / fastest : Number.POSITIVE_INFINITY;
  // Either convex from the right or concave from the left: Newton's steps go one way and never pass the root.
  let x = Math.min(end, wanted / linear);
  for (let step = 0; step < newtonSteps; step += 1) {
    const change = (x * (linear + cubic * x * x) - wanted) / (linear + 3 * cubic * x * x);
    if (!(Math.abs(change) > 4e-16 * x)) break;
    x -= change;
  }
  return Math.min(x, end);
}
