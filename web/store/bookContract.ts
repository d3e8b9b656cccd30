/** What the book offers to the app, and how each request can end. */
import type { ReadonlySignal } from '@preact/signals';
import type { Candidate } from '../../core/index';
import type { StoreFailure } from './failure';
import type { BookEntry, BookRevision, ReadableEntry } from './readStored';
import type { Outcome } from './rows';

/** Somebody, such as another tab, has saved a revision that this editor has not seen. Nothing was written. */
export interface Conflict {
  readonly ok: false;
  readonly reason: 'conflict';
  readonly stored: BookEntry;
  readonly message: string;
}
/** The request makes no sense for what is stored; nothing was written. */
export interface Refusal {
  readonly ok: false;
  readonly reason: 'missing' | 'unreadable';
  readonly message: string;
}
export type Saved = { readonly ok: true; readonly entry: ReadableEntry };

export interface SaveOptions {
  /** Why this revision, in the user's words; may be empty. */
  readonly note: string;
  /** The revision that the editor started from; null for a candidate that was never saved. */
  readonly basedOn: number | null;
  /** After a conflict: add the revision on top of the other one, which stays in the history. */
  readonly evenIfNewer?: boolean;
}

export interface Book {
  /** Rises with every change made here or announced from another tab. */
  readonly changes: ReadonlySignal<number>;
  noticeChange(): void;
  save(candidate: Candidate, options: SaveOptions): Promise<Saved | Conflict | Refusal | StoreFailure>;
  /** Latest save first. Unreadable entries are among them, each with its message. */
  list(options?: { readonly removed?: boolean }): Promise<Outcome<BookEntry[]>>;
  /** Latest first. */
  revisionsOf(id: string): Promise<Outcome<BookRevision[]>>;
  /** Adds a revision with the content of an older one. */
  restore(id: string, revision: number): Promise<Saved | Refusal | StoreFailure>;
  rename(id: string, name: string): Promise<Saved | Refusal | StoreFailure>;
  duplicate(id: string): Promise<Saved | Refusal | StoreFailure>;
  /** Takes the candidate out of the list; it stays on the device, so undo works even after a restart. */
  remove(id: string): Promise<Outcome<BookEntry> | Refusal>;
  undoRemove(id: string): Promise<Outcome<BookEntry> | Refusal>;
  /** Drops for good what was removed before the given moment; answers how many. */
  purgeRemoved(olderThan: Date): Promise<Outcome<number>>;
}
