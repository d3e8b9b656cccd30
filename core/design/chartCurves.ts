/**
 * The curves of the rate chart: orbits of one shape that meet one condition, in inclination and mean altitude.
 *
 * Second order throughout (`secularRates`). With θ = cos i a node rate is c₁θ + c₃θ³, so that the inclination at an altitude
 * comes from a cubic, and the altitude at an inclination from a power law in a, both closed by Newton; the perigee's rate is
 * a quadratic in θ²; a repeat track gives a at each inclination, its pace falling nearly as a^(−3/2). Found numbers are
 * exact to rounding, so that a point snapped to a curve meets the condition itself.
 */
import type { Body } from '../bodies/body';
import { secondsPerDay, twoPi } from '../numerics/angles';
import { type ChartShape, eccentricityAt } from './chartShape';
import { latitudeRateAt, nodeRateAt, type ShapeRates, shapeRates, shapeRatesAt } from './shapeRates';

export type ChartCondition =
  | { readonly kind: 'sunSynchronous' }
  | { readonly kind: 'polar' }
  /** The perigee stands still; `side` tells the inclination below 90° (−1) from the one above (+1). */
  | { readonly kind: 'critical'; readonly side: -1 | 1 }
  | { readonly kind: 'nodeRate'; readonly radPerS: number }
  | { readonly kind: 'repeat'; readonly revolutions: number; readonly days: number };

export interface ChartCurve {
  readonly condition: ChartCondition;
  /** Inclination (rad) at a mean altitude (km); null where no orbit there meets the condition. */
  readonly inclinationAt: ((altitudeKm: number) => number | null) | null;
  /** Mean altitude (km) at an inclination (rad); null where none does. */
  readonly altitudeAt: ((inclinationRad: number) => number | null) | null;
  /** Mean altitude (km) above which no inclination meets the condition; null where it has no such end. */
  readonly endAltitudeKm: number | null;
}

/** Null where the body lacks what the condition needs (a year, a rotation, a J2), or N or D is no whole number from 1. */
export function chartCurve(body: Body, shape: ChartShape, condition: ChartCondition): ChartCurve | null {
  if ((body.zonals[2] ?? 0) === 0 && condition.kind !== 'polar') return null;
  switch (condition.kind) {
    case 'polar':
      return { condition, inclinationAt: () => Math.PI / 2, altitudeAt: null, endAltitudeKm: null };
    case 'critical':
      return critical(body, shape, condition);
    case 'sunSynchronous':
      return body.yearDays === null
        ? null
        : nodeCurve(body, shape, { condition, radPerS: twoPi / (body.yearDays * secondsPerDay) });
    case 'nodeRate':
      return nodeCurve(body, shape, { condition, radPerS: condition.radPerS });
    case 'repeat':
      return body.rotationRadPerS ? repeatCurve(body, shape, condition) : null;
  }
}

function ratesAt(body: Body, shape: ChartShape, altitudeKm: number): ShapeRates | null {
  const eccentricity = eccentricityAt(body, shape, altitudeKm);
  if (eccentricity === null) return null;
  return shapeRates(body, 'second', { semiMajorAxisKm: body.equatorialRadiusKm + altitudeKm, eccentricity });
}

function critical(
  body: Body,
  shape: ChartShape,
  condition: ChartCondition & { readonly kind: 'critical' },
): ChartCurve {
  const inclinationAt = (altitudeKm: number) => {
    const rates = ratesAt(body, shape, altitudeKm);
    if (!rates) return null;
    const { perigee0, perigee2, perigee4 } = rates;
    // The root near θ² = 1/5, in the form that stays exact where the fourth power is small.
    const root = Math.sqrt(perigee2 * perigee2 - 4 * perigee4 * perigee0);
    const square = (-2 * perigee0) / (perigee2 + Math.sign(perigee2) * root);
    return square >= 0 && square <= 1 ? Math.acos(-condition.side * Math.sqrt(square)) : null;
  };
  return { condition, inclinationAt, altitudeAt: null, endAltitudeKm: null };
}

interface NodeWish {
  readonly condition: ChartCondition;
  readonly radPerS: number;
}

const mostSteps = 60;
/** Shares of θ, and of a, that are rounding. */
const rounding = 4e-16;
const close = 1e-14;

function nodeCurve(body: Body, shape: ChartShape, { condition, radPerS }: NodeWish): ChartCurve {
  const inclinationAt = (altitudeKm: number) => {
    const rates = ratesAt(body, shape, altitudeKm);
    return rates && inclinationOf(rates, radPerS);
  };
  const altitudeAt = (inclinationRad: number) => altitudeOf(body, shape, { radPerS, inclinationRad });
  // Retrograde orbits turn the node forwards where J2 is that of an oblate body.
  const fastest = radPerS * (body.zonals[2] ?? 0) > 0 ? Math.PI : 0;
  return { condition, inclinationAt, altitudeAt, endAltitudeKm: radPerS === 0 ? null : altitudeAt(fastest) };
}

