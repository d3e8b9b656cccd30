/** The conditions of the candidate and what they settle. */
import { computed, effect, type ReadonlySignal, type Signal, signal } from '@preact/signals';
import type { Candidate, ConditionEntry, MeanElements, Resolution, Settlement, settleOrbit } from '../../core/index';

export interface Conditions {
  /** What the conditions come to; null where there are none, the entry is in error, or solving is still being loaded. */
  readonly settlement: ReadonlySignal<Settlement | null>;
  /** The entry and its conditions taken together. */
  readonly resolution: ReadonlySignal<Resolution>;
  add(condition: ConditionEntry): void;
  change(place: number, condition: ConditionEntry): void;
  remove(place: number): void;
}

/** Solving is fetched with the first condition that any candidate has. */
export function createConditions(
  draft: Signal<Candidate>,
  entered: ReadonlySignal<Resolution>,
  load: () => Promise<typeof settleOrbit>,
): Conditions {
  const settle = signal<typeof settleOrbit | null>(null);
  const hasConditions = computed(() => draft.value.conditions.length > 0);
  effect(() => {
    if (draft.value.conditions.length === 0 || settle.peek()) return;
    load().then(
      (loaded) => {
        settle.value = loaded;
      },
      // Out of reach for now: the next edit tries again.
      () => undefined,
    );
  });
  const settlement = computed(() => {
    const entry = entered.value;
    if (!hasConditions.value || !entry.ok || !settle.value) return null;
    return settle.value(draft.value, entry.orbit);
  });
  const setAll = (conditions: Candidate['conditions']) => {
    draft.value = { ...draft.value, conditions };
  };
  return {
    settlement,
    resolution: computed(() => joined(entered.value, settlement.value, hasConditions.value)),
    add: (condition) => setAll([...draft.value.conditions, { ...condition }]),
    change: (place, condition) =>
      setAll(draft.value.conditions.map((each, index) => (index === place ? { ...condition } : each))),
    remove: (place) => setAll(draft.value.conditions.filter((_, index) => index !== place)),
  };
}

/** An orbit only where the entry and the conditions both come to one. */
function joined(entry: Resolution, settlement: Settlement | null, hasConditions: boolean): Resolution {
  if (!entry.ok || !hasConditions) return entry;
  if (!settlement?.ok) return { ok: false, errors: {}, notices: entry.notices };
  const notes = settlement.notes.map((text, index) => ({ id: `condition${index}`, severity: 'note' as const, text }));
  return { ok: true, orbit: settlement.orbit, notices: [...entry.notices, ...notes] };
}

/** Where a condition settles, the field shows what was settled in place of what was typed. */
export function settledMean(settlement: Settlement | null): MeanElements | null {
  return settlement?.ok ? settlement.orbit.mean : null;
}
