import { describe, expect, it } from 'vitest';
import { julianDateOfMidnight } from '../../../core/bodies/calendar';
import { deltaTSeconds, polynomial, terrestrialTimeJd } from '../../../core/bodies/timeScales';

const newYear = (year: number) => julianDateOfMidnight({ year, month: 1, day: 1 });

describe('deltaTSeconds', () => {
  // Observed values: Astronomical Almanac, section K, reduction of time scales.
  it.each([
    [1950, 29.15, 0.2],
    [1975, 45.48, 0.2],
    [2000, 63.83, 0.2],
    [2020, 69.36, 2.5],
  ])('is near the observed value in %d', (year, seconds, tolerance) => {
    expect(Math.abs(deltaTSeconds(newYear(year)) - seconds)).toBeLessThan(tolerance);
  });

  it('joins its pieces within a second', () => {
    for (const year of [1961, 1986, 2005, 2050, 2150]) {
      const step = deltaTSeconds(newYear(year) + 5) - deltaTSeconds(newYear(year) - 5);
      expect(Math.abs(step)).toBeLessThan(1);
    }
  });

  it('puts terrestrial time ahead of UTC by about 69 s in 2020', () => {
    expect((terrestrialTimeJd(newYear(2020)) - newYear(2020)) * 86400).toBeCloseTo(deltaTSeconds(newYear(2020)), 3);
  });

  it('stays finite far outside the span', () => {
    expect(deltaTSeconds(newYear(1800))).toBeLessThan(0);
    expect(deltaTSeconds(newYear(2300))).toBeGreaterThan(300);
  });
});

describe('polynomial', () => {
  it('starts with the constant term', () => {
    expect(polynomial(2, [1, 10, 100])).toBe(421);
  });
});
