/** The ground that a swath covers along a line, as quadrilaterals on a sphere; good for swaths far narrower than the body. */
import type { GroundLine } from '../../../core/index';
import type { MapPoint } from './trackDrawn';

/** Nearer to a pole a step to the side has no longitude. */
const highestRad = 1.55;

/** One for each step of the line; `halfRad`: half the width as an angle at the body's centre. */
export function swathQuads(line: GroundLine, halfRad: number): readonly (readonly MapPoint[])[] {
  const sides = Array.from(line.longitudeRad, (_, index) => sidesAt(line, index, halfRad));
  return sides.slice(1).flatMap((after, index) => {
    const before = sides[index];
    return before && after ? [[before[0], after[0], after[1], before[1]]] : [];
  });
}

/** The points to the left and right; null over a pole. */
function sidesAt(line: GroundLine, index: number, halfRad: number): readonly [MapPoint, MapPoint] | null {
  const last = line.longitudeRad.length - 1;
  const at = (place: number): MapPoint => ({
    longitudeRad: line.longitudeRad[place] ?? Number.NaN,
    latitudeRad: line.latitudeRad[place] ?? Number.NaN,
  });
  const here = at(index);
  const [from, to] = [at(Math.max(0, index - 1)), at(Math.min(last, index + 1))];
  const cosine = Math.cos(here.latitudeRad);
  const east = (to.longitudeRad - from.longitudeRad) * cosine;
  const north = to.latitudeRad - from.latitudeRad;
  const length = Math.hypot(east, north);
  if (length === 0) return null;
  const side = (sign: number): MapPoint => {
    const latitudeRad = here.latitudeRad + (sign * halfRad * east) / length;
    return { latitudeRad, longitudeRad: here.longitudeRad - (sign * halfRad * north) / length / Math.cos(latitudeRad) };
  };
  const [left, right] = [side(1), side(-1)];
  const isOverPole = Math.max(Math.abs(left.latitudeRad), Math.abs(right.latitudeRad)) > highestRad;
  return isOverPole ? null : [left, right];
}
