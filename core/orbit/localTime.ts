import type { Body } from '../bodies/body';
import { meanSunRightAscensionRad, sunPosition } from '../bodies/sun';
import { secondsPerDay, twoPi, wrapTwoPi } from '../numerics/angles';

export interface LocalTimeOptions {
  /** Whose local time: missions quote either node, 12 h apart. */
  readonly node: 'ascending' | 'descending';
  /** The mean Sun keeps clock time, which missions quote; the apparent Sun is where it is seen. */
  readonly sun: 'mean' | 'apparent';
}

/**
 * Local time of a node of an Earth orbit, hours in [0, 24): 12 h + (Ω − α)/15°, and 12 h more at
 * the descending node. Right ascension of the ascending node in rad, mean equinox of date.
 */
export function localTimeOfNodeH(nodeRad: number, jdUtc: number, options: LocalTimeOptions): number {
  const hours = (wrapTwoPi(nodeRad - nodeAtMidnightRad(jdUtc, options)) / twoPi) * 24;
  return hours >= 24 ? 0 : hours;
}

/** Right ascension of the ascending node, rad in [0, 2π), mean equinox of date, from a local time in hours. */
export function nodeFromLocalTimeRad(hours: number, jdUtc: number, options: LocalTimeOptions): number {
  return wrapTwoPi((hours / 24) * twoPi + nodeAtMidnightRad(jdUtc, options));
}

/**
 * How fast the local time of either node moves, seconds of local time per second, from a node rate
 * in rad/s: (Ω̇ − 2π/year) as time of day, with the sign turned on a retrograde rotator, where
 * clocks run 12 h − (Ω − α)/15°. Null where the body's year, or the sense of its rotation, is unknown.
 */
export function localTimeDriftSPerS(nodeRadPerS: number, body: Body): number | null {
  if (body.yearDays === null || body.rotationRadPerS === null) return null;
  const sunRadPerS = twoPi / (body.yearDays * secondsPerDay);
  const sense = body.rotationRadPerS < 0 ? -1 : 1;
  return (sense * (nodeRadPerS - sunRadPerS) * secondsPerDay) / twoPi;
}

/** Right ascension of the ascending node at which the asked-for node has local time 0 h. */
function nodeAtMidnightRad(jdUtc: number, { node, sun }: LocalTimeOptions): number {
  const sunRad = sun === 'mean' ? meanSunRightAscensionRad(jdUtc) : sunPosition(jdUtc).rightAscensionRad;
  return node === 'ascending' ? sunRad - Math.PI : sunRad;
}
