/**
 * The one writable document: the candidate as typed. Everything else here is computed from it.
 */
import { batch, computed, type ReadonlySignal, type Signal, signal } from '@preact/signals';
import {
  type AbsentReading,
  absentReadings,
  type Candidate,
  canonicalText,
  type FieldId,
  fingerprint,
  type Notice,
  type OrbitEntry,
  type Reading,
  type Resolution,
  type ResolvedOrbit,
  readingsOf,
  resolveOrbit,
  warningsOf,
} from '../../core/index';
import { type Conditions, createConditions } from './conditions';
import { createLimits, type Limits } from './limits';
import { type SettledFields, settledFields } from './settledFields';

/** A candidate and the saved revision it was opened from; null where it was never saved. */
export interface OpenCandidate {
  readonly candidate: Candidate;
  readonly baseRevision: number | null;
  /** What counts as unchanged, in canonical form: as last saved, or as a blank one started; null where all of it is new. */
  readonly savedText: string | null;
}

export interface OrbitDocument {
  readonly draft: ReadonlySignal<Candidate>;
  readonly baseRevision: ReadonlySignal<number | null>;
  /** The entry alone, whatever the conditions say. */
  readonly entered: ReadonlySignal<Resolution>;
  readonly conditions: Conditions;
  readonly limits: Limits;
  /** Fields that a condition settles, with the text that each shows. */
  readonly settled: ReadonlySignal<SettledFields>;
  /** The entry and its conditions together. */
  readonly resolution: ReadonlySignal<Resolution>;
  /** The last orbit that the entry came to; null before there was one. */
  readonly orbit: ReadonlySignal<ResolvedOrbit | null>;
  /** True while the entry is in error and `orbit` is the last good one. */
  readonly stale: ReadonlySignal<boolean>;
  readonly readings: ReadonlySignal<readonly Reading[]>;
  /** Readings that cannot be had, each with the reason. */
  readonly absentReadings: ReadonlySignal<readonly AbsentReading[]>;
  readonly notices: ReadonlySignal<readonly Notice[]>;
  readonly fingerprint: ReadonlySignal<string | null>;
  /** True where the draft differs from what was saved. */
  readonly changed: ReadonlySignal<boolean>;
  setText(field: FieldId, text: string): void;
  setTexts(texts: Partial<Record<FieldId, string>>): void;
  setTags(tags: Partial<Omit<OrbitEntry, 'texts'>>, texts?: Partial<Record<FieldId, string>>): void;
  setCandidate(part: Partial<Pick<Candidate, 'name' | 'notes' | 'body' | 'gravitySet'>>): void;
  /** Puts an earlier draft of the same candidate back, for an undo. */
  restoreDraft(candidate: Candidate): void;
  open(next: OpenCandidate): void;
  /** The draft has been saved as this revision. */
  markSaved(candidate: Candidate, revision: number): void;
}

const loadSettler = async () => (await import('./settler')).settle;

export function createDocument(initial: OpenCandidate): OrbitDocument {
  const draft = signal(initial.candidate);
  const baseRevision = signal(initial.baseRevision);
  const savedText = signal(initial.savedText);
  const entered = computed(() => resolveOrbit(draft.value));
  const conditions = createConditions(draft, entered, loadSettler);
  const { resolution } = conditions;
  const orbit = lastGoodOrbit(draft, resolution);
  const readings = computed(() => (orbit.value ? readingsOf(orbit.value) : []));

  return {
    draft,
    baseRevision,
    entered,
    conditions,
    limits: createLimits(draft, readings, () => import('./limitReader')),
    settled: computed(() => settledFields(conditions.settlement.value, draft.value.entry)),
    resolution,
    orbit,
    readings,
    stale: computed(() => !resolution.value.ok),
    absentReadings: computed(() => (orbit.value ? absentReadings(orbit.value, readings.value) : [])),
    notices: computed(() => {
      const said = resolution.value.notices;
      const warnings = orbit.value ? warningsOf(orbit.value, readings.value) : [];
      return [...said, ...warnings.filter(({ id }) => !said.some((notice) => notice.id === id))];
    }),
    fingerprint: computed(() => (orbit.value ? fingerprint(orbit.value) : null)),
    changed: computed(() => canonicalText(draft.value) !== savedText.value),
    ...documentActions(draft),
    restoreDraft: (candidate) => {
      draft.value = candidate;
    },
    open: (next) =>
      batch(() => {
        baseRevision.value = next.baseRevision;
        savedText.value = next.savedText;
        draft.value = next.candidate;
      }),
    markSaved: (candidate, revision) =>
      batch(() => {
        baseRevision.value = revision;
        savedText.value = canonicalText(candidate);
      }),
  };
}

/** Keeps the last orbit while the entry is in error, so that a half-typed number does not blank the screen. */
function lastGoodOrbit(draft: Signal<Candidate>, resolution: ReadonlySignal<Resolution>) {
  let last: { readonly id: string; readonly orbit: ResolvedOrbit } | null = null;
  return computed(() => {
    const { id } = draft.value;
    if (resolution.value.ok) last = { id, orbit: resolution.value.orbit };
    return last?.id === id ? last.orbit : null;
  });
}

function documentActions(draft: Signal<Candidate>) {
  const setEntry = (entry: Partial<OrbitEntry>) => {
    draft.value = { ...draft.value, entry: { ...draft.value.entry, ...entry } };
  };
  const setTexts = (texts: Partial<Record<FieldId, string>>) =>
    setEntry({ texts: { ...draft.value.entry.texts, ...texts } });
  return {
    setTexts,
    setText: (field: FieldId, text: string) => setTexts({ [field]: text }),
    setTags: (tags: Partial<Omit<OrbitEntry, 'texts'>>, texts: Partial<Record<FieldId, string>> = {}) =>
      setEntry({ ...tags, texts: { ...draft.value.entry.texts, ...texts } }),
    setCandidate: (part: Partial<Candidate>) => {
      draft.value = { ...draft.value, ...part };
    },
  };
}
