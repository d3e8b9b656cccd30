import { radPerDeg, twoPi, wrapTwoPi } from '../numerics/angles';
import { j2000Jd, polynomial, terrestrialCenturies } from './timeScales';

/**
 * Greenwich mean sidereal time, rad in [0, 2π), from UTC taken as UT1.
 *
 * Earth rotation angle plus the accumulated precession in right ascension, IAU 2006: Capitaine,
 * Wallace and Chapront, Astron. Astrophys. 432, 355 (2005), eq. 40 to 42; IERS Conventions 2010,
 * eq. 5.15 and 5.32. Nutation (equation of the equinoxes, 0.005° at most) is left out by design.
 */
export function meanSiderealTimeRad(jdUtc: number): number {
  return wrapTwoPi(earthRotationAngleRad(jdUtc) + accumulatedPrecessionRad(jdUtc));
}

function earthRotationAngleRad(jdUtc: number): number {
  const days = jdUtc - j2000Jd;
  // The whole turns of the day are dropped before scaling, or they would cost digits.
  const turns = (days % 1) + 0.779057273264 + 0.00273781191135448 * days;
  return twoPi * (turns % 1);
}

function accumulatedPrecessionRad(jdUtc: number): number {
  const centuries = terrestrialCenturies(jdUtc);
  const arcseconds = polynomial(centuries, [0.014506, 4612.156534, 1.3915817, -4.4e-7, -2.9956e-5, -3.68e-8]);
  return (arcseconds / 3600) * radPerDeg;
}
