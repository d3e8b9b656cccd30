import fc from 'fast-check';
import { describe, expect, expectTypeOf, it } from 'vitest';
import { nearestRoot } from '../../../core/design/nearestRoot';
import { perigeeMotion } from '../../../core/design/perigeeMotion';
import { type Body, bodies, customBody, type FrozenResult, frozenOrbit, gravitySets } from '../../../core/index';

const { earth, mars } = bodies;
const radPerDeg = Math.PI / 180;

function at(semiMajorAxisKm: number, inclinationDeg: number, body: Body = earth): FrozenResult {
  return frozenOrbit(body, { semiMajorAxisKm, inclinationRad: inclinationDeg * radPerDeg });
}

function refusal(result: FrozenResult): string {
  if (result.ok) throw new Error(`a refusal was expected, got e ${result.eccentricity}`);
  return `${result.reason}: ${result.message}`;
}

const input = fc.record({
  semiMajorAxisKm: fc.double({ min: 6600, max: 40_000, noNaN: true }),
  inclinationRad: fc.double({ min: 0, max: Math.PI, noNaN: true }),
});

describe('a frozen orbit', () => {
  it('has its shape at the top level, beside the one by hand', () => {
    const found = at(7159.49565, 98.5429);
    expectTypeOf(found).toEqualTypeOf<FrozenResult>();
    if (!found.ok) throw new Error(found.message);
    expect(found.degree).toBe(14);
    expect(found.cautions).toEqual([]);
    const j3 = earth.zonals[3] ?? Number.NaN;
    const j2 = earth.zonals[2] ?? Number.NaN;
    const byHand = (-j3 / (2 * j2)) * (earth.radiusKm / 7159.49565) * Math.sin(98.5429 * radPerDeg);
    expect(found.hand).toEqual({ eccentricity: expect.closeTo(byHand, 15), perigeeRad: 0.5 * Math.PI });
  });

  it('is an answer or a refusal everywhere, never a number that is no orbit', () => {
    fc.assert(
      fc.property(input, (place) => {
        const found = frozenOrbit(earth, place);
        if (!found.ok) return expect(found.reason).toBe('criticalInclination');
        expect(found.eccentricity).toBeGreaterThanOrEqual(0);
        expect(found.eccentricity).toBeLessThan(0.004);
        expect([0.5 * Math.PI, 1.5 * Math.PI]).toContain(found.perigeeRad);
      }),
      { numRuns: 300, seed: 3 },
    );
  });

  it('is the smallest there is: no change of sign on a fine grid nearer to the circle, at bodies of rough fields too', () => {
    const cases = [earth, mars, bodies.moon, bodies.venus, bodies.mercury].flatMap((body) =>
      [1.06, 1.4].flatMap((radii) => [20, 57, 75, 98, 140].map((deg) => ({ body, radii, deg }))),
    );
    for (const { body, radii, deg } of cases) {
      const place = { semiMajorAxisKm: radii * body.radiusKm, inclinationRad: deg * radPerDeg };
      const found = frozenOrbit(body, place);
      const most = 1 - Math.max(body.radiusKm, body.equatorialRadiusKm) / place.semiMajorAxisKm;
      const rates = perigeeMotion(body, place, 14);
      const signs = Array.from({ length: 401 }, (_, k) => {
        const eSine = (most * (k - 200)) / 200;
        return { eSine, rate: rates({ eCosine: 0, eSine }).eCosine };
      });
      const brackets = signs.flatMap(({ eSine, rate }, k) => {
        const next = signs[k + 1];
        return next && rate * next.rate <= 0 ? [Math.min(Math.abs(eSine), Math.abs(next.eSine))] : [];
      });
      if (found.ok) expect(found.eccentricity - Math.min(...brackets)).toBeLessThanOrEqual(most / 200);
      else expect(brackets).toEqual([]);
    }
  });

  it('is the same whichever way round the orbit is flown', () => {
    fc.assert(
      fc.property(input, (place) => {
        const direct = frozenOrbit(earth, place);
        const reverse = frozenOrbit(earth, { ...place, inclinationRad: Math.PI - place.inclinationRad });
        expect(reverse.ok).toBe(direct.ok);
        if (!(direct.ok && reverse.ok)) return;
        expect(reverse.eccentricity).toBeCloseTo(direct.eccentricity, 12);
      }),
      { numRuns: 100, seed: 3 },
    );
  });

  it('tends to the one by hand far out, where only J3 is felt', () => {
    const found = at(60_000, 98);
    if (!found.ok) throw new Error(found.message);
    expect(found.eccentricity / found.hand.eccentricity).toBeCloseTo(1, 2);
  });

  it('is a circle where there is nothing odd to hold a perigee: J3 known to be zero, or an orbit in the equator', () => {
    const even = customBody({ name: 'Even', muKm3PerS2: 4e5, radiusKm: 6000, zonals: [0, 0, 1e-3, 0] });
    expect(at(7000, 40, even)).toMatchObject({ ok: true, eccentricity: 0 });
    for (const inclinationDeg of [0, 180]) {
      const found = at(7000, inclinationDeg);
      if (!found.ok) throw new Error(found.message);
      expect(found.eccentricity).toBeLessThan(1e-8);
    }
  });

  it('has its perigee turned over by the sign of J3', () => {
    const turned = { ...mars, zonals: mars.zonals.map((value, n) => (n === 3 ? -value : value)) };
    const [south, north] = [at(3796, 60, mars), at(3796, 60, turned)];
    if (!(south.ok && north.ok)) throw new Error('both were expected');
    expect(south.perigeeRad).toBe(1.5 * Math.PI);
    expect(north.perigeeRad).toBe(0.5 * Math.PI);
    expect(north.eccentricity).toBeCloseTo(south.eccentricity, 10);
  });

  it('says what makes it doubtful', () => {
    const cautionsOf = (result: FrozenResult) => (result.ok ? result.cautions.join(' ') : refusal(result));
    expect(cautionsOf(at(7714.428, 66.039))).toMatch(/critical inclination is only 2\.60° away/);
    expect(cautionsOf(at(7000, 98, gravitySets.WGS72))).toMatch(/WGS72 has zonals to degree 4 only.*degrees 5 to 13/);
    expect(cautionsOf(at(12_102, 59, bodies.venus))).toMatch(/balance is unstable/);
    expect(cautionsOf(at(1838, 90, bodies.moon))).toMatch(/J2 does not dominate at Moon/);
  });
});

