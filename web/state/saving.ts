/**
 * Saving and opening candidates. A save is called done only after its transaction has completed; a conflict or
 * a full disk leaves the draft as it is and says what to do.
 */
import { type ReadonlySignal, signal } from '@preact/signals';
import { blankCandidate, type Candidate, canonicalText } from '../../core/index';
import type { Store } from '../store/store';
import type { Announcer } from './announce';
import type { OpenCandidate, OrbitDocument } from './document';

export type SaveStatus =
  | { readonly kind: 'idle' }
  | { readonly kind: 'saving' }
  | { readonly kind: 'saved'; readonly revision: number; readonly atIso: string }
  | { readonly kind: 'failed'; readonly message: string };

export interface Saving {
  readonly status: ReadonlySignal<SaveStatus>;
  /** Saves the draft as a new revision; answers whether it is now kept. */
  save(note?: string): Promise<boolean>;
  /** Opens another candidate, keeping what is unsaved of this one as a revision first. */
  openSaved(candidate: Candidate, revision: number): Promise<boolean>;
  startNew(): Promise<boolean>;
  /** Puts the draft back to what was last saved; can be undone. */
  discardChanges(): Promise<void>;
}

export interface SavingParts {
  readonly store: Store;
  readonly document: OrbitDocument;
  readonly announcer: Announcer;
  readonly newId: () => string;
}

export function openedFrom(candidate: Candidate, revision: number): OpenCandidate {
  return { candidate, baseRevision: revision, savedText: canonicalText(candidate) };
}

/** A blank one counts as unchanged until something is typed, so that leaving it keeps nothing. */
export function openedNew(id: string): OpenCandidate {
  const candidate = blankCandidate({ id, name: 'New orbit' });
  return { candidate, baseRevision: null, savedText: canonicalText(candidate) };
}

export function createSaving(parts: SavingParts): Saving {
  const { store, document, announcer } = parts;
  const status = signal<SaveStatus>({ kind: 'idle' });

  const write: Write = async (note, evenIfNewer) => {
    const candidate = document.draft.value;
    status.value = { kind: 'saving' };
    const outcome = await store.book.save(candidate, { note, basedOn: document.baseRevision.value, evenIfNewer });
    if (outcome.ok && document.draft.value.id !== candidate.id) {
      // The editor came back from another tab meanwhile, with another orbit: the revision is not of that one.
      status.value = { kind: 'idle' };
      return true;
    }
    if (outcome.ok) {
      document.markSaved(candidate, outcome.entry.revision);
      store.draft.note({ candidate: document.draft.value, baseRevision: outcome.entry.revision });
      status.value = { kind: 'saved', revision: outcome.entry.revision, atIso: outcome.entry.savedAtIso };
      if (document.stale.value) {
        const text = 'Saved as typed, though it does not come to an orbit yet: see the messages at the fields.';
        announcer.say({ text, tone: 'note', untilEdited: true });
      }
      return true;
    }
    status.value = { kind: 'failed', message: outcome.message };
    const label = outcome.reason === 'conflict' ? 'Save on top of it' : 'Try again';
    const again = () => void save(note, evenIfNewer || outcome.reason === 'conflict');
    announcer.say({ text: outcome.message, tone: 'caution', action: { label, run: again } });
    return false;
  };

  const save = inTurn(write, document);

  const open = async (next: OpenCandidate): Promise<boolean> => {
    const leaving = document.draft.value;
    // Again where typing went on during the save.
    while (document.changed.value) {
      if (!(await save('kept when another orbit was opened'))) return false;
      announcer.say({
        text: `The changes of “${leaving.name}” were saved as a revision of their own.`,
        tone: 'note',
      });
    }
    status.value = { kind: 'idle' };
    document.open(next);
    return true;
  };

  return {
    status,
    save,
    openSaved: (candidate, revision) => open(openedFrom(candidate, revision)),
    startNew: () => open(openedNew(parts.newId())),
    discardChanges: () => discardChanges(parts),
  };
}

type Write = (note: string, evenIfNewer: boolean) => Promise<boolean>;

/** One save after another: a second tap must not take the revision of the first for somebody else's. */
function inTurn(write: Write, document: OrbitDocument) {
  let running: Promise<boolean> | null = null;
  return async (note = '', evenIfNewer = false): Promise<boolean> => {
    while (running) {
      if ((await running) && !document.changed.value) return true;
    }
    running = write(note, evenIfNewer).finally(() => {
      running = null;
    });
    return running;
  };
}

async function discardChanges({ store, document, announcer }: SavingParts): Promise<void> {
  const typed = document.draft.value;
  const revision = document.baseRevision.value;
  const stored = await store.book.revisionsOf(typed.id);
  const base = stored.ok ? stored.value.find((entry) => entry.revision === revision) : undefined;
  if (base?.kind !== 'readable' || revision === null) {
    announcer.say({ text: 'The saved revision cannot be read, so the changes stay.', tone: 'caution' });
    return;
  }
  document.open(openedFrom(base.candidate, revision));
  announcer.say({
    text: `Back to revision ${revision}.`,
    tone: 'note',
    untilEdited: true,
    action: {
      label: 'Undo',
      run: () => document.open({ ...openedFrom(base.candidate, revision), candidate: typed }),
    },
  });
}
