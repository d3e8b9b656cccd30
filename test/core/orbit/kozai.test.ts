import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gravitySets } from '../../../core/bodies/earth';
import { brouwerFromKozai } from '../../../core/orbit/kozai';

const { WGS72 } = gravitySets;

describe('brouwerFromKozai', () => {
  it('changes nothing where 3 cos² i = 1', () => {
    const meanMotionKozaiRadPerS = 1.06e-3;
    const { meanMotionRadPerS } = brouwerFromKozai({
      meanMotionKozaiRadPerS,
      eccentricity: 0.01,
      inclinationRad: Math.acos(Math.sqrt(1 / 3)),
    });
    expect(meanMotionRadPerS / meanMotionKozaiRadPerS).toBeCloseTo(1, 14);
  });

  it('undoes Kozai’s definition, n (1 + (3/4) J2 (R/p)² √(1−e²) (3 cos² i − 1)), to first order in J2', () => {
    const orbit = fc.record({
      a: fc.double({ min: 6700, max: 42000, noNaN: true }),
      e: fc.double({ min: 0, max: 0.1, noNaN: true }),
      i: fc.double({ min: 0, max: Math.PI, noNaN: true }),
    });
    fc.assert(
      fc.property(orbit, ({ a, e, i }) => {
        const n = Math.sqrt(WGS72.muKm3PerS2 / a ** 3);
        const j2 = WGS72.zonals[2] ?? 0;
        const ratio = (WGS72.radiusKm / a) ** 2 / (1 - e * e) ** 1.5;
        const delta = 0.75 * j2 * ratio * (3 * Math.cos(i) ** 2 - 1);
        const kozai = n * (1 + delta);
        const back = brouwerFromKozai({ meanMotionKozaiRadPerS: kozai, eccentricity: e, inclinationRad: i });
        // The report takes δ₀ at a₀ = a (1 − δ), which makes it δ + 2δ²: 4/3 δ² in a, and third order.
        expect(Math.abs(back.semiMajorAxisKm / a - 1)).toBeLessThan(
          (4 / 3) * delta ** 2 + 20 * Math.abs(delta) ** 3 + 1e-14,
        );
      }),
    );
  });
});
