/**
 * What is kept, row by row, and the shelf it is kept on.
 *
 * Rows hold inputs only. `candidate` is `unknown` in every row, because a stored record may come from
 * an older or newer version or be damaged; `readStored` decides what can be read of it.
 */
import type { ReadonlySignal } from '@preact/signals';
import type { StoreFailure } from './failure';

/** The latest state of one candidate. `id` and `name` stand beside it so that an unreadable one still has them. */
export interface CandidateRow {
  readonly id: string;
  readonly name: string;
  readonly candidate: unknown;
  readonly revision: number;
  readonly createdAtIso: string;
  readonly savedAtIso: string;
  /** Set while the candidate is removed and can still be brought back. */
  readonly deletedAtIso?: string;
  /** True for a candidate of the demo book that the user has not saved over. */
  readonly demo?: boolean;
}

/** One saved revision; rows of this kind are never changed. */
export interface RevisionRow {
  readonly candidateId: string;
  readonly revision: number;
  readonly candidate: unknown;
  readonly savedAtIso: string;
  readonly note: string;
}

/** What is being typed. */
export interface DraftRow {
  readonly candidate: unknown;
  /** The saved revision that the typing started from; null if the candidate was never saved. */
  readonly baseRevision: number | null;
  readonly typedAtIso: string;
}

/** `current` is the draft; `unreadable` sets aside one that this version cannot read, so that typing does not replace it. */
export type DraftKey = 'current' | 'unreadable';

export interface Rows {
  candidate(id: string): Promise<CandidateRow | undefined>;
  /** All candidates, removed ones too. */
  candidates(): Promise<CandidateRow[]>;
  revision(id: string, revision: number): Promise<RevisionRow | undefined>;
  /** Oldest first. */
  revisions(id: string): Promise<RevisionRow[]>;
  draft(key: DraftKey): Promise<DraftRow | undefined>;
  setting(key: string): Promise<unknown>;
}

export interface WritableRows extends Rows {
  putCandidate(row: CandidateRow): Promise<void>;
  putRevision(row: RevisionRow): Promise<void>;
  /** Takes the candidate and all its revisions away for good. */
  dropCandidate(id: string): Promise<void>;
  putDraft(key: DraftKey, row: DraftRow): Promise<void>;
  dropDraft(key: DraftKey): Promise<void>;
  putSetting(key: string, value: unknown): Promise<void>;
  /**
   * No more requests follow. Hands the transaction over at once instead of after its last answer, which a page
   * that is going away does not live to see.
   */
  commit(): void;
}

export type Outcome<Value> = { readonly ok: true; readonly value: Value } | StoreFailure;

/** `superseded`: a newer Driftbook in another tab needed the storage and this tab let go of it. */
export type ShelfState = 'kept' | 'memory' | 'superseded';

export interface Shelf {
  readonly state: ReadonlySignal<ShelfState>;
  look<Value>(work: (rows: Rows) => Promise<Value>): Promise<Outcome<Value>>;
  /**
   * One transaction, all of it or nothing. Resolves with ok only after the transaction has completed in strict
   * durability. `work` is called before the first await where storage is open, and may await nothing but `rows`.
   */
  change<Value>(work: (rows: WritableRows) => Promise<Value>): Promise<Outcome<Value>>;
  /** Called before this tab lets go of its storage for a newer version, to write what is pending. */
  beforeClosing(listener: () => Promise<unknown>): void;
  close(): void;
}

/** The present moment, given from outside so that tests can hold it still. */
export type Clock = () => Date;
