/**
 * Taking entries out of the book. Where the open orbit goes, its unsaved changes are saved into it first, and
 * the editor moves on to the orbit saved last.
 */
import { batch } from '@preact/signals';
import type { AppState } from '../state/appState';
import type { BookView } from './bookView';
import type { ListedEntry } from './listing';
import { isOpen, keepUnsaved } from './openOrbit';

export interface Failed {
  readonly ok: false;
  readonly message: string;
}

export interface RemovalParts {
  readonly app: AppState;
  readonly view: BookView;
  readonly caution: (failed: Failed) => void;
}
interface UndoableParts extends RemovalParts {
  readonly bringBack: (id: string, name: string) => Promise<void>;
}

export async function remove({ app, view, caution, bringBack }: UndoableParts, entry: ListedEntry): Promise<void> {
  const wasOpen = isOpen(app, entry.id);
  if (!(await keepUnsaved(app, entry.id, 'kept before it was removed'))) return;
  const neighbour = neighbourOf(view.shown.value, entry.id);
  const outcome = await app.store.book.remove(entry.id);
  if (!outcome.ok) return caution(outcome);
  const next = wasOpen ? await openAnother(app, [entry.id]) : null;
  batch(() => {
    view.detailsInFront.value = false;
    view.chosenId.value = neighbour;
    view.focusOn.value = neighbour ?? 'headline';
  });
  const undo = async () => {
    await bringBack(entry.id, entry.name);
    if (next === null || outcome.value.kind !== 'readable') return;
    await app.saving.openSaved(outcome.value.candidate, outcome.value.revision);
  };
  const text = `“${entry.name}” was removed.${next === null ? '' : ` “${next}” is open now.`}`;
  app.announcer.say({ text, tone: 'note', action: { label: 'Undo', run: () => void undo() } });
}

/** The row that takes the place of a removed one. */
function neighbourOf(shown: readonly ListedEntry[], id: string): string | null {
  const index = shown.findIndex((entry) => entry.id === id);
  return (shown[index + 1] ?? shown[index - 1])?.id ?? null;
}

/** Opens what was saved last apart from the given ones, else a blank one; answers its name. */
async function openAnother(app: AppState, leaving: readonly string[]): Promise<string> {
  const list = await app.store.book.list();
  const next = list.ok ? list.value.find(({ id, kind }) => kind === 'readable' && !leaving.includes(id)) : undefined;
  if (next?.kind === 'readable') await app.saving.openSaved(next.candidate, next.revision);
  else await app.saving.startNew();
  return app.document.draft.value.name;
}

export async function removeDemoBook({ app, view, caution }: RemovalParts): Promise<void> {
  const demo = (view.stored.value ?? []).filter((entry) => entry.demo).map(({ id }) => id);
  const openId = app.document.draft.value.id;
  // Changed and saved, it is the user's own and stays.
  if (demo.includes(openId) && !(await keepUnsaved(app, openId, 'kept before the demo book was removed'))) return;
  const outcome = await app.store.removeDemoBook();
  if (!outcome.ok) return caution(outcome);
  const list = await app.store.book.list();
  const openIsGone = demo.includes(openId) && list.ok && !list.value.some(({ id }) => id === openId);
  if (openIsGone) await openAnother(app, demo);
  batch(() => {
    view.chosenId.value = null;
    view.detailsInFront.value = false;
    view.focusOn.value = 'headline';
  });
  app.announcer.say({ text: 'The demo book is gone for good.', tone: 'note' });
}
