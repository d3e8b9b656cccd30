/** The integrator of `core` against odex (Hairer and Wanner's extrapolation method) on problems that are not orbits only. */
import { Outcome, Solver } from 'odex';
import { describe, expect, it } from 'vitest';
import { componentScale, type OdeEnd, type OdeProblem, odeSteps } from '../../core/index';

/** Runs to the end and returns the last values with how it ended. */
function run(problem: OdeProblem): { values: Float64Array; end: OdeEnd } {
  const steps = odeSteps(problem);
  let values = problem.initial;
  for (;;) {
    const drawn = steps.next();
    if (drawn.done) return { values, end: drawn.value };
    values = Float64Array.from(drawn.value.after);
  }
}

interface Problem {
  readonly name: string;
  readonly initial: readonly number[];
  readonly to: number;
  readonly rates: (t: number, y: readonly number[]) => number[];
}

const at = (y: readonly number[], index: number) => y[index] ?? Number.NaN;

/** Classical test problems: Hairer, Nørsett and Wanner, section II.10, and Enright and Pryce (DETEST). */
const problems: readonly Problem[] = [
  {
    name: 'two bodies, e 0.6',
    initial: [0.4, 0, 0, 2],
    to: 20,
    rates: (_, y) => {
      const cube = Math.hypot(at(y, 0), at(y, 1)) ** 3;
      return [at(y, 2), at(y, 3), -at(y, 0) / cube, -at(y, 1) / cube];
    },
  },
  {
    name: 'Euler’s rigid body',
    initial: [0, 1, 1],
    to: 20,
    rates: (_, y) => [at(y, 1) * at(y, 2), -at(y, 0) * at(y, 2), -0.51 * at(y, 0) * at(y, 1)],
  },
  {
    name: 'Van der Pol, ε 1',
    initial: [2, 0],
    to: 20,
    rates: (_, y) => [at(y, 1), (1 - at(y, 0) ** 2) * at(y, 1) - at(y, 0)],
  },
  {
    name: 'a pendulum pushed in time',
    initial: [1, 0],
    to: 30,
    rates: (t, y) => [at(y, 1), -Math.sin(at(y, 0)) + 0.1 * Math.cos(0.7 * t)],
  },
];

describe('against odex', () => {
  it.each(problems)('$name', ({ initial, to, rates }) => {
    const solver = new Solver(initial.length);
    solver.maxSteps = 1e5;
    solver.relativeTolerance = 1e-13;
    solver.absoluteTolerance = 1e-13;
    const truth = solver.solve((t, y) => rates(t, y), 0, [...initial], to);
    expect(truth.outcome).toBe(Outcome.Converged);
    const mine = run({
      derivative: (out, t, y) => out.set(rates(t, Array.from(y))),
      initial: Float64Array.from(initial),
      from: 0,
      to,
      errorScale: componentScale(1e-13, 1e-13),
    });
    expect(mine.end.ok).toBe(true);
    mine.values.forEach((value, index) => {
      expect(Math.abs(value - at(truth.y, index))).toBeLessThan(1e-10);
    });
  });
});
