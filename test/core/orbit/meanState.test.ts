import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bodies } from '../../../core/bodies/bodies';
import type { MeanElements } from '../../../core/orbit/elements';
import { ConversionError, meanFromState, stateFromMean, tryMeanFromState } from '../../../core/orbit/meanState';
import { secularRates } from '../../../core/orbit/secularRates';

const turn = fc.double({ min: 0, max: 2 * Math.PI, noNaN: true });
const orbits: fc.Arbitrary<MeanElements> = fc
  .record({
    perigeeKm: fc.double({ min: 6578, max: 40000, noNaN: true }),
    eccentricity: fc.oneof(fc.double({ min: 0, max: 0.8, noNaN: true }), fc.constantFrom(0, 1e-10, 1e-4)),
    inclinationRad: fc.oneof(
      fc.double({ min: 0, max: Math.PI, noNaN: true }),
      fc.constantFrom(0, Math.PI, Math.PI / 2, 1e-8, 1.1071487177940904),
    ),
    nodeRad: turn,
    perigeeRad: turn,
    meanAnomalyRad: turn,
  })
  .map(({ perigeeKm, ...angles }) => ({ ...angles, semiMajorAxisKm: perigeeKm / (1 - angles.eccentricity) }));

describe('mean elements and osculating state', () => {
  it('return the state within a micrometre after a round trip, everywhere', () => {
    fc.assert(
      fc.property(orbits, (mean) => {
        const state = stateFromMean(bodies.earth, mean);
        const result = tryMeanFromState(bodies.earth, state);
        if (!result.ok) throw new Error(result.message);
        const again = stateFromMean(bodies.earth, result.mean);
        const miss = Math.hypot(...again.positionKm.map((x, k) => x - (state.positionKm[k] ?? 0)));
        expect(miss / mean.semiMajorAxisKm).toBeLessThan(2e-13);
        expect(result.mean.kind).toBe('mean');
      }),
      { numRuns: 2000 },
    );
  });

  it('converge at the giants, whose J2 is more than ten times that of the Earth', () => {
    for (const body of [bodies.jupiter, bodies.saturn]) {
      const mean: MeanElements = {
        semiMajorAxisKm: 1.3 * body.radiusKm,
        eccentricity: 0.1,
        inclinationRad: 1,
        nodeRad: 0.3,
        perigeeRad: 2,
        meanAnomalyRad: 1,
      };
      const back = meanFromState(body, stateFromMean(body, mean));
      expect(back.semiMajorAxisKm / mean.semiMajorAxisKm).toBeCloseTo(1, 12);
    }
  });

  it('throw a ConversionError that names the reason', () => {
    const escaping = { positionKm: [7000, 0, 0], velocityKmPerS: [0, 12, 0] } as const;
    expect(() => meanFromState(bodies.earth, escaping)).toThrow(ConversionError);
    expect(tryMeanFromState(bodies.earth, escaping)).toMatchObject({ ok: false, reason: 'hyperbolic' });
  });

  it('keep osculating elements out of the secular rates', () => {
    const osculating = { kind: 'osculating', semiMajorAxisKm: 7000, eccentricity: 0, inclinationRad: 1 };
    expect(() => secularRates(bodies.earth, osculating as unknown as MeanElements, 'first')).toThrow(/mean elements/);
  });
});
