/**
 * What can be done to an entry, and what that means for the orbit in the editor.
 *
 * Nothing is lost by any of it: where the open orbit is concerned, its unsaved changes are kept as a revision
 * first, or stay as unsaved changes on top of the new revision.
 */
import { batch } from '@preact/signals';
import { lengthCaps } from '../../core/index';
import type { AppState } from '../state/appState';
import { bookViewOf } from './bookView';
import type { ListedEntry } from './listing';
import { hasUnsaved, isOpen, keepUnsaved } from './openOrbit';
import { type Failed, remove, removeDemoBook } from './removal';

export interface BookActions {
  choose(id: string): void;
  open(entry: ListedEntry): Promise<void>;
  startNew(): Promise<void>;
  /** Answers what is wrong with the name, or null once the entry has it. */
  rename(entry: ListedEntry, name: string): Promise<string | null>;
  duplicate(entry: ListedEntry): Promise<void>;
  remove(entry: ListedEntry): Promise<void>;
  bringBack(id: string, name: string): Promise<void>;
  restore(entry: ListedEntry, revision: number): Promise<void>;
  removeDemoBook(): Promise<void>;
}

/** One change at a time: a second tap while the first is under way would copy or restore twice. */
function oneAtATime(): <Args extends unknown[]>(
  act: (...args: Args) => Promise<void>,
) => (...args: Args) => Promise<void> {
  let isBusy = false;
  return (act) =>
    async (...args) => {
      if (isBusy) return;
      isBusy = true;
      try {
        await act(...args);
      } finally {
        isBusy = false;
      }
    };
}

export function bookActions(app: AppState): BookActions {
  const view = bookViewOf(app);
  const alone = oneAtATime();
  const caution = ({ message }: Failed) => app.announcer.say({ text: message, tone: 'caution' });
  const choose = (id: string) =>
    batch(() => {
      view.chosenId.value = id;
      view.detailsInFront.value = true;
    });
  const bringBack = async (id: string, name: string) => {
    const outcome = await app.store.book.undoRemove(id);
    if (!outcome.ok) return caution(outcome);
    app.announcer.say({ text: `“${name}” is back in the book.`, tone: 'note' });
    view.chosenId.value = id;
    view.focusOn.value = id;
  };
  return {
    choose,
    bringBack,
    open: alone((entry) => openEntry(app, entry)),
    startNew: alone(async () => {
      if (await app.saving.startNew()) app.route.go('size');
    }),
    rename: (entry, name) => rename(app, entry, name),
    duplicate: alone(async (entry) => {
      const outcome = await app.store.book.duplicate(entry.id);
      if (!outcome.ok) return caution(outcome);
      const text = `Copied revision ${entry.saved?.revision ?? 1} as “${outcome.entry.name}”.`;
      const unsaved = hasUnsaved(app, entry.id) ? ' Unsaved changes are not in the copy.' : '';
      app.announcer.say({ text: text + unsaved, tone: 'note' });
      view.chosenId.value = outcome.entry.id;
      view.focusOn.value = outcome.entry.id;
    }),
    remove: alone((entry) => remove({ app, view, caution, bringBack }, entry)),
    restore: alone(async (entry, revision) => {
      if (!(await keepUnsaved(app, entry.id, `kept before revision ${revision} was restored`))) return;
      const outcome = await app.store.book.restore(entry.id, revision);
      if (!outcome.ok) return caution(outcome);
      if (isOpen(app, entry.id)) await app.saving.openSaved(outcome.entry.candidate, outcome.entry.revision);
      const text = `Revision ${revision} of “${outcome.entry.name}” is back, as revision ${outcome.entry.revision}.`;
      app.announcer.say({ text, tone: 'note' });
    }),
    removeDemoBook: alone(() => removeDemoBook({ app, view, caution })),
  };
}

async function openEntry(app: AppState, { id, saved, content }: ListedEntry): Promise<void> {
  if (content.kind === 'unreadable') return;
  const isNewer = saved !== null && saved.revision !== app.document.baseRevision.value;
  // Opening what is open already would put the typing of the last minutes away.
  const goesOn = isOpen(app, id) && (app.document.changed.value || !isNewer);
  const opened = goesOn || saved === null || (await app.saving.openSaved(content.candidate, saved.revision));
  if (opened) app.route.go('size');
}

async function rename(app: AppState, entry: ListedEntry, typed: string): Promise<string | null> {
  const { document, store } = app;
  const name = typed.trim();
  if (!name) return 'Expected a name; an orbit without one is hard to find again.';
  if (name.length > lengthCaps.name) return `Expected at most ${lengthCaps.name} characters; these are ${name.length}.`;
  if (isOpen(app, entry.id) && entry.saved === null) document.setCandidate({ name });
  if (entry.saved === null || name === entry.name) return null;
  const isBase = document.baseRevision.value === entry.saved.revision;
  const outcome = await store.book.rename(entry.id, name);
  if (!outcome.ok) return outcome.message;
  if (!isOpen(app, entry.id)) return null;
  batch(() => {
    document.setCandidate({ name });
    // Unsaved changes stay unsaved, now on top of the renamed revision. Where the editor had an older revision
    // than the book, it keeps it, so that the next save still tells of the other one.
    if (isBase) document.markSaved(outcome.entry.candidate, outcome.entry.revision);
  });
  await store.draft.flush();
  return null;
}
