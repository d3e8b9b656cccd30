/** What the tests of the app's state share: a document, and an app whose store is a database of its own. */
import { signal } from '@preact/signals';
import { blankCandidate, type Candidate, type FieldId, type OrbitEntry, type ResolvedOrbit } from '../../../core/index';
import { type AppState, createAppState } from '../../../web/state/appState';
import { createDocument, type OrbitDocument } from '../../../web/state/document';
import { openedFrom } from '../../../web/state/saving';
import { openStore, type Store } from '../../../web/store/store';
import { freshDatabase, numberedIds, tickingClock } from '../store/support';

type Part = Partial<Pick<Candidate, 'id' | 'name' | 'body' | 'gravitySet' | 'conditions' | 'limits'>>;

export function candidateOf(
  texts: Partial<Record<FieldId, string>> = {},
  tags: Partial<Omit<OrbitEntry, 'texts'>> = {},
  part: Part = {},
): Candidate {
  const blank = blankCandidate({ id: 'one', name: 'Coast' });
  return { ...blank, ...part, entry: { ...blank.entry, ...tags, texts: { ...blank.entry.texts, ...texts } } };
}

/** A document opened on a candidate that was saved as its first revision. */
export function documentOf(candidate: Candidate = candidateOf()): OrbitDocument {
  return createDocument(openedFrom(candidate, 1));
}

export function textsOf(document: OrbitDocument): OrbitEntry['texts'] {
  return document.draft.value.entry.texts;
}

/** The orbit at hand, good or last good. */
export function orbitOf(document: OrbitDocument): ResolvedOrbit {
  const orbit = document.orbit.value;
  if (!orbit) throw new Error(`Expected an orbit, got ${JSON.stringify(document.resolution.value)}`);
  return orbit;
}

/** A page that has an address and tells when it changes. */
export function fakePage(hash = '') {
  const listeners: (() => void)[] = [];
  const location = { hash };
  return {
    location: location as Location,
    addEventListener: ((type: string, listener: () => void) => {
      if (type === 'hashchange') listeners.push(listener);
    }) as Window['addEventListener'],
    /** As the back button does. */
    goTo: (next: string) => {
      location.hash = next;
      for (const listener of listeners) listener();
    },
  };
}

/** An app on a store of its own; `again` opens the app anew on what the store keeps, as after a restart. */
export async function startApp(onStore: (store: Store) => Promise<unknown> = async () => undefined) {
  freshDatabase();
  const newId = numberedIds();
  const open = async (): Promise<AppState> => {
    const store = await openStore({ clock: tickingClock(), newId });
    await onStore(store);
    return createAppState({
      store,
      newId,
      offline: { status: signal('unsupported'), updateWaiting: signal(false), applyUpdate: async () => false },
      page: fakePage(),
    });
  };
  return { app: await open(), again: open };
}
