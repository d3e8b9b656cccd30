import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { createDraftKeeper, type Draft } from '../../../web/store/draft';
import { failure } from '../../../web/store/failure';
import { createMemoryShelf } from '../../../web/store/memoryShelf';
import type { Shelf } from '../../../web/store/rows';
import { bookOn, candidateNamed, freshDatabase, openShelf, tickingClock, valueIn } from './support';

const typed = (name: string, baseRevision: number | null = null): Draft => ({
  candidate: candidateNamed(name),
  baseRevision,
});
const clock = tickingClock();

/** The names written to the shelf, in order. */
function watched(shelf: Shelf): { readonly shelf: Shelf; readonly written: string[] } {
  const written: string[] = [];
  const change: Shelf['change'] = (work) =>
    shelf.change((rows) =>
      work({
        ...rows,
        putDraft: (key, row) => {
          written.push((row.candidate as { name: string }).name);
          return rows.putDraft(key, row);
        },
      }),
    );
  return { shelf: { ...shelf, change }, written };
}

describe('the rhythm of the draft', () => {
  beforeEach(() => void vi.useFakeTimers());
  afterEach(() => void vi.useRealTimers());

  it('writes once, 250 ms after the last keystroke', async () => {
    const { shelf, written } = watched(createMemoryShelf());
    const draft = createDraftKeeper({ shelf, clock });
    draft.note(typed('C'));
    await vi.advanceTimersByTimeAsync(100);
    draft.note(typed('Co'));
    await vi.advanceTimersByTimeAsync(249);
    expect(written).toEqual([]);
    expect(draft.status.value).toBe('pending');
    await vi.advanceTimersByTimeAsync(1);
    expect(written).toEqual(['Co']);
    expect(draft.status.value).toBe('kept');
  });

  it('writes at least each 500 ms while the typing never pauses', async () => {
    const { shelf, written } = watched(createMemoryShelf());
    const draft = createDraftKeeper({ shelf, clock });
    for (let key = 0; key < 30; key++) {
      draft.note(typed(`${key}`));
      await vi.advanceTimersByTimeAsync(100);
    }
    expect(written.length).toBeGreaterThanOrEqual(5);
    expect(Number(written.at(-1))).toBeGreaterThanOrEqual(24);
  });

  it('is clean before anything was typed, and flushing then writes nothing', async () => {
    const { shelf, written } = watched(createMemoryShelf());
    const draft = createDraftKeeper({ shelf, clock });
    expect(await draft.flush()).toBe('clean');
    expect(written).toEqual([]);
  });

  it('flushes at once and does not write the same again when its time comes', async () => {
    const { shelf, written } = watched(createMemoryShelf());
    const draft = createDraftKeeper({ shelf, clock });
    draft.note(typed('Coast'));
    expect(await draft.flush()).toBe('kept');
    await vi.advanceTimersByTimeAsync(1000);
    expect(written).toEqual(['Coast']);
  });

  it('stays pending when typed on during a write', async () => {
    const { shelf, written } = watched(createMemoryShelf());
    const draft = createDraftKeeper({ shelf, clock });
    draft.note(typed('Coast'));
    const flushed = draft.flush();
    draft.note(typed('Coastal'));
    expect(await flushed).toBe('pending');
    await vi.advanceTimersByTimeAsync(250);
    expect(draft.status.value).toBe('kept');
    expect(written).toEqual(['Coast', 'Coastal']);
  });

  it('says that it failed, holds on to the text, and writes it when there is room again', async () => {
    const { shelf, written } = watched(createMemoryShelf());
    let full = true;
    const change: Shelf['change'] = async (work) => (full ? failure('full') : shelf.change(work));
    const draft = createDraftKeeper({ shelf: { ...shelf, change }, clock });
    draft.note(typed('Coast'));
    await vi.advanceTimersByTimeAsync(250);
    expect(draft.status.value).toBe('failed');
    expect(draft.failure.value?.message).toMatch(/full/);
    full = false;
    expect(await draft.flush()).toBe('kept');
    expect(draft.failure.value).toBeNull();
    expect(written).toEqual(['Coast']);
  });

  it('does not write while another tab holds the editor', async () => {
    const { shelf, written } = watched(createMemoryShelf());
    const draft = createDraftKeeper({ shelf, clock, mayWrite: () => false });
    draft.note(typed('Coast'));
    expect(await draft.flush()).toBe('failed');
    expect(draft.failure.value?.reason).toBe('elsewhere');
    expect(written).toEqual([]);
  });
});

