import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { seriesSpan } from '../../../core/bodies/julianDate';
import { nodePrecessionRadPerS, precessionMatrix, transform, transpose } from '../../../core/bodies/precession';
import { meanSiderealTimeRad } from '../../../core/bodies/siderealTime';
import { equationOfTimeS, meanSunRightAscensionRad, sunPosition } from '../../../core/bodies/sun';
import { wrapPi, wrapTwoPi } from '../../../core/numerics/angles';
import { norm } from '../../../core/numerics/vectors';

const anyJd = fc.double({ min: seriesSpan.firstJd, max: seriesSpan.lastJd, noNaN: true });

describe('meanSiderealTimeRad', () => {
  it('is the published value at J2000', () => {
    // 18 h 41 min 50.548 s at 2000 January 1, 12 h UT1: Explanatory Supplement to the Astronomical Almanac (1992), p. 50.
    const hours = (meanSiderealTimeRad(2451545) / (2 * Math.PI)) * 24;
    expect((hours - (18 + 41 / 60 + 50.548 / 3600)) * 3600).toBeCloseTo(0, 2);
  });

  it('is the published value of a worked example', () => {
    // 13 h 10 min 46.3668 s at 1987 April 10, 0 h UT: Meeus, Astronomical Algorithms, example 12.a.
    const hours = (meanSiderealTimeRad(2446895.5) / (2 * Math.PI)) * 24;
    expect((hours - (13 + 10 / 60 + 46.3668 / 3600)) * 3600).toBeCloseTo(0, 2);
  });

  it('gains 3 min 56.555 s a day', () => {
    const gain = wrapTwoPi(meanSiderealTimeRad(2461001.5) - meanSiderealTimeRad(2461000.5));
    expect((gain / (2 * Math.PI)) * 86400).toBeCloseTo(236.555, 2);
  });
});

describe('the mean Sun', () => {
  it('makes its hour angle at Greenwich the time of day less 12 h', () => {
    fc.assert(
      fc.property(anyJd, (jd) => {
        const hourAngle = meanSiderealTimeRad(jd) - meanSunRightAscensionRad(jd);
        expect(wrapPi(hourAngle - 2 * Math.PI * (jd % 1))).toBeCloseTo(0, 8);
      }),
    );
  });

  it('moves on by 0.985647° a day', () => {
    const step = wrapTwoPi(meanSunRightAscensionRad(2461011) - meanSunRightAscensionRad(2461001)) / 10;
    expect((step * 180) / Math.PI).toBeCloseTo(0.985647, 5);
  });
});

describe('the apparent Sun', () => {
  it('has a unit direction that agrees with its right ascension and declination', () => {
    fc.assert(
      fc.property(anyJd, (jd) => {
        const sun = sunPosition(jd);
        expect(norm(sun.directionMeanOfDate)).toBeCloseTo(1, 12);
        expect(Math.asin(sun.directionMeanOfDate[2])).toBeCloseTo(sun.declinationRad, 12);
        expect(sun.distanceKm / 149597870.7).toBeGreaterThan(0.983);
        expect(sun.distanceKm / 149597870.7).toBeLessThan(1.0168);
      }),
    );
  });

  it('is as far from the mean Sun as the equation of time says, never more than 17 min', () => {
    fc.assert(
      fc.property(anyJd, (jd) => {
        expect(Math.abs(equationOfTimeS(jd))).toBeLessThan(17 * 60);
      }),
    );
  });
});

describe('precessionMatrix', () => {
  it('is undone by the reverse and keeps lengths', () => {
    fc.assert(
      fc.property(anyJd, anyJd, (from, to) => {
        const there = transform(precessionMatrix(from, to), [0.6, 0, 0.8]);
        expect(norm(there)).toBeCloseTo(1, 13);
        const back = transform(precessionMatrix(to, from), there);
        const transposed = transform(transpose(precessionMatrix(from, to)), there);
        [0.6, 0, 0.8].forEach((value, index) => {
          expect(back[index]).toBeCloseTo(value, 13);
          expect(transposed[index]).toBeCloseTo(value, 13);
        });
      }),
    );
  });

  it('changes nothing between equal dates', () => {
    expect(transform(precessionMatrix(2460000, 2460000), [1, 2, 3])).toEqual([1, 2, 3]);
  });

  it('moves the node of a polar plane by 0.0128° a year', () => {
    expect(((nodePrecessionRadPerS * 180) / Math.PI) * 365.25 * 86400).toBeCloseTo(0.01281, 5);
    const days = 3652.5;
    const [x, y] = transform(precessionMatrix(2461000, 2461000 + days), [1, 0, 0]);
    expect(Math.atan2(y, x) / (days * 86400)).toBeCloseTo(nodePrecessionRadPerS, 14);
  });
});
