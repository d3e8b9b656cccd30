import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  betaRad,
  bodies,
  circularEclipseShare,
  customBody,
  eclipse,
  eclipseFreeBetaRad,
  LightError,
  lightHistory,
  type MeanElements,
  periods,
  sunPosition,
} from '../../../core/index';
import { at, orbits } from './orbits';

const { earth } = bodies;
const jd = 2_461_193;
const sun = sunPosition(jd);

/** A circle whose plane makes this β with the Sun of `jd`: inclination 90°, so that sin β = cos δ sin(Ω − α). */
function circleAt(beta: number, semiMajorAxisKm: number): MeanElements {
  const turn = Math.asin(Math.sin(beta) / Math.cos(sun.declinationRad));
  return at({ semiMajorAxisKm, eccentricity: 0, inclinationRad: Math.PI / 2, nodeRad: sun.rightAscensionRad + turn });
}

/** The orbit of a body without oblateness, on which the closed form is exact but for the cone. */
const round = { ...earth, zonals: [] };

describe('β', () => {
  it('is the Sun’s height above the orbit plane by the textbook formula', () => {
    fc.assert(
      fc.property(orbits(0), (mean) => {
        const { inclinationRad: i, nodeRad } = mean;
        const { declinationRad: delta, rightAscensionRad: alpha } = sun;
        const sine = Math.cos(delta) * Math.sin(i) * Math.sin(nodeRad - alpha) + Math.sin(delta) * Math.cos(i);
        expect(betaRad(earth, mean, jd)).toBeCloseTo(Math.asin(sine), 12);
      }),
      { numRuns: 200, seed: 4 },
    );
  });

  it('counts the Sun in the frame of the elements', () => {
    const mean = at({ inclinationRad: 1.7 });
    const later = jd + 3652.5;
    // Ten years turn the equinox by 0.14°.
    const apart = Math.abs(betaRad(earth, mean, later) - betaRad(earth, mean, later, jd));
    expect(apart).toBeGreaterThan(1e-4);
    expect(apart).toBeLessThan(3e-3);
  });

  it('is refused by name for a body whose Sun is unknown', () => {
    const body = customBody({ name: 'Pebble', muKm3PerS2: 1e5, radiusKm: 3000, zonals: [] });
    expect(() => betaRad(body, at({}), jd)).toThrow(LightError);
    expect(() => eclipse(body, at({}), jd)).toThrow(/Pebble/);
    expect(lightHistory({ body, epochJd: jd, samples: [{ days: 0, mean: at({}) }] })).toMatchObject({
      ok: false,
      reason: 'noSunModel',
    });
  });
});

describe('eclipse', () => {
  it('on a circle lies on either side of the closed form: less umbra, more shadow in all', () => {
    for (const beta of [0, 0.3, 0.7, 0.9]) {
      const mean = circleAt(beta, 6928);
      const shadow = { radiusKm: round.equatorialRadiusKm, heightKm: 6928 - round.equatorialRadiusKm, betaRad: beta };
      const cylinderS = circularEclipseShare(shadow) * periods(round, mean, 'first').nodalS;
      const { umbraS, penumbraS } = eclipse(round, mean, jd);
      expect(umbraS).toBeLessThan(cylinderS);
      expect(umbraS + penumbraS).toBeGreaterThan(cylinderS);
      expect(umbraS + 0.5 * penumbraS).toBeCloseTo(cylinderS, 0);
    }
  });

  it('ends at the closed form’s β: there half the Sun is hidden for a moment', () => {
    const limit = eclipseFreeBetaRad({ radiusKm: round.equatorialRadiusKm, heightKm: 6928 - round.equatorialRadiusKm });
    expect(eclipse(round, circleAt(limit - 0.01, 6928), jd).umbraS).toBeGreaterThan(0);
    expect(eclipse(round, circleAt(limit, 6928), jd).umbraS).toBe(0);
    expect(eclipse(round, circleAt(limit, 6928), jd).penumbraS).toBeGreaterThan(0);
    expect(eclipse(round, circleAt(limit + 0.01, 6928), jd)).toEqual({ umbraS: 0, penumbraS: 0 });
  });

  it('shrinks steadily, without gaps, where the orbit comes to graze the shadow', () => {
    const limit = eclipseFreeBetaRad({ radiusKm: round.equatorialRadiusKm, heightKm: 6928 - round.equatorialRadiusKm });
    const inAll = (depth: number) => {
      const { umbraS, penumbraS } = eclipse(round, circleAt(limit - 0.0045 - depth, 6928), jd);
      return umbraS + 0.5 * penumbraS;
    };
    expect(inAll(0.004)).toBeGreaterThan(0);
    const widths = [0, 0.002, 0.004, 0.006, 0.008, 0.01].map(inAll);
    expect(widths).toEqual([...widths].sort((a, b) => a - b));
  });

  it('of a steep ellipse is long at apogee and short at perigee', () => {
    const steep = { semiMajorAxisKm: 24_400, eccentricity: 0.72 };
    const node = sun.rightAscensionRad;
    const tilt = sun.declinationRad;
    // In the plane of the ecliptic, about: the Sun lies in the plane, 180° from the shadow.
    const inPlane = (perigeeRad: number) =>
      eclipse(earth, at({ ...steep, inclinationRad: Math.abs(tilt), nodeRad: node - Math.PI / 2, perigeeRad }), jd)
        .umbraS;
    const times = [0, 1, 2, 3, 4, 5, 6].map(inPlane);
    expect(Math.max(...times)).toBeGreaterThan(2 * Math.min(...times));
    // Each point of the ellipse is either in shadow or not: never more than the revolution.
    for (const time of times) expect(time).toBeLessThan(0.3 * periods(earth, at(steep), 'first').keplerianS);
  });

  it('is nothing at all or a finite time for any ellipse', () => {
    fc.assert(
      fc.property(orbits(0), (mean) => {
        const { umbraS, penumbraS } = eclipse(earth, mean, jd);
        const periodS = periods(earth, mean, 'second').nodalS;
        expect(umbraS).toBeGreaterThanOrEqual(0);
        expect(penumbraS).toBeGreaterThanOrEqual(0);
        expect(umbraS + penumbraS).toBeLessThan(0.5 * periodS);
      }),
      { numRuns: 500, seed: 24 },
    );
  });

  it('has its own length at Mars, with a smaller Sun and a narrower penumbra', () => {
    const { mars } = bodies;
    const mean = at({ semiMajorAxisKm: mars.equatorialRadiusKm + 400, eccentricity: 0.01, inclinationRad: 1.62 });
    const { umbraS, penumbraS } = eclipse(mars, mean, jd);
    const share = circularEclipseShare({
      radiusKm: mars.equatorialRadiusKm,
      heightKm: 400,
      betaRad: betaRad(mars, mean, jd),
    });
    expect(umbraS / periods(mars, mean, 'second').nodalS).toBeCloseTo(share, 1);
    expect(penumbraS).toBeGreaterThan(0);
  });
});
