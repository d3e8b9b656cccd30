/** What the Drift place draws: closed-form lines over the chosen span. */
import { computed, type ReadonlySignal } from '@preact/signals';
import { type ClosedFormDrift, closedFormDrift, type ResolvedOrbit } from '../../core/index';

/** Enough for a straight line to be read off at any day of the span. */
const samples = 241;

export function createDrift(
  orbit: ReadonlySignal<ResolvedOrbit | null>,
  spanDays: ReadonlySignal<number>,
): ReadonlySignal<ClosedFormDrift | null> {
  return computed(() =>
    orbit.value
      ? closedFormDrift({ body: orbit.value.body, mean: orbit.value.mean, spanDays: spanDays.value, samples })
      : null,
  );
}
