/**
 * Secular rates of node, perigee and mean anomaly: the closed form.
 *
 * First order: J2 alone. Second order: J2 + J2² + J4. Valid for 0 ≤ e < 1, any inclination; second
 * order lacks J6 and above, and neither knows Sun, Moon or drag. Near the critical inclination the
 * rates stay right while long-period terms, left out here, grow.
 *
 * Sources: Kozai, Astron. J. 64, 367 (1959); Brouwer, Astron. J. 64, 378 (1959), the secular parts of
 * his final formulas for g, h and l.
 */
import type { Body } from '../bodies/body';
import type { MeanElements, Theory } from './elements';

export interface SecularRates {
  readonly nodeRadPerS: number;
  readonly perigeeRadPerS: number;
  readonly meanAnomalyRadPerS: number;
}

/**
 * Rates now, of mean elements (km, rad), in the inertial equatorial frame of the body.
 *
 * @throws Error where the elements are marked osculating, e is outside [0, 1), a ≤ 0, or a or i is not finite.
 */
export function secularRates(body: Body, mean: MeanElements, theory: Theory): SecularRates {
  if (mean.kind !== undefined && mean.kind !== 'mean') {
    throw new Error(`secular rates need mean elements, got ${String(mean.kind)}`);
  }
  const { semiMajorAxisKm: a, eccentricity: e, inclinationRad: i } = mean;
  if (!(a > 0 && a < Infinity && e >= 0 && e < 1 && Number.isFinite(i))) {
    throw new Error(`secular rates need a > 0, 0 ≤ e < 1 and finite a and i, got a ${a}, e ${e}, i ${i}`);
  }
  return theory === 'first' ? firstOrder(body, mean) : secondOrder(body, mean);
}

function firstOrder(body: Body, mean: MeanElements): SecularRates {
  const { semiMajorAxisKm: a, eccentricity: e } = mean;
  const theta = Math.cos(mean.inclinationRad);
  const theta2 = theta * theta;
  const eta2 = 1 - e * e;
  const n = Math.sqrt(body.muKm3PerS2 / a) / a;
  const ratio = body.radiusKm / (a * eta2);
  const k = 1.5 * n * (body.zonals[2] ?? 0) * ratio * ratio;
  return {
    nodeRadPerS: -k * theta,
    perigeeRadPerS: 0.5 * k * (5 * theta2 - 1),
    meanAnomalyRadPerS: n + 0.5 * k * Math.sqrt(eta2) * (3 * theta2 - 1),
  };
}

function secondOrder(body: Body, mean: MeanElements): SecularRates {
  const { semiMajorAxisKm: a, eccentricity: e } = mean;
  const theta = Math.cos(mean.inclinationRad);
  const theta2 = theta * theta;
  const theta4 = theta2 * theta2;
  const e2 = e * e;
  const eta2 = 1 - e2;
  const eta = Math.sqrt(eta2);
  const n = Math.sqrt(body.muKm3PerS2 / a) / a;
  const ratio = body.radiusKm / (a * eta2);
  const ratio2 = ratio * ratio;
  const gamma2 = 0.5 * (body.zonals[2] ?? 0) * ratio2;
  const gamma4 = -0.375 * (body.zonals[4] ?? 0) * ratio2 * ratio2;
  const square = gamma2 * gamma2;
  // Brouwer's brackets beside γ2'², as polynomials in θ².
  const node = -5 + 12 * eta + 9 * eta2 + (-35 - 36 * eta - 5 * eta2) * theta2;
  const perigee0 = -35 + 24 * eta + 25 * eta2;
  const perigee = perigee0 + (90 - 192 * eta - 126 * eta2) * theta2 + (385 + 360 * eta + 45 * eta2) * theta4;
  const anomaly0 = -15 + 16 * eta + 25 * eta2;
  const anomaly = anomaly0 + (30 - 96 * eta - 90 * eta2) * theta2 + (105 + 144 * eta + 25 * eta2) * theta4;
  // And those beside γ4'.
  const node4 = (5 - 3 * eta2) * (3 - 7 * theta2);
  const perigee4 = 21 - 9 * eta2 + (-270 + 126 * eta2) * theta2 + (385 - 189 * eta2) * theta4;
  const anomaly4 = e2 * (3 - 30 * theta2 + 35 * theta4);
  return {
    nodeRadPerS: n * theta * (-3 * gamma2 + 0.375 * square * node + 1.25 * gamma4 * node4),
    perigeeRadPerS: n * (1.5 * gamma2 * (5 * theta2 - 1) + 0.09375 * square * perigee + 0.3125 * gamma4 * perigee4),
    meanAnomalyRadPerS:
      n * (1 + eta * (1.5 * gamma2 * (3 * theta2 - 1) + 0.09375 * square * anomaly + 0.9375 * gamma4 * anomaly4)),
  };
}
