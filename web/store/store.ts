/**
 * All that the app keeps, behind one door. Where the browser refuses storage, the same store runs in memory
 * and `trouble` says so.
 */
import type { ReadonlySignal } from '@preact/signals';
import { createBook } from './book';
import type { Book } from './bookContract';
import { openDatabaseShelf } from './databaseShelf';
import { isDemoBookDecided, removeDemoBook, seedDemoBook } from './demoBook';
import { createDraftKeeper, type DraftKeeper } from './draft';
import type { StoreFailure } from './failure';
import { flushWhenLeaving } from './leaving';
import { createMemoryShelf } from './memoryShelf';
import { createPersistence, type Persistence } from './persistence';
import type { Clock, Outcome, Shelf, ShelfState } from './rows';
import { loadSettings, type SettingsKeeper } from './settings';
import { joinTabs, type Tabs } from './tabs';

export interface Store {
  readonly book: Book;
  readonly draft: DraftKeeper;
  readonly settings: SettingsKeeper;
  readonly persistence: Persistence;
  readonly tabs: Tabs;
  /** Whether what is saved outlasts this tab. */
  readonly state: ReadonlySignal<ShelfState>;
  /** Why the store runs in memory; null where it is kept on the device. */
  readonly trouble: StoreFailure | null;
  /** Takes out the demo candidates that were not saved over, for good. Answers how many. */
  removeDemoBook(): Promise<Outcome<number>>;
  /** Writes the draft and lets go of the storage. */
  close(): Promise<void>;
}

export interface StoreParts {
  readonly clock: Clock;
  /** Identifiers for new candidates, unique on this device. */
  readonly newId: () => string;
  /** How long to wait for the browser to open its storage, in ms. */
  readonly openWaitMs?: number;
}

/** Removed candidates stay this long, in days, before they are dropped for good. */
const removedKeptDays = 30;
const millisecondsPerDay = 86_400_000;

async function prepareBook(shelf: Shelf, book: Book, clock: Clock): Promise<void> {
  const now = clock();
  if (!(await isDemoBookDecided(shelf))) {
    // Needed once in the life of a book, so it is not among what every start loads.
    const { skerryBook } = await import('./skerryBook');
    await seedDemoBook(shelf, { candidates: skerryBook, savedAtIso: now.toISOString() });
  }
  // Not awaited, so that the start does not wait; whatever reads the book next queues behind it.
  void book.purgeRemoved(new Date(now.getTime() - removedKeptDays * millisecondsPerDay));
}

/** Opens the store. Always resolves: without storage it works in memory. */
export async function openStore({ clock, newId, openWaitMs }: StoreParts): Promise<Store> {
  const opened = await openDatabaseShelf(openWaitMs);
  const shelf = opened.ok ? opened.shelf : createMemoryShelf();
  const settings = await loadSettings(shelf);
  const persistence = createPersistence(settings);
  const onChange = ({ saved }: { readonly saved: boolean }) => {
    tabs.announceChange();
    // Not awaited: the browser may put the question to the user, and the save is already done.
    if (saved && opened.ok) void persistence.askAtFirstSave();
  };
  const book = createBook({ shelf, clock, newId, onChange });
  const draft = createDraftKeeper({ shelf, clock, mayWrite: () => !tabs.editorElsewhere.value });
  const flush = () => draft.flush();
  const tabs = await joinTabs({ beforeHandOver: flush, onBookChanged: () => book.noticeChange() });
  shelf.beforeClosing(flush);
  await prepareBook(shelf, book, clock);
  void persistence.look();
  const stopFlushing = flushWhenLeaving(flush);
  return {
    book,
    draft,
    settings,
    persistence,
    tabs,
    state: shelf.state,
    trouble: opened.ok ? null : opened,
    removeDemoBook: async () => {
      const outcome = await removeDemoBook(shelf);
      if (outcome.ok) book.noticeChange();
      tabs.announceChange();
      return outcome;
    },
    close: async () => {
      stopFlushing();
      await flush();
      tabs.close();
      shelf.close();
    },
  };
}
