/** The Moon against astronomy-engine 2.1.19; the air against printed values. */
import { GeoMoon } from 'astronomy-engine';
import { describe, expect, it } from 'vitest';
import { airDensityKgPerM3, densityFactor, moonPlace, moonPosition, smoothedPlace, transform } from '../../core/index';
import { angleBetweenDeg, julianDateOf, meanOfDateFromJ2000, spreadDates, type Vec3 } from './skyOracle';

const astronomicalUnitKm = 149_597_870.7;
const dates = spreadDates(2000);

/**
 * The Almanac claims 0.3° in longitude and 0.2° in latitude, 0.36° together, and 0.003° of a parallax of 0.95°. Measured over
 * 20 000 dates: [0.374° at worst, 0.108° root mean square, 0.33 %].
 */
const tolerances = { directionDeg: 0.38, directionRmsDeg: 0.115, distanceShare: 0.004 } as const;

function truth(date: Date): { direction: Vec3; distanceKm: number } {
  const { x, y, z } = GeoMoon(date);
  const place = transform(meanOfDateFromJ2000(date), [x, y, z]);
  const distance = Math.hypot(...place);
  return {
    direction: [place[0] / distance, place[1] / distance, place[2] / distance],
    distanceKm: distance * astronomicalUnitKm,
  };
}

describe('the Moon against astronomy-engine, 1980 to 2060', () => {
  const gaps = dates.map((date) => {
    const ours = moonPosition(julianDateOf(date));
    const theirs = truth(date);
    return {
      deg: angleBetweenDeg(ours.directionMeanOfDate, theirs.direction),
      share: Math.abs(ours.distanceKm / theirs.distanceKm - 1),
    };
  });

  it('stands in the same direction', () => {
    expect(Math.max(...gaps.map(({ deg }) => deg))).toBeLessThan(tolerances.directionDeg);
    expect(Math.sqrt(gaps.reduce((sum, { deg }) => sum + deg * deg, 0) / gaps.length)).toBeLessThan(
      tolerances.directionRmsDeg,
    );
  });

  it('is at the same distance', () => {
    expect(Math.max(...gaps.map(({ share }) => share))).toBeLessThan(tolerances.distanceShare);
  });

  it('is read from a cubic as from the series', () => {
    const epoch = 2_461_000.5;
    const place = moonPlace(epoch);
    const smooth = smoothedPlace(place, epoch);
    for (let k = 0; k < 200; k += 1) {
      const jd = epoch + 40 * ((k * 0.618) % 1);
      const [a, b] = [place(jd), smooth(jd)];
      expect(Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2])).toBeLessThan(1);
    }
  });
});

describe('density of the air', () => {
  // Check value 23: Vallado, Fundamentals of Astrodynamics and Applications, table 8-4.
  it.each([
    [400, 3.725e-12],
    [500, 6.967e-13],
    [600, 1.454e-13],
    [800, 1.17e-14],
  ])('at %d km is as printed', (heightKm, density) => {
    expect(airDensityKgPerM3(heightKm) / density).toBeCloseTo(1, 9);
  });

  it('is continuous from layer to layer: the table was made so, and a slip in it would show', () => {
    for (const edge of [
      25, 40, 60, 90, 100, 110, 120, 130, 150, 180, 200, 250, 300, 350, 400, 450, 500, 600, 800, 1000,
    ]) {
      const [below, above] = [airDensityKgPerM3(edge - 1e-9), airDensityKgPerM3(edge)];
      expect(Math.abs(below / above - 1)).toBeLessThan(0.006);
    }
  });

  it('knows its levels', () => {
    expect([densityFactor('low'), densityFactor('mean'), densityFactor('high'), densityFactor(3)]).toEqual([
      0.5, 1, 2, 3,
    ]);
  });
});
