/** Whether an orbit breaks limits, cheaply enough to ask at every point of a chart. */
import type { Body } from '../bodies/body';
import type { MeanElements } from '../orbit/elements';
import { roughHeights } from '../orbit/roughHeights';
import { type Limit, marginLeft } from './limits';
import { isHeight } from './readings/heights';
import type { ReadingPoint } from './readings/reading';
import { readingSpec } from './readings/readings';

/**
 * True where at least one limit is broken by the orbit's second-order readings. `limits` as from `knownLimits`; `epochJd`
 * (UTC) serves local times. Heights above the ellipsoid are rough here (see `roughHeights`), so that a coarse grid is shaded
 * within a frame. A reading that the orbit does not have breaks nothing, nor does an orbit that the theory cannot describe.
 */
export function violatesAt(body: Body, mean: MeanElements, epochJd: number | null, limits: readonly Limit[]): boolean {
  const point = { body, mean, epochJd };
  return limits.some((limit) => marginLeft(limit, valueAt(point, limit)) < 0);
}

function valueAt(point: ReadingPoint, { reading }: Limit): number {
  if (isHeight(reading)) {
    const { leastKm, greatestKm } = roughHeights(point.body, point.mean);
    return reading === 'leastHeight' ? leastKm : greatestKm;
  }
  const spec = readingSpec(reading);
  return !spec || spec.missing?.(point) ? Number.NaN : spec.evaluate(point, 'second');
}
