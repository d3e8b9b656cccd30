import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { zonalForce } from '../../../core/forces/zonal';
import { bodies } from '../../../core/index';
import { averagedRates } from '../../../core/mission/averagedRates';
import {
  elementsFromEquinoctial,
  equinoctialFromElements,
  type Sense,
  senseOf,
} from '../../../core/mission/equinoctial';
import { at, keplerian, orbits } from './orbits';

const { earth } = bodies;
const mu = earth.muKm3PerS2;
const j2 = earth.zonals[2] ?? Number.NaN;

describe('averaged rates', () => {
  it('are the same in both senses', () => {
    const model = { body: earth, oblateness: 'second', forces: [zonalForce(earth, { from: 3, to: 14 })] } as const;
    fc.assert(
      fc.property(orbits(1e-2), (mean) => {
        const direct = keplerian(mean, model, 1);
        const reverse = keplerian(mean, model, -1);
        for (const key of ['eccentricity', 'inclination', 'node', 'perigee', 'anomaly'] as const) {
          expect(Math.abs(direct[key] - reverse[key])).toBeLessThan(1e-15);
        }
      }),
      { numRuns: 100, seed: 1972 },
    );
  });

  it('are finite and continuous at e = 0 and in the equator, both ways round', () => {
    const model = { body: earth, oblateness: 'second', forces: [zonalForce(earth, { from: 3, to: 14 })] } as const;
    for (const inclinationRad of [0, Math.PI, 1, Math.PI / 2]) {
      const sense: Sense = senseOf(inclinationRad);
      const rates = averagedRates({ ...model, sense });
      const [exact, near] = [new Float64Array(6), new Float64Array(6)];
      rates(exact, equinoctialFromElements(at({ eccentricity: 0, inclinationRad }), sense), 0);
      const nudged = inclinationRad === 0 ? 1e-9 : inclinationRad - 1e-9;
      rates(near, equinoctialFromElements(at({ eccentricity: 1e-9, inclinationRad: nudged }), sense), 0);
      exact.forEach((value, index) => {
        expect(Number.isFinite(value)).toBe(true);
        expect(Math.abs(value - (near[index] ?? Number.NaN))).toBeLessThan(1e-14);
      });
    }
  });

  it('keep the polar angular momentum and a: zonals cannot change them', () => {
    const model = { body: earth, oblateness: 'second', forces: [zonalForce(earth, { from: 3, to: 14 })] } as const;
    fc.assert(
      fc.property(orbits(1e-2), (mean) => {
        const { eccentricity: e, inclinationRad: i } = mean;
        const found = keplerian(mean, model);
        const share = (-e * found.eccentricity) / (1 - e * e) - Math.tan(i) * found.inclination;
        expect(Math.abs(share * Math.cos(i))).toBeLessThan(1e-17);
        expect(Math.abs(found.axis / mean.semiMajorAxisKm)).toBeLessThan(1e-17);
      }),
      { numRuns: 100, seed: 1959 },
    );
  });

  it('do not change when the points are doubled', () => {
    for (const degree of [2, 3, 8, 14]) {
      const zonals = zonalForce(earth, { from: 2, to: degree });
      const doubled = { ...zonals, averagingPoints: (a: number, e: number) => 2 * zonals.averagingPoints(a, e) };
      for (const eccentricity of [0, 1e-3, 0.02, 0.1, 0.3, 0.5, 0.74, 0.9]) {
        const mean = at({ semiMajorAxisKm: 6700 / (1 - eccentricity), eccentricity });
        const values = equinoctialFromElements(mean, 1);
        const [once, twice] = [new Float64Array(6), new Float64Array(6)];
        averagedRates({ body: earth, sense: 1, oblateness: 'none', forces: [zonals] })(once, values, 0);
        averagedRates({ body: earth, sense: 1, oblateness: 'none', forces: [doubled] })(twice, values, 0);
        const n = Math.sqrt(mu / mean.semiMajorAxisKm) / mean.semiMajorAxisKm;
        for (const index of [1, 2, 3, 4]) {
          const change = Math.abs((once[index] ?? Number.NaN) - (twice[index] ?? Number.NaN));
          expect(change / (n * j2)).toBeLessThan(1e-13);
        }
      }
    }
  });

  it('refuse elements that are no orbit', () => {
    const rates = averagedRates({ body: earth, sense: 1, oblateness: 'second', forces: [] });
    expect(() => rates(new Float64Array(6), Float64Array.of(7000, 0.9, 0.9, 0, 0, 0), 0)).toThrow(/e < 1/);
    expect(() => rates(new Float64Array(6), Float64Array.of(Number.NaN, 0, 0, 0, 0, 0), 0)).toThrow(/finite/);
  });
});

describe('equinoctial elements', () => {
  it('go there and back in both senses', () => {
    fc.assert(
      fc.property(orbits(1e-3), fc.constantFrom<Sense>(1, -1), (mean, sense) => {
        const back = elementsFromEquinoctial(equinoctialFromElements(mean, sense), sense);
        expect(back.semiMajorAxisKm).toBe(mean.semiMajorAxisKm);
        expect(back.eccentricity).toBeCloseTo(mean.eccentricity, 13);
        expect(back.inclinationRad).toBeCloseTo(mean.inclinationRad, 12);
        for (const key of ['nodeRad', 'perigeeRad', 'meanAnomalyRad'] as const) {
          expect(Math.abs(Math.sin(0.5 * (back[key] - mean[key])))).toBeLessThan(1e-11);
        }
      }),
      { numRuns: 200, seed: 1972 },
    );
  });
});
