/**
 * The Sun as a body sees it, in the inertial equatorial frame that orbits about that body are counted in.
 *
 * Earth: mean equator and equinox. Other bodies: their own equator, counted from where it rises through the equator of
 * J2000; see `equatorialFrame`. A body of the user's own has no year's motion that could be known: it is refused by name.
 */
import type { Vec3 } from '../numerics/vectors';
import type { Body } from './body';
import { heliocentricAu, type Planet, planetOrbits } from './planetOrbits';
import { equatorialFrame } from './poles';
import { precessionFromJ2000, precessionMatrix, transform, transpose } from './precession';
import { astronomicalUnitKm, sunPosition } from './sun';

export interface SunSeen {
  /** Unit vector from the body's centre to the Sun's. */
  readonly direction: Vec3;
  readonly distanceKm: number;
}

/** The Sun at a Julian date (UTC). */
export type SunAt = (jdUtc: number) => SunSeen;

export type SunModel =
  | { readonly ok: true; readonly sunAt: SunAt; readonly source: string }
  | { readonly ok: false; readonly reason: 'noSunModel'; readonly message: string };

/**
 * The Sun's motion seen from a body. The frame is that of `frameJd` (Julian date, UTC), held inertial: give the epoch
 * where the elements are counted in the epoch's frame; left out, it is the frame of each date.
 *
 * Worst errors found against full theories, 1980 to 2060, the pole's included: Earth 0.011°, Mercury and Venus 0.01°,
 * Mars 0.03°, Jupiter 0.15°, Saturn and the Moon 0.26° (the Moon's distance from the Earth is left out).
 */
export function sunSeenFrom(body: Body, frameJd?: number): SunModel {
  if (body.id === 'earth') return { ok: true, sunAt: earthSun(frameJd), source: earthSource };
  if (body.id === 'moon') return { ok: true, sunAt: moonSun(frameJd), source: moonSource };
  if (isPlanet(body.id)) return { ok: true, sunAt: planetSun(body.id, frameJd), source: planetSource };
  return {
    ok: false,
    reason: 'noSunModel',
    message: `How the Sun moves in the sky of ${body.name} is not known: light needs a body with its own year and tilt.`,
  };
}

const earthSource = 'Sun: Meeus (1998), chapter 25. Frame: IAU 2006 precession.';
const moonSource = 'Sun as seen from the Earth: Meeus (1998), chapter 25. Pole: IAU 2009, largest terms.';
const planetSource = 'Orbit: Standish, JPL, approximate elements 1800 to 2050. Pole: IAU 2009.';

function isPlanet(id: string): id is Planet {
  return Object.hasOwn(planetOrbits, id);
}

function earthSun(frameJd: number | undefined): SunAt {
  return (jd) => {
    const { directionMeanOfDate, distanceKm } = sunPosition(jd);
    if (frameJd === undefined) return { direction: directionMeanOfDate, distanceKm };
    return { direction: transform(precessionMatrix(jd, frameJd), directionMeanOfDate), distanceKm };
  };
}

function moonSun(frameJd: number | undefined): SunAt {
  return (jd) => {
    const { directionMeanOfDate, distanceKm } = sunPosition(jd);
    const j2000 = transform(transpose(precessionFromJ2000(jd)), directionMeanOfDate);
    return { direction: transform(equatorialFrame('moon', frameJd ?? jd), j2000), distanceKm };
  };
}

function planetSun(planet: Planet, frameJd: number | undefined): SunAt {
  return (jd) => {
    const [x, y, z] = heliocentricAu(planetOrbits[planet], jd);
    const distance = Math.hypot(x, y, z);
    const direction: Vec3 = [-x / distance, -y / distance, -z / distance];
    return {
      direction: transform(equatorialFrame(planet, frameJd ?? jd), direction),
      distanceKm: distance * astronomicalUnitKm,
    };
  };
}
