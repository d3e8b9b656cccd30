import type { Body } from './body';
import { rotationFromDegPerDay } from './rotation';

/** Mars. J22 is left out, so near-synchronous orbits are not described well. */
export const mars: Body = {
  id: 'mars',
  name: 'Mars',
  gravitySet: 'MRO120D',
  // Konopliv, Park and Folkner, Icarus 274, 253 (2016), second-hand. J2 1.9566e-3 goes with 3396.0 km;
  // 1.9555e-3 goes with 3397 km. J4 from memory.
  muKm3PerS2: 42828.37581,
  radiusKm: 3396,
  zonals: [0, 0, 1.9566e-3, 3.145e-5, -1.538e-5],
  // Ellipsoid 3396.19 × 3376.20 km: IAU working group, 2015. For altitudes only.
  equatorialRadiusKm: 3396.19,
  flattening: (3396.19 - 3376.2) / 3396.19,
  // Konopliv et al. (2016), second-hand.
  rotationRadPerS: rotationFromDegPerDay(350.891985307),
  // Sidereal year 686.98 d; the tropical year is shorter by 1e-5 of itself.
  yearDays: 686.98,
  source:
    'Konopliv et al. (2016), Icarus 274, second-hand; J4 from memory. Ellipsoid: IAU 2015. ' +
    'Year: sidereal, 686.98 d.',
};
