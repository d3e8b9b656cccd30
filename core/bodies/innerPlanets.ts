import type { Body } from './body';
import { rotationFromDegPerDay, rotationFromPeriodDays } from './rotation';

/** Venus. J2 is only 4e-6: J3 and J4 are as strong, and the closed form is a first guess only. */
export const venus: Body = {
  id: 'venus',
  name: 'Venus',
  gravitySet: 'MGNP180U',
  // Konopliv, Banerdt and Sjogren, Icarus 139, 3 (1999); J3 and J4 from memory.
  muKm3PerS2: 324858.592,
  radiusKm: 6051,
  zonals: [0, 0, 4.4044e-6, -2.108e-6, -2.147e-6],
  // Sphere of 6051.8 km for mapping: IAU working group, 2015.
  equatorialRadiusKm: 6051.8,
  flattening: 0,
  // Retrograde, −243.0226 d: Margot et al., Nature Astronomy 5, 676 (2021).
  rotationRadPerS: rotationFromPeriodDays(-243.0226),
  // Sidereal year, Astronomical Almanac; from memory.
  yearDays: 224.701,
  source:
    'Konopliv et al. (1999), Icarus 139; J3, J4 from memory. Rotation: Margot et al. (2021). ' +
    'Radius: IAU 2015. Year: sidereal, from memory.',
};

/** Mercury. J2 does not dominate: the closed form is a first guess only. */
export const mercury: Body = {
  id: 'mercury',
  name: 'Mercury',
  gravitySet: 'HgM002',
  // Smith et al., Science 336, 214 (2012); from memory. One set, so μ is not taken from a newer one.
  muKm3PerS2: 22031.78,
  radiusKm: 2440,
  zonals: [0, 0, 5.031e-5, 1.188e-5, 1.95e-5],
  // Ellipsoid 2440.53 × 2438.26 km: IAU working group, 2015; from memory.
  equatorialRadiusKm: 2440.53,
  flattening: (2440.53 - 2438.26) / 2440.53,
  // 6.1385108 deg/day: IAU working group, 2015; from memory.
  rotationRadPerS: rotationFromDegPerDay(6.1385108),
  // Sidereal year, Astronomical Almanac; from memory.
  yearDays: 87.9691,
  source:
    'Smith et al. (2012), Science 336, from memory. Ellipsoid and rotation: IAU 2015, from memory. ' +
    'Year: sidereal, from memory.',
};
