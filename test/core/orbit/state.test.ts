import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { KeplerianElements, StateVector } from '../../../core/orbit/elements';
import { elementsFromState, stateFromElements } from '../../../core/orbit/state';

const mu = 398600.4415;
const turn = fc.double({ min: 0, max: 2 * Math.PI, noNaN: true });
const anyOrbit: fc.Arbitrary<KeplerianElements> = fc.record({
  semiMajorAxisKm: fc.double({ min: 6500, max: 60000, noNaN: true }),
  eccentricity: fc.oneof(fc.double({ min: 0, max: 0.9, noNaN: true }), fc.constantFrom(0, 1e-14, 1e-9, 1e-5)),
  inclinationRad: fc.oneof(
    fc.double({ min: 0, max: Math.PI, noNaN: true }),
    fc.constantFrom(0, Math.PI, 1e-12, 1e-7, Math.PI - 1e-9),
  ),
  nodeRad: turn,
  perigeeRad: turn,
  meanAnomalyRad: turn,
});

function distance(a: StateVector, b: StateVector): { km: number; kmPerS: number } {
  const miss = (p: readonly number[], q: readonly number[]) => Math.hypot(...p.map((x, k) => x - (q[k] ?? 0)));
  return { km: miss(a.positionKm, b.positionKm), kmPerS: miss(a.velocityKmPerS, b.velocityKmPerS) };
}

describe('elements and state', () => {
  it('round-trip to better than a millimetre, circular and equatorial orbits included', () => {
    fc.assert(
      fc.property(anyOrbit, (elements) => {
        const state = stateFromElements(mu, elements);
        const back = elementsFromState(mu, state);
        if (!back.ok) throw new Error(back.message);
        const miss = distance(stateFromElements(mu, back.elements), state);
        expect(miss.km).toBeLessThan(1e-6);
        expect(miss.kmPerS).toBeLessThan(1e-9);
        expect(back.elements.semiMajorAxisKm / elements.semiMajorAxisKm).toBeCloseTo(1, 10);
        expect(Math.abs(back.elements.eccentricity - elements.eccentricity)).toBeLessThan(1e-12);
      }),
      { numRuns: 3000 },
    );
  });

  it('sets the node to 0 in the equator and the perigee to 0 on a circle', () => {
    const speed = Math.sqrt(mu / 7000);
    const result = elementsFromState(mu, { positionKm: [7000, 0, 0], velocityKmPerS: [0, speed, 0] });
    expect(result.ok && result.elements).toMatchObject({ kind: 'osculating', inclinationRad: 0, nodeRad: 0 });
  });

  it.each([
    ['zero', [0, 0, 0], [0, 7, 0]],
    ['zero', [7000, 0, 0], [0, 0, 0]],
    ['rectilinear', [7000, 0, 0], [3, 0, 0]],
    ['hyperbolic', [7000, 0, 0], [0, 11, 0]],
    ['notFinite', [Number.NaN, 0, 0], [0, 7, 0]],
  ] as const)('says that a state is %s', (reason, positionKm, velocityKmPerS) => {
    const result = elementsFromState(mu, { positionKm, velocityKmPerS });
    expect(result).toMatchObject({ ok: false, reason });
  });

  it('names the escape speed when the orbit does not close', () => {
    const result = elementsFromState(mu, { positionKm: [7000, 0, 0], velocityKmPerS: [0, 11, 0] });
    expect(result.ok ? '' : result.message).toContain('escape speed 10.672 km/s');
  });
});
