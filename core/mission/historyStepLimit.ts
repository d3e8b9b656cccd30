/** How long a step of a history may be, and the axes that turn with it. */
import { scaleHeightKm } from '../bodies/atmosphere';
import type { Body } from '../bodies/body';
import { secularRates } from '../orbit/secularRates';
import type { AxesTurn } from './averagedStep';
import { elementsFromEquinoctial, type Sense } from './equinoctial';

export interface StepLimit {
  readonly lengthS: number;
  readonly turn: AxesTurn;
}

export interface StepSetting {
  readonly body: Body;
  readonly sense: Sense;
  /** Equinoctial elements, and their rates in inertial axes. */
  readonly values: Float64Array;
  readonly rates: Float64Array;
  readonly drags: boolean;
  readonly longestS: number;
}

/** Perigee's height (km) above the equatorial radius, of mean elements. */
export function perigeeHeightKm(body: Body, values: Float64Array): number {
  const eccentricity = Math.hypot(values[1] as number, values[2] as number);
  return (values[0] as number) * (1 - eccentricity) - body.equatorialRadiusKm;
}

/** Apogee's distance (km) from the centre, of mean elements. */
export function apogeeKm(values: Float64Array): number {
  return (values[0] as number) * (1 + Math.hypot(values[1] as number, values[2] as number));
}

/** Turn (rad) of perigee or node within a step: forces that see it turn are then good to 1e-6 of themselves. */
const mostTurnRad = 0.5;

/** Share of the scale height that perigee, or the steepness of the fall from it, may move by within a step. */
const mostFall = 0.2;

/** Perigee height (km) above which drag is too weak to ask for short steps. */
const airlessKm = 1500;

export function stepLimit({ body, sense, values, rates, drags, longestS }: StepSetting): StepLimit {
  const mean = elementsFromEquinoctial(values, sense);
  const { nodeRadPerS, perigeeRadPerS } = secularRates(body, mean, 'second');
  const fastest = Math.max(Math.abs(nodeRadPerS), Math.abs(perigeeRadPerS));
  const turn = { perigeeLongitudeRadPerS: perigeeRadPerS + sense * nodeRadPerS, nodeRadPerS };
  const turnS = fastest > 0 ? mostTurnRad / fastest : Infinity;
  const fallS = drags ? fallLimitS(body, values, rates) : Infinity;
  return { lengthS: Math.min(longestS, turnS, fallS), turn };
}

function fallLimitS(body: Body, values: Float64Array, rates: Float64Array): number {
  const [a, h, k] = [values[0] as number, values[1] as number, values[2] as number];
  const e = Math.hypot(h, k);
  const [aRate, hRate, kRate] = [rates[0] as number, rates[1] as number, rates[2] as number];
  const eRate = e > 0 ? (h * hRate + k * kRate) / e : Math.hypot(hRate, kRate);
  const heightKm = perigeeHeightKm(body, values);
  if (heightKm > airlessKm) return Infinity;
  const scaleKm = scaleHeightKm(heightKm);
  const perigeeRate = Math.abs(aRate * (1 - e) - a * eRate);
  const steepness = Math.abs(e * aRate + a * eRate) / Math.max(a * e, scaleKm);
  return mostFall / Math.max(perigeeRate / scaleKm, steepness);
}
