/** The shelf on the device: typed transactions over the database, reconnecting where the browser cut it off. */
import { signal } from '@preact/signals';
import type { IDBPTransaction } from 'idb';
import { type Database, type DriftbookSchema, type Opened, openDatabase } from './database';
import { failure, failureFrom, type StoreFailure } from './failure';
import type { Outcome, Shelf, ShelfState, WritableRows } from './rows';

const storeNames = ['candidates', 'revisions', 'drafts', 'settings'] as const;
type StoreNames = (typeof storeNames)[number][];
type WriteTransaction = IDBPTransaction<DriftbookSchema, StoreNames, 'readwrite'>;

const allRevisionsOf = (id: string) =>
  IDBKeyRange.bound([id, Number.NEGATIVE_INFINITY], [id, Number.POSITIVE_INFINITY]);

function rowsOf(transaction: WriteTransaction): WritableRows {
  const store = <Name extends StoreNames[number]>(name: Name) => transaction.objectStore(name);
  return {
    candidate: (id) => store('candidates').get(id),
    candidates: () => store('candidates').getAll(),
    revision: (id, revision) => store('revisions').get([id, revision]),
    revisions: (id) => store('revisions').getAll(allRevisionsOf(id)),
    draft: (key) => store('drafts').get(key),
    setting: (key) => store('settings').get(key),
    putCandidate: async (row) => void (await store('candidates').put(row)),
    putRevision: async (row) => void (await store('revisions').put(row)),
    dropCandidate: async (id) => {
      await Promise.all([store('candidates').delete(id), store('revisions').delete(allRevisionsOf(id))]);
    },
    putDraft: async (key, row) => void (await store('drafts').put(row, key)),
    dropDraft: (key) => store('drafts').delete(key),
    putSetting: async (key, value) => void (await store('settings').put(value, key)),
    // Some older browsers lack `commit`; there the transaction ends by itself.
    commit: () => transaction.commit?.(),
  };
}

/** Runs `work` in a transaction and answers only when the transaction is done. */
async function runIn<Value>(
  transaction: WriteTransaction,
  work: (rows: WritableRows) => Promise<Value>,
): Promise<Outcome<Value>> {
  // Also watched here, since `work` may fail first and leave the rejection of `done` to nobody.
  const done = transaction.done.then(
    () => undefined,
    (error: unknown) => ({ error }),
  );
  try {
    const value = await work(rowsOf(transaction));
    const failed = await done;
    return failed ? failureFrom(transaction.error ?? failed.error) : { ok: true, value };
  } catch (error) {
    try {
      transaction.abort();
    } catch {
      // Already ended by the failure itself.
    }
    await done;
    return failureFrom(transaction.error ?? error);
  }
}

const isClosed = (error: unknown) => error instanceof DOMException && error.name === 'InvalidStateError';

class Connection {
  readonly state = signal<ShelfState>('kept');
  database: Database | null = null;
  readonly #closingListeners: (() => Promise<unknown>)[] = [];

  constructor(readonly waitMs: number | undefined) {}

  async open(): Promise<Opened> {
    const opened = await openDatabase(
      {
        onBlocking: (database) => void this.#letGo(database),
        onTerminated: () => {
          this.database = null;
        },
      },
      this.waitMs,
    );
    if (opened.ok) this.database = opened.database;
    return opened;
  }

  async #letGo(database: Database): Promise<void> {
    await Promise.allSettled(this.#closingListeners.map((listener) => listener()));
    this.state.value = 'superseded';
    this.database = null;
    database.close();
  }

  beforeClosing(listener: () => Promise<unknown>): void {
    this.#closingListeners.push(listener);
  }

  /** A transaction on the open database; on a connection that was cut, one attempt to open it again. */
  async begin(mode: IDBTransactionMode): Promise<{ ok: true; transaction: WriteTransaction } | StoreFailure> {
    const opened = await this.open();
    if (!opened.ok) return opened;
    return { ok: true, transaction: this.transaction(opened.database, mode) };
  }

  transaction(database: Database, mode: IDBTransactionMode): WriteTransaction {
    const names: StoreNames = [...storeNames];
    // Reading code gets `Rows`, whose members never write, so one transaction type serves both modes.
    return database.transaction(names, mode as 'readwrite', { durability: 'strict' });
  }
}

async function run<Value>(
  connection: Connection,
  mode: IDBTransactionMode,
  work: (rows: WritableRows) => Promise<Value>,
): Promise<Outcome<Value>> {
  if (connection.state.value === 'superseded') return failure('superseded');
  if (connection.database) {
    try {
      // No await before this: on `pagehide` a write must be handed over in the same turn.
      const transaction = connection.transaction(connection.database, mode);
      return await runIn(transaction, work);
    } catch (error) {
      if (!isClosed(error)) return failureFrom(error);
      connection.database = null;
    }
  }
  const begun = await connection.begin(mode);
  return begun.ok ? runIn(begun.transaction, work) : begun;
}

/** Opens the shelf on the device, or says why there is none. */
export async function openDatabaseShelf(
  waitMs?: number,
): Promise<{ readonly ok: true; readonly shelf: Shelf } | StoreFailure> {
  const connection = new Connection(waitMs);
  const opened = await connection.open();
  if (!opened.ok) return opened;
  const shelf: Shelf = {
    state: connection.state,
    look: (work) => run(connection, 'readonly', work),
    change: (work) => run(connection, 'readwrite', work),
    beforeClosing: (listener) => connection.beforeClosing(listener),
    close: () => {
      connection.database?.close();
      connection.database = null;
    },
  };
  return { ok: true, shelf };
}
