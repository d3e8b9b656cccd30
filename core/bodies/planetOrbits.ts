/**
 * Where the planets stand round the Sun, well enough for light: Keplerian elements with linear rates.
 *
 * Source: Standish, "Keplerian elements for approximate positions of the major planets", JPL, table 1, 1800 to 2050;
 * numbers from memory, checked in the tests against a full theory over 1980 to 2060.
 */
import { radPerDeg } from '../numerics/angles';
import type { Vec3 } from '../numerics/vectors';
import { terrestrialCenturies } from './timeScales';

/** Value at J2000 and rate in a Julian century; degrees, astronomical units; ecliptic and equinox of J2000. */
type Linear = readonly [number, number];

export interface PlanetOrbit {
  readonly axisAu: Linear;
  readonly eccentricity: Linear;
  readonly inclinationDeg: Linear;
  readonly longitudeDeg: Linear;
  readonly perihelionDeg: Linear;
  readonly nodeDeg: Linear;
}

export type Planet = 'mercury' | 'venus' | 'mars' | 'jupiter' | 'saturn';

export const planetOrbits: Readonly<Record<Planet, PlanetOrbit>> = {
  mercury: {
    axisAu: [0.38709927, 0.00000037],
    eccentricity: [0.20563593, 0.00001906],
    inclinationDeg: [7.00497902, -0.00594749],
    longitudeDeg: [252.2503235, 149472.67411175],
    perihelionDeg: [77.45779628, 0.16047689],
    nodeDeg: [48.33076593, -0.12534081],
  },
  venus: {
    axisAu: [0.72333566, 0.0000039],
    eccentricity: [0.00677672, -0.00004107],
    inclinationDeg: [3.39467605, -0.0007889],
    longitudeDeg: [181.9790995, 58517.81538729],
    perihelionDeg: [131.60246718, 0.00268329],
    nodeDeg: [76.67984255, -0.27769418],
  },
  mars: {
    axisAu: [1.52371034, 0.00001847],
    eccentricity: [0.0933941, 0.00007882],
    inclinationDeg: [1.84969142, -0.00813131],
    longitudeDeg: [-4.55343205, 19140.30268499],
    perihelionDeg: [-23.94362959, 0.44441088],
    nodeDeg: [49.55953891, -0.29257343],
  },
  jupiter: {
    axisAu: [5.202887, -0.00011607],
    eccentricity: [0.04838624, -0.00013253],
    inclinationDeg: [1.30439695, -0.00183714],
    longitudeDeg: [34.39644051, 3034.74612775],
    perihelionDeg: [14.72847983, 0.21252668],
    nodeDeg: [100.47390909, 0.20469106],
  },
  saturn: {
    axisAu: [9.53667594, -0.0012506],
    eccentricity: [0.05386179, -0.00050991],
    inclinationDeg: [2.48599187, 0.00193609],
    longitudeDeg: [49.95424423, 1222.49362201],
    perihelionDeg: [92.59887831, -0.41897216],
    nodeDeg: [113.66242448, -0.28867794],
  },
};

/** Obliquity of J2000, rad: IAU 1976, as the table's own frame has it. */
const obliquityRad = 23.43928 * radPerDeg;

/** Heliocentric position in au, mean equator and equinox of J2000, at a Julian date (UTC). */
export function heliocentricAu(orbit: PlanetOrbit, jdUtc: number): Vec3 {
  const centuries = terrestrialCenturies(jdUtc);
  const at = ([value, rate]: Linear) => value + rate * centuries;
  const eccentricity = at(orbit.eccentricity);
  const inclination = at(orbit.inclinationDeg) * radPerDeg;
  const node = at(orbit.nodeDeg) * radPerDeg;
  const perihelion = (at(orbit.perihelionDeg) - at(orbit.nodeDeg)) * radPerDeg;
  const anomaly = eccentricAnomaly((at(orbit.longitudeDeg) - at(orbit.perihelionDeg)) * radPerDeg, eccentricity);
  const axis = at(orbit.axisAu);
  const along = axis * (Math.cos(anomaly) - eccentricity);
  const across = axis * Math.sqrt(1 - eccentricity ** 2) * Math.sin(anomaly);
  const fromNode = along * Math.cos(perihelion) - across * Math.sin(perihelion);
  const ahead = along * Math.sin(perihelion) + across * Math.cos(perihelion);
  const x = fromNode * Math.cos(node) - ahead * Math.cos(inclination) * Math.sin(node);
  const y = fromNode * Math.sin(node) + ahead * Math.cos(inclination) * Math.cos(node);
  const z = ahead * Math.sin(inclination);
  const [c, s] = [Math.cos(obliquityRad), Math.sin(obliquityRad)];
  return [x, c * y - s * z, s * y + c * z];
}

/** Newton's steps: four are exact to rounding below e 0.21. */
function eccentricAnomaly(meanAnomalyRad: number, eccentricity: number): number {
  let anomaly = meanAnomalyRad + eccentricity * Math.sin(meanAnomalyRad);
  for (let step = 0; step < 4; step += 1) {
    const miss = anomaly - eccentricity * Math.sin(anomaly) - meanAnomalyRad;
    anomaly -= miss / (1 - eccentricity * Math.cos(anomaly));
  }
  return anomaly;
}
