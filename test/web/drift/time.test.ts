import { describe, expect, it } from 'vitest';
import { julianDateFromIso } from '../../../core/index';
import { daysNumber, readSpan, spanIdOf, spanText } from '../../../web/drift/spans';
import { momentText, timeTicks } from '../../../web/drift/timeAxis';

function jd(iso: string): number {
  const read = julianDateFromIso(iso);
  if (!read.ok) throw new Error(read.message);
  return read.jd;
}

describe('the time axis', () => {
  it('has years on a span of years', () => {
    const ticks = timeTicks({ epochJd: jd('2028-01-01'), spanDays: 1826.25 }, 7);
    expect(ticks.map(({ text }) => text)).toEqual(['2028', '2029', '2030', '2031', '2032']);
    expect(ticks[1]?.at).toBe(366);
  });

  it('has months on a year, days on a month, hours on a day', () => {
    expect(timeTicks({ epochJd: jd('2028-01-15'), spanDays: 365 }, 6)[0]).toEqual({ at: 77, text: '2028-04' });
    expect(timeTicks({ epochJd: jd('2028-01-15T12:00Z'), spanDays: 30 }, 8)[0]).toEqual({ at: 4.5, text: '01-20' });
    const hours = timeTicks({ epochJd: jd('2028-01-15T10:30Z'), spanDays: 1 }, 6).map(({ text }) => text);
    expect(hours).toEqual(['12:00', '18:00', '00:00', '06:00']);
  });

  it('counts days where no epoch is known', () => {
    const ticks = timeTicks({ epochJd: null, spanDays: 1826.25 }, 6).map(({ text }) => text);
    expect(ticks).toEqual(['0 d', '500 d', '1000 d', '1500 d']);
  });

  it('never has more ticks than there is room for, and none outside the span', () => {
    for (const epochJd of [null, jd('2027-03-21T10:30:00Z')]) {
      for (const spanDays of [1, 1.5, 4, 30, 90, 365.25, 1826.25, 5478.75]) {
        for (const most of [2, 3, 5, 9]) {
          const ticks = timeTicks({ epochJd, spanDays }, most);
          expect(ticks.length).toBeLessThanOrEqual(most + 1);
          expect(ticks.every(({ at }) => at >= -1e-6 && at <= spanDays + 1e-6)).toBe(true);
        }
      }
    }
  });
});

describe('a moment in words', () => {
  it('is a date on long spans, with a time on short ones, a day without an epoch', () => {
    const epochJd = jd('2028-01-01');
    expect(momentText({ epochJd, spanDays: 1826 }, 366)).toBe('2029-01-01');
    expect(momentText({ epochJd, spanDays: 1 }, 0.5)).toBe('2028-01-01 12:00');
    expect(momentText({ epochJd: null, spanDays: 1826 }, 1217.4)).toBe('day 1217');
    expect(momentText({ epochJd: null, spanDays: 1 }, 0.25)).toBe('day 0.25');
  });
});

describe('the span', () => {
  it('is known by name, whole days counting as their years', () => {
    expect(spanIdOf(1825)).toBe('fiveYears');
    expect(spanIdOf(365.25)).toBe('year');
    expect(spanIdOf(31)).toBe('other');
    expect(spanText(1826.25)).toBe('5 years');
    expect(spanText(90)).toBe('90 days');
    expect(daysNumber(1826.25)).toBe('1826.25');
  });

  it('reads a decimal comma and point alike, and a day to 15 years', () => {
    expect(readSpan('90,5')).toEqual({ ok: true, days: 90.5 });
    expect(readSpan('5479')).toEqual({ ok: true, days: 5479 });
  });

  it.each(['', 'abc', 'NaN', 'Infinity', '1e400', '-5', '0', '5480'])('says what it expects for %j', (text) => {
    const read = readSpan(text);
    expect(read.ok).toBe(false);
    if (!read.ok) expect(read.error.message).toContain('from 1 to 5479 days');
  });

  it('asks which of two readings is meant', () => {
    const read = readSpan('1,234');
    expect(read.ok ? [] : read.error.choices?.map(({ text }) => text)).toEqual(['1.234', '1234']);
  });
});
