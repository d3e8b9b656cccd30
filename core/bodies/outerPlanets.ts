import type { Body } from './body';
import { rotationFromDegPerDay } from './rotation';

/** Jupiter. Altitudes are above the 1-bar ellipsoid. */
export const jupiter: Body = {
  id: 'jupiter',
  name: 'Jupiter',
  gravitySet: 'Juno 2018',
  // μ of the planet without its satellites: Jacobson, JUP230 (2003); from memory.
  muKm3PerS2: 126686534,
  radiusKm: 71492,
  // Iess et al., Nature 555, 220 (2018), J2 to J8; from memory.
  zonals: [0, 0, 14696.572e-6, -0.042e-6, -586.609e-6, -0.069e-6, 34.198e-6, 0.124e-6, -2.426e-6],
  // Ellipsoid 71492 × 66854 km at 1 bar: IAU working group, 2015.
  equatorialRadiusKm: 71492,
  flattening: (71492 - 66854) / 71492,
  // System III, 870.536 deg/day: IAU working group, 2015.
  rotationRadPerS: rotationFromDegPerDay(870.536),
  // Sidereal year, Astronomical Almanac; from memory.
  yearDays: 4332.589,
  source:
    'μ: Jacobson (2003), JUP230. Zonals: Iess et al. (2018), Nature 555. Ellipsoid and rotation (System III): IAU 2015. ' +
    'Year: sidereal. All from memory.',
};

/** Saturn. Altitudes are above the 1-bar ellipsoid; the gravity set's radius is another one. */
export const saturn: Body = {
  id: 'saturn',
  name: 'Saturn',
  gravitySet: 'Cassini 2019',
  // μ of the planet without its satellites: Jacobson et al., Astron. J. 132, 2520 (2006); from memory.
  muKm3PerS2: 37931207.7,
  radiusKm: 60330,
  // Iess et al., Science 364, eaat2965 (2019), J2 to J6; from memory.
  zonals: [0, 0, 16290.573e-6, 0.059e-6, -935.314e-6, -0.224e-6, 86.34e-6],
  // Ellipsoid 60268 × 54364 km at 1 bar: IAU working group, 2015.
  equatorialRadiusKm: 60268,
  flattening: (60268 - 54364) / 60268,
  // System III, 810.7939024 deg/day: IAU working group, 2015.
  rotationRadPerS: rotationFromDegPerDay(810.7939024),
  // Sidereal year, Astronomical Almanac; from memory.
  yearDays: 10759.22,
  source:
    'μ: Jacobson et al. (2006). Zonals at 60330 km: Iess et al. (2019), Science 364. Ellipsoid and rotation (System III): IAU 2015. ' +
    'Year: sidereal. All from memory.',
};
