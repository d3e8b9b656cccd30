import { radPerDeg, secondsPerDay, twoPi } from '../numerics/angles';

/** Rotation in rad/s from the degrees a day that the IAU working group publishes; the sign is kept. */
export function rotationFromDegPerDay(degPerDay: number): number {
  return (degPerDay * radPerDeg) / secondsPerDay;
}

/** Rotation in rad/s from a sidereal period in days; negative for a retrograde rotator. */
export function rotationFromPeriodDays(periodDays: number): number {
  return twoPi / (periodDays * secondsPerDay);
}
