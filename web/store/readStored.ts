/** What can be read of a stored row. A record that cannot be read is shown with the reason, never dropped. */
import { type Candidate, parseCandidate } from '../../core/index';
import type { CandidateRow, DraftRow, RevisionRow } from './rows';

export type ReadCandidate =
  | { readonly kind: 'readable'; readonly candidate: Candidate }
  | { readonly kind: 'unreadable'; readonly message: string };

interface EntryFacts {
  readonly id: string;
  readonly name: string;
  readonly revision: number;
  readonly createdAtIso: string;
  readonly savedAtIso: string;
  /** Belongs to the demo book and was never saved over. */
  readonly demo: boolean;
  /** Present on removed entries only. */
  readonly deletedAtIso?: string;
}
export type ReadableEntry = EntryFacts & { readonly kind: 'readable'; readonly candidate: Candidate };
export type UnreadableEntry = EntryFacts & { readonly kind: 'unreadable'; readonly message: string };
export type BookEntry = ReadableEntry | UnreadableEntry;

export type BookRevision = ReadCandidate & {
  readonly candidateId: string;
  readonly revision: number;
  readonly savedAtIso: string;
  readonly note: string;
};

export type StoredDraft = ReadCandidate & { readonly baseRevision: number | null; readonly typedAtIso: string };

export function readStored(stored: unknown): ReadCandidate {
  const parsed = parseCandidate(stored);
  if (parsed.ok) return { kind: 'readable', candidate: parsed.candidate };
  const [first] = parsed.errors;
  const where = first?.path ? `${first.path}: ` : '';
  return { kind: 'unreadable', message: first ? `${where}${first.message}` : 'The stored record cannot be read.' };
}

export function entryFrom(row: CandidateRow): BookEntry {
  const { id, name, revision, createdAtIso, savedAtIso, deletedAtIso, demo = false } = row;
  const facts = { id, name, revision, createdAtIso, savedAtIso, demo, ...(deletedAtIso ? { deletedAtIso } : {}) };
  return { ...facts, ...readStored(row.candidate) };
}

export function revisionFrom({ candidate, ...facts }: RevisionRow): BookRevision {
  return { ...facts, ...readStored(candidate) };
}

export function draftFrom({ candidate, ...facts }: DraftRow): StoredDraft {
  return { ...facts, ...readStored(candidate) };
}
