/** The chosen entry: its facts, what can be done with it, its notes and revisions. */
import { useEffect, useRef } from 'preact/hooks';
import { changesBetween } from './changesBetween';
import { EntryTools } from './entryTools';
import { Facts } from './facts';
import type { ListedEntry } from './listing';
import { Notes } from './notes';
import { RevisionList } from './revisionList';
import { countText } from './sentences';
import { useBook } from './useBook';

export function Details({ entry }: { readonly entry: ListedEntry }) {
  const { view } = useBook();
  const heading = useRef<HTMLHeadingElement>(null);
  const inFront = view.detailsInFront.value;
  useEffect(() => {
    // Where list and details share the screen, the focus stays in the list.
    const listIsHidden = document.querySelector('.book-entries')?.getClientRects().length === 0;
    if (inFront && listIsHidden) heading.current?.focus();
  }, [inFront]);
  return (
    <div class="book-details">
      <h2 class="book-name" ref={heading} tabIndex={-1}>
        {entry.name || 'No name'}
      </h2>
      {entry.content.kind === 'unreadable' ? (
        <p class="book-caution">
          This entry cannot be read, so it cannot be opened: {entry.content.message} It stays here untouched until you
          remove it; an earlier revision below may still read.
        </p>
      ) : (
        <Facts entry={entry} content={entry.content} />
      )}
      <EntryTools entry={entry} />
      <Unsaved entry={entry} />
      <Notes entry={entry} />
      {entry.saved && <RevisionList entry={entry} />}
    </div>
  );
}

/** What the editor holds that the book does not have yet. */
function Unsaved({ entry }: { readonly entry: ListedEntry }) {
  const { app, locked } = useBook();
  if (!entry.isOpen || !app.document.changed.value || entry.content.kind === 'unreadable') return null;
  const changes = entry.saved ? changesBetween(entry.content.candidate, app.document.draft.value) : [];
  const title = entry.saved ? `${countText(changes.length, 'unsaved change')} in the editor` : 'Not in the book yet';
  return (
    <section class="book-unsaved">
      <h3>{title}</h3>
      <ul>
        {changes.map((change) => (
          <li key={change}>{change}</li>
        ))}
      </ul>
      <button type="button" disabled={locked} onClick={() => void app.saving.save()}>
        {entry.saved ? `Save as revision ${entry.saved.revision + 1}` : 'Save to the book'}
      </button>
    </section>
  );
}
