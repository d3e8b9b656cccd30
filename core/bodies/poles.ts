/**
 * Where the axes of the bodies point, and the equatorial frames that their orbits are counted in.
 *
 * z along the north pole of the IAU, x along the line where the body's equator rises through the equator of J2000 (right
 * ascension α₀ + 90°), held as they are at one date. Only trends over centuries are kept; nodding terms of Jupiter and
 * Saturn (under 0.01°) are left out. Source: Archinal et al., Report of the IAU working group on cartographic
 * coordinates and rotational elements: 2009, Celest. Mech. Dyn. Astron. 109, 101 (2011), tables 1 and 2; from memory.
 */
import { radPerDeg } from '../numerics/angles';
import type { Vec3 } from '../numerics/vectors';
import type { Planet } from './planetOrbits';
import type { Matrix3 } from './precession';
import { daysPerJulianCentury, terrestrialCenturies } from './timeScales';

interface Pole {
  readonly rightAscensionDeg: number;
  readonly declinationDeg: number;
}

type Linear = readonly [number, number];

/** Degrees at J2000 and their change in a century. */
const planets: Readonly<Record<Planet, { readonly rightAscension: Linear; readonly declination: Linear }>> = {
  mercury: { rightAscension: [281.0097, -0.0328], declination: [61.4143, -0.0049] },
  venus: { rightAscension: [272.76, 0], declination: [67.16, 0] },
  mars: { rightAscension: [317.68143, -0.1061], declination: [52.8865, -0.0609] },
  jupiter: { rightAscension: [268.056595, -0.006499], declination: [64.495303, 0.002413] },
  saturn: { rightAscension: [40.589, -0.036], declination: [83.537, -0.004] },
};

function planetPole(planet: Planet, centuries: number): Pole {
  const { rightAscension, declination } = planets[planet];
  return {
    rightAscensionDeg: rightAscension[0] + rightAscension[1] * centuries,
    declinationDeg: declination[0] + declination[1] * centuries,
  };
}

/** The largest terms of the Moon's pole, which goes round with its node in 18.6 years; the rest is under 0.15°. */
function moonPole(centuries: number): Pole {
  const days = centuries * daysPerJulianCentury;
  const node = (125.045 - 0.0529921 * days) * radPerDeg;
  const double = (250.089 - 0.1059842 * days) * radPerDeg;
  return {
    rightAscensionDeg: 269.9949 + 0.0031 * centuries - 3.8787 * Math.sin(node) - 0.1204 * Math.sin(double),
    declinationDeg: 66.5392 + 0.013 * centuries + 1.5419 * Math.cos(node) + 0.0239 * Math.cos(double),
  };
}

/** From the mean equator and equinox of J2000 into the body's equatorial frame at a Julian date (UTC). */
export function equatorialFrame(id: Planet | 'moon', jdUtc: number): Matrix3 {
  const centuries = terrestrialCenturies(jdUtc);
  const pole = id === 'moon' ? moonPole(centuries) : planetPole(id, centuries);
  const [alpha, delta] = [pole.rightAscensionDeg * radPerDeg, pole.declinationDeg * radPerDeg];
  const node: Vec3 = [-Math.sin(alpha), Math.cos(alpha), 0];
  const ahead: Vec3 = [-Math.cos(alpha) * Math.sin(delta), -Math.sin(alpha) * Math.sin(delta), Math.cos(delta)];
  const axis: Vec3 = [Math.cos(alpha) * Math.cos(delta), Math.sin(alpha) * Math.cos(delta), Math.sin(delta)];
  return [node, ahead, axis];
}
