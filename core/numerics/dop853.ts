/**
 * One step of Dormand and Prince's method of order 8(5,3), with its error and its dense output.
 *
 * Source: Hairer, Nørsett and Wanner, Solving Ordinary Differential Equations I, 2nd edition (1993), sections II.5 and II.6.
 * All arrays are made once; a step makes no garbage.
 */
import { denseWeights, fifthOrderError, stageShares, stageWeights, thirdOrderError } from './dop853Coefficients';

/** Fills `rates` with dy/dt at `t`; must not keep or change `values`. */
export type Derivative = (rates: Float64Array, t: number, values: Float64Array) => void;

/** Place of the derivative at the end of the step among the stages. */
const endStage = 12;
const denseTerms = 7;

/** A step that may still be refused: `values` and `rates` belong to its start, `next` to its end. */
export interface Stepper {
  readonly values: Float64Array;
  readonly next: Float64Array;
  /** Derivative at the start of the step. */
  readonly rates: Float64Array;
  /** Sets the start, with its derivative. */
  readonly begin: (t: number, initial: Float64Array) => void;
  /** Tries a step of length h from t and fills `next`. */
  readonly attempt: (t: number, h: number) => void;
  /** Size of the error of the last attempt in units of `scale`: at most 1 where it may be kept. */
  readonly errorSize: (h: number, scale: Float64Array) => number;
  /** Evaluates the derivative at the end of the step, which `dense` and `accept` need. */
  readonly finish: (t: number, h: number) => void;
  /** Fills the terms of the dense output, three evaluations more. */
  readonly prepareDense: (t: number, h: number) => void;
  /** Values at the share θ of the step, 0 ≤ θ ≤ 1; needs `prepareDense`. */
  readonly dense: (out: Float64Array, share: number) => void;
  /** Makes the end of the step the start of the next one. */
  readonly accept: () => void;
}

/** A stepper for a system of `size` equations. */
export function dop853(derivative: Derivative, size: number): Stepper {
  const work: Workspace = {
    derivative,
    size,
    stages: stageShares.map(() => new Float64Array(size)),
    trial: new Float64Array(size),
    terms: Array.from({ length: denseTerms }, () => new Float64Array(size)),
    values: new Float64Array(size),
    next: new Float64Array(size),
  };
  const { stages, values, next } = work;
  const first = stages[0] as Float64Array;
  const end = stages[endStage] as Float64Array;
  return {
    values,
    next,
    rates: first,
    begin: (t, initial) => {
      values.set(initial);
      derivative(first, t, values);
    },
    attempt: (t, h) => {
      for (let stage = 1; stage < endStage; stage += 1) evaluate(work, stage, t, h);
      combine(work, next, stageWeights[endStage] as readonly number[], h);
    },
    errorSize: (h, scale) => errorSize(work, h, scale),
    finish: (t, h) => derivative(end, t + h, next),
    prepareDense: (t, h) => prepareDense(work, t, h),
    dense: (out, share) => dense(work, out, share),
    accept: () => {
      values.set(next);
      first.set(end);
    },
  };
}

interface Workspace {
  readonly derivative: Derivative;
  readonly size: number;
  readonly stages: readonly Float64Array[];
  readonly trial: Float64Array;
  readonly terms: readonly Float64Array[];
  readonly values: Float64Array;
  readonly next: Float64Array;
}

/** Start plus h times the weighted sum of the stages so far. */
function combine({ size, stages, values }: Workspace, out: Float64Array, weights: readonly number[], h: number): void {
  out.fill(0);
  addWeighted(out, stages, weights, size);
  for (let index = 0; index < size; index += 1) out[index] = (values[index] as number) + h * (out[index] as number);
}

function addWeighted(
  out: Float64Array,
  stages: readonly Float64Array[],
  weights: readonly number[],
  size: number,
): void {
  for (let stage = 0; stage < weights.length; stage += 1) {
    const weight = weights[stage] as number;
    if (weight === 0) continue;
    const rates = stages[stage] as Float64Array;
    for (let index = 0; index < size; index += 1) {
      out[index] = (out[index] as number) + weight * (rates[index] as number);
    }
  }
}

function evaluate(work: Workspace, stage: number, t: number, h: number): void {
  combine(work, work.trial, stageWeights[stage] as readonly number[], h);
  work.derivative(work.stages[stage] as Float64Array, t + (stageShares[stage] as number) * h, work.trial);
}

/** The two estimates combined: section II.10, equation 10.17. */
function errorSize({ size, stages }: Workspace, h: number, scale: Float64Array): number {
  let fifth = 0;
  let third = 0;
  for (let index = 0; index < size; index += 1) {
    let five = 0;
    let three = 0;
    for (let stage = 0; stage < endStage; stage += 1) {
      const rate = (stages[stage] as Float64Array)[index] as number;
      five += (fifthOrderError[stage] ?? 0) * rate;
      three += (thirdOrderError[stage] ?? 0) * rate;
    }
    fifth += (five / (scale[index] as number)) ** 2;
    third += (three / (scale[index] as number)) ** 2;
  }
  const both = fifth + 0.01 * third;
  return both === 0 ? 0 : (Math.abs(h) * fifth) / Math.sqrt(size * both);
}

function prepareDense(work: Workspace, t: number, h: number): void {
  const { size, stages, terms, values, next } = work;
  for (let stage = endStage + 1; stage < stages.length; stage += 1) evaluate(work, stage, t, h);
  const [change, slope, bend] = terms as readonly [Float64Array, Float64Array, Float64Array];
  const first = stages[0] as Float64Array;
  const end = stages[endStage] as Float64Array;
  for (let index = 0; index < size; index += 1) {
    const rise = (next[index] as number) - (values[index] as number);
    change[index] = rise;
    slope[index] = h * (first[index] as number) - rise;
    bend[index] = rise - h * (end[index] as number) - (slope[index] as number);
  }
  denseWeights.forEach((weights, row) => {
    const term = terms[row + 3] as Float64Array;
    term.fill(0);
    addWeighted(term, stages, weights, size);
    for (let index = 0; index < size; index += 1) term[index] = h * (term[index] as number);
  });
}

/** Section II.6, equation 6.33: a nested product of θ and 1 − θ by turns. */
function dense({ size, terms, values }: Workspace, out: Float64Array, share: number): void {
  for (let index = 0; index < size; index += 1) {
    let sum = 0;
    for (let term = denseTerms - 1; term >= 0; term -= 1) {
      sum = (sum + ((terms[term] as Float64Array)[index] as number)) * (term % 2 === 0 ? share : 1 - share);
    }
    out[index] = (values[index] as number) + sum;
  }
}
