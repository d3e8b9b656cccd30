/**
 * One step of the averaged elements: the fourth-order Runge–Kutta rule in axes that turn with the orbit.
 *
 * J2 turns (h, k) and (p, q) by up to 16° a day, which says nothing and would cost small steps. Within a step the pairs
 * are held in axes that turn at the closed form's rates of the step's start; what the rule sees is how the rates change.
 * Regular at e = 0 and in the equator, because both pairs only rotate. Dense output: the cubic through values and slopes
 * of both ends, in the turning axes.
 *
 * Source: Lawson, SIAM J. Numer. Anal. 4, 372 (1967), for the change of variables.
 */
import { secondsPerDay } from '../numerics/angles';
import type { AveragedRates } from './averagedRates';

const size = 6;

/** Rates (rad/s) at which the axes of (h, k) and (p, q) turn. */
export interface AxesTurn {
  readonly perigeeLongitudeRadPerS: number;
  readonly nodeRadPerS: number;
}

/** One step that was taken: enough to read any moment within it. */
export interface AveragedStep {
  readonly startDays: number;
  readonly lengthS: number;
  readonly turn: AxesTurn;
  /** In the turning axes, values and slopes (per s) at both ends. */
  readonly from: Float64Array;
  readonly fromSlope: Float64Array;
  readonly to: Float64Array;
  readonly toSlope: Float64Array;
  /** Rates at the end, inertial axes. */
  readonly endRates: Float64Array;
}

/** Turns both pairs of `values` by the angles that the axes turn in `timeS`. */
function turned(values: Float64Array, { perigeeLongitudeRadPerS, nodeRadPerS }: AxesTurn, timeS: number): Float64Array {
  const out = values.slice();
  rotatePair(out, values, 1, perigeeLongitudeRadPerS * timeS);
  rotatePair(out, values, 3, nodeRadPerS * timeS);
  return out;
}

/** (x sin α, x cos α) becomes (x sin(α + angle), x cos(α + angle)). */
function rotatePair(out: Float64Array, values: Float64Array, at: number, angle: number): void {
  const [c, s] = [Math.cos(angle), Math.sin(angle)];
  const sine = values[at] as number;
  const cosine = values[at + 1] as number;
  out[at] = sine * c + cosine * s;
  out[at + 1] = cosine * c - sine * s;
}

/** Values `timeS` after the step's start, in inertial axes. */
export function valuesWithin(step: AveragedStep, timeS: number): Float64Array {
  const { lengthS, from, fromSlope, to, toSlope } = step;
  const x = timeS / lengthS;
  const y = 1 - x;
  const out = new Float64Array(size);
  for (let n = 0; n < size; n += 1) {
    const [v0, v1] = [from[n] as number, to[n] as number];
    const rise = v1 - v0;
    const b0 = lengthS * (fromSlope[n] as number) - rise;
    const b1 = rise - lengthS * (toSlope[n] as number);
    out[n] = y * v0 + x * v1 + x * y * (b0 * y + b1 * x);
  }
  return turned(out, step.turn, timeS);
}

export interface StepStart {
  readonly epochJd: number;
  readonly days: number;
  readonly values: Float64Array;
  /** Rates of `values`, inertial axes: the last step's `endRates`. */
  readonly startRates: Float64Array;
  readonly turn: AxesTurn;
}

/** Takes one step; throws as `rates` does where a stage is no orbit. */
export function averagedStep(rates: AveragedRates, start: StepStart, lengthS: number): AveragedStep {
  const { epochJd, days, values: from, startRates, turn } = start;
  const endRates = new Float64Array(size);
  const slopes = (values: Float64Array, timeS: number): Float64Array => {
    const here = turned(values, turn, timeS);
    rates(endRates, here, epochJd + days + timeS / secondsPerDay);
    return turned(beside(endRates, here, turn), turn, -timeS);
  };
  const half = 0.5 * lengthS;
  const k1 = beside(startRates, from, turn);
  const k2 = slopes(moved(from, k1, half), half);
  const k3 = slopes(moved(from, k2, half), half);
  const k4 = slopes(moved(from, k3, lengthS), lengthS);
  const to = from.slice();
  for (let n = 0; n < size; n += 1) {
    const sum = (k1[n] as number) + 2 * ((k2[n] as number) + (k3[n] as number)) + (k4[n] as number);
    to[n] = (to[n] as number) + (lengthS / 6) * sum;
  }
  const toSlope = slopes(to, lengthS);
  return { startDays: days, lengthS, turn, from, fromSlope: k1, to, toSlope, endRates };
}

/** Rates less the turn of the axes. */
function beside(rates: Float64Array, values: Float64Array, turn: AxesTurn): Float64Array {
  const { perigeeLongitudeRadPerS: nu, nodeRadPerS: node } = turn;
  const out = rates.slice();
  out[1] = (rates[1] as number) - nu * (values[2] as number);
  out[2] = (rates[2] as number) + nu * (values[1] as number);
  out[3] = (rates[3] as number) - node * (values[4] as number);
  out[4] = (rates[4] as number) + node * (values[3] as number);
  return out;
}

function moved(values: Float64Array, slope: Float64Array, timeS: number): Float64Array {
  return values.map((value, n) => value + timeS * (slope[n] as number));
}
