import { blankCandidate, type Candidate, type FieldId, type ResolvedOrbit, resolveOrbit } from '../../../core/index';

/** A blank candidate with some texts changed. */
export function candidateWith(texts: Partial<Record<FieldId, string>>): Candidate {
  const blank = blankCandidate({ id: 'test' });
  return { ...blank, entry: { ...blank.entry, texts: { ...blank.entry.texts, ...texts } } };
}

export function resolved(candidate: Candidate): ResolvedOrbit {
  const result = resolveOrbit(candidate);
  if (!result.ok) throw new Error(`expected an orbit, got ${JSON.stringify(result.errors)}`);
  return result.orbit;
}
