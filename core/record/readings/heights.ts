/** Heights above the ellipsoid, least and greatest along one revolution. */
import { twoPi } from '../../numerics/angles';
import { ellipsoidHeightKm, heightsAlongOrbit } from '../../orbit/heights';
import { stateFromMean } from '../../orbit/meanState';
import type { ReadingId, ReadingPoint, ReadingSpec } from './reading';

export type HeightId = 'leastHeight' | 'greatestHeight';

export function isHeight(id: ReadingId): id is HeightId {
  return id === 'leastHeight' || id === 'greatestHeight';
}

/** One walk along the orbit serves both; null where J2 terms are too large for the orbit to close. */
export function heightValues({ body, mean }: ReadingPoint): Partial<Record<ReadingId, number>> | null {
  try {
    const { leastKm, greatestKm } = heightsAlongOrbit(body, mean);
    return { leastHeight: leastKm, greatestHeight: greatestKm };
  } catch {
    return null;
  }
}

export function heightReading(id: HeightId, label: string): ReadingSpec {
  const evaluate = ({ body, mean }: ReadingPoint) => {
    const { leastKm, greatestKm } = heightsAlongOrbit(body, mean);
    return id === 'leastHeight' ? leastKm : greatestKm;
  };
  return {
    id,
    label,
    symbol: id === 'leastHeight' ? 'h min' : 'h max',
    quantity: 'length',
    mark: 'none',
    ordered: false,
    evaluate,
    slopeOf: (point) => heightAtFixedPlace(point, id),
  };
}

/** Samples a revolution: between them the place is found by a parabola. */
const samples = 48;

/**
 * At an extreme the height does not change with the place, so its slope in a, e and i is that of
 * the height at the place held: a handful of points instead of six walks around the orbit.
 */
function heightAtFixedPlace(point: ReadingPoint, id: HeightId): (point: ReadingPoint) => number {
  const sign = id === 'leastHeight' ? 1 : -1;
  const heightAt = ({ body, mean }: ReadingPoint, meanAnomalyRad: number) =>
    ellipsoidHeightKm(body, stateFromMean(body, { ...mean, meanAnomalyRad }).positionKm);
  const heights = Array.from({ length: samples }, (_, index) => sign * heightAt(point, (index * twoPi) / samples));
  const best = heights.indexOf(Math.min(...heights));
  const [before, at, after] = [best + samples - 1, best, best + 1].map((index) => heights[index % samples] ?? 0);
  const curvature = (before ?? 0) - 2 * (at ?? 0) + (after ?? 0);
  const shift = curvature === 0 ? 0 : ((before ?? 0) - (after ?? 0)) / (2 * curvature);
  const placeRad = ((best + shift) * twoPi) / samples;
  return (other) => heightAt(other, placeRad);
}
