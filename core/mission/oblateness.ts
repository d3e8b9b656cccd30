/**
 * Rates of equinoctial elements by oblateness in closed form: J2, and J2² with its long-period part.
 *
 * The secular part is Brouwer's (secularRates without J4). The long-period part follows from the term of his second-
 * order Hamiltonian that keeps the perigee,
 *   F = (3/16) n √(μa) γ2² (η⁻⁷ − η⁻⁵)(1 − 16θ² + 15θ⁴) cos 2ω,
 * found from his long-period variation of e, (γ2'/8) e η² (1 − 11θ² − 40θ⁴/(1 − 5θ²)) cos 2ω: Brouwer, Astron. J. 64,
 * 378 (1959), from memory; checked against integrated orbits. At small e it moves the eccentricity vector as much as
 * the secular J2² does, so one is not right without the other. Its rates are written so that nothing is divided by e.
 */
import type { Body } from '../bodies/body';
import { secularRates } from '../orbit/secularRates';
import { elementsFromEquinoctial, type Sense } from './equinoctial';
import { fillOrbitBasis } from './orbitBasis';

/** J2 alone, or J2 and J2². */
export type OblatenessOrder = 'first' | 'second';

/** Adds rates (km/s, 1/s, rad/s) to `rates`; the mean motion itself is not in them. */
export type AddOblateness = (rates: Float64Array, values: Float64Array) => void;

/** Rates by the body's J2 in closed form, to the order asked for. */
export function oblateness(body: Body, order: OblatenessOrder, sense: Sense): AddOblateness {
  const alone: Body = { ...body, zonals: [0, 0, body.zonals[2] ?? 0] };
  const basis = new Float64Array(9);
  return (rates, values) => {
    addSecular(rates, values, { body: alone, order, sense });
    if (order === 'second') addLongPeriod(rates, values, { body: alone, basis, sense });
  };
}

interface SecularSetting {
  readonly body: Body;
  readonly order: OblatenessOrder;
  readonly sense: Sense;
}

function addSecular(rates: Float64Array, values: Float64Array, { body, order, sense }: SecularSetting): void {
  const mean = elementsFromEquinoctial(values, sense);
  const { nodeRadPerS, perigeeRadPerS, meanAnomalyRadPerS } = secularRates(body, mean, order);
  const a = mean.semiMajorAxisKm;
  const longitudeRate = perigeeRadPerS + sense * nodeRadPerS;
  rates[1] = (rates[1] as number) + longitudeRate * (values[2] as number);
  rates[2] = (rates[2] as number) - longitudeRate * (values[1] as number);
  rates[3] = (rates[3] as number) + nodeRadPerS * (values[4] as number);
  rates[4] = (rates[4] as number) - nodeRadPerS * (values[3] as number);
  rates[5] = (rates[5] as number) + meanAnomalyRadPerS - Math.sqrt(body.muKm3PerS2 / a) / a + longitudeRate;
}

interface LongPeriodSetting {
  readonly body: Body;
  readonly basis: Float64Array;
  readonly sense: Sense;
}

function addLongPeriod(rates: Float64Array, values: Float64Array, { body, basis, sense }: LongPeriodSetting): void {
  const a = values[0] as number;
  const h = values[1] as number;
  const k = values[2] as number;
  fillOrbitBasis(basis, values, sense);
  // The body's axis in the orbit plane, of length sin i, and the eccentricity vector along and across it.
  const axisF = basis[2] as number;
  const axisG = basis[5] as number;
  const eSine = axisF * k + axisG * h;
  const eCosine = axisG * k - axisF * h;
  const eta2 = 1 - h * h - k * k;
  const eta = Math.sqrt(eta2);
  const gamma = 0.5 * (body.zonals[2] ?? 0) * (body.radiusKm / (a * eta2)) ** 2;
  const unit = 0.1875 * (Math.sqrt(body.muKm3PerS2 / a) / a) * gamma * gamma;
  // e² sin² i cos 2ω; τ = cos i counted from this sense's side, 1 where the plane is the equator.
  const double = eCosine * eCosine - eSine * eSine;
  const tau = sense * (basis[8] as number);
  const bracket = 1 - 15 * tau * tau;
  const stretch = 2 * unit * eta2 * bracket;
  const turn = (-unit * double * (((165 * tau + 105) * tau - 39) * tau - 7)) / (1 + tau);
  const longitude = ((5 * eta2 + 10 * eta + 7) / (1 + eta)) * bracket - slopeOfBracket(tau) / (1 + tau);
  rates[1] = (rates[1] as number) + stretch * (eCosine * axisG - eSine * axisF) + turn * k;
  rates[2] = (rates[2] as number) + stretch * (eSine * axisG + eCosine * axisF) - turn * h;
  rates[5] = (rates[5] as number) + unit * double * longitude;
  turnPlane(rates, values, { axisF, axisG, tau, sense, unit, double, product: eCosine * eSine });
}

/** Derivative of 1 − 16τ² + 15τ⁴. */
function slopeOfBracket(tau: number): number {
  return tau * (60 * tau * tau - 32);
}

interface Turn {
  readonly axisF: number;
  readonly axisG: number;
  readonly tau: number;
  readonly sense: Sense;
  readonly unit: number;
  readonly double: number;
  readonly product: number;
}

/** Turn of the plane about the node line (di/dt) and about the line across it (sin i times the node's rate). */
function turnPlane(rates: Float64Array, values: Float64Array, turn: Turn): void {
  const { axisF, axisG, tau, sense, unit, double, product } = turn;
  const sine2 = axisF * axisF + axisG * axisG;
  // In the equator the turn is zero, of the order of e² sin i.
  if (sine2 === 0) return;
  const aboutNode = (-4 * unit * sense * tau * (1 - 15 * tau * tau) * product) / sine2;
  const aboutAcross = (-unit * double * sense * slopeOfBracket(tau)) / sine2;
  const half = 0.5 * (1 + (values[3] as number) ** 2 + (values[4] as number) ** 2);
  rates[3] = (rates[3] as number) + half * (aboutAcross * axisG - aboutNode * axisF);
  rates[4] = (rates[4] as number) + half * sense * (aboutAcross * axisF + aboutNode * axisG);
}
