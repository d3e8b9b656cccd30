import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bodies } from '../../../core/bodies/bodies';
import type { MeanElements, Theory } from '../../../core/orbit/elements';
import { periods } from '../../../core/orbit/periods';
import { secularRates } from '../../../core/orbit/secularRates';

const { earth } = bodies;
const orbit = (a: number, e: number, inclinationRad: number): MeanElements => ({
  semiMajorAxisKm: a,
  eccentricity: e,
  inclinationRad,
  nodeRad: 0,
  perigeeRad: 0,
  meanAnomalyRad: 0,
});
const shapes = fc.tuple(
  fc.double({ min: 6600, max: 45000, noNaN: true }),
  fc.double({ min: 0, max: 0.8, noNaN: true }),
  fc.double({ min: 0, max: Math.PI, noNaN: true }),
);

describe('secular rates', () => {
  it.each(['first', 'second'] as Theory[])(
    'mirror the node and keep the perigee under i → 180° − i (%s order)',
    (theory) => {
      fc.assert(
        fc.property(shapes, ([a, e, i]) => {
          const direct = secularRates(earth, orbit(a, e, i), theory);
          const mirrored = secularRates(earth, orbit(a, e, Math.PI - i), theory);
          expect(mirrored.nodeRadPerS).toBeCloseTo(-direct.nodeRadPerS, 18);
          expect(mirrored.perigeeRadPerS).toBeCloseTo(direct.perigeeRadPerS, 18);
          expect(mirrored.meanAnomalyRadPerS).toBeCloseTo(direct.meanAnomalyRadPerS, 15);
        }),
      );
    },
  );

  it('of both orders differ by J2² and J4 alone: the difference falls a hundredfold when both shrink tenfold', () => {
    const scaled = (factor: number) => {
      const zonals = [0, 0, (earth.zonals[2] ?? 0) * factor, 0, (earth.zonals[4] ?? 0) * factor ** 2];
      const body = { ...earth, zonals };
      const mean = orbit(7000, 0.05, 0.9);
      return secularRates(body, mean, 'second').nodeRadPerS - secularRates(body, mean, 'first').nodeRadPerS;
    };
    expect(scaled(1) / scaled(0.1)).toBeCloseTo(100, 6);
  });

  it.each([
    [Number.NaN, 1],
    [Number.POSITIVE_INFINITY, 1],
    [7000, Number.NaN],
    [7000, Number.POSITIVE_INFINITY],
  ])('refuse a = %s with i = %s, rather than give rates that are not numbers', (a, i) => {
    expect(() => secularRates(earth, orbit(a, 0.1, i), 'second')).toThrow(/finite/);
  });

  it.each([-1, 1, Number.NaN])('refuse e = %s', (e) => {
    expect(() => secularRates(earth, orbit(7000, e, 1), 'first')).toThrow(/0 ≤ e < 1/);
  });
});

describe('periods', () => {
  it('come out in their order below the critical inclination: nodal shortest', () => {
    const result = periods(earth, orbit(7000, 0.001, 0.9), 'second');
    expect(result.nodalS).toBeLessThan(result.anomalisticS);
    expect(result.anomalisticS).toBeLessThan(result.keplerianS);
  });

  it('give no nodal day for a body whose rotation is unknown', () => {
    expect(periods({ ...earth, rotationRadPerS: null }, orbit(7000, 0, 1), 'first').nodalDayS).toBeNull();
  });
});
