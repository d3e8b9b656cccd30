/** The steps of a change to the book, each inside a transaction that its caller has begun. */
import type { Candidate } from '../../core/index';
import type { CandidateRow, WritableRows } from './rows';

export interface Revising {
  readonly candidate: Candidate;
  readonly note: string;
  readonly savedAtIso: string;
  /** The row as it stands, or undefined for a candidate that is new to the book. */
  readonly current: CandidateRow | undefined;
  /** The revision that the editor started from; numbers never go back below it. */
  readonly basedOn: number | null;
  readonly demo?: boolean;
}

/** Writes the next revision of a candidate beside its history; a removed candidate comes back. */
export async function writeRevision(rows: WritableRows, revising: Revising): Promise<CandidateRow> {
  const { candidate, note, savedAtIso, current, basedOn, demo } = revising;
  const revision = Math.max(current?.revision ?? 0, basedOn ?? 0) + 1;
  const row: CandidateRow = {
    id: candidate.id,
    name: candidate.name,
    candidate,
    revision,
    createdAtIso: current?.createdAtIso ?? savedAtIso,
    savedAtIso,
    ...(demo ? { demo } : {}),
  };
  await rows.putCandidate(row);
  await rows.putRevision({ candidateId: candidate.id, revision, candidate, savedAtIso, note });
  return row;
}

const idOf = (stored: unknown) =>
  typeof stored === 'object' && stored !== null && 'id' in stored ? stored.id : undefined;

/**
 * Brings the kept draft up to what was saved as `row`. In the same transaction as the save: a draft is written a moment
 * after it is typed, so a crash right after the save would otherwise open an older draft over it.
 */
export async function rebaseDraft(rows: WritableRows, row: CandidateRow, basedOn: number | null): Promise<void> {
  const draft = await rows.draft('current');
  if (!draft || idOf(draft.candidate) !== row.id || draft.baseRevision !== basedOn) return;
  await rows.putDraft('current', { candidate: row.candidate, baseRevision: row.revision, typedAtIso: row.savedAtIso });
}

/** Whether the row holds something that an editor based on `basedOn` has not seen. */
export const isNewer = (current: CandidateRow | undefined, basedOn: number | null): current is CandidateRow =>
  current !== undefined && current.revision !== basedOn;
