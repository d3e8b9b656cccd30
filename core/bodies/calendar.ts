/**
 * Days of the Gregorian calendar, extended backwards where needed.
 *
 * Years are shifted to begin in March, so that the leap day comes last, and counted in eras of
 * 400 years: 146 097 days exactly. Julian day numbers follow Meeus, Astronomical Algorithms,
 * chapter 7: 2000 January 1, 12 h is 2451545.0.
 */

export interface CalendarDate {
  readonly year: number;
  /** 1 to 12. */
  readonly month: number;
  readonly day: number;
}

const daysPerEra = 146_097;
/** Julian date of 0000 March 1, 0 h. */
const firstMarchJd = 1_721_119.5;

export function isLeapYear(year: number): boolean {
  return year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0);
}

export function daysInYear(year: number): number {
  return isLeapYear(year) ? 366 : 365;
}

export function daysInMonth(year: number, month: number): number {
  if (month === 2) return isLeapYear(year) ? 29 : 28;
  return [4, 6, 9, 11].includes(month) ? 30 : 31;
}

/** Julian date at 0 h UTC of a date that exists. */
export function julianDateOfMidnight({ year, month, day }: CalendarDate): number {
  const marchYear = month > 2 ? year : year - 1;
  const era = Math.floor(marchYear / 400);
  const yearOfEra = marchYear - 400 * era;
  const dayOfYear = Math.floor((153 * ((month + 9) % 12) + 2) / 5) + day - 1;
  const dayOfEra = 365 * yearOfEra + Math.floor(yearOfEra / 4) - Math.floor(yearOfEra / 100) + dayOfYear;
  return firstMarchJd + daysPerEra * era + dayOfEra;
}

/** The date whose 0 h UTC has this Julian date; the inverse of `julianDateOfMidnight`. */
export function dateFromMidnight(jd: number): CalendarDate {
  const days = Math.round(jd - firstMarchJd);
  const era = Math.floor(days / daysPerEra);
  const dayOfEra = days - daysPerEra * era;
  const leapDays = Math.floor(dayOfEra / 1460) - Math.floor(dayOfEra / 36_524) + Math.floor(dayOfEra / 146_096);
  const yearOfEra = Math.floor((dayOfEra - leapDays) / 365);
  const dayOfYear = dayOfEra - (365 * yearOfEra + Math.floor(yearOfEra / 4) - Math.floor(yearOfEra / 100));
  const monthFromMarch = Math.floor((5 * dayOfYear + 2) / 153);
  const month = monthFromMarch < 10 ? monthFromMarch + 3 : monthFromMarch - 9;
  return {
    year: 400 * era + yearOfEra + (month <= 2 ? 1 : 0),
    month,
    day: dayOfYear - Math.floor((153 * monthFromMarch + 2) / 5) + 1,
  };
}
