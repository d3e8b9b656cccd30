import { describe, expect, it } from 'vitest';
import { solveLinear } from '../../../core/numerics/linear';
import { dampedNewton } from '../../../core/numerics/newton';

const common = { maxStep: 0.5, tolerance: 1e-12, maxIterations: 40 };

describe('dampedNewton', () => {
  it('solves three equations in unknowns of very different size', () => {
    const result = dampedNewton({
      ...common,
      start: [7000, 0.3, 1],
      scales: [7000, 1, 1],
      residuals: ([a = 0, e = 0, i = 0]) => [a / 8000 - 1, e * e * (a / 8000) - 0.01, Math.cos(i) + e],
    });
    expect(result.converged).toBe(true);
    expect(result.x[0]).toBeCloseTo(8000, 7);
    expect(result.x[1]).toBeCloseTo(0.1, 10);
    expect(result.x[2]).toBeCloseTo(Math.acos(-0.1), 10);
  });

  it('never steps out of the domain, and does not call its edge a solution', () => {
    const seen: number[] = [];
    const result = dampedNewton({
      ...common,
      start: [0.5],
      scales: [1],
      residuals: ([x = 0]) => {
        if (x < 0 || x > 1) return null;
        seen.push(x);
        return [x - 1.5];
      },
    });
    expect(result.converged).toBe(false);
    expect(Math.max(...seen)).toBeLessThanOrEqual(1);
    expect(result.residual).toBeGreaterThan(0.49);
  });

  it('says why it ended', () => {
    const stalled = dampedNewton({ ...common, start: [1], scales: [1], residuals: ([x = 0]) => [x * x + 1] });
    expect(stalled).toMatchObject({ converged: false });
    const singular = dampedNewton({ ...common, start: [1], scales: [1], residuals: () => [1] });
    expect(singular).toMatchObject({ converged: false, why: 'singular' });
    const outside = dampedNewton({ ...common, start: [1], scales: [1], residuals: () => null });
    expect(outside).toMatchObject({ converged: false, why: 'startOutside' });
  });
});

describe('solveLinear', () => {
  it('swaps rows where the first pivot is zero, and refuses a singular matrix', () => {
    expect(
      solveLinear(
        [
          [0, 2],
          [4, 0],
        ],
        [2, 8],
      ),
    ).toEqual([2, 1]);
    expect(
      solveLinear(
        [
          [1, 2],
          [2, 4],
        ],
        [1, 2],
      ),
    ).toBeNull();
  });
});