describe('the draft on the device', () => {
  beforeEach(freshDatabase);

  it('is there after the process was killed, invalid texts and all', async () => {
    const half = candidateNamed('Half');
    const texts = { ...half.entry.texts, inclination: '97,', perigeeAltitude: 'abc' };
    const draft = createDraftKeeper({ shelf: await openShelf(), clock });
    draft.note({ candidate: { ...half, entry: { ...half.entry, texts } }, baseRevision: 3 });
    await draft.flush();
    const loaded = valueIn(await createDraftKeeper({ shelf: await openShelf(), clock }).load());
    expect(loaded).toMatchObject({ kind: 'readable', baseRevision: 3, candidate: { entry: { texts } } });
  });

  it('is handed over within the call, since a page that is going away gets no further turn', async () => {
    const draft = createDraftKeeper({ shelf: await openShelf(), clock });
    const commit = vi.spyOn(IDBTransaction.prototype, 'commit');
    draft.note(typed('Coast'));
    const flushed = draft.flush();
    expect(commit).toHaveBeenCalledTimes(1);
    expect(await flushed).toBe('kept');
    commit.mockRestore();
  });

  it('is null where nothing was kept, and after it was discarded', async () => {
    const draft = createDraftKeeper({ shelf: await openShelf(), clock });
    expect(valueIn(await draft.load())).toBeNull();
    draft.note(typed('Coast'));
    await draft.flush();
    await draft.discard();
    expect(draft.status.value).toBe('clean');
    expect(valueIn(await draft.load())).toBeNull();
  });

  it('sets an unreadable draft aside, so that typing does not replace it', async () => {
    const shelf = await openShelf();
    const row = { candidate: { schema: 99 }, baseRevision: null, typedAtIso: '2030' };
    await shelf.change((rows) => rows.putDraft('current', row));
    const draft = createDraftKeeper({ shelf, clock });
    expect(valueIn(await draft.load())).toMatchObject({ kind: 'unreadable' });
    draft.note(typed('Coast'));
    await draft.flush();
    expect(valueIn(await shelf.look((rows) => rows.draft('unreadable')))).toEqual(row);
  });

  it('follows a save in the same transaction, so that a crash after it is no conflict', async () => {
    const shelf = await openShelf();
    const draft = createDraftKeeper({ shelf, clock });
    draft.note(typed('Coast'));
    await draft.flush();
    await bookOn(shelf).save(candidateNamed('Coast'), { note: '', basedOn: null });
    const loaded = valueIn(await createDraftKeeper({ shelf: await openShelf(), clock }).load());
    expect(loaded?.baseRevision).toBe(1);
    const answer = await bookOn(shelf).save(candidateNamed('Coast'), {
      note: '',
      basedOn: loaded?.baseRevision ?? null,
    });
    expect(answer).toMatchObject({ ok: true, entry: { revision: 2 } });
  });

  it('of another candidate is left alone by a save', async () => {
    const shelf = await openShelf();
    const draft = createDraftKeeper({ shelf, clock });
    draft.note(typed('Coast'));
    await draft.flush();
    await bookOn(shelf).save(candidateNamed('Other', 'other'), { note: '', basedOn: null });
    expect(valueIn(await draft.load())?.baseRevision).toBeNull();
  });
});
