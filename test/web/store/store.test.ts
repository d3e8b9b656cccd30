import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { skerryBook } from '../../../web/store/skerryBook';
import { openStore, type Store } from '../../../web/store/store';
import { candidateNamed, freshDatabase, numberedIds, tickingClock, valueIn } from './support';

const opened: Store[] = [];
async function start(clock = tickingClock()): Promise<Store> {
  const store = await openStore({ clock, newId: numberedIds() });
  opened.push(store);
  return store;
}

beforeEach(freshDatabase);
afterEach(async () => {
  vi.unstubAllGlobals();
  await Promise.all(opened.splice(0).map((store) => store.close()));
});

describe('the store', () => {
  it('starts with the demo book, which stays away once removed', async () => {
    const store = await start();
    expect(store.trouble).toBeNull();
    expect(store.state.value).toBe('kept');
    expect(valueIn(await store.book.list())).toHaveLength(skerryBook.length);
    await store.removeDemoBook();
    expect(store.book.changes.value).toBe(1);
    expect(valueIn(await (await start()).book.list())).toEqual([]);
  });

  it('writes the draft that is pending when it closes', async () => {
    const store = await start();
    store.draft.note({ candidate: candidateNamed('Coast'), baseRevision: null });
    await store.close();
    expect(valueIn(await (await start()).draft.load())).toMatchObject({ candidate: { name: 'Coast' } });
  });

  it('asks to keep the storage at the first save, not before', async () => {
    const persist = vi.fn(async () => true);
    vi.stubGlobal('navigator', { storage: { persist, persisted: async () => false } });
    const store = await start();
    await store.book.remove('skerry-a');
    expect(persist).not.toHaveBeenCalled();
    await store.book.save(candidateNamed('Coast'), { note: '', basedOn: null });
    await vi.waitFor(() => expect(store.persistence.answer.value).toBe('granted'));
    expect(persist).toHaveBeenCalledTimes(1);
  });

  it('drops what was removed more than 30 days ago', async () => {
    const store = await start();
    await store.book.remove('skerry-a');
    const days29 = await start(tickingClock('2028-01-30T00:00:00Z'));
    expect(valueIn(await days29.book.list({ removed: true }))).toHaveLength(1);
    const days31 = await start(tickingClock('2028-02-01T00:00:00Z'));
    expect(valueIn(await days31.book.list({ removed: true }))).toEqual([]);
  });

  it('tells the other tab when the book changes', async () => {
    const [here, there] = [await start(), await start()];
    await here.book.save(candidateNamed('Coast'), { note: '', basedOn: null });
    await vi.waitFor(() => expect(there.book.changes.value).toBe(1));
  });

  it('works in memory where storage is refused, and says so', async () => {
    vi.stubGlobal('indexedDB', undefined);
    const store = await start();
    expect(store.state.value).toBe('memory');
    expect(store.trouble).toMatchObject({
      reason: 'refused',
      message: expect.stringMatching(/gone when this tab closes/),
    });
    expect(valueIn(await store.book.list())).toHaveLength(skerryBook.length);
    const saved = await store.book.save(candidateNamed('Coast'), { note: '', basedOn: null });
    expect(saved).toMatchObject({ ok: true, entry: { revision: 1 } });
    store.draft.note({ candidate: candidateNamed('Coast'), baseRevision: 1 });
    expect(await store.draft.flush()).toBe('kept');
    await store.settings.set('lighting', 'night');
    expect(store.settings.values.value.lighting).toBe('night');
  });
});
