import { e_tilt, MakeTime, Rotation_EQJ_EQD } from 'astronomy-engine';

export type Vec3 = readonly [number, number, number];
type Matrix3 = readonly [Vec3, Vec3, Vec3];

/**
 * The sky as astronomy-engine 2.1.19 has it, with nutation taken off again where the comparison
 * is with quantities from which nutation is left out by design.
 */

export const firstYear = 1980;
export const lastYear = 2060;

/** Dates over 1980–2060, `count` of them, spread so that day, month and season all vary. */
export function spreadDates(count: number): readonly Date[] {
  const first = Date.UTC(firstYear, 0, 1);
  const last = Date.UTC(lastYear, 11, 31);
  return Array.from({ length: count }, (_, index) => {
    // Golden-ratio steps never fall into step with a day or a year. Whole milliseconds, as Date keeps them.
    const share = (index * 0.6180339887498949) % 1;
    return new Date(Math.round(first + share * (last - first)));
  });
}

export function julianDateOf(date: Date): number {
  return 2440587.5 + date.getTime() / 86_400_000;
}

/** Wraps an angle in rad into [−π, π]. */
export function wrapPi(rad: number): number {
  return Math.atan2(Math.sin(rad), Math.cos(rad));
}

/** From mean equator and equinox of J2000 to true equator and equinox of date, nutation included. */
export function trueOfDateFromJ2000(date: Date): Matrix3 {
  return fromColumns(Rotation_EQJ_EQD(MakeTime(date)).rot);
}

/** From mean equator and equinox of J2000 to mean equator and equinox of date: nutation undone. */
export function meanOfDateFromJ2000(date: Date): Matrix3 {
  const tilt = e_tilt(MakeTime(date));
  const trueOfDate = trueOfDateFromJ2000(date);
  const radPerArcsec = Math.PI / 180 / 3600;
  const meanObliquity = (tilt.mobl * Math.PI) / 180;
  const trueObliquity = (tilt.tobl * Math.PI) / 180;
  // Nutation takes mean to true: about x to the ecliptic, about z by Δψ, about x back by the true obliquity.
  const undo = (vector: Vec3): Vec3 =>
    aboutX(aboutZ(aboutX(vector, -trueObliquity), tilt.dpsi * -radPerArcsec), meanObliquity);
  const [x, y, z] = transpose(trueOfDate).map(undo);
  if (!x || !y || !z) throw new Error('expected three columns');
  return transpose([x, y, z]);
}

/** The library keeps rot[i][j] so that column i is where axis i goes. */
function fromColumns(rot: readonly (readonly number[])[]): Matrix3 {
  const column = (index: number): Vec3 => {
    const [a, b, c] = rot[index] ?? [];
    if (a === undefined || b === undefined || c === undefined) throw new Error('expected a 3 by 3 matrix');
    return [a, b, c];
  };
  return transpose([column(0), column(1), column(2)]);
}

export function angleBetweenDeg(a: Vec3, b: Vec3): number {
  const chord = Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]);
  return (2 * Math.asin(Math.min(1, chord / 2)) * 180) / Math.PI;
}

function transpose([a, b, c]: Matrix3): Matrix3 {
  return [
    [a[0], b[0], c[0]],
    [a[1], b[1], c[1]],
    [a[2], b[2], c[2]],
  ];
}

/** Turns a vector about x, counter-clockwise seen from +x. */
function aboutX([x, y, z]: Vec3, rad: number): Vec3 {
  return [x, Math.cos(rad) * y - Math.sin(rad) * z, Math.sin(rad) * y + Math.cos(rad) * z];
}

function aboutZ([x, y, z]: Vec3, rad: number): Vec3 {
  return [Math.cos(rad) * x - Math.sin(rad) * y, Math.sin(rad) * x + Math.cos(rad) * y, z];
}
