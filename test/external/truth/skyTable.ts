/**
 * Sun and Moon from astronomy-engine 2.1.19, in the mean equator and equinox of an epoch held inertial, as a table that an
 * integration can read quickly.
 *
 * Geometric positions (no aberration: gravity does not see it). Eight-point Lagrange interpolation on a grid of six
 * hours: the Moon turns 0.06 rad in six hours, which leaves far less than a metre.
 */
import { Body as Celestial, GeoMoon, GeoVector } from 'astronomy-engine';
import { meanOfDateFromJ2000 } from '../skyOracle';

const astronomicalUnitKm = 149_597_870.7;
const perDay = 4;
const points = 8;
/** Nodes before the epoch and after the span, so that every interpolation is centred. */
const margin = 4;

export interface SkyTable {
  /** Fills `out` with the position (km) `days` after the epoch. */
  readonly sun: (out: number[], days: number) => void;
  readonly moon: (out: number[], days: number) => void;
}

export function skyTable(epoch: Date, spanDays: number): SkyTable {
  const rotation = meanOfDateFromJ2000(epoch);
  const count = Math.ceil(spanDays * perDay) + 2 * margin;
  const sun = new Float64Array(3 * count);
  const moon = new Float64Array(3 * count);
  for (let node = 0; node < count; node += 1) {
    const date = new Date(epoch.getTime() + ((node - margin + 1) / perDay) * 86_400_000);
    for (const [table, vector] of [
      [sun, GeoVector(Celestial.Sun, date, false)],
      [moon, GeoMoon(date)],
    ] as const) {
      rotation.forEach((row, axis) => {
        table[3 * node + axis] = astronomicalUnitKm * (row[0] * vector.x + row[1] * vector.y + row[2] * vector.z);
      });
    }
  }
  return { sun: (out, days) => interpolate(out, sun, days), moon: (out, days) => interpolate(out, moon, days) };
}

/** (−1)^(7−j) / (j! (7−j)!) */
const weights = Array.from({ length: points }, (_, j) => (-1) ** (points - 1 - j) / (factorial(j) * factorial(7 - j)));

function interpolate(out: number[], table: Float64Array, days: number): void {
  const place = days * perDay + margin - 1;
  const first = Math.floor(place) - margin + 1;
  const x = place - first;
  const exact = Math.round(x);
  if (x === exact) {
    for (let axis = 0; axis < 3; axis += 1) out[axis] = table[3 * (first + exact) + axis] as number;
    return;
  }
  let all = 1;
  for (let j = 0; j < points; j += 1) all *= x - j;
  out[0] = 0;
  out[1] = 0;
  out[2] = 0;
  for (let j = 0; j < points; j += 1) {
    const weight = (all * (weights[j] as number)) / (x - j);
    for (let axis = 0; axis < 3; axis += 1) {
      out[axis] = (out[axis] as number) + weight * (table[3 * (first + j) + axis] as number);
    }
  }
}

function factorial(n: number): number {
  return n <= 1 ? 1 : n * factorial(n - 1);
}
