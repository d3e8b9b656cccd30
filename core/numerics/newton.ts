/**
 * Damped Newton for a few unknowns (three at most here), scaled so that 1 is a large change of each.
 *
 * The domain is the caller's: `residuals` returns null outside. A step that would leave it is shortened, never bent onto
 * its edge, so that a root beyond the edge ends as "not converged" and not as a point of the edge.
 */
import { solveLinear } from './linear';

export interface NewtonProblem {
  /** Residuals at x, as many as unknowns; null where x is outside the domain. */
  readonly residuals: (x: readonly number[]) => readonly number[] | null;
  readonly start: readonly number[];
  /** The unit of each unknown. */
  readonly scales: readonly number[];
  /** Largest change of any unknown in one step, in its scale. */
  readonly maxStep: number;
  /** Converged where the largest residual is at or below this. */
  readonly tolerance: number;
  readonly maxIterations: number;
}

export type NewtonResult = {
  readonly x: readonly number[];
  /** Largest absolute residual at x. */
  readonly residual: number;
  readonly iterations: number;
} & (
  | { readonly converged: true }
  | { readonly converged: false; readonly why: 'startOutside' | 'singular' | 'stalled' | 'outOfSteps' }
);

/** Where the last unconverged point stands is returned too: it is the nearest thing that was found. */
export function dampedNewton(problem: NewtonProblem): NewtonResult {
  const { residuals, tolerance, maxIterations } = problem;
  let x = problem.start;
  let values = residuals(x);
  if (!values) return { converged: false, why: 'startOutside', x, residual: Number.NaN, iterations: 0 };
  for (let iterations = 0; ; iterations += 1) {
    const residual = largestOf(values);
    if (residual <= tolerance) return { converged: true, x, residual, iterations };
    if (iterations >= maxIterations) return { converged: false, why: 'outOfSteps', x, residual, iterations };
    const step = newtonStep(problem, x, values);
    if (!step) return { converged: false, why: 'singular', x, residual, iterations };
    const next = shortened(problem, { x, step, residual: lengthOf(values) });
    if (!next) return { converged: false, why: 'stalled', x, residual, iterations };
    [x, values] = [next.x, next.values];
  }
}

function largestOf(values: readonly number[]): number {
  return values.reduce((most, value) => Math.max(most, Math.abs(value)), 0);
}

function lengthOf(values: readonly number[]): number {
  return Math.hypot(...values);
}

/** Forward difference in units of the scales, or backward where forward leaves the domain. */
const difference = 1e-7;

function newtonStep(problem: NewtonProblem, x: readonly number[], values: readonly number[]): number[] | null {
  const jacobian = values.map(() => new Array<number>(x.length).fill(0));
  for (let column = 0; column < x.length; column += 1) {
    const slope = slopes(problem, { x, values, column });
    if (!slope) return null;
    slope.forEach((entry, row) => {
      (jacobian[row] as number[])[column] = entry;
    });
  }
  const solution = solveLinear(
    jacobian,
    values.map((value) => -value),
  );
  return solution?.every(Number.isFinite) ? solution : null;
}

interface SlopePoint {
  readonly x: readonly number[];
  readonly values: readonly number[];
  readonly column: number;
}

function slopes({ residuals, scales }: NewtonProblem, { x, values, column }: SlopePoint): number[] | null {
  for (const change of [difference, -difference]) {
    const moved = x.map((entry, index) => (index === column ? entry + change * (scales[index] as number) : entry));
    const there = residuals(moved);
    if (there) return there.map((value, row) => (value - (values[row] as number)) / change);
  }
  return null;
}

interface Descent {
  readonly x: readonly number[];
  readonly step: readonly number[];
  readonly residual: number;
}

/** The step, limited and then halved until it stays inside and the residuals shrink. */
function shortened(
  { residuals, scales, maxStep }: NewtonProblem,
  { x, step, residual }: Descent,
): { x: readonly number[]; values: readonly number[] } | null {
  let share = Math.min(1, maxStep / largestOf(step));
  for (let halving = 0; halving < 30; halving += 1) {
    const moved = x.map((entry, index) => entry + share * (step[index] as number) * (scales[index] as number));
    const values = residuals(moved);
    if (values && lengthOf(values) < residual) return { x: moved, values };
    share /= 2;
  }
  return null;
}
