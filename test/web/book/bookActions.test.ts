import { signal } from '@preact/signals';
import { afterEach, describe, expect, it } from 'vitest';
import { bookActions } from '../../../web/book/bookActions';
import { bookViewOf } from '../../../web/book/bookView';
import type { ListedEntry } from '../../../web/book/listing';
import { type AppState, createAppState } from '../../../web/state/appState';
import { openStore } from '../../../web/store/store';
import { freshDatabase, numberedIds, tickingClock } from '../store/support';

const opened: AppState[] = [];
afterEach(async () => {
  await Promise.all(opened.splice(0).map((app) => app.store.close()));
});

async function startApp(): Promise<AppState> {
  freshDatabase();
  const newId = numberedIds();
  const store = await openStore({ clock: tickingClock(), newId });
  const app = await createAppState({
    store,
    newId,
    offline: { status: signal('unsupported'), updateWaiting: signal(false), applyUpdate: async () => false },
    page: { location: { hash: '#/book' } as Location, addEventListener: () => undefined },
  });
  opened.push(app);
  return app;
}

async function start() {
  const app = await startApp();
  const view = bookViewOf(app);
  await view.readBook();
  const entry = (id: string): ListedEntry => {
    const found = view.listed.value.find((each) => each.id === id);
    if (!found) throw new Error(`Expected ${id} in the list, got ${view.listed.value.map((each) => each.id)}`);
    return found;
  };
  const openOne = async (id: string) => {
    await actions.open(entry(id));
    await view.readBook();
  };
  const actions = bookActions(app);
  return { app, view, actions, entry, openOne };
}

const storedIds = async ({ store }: AppState) => {
  const list = await store.book.list();
  return list.ok ? list.value.map(({ id }) => id) : [];
};

describe('renaming', () => {
  it('leaves unsaved changes of the open orbit unsaved, on top of the renamed revision', async () => {
    const { app, view, actions, entry, openOne } = await start();
    await openOne('skerry-a');
    app.document.setText('inclination', '98');
    expect(await actions.rename(entry('skerry-a'), '  Morning pass ')).toBeNull();
    await view.readBook();
    expect(app.document.draft.value).toMatchObject({ name: 'Morning pass', entry: { texts: { inclination: '98' } } });
    expect(app.document.changed.value).toBe(true);
    expect(app.document.baseRevision.value).toBe(2);
    expect(await app.saving.save()).toBe(true);
    await view.readBook();
    expect(entry('skerry-a')).toMatchObject({ name: 'Morning pass', saved: { revision: 3 } });
  });

  it('refuses an empty or endless name and says what is expected', async () => {
    const { actions, entry } = await start();
    expect(await actions.rename(entry('skerry-b'), '   ')).toContain('Expected a name');
    expect(await actions.rename(entry('skerry-b'), 'x'.repeat(201))).toContain('at most 200');
  });
});

describe('removing', () => {
  it('keeps unsaved changes first, opens another, and undo brings all of it back', async () => {
    const { app, view, actions, entry, openOne } = await start();
    await openOne('skerry-b');
    app.document.setText('inclination', '98');
    await actions.remove(entry('skerry-b'));
    expect(await storedIds(app)).not.toContain('skerry-b');
    expect(app.document.draft.value.id).not.toBe('skerry-b');
    expect(app.document.changed.value).toBe(false);
    app.announcer.current.value?.action?.run();
    await expect.poll(() => app.document.draft.value.id).toBe('skerry-b');
    expect(app.document.draft.value.entry.texts.inclination).toBe('98');
    await view.readBook();
    expect(entry('skerry-b').saved?.revision).toBe(2);
  });

  it('leaves the editor alone when another orbit is removed', async () => {
    const { app, actions, entry, openOne } = await start();
    await openOne('skerry-b');
    app.document.setText('inclination', '98');
    await actions.remove(entry('skerry-a'));
    expect(app.document.draft.value).toMatchObject({ id: 'skerry-b', entry: { texts: { inclination: '98' } } });
    expect(app.document.changed.value).toBe(true);
  });
});

describe('restoring and copying', () => {
  it('keeps unsaved changes as a revision before an older one comes back', async () => {
    const { app, actions, view, entry, openOne } = await start();
    await openOne('skerry-a');
    app.document.setText('inclination', '98');
    await view.readBook();
    await actions.restore(entry('skerry-a'), 1);
    expect(app.document.draft.value.entry.texts.inclination).toBe('97.68');
    expect(app.document.baseRevision.value).toBe(3);
    await view.readRevisions('skerry-a');
    const kept = view.revisions.value?.list.find(({ revision }) => revision === 2);
    expect(kept?.kind === 'readable' && kept.candidate.entry.texts.inclination).toBe('98');
  });

  it('copies once for two quick taps', async () => {
    const { app, actions, entry } = await start();
    await Promise.all([actions.duplicate(entry('skerry-d')), actions.duplicate(entry('skerry-d'))]);
    expect(await storedIds(app)).toHaveLength(8);
  });
});

describe('opening', () => {
  it('does not put away the typing of the orbit that is open already', async () => {
    const { app, actions, entry, openOne } = await start();
    await openOne('skerry-a');
    app.document.setText('inclination', '98');
    await actions.open(entry('skerry-a'));
    expect(app.document.draft.value.entry.texts.inclination).toBe('98');
  });
});

describe('removing the demo book', () => {
  it('leaves what was changed, also what was not saved yet', async () => {
    const { app, actions, openOne } = await start();
    await openOne('skerry-a');
    app.document.setText('inclination', '98');
    await actions.removeDemoBook();
    expect(await storedIds(app)).toEqual(['skerry-a']);
    expect(app.document.draft.value.id).toBe('skerry-a');
  });

  it('leaves a blank orbit in the editor where the open one went with it', async () => {
    const { app, actions, openOne } = await start();
    await openOne('skerry-a');
    await actions.removeDemoBook();
    expect(await storedIds(app)).toEqual([]);
    expect(app.document.draft.value.name).toBe('New orbit');
    expect(app.document.changed.value).toBe(false);
  });
});
