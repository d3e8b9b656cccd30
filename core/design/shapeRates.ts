/**
 * The secular rates of one shape of orbit (a and e) at every inclination at once.
 *
 * With θ = cos i, closed form of either order is a polynomial in θ: node c₁θ + c₃θ³, perigee and mean anomaly even and of
 * fourth degree (Kozai 1959; Brouwer 1959; see `secularRates`). Three inclinations therefore give all of them, exactly up
 * to rounding. Solving for an inclination becomes solving a polynomial, and a cos i beyond ±1 can be named instead of lost.
 */
import type { Body } from '../bodies/body';
import type { MeanElements, Theory } from '../orbit/elements';
import { type SecularRates, secularRates } from '../orbit/secularRates';

export interface ShapeRates {
  readonly semiMajorAxisKm: number;
  readonly eccentricity: number;
  /** rad/s beside θ and θ³. */
  readonly node1: number;
  readonly node3: number;
  /** rad/s beside 1, θ² and θ⁴. */
  readonly perigee0: number;
  readonly perigee2: number;
  readonly perigee4: number;
  /** The same of the mean argument of latitude, ω + M: what passes the node. */
  readonly latitude0: number;
  readonly latitude2: number;
  readonly latitude4: number;
  /** The size that rates of node and perigee have at this shape, rad/s. */
  readonly size: number;
}

export interface Shape {
  readonly semiMajorAxisKm: number;
  readonly eccentricity: number;
}

const slantRad = Math.PI / 4;
const poleRad = Math.PI / 2;

/** Rates of a shape (km); errors as `secularRates`. */
export function shapeRates(body: Body, theory: Theory, shape: Shape): ShapeRates {
  const equator = secularRates(body, meanAt(shape, 0), theory);
  const pole = secularRates(body, meanAt(shape, poleRad), theory);
  // First order has no fourth powers: halfway in θ² is the mean of both ends.
  const slant = theory === 'first' ? halfway(equator, pole) : secularRates(body, meanAt(shape, slantRad), theory);
  // Ω̇/θ is c₁ + c₃θ²: at θ² = 1 and θ² = ½.
  const node3 = 2 * (equator.nodeRadPerS - slant.nodeRadPerS * Math.SQRT2);
  const perigee4 = quartic(equator.perigeeRadPerS, slant.perigeeRadPerS, pole.perigeeRadPerS);
  const latitude0 = latitudeOf(pole);
  const latitude4 = quartic(latitudeOf(equator), latitudeOf(slant), latitude0);
  return {
    semiMajorAxisKm: shape.semiMajorAxisKm,
    eccentricity: shape.eccentricity,
    node1: equator.nodeRadPerS - node3,
    node3,
    perigee0: pole.perigeeRadPerS,
    perigee2: equator.perigeeRadPerS - pole.perigeeRadPerS - perigee4,
    perigee4,
    latitude0,
    latitude2: latitudeOf(equator) - latitude0 - latitude4,
    latitude4,
    size: Math.abs(equator.nodeRadPerS),
  };
}

/** The same, true at one inclination (rad) only, for a third of the work: for searches that hold it. */
export function shapeRatesAt(body: Body, theory: Theory, shape: Shape, inclinationRad: number): ShapeRates {
  const rates = secularRates(body, meanAt(shape, inclinationRad), theory);
  const { semiMajorAxisKm: a, eccentricity: e } = shape;
  const ratio = body.radiusKm / (a * (1 - e * e));
  return {
    semiMajorAxisKm: a,
    eccentricity: e,
    node1: rates.nodeRadPerS / Math.cos(inclinationRad),
    node3: 0,
    perigee0: rates.perigeeRadPerS,
    perigee2: 0,
    perigee4: 0,
    latitude0: latitudeOf(rates),
    latitude2: 0,
    latitude4: 0,
    size: 1.5 * Math.sqrt(body.muKm3PerS2 / a / a / a) * Math.abs(body.zonals[2] ?? 0) * ratio * ratio,
  };
}

function latitudeOf(rates: SecularRates): number {
  return rates.perigeeRadPerS + rates.meanAnomalyRadPerS;
}

function halfway(one: SecularRates, other: SecularRates): SecularRates {
  return {
    nodeRadPerS: one.nodeRadPerS * Math.SQRT1_2,
    perigeeRadPerS: (one.perigeeRadPerS + other.perigeeRadPerS) / 2,
    meanAnomalyRadPerS: (one.meanAnomalyRadPerS + other.meanAnomalyRadPerS) / 2,
  };
}

function meanAt({ semiMajorAxisKm, eccentricity }: Shape, inclinationRad: number): MeanElements {
  return { semiMajorAxisKm, eccentricity, inclinationRad, nodeRad: 0, perigeeRad: 0, meanAnomalyRad: 0 };
}

/** c of a + bθ² + cθ⁴ from its values at θ² = 1, ½ and 0. */
function quartic(one: number, half: number, zero: number): number {
  return 2 * (one - zero) - 4 * (half - zero);
}

/** rad/s at θ = cos i. */
export function nodeRateAt({ node1, node3 }: ShapeRates, theta: number): number {
  return theta * (node1 + node3 * theta * theta);
}

/** rad/s at θ = cos i. */
export function perigeeRateAt({ perigee0, perigee2, perigee4 }: ShapeRates, theta: number): number {
  const theta2 = theta * theta;
  return perigee0 + theta2 * (perigee2 + theta2 * perigee4);
}

/** Rate of ω + M, rad/s, at θ = cos i. */
export function latitudeRateAt({ latitude0, latitude2, latitude4 }: ShapeRates, theta: number): number {
  const theta2 = theta * theta;
  return latitude0 + theta2 * (latitude2 + theta2 * latitude4);
}
