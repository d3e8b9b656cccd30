/** Name, fingerprint and revision of the open orbit; what is kept; the lighting. */
import { useApp } from '../state/appContext';
import type { Settings } from '../store/settings';
import { useRested } from './useRested';

const lightings = ['room', 'sunlight', 'night'] as const;
const lightingNames = { room: 'Room', sunlight: 'Sunlight', night: 'Night' } as const;

export function Head() {
  const { document, store } = useApp();
  const { name } = document.draft.value;
  const letters = document.fingerprint.value;
  const revision = document.baseRevision.value;
  const changed = document.changed.value;
  return (
    <div class="head">
      <input
        class="head-name"
        aria-label="Name of this orbit"
        maxLength={200}
        value={name}
        title={name}
        readOnly={store.tabs.editorElsewhere.value}
        onInput={(event) => document.setCandidate({ name: event.currentTarget.value })}
      />
      {letters && (
        <span
          class={`chip fingerprint${document.stale.value ? ' is-stale' : ''}`}
          role="img"
          aria-label={`Fingerprint ${[...letters].join(' ')}`}
        >
          {letters}
        </span>
      )}
      <span class="chip soft">{revision === null ? 'not saved' : `rev ${revision}${changed ? ' +' : ''}`}</span>
      <HeadStatus />
      <LightingButton />
    </div>
  );
}

const clock = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });

function HeadStatus() {
  const { saving, store, offline, document } = useApp();
  // Every keystroke is pending for a moment: what stands still is said.
  const draftStatus = useRested(store.draft.status);
  const offlineTexts = {
    ready: 'ready offline',
    installing: 'getting ready for offline',
    failed: 'not ready offline',
    unsupported: 'no offline here',
  } as const;
  return (
    <p class="head-status" role="status">
      {keptText(saving.status.value, draftStatus, document.changed.value)}
      {' · '}
      {offlineTexts[offline.status.value]}
    </p>
  );
}

type SaveStatus = ReturnType<typeof useApp>['saving']['status']['value'];
type DraftStatus = ReturnType<typeof useApp>['store']['draft']['status']['value'];

function keptText(save: SaveStatus, draft: DraftStatus, changed: boolean): string {
  if (save.kind === 'saving') return 'Saving';
  if (save.kind === 'failed') return 'Not saved';
  if (changed) {
    if (draft === 'failed') return 'Draft not kept';
    return draft === 'pending' ? 'Keeping draft' : 'Draft kept';
  }
  return save.kind === 'saved' ? `Saved ${clock.format(new Date(save.atIso))}` : 'No changes';
}

function LightingButton() {
  const { preferences } = useApp();
  const current = preferences.values.value.lighting;
  const next: NonNullable<Settings['lighting']> =
    lightings[(lightings.indexOf(current) + 1) % lightings.length] ?? 'room';
  return (
    <button
      type="button"
      class="lighting"
      aria-label={`Lighting: ${lightingNames[current]}. Switch to ${lightingNames[next]}`}
      onClick={() => void preferences.set('lighting', next)}
    >
      {lightingNames[current]}
    </button>
  );
}
