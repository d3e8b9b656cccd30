import { afterEach, describe, expect, it, vi } from 'vitest';
import type { AppState } from '../../../web/state/appState';
import { openedFrom } from '../../../web/state/saving';
import { valueIn } from '../store/support';
import { candidateOf, startApp as startOn } from './support';

const opened: AppState[] = [];
afterEach(async () => {
  await Promise.all(opened.splice(0).map((app) => app.store.close()));
});

/** An app on an empty book, with a new orbit open. */
async function startApp(): Promise<AppState> {
  const { app } = await startOn((store) => store.removeDemoBook());
  opened.push(app);
  return app;
}

const said = (app: AppState) => app.announcer.current.value?.text ?? null;
const actionOf = (app: AppState) => app.announcer.current.value?.action;
const type = (app: AppState, inclination: string) => app.document.setText('inclination', inclination);
const typed = (app: AppState) => app.document.draft.value.entry.texts.inclination;
const historyOf = async (app: AppState, id: string) =>
  valueIn(await app.store.book.revisionsOf(id)).map((row) => [
    row.revision,
    row.kind === 'readable' ? row.candidate.entry.texts.inclination : null,
  ]);

async function startSaved(): Promise<AppState> {
  const app = await startApp();
  type(app, '98');
  await app.saving.save('first');
  return app;
}

describe('saving', () => {
  it('adds a revision, and is done only when it is kept', async () => {
    const app = await startApp();
    expect(app.saving.status.value).toEqual({ kind: 'idle' });
    type(app, '98');
    const saving = app.saving.save('higher');
    expect(app.saving.status.value).toEqual({ kind: 'saving' });
    expect(app.document.changed.value).toBe(true);
    expect(await saving).toBe(true);
    expect(app.saving.status.value).toMatchObject({ kind: 'saved', revision: 1, atIso: expect.any(String) });
    expect(app.document.changed.value).toBe(false);
    expect(app.document.baseRevision.value).toBe(1);
    expect(said(app)).toBeNull();
    const [row] = valueIn(await app.store.book.revisionsOf(app.document.draft.value.id));
    expect(row).toMatchObject({ revision: 1, note: 'higher' });
  });

  it('leaves what is typed meanwhile as a change on top', async () => {
    const app = await startApp();
    type(app, '98');
    const saving = app.saving.save();
    type(app, '98.5');
    expect(await saving).toBe(true);
    expect(typed(app)).toBe('98.5');
    expect(app.document.changed.value).toBe(true);
    expect(await app.saving.save()).toBe(true);
    expect(await historyOf(app, app.document.draft.value.id)).toEqual([
      [2, '98.5'],
      [1, '98'],
    ]);
  });

  it('twice at once makes one revision, and is no conflict with itself', async () => {
    const app = await startApp();
    type(app, '98');
    expect(await Promise.all([app.saving.save(), app.saving.save(), app.saving.save()])).toEqual([true, true, true]);
    expect(await historyOf(app, app.document.draft.value.id)).toEqual([[1, '98']]);
    expect(said(app)).toBeNull();
    expect(app.saving.status.value).toMatchObject({ kind: 'saved', revision: 1 });
  });

  it('leaves an orbit alone that was opened meanwhile', async () => {
    const app = await startApp();
    type(app, '98');
    const saving = app.saving.save();
    app.document.open(openedFrom(candidateOf({}, {}, { id: 'other' }), 4));
    type(app, '99');
    expect(await saving).toBe(true);
    expect(app.document.baseRevision.value).toBe(4);
    expect(app.document.changed.value).toBe(true);
    expect(app.saving.status.value).toEqual({ kind: 'idle' });
  });

  it('tells the draft the revision, so that a restart has it', async () => {
    const app = await startSaved();
    await app.store.draft.flush();
    const draft = valueIn(await app.store.draft.load());
    expect(draft).toMatchObject({ kind: 'readable', baseRevision: 1 });
  });

  it('of an entry that comes to no orbit keeps it as typed and says so', async () => {
    const app = await startApp();
    type(app, 'steep');
    expect(await app.saving.save()).toBe(true);
    expect(said(app)).toMatch(/Saved as typed.*does not come to an orbit/);
    expect(await historyOf(app, app.document.draft.value.id)).toEqual([[1, 'steep']]);
    type(app, '98');
    expect(said(app)).toBeNull();
  });

  it('that fails leaves the draft, says why and offers to try again', async () => {
    const app = await startSaved();
    type(app, '99');
    vi.spyOn(app.store.book, 'save').mockResolvedValueOnce({ ok: false, reason: 'full', message: 'No room.' });
    expect(await app.saving.save()).toBe(false);
    expect(app.saving.status.value).toEqual({ kind: 'failed', message: 'No room.' });
    expect(app.announcer.current.value).toMatchObject({ text: 'No room.', tone: 'caution' });
    expect(app.document.changed.value).toBe(true);
    expect(typed(app)).toBe('99');
    expect(actionOf(app)?.label).toBe('Try again');
    actionOf(app)?.run();
    await expect.poll(() => app.saving.status.value).toMatchObject({ kind: 'saved', revision: 2 });
  });
});

