/**
 * All state of the app, from one factory, so that each test starts fresh.
 *
 * Writable: the document, the route, the announcement, the picture and its choices, the working that is open. Everything else is computed.
 */
import { computed, effect, type ReadonlySignal, type Signal, signal } from '@preact/signals';
import type { ClosedFormDrift, ReadingId } from '../../core/index';
import type { Offline } from '../offline/offline';
import type { Store } from '../store/store';
import { type Announcer, createAnnouncer } from './announce';
import { createDocument, type OpenCandidate, type OrbitDocument } from './document';
import { createDrift } from './drift';
import { createMissionLink, type MissionLink } from './missionLink';
import type { PictureId } from './picture';
import { createPreferences, type Preferences } from './preferences';
import { createRoute, type Route } from './route';
import { createSaving, openedFrom, openedNew, type Saving } from './saving';
import { firstSweep, type SweepChoice } from './sweepChoice';

export interface AppState {
  readonly store: Store;
  readonly offline: Offline;
  readonly document: OrbitDocument;
  readonly preferences: Preferences;
  readonly route: Route;
  readonly announcer: Announcer;
  readonly saving: Saving;
  readonly drift: ReadonlySignal<ClosedFormDrift | null>;
  readonly mission: MissionLink;
  readonly picture: Signal<PictureId>;
  readonly sweep: Signal<SweepChoice>;
  /** The reading whose working is open; null for none. */
  readonly openWorking: Signal<ReadingId | null>;
}

export interface AppStateParts {
  readonly store: Store;
  readonly offline: Offline;
  readonly page: Pick<Window, 'location' | 'addEventListener'>;
  readonly newId: () => string;
}

export async function createAppState({ store, offline, page, newId }: AppStateParts): Promise<AppState> {
  const opened = await openedAtStart(store, newId);
  const document = createDocument(opened);
  const announcer = createAnnouncer();
  const preferences = createPreferences(store.settings);
  const saving = createSaving({ store, document, announcer, newId });
  const spanDays = computed(() => preferences.values.value.spanDays);
  keepDraft(store, document);
  expireUndo(document, announcer);
  followHandOver(store, document);
  return {
    store,
    offline,
    document,
    preferences,
    route: createRoute(page),
    announcer,
    saving,
    drift: createDrift(document.orbit, spanDays),
    mission: createMissionLink({ document, spanDays }, async () => (await import('./missionStart')).startMission),
    picture: signal<PictureId>('chart'),
    sweep: signal(firstSweep),
    openWorking: signal(null),
  };
}

/** The kept draft, else the candidate saved last, else a blank one. */
async function openedAtStart(store: Store, newId: () => string): Promise<OpenCandidate> {
  const draft = await store.draft.load();
  if (draft.ok && draft.value?.kind === 'readable') {
    const { candidate, baseRevision } = draft.value;
    const saved = await savedRevision(store, candidate.id, baseRevision);
    return { candidate, baseRevision, savedText: saved?.savedText ?? null };
  }
  const list = await store.book.list();
  const latest = list.ok ? list.value.find((entry) => entry.kind === 'readable') : undefined;
  return latest?.kind === 'readable' ? openedFrom(latest.candidate, latest.revision) : openedNew(newId());
}

/** What a draft came from: a blank one where it was never saved. */
async function savedRevision(store: Store, id: string, revision: number | null): Promise<OpenCandidate | null> {
  if (revision === null) return openedNew(id);
  const revisions = await store.book.revisionsOf(id);
  const found = revisions.ok ? revisions.value.find((entry) => entry.revision === revision) : undefined;
  return found?.kind === 'readable' ? openedFrom(found.candidate, revision) : null;
}

/** Every change of the document is handed to the draft keeper; the first value is what it came from. */
function keepDraft(store: Store, document: OrbitDocument): void {
  let known = document.draft.peek();
  effect(() => {
    const candidate = document.draft.value;
    const baseRevision = document.baseRevision.value;
    if (candidate === known) return;
    known = candidate;
    store.draft.note({ candidate, baseRevision });
  });
}

/** An undo that puts a draft back goes when something else has been typed: it would undo that too. */
function expireUndo(document: OrbitDocument, announcer: Announcer): void {
  let said = announcer.current.peek();
  let draftThen = document.draft.peek();
  effect(() => {
    const current = announcer.current.value;
    const draft = document.draft.value;
    if (current === said && current?.untilEdited && draft !== draftThen) announcer.dismiss();
    if (current === said) return;
    said = current;
    draftThen = draft;
  });
}

/** When the editor comes back from another tab, that tab may have typed: read its draft. */
function followHandOver(store: Store, document: OrbitDocument): void {
  let wasElsewhere = store.tabs.editorElsewhere.peek();
  effect(() => {
    const isElsewhere = store.tabs.editorElsewhere.value;
    if (wasElsewhere && !isElsewhere) void openDraftOfOtherTab(store, document);
    wasElsewhere = isElsewhere;
  });
}

async function openDraftOfOtherTab(store: Store, document: OrbitDocument): Promise<void> {
  const draft = await store.draft.load();
  if (!draft.ok || draft.value?.kind !== 'readable') return;
  const { candidate, baseRevision } = draft.value;
  const saved = await savedRevision(store, candidate.id, baseRevision);
  document.open({ candidate, baseRevision, savedText: saved?.savedText ?? null });
}
