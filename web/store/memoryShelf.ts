/** A shelf that lasts as long as the tab: for browsers that refuse storage. */
import { signal } from '@preact/signals';
import type { CandidateRow, DraftRow, Outcome, RevisionRow, Shelf, ShelfState, WritableRows } from './rows';

function memoryRows(): WritableRows {
  const candidates = new Map<string, CandidateRow>();
  const revisions = new Map<string, RevisionRow[]>();
  const drafts = new Map<string, DraftRow>();
  const settings = new Map<string, unknown>();
  const keep = <Key, Value>(map: Map<Key, Value>, key: Key, value: Value) => void map.set(key, structuredClone(value));
  return {
    candidate: async (id) => candidates.get(id),
    candidates: async () => [...candidates.values()],
    revision: async (id, revision) => revisions.get(id)?.find((row) => row.revision === revision),
    revisions: async (id) => [...(revisions.get(id) ?? [])],
    draft: async (key) => drafts.get(key),
    setting: async (key) => settings.get(key),
    putCandidate: async (row) => keep(candidates, row.id, row),
    putRevision: async (row) => keep(revisions, row.candidateId, [...(revisions.get(row.candidateId) ?? []), row]),
    dropCandidate: async (id) => {
      candidates.delete(id);
      revisions.delete(id);
    },
    putDraft: async (key, row) => keep(drafts, key, row),
    dropDraft: async (key) => void drafts.delete(key),
    putSetting: async (key, value) => keep(settings, key, value),
    commit: () => undefined,
  };
}

export function createMemoryShelf(): Shelf {
  const rows = memoryRows();
  // Changes run one after another, as transactions do.
  let last: Promise<unknown> = Promise.resolve();
  const run = <Value>(work: (rows: WritableRows) => Promise<Value>): Promise<Outcome<Value>> => {
    const next = last.then(async () => ({ ok: true, value: await work(rows) }) as const);
    last = next.catch(() => undefined);
    return next;
  };
  return {
    state: signal<ShelfState>('memory'),
    look: run,
    change: run,
    beforeClosing: () => undefined,
    close: () => undefined,
  };
}
