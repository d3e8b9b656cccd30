/** What the store tests share: a database of their own, a clock they set, candidates to save. */
import 'fake-indexeddb/auto';
import { IDBFactory } from 'fake-indexeddb';
import { blankCandidate, type Candidate } from '../../../core/index';
import { createBook } from '../../../web/store/book';
import type { Book } from '../../../web/store/bookContract';
import { openDatabaseShelf } from '../../../web/store/databaseShelf';
import { createMemoryShelf } from '../../../web/store/memoryShelf';
import type { Clock, Outcome, Shelf } from '../../../web/store/rows';

export function freshDatabase(): void {
  globalThis.indexedDB = new IDBFactory();
}

/** A clock that moves on by a minute at each look, so that saves have an order. */
export function tickingClock(startIso = '2028-01-01T00:00:00Z'): Clock {
  let time = Date.parse(startIso);
  return () => {
    time += 60_000;
    return new Date(time);
  };
}

export async function openShelf(): Promise<Shelf> {
  const opened = await openDatabaseShelf();
  if (!opened.ok) throw new Error(`Expected storage to open, got: ${opened.message}`);
  return opened.shelf;
}

export function numberedIds(): () => string {
  let count = 0;
  return () => `new-${++count}`;
}

export function bookOn(shelf: Shelf, clock: Clock = tickingClock()): Book {
  return createBook({ shelf, clock, newId: numberedIds() });
}

/** A shelf as after a restart: nothing of the old tab is closed or written first, as when the process is killed. */
export const shelves = {
  'on the device': { open: openShelf, reopen: openShelf },
  'in memory': (() => {
    let shelf = createMemoryShelf();
    return {
      open: async () => {
        shelf = createMemoryShelf();
        return shelf;
      },
      reopen: async () => shelf,
    };
  })(),
};

export const candidateNamed = (name: string, id = 'one'): Candidate => blankCandidate({ id, name });

export function valueIn<Value>(outcome: Outcome<Value> | { readonly ok: false; readonly message: string }): Value {
  if (!outcome.ok) throw new Error(`Expected success, got: ${outcome.message}`);
  return outcome.value;
}
