import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { averagingPoints } from '../../../core/forces/averagingPoints';
import { zonalForce } from '../../../core/forces/zonal';
import { type Body, bodies, customBody } from '../../../core/index';

const { earth } = bodies;
type Triple = readonly [number, number, number];

/** One zonal alone, so large that the others' size does not hide it. */
function single(degree: number): Body {
  const zonals = new Array<number>(degree + 1).fill(0);
  zonals[degree] = 1;
  return customBody({ name: 'one zonal', muKm3PerS2: 1, radiusKm: 1, zonals });
}

function acceleration(body: Body, from: number, to: number, position: Triple): Triple {
  const sum = new Float64Array(3);
  zonalForce(body, { from, to }).add(sum, Float64Array.from([...position, 0, 0, 0]), 0);
  return [sum[0] ?? Number.NaN, sum[1] ?? Number.NaN, sum[2] ?? Number.NaN];
}

function factorial(n: number): number {
  return n <= 1 ? 1 : n * factorial(n - 1);
}

/** Explicit sum over powers (Abramowitz and Stegun, 22.3.8): shares no recursion with what is tested. */
function legendre(n: number, s: number): number {
  let sum = 0;
  for (let m = 0; 2 * m <= n; m += 1) {
    const weight = factorial(2 * n - 2 * m) / (factorial(m) * factorial(n - m) * factorial(n - 2 * m));
    sum += (-1) ** m * weight * s ** (n - 2 * m);
  }
  return sum / 2 ** n;
}

function potential(body: Body, from: number, to: number, [x, y, z]: Triple): number {
  const r = Math.hypot(x, y, z);
  let sum = 0;
  for (let n = from; n <= to; n += 1) sum += (body.zonals[n] ?? 0) * (body.radiusKm / r) ** n * legendre(n, z / r);
  return (-body.muKm3PerS2 / r) * sum;
}

/** Sixth-order central difference along one axis. */
function slope(value: (at: Triple) => number, at: Triple, axis: number, step: number): number {
  const moved = (times: number) => value(at.map((x, k) => (k === axis ? x + times * step : x)) as unknown as Triple);
  const difference = (times: number) => moved(times) - moved(-times);
  return (45 * difference(1) - 9 * difference(2) + difference(3)) / (60 * step);
}

const direction = fc
  .tuple(fc.double({ min: -1, max: 1, noNaN: true }), fc.double({ min: 0, max: 2 * Math.PI, noNaN: true }))
  .map(([s, longitude]): Triple => {
    const c = Math.sqrt(1 - s * s);
    return [c * Math.cos(longitude), c * Math.sin(longitude), s];
  });

describe('acceleration by zonals', () => {
  it('is the gradient of the potential, for every degree alone', () => {
    const degrees = fc.integer({ min: 2, max: 14 });
    fc.assert(
      fc.property(degrees, direction, fc.double({ min: 1.02, max: 3, noNaN: true }), (n, [x, y, z], r) => {
        const body = single(n);
        const at: Triple = [r * x, r * y, r * z];
        const found = acceleration(body, 2, 14, at);
        const size = (n + 1) ** 2 / r ** (n + 2);
        for (const axis of [0, 1, 2]) {
          const expected = slope((place) => potential(body, 2, 14, place), at, axis, 2e-3 * r);
          // The difference formula's own error: (step)⁶ times the seventh derivative, and rounding of the power sum.
          expect(Math.abs((found[axis] ?? Number.NaN) - expected) / size).toBeLessThan(2e-8);
        }
      }),
      { numRuns: 500, seed: 1966 },
    );
  });

  it('is free of divergence (Laplace), for the whole field', () => {
    fc.assert(
      fc.property(direction, fc.double({ min: 6500, max: 30_000, noNaN: true }), ([x, y, z], r) => {
        const at: Triple = [r * x, r * y, r * z];
        const component = (axis: number) => (place: Triple) => acceleration(earth, 2, 14, place)[axis] ?? Number.NaN;
        const slopes = [0, 1, 2].map((axis) => slope(component(axis), at, axis, 1e-2 * r));
        const largest = Math.max(...slopes.map(Math.abs));
        expect(Math.abs(slopes.reduce((sum, value) => sum + value, 0)) / largest).toBeLessThan(1e-7);
      }),
      { numRuns: 200, seed: 1966 },
    );
  });

  it('has no torque about the axis, and turns with the place', () => {
    const [ax, ay, az] = acceleration(earth, 2, 14, [4000, 5000, 3000]);
    const [bx, by, bz] = acceleration(earth, 2, 14, [-5000, 4000, 3000]);
    expect(Math.abs(4000 * ay - 5000 * ax)).toBeLessThan(1e-15 * 5000);
    expect([bx, by, bz]).toEqual([-ay, ax, az]);
  });

  it('is mirrored by the equator: even zonals keep the sides alike, odd ones make them opposite', () => {
    for (let n = 2; n <= 14; n += 1) {
      const north = acceleration(earth, n, n, [5000, 2000, 4500]);
      const south = acceleration(earth, n, n, [5000, 2000, -4500]);
      const sign = n % 2 === 0 ? 1 : -1;
      expect(south[0]).toBeCloseTo(sign * north[0], 20);
      expect(south[2]).toBeCloseTo(-sign * north[2], 20);
    }
  });

  it('is regular at the poles: P_n(1) = 1, so the pull is (n + 1) J_n along the axis', () => {
    for (let n = 2; n <= 14; n += 1) {
      const [x, y, z] = acceleration(single(n), 2, 14, [0, 0, 2]);
      expect([x, y]).toEqual([0, 0]);
      expect(z * 2 ** (n + 2)).toBeCloseTo(n + 1, 11);
    }
  });

  it('sums its degrees: a range split in two gives the same', () => {
    const at: Triple = [3000, -5500, 3300];
    const whole = acceleration(earth, 2, 14, at);
    const [low, high] = [acceleration(earth, 2, 6, at), acceleration(earth, 7, 14, at)];
    whole.forEach((value, k) => {
      expect((low[k] ?? Number.NaN) + (high[k] ?? Number.NaN)).toBeCloseTo(value, 18);
    });
  });

  it('gives nothing for degrees that the gravity set lacks, and refuses a range that is none', () => {
    expect(acceleration(bodies.mars, 5, 14, [4000, 0, 1000])).toEqual([0, 0, 0]);
    for (const [from, to] of [
      [1, 4],
      [3, 2],
      [2.5, 4],
      [2, Number.NaN],
    ] as const) {
      expect(() => zonalForce(earth, { from, to })).toThrow(/whole degrees/);
    }
  });
});

describe('points of an average', () => {
  it('are few for a circle, and more with e and degree', () => {
    expect(averagingPoints(14, 0)).toBe(20);
    expect(averagingPoints(14, 0.001)).toBeLessThanOrEqual(24);
    expect(averagingPoints(14, 0.74)).toBeGreaterThan(90);
    expect(averagingPoints(14, 0.74)).toBeGreaterThan(averagingPoints(4, 0.74));
    expect(() => averagingPoints(14, 1)).toThrow(/0 ≤ e < 1/);
  });
});
