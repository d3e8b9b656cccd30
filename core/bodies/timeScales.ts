import { secondsPerDay } from '../numerics/angles';

/** Julian date of the standard epoch J2000.0 (TT) and the length of a Julian century, days. */
export const j2000Jd = 2_451_545;
export const daysPerJulianCentury = 36_525;

/**
 * ΔT = TT − UT in seconds. UTC is taken as UT1, which differs by 0.9 s at most.
 *
 * Source: Espenak and Meeus, Five Millennium Canon of Solar Eclipses, NASA/TP-2006-214141,
 * section 2.7, polynomial expressions for 1941 to 2150. It predicts: the true value in the 2020s
 * is some 6 s lower, which moves the Sun by 7e-5°. Before 1941 and after 2150 the long-term parabola.
 */
export function deltaTSeconds(jdUtc: number): number {
  const year = 2000 + (jdUtc - 2_451_544.5) / 365.25;
  const longTerm = -20 + 32 * ((year - 1820) / 100) ** 2;
  if (year < 1941) return longTerm;
  if (year < 1961) return polynomial(year - 1950, [29.07, 0.407, -1 / 233, 1 / 2547]);
  if (year < 1986) return polynomial(year - 1975, [45.45, 1.067, -1 / 260, -1 / 718]);
  if (year < 2005) {
    return polynomial(year - 2000, [63.86, 0.3345, -0.060374, 0.0017275, 0.000651814, 0.00002373599]);
  }
  if (year < 2050) return polynomial(year - 2000, [62.92, 0.32217, 0.005589]);
  if (year < 2150) return longTerm - 0.5628 * (2150 - year);
  return longTerm;
}

/** Julian date in terrestrial time from one in UTC. */
export function terrestrialTimeJd(jdUtc: number): number {
  return jdUtc + deltaTSeconds(jdUtc) / secondsPerDay;
}

/** Julian centuries of terrestrial time since J2000.0. */
export function terrestrialCenturies(jdUtc: number): number {
  return (terrestrialTimeJd(jdUtc) - j2000Jd) / daysPerJulianCentury;
}

/** c₀ + c₁x + c₂x² + …, by Horner's rule. */
export function polynomial(x: number, coefficients: readonly number[]): number {
  return coefficients.reduceRight((sum, coefficient) => sum * x + coefficient, 0);
}
