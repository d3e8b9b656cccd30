import { describe, expect, it } from 'vitest';
import { bodies } from '../../../core/bodies/bodies';
import { radPerDeg } from '../../../core/numerics/angles';
import type { Limit } from '../../../core/record/limits';
import { violatesAt } from '../../../core/record/limitsAt';
import { readingsOf } from '../../../core/record/readings/readings';

const { earth } = bodies;
const orbitAt = (altitudeKm: number, inclinationDeg: number, eccentricity = 0.001) => ({
  semiMajorAxisKm: earth.equatorialRadiusKm + altitudeKm,
  eccentricity,
  inclinationRad: inclinationDeg * radPerDeg,
  nodeRad: 0,
  perigeeRad: 1.5,
  meanAnomalyRad: 0,
});

function grid() {
  const points = [];
  for (let column = 0; column < 60; column += 1) {
    for (let row = 0; row < 40; row += 1) points.push(orbitAt(200 + 35 * row, 3 * column));
  }
  return points;
}

const limits: readonly Limit[] = [
  { reading: 'nodeRate', bound: 'atMost', value: 2e-7 },
  { reading: 'perigeeAltitude', bound: 'atLeast', value: 450 },
  { reading: 'nodalPeriod', bound: 'atMost', value: 6600 },
];

describe('limits at a point of a chart', () => {
  it('are broken where the readings of the orbit break them', () => {
    for (const mean of grid().filter((_, index) => index % 37 === 0)) {
      const readings = readingsOf({ body: earth, mean, epochJd: null });
      const value = (id: string) => readings.find((reading) => reading.id === id)?.value ?? Number.NaN;
      const isBroken = value('nodeRate') > 2e-7 || value('perigeeAltitude') < 450 || value('nodalPeriod') > 6600;
      expect(violatesAt(earth, mean, null, limits)).toBe(isBroken);
    }
  });

  it('on a reading that the orbit does not have are not broken', () => {
    const morning: Limit = { reading: 'localTimeAscending', bound: 'atMost', value: 1 };
    expect(violatesAt(earth, orbitAt(700, 98), null, [morning])).toBe(false);
    expect(violatesAt(earth, orbitAt(700, 98), 2461485.9, [morning])).toBe(true);
    expect(violatesAt(earth, orbitAt(700, 98), null, [])).toBe(false);
  });

  it('cost a small part of a frame on a grid of 60 × 40', () => {
    const points = grid();
    const time = (set: readonly Limit[]) => {
      let best = Number.POSITIVE_INFINITY;
      for (let round = 0; round < 8; round += 1) {
        const start = performance.now();
        for (const mean of points) violatesAt(earth, mean, null, set);
        best = Math.min(best, performance.now() - start);
      }
      return best;
    };
    const never: readonly Limit[] = limits.map((each) => ({ ...each, value: each.bound === 'atMost' ? 1e9 : -1e9 }));
    const heights: readonly Limit[] = [{ reading: 'leastHeight', bound: 'atLeast', value: -1e9 }];
    const [rates, rough] = [time(never), time(heights)];
    console.log(`2400 points: ${rates.toFixed(2)} ms for three limits, ${rough.toFixed(2)} ms for a height`);
    expect(rates).toBeLessThan(40);
    expect(rough).toBeLessThan(40);
  });
});
