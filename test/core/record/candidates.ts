import { blankCandidate } from '../../../core/record/blankCandidate';
import type { Candidate, FieldId, OrbitEntry } from '../../../core/record/candidate';
import type { ResolvedOrbit } from '../../../core/record/resolved';
import { resolveOrbit } from '../../../core/record/resolveOrbit';

type Change = Partial<Omit<OrbitEntry, 'texts'>> & Partial<Pick<Candidate, 'body' | 'gravitySet'>>;

/** A blank candidate with some tags and texts changed. */
export function candidateWith(texts: Partial<Record<FieldId, string>>, change: Change = {}): Candidate {
  const blank = blankCandidate({ id: 'test' });
  const { body = blank.body, gravitySet = blank.gravitySet, ...entry } = change;
  return {
    ...blank,
    body,
    gravitySet,
    entry: { ...blank.entry, ...entry, texts: { ...blank.entry.texts, ...texts } },
  };
}

export function resolved(texts: Partial<Record<FieldId, string>>, change: Change = {}): ResolvedOrbit {
  const result = resolveOrbit(candidateWith(texts, change));
  if (!result.ok) throw new Error(`expected an orbit, got ${JSON.stringify(result.errors)}`);
  return result.orbit;
}

/** The message at each field that has one. */
export function messages(
  texts: Partial<Record<FieldId, string>>,
  change: Change = {},
): Partial<Record<FieldId, string>> {
  const result = resolveOrbit(candidateWith(texts, change));
  if (result.ok) return {};
  return Object.fromEntries(Object.entries(result.errors).map(([field, error]) => [field, error.message]));
}
