/**
 * The book: saved candidates with all their revisions.
 *
 * Every change adds a revision and none is ever written over. Each call is one transaction; an answer with
 * ok means that the device has it.
 */
import { type ReadonlySignal, signal } from '@preact/signals';
import { type Candidate, parseCandidate } from '../../core/index';
import { isNewer, rebaseDraft, writeRevision } from './bookChanges';
import type { Book, Conflict, Refusal, Saved, SaveOptions } from './bookContract';
import type { StoreFailure } from './failure';
import { type BookEntry, entryFrom, type ReadableEntry, readStored, revisionFrom } from './readStored';
import type { CandidateRow, Clock, Outcome, Shelf, WritableRows } from './rows';

export interface BookParts {
  readonly shelf: Shelf;
  readonly clock: Clock;
  readonly newId: () => string;
  /** Called after each completed change; `saved` is true when the user saved something of their own. */
  readonly onChange?: (change: { readonly saved: boolean }) => void;
}

const missing: Refusal = { ok: false, reason: 'missing', message: 'This candidate is no longer in the book.' };
const unreadable = (message: string): Refusal => ({ ok: false, reason: 'unreadable', message });
const conflict = (current: CandidateRow): Conflict => ({
  ok: false,
  reason: 'conflict',
  stored: entryFrom(current),
  message: `Revision ${current.revision} was saved elsewhere in the meantime. Nothing was written over: open it, or save yours as revision ${current.revision + 1} on top of it.`,
});
const savedEntry = (row: CandidateRow, candidate: Candidate): ReadableEntry => {
  const entry = entryFrom(row);
  if (entry.kind !== 'readable')
    throw new Error(`Expected a readable entry for ${candidate.id}, got: ${entry.message}`);
  return entry;
};

/** The candidate as it would be read back, so that nothing is stored that could not be opened again. */
function readableOrRefusal(candidate: Candidate): { ok: true; candidate: Candidate } | Refusal {
  const parsed = parseCandidate(candidate);
  if (parsed.ok) return parsed;
  const [first] = parsed.errors;
  return unreadable(`This cannot be saved as it stands. ${first?.path ?? ''} ${first?.message ?? ''}`.trim());
}

class KeptBook implements Book {
  readonly #changes = signal(0);
  readonly changes: ReadonlySignal<number> = this.#changes;

  constructor(readonly parts: BookParts) {}

  noticeChange(): void {
    this.#changes.value++;
  }

  #nowIso(): string {
    return this.parts.clock().toISOString();
  }

  async #change<Value, Refused extends Conflict | Refusal>(
    saved: boolean,
    work: (rows: WritableRows) => Promise<{ readonly ok: true; readonly value: Value } | Refused>,
  ): Promise<Outcome<Value> | Refused> {
    const outcome = await this.parts.shelf.change(work);
    if (!outcome.ok) return outcome;
    if (outcome.value.ok) {
      this.noticeChange();
      this.parts.onChange?.({ saved });
    }
    return outcome.value;
  }

  async save(candidate: Candidate, { note, basedOn, evenIfNewer = false }: SaveOptions) {
    const checked = readableOrRefusal(candidate);
    if (!checked.ok) return checked;
    const outcome = await this.#change<CandidateRow, Conflict>(true, async (rows) => {
      const current = await rows.candidate(candidate.id);
      if (!evenIfNewer && isNewer(current, basedOn)) return conflict(current);
      const savedAtIso = this.#nowIso();
      const row = await writeRevision(rows, { candidate: checked.candidate, note, savedAtIso, current, basedOn });
      await rebaseDraft(rows, row, basedOn);
      return { ok: true, value: row };
    });
    return outcome.ok ? { ok: true as const, entry: savedEntry(outcome.value, candidate) } : outcome;
  }

  async list({ removed = false }: { readonly removed?: boolean } = {}) {
    const outcome = await this.parts.shelf.look((rows) => rows.candidates());
    if (!outcome.ok) return outcome;
    const wanted = outcome.value.filter((row) => Boolean(row.deletedAtIso) === removed);
    const value = wanted
      .map(entryFrom)
      .sort((a, b) => (a.savedAtIso < b.savedAtIso ? 1 : a.savedAtIso > b.savedAtIso ? -1 : 0));
    return { ok: true as const, value };
  }

  async revisionsOf(id: string) {
    const outcome = await this.parts.shelf.look((rows) => rows.revisions(id));
    return outcome.ok ? { ok: true as const, value: outcome.value.map(revisionFrom).reverse() } : outcome;
  }

  /** Adds a revision made from a stored one, by whatever `make` turns it into. */
  async #reviseStored(
    find: (rows: WritableRows) => Promise<unknown>,
    make: (stored: Candidate) => { candidate: Candidate; note: string },
  ): Promise<Saved | Refusal | StoreFailure> {
    const outcome = await this.#change<CandidateRow, Refusal>(true, async (rows) => {
      const stored = await find(rows);
      if (stored === undefined) return missing;
      const read = readStored(stored);
      if (read.kind === 'unreadable') return unreadable(read.message);
      const { candidate, note } = make(read.candidate);
      const checked = readableOrRefusal(candidate);
      if (!checked.ok) return checked;
      const current = await rows.candidate(candidate.id);
      const value = await writeRevision(rows, { candidate, note, savedAtIso: this.#nowIso(), current, basedOn: null });
      return { ok: true, value };
    });
    if (!outcome.ok) return outcome;
    const read = entryFrom(outcome.value);
    return read.kind === 'readable' ? { ok: true, entry: read } : unreadable(read.message);
  }

  restore(id: string, revision: number) {
    const find = async (rows: WritableRows) => (await rows.revision(id, revision))?.candidate;
    return this.#reviseStored(find, (candidate) => ({ candidate, note: `Revision ${revision} restored` }));
  }

  rename(id: string, name: string) {
    const find = async (rows: WritableRows) => (await rows.candidate(id))?.candidate;
    return this.#reviseStored(find, (stored) => ({
      candidate: { ...stored, name },
      note: `Renamed from ${stored.name || 'no name'}`,
    }));
  }

  duplicate(id: string) {
    const find = async (rows: WritableRows) => (await rows.candidate(id))?.candidate;
    return this.#reviseStored(find, (stored) => ({
      candidate: { ...stored, id: this.parts.newId(), name: `${stored.name}, copy` },
      note: `Copied from ${stored.name || 'a candidate without a name'}`,
    }));
  }

  #replace(id: string, make: (row: CandidateRow) => CandidateRow): Promise<Outcome<BookEntry> | Refusal> {
    return this.#change<BookEntry, Refusal>(false, async (rows) => {
      const current = await rows.candidate(id);
      if (!current) return missing;
      const row = make(current);
      await rows.putCandidate(row);
      return { ok: true, value: entryFrom(row) };
    });
  }

  remove(id: string) {
    return this.#replace(id, (row) => ({ ...row, deletedAtIso: this.#nowIso() }));
  }

  undoRemove(id: string) {
    return this.#replace(id, ({ deletedAtIso: _removed, ...row }) => row);
  }

  purgeRemoved(olderThan: Date) {
    const limitIso = olderThan.toISOString();
    return this.parts.shelf.change(async (rows) => {
      const gone = (await rows.candidates()).filter(
        (row) => row.deletedAtIso !== undefined && row.deletedAtIso < limitIso,
      );
      await Promise.all(gone.map((row) => rows.dropCandidate(row.id)));
      return gone.length;
    });
  }
}

export const createBook = (parts: BookParts): Book => new KeptBook(parts);
