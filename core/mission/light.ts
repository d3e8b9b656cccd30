/**
 * Light on an orbit: the Sun's angle from the orbit plane, and the time in the body's shadow.
 *
 * Elements and Sun must be counted in one frame. With a date alone that is the body's equator and equinox of the date; for
 * a history counted in the frame of its epoch give `frameJd`, and the Sun is turned into it.
 */
import type { Body } from '../bodies/body';
import { type SunSeen, sunSeenFrom } from '../bodies/sunSeenFrom';
import { twoPi } from '../numerics/angles';
import type { MeanElements } from '../orbit/elements';
import { secularRates } from '../orbit/secularRates';
import { litOrbit } from './shadow';
import { type ShadowArc, shadowArcs } from './shadowArcs';

/** No light can be told: the Sun's motion in the sky of this body is unknown. */
export class LightError extends Error {
  constructor(
    readonly reason: 'noSunModel',
    message: string,
  ) {
    super(message);
    this.name = 'LightError';
  }
}

/**
 * β, rad in [−π/2, π/2]: the Sun's height above the orbit plane, positive on the side of the angular momentum.
 * sin β = cos δ sin i sin(Ω − α) + sin δ cos i, as a dot product. `jd` and `frameJd` are Julian dates (UTC).
 *
 * @throws LightError for a body whose Sun is unknown; `sunSeenFrom` tells beforehand.
 */
export function betaRad(body: Body, mean: MeanElements, jd: number, frameJd?: number): number {
  return betaUnder(mean, sunOf(body, jd, frameJd));
}

/** β (rad) under the Sun seen so. */
export function betaUnder(mean: MeanElements, sun: SunSeen): number {
  const { sinBeta, cosBeta } = litOrbit(mean, sun);
  return Math.atan2(sinBeta, cosBeta);
}

export interface EclipseTimes {
  /** Time a revolution in which the Sun is wholly hidden, s. */
  readonly umbraS: number;
  /** Time a revolution in which it is partly hidden, s; the umbra is not in it. */
  readonly penumbraS: number;
}

/**
 * Shadow of the revolution that these mean elements describe, under the Sun of `jd` (UTC).
 *
 * Cones on the true ellipse with its short-period J2 terms. Node, perigee and Sun are those of the deepest shadow and held
 * for the one revolution: there, within 3 s of a count along integrated orbits (15 cases, grazing ones too). Elements of half a
 * revolution before matter where the orbit grazes: the node's own drift meanwhile may change such a shadow by 10 % and more.
 *
 * @throws LightError for a body whose Sun is unknown; Error for elements that are no ellipse.
 */
export function eclipse(body: Body, mean: MeanElements, jd: number, frameJd?: number): EclipseTimes {
  const { umbraS, penumbraS } = eclipseUnder(body, mean, sunOf(body, jd, frameJd));
  return { umbraS, penumbraS };
}

export interface RevolutionLight extends EclipseTimes {
  readonly revolutionS: number;
}

/** As `eclipse`, under the Sun seen so, with the revolution that the times belong to. */
export function eclipseUnder(body: Body, mean: MeanElements, sun: SunSeen): RevolutionLight {
  // The shadow stands still among the stars: a turn against them, along the orbit, is what its arcs are a share of.
  const { nodeRadPerS, perigeeRadPerS, meanAnomalyRadPerS } = secularRates(body, mean, 'second');
  const alongRadPerS = meanAnomalyRadPerS + perigeeRadPerS + nodeRadPerS * Math.cos(mean.inclinationRad);
  const revolutionS = twoPi / alongRadPerS;
  const { umbra, penumbra } = shadowArcs(body, mean, sun);
  const time = (arcs: readonly ShadowArc[]) =>
    (revolutionS / twoPi) * arcs.reduce((sum, { fromRad, toRad }) => sum + toRad - fromRad, 0);
  const umbraS = time(umbra);
  return { umbraS, penumbraS: Math.max(0, time(penumbra) - umbraS), revolutionS };
}

function sunOf(body: Body, jd: number, frameJd: number | undefined): SunSeen {
  const model = sunSeenFrom(body, frameJd);
  if (!model.ok) throw new LightError(model.reason, model.message);
  return model.sunAt(jd);
}
