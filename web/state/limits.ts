/** The limits of the candidate: read, and how much is left of each on the orbit at hand. */
import { computed, effect, type ReadonlySignal, type Signal, signal } from '@preact/signals';
import type { Candidate, LimitEntry, LimitMargin, Reading, ReadLimit } from '../../core/index';

export type LimitReader = typeof import('./limitReader');

export interface Limits {
  /** Reads limits and puts them in words; null until a candidate has one and this is loaded. */
  readonly reader: ReadonlySignal<LimitReader | null>;
  readonly read: ReadonlySignal<readonly ReadLimit[]>;
  readonly margins: ReadonlySignal<readonly LimitMargin[]>;
  add(limit: LimitEntry): void;
  change(place: number, limit: LimitEntry): void;
  remove(place: number): void;
}

/** What reads limits is fetched with the first limit that any candidate has. */
export function createLimits(
  draft: Signal<Candidate>,
  readings: ReadonlySignal<readonly Reading[]>,
  load: () => Promise<LimitReader>,
): Limits {
  const reader = signal<LimitReader | null>(null);
  const stored = computed(() => draft.value.limits);
  effect(() => {
    if (stored.value.length > 0 && !reader.peek()) {
      void load().then((loaded) => {
        reader.value = loaded;
      });
    }
  });
  const read = computed(() => reader.value?.readLimits({ limits: stored.value }) ?? []);
  const setAll = (limits: Candidate['limits']) => {
    draft.value = { ...draft.value, limits };
  };
  return {
    reader,
    read,
    margins: computed(() => reader.value?.limitMargins(read.value, readings.value) ?? []),
    add: (limit) => setAll([...draft.value.limits, { ...limit }]),
    change: (place, limit) => setAll(draft.value.limits.map((each, index) => (index === place ? { ...limit } : each))),
    remove: (place) => setAll(draft.value.limits.filter((_, index) => index !== place)),
  };
}
