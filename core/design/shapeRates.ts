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
}

export interface Shape {
  readonly semiMajorAxisKm: number;
  readonly eccentricity: number;
}

/** Rates of a shape (km); errors as `secularRates`. */
export function shapeRates(body: Body, theory: Theory, { semiMajorAxisKm, eccentricity }: Shape): ShapeRates {
  const at = (inclinationRad: number): SecularRates =>
    secularRates(body, meanAt({ semiMajorAxisKm, eccentricity }, inclinationRad), theory);
  const equator = at(0);
  const slant = at(Math.PI / 4);
  const pole = at(Math.PI / 2);
  // Ω̇/θ is c₁ + c₃θ²: at θ² = 1 and θ² = ½.
  const slantNode = slant.nodeRadPerS * Math.SQRT2;
  const node3 = 2 * (equator.nodeRadPerS - slantNode);
  const latitude = (rates: SecularRates) => rates.perigeeRadPerS + rates.meanAnomalyRadPerS;
  const [perigee2, perigee4] = evenTerms(equator.perigeeRadPerS, slant.perigeeRadPerS, pole.perigeeRadPerS);
  const [latitude2, latitude4] = evenTerms(latitude(equator), latitude(slant), latitude(pole));
  return {
    semiMajorAxisKm,
    eccentricity,
    node1: equator.nodeRadPerS - node3,
    node3,
    perigee0: pole.perigeeRadPerS,
    perigee2,
    perigee4,
    latitude0: latitude(pole),
    latitude2,
    latitude4,
  };
}

function meanAt({ semiMajorAxisKm, eccentricity }: Shape, inclinationRad: number): MeanElements {
  return { semiMajorAxisKm, eccentricity, inclinationRad, nodeRad: 0, perigeeRad: 0, meanAnomalyRad: 0 };
}

/** b and c of a + bθ² + cθ⁴ from its values at θ² = 1, ½ and 0. */
function evenTerms(one: number, half: number, zero: number): readonly [number, number] {
  const whole = one - zero;
  const part = half - zero;
  return [4 * part - whole, 2 * whole - 4 * part];
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

/** The size that rates of node and perigee have at this shape, rad/s: the node's at the equator. */
export function rateSize({ node1, node3 }: ShapeRates): number {
  return Math.abs(node1 + node3);
}
