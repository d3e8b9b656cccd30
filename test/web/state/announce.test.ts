import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { createAnnouncer } from '../../../web/state/announce';
import type { AppState } from '../../../web/state/appState';
import { startApp } from './support';

describe('the announcer', () => {
  it('shows the latest message until it is dismissed', () => {
    const { current, say, dismiss } = createAnnouncer();
    expect(current.value).toBeNull();
    say({ text: 'one', tone: 'note' });
    say({ text: 'two', tone: 'caution' });
    expect(current.value).toEqual({ text: 'two', tone: 'caution' });
    dismiss();
    expect(current.value).toBeNull();
  });
});

describe('an undo of a draft', () => {
  let app: AppState;
  beforeEach(async () => {
    ({ app } = await startApp());
  });
  afterEach(() => app.store.close());

  const said = () => app.announcer.current.value?.text ?? null;
  const sayUndo = (text = 'Read.') => {
    const before = app.document.draft.value;
    app.document.setText('inclination', '50');
    const run = () => app.document.restoreDraft(before);
    app.announcer.say({ text, tone: 'note', untilEdited: true, action: { label: 'Undo', run } });
    return before;
  };

  it('stays until something else is typed', () => {
    sayUndo();
    expect(said()).toBe('Read.');
    app.document.setText('node', '5');
    expect(said()).toBeNull();
  });

  it('goes once it is used', () => {
    const before = sayUndo();
    app.announcer.current.value?.action?.run();
    expect(app.document.draft.value).toBe(before);
    expect(said()).toBeNull();
  });

  it('of a second change counts from that change', () => {
    sayUndo('first');
    sayUndo('second');
    expect(said()).toBe('second');
    app.document.setText('node', '6');
    expect(said()).toBeNull();
  });

  it('goes when another orbit is opened', () => {
    sayUndo();
    app.document.open({ candidate: { ...app.document.draft.value, id: 'two' }, baseRevision: null, savedText: null });
    expect(said()).toBeNull();
  });

  it('leaves messages alone that undo no draft', () => {
    app.announcer.say({ text: 'Removed.', tone: 'note', action: { label: 'Undo', run: () => undefined } });
    app.document.setText('node', '7');
    expect(said()).toBe('Removed.');
  });
});