/** c₁θ + c₃θ³ = rate for the θ nearest to polar. */
function inclinationOf({ node1, node3 }: ShapeRates, radPerS: number): number | null {
  let theta = radPerS / node1;
  for (let step = 0; step < mostSteps; step += 1) {
    const change = (theta * (node1 + node3 * theta * theta) - radPerS) / (node1 + 3 * node3 * theta * theta);
    theta -= change;
    if (!(Math.abs(change) > rounding * Math.abs(theta))) break;
  }
  // At the curve's very end rounding may step past the equator.
  if (Math.abs(theta) > 1 && Math.abs(theta) < 1 + 1e-13) return theta > 0 ? 0 : Math.PI;
  return Math.abs(theta) <= 1 ? Math.acos(theta) : null;
}

interface NodePoint {
  readonly radPerS: number;
  readonly inclinationRad: number;
}

/** The node's rate falls with a, as a^(−7/2) at a held e: Newton in the logarithms, with the slope from the last step. */
function altitudeOf(body: Body, shape: ChartShape, { radPerS, inclinationRad }: NodePoint): number | null {
  const theta = Math.cos(inclinationRad);
  if (Math.abs(theta) < 1e-9) return null;
  const radiusKm = body.equatorialRadiusKm;
  const rateAt = (axisKm: number) => {
    const eccentricity = eccentricityAt(body, shape, axisKm - radiusKm);
    if (eccentricity === null) return null;
    const rates = shapeRatesAt(body, 'second', { semiMajorAxisKm: axisKm, eccentricity }, inclinationRad);
    return nodeRateAt(rates, theta);
  };
  let axisKm = firstAxisKm(body, shape);
  let slope = -3.5;
  for (let step = 0; step < mostSteps; step += 1) {
    const share = (rateAt(axisKm) ?? Number.NaN) / radPerS;
    if (!(share > 0)) return null;
    const change = -Math.log(share) / slope;
    if (Math.abs(change) < close) return axisKm - radiusKm;
    const nextKm = axisKm * Math.exp(Math.min(1.5, Math.max(-1.5, change)));
    const next = (rateAt(nextKm) ?? Number.NaN) / radPerS;
    const steeper = Math.log(next / share) / Math.log(nextKm / axisKm);
    if (steeper < -1 && steeper > -8) slope = steeper;
    axisKm = nextKm;
  }
  return axisKm - radiusKm;
}

/** A first a (km) at which the shape exists. */
function firstAxisKm(body: Body, shape: ChartShape): number {
  const lowestKm = shape.kind === 'perigeeAltitude' ? body.equatorialRadiusKm + shape.km : 0;
  return Math.max(1.1 * body.equatorialRadiusKm, 1.05 * lowestKm);
}

function repeatCurve(
  body: Body,
  shape: ChartShape,
  condition: ChartCondition & { readonly kind: 'repeat' },
): ChartCurve | null {
  const spin = body.rotationRadPerS ?? Number.NaN;
  const { revolutions, days } = condition;
  if (![revolutions, days].every((count) => Number.isInteger(count) && count >= 1)) return null;
  const pace = revolutions / days;
  const radiusKm = body.equatorialRadiusKm;
  const guessKm = Math.cbrt(body.muKm3PerS2 / (pace * spin) ** 2);
  if (!(guessKm > 0 && Number.isFinite(guessKm))) return null;
  const altitudeAt = (inclinationRad: number) => {
    const theta = Math.cos(inclinationRad);
    let axisKm = guessKm;
    for (let step = 0; step < mostSteps; step += 1) {
      const eccentricity = eccentricityAt(body, shape, axisKm - radiusKm);
      if (eccentricity === null) return null;
      const rates = shapeRatesAt(body, 'second', { semiMajorAxisKm: axisKm, eccentricity }, inclinationRad);
      // Revolutions from node to node for a turn of the ground under the plane.
      const share = latitudeRateAt(rates, theta) / Math.abs(spin - nodeRateAt(rates, theta)) / pace;
      if (!(share > 0)) return null;
      // What is left shrinks by a factor of about J2 a step.
      axisKm *= share ** (2 / 3);
      if (Math.abs(share - 1) < close) return axisKm - radiusKm;
    }
    return null;
  };
  return { condition, inclinationAt: null, altitudeAt, endAltitudeKm: null };
}
