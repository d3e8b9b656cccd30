/** The limits of the candidate: read, and how much is left of each on the orbit at hand. */
import { computed, type ReadonlySignal, type Signal } from '@preact/signals';
import {
  type Candidate,
  type LimitEntry,
  type LimitMargin,
  limitMargins,
  type Reading,
  type ReadLimit,
  readLimits,
} from '../../core/index';

export interface Limits {
  readonly read: ReadonlySignal<readonly ReadLimit[]>;
  readonly margins: ReadonlySignal<readonly LimitMargin[]>;
  add(limit: LimitEntry): void;
  change(place: number, limit: LimitEntry): void;
  remove(place: number): void;
}

export function createLimits(draft: Signal<Candidate>, readings: ReadonlySignal<readonly Reading[]>): Limits {
  const stored = computed(() => draft.value.limits);
  const read = computed(() => readLimits({ limits: stored.value }));
  const setAll = (limits: Candidate['limits']) => {
    draft.value = { ...draft.value, limits };
  };
  return {
    read,
    margins: computed(() => limitMargins(read.value, readings.value)),
    add: (limit) => setAll([...draft.value.limits, { ...limit }]),
    change: (place, limit) => setAll(draft.value.limits.map((each, index) => (index === place ? { ...limit } : each))),
    remove: (place) => setAll(draft.value.limits.filter((_, index) => index !== place)),
  };
}
