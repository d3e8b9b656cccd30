/** The database: its schema, and opening it with every way in which that goes wrong. */
import { type DBSchema, type IDBPDatabase, openDB } from 'idb';
import { failure, failureFrom, type StoreFailure } from './failure';
import type { CandidateRow, DraftKey, DraftRow, RevisionRow } from './rows';

const databaseName = 'driftbook';
const databaseVersion = 1;

export interface DriftbookSchema extends DBSchema {
  candidates: { key: string; value: CandidateRow; indexes: { savedAt: string; name: string } };
  revisions: { key: [candidateId: string, revision: number]; value: RevisionRow };
  drafts: { key: DraftKey; value: DraftRow };
  settings: { key: string; value: unknown };
}

export type Database = IDBPDatabase<DriftbookSchema>;

export interface DatabaseEvents {
  /** A newer version in another tab waits for this connection to close. */
  readonly onBlocking: (database: Database) => void;
  /** The browser has cut the connection, as when the user clears the site's data. */
  readonly onTerminated: () => void;
}

export type Opened = { readonly ok: true; readonly database: Database } | StoreFailure;

/** Longest wait for the browser to open the database; some never answer, and the app must start all the same. */
const openWaitMs = 4000;

function createStores(database: Database): void {
  const candidates = database.createObjectStore('candidates', { keyPath: 'id' });
  candidates.createIndex('savedAt', 'savedAtIso');
  candidates.createIndex('name', 'name');
  database.createObjectStore('revisions', { keyPath: ['candidateId', 'revision'] });
  database.createObjectStore('drafts');
  database.createObjectStore('settings');
}

/** Opens the database, or says why it cannot be used. Never rejects for what the platform does. */
export async function openDatabase(events: DatabaseEvents, waitMs: number = openWaitMs): Promise<Opened> {
  if (typeof indexedDB === 'undefined') return failure('refused');
  let blocked = false;
  let opened: Database | undefined;
  let late = false;
  // In an async function, since some browsers refuse by throwing before there is a request.
  const open = async () =>
    openDB<DriftbookSchema>(databaseName, databaseVersion, {
      upgrade: createStores,
      blocked: () => {
        blocked = true;
      },
      blocking: () => opened && events.onBlocking(opened),
      terminated: events.onTerminated,
    });
  const answer = open().then(
    (database): Opened => {
      opened = database;
      // The app already runs without storage: a connection left open would only block other tabs.
      if (late) database.close();
      return { ok: true, database };
    },
    (error: unknown): Opened => {
      const found = failureFrom(error);
      return found.reason === 'failed' ? failure('refused') : found;
    },
  );
  let timer: ReturnType<typeof setTimeout> | undefined;
  const waited = new Promise<Opened>((resolve) => {
    timer = setTimeout(() => {
      late = true;
      resolve(failure(blocked ? 'blocked' : 'noAnswer'));
    }, waitMs);
  });
  const first = await Promise.race([answer, waited]);
  clearTimeout(timer);
  return first;
}
