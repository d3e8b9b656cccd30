import { afterEach, describe, expect, it, vi } from 'vitest';
import type { AppState } from '../../../web/state/appState';
import { fakeLocks } from '../store/fakeLocks';
import { startApp } from './support';

const opened: AppState[] = [];
afterEach(async () => {
  await Promise.all(opened.splice(0).map((app) => app.store.close()));
  vi.unstubAllGlobals();
});

describe('two tabs', () => {
  it('hand the editor over with what is typed, back and forth', async () => {
    vi.stubGlobal('navigator', { locks: fakeLocks() });
    const { app: first, again } = await startApp();
    const second = await again();
    opened.push(first, second);
    expect([first, second].map(({ store }) => store.tabs.editorElsewhere.value)).toEqual([false, true]);

    first.document.setText('inclination', '97.');
    await second.store.tabs.takeOver();
    await expect.poll(() => second.document.draft.value.entry.texts.inclination).toBe('97.');
    expect(first.store.tabs.editorElsewhere.value).toBe(true);
    expect(second.document.changed.value).toBe(true);
    expect(second.document.baseRevision.value).toBe(1);

    second.document.setText('inclination', '97.5');
    await first.store.tabs.takeOver();
    await expect.poll(() => first.document.draft.value.entry.texts.inclination).toBe('97.5');
    expect(first.document.stale.value).toBe(false);
  });
});
