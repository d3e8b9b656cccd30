import { describe, expect, it } from 'vitest';
import { rootInBracket } from '../../../core/numerics/bracket';
import { rootsOnGrid } from '../../../core/numerics/roots';

const grid = (low: number, high: number, count: number) =>
  Array.from({ length: count + 1 }, (_, k) => low + ((high - low) * k) / count);

function bracketed(f: (x: number) => number, low: number, high: number) {
  let calls = 0;
  const result = rootInBracket(
    (x) => {
      calls += 1;
      return f(x);
    },
    { low, high, atLow: f(low), atHigh: f(high) },
  );
  return { result, calls };
}

describe('rootInBracket', () => {
  const cases: readonly [string, (x: number) => number, number, number, number][] = [
    ['a parabola', (x) => x * x - 2, 0, 2, Math.SQRT2],
    ['a flat cubic', (x) => (x - 0.3) ** 3, -1, 2, 0.3],
    ['a steep exponential', (x) => Math.exp(30 * x) - 1, -1, 1.3, 0],
    ['a root of large size', (x) => 1 / x - 1 / 42164, 100, 1e9, 42164],
  ];
  for (const [name, f, low, high, root] of cases) {
    it(`finds ${name} within its rounding and in few calls`, () => {
      const { result, calls } = bracketed(f, low, high);
      expect(result.ok).toBe(true);
      if (result.ok) expect(Math.abs(result.x - root)).toBeLessThan(1e-5 + 1e-12 * Math.abs(root));
      expect(calls).toBeLessThan(90);
    });
  }

  it('says that there is no change of sign, which is not the same as not converging', () => {
    expect(bracketed((x) => x * x + 1, -1, 2).result).toEqual({ ok: false, reason: 'noSignChange' });
    const undefinedInside = (x: number) => (Math.abs(x) < 0.5 ? Number.NaN : x);
    expect(bracketed(undefinedInside, -1, 1).result).toEqual({ ok: false, reason: 'didNotConverge' });
  });

  it('takes no pole for a root', () => {
    expect(bracketed((x) => 1 / (x - 0.3), -1, 1).result).toEqual({ ok: false, reason: 'pole' });
  });
});

describe('rootsOnGrid', () => {
  it('finds every crossing of a wave', () => {
    const { roots, unresolved } = rootsOnGrid(Math.sin, grid(0.5, 20, 60), { touching: 1e-12 });
    expect(unresolved).toBe(0);
    expect(roots).toHaveLength(6);
    roots.forEach((root, k) => {
      expect(root).toBeCloseTo((k + 1) * Math.PI, 13);
    });
  });

  it('finds a root that only touches, and a pair between two samples', () => {
    const touching = rootsOnGrid((x) => (x - 0.37) ** 2, grid(-1, 1, 20), { touching: 1e-12 });
    expect(touching.roots).toHaveLength(1);
    expect(touching.roots[0]).toBeCloseTo(0.37, 5);
    const pair = rootsOnGrid((x) => (x - 0.37) ** 2 - 1e-6, grid(-1, 1, 20), { touching: 1e-12 });
    expect(pair.roots).toHaveLength(2);
    expect(pair.roots[0]).toBeCloseTo(0.369, 10);
    expect(pair.roots[1]).toBeCloseTo(0.371, 10);
  });

  it('gives the least value where there is none, and no root', () => {
    const { roots, least } = rootsOnGrid((x) => (x - 0.37) ** 2 + 0.001, grid(-1, 1, 20), { touching: 1e-12 });
    expect(roots).toEqual([]);
    expect(least?.x).toBeCloseTo(0.37, 3);
  });

  it('takes roots at samples and at the ends once', () => {
    expect(rootsOnGrid((x) => x * (x - 1), grid(0, 2, 8), { touching: 1e-12 }).roots).toEqual([0, 1]);
    expect(rootsOnGrid((x) => (x < 0.9 ? Number.NaN : x - 1), grid(0, 1, 8), { touching: 1e-12 }).roots).toEqual([1]);
  });
});
