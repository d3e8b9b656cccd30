import { useSignalEffect } from '@preact/signals';
import { useRef } from 'preact/hooks';
import type { ListedEntry } from './listing';
import { orbitLine } from './orbitSummary';
import { savedWhen } from './savedWhen';
import { useBook } from './useBook';

/** One entry: a tap shows its details. */
export function EntryRow({ entry }: { readonly entry: ListedEntry }) {
  const { view, actions } = useBook();
  const button = useRef<HTMLButtonElement>(null);
  useSignalEffect(() => {
    // While the details are in front, the row cannot take the focus yet.
    if (view.focusOn.value !== entry.id || !button.current) return;
    button.current.focus();
    view.focusOn.value = null;
  });
  return (
    <button
      ref={button}
      type="button"
      class="book-row"
      aria-current={view.selectedId.value === entry.id ? 'true' : undefined}
      onClick={() => actions.choose(entry.id)}
    >
      <span class="book-row-main">
        <span class="book-row-name">{entry.name || 'No name'}</span>
        <RowOrbit entry={entry} />
      </span>
      <RowFacts entry={entry} />
    </button>
  );
}

function RowOrbit({ entry }: { readonly entry: ListedEntry }) {
  const { app } = useBook();
  const { content } = entry;
  if (content.kind === 'unreadable') return <span class="book-caution">Cannot be read. {content.message}</span>;
  return <span class="book-orbit">{orbitLine(content.summary, app.preferences.values.value.lengthUnit)}</span>;
}

function RowFacts({ entry }: { readonly entry: ListedEntry }) {
  const { saved, content, demo, isOpen } = entry;
  const letters = content.kind === 'readable' && content.summary.kind === 'orbit' ? content.summary.fingerprint : null;
  return (
    <span class="book-row-facts">
      <span class="book-marks">
        {isOpen && <span class="book-mark-open">open</span>}
        {demo && <span class="book-mark-demo">demo</span>}
        {letters && <span class="book-letters">{letters}</span>}
      </span>
      <span class="small soft">
        {saved ? `rev ${saved.revision} · ${savedWhen(saved.atIso, new Date())}` : 'not in the book yet'}
      </span>
    </span>
  );
}
