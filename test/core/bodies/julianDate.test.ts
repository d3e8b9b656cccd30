import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dateFromMidnight, daysInMonth, daysInYear, julianDateOfMidnight } from '../../../core/bodies/calendar';
import { isoFromJulianDate, julianDateFromIso, seriesSpan } from '../../../core/bodies/julianDate';

function jdOf(text: string): number {
  const result = julianDateFromIso(text);
  if (!result.ok) throw new Error(result.message);
  return result.jd;
}

function messageOf(text: string): string {
  const result = julianDateFromIso(text);
  if (result.ok) throw new Error(`expected a refusal of ${text}, got ${result.jd}`);
  return result.message;
}

describe('julianDateFromIso', () => {
  // Meeus, Astronomical Algorithms, 2nd edition, table 7.A and examples 7.a, 7.b.
  it.each([
    ['2000-01-01T12:00:00Z', 2451545],
    ['1999-01-01', 2451179.5],
    ['1987-01-27', 2446822.5],
    ['1987-06-19T12:00Z', 2446966],
    ['1988-06-19T12:00', 2447332],
    ['1900-01-01', 2415020.5],
    ['1957-10-04T19:26:24', 2436116.31],
  ])('reads %s as %d', (text, jd) => {
    expect(jdOf(text)).toBeCloseTo(jd, 8);
  });

  it('takes a numeric offset as time ahead of UTC', () => {
    expect(jdOf('2027-03-21T10:30:00+02:00')).toBe(jdOf('2027-03-21T08:30:00Z'));
    expect(jdOf('2027-03-21T23:30:00-0130')).toBe(jdOf('2027-03-22T01:00:00Z'));
    expect(jdOf('2027-03-21T23:30:00\u221201')).toBe(jdOf('2027-03-22T00:30:00Z'));
  });

  it('reads a fraction of a second, with a point or a comma, and small letters or a space', () => {
    const half = jdOf('2027-03-21T10:30:00Z') + 0.5 / 86400;
    for (const text of ['2027-03-21T10:30:00.5Z', ' 2027-03-21t10:30:00,5z ', '2027-03-21 10:30:00.500']) {
      expect(jdOf(text)).toBeCloseTo(half, 9);
    }
  });

  it('carries a leap second into the next day', () => {
    expect(jdOf('2016-12-31T23:59:60Z')).toBe(jdOf('2017-01-01T00:00:00Z'));
  });

  it.each([
    ['', /empty/],
    ['tomorrow', /not a date/],
    ['2027-3-21', /not a date/],
    ['21.03.2027', /not a date/],
    ['2027-13-01', /no month 13/],
    ['2027-02-29', /no day 29 in 2027-02, which has 28 days/],
    ['2100-02-29', /which has 28 days/],
    ['2027-00-10', /no month 0/],
    ['2027-01-00', /no day 0/],
    ['2027-01-01T24:00', /Hours go from 00 to 23/],
    ['2027-01-01T10:60', /Minutes go from 00 to 59/],
    ['2027-01-01T10:30:60', /Seconds go from 00 to 59/],
    ['2027-01-01T10:30:00+24:00', /offset from UTC/],
  ])('refuses "%s" and says what was expected', (text, problem) => {
    expect(messageOf(text)).toMatch(problem);
    expect(messageOf(text)).toContain('2027-03-21T10:30:00Z');
  });
});

describe('isoFromJulianDate', () => {
  it('returns every second of the checked span as it was read', () => {
    const seconds = fc.integer({ min: 0, max: Math.round((seriesSpan.lastJd - seriesSpan.firstJd) * 86400) });
    fc.assert(
      fc.property(seconds, (second) => {
        // The platform's own calendar is the judge: 1950 January 1 is −631 152 000 s.
        const text = new Date((second - 631_152_000) * 1000).toISOString().replace('.000', '');
        expect(isoFromJulianDate(jdOf(text))).toBe(text);
        expect(jdOf(text)).toBeCloseTo(seriesSpan.firstJd + second / 86400, 8);
      }),
    );
  });

  it('rounds up into the next day', () => {
    expect(isoFromJulianDate(jdOf('2027-12-31T23:59:59.7'))).toBe('2028-01-01T00:00:00Z');
  });

  it('refuses a number that is no date', () => {
    expect(() => isoFromJulianDate(Number.NaN)).toThrow(/finite Julian date/);
  });
});

describe('calendar', () => {
  it('gives back every date over eight centuries', () => {
    const wrong: number[] = [];
    for (let jd = 2305447.5; jd < 2305447.5 + 8 * 36525; jd += 1) {
      const date = dateFromMidnight(jd);
      if (julianDateOfMidnight(date) !== jd || date.day > daysInMonth(date.year, date.month)) wrong.push(jd);
    }
    expect(wrong).toEqual([]);
  });

  it('knows which centuries have a leap year', () => {
    expect([1900, 2000, 2024, 2026, 2100].map(daysInYear)).toEqual([365, 366, 366, 365, 365]);
  });
});
