/**
 * Where the Sun and the Moon stand, as forces on an Earth orbit need it: km, in the mean equator and equinox of the orbit's
 * epoch, held inertial. The series give places of date; precession takes them back to the epoch.
 */
import { moonPosition } from '../bodies/moonPosition';
import { precessionMatrix, transform } from '../bodies/precession';
import { sunPosition } from '../bodies/sun';
import { scale, type Vec3 } from '../numerics/vectors';

/** Position (km) of a body at a Julian date, UTC. */
export type SkyPlace = (jdUtc: number) => Vec3;

/** Moves the Sun by 0.0057°, which its pull does not see; aberration is left in. */
export function sunPlace(epochJdUtc: number): SkyPlace {
  return (jd) => {
    const { directionMeanOfDate, distanceKm } = sunPosition(jd);
    return scale(transform(precessionMatrix(jd, epochJdUtc), directionMeanOfDate), distanceKm);
  };
}

export function moonPlace(epochJdUtc: number): SkyPlace {
  return (jd) => {
    const { directionMeanOfDate, distanceKm } = moonPosition(jd);
    return scale(transform(precessionMatrix(jd, epochJdUtc), directionMeanOfDate), distanceKm);
  };
}

/** Days between the places that are kept: the Moon turns 0.06 rad meanwhile. */
const gridDays = 0.25;

/**
 * The same places, read from a cubic through four of them: for an integrator, which asks many times a day. Differs from the
 * series by 3e-7 of the distance at most.
 */
export function smoothedPlace(place: SkyPlace, epochJdUtc: number): SkyPlace {
  const known = new Map<number, Vec3>();
  const at = (node: number): Vec3 => {
    const found = known.get(node);
    if (found) return found;
    // A year of nodes; an integrator goes forwards and needs only the last few.
    if (known.size > 1500) known.clear();
    const made = place(epochJdUtc + node * gridDays);
    known.set(node, made);
    return made;
  };
  return (jd) => {
    const x = (jd - epochJdUtc) / gridDays;
    const first = Math.floor(x) - 1;
    const t = x - first;
    const [a, b, c, d] = [at(first), at(first + 1), at(first + 2), at(first + 3)];
    // Lagrange's weights for nodes 0, 1, 2, 3.
    const wa = (-(t - 1) * (t - 2) * (t - 3)) / 6;
    const wb = (t * (t - 2) * (t - 3)) / 2;
    const wc = (-t * (t - 1) * (t - 3)) / 2;
    const wd = (t * (t - 1) * (t - 2)) / 6;
    return [
      wa * a[0] + wb * b[0] + wc * c[0] + wd * d[0],
      wa * a[1] + wb * b[1] + wc * c[1] + wd * d[1],
      wa * a[2] + wb * b[2] + wc * c[2] + wd * d[2],
    ];
  };
}
