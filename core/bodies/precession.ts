import { radPerDeg, secondsPerDay } from '../numerics/angles';
import type { Vec3 } from '../numerics/vectors';
import { daysPerJulianCentury, polynomial, terrestrialCenturies } from './timeScales';

/** Rows of an orthogonal matrix. */
export type Matrix3 = readonly [Vec3, Vec3, Vec3];

const radPerArcsec = radPerDeg / 3600;

/**
 * Equatorial precession angles from J2000, arcseconds in powers of Julian centuries of TT.
 * Source: Capitaine, Wallace and Chapront, Astron. Astrophys. 412, 567 (2003), eq. 40; IAU 2006.
 */
const zetaArcsec = [2.650545, 2306.083227, 0.2988499, 0.01801828, -5.971e-6, -3.173e-7];
const zArcsec = [-2.650545, 2306.077181, 1.0927348, 0.01826837, -2.8596e-5, -2.904e-7];
const thetaArcsec = [0, 2004.191903, -0.4294934, -0.04182264, -7.089e-6, -1.274e-7];

/** General precession in right ascension at J2000, rad/s: 0.0128° a year. Linear term of ζ + z. */
export const nodePrecessionRadPerS =
  ((2306.083227 + 2306.077181) * radPerArcsec) / (daysPerJulianCentury * secondsPerDay);

/**
 * Turns a vector given in the mean equator and equinox of one date into those of another;
 * dates are Julian dates, UTC. Nutation is left out by design.
 */
export function precessionMatrix(fromJdUtc: number, toJdUtc: number): Matrix3 {
  if (fromJdUtc === toJdUtc) return identity;
  return multiply(fromJ2000(terrestrialCenturies(toJdUtc)), transpose(fromJ2000(terrestrialCenturies(fromJdUtc))));
}

/** From the mean equator and equinox of J2000 to those of a date, Julian date UTC. */
export function precessionFromJ2000(toJdUtc: number): Matrix3 {
  return fromJ2000(terrestrialCenturies(toJdUtc));
}

export function transform(matrix: Matrix3, vector: Vec3): Vec3 {
  return [rowTimes(matrix[0], vector), rowTimes(matrix[1], vector), rowTimes(matrix[2], vector)];
}

export function transpose([a, b, c]: Matrix3): Matrix3 {
  return [
    [a[0], b[0], c[0]],
    [a[1], b[1], c[1]],
    [a[2], b[2], c[2]],
  ];
}

const identity: Matrix3 = [
  [1, 0, 0],
  [0, 1, 0],
  [0, 0, 1],
];

/** R₃(−z) R₂(θ) R₃(−ζ), written out: Lieske et al., Astron. Astrophys. 58, 1 (1977), eq. 5. */
function fromJ2000(centuries: number): Matrix3 {
  const zeta = polynomial(centuries, zetaArcsec) * radPerArcsec;
  const z = polynomial(centuries, zArcsec) * radPerArcsec;
  const theta = polynomial(centuries, thetaArcsec) * radPerArcsec;
  const [cosZeta, sinZeta] = [Math.cos(zeta), Math.sin(zeta)];
  const [cosZ, sinZ] = [Math.cos(z), Math.sin(z)];
  const [cosTheta, sinTheta] = [Math.cos(theta), Math.sin(theta)];
  return [
    [cosZ * cosTheta * cosZeta - sinZ * sinZeta, -cosZ * cosTheta * sinZeta - sinZ * cosZeta, -cosZ * sinTheta],
    [sinZ * cosTheta * cosZeta + cosZ * sinZeta, -sinZ * cosTheta * sinZeta + cosZ * cosZeta, -sinZ * sinTheta],
    [sinTheta * cosZeta, -sinTheta * sinZeta, cosTheta],
  ];
}

function multiply(a: Matrix3, b: Matrix3): Matrix3 {
  const columns = transpose(b);
  return [transform(columns, a[0]), transform(columns, a[1]), transform(columns, a[2])];
}

function rowTimes(row: Vec3, vector: Vec3): number {
  return row[0] * vector[0] + row[1] * vector[1] + row[2] * vector[2];
}
