/** Angle units and wrapping. */

export const twoPi = 2 * Math.PI;
export const radPerDeg = Math.PI / 180;
export const degPerRad = 180 / Math.PI;
export const secondsPerDay = 86_400;

/** Wraps an angle in rad into [0, 2π). */
export function wrapTwoPi(angleRad: number): number {
  const wrapped = angleRad - twoPi * Math.floor(angleRad / twoPi);
  // A tiny negative angle rounds up to a whole turn.
  return wrapped >= twoPi ? 0 : wrapped;
}

/** Wraps an angle in rad into [−π, π); one that lies there already keeps every digit. */
export function wrapPi(angleRad: number): number {
  if (angleRad >= -Math.PI && angleRad < Math.PI) return angleRad;
  return wrapTwoPi(angleRad + Math.PI) - Math.PI;
}
