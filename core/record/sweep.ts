/**
 * A sweep: one reading against one element, the others of the orbit held, or settled anew at each point where
 * conditions are to be kept.
 *
 * Only the one reading is worked out, in both orders where they differ. A point with no such orbit is NaN.
 */
import { rootInBracket } from '../numerics/bracket';
import type { MeanElements } from '../orbit/elements';
import { type Limit, marginLeft } from './limits';
import type { ReadingId, ReadingPoint } from './readings/reading';
import { readingSpec } from './readings/readings';
import { meanWith, type SweptElement } from './sweptElements';

export interface SweepRequest {
  readonly point: ReadingPoint;
  readonly reading: ReadingId;
  readonly element: SweptElement;
  /** Values of the element, rising (km, rad). */
  readonly places: Float64Array;
  /** Lets conditions settle their elements from a start; null where no orbit meets them. */
  readonly settle?: ((start: MeanElements) => MeanElements | null) | undefined;
}

export interface Sweep {
  readonly request: SweepRequest;
  /** By second order, or without a theory where none comes in; in the reading's core unit. */
  readonly values: Float64Array;
  /** Null where the orders do not differ by nature. */
  readonly first: Float64Array | null;
}

/** The reading at every place; or why this orbit does not have it. */
export function sweepReading(
  request: SweepRequest,
): { readonly ok: true; readonly sweep: Sweep } | { readonly ok: false; readonly reason: string } {
  const { reading, point, places } = request;
  const spec = readingSpec(reading);
  const reason = spec ? spec.missing?.(point) : 'This version does not know that reading.';
  if (!spec || reason) return { ok: false, reason: reason ?? '' };
  const values = new Float64Array(places.length);
  const first = spec.ordered ? new Float64Array(places.length) : null;
  places.forEach((place, index) => {
    const there = pointAt(request, place);
    values[index] = valueAt(there, reading, 'second');
    if (first) first[index] = valueAt(there, reading, 'first');
  });
  return { ok: true, sweep: { request, values, first } };
}

/** The whole orbit at a place of the sweep; null where there is none. */
export function pointAt({ point, element, settle }: SweepRequest, place: number): ReadingPoint | null {
  const started = meanWith(point, element, place);
  const mean = started && settle ? settle(started) : started;
  return mean && { ...point, mean };
}

/** NaN where there is no such orbit, or where the theory cannot describe it. */
function valueAt(point: ReadingPoint | null, reading: ReadingId, theory: 'first' | 'second'): number {
  if (!point) return Number.NaN;
  try {
    return readingSpec(reading)?.evaluate(point, theory) ?? Number.NaN;
  } catch {
    // Short-period terms beyond what the theory can carry: heights do not exist there.
    return Number.NaN;
  }
}

/** Where the reading meets a limit, to rounding, in rising order of the element. */
export function limitCrossings({ request, values }: Sweep, limit: Limit): number[] {
  const { places, reading } = request;
  const margin = (value: number) => marginLeft(limit, value);
  const found: number[] = [];
  for (let index = 1; index < places.length; index += 1) {
    const [low = 0, high = 0] = [places[index - 1], places[index]];
    const [atLow, atHigh] = [margin(values[index - 1] ?? Number.NaN), margin(values[index] ?? Number.NaN)];
    if (atLow === 0 && found.at(-1) !== low) found.push(low);
    if (!(atLow * atHigh < 0)) continue;
    const root = rootInBracket((place) => margin(valueAt(pointAt(request, place), reading, 'second')), {
      low,
      high,
      atLow,
      atHigh,
    });
    if (root.ok) found.push(root.x);
  }
  const last = places.length - 1;
  if (margin(values[last] ?? Number.NaN) === 0) found.push(places[last] ?? 0);
  return found;
}