describe('no frozen orbit', () => {
  it('near the critical inclination, prograde and retrograde', () => {
    for (const inclinationDeg of [61, 63.4349, 65.9, 114.1, 116.565, 119]) {
      expect(refusal(at(7000, inclinationDeg))).toMatch(/^criticalInclination: the inclination is \d\.\d\d° from/);
    }
  });

  it('where the odd zonals are not known: says which', () => {
    const body = customBody({ name: 'Ovoid', muKm3PerS2: 4e5, radiusKm: 6000, zonals: [0, 0, 1e-3] });
    expect(refusal(at(7000, 98, body))).toMatch(/^oddZonalsUnknown: the odd zonals of Ovoid are missing \(J3, then J5/);
    const sphere = customBody({ name: 'Sphere', muKm3PerS2: 4e5, radiusKm: 6000, zonals: [] });
    expect(refusal(at(7000, 98, sphere))).toMatch(/^oblatenessUnknown: J2 of Sphere is missing/);
  });

  it('inside the body, or where the perigee would be', () => {
    expect(refusal(at(6378, 98))).toMatch(/^insideBody: the orbit lies inside Earth: a 6378\.0 km, radius 6378\.1 km/);
    expect(refusal(at(6380, 98))).toMatch(/^noSolution: no eccentricity below 0\.00029/);
    expect(refusal(at(6351, 90, bodies.venus))).toMatch(/^noSolution: .* J3 alone would ask for 0\.228/);
  });

  it('for numbers that are no orbit: says what was expected', () => {
    for (const a of [Number.NaN, 0, -7000, Infinity]) {
      expect(refusal(at(a, 98))).toMatch(/^badInput: the semi-major axis must be a positive number of km/);
    }
    for (const i of [Number.NaN, -1, 181]) {
      expect(refusal(at(7000, i))).toMatch(/^badInput: the inclination must lie between 0° and 180°/);
    }
  });
});

describe('the zero nearest to 0', () => {
  it('is the smaller of several, on either side', () => {
    const cubic = (x: number) => (x - 0.3) * (x + 0.1) * (x - 0.8);
    expect(nearestRoot(cubic, 0.9)).toEqual({ ok: true, x: expect.closeTo(-0.1, 12) });
    const pair = (x: number) => (x - 0.1002) * (x + 0.1);
    expect(nearestRoot(pair, 0.9)).toEqual({ ok: true, x: expect.closeTo(-0.1, 12) });
  });

  it('is told apart from none, and from a search that failed', () => {
    expect(nearestRoot((x) => 1 + x, 0.5)).toEqual({ ok: false, reason: 'none' });
    expect(nearestRoot(() => 0, 0.5)).toEqual({ ok: true, x: 0 });
    expect(nearestRoot((x) => (x > 0.2 ? -1 : 1), 0.5)).toMatchObject({ ok: false, reason: 'notConverged' });
  });
});
