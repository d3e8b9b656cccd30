import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bodies } from '../../../core/bodies/bodies';
import { type CurveRequest, sunSynchronousAt, trackCurve } from '../../../core/design/trackCurve';
import type { Theory } from '../../../core/orbit/elements';
import { secularRates } from '../../../core/orbit/secularRates';

const { earth } = bodies;
const wanted = (2 * Math.PI) / (365.2422 * 86_400);

function nodeRate({ body, theory, eccentricity }: CurveRequest, a: number, inclinationRad: number): number {
  const mean = { semiMajorAxisKm: a, eccentricity, inclinationRad, nodeRad: 0, perigeeRad: 0, meanAnomalyRad: 0 };
  return secularRates(body, mean, theory).nodeRadPerS;
}

const cases = fc.record({
  theory: fc.constantFrom<Theory>('first', 'second'),
  j2: fc.double({ min: -2e-3, max: 2e-3, noNaN: true }),
  j4: fc.double({ min: -3e-4, max: 3e-4, noNaN: true }),
  e: fc.double({ min: 0, max: 0.5, noNaN: true }),
  a: fc.double({ min: 6500, max: 12_000, noNaN: true }),
});

describe('the Sun-synchronous inclination', () => {
  it('turns the node with the Sun, and no inclination nearer to polar does; where there is none, none there does', () => {
    let found = 0;
    let none = 0;
    let worst = 0;
    fc.assert(
      fc.property(cases, ({ theory, j2, j4, e, a }) => {
        const body = { ...earth, zonals: [0, 0, j2, 0, j4] };
        const request: CurveRequest = { body, theory, eccentricity: e, inclination: { kind: 'sunSynchronous' } };
        const { inclinationRad, cosine } = sunSynchronousAt(request, a);
        // Away from polar, on the side where the node goes east, up to where its rate stops growing.
        const side = nodeRate(request, a, Math.PI / 2 + 1e-6) > 0 ? 1 : -1;
        const rates = Array.from({ length: 900 }, (_, k) =>
          nodeRate(request, a, Math.PI / 2 + (side * k * Math.PI) / 1800),
        );
        const turn = rates.findIndex((rate, k) => k > 0 && rate < (rates[k - 1] ?? 0));
        const rising = turn < 0 ? rates : rates.slice(0, turn);
        const passes = rising.findIndex((rate) => rate > wanted);
        if (inclinationRad === null) {
          none += 1;
          return passes < 0 && !(Math.abs(cosine) <= 1);
        }
        found += 1;
        worst = Math.max(worst, Math.abs(nodeRate(request, a, inclinationRad) / wanted - 1));
        const steps = (Math.abs(inclinationRad - Math.PI / 2) * 1800) / Math.PI;
        return passes < 0 ? steps > rising.length - 2 : Math.abs(steps - passes) <= 1;
      }),
      { numRuns: 500, seed: 3 },
    );
    expect(worst).toBeLessThan(1e-12);
    expect(found).toBeGreaterThan(50);
    expect(none).toBeGreaterThan(50);
  });

  it('is beyond ±1, or nowhere, where no orbit is', () => {
    const request: CurveRequest = {
      body: earth,
      theory: 'first',
      eccentricity: 0,
      inclination: { kind: 'sunSynchronous' },
    };
    // cos i = −(a/12 352 km)^3.5 on the Earth, first order, circular.
    expect(sunSynchronousAt(request, 13_000)).toMatchObject({
      inclinationRad: null,
      cosine: expect.closeTo(-((13_000 / 12_352) ** 3.5), 3),
    });
    const round = { ...request, body: { ...earth, zonals: [0, 0, 0] } };
    expect(sunSynchronousAt(round, 7000).inclinationRad).toBeNull();
    expect(trackCurve(round)(7000)).toBeNull();
  });
});

describe('days in a revolution', () => {
  it('are negative on a retrograde rotator', () => {
    const fixed = { theory: 'second', eccentricity: 0, inclination: { kind: 'fixed', rad: 1 } } as const;
    expect(trackCurve({ ...fixed, body: earth })(7000)?.daysPerRevolution).toBeGreaterThan(0.06);
    expect(trackCurve({ ...fixed, body: bodies.venus })(7000)?.daysPerRevolution).toBeLessThan(0);
  });
});
