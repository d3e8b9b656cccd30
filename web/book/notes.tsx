import { useId } from 'preact/hooks';
import { lengthCaps } from '../../core/index';
import type { ListedEntry } from './listing';
import { useBook } from './useBook';

/** The notes: written here for the open orbit, read here for the others. */
export function Notes({ entry }: { readonly entry: ListedEntry }) {
  const { app, locked } = useBook();
  const id = useId();
  if (entry.content.kind === 'unreadable') return null;
  if (entry.isOpen) {
    return (
      <section>
        <h3>
          <label for={id}>Notes</label>
        </h3>
        <textarea
          id={id}
          class="book-notes"
          rows={4}
          maxLength={lengthCaps.notes}
          readOnly={locked}
          value={app.document.draft.value.notes}
          onInput={(event) => app.document.setCandidate({ notes: event.currentTarget.value })}
        />
      </section>
    );
  }
  const { notes } = entry.content.candidate;
  return (
    <section>
      <h3>Notes</h3>
      <p class="book-notes-read">{notes || 'No notes.'}</p>
      <p class="small soft">Open this orbit to write its notes.</p>
    </section>
  );
}
