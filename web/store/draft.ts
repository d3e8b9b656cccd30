/**
 * Keeps what is being typed, so that a killed process loses at most the last second of it.
 *
 * A write follows the last keystroke by `delayMs`, and the first unwritten one by at most twice that, so
 * that steady typing is written too.
 */
import { type ReadonlySignal, signal } from '@preact/signals';
import type { Candidate } from '../../core/index';
import { failure, type StoreFailure } from './failure';
import { draftFrom, type StoredDraft } from './readStored';
import type { Clock, Outcome, Shelf } from './rows';

export interface Draft {
  /** As typed; its texts may be half-written or wrong. */
  readonly candidate: Candidate;
  /** The saved revision that the typing started from; null if never saved. */
  readonly baseRevision: number | null;
}

/** `kept`: the device has everything typed. `pending`: a write is due or under way. `clean`: nothing noted yet. */
export type DraftStatus = 'clean' | 'pending' | 'kept' | 'failed';

export interface DraftKeeper {
  readonly status: ReadonlySignal<DraftStatus>;
  /** Why the last write failed; null otherwise. */
  readonly failure: ReadonlySignal<StoreFailure | null>;
  /** Call at each keystroke. */
  note(draft: Draft): void;
  /** Writes at once what is pending; the write is handed over before this returns its promise. */
  flush(): Promise<DraftStatus>;
  /** The kept draft, or null if there is none. One that cannot be read is set aside, not dropped. */
  load(): Promise<Outcome<StoredDraft | null>>;
  /** Forgets the draft, here and on the device. */
  discard(): Promise<Outcome<void>>;
}

export interface DraftParts {
  readonly shelf: Shelf;
  readonly clock: Clock;
  readonly delayMs?: number;
  /** False while another tab holds the editor: two tabs must not write one draft. */
  readonly mayWrite?: () => boolean;
}

class KeptDraft implements DraftKeeper {
  readonly #status = signal<DraftStatus>('clean');
  readonly #failure = signal<StoreFailure | null>(null);
  readonly status: ReadonlySignal<DraftStatus> = this.#status;
  readonly failure: ReadonlySignal<StoreFailure | null> = this.#failure;
  readonly #delayMs: number;
  #noted: { readonly draft: Draft; readonly typedAtIso: string } | null = null;
  #trailing: ReturnType<typeof setTimeout> | undefined;
  #latest: ReturnType<typeof setTimeout> | undefined;

  constructor(readonly parts: DraftParts) {
    this.#delayMs = parts.delayMs ?? 250;
  }

  note(draft: Draft): void {
    this.#noted = { draft, typedAtIso: this.parts.clock().toISOString() };
    this.#status.value = 'pending';
    const write = () => void this.#write();
    clearTimeout(this.#trailing);
    this.#trailing = setTimeout(write, this.#delayMs);
    this.#latest ??= setTimeout(write, 2 * this.#delayMs);
  }

  #stopTimers(): void {
    clearTimeout(this.#trailing);
    clearTimeout(this.#latest);
    this.#trailing = undefined;
    this.#latest = undefined;
  }

  async #write(): Promise<void> {
    this.#stopTimers();
    const noted = this.#noted;
    if (!noted) return;
    const outcome = (this.parts.mayWrite?.() ?? true) ? await this.#put(noted) : failure('elsewhere');
    // Typed on in the meantime: its own write is due and will tell.
    if (this.#noted !== noted) return;
    this.#failure.value = outcome.ok ? null : outcome;
    this.#status.value = outcome.ok ? 'kept' : 'failed';
  }

  #put({ draft, typedAtIso }: { readonly draft: Draft; readonly typedAtIso: string }): Promise<Outcome<void>> {
    return this.parts.shelf.change((rows) => {
      const put = rows.putDraft('current', { ...draft, typedAtIso });
      rows.commit();
      return put;
    });
  }

  async flush(): Promise<DraftStatus> {
    if (this.#status.value === 'pending' || this.#status.value === 'failed') await this.#write();
    return this.#status.value;
  }

  load(): Promise<Outcome<StoredDraft | null>> {
    return this.parts.shelf.change(async (rows) => {
      const row = await rows.draft('current');
      if (!row) return null;
      const draft = draftFrom(row);
      if (draft.kind === 'unreadable') await rows.putDraft('unreadable', row);
      return draft;
    });
  }

  async discard(): Promise<Outcome<void>> {
    this.#stopTimers();
    this.#noted = null;
    this.#status.value = 'clean';
    this.#failure.value = null;
    return this.parts.shelf.change((rows) => rows.dropDraft('current'));
  }
}

export const createDraftKeeper = (parts: DraftParts): DraftKeeper => new KeptDraft(parts);