describe('a conflict', () => {
  const startConflict = async () => {
    const app = await startSaved();
    const theirs = app.document.draft.value;
    const text = { ...theirs, entry: { ...theirs.entry, texts: { ...theirs.entry.texts, inclination: '50' } } };
    expect(await app.store.book.save(text, { note: 'theirs', basedOn: 1 })).toMatchObject({ ok: true });
    type(app, '99');
    return app;
  };

  it('writes nothing and offers to save on top, and both stay', async () => {
    const app = await startConflict();
    expect(await app.saving.save()).toBe(false);
    const { id } = app.document.draft.value;
    expect(await historyOf(app, id)).toHaveLength(2);
    expect(typed(app)).toBe('99');
    expect(actionOf(app)?.label).toBe('Save on top of it');
    actionOf(app)?.run();
    await expect.poll(() => app.document.changed.value).toBe(false);
    expect(await historyOf(app, id)).toEqual([
      [3, '99'],
      [2, '50'],
      [1, '98'],
    ]);
  });

  it('keeps the open orbit when another was to be opened', async () => {
    const app = await startConflict();
    expect(await app.saving.openSaved(candidateOf({}, {}, { id: 'other' }), 1)).toBe(false);
    expect(typed(app)).toBe('99');
  });
});

describe('opening another orbit', () => {
  it('keeps what is unsaved as a revision first and says so', async () => {
    const app = await startSaved();
    const { id } = app.document.draft.value;
    type(app, '99');
    expect(await app.saving.openSaved(candidateOf({}, {}, { id: 'other', name: 'Other' }), 4)).toBe(true);
    expect(await historyOf(app, id)).toEqual([
      [2, '99'],
      [1, '98'],
    ]);
    expect(said(app)).toContain('New orbit');
    expect(app.document.draft.value.id).toBe('other');
    expect(app.document.baseRevision.value).toBe(4);
    expect(app.document.changed.value).toBe(false);
    expect(app.saving.status.value).toEqual({ kind: 'idle' });
  });

  it('keeps what is typed while the other is being saved', async () => {
    const app = await startSaved();
    const { id } = app.document.draft.value;
    type(app, '99');
    const opening = app.saving.openSaved(candidateOf({}, {}, { id: 'other' }), 4);
    type(app, '99.5');
    expect(await opening).toBe(true);
    expect(await historyOf(app, id)).toEqual([
      [3, '99.5'],
      [2, '99'],
      [1, '98'],
    ]);
    expect(app.document.draft.value.id).toBe('other');
  });

  it('waits for a save that is under way', async () => {
    const app = await startApp();
    const { id } = app.document.draft.value;
    type(app, '98');
    const saving = app.saving.save();
    expect(await app.saving.startNew()).toBe(true);
    expect(await saving).toBe(true);
    expect(await historyOf(app, id)).toEqual([[1, '98']]);
  });

  it('saves nothing where nothing is unsaved', async () => {
    const app = await startSaved();
    const { id } = app.document.draft.value;
    expect(await app.saving.startNew()).toBe(true);
    expect(await app.saving.startNew()).toBe(true);
    expect(said(app)).toBeNull();
    expect(await historyOf(app, id)).toHaveLength(1);
    expect(valueIn(await app.store.book.list())).toHaveLength(1);
    expect(app.document.draft.value.id).not.toBe(id);
  });
});

describe('discarding changes', () => {
  it('goes back to what was saved, and undo brings the typing back', async () => {
    const app = await startSaved();
    type(app, '99');
    await app.saving.discardChanges();
    expect(typed(app)).toBe('98');
    expect(app.document.changed.value).toBe(false);
    expect(said(app)).toBe('Back to revision 1.');
    actionOf(app)?.run();
    expect(typed(app)).toBe('99');
    expect(app.document.changed.value).toBe(true);
    expect(app.document.baseRevision.value).toBe(1);
    expect(await app.saving.save()).toBe(true);
  });

  it('goes back to the revision that the typing started from, not to a later one', async () => {
    const app = await startSaved();
    expect(await app.store.book.rename(app.document.draft.value.id, 'Theirs')).toMatchObject({ ok: true });
    type(app, '99');
    await app.saving.discardChanges();
    expect(app.document.draft.value.name).toBe('New orbit');
    expect(app.document.baseRevision.value).toBe(1);
  });

  it('keeps them where the saved revision cannot be had, and says so', async () => {
    const app = await startSaved();
    app.document.open({ ...openedFrom(app.document.draft.value, 7) });
    type(app, '99');
    await app.saving.discardChanges();
    expect(typed(app)).toBe('99');
    expect(said(app)).toMatch(/changes stay/);
  });
});

describe('the start', () => {
  it('opens the draft as it was left, with what counts as saved', async () => {
    const { app, again } = await startOn((store) => store.removeDemoBook());
    type(app, '98');
    await app.saving.save();
    type(app, '98.');
    await app.store.close();
    const later = await again();
    opened.push(later);
    expect(typed(later)).toBe('98.');
    expect(later.document.baseRevision.value).toBe(1);
    expect(later.document.changed.value).toBe(true);
    type(later, '98');
    expect(later.document.changed.value).toBe(false);
  });

  it('takes a blank one for unchanged after a restart too', async () => {
    const { app, again } = await startOn();
    await app.saving.startNew();
    await app.store.close();
    const later = await again();
    opened.push(later);
    expect(later.document.draft.value.name).toBe('New orbit');
    expect(later.document.changed.value).toBe(false);
    type(later, '98');
    expect(later.document.changed.value).toBe(true);
  });

  it('opens the orbit saved last where there is no draft, else a blank one', async () => {
    const { app } = await startOn();
    opened.push(app);
    const [latest] = valueIn(await app.store.book.list());
    expect(app.document.draft.value.id).toBe(latest?.id);
    expect(app.document.changed.value).toBe(false);
    const empty = await startApp();
    expect(empty.document.draft.value.name).toBe('New orbit');
    expect(empty.document.baseRevision.value).toBeNull();
  });
});
