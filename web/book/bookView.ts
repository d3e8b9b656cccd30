/** What the book shows and how: read from the store, and remembered while the page is open. */
import { computed, type ReadonlySignal, type Signal, signal } from '@preact/signals';
import type { AppState } from '../state/appState';
import type { BookEntry, BookRevision } from '../store/readStored';
import { type ListedEntry, listedEntries, matches, type SortKey, sortEntries } from './listing';
import { createSummaryKeeper, orbitSummary } from './orbitSummary';

export interface BookView {
  readonly query: Signal<string>;
  readonly sort: Signal<SortKey>;
  /** Null until the user has chosen; then the open orbit counts as chosen. */
  readonly chosenId: Signal<string | null>;
  /** On a phone: whether the details are in front of the list. */
  readonly detailsInFront: Signal<boolean>;
  /** The row that should take the focus as soon as it is there; `headline` for none. */
  readonly focusOn: Signal<string | null>;
  /** Null until the book was read for the first time. */
  readonly stored: ReadonlySignal<readonly BookEntry[] | null>;
  readonly removed: ReadonlySignal<readonly BookEntry[]>;
  /** Why the book cannot be read; null otherwise. */
  readonly problem: ReadonlySignal<string | null>;
  readonly listed: ReadonlySignal<readonly ListedEntry[]>;
  readonly shown: ReadonlySignal<readonly ListedEntry[]>;
  readonly selectedId: ReadonlySignal<string | null>;
  readonly selected: ReadonlySignal<ListedEntry | null>;
  /** Revisions of one entry, latest first. */
  readonly revisions: ReadonlySignal<{ readonly id: string; readonly list: readonly BookRevision[] } | null>;
  readBook(): Promise<void>;
  readRevisions(id: string): Promise<void>;
}

function createBookView({ store, document }: AppState): BookView {
  const query = signal('');
  const sort = signal<SortKey>('saved');
  const chosenId = signal<string | null>(null);
  const reads = createReads(store.book);
  const summaryOf = createSummaryKeeper();
  const openId = computed(() => document.draft.value.id);
  const openSummary = computed(() => orbitSummary(document.draft.value));
  const listed = computed(() =>
    reads.stored.value === null
      ? []
      : listedEntries({
          entries: reads.stored.value,
          summaryOf,
          openId: openId.value,
          open: () => ({ candidate: document.draft.value, summary: openSummary.value }),
        }),
  );
  const selectedId = computed(() => {
    const ids = listed.value.map(({ id }) => id);
    return ids.find((id) => id === chosenId.value) ?? listed.value.find(({ isOpen }) => isOpen)?.id ?? null;
  });
  return {
    query,
    sort,
    chosenId,
    detailsInFront: signal(false),
    focusOn: signal(null),
    listed,
    shown: computed(() =>
      sortEntries(
        listed.value.filter((entry) => matches(entry, query.value)),
        sort.value,
      ),
    ),
    selectedId,
    selected: computed(() => listed.value.find(({ id }) => id === selectedId.value) ?? null),
    ...reads,
  };
}

function createReads(book: AppState['store']['book']) {
  const stored = signal<readonly BookEntry[] | null>(null);
  const removed = signal<readonly BookEntry[]>([]);
  const problem = signal<string | null>(null);
  const revisions = signal<BookView['revisions']['value']>(null);
  let latestRead = 0;
  let latestId = '';
  return {
    stored,
    removed,
    problem,
    revisions,
    readBook: async () => {
      latestRead += 1;
      const read = latestRead;
      const [present, gone] = await Promise.all([book.list(), book.list({ removed: true })]);
      // A later read may have answered first.
      if (read !== latestRead) return;
      problem.value = present.ok ? null : present.message;
      if (present.ok) stored.value = present.value;
      if (gone.ok) removed.value = gone.value;
    },
    readRevisions: async (id: string) => {
      latestId = id;
      const found = await book.revisionsOf(id);
      if (found.ok && id === latestId) revisions.value = { id, list: found.value };
    },
  };
}

const views = new WeakMap<AppState, BookView>();

/** The view of this app's book; the same one each time the place is shown, so that search and order are remembered. */
export function bookViewOf(app: AppState): BookView {
  const view = views.get(app) ?? createBookView(app);
  views.set(app, view);
  return view;
}
