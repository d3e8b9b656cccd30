import type { Body } from './body';
import { rescaleZonals, zonalsFromNormalised } from './zonals';

/**
 * The Earth under four gravity sets, each kept whole. Shape, rotation and year are the same in
 * all four, so that an altitude means the same whichever set is chosen.
 */

/** Rotation of the Earth in inertial space, rad/s: NIMA TR 8350.2, 3rd edition, table 3.1. */
export const earthRotationRadPerS = 7.292115e-5;

const shape = {
  id: 'earth',
  name: 'Earth',
  // WGS 84 ellipsoid: a 6378.137 km, 1/f 298.257223563 (NIMA TR 8350.2, 3rd edition, table 3.1).
  equatorialRadiusKm: 6378.137,
  flattening: 1 / 298.257223563,
  rotationRadPerS: earthRotationRadPerS,
  // Mean tropical year near J2000, days of 86 400 s (Astronomical Almanac, section C).
  yearDays: 365.2422,
} as const;

const shapeSource = 'Ellipsoid and rotation: WGS 84, NIMA TR 8350.2, 3rd edition. Tropical year: Astronomical Almanac.';

/**
 * EGM2008, tide-free, C̄(2,0) to C̄(14,0): Pavlis et al., J. Geophys. Res. 117, B04406 (2012); NGA.
 * Degrees 2 to 12 were compared in two independent copies, 13 and 14 read in one.
 */
const egm2008Normalised = [
  -4.84165143790815e-4, 9.57161207093473e-7, 5.39965866638991e-7, 6.86702913736681e-8, -1.49953927978527e-7,
  9.05120844521618e-8, 4.94756003005199e-8, 2.801807532163e-8, 5.33304381729473e-8, -5.07683787085927e-8,
  3.64361922614572e-8, 4.17293021685027e-8, -2.26681154094404e-8,
];

/** Scale of EGM96 and EGM2008 alike, in the terrestrial time scale: km³/s² and km. */
const egmScale = { muKm3PerS2: 398600.4415, radiusKm: 6378.1363 } as const;

/** EGM96, tide-free, C̄(2,0) to C̄(6,0): Lemoine et al., NASA/TP-1998-206861 (1998). From memory. */
const egm96Normalised = [-4.84165371736e-4, 9.57254173792e-7, 5.39873863789e-7, 6.8532347563e-8, -1.49957994714e-7];

const egm96Zonals = zonalsFromNormalised(egm96Normalised);

/** WGS 84 defining constants: NIMA TR 8350.2, 3rd edition (1997, amended 2000), table 3.1. */
const wgs84Scale = { muKm3PerS2: 398600.4418, radiusKm: 6378.137 } as const;

/** J2 of the WGS 84 ellipsoid, from its C̄(2,0) = −0.484166774985e-3, NIMA TR 8350.2, table 3.3. From memory. */
const wgs84J2 = Math.sqrt(5) * 0.484166774985e-3;

const EGM2008: Body = {
  ...shape,
  ...egmScale,
  gravitySet: 'EGM2008',
  zonals: zonalsFromNormalised(egm2008Normalised),
  source: `EGM2008, tide-free: Pavlis et al. (2012), J. Geophys. Res. 117, B04406; NGA. ${shapeSource}`,
};

const EGM96: Body = {
  ...shape,
  ...egmScale,
  gravitySet: 'EGM96',
  zonals: egm96Zonals,
  source: `EGM96, tide-free, zonals to degree 6 from memory: Lemoine et al. (1998), NASA/TP-1998-206861. ${shapeSource}`,
};

const WGS84: Body = {
  ...shape,
  ...wgs84Scale,
  gravitySet: 'WGS84',
  // The standard names EGM96 as its gravity model beyond the ellipsoid's J2 (chapter 5); those
  // zonals are rewritten for the standard's own μ and radius, so that the set stays whole.
  zonals: [0, 0, wgs84J2, ...rescaleZonals(egm96Zonals, egmScale, wgs84Scale).slice(3)],
  source:
    'WGS 84: NIMA TR 8350.2, 3rd edition; J2 of the ellipsoid, J3 to J6 of its gravity model EGM96 ' +
    `referred to the WGS 84 radius (zonals from memory). ${shapeSource}`,
};

/**
 * The set that two-line elements are made with: Seppelin, The Department of Defense World Geodetic
 * System 1972; the values as used by SGP4, Hoots and Roehrich, Spacetrack Report no. 3 (1980).
 */
const WGS72: Body = {
  ...shape,
  muKm3PerS2: 398600.8,
  radiusKm: 6378.135,
  gravitySet: 'WGS72',
  zonals: [0, 0, 1.082616e-3, -2.53881e-6, -1.65597e-6],
  source: `WGS 72 as used with two-line elements: Spacetrack Report no. 3 (1980); J2 to J4. ${shapeSource}`,
};

/** The Earth under each gravity set; μ in km³/s², radii in km, rotation in rad/s, year in days. */
export const gravitySets = { EGM2008, EGM96, WGS84, WGS72 } as const satisfies Record<string, Body>;
