import type { Body } from './body';
import { rotationFromPeriodDays } from './rotation';

/** The Moon. J2 does not dominate here: the closed form is a first guess only. */
export const moon: Body = {
  id: 'moon',
  name: 'Moon',
  gravitySet: 'GRAIL',
  // Williams et al., J. Geophys. Res. Planets 119, 1546 (2014).
  muKm3PerS2: 4902.80007,
  radiusKm: 1738,
  // J2 2.033e-4 at 1738 km (same source); J3 and J4 of the same missions; all three from memory.
  zonals: [0, 0, 2.033e-4, 8.476e-6, -9.59e-6],
  // Sphere of 1737.4 km: IAU working group on cartographic coordinates, 2015.
  equatorialRadiusKm: 1737.4,
  flattening: 0,
  // Sidereal month 27.321661 d, not the tropical month of 27.321582 d (Astronomical Almanac).
  rotationRadPerS: rotationFromPeriodDays(27.321661),
  // The Sun goes round the Moon's sky, against the stars, with the Earth's year.
  yearDays: 365.2422,
  source:
    'Williams et al. (2014), GRAIL, zonals at 1738 km from memory. Radius: IAU 2015. ' +
    'Sidereal month and year: Astronomical Almanac.',
};
