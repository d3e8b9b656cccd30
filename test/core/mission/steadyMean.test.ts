import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { zonalForce } from '../../../core/forces/zonal';
import { zonalPotential } from '../../../core/forces/zonalPotential';
import { bodies, stateFromMean } from '../../../core/index';
import { meanOfSteady, steadyMean } from '../../../core/mission/steadyMean';
import { at, orbits } from './orbits';

const { earth } = bodies;

describe('steady mean elements', () => {
  it('change a alone, and in low orbit by less than a hundred metres', () => {
    for (const meanAnomalyRad of [0, 1, 2, 3, 4, 5, 6]) {
      const mean = at({ eccentricity: 0.002, inclinationRad: 1.7, meanAnomalyRad });
      const steady = steadyMean(earth, mean, 14);
      expect({ ...steady, semiMajorAxisKm: 0 }).toEqual({ ...mean, semiMajorAxisKm: 0 });
      expect(Math.abs(steady.semiMajorAxisKm - mean.semiMajorAxisKm)).toBeLessThan(0.1);
    }
  });

  it('leave the average over a revolution where it was: a design keeps its a', () => {
    const count = 200;
    let sum = 0;
    for (let k = 0; k < count; k += 1) {
      const mean = at({ eccentricity: 0.001, inclinationRad: 1.7, meanAnomalyRad: (2 * Math.PI * k) / count });
      sum += (steadyMean(earth, mean, 14).semiMajorAxisKm - mean.semiMajorAxisKm) / count;
    }
    expect(Math.abs(sum)).toBeLessThan(1e-6);
  });

  it('lead back to the mean elements that they came from', () => {
    const mean = at({ eccentricity: 0.02, inclinationRad: 1.2, meanAnomalyRad: 2 });
    const back = meanOfSteady(earth, steadyMean(earth, mean, 14), 14);
    expect(Math.abs(back.semiMajorAxisKm - mean.semiMajorAxisKm)).toBeLessThan(1e-5);
  });

  it('do nothing where there is only the central attraction', () => {
    const bare = { ...earth, zonals: [0, 0, 0] };
    expect(steadyMean(bare, at({}), 2).semiMajorAxisKm).toBeCloseTo(7000, 8);
  });
});

describe('potential of zonals', () => {
  it('has their acceleration as its gradient', () => {
    const potential = zonalPotential(earth, { from: 3, to: 14 });
    const force = zonalForce(earth, { from: 3, to: 14 });
    fc.assert(
      fc.property(orbits(1e-3), (mean) => {
        const { positionKm } = stateFromMean(earth, mean);
        const sum = new Float64Array(3);
        force.add(sum, Float64Array.of(...positionKm, 0, 0, 0), 0);
        const h = 0.5;
        [0, 1, 2].forEach((axis) => {
          const beside = (side: number) =>
            potential([
              positionKm[0] + (axis === 0 ? side : 0),
              positionKm[1] + (axis === 1 ? side : 0),
              positionKm[2] + (axis === 2 ? side : 0),
            ]);
          expect(Math.abs((beside(h) - beside(-h)) / (2 * h) - (sum[axis] ?? Number.NaN))).toBeLessThan(1e-12);
        });
      }),
      { seed: 14, numRuns: 100 },
    );
  });
});
