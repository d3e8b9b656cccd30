import { forceCloseDatabase } from 'fake-indexeddb';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { openDatabaseShelf } from '../../../web/store/databaseShelf';
import { bookOn, candidateNamed, freshDatabase, openShelf, valueIn } from './support';

const save = { note: '', basedOn: null };
const named = (name: string) => new DOMException('as the platform says it', name);

/** The raw connection of the shelf opened last. */
function watchConnections(): () => IDBDatabase {
  const open = vi.spyOn(indexedDB, 'open');
  return () => {
    const result = open.mock.results.at(-1);
    if (result?.type !== 'return') throw new Error('Expected an opened connection, got none');
    return result.value.result;
  };
}

beforeEach(freshDatabase);
afterEach(() => void vi.restoreAllMocks());

describe('a write', () => {
  it('asks for strict durability and is ok only after its transaction has completed', async () => {
    const transaction = vi.spyOn(IDBDatabase.prototype, 'transaction');
    const order: string[] = [];
    const shelf = await openShelf();
    const writing = shelf.change((rows) => rows.putSetting('lighting', 'night'));
    expect(transaction.mock.calls.at(-1)?.[2]).toEqual({ durability: 'strict' });
    const result = transaction.mock.results.at(-1);
    if (result?.type === 'return') result.value.addEventListener('complete', () => order.push('complete'));
    await writing;
    order.push('ok');
    expect(order).toEqual(['complete', 'ok']);
  });

  it('is all or nothing', async () => {
    const shelf = await openShelf();
    const outcome = await shelf.change(async (rows) => {
      await rows.putSetting('lighting', 'night');
      throw named('QuotaExceededError');
    });
    expect(outcome).toMatchObject({ ok: false, reason: 'full' });
    expect(valueIn(await shelf.look((rows) => rows.setting('lighting')))).toBeUndefined();
  });

  it('that finds the device full says so and leaves what was saved before', async () => {
    const book = bookOn(await openShelf());
    await book.save(candidateNamed('Coast'), save);
    const put = vi.spyOn(IDBObjectStore.prototype, 'put').mockImplementation(() => {
      throw named('QuotaExceededError');
    });
    const answer = await book.save(candidateNamed('Coast, higher'), { note: '', basedOn: 1 });
    expect(answer).toMatchObject({ ok: false, reason: 'full' });
    put.mockRestore();
    expect(valueIn(await book.list())).toMatchObject([{ name: 'Coast', revision: 1 }]);
    const again = await book.save(candidateNamed('Coast, higher'), { note: '', basedOn: 1 });
    expect(again).toMatchObject({ ok: true, entry: { revision: 2 } });
  });

  it('passes on a fault of the program itself instead of calling it a failure of the device', async () => {
    const shelf = await openShelf();
    const faulty = shelf.change(async () => {
      throw new Error('Expected a row, got none');
    });
    await expect(faulty).rejects.toThrow('Expected a row');
    expect(await shelf.change((rows) => rows.putSetting('lighting', 'night'))).toMatchObject({ ok: true });
  });
});

describe('a lost connection', () => {
  it('is opened again by the next call when the browser cut it', async () => {
    const connection = watchConnections();
    const shelf = await openShelf();
    // The library's type names the constructor where it takes an instance.
    forceCloseDatabase(connection() as unknown as typeof IDBDatabase);
    expect(await bookOn(shelf).save(candidateNamed('Coast'), save)).toMatchObject({ ok: true });
    expect(indexedDB.open).toHaveBeenCalledTimes(2);
  });

  it('is opened again when it turns out closed without notice', async () => {
    const connection = watchConnections();
    const shelf = await openShelf();
    connection().close();
    expect(await bookOn(shelf).save(candidateNamed('Coast'), save)).toMatchObject({ ok: true });
  });

  it('makes way for a newer version in another tab, writing what is pending first', async () => {
    const shelf = await openShelf();
    shelf.beforeClosing(() => shelf.change((rows) => rows.putSetting('lighting', 'night')));
    const newer = indexedDB.open('driftbook', 2);
    const database = await new Promise<IDBDatabase>((resolve) => {
      newer.onsuccess = () => resolve(newer.result);
    });
    expect(shelf.state.value).toBe('superseded');
    expect(await bookOn(shelf).save(candidateNamed('Coast'), save)).toMatchObject({ ok: false, reason: 'superseded' });
    const kept = database.transaction('settings').objectStore('settings').get('lighting');
    await new Promise((resolve) => {
      kept.onsuccess = resolve;
    });
    expect(kept.result).toBe('night');
    database.close();
  });
});

describe('storage that does not open', () => {
  it('is called refused where the browser has none', async () => {
    vi.stubGlobal('indexedDB', undefined);
    expect(await openDatabaseShelf()).toMatchObject({ ok: false, reason: 'refused' });
    vi.unstubAllGlobals();
  });

  it.each(['SecurityError', 'InvalidStateError', 'UnknownError'])('is called refused on %s', async (name) => {
    vi.spyOn(indexedDB, 'open').mockImplementation(() => {
      throw named(name);
    });
    expect(await openDatabaseShelf()).toMatchObject({ ok: false, reason: 'refused' });
  });

  it('is called newer where a newer version wrote it', async () => {
    const newer = indexedDB.open('driftbook', 2);
    await new Promise((resolve) => {
      newer.onsuccess = resolve;
    });
    newer.result.close();
    expect(await openDatabaseShelf()).toMatchObject({ ok: false, reason: 'newer' });
  });

  it('does not keep the app waiting when the browser never answers', async () => {
    vi.spyOn(indexedDB, 'open').mockImplementation(() => new IDBOpenDBRequest());
    expect(await openDatabaseShelf(10)).toMatchObject({ ok: false, reason: 'noAnswer' });
  });

  it('is called blocked while a tab with an older version holds it', async () => {
    vi.spyOn(indexedDB, 'open').mockImplementation(() => {
      const request = new IDBOpenDBRequest();
      setTimeout(() => request.dispatchEvent(new IDBVersionChangeEvent('blocked')));
      return request;
    });
    expect(await openDatabaseShelf(20)).toMatchObject({ ok: false, reason: 'blocked' });
  });
});
