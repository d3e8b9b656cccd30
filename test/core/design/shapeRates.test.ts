import { describe, expect, it } from 'vitest';
import { bodies } from '../../../core/bodies/bodies';
import { latitudeRateAt, nodeRateAt, perigeeRateAt, shapeRates, shapeRatesAt } from '../../../core/design/shapeRates';
import { secularRates } from '../../../core/orbit/secularRates';

const angles = { nodeRad: 0, perigeeRad: 0, meanAnomalyRad: 0 };

describe('shapeRates', () => {
  it('are the secular rates at every inclination, for every body and both orders', () => {
    for (const body of Object.values(bodies)) {
      for (const theory of ['first', 'second'] as const) {
        for (let k = 0; k <= 60; k += 1) {
          const inclinationRad = (Math.PI * k) / 60;
          const shape = { semiMajorAxisKm: body.radiusKm * (1.05 + k / 20) * 2, eccentricity: (k % 10) / 20 };
          const rates = secularRates(body, { ...shape, ...angles, inclinationRad }, theory);
          const theta = Math.cos(inclinationRad);
          for (const shaped of [shapeRates(body, theory, shape), shapeRatesAt(body, theory, shape, inclinationRad)]) {
            const near = (value: number, expected: number, size: number) =>
              expect(Math.abs(value - expected)).toBeLessThan(4e-15 * size);
            near(nodeRateAt(shaped, theta), rates.nodeRadPerS, shaped.size);
            near(perigeeRateAt(shaped, theta), rates.perigeeRadPerS, shaped.size * 10);
            near(
              latitudeRateAt(shaped, theta),
              rates.perigeeRadPerS + rates.meanAnomalyRadPerS,
              rates.meanAnomalyRadPerS,
            );
          }
        }
      }
    }
  });
});
