/** What rules a frozen orbit out before anything is solved, and what makes one doubtful. */
import type { Body } from '../bodies/body';
import { degPerRad } from '../numerics/angles';
import { type NoFrozenOrbit, refuse } from './frozenResult';

export interface FrozenInput {
  readonly semiMajorAxisKm: number;
  readonly inclinationRad: number;
}

/** First order, 5 cos² i = 1: 63.4349° and its mirror. */
const criticalRad = Math.acos(Math.sqrt(0.2));

/**
 * Nearer than this the answer is refused. Known frozen orbits fly 2.6° away; 2.5° away the terms left out, about
 * J2 over the distance in radians, are still a twentieth of what holds the perigee.
 */
const refusedDeg = 2.5;
/** Nearer than this it is given with a caution: the long-period terms grow. */
const doubtfulDeg = 3.5;

/** J2 below this does not dominate the field. */
const weakOblateness = 5e-4;

/** Up to here each degree of the Earth's odd zonals still moves the answer near 66°. */
const settledDegree = 13;

/** The reason why no frozen orbit can be looked for; null where one can. */
export function frozenObstacle(body: Body, input: FrozenInput): NoFrozenOrbit | null {
  return badInput(input) ?? missingZonals(body) ?? placeObstacle(body, input);
}

function badInput({ semiMajorAxisKm: a, inclinationRad: i }: FrozenInput): NoFrozenOrbit | null {
  if (!(a > 0 && a < Infinity)) {
    return refuse('badInput', `the semi-major axis must be a positive number of km, got ${a}`);
  }
  if (!(i >= 0 && i <= Math.PI)) {
    return refuse('badInput', `the inclination must lie between 0° and 180°, got ${(i * degPerRad).toFixed(4)}°`);
  }
  return null;
}

function missingZonals(body: Body): NoFrozenOrbit | null {
  const known = (degree: number) => Number.isFinite(body.zonals[degree] ?? Number.NaN);
  if (!(known(2) && body.zonals[2] !== 0)) {
    return refuse('oblatenessUnknown', `J2 of ${body.name} is missing: without it nothing turns the perigee steadily`);
  }
  if (!known(3)) {
    return refuse(
      'oddZonalsUnknown',
      `the odd zonals of ${body.name} are missing (J3, then J5 to J13): they alone decide where a frozen perigee rests`,
    );
  }
  return null;
}

function placeObstacle(body: Body, { semiMajorAxisKm: a, inclinationRad: i }: FrozenInput): NoFrozenOrbit | null {
  if (a <= surfaceKm(body)) {
    const size = `a ${a.toFixed(1)} km, radius ${surfaceKm(body).toFixed(1)} km`;
    return refuse('insideBody', `the orbit lies inside ${body.name}: ${size}`);
  }
  const distance = criticalDistanceDeg(i);
  if (distance < refusedDeg) {
    return refuse(
      'criticalInclination',
      `the inclination is ${distance.toFixed(2)}° from the critical one (63.43° or 116.57°): J2 no longer turns the ` +
        `perigee there, and within ${refusedDeg}° no frozen eccentricity can be trusted`,
    );
  }
  return null;
}

/** Radius that a perigee must clear, km; the zonals' series needs their own reference radius cleared as well. */
export function surfaceKm(body: Body): number {
  return Math.max(body.equatorialRadiusKm, body.radiusKm);
}

/** Degrees between an inclination and the nearer critical one. */
function criticalDistanceDeg(inclinationRad: number): number {
  const folded = Math.min(inclinationRad, Math.PI - inclinationRad);
  return Math.abs(folded - criticalRad) * degPerRad;
}

export interface FrozenFound {
  readonly degree: number;
  /** A vector beside the frozen point goes round it. */
  readonly stable: boolean;
}

/** Sentences about an answer from zonals to `degree`. */
export function frozenCautions(body: Body, input: FrozenInput, { degree, stable }: FrozenFound): readonly string[] {
  const cautions: string[] = [];
  if (!stable) cautions.push('The balance is unstable: an eccentricity slightly off drifts away instead of round it.');
  const distance = criticalDistanceDeg(input.inclinationRad);
  if (distance < doubtfulDeg) {
    cautions.push(`The critical inclination is only ${distance.toFixed(2)}° away: long-period terms are large here.`);
  }
  if (degree < settledDegree) {
    const above = body.id === 'earth' ? ' At the Earth, near 66°, degrees 5 to 13 change the answer altogether.' : '';
    cautions.push(`${body.gravitySet} has zonals to degree ${degree} only.${above}`);
  }
  if (Math.abs(body.zonals[2] ?? 0) < weakOblateness) {
    cautions.push(`J2 does not dominate at ${body.name}: take this as a first guess.`);
  }
  return cautions;
}
