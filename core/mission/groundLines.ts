/** Cuts a line on the ground where it leaves the map at the antimeridian. */
import { wrapPi } from '../numerics/angles';
import type { GroundPoint } from './groundMotion';

export interface LineTags {
  readonly ascending: boolean;
  /** Revolution, 0 from the first ascending crossing on. */
  readonly pass: number;
}

/** One stroke of the pen: nowhere does it leap from one edge of the map to the other. */
export interface GroundLine extends LineTags {
  /** East, rad, from −π to π. */
  readonly longitudeRad: Float64Array;
  /** Geodetic, rad. */
  readonly latitudeRad: Float64Array;
}

/** Points closer than half a turn of longitude to their neighbours, in order. */
export function linesWithinMap(points: readonly GroundPoint[], tags: LineTags): readonly GroundLine[] {
  const lines: GroundLine[] = [];
  let longitudes: number[] = [];
  let latitudes: number[] = [];
  const finish = () => {
    const line = { longitudeRad: Float64Array.from(longitudes), latitudeRad: Float64Array.from(latitudes) };
    if (longitudes.length > 1) lines.push({ ...tags, ...line });
    longitudes = [];
    latitudes = [];
  };
  const add = (longitude: number, latitude: number) => {
    longitudes.push(longitude);
    latitudes.push(latitude);
  };
  for (const { longitudeRad, latitudeRad } of points) {
    const here = wrapPi(longitudeRad);
    const before = longitudes.at(-1);
    if (before !== undefined) {
      const step = wrapPi(here - before);
      const ahead = before + step;
      if (Math.abs(ahead) > Math.PI) {
        const edge = Math.sign(ahead) * Math.PI;
        const latitudeBefore = latitudes.at(-1) ?? latitudeRad;
        const latitude = latitudeBefore + ((edge - before) / step) * (latitudeRad - latitudeBefore);
        add(edge, latitude);
        finish();
        add(-edge, latitude);
      }
    }
    add(here, latitudeRad);
  }
  finish();
  return lines;
}
