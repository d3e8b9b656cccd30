import type { BookRevision } from '../store/readStored';
import { changesBetween } from './changesBetween';
import type { ListedEntry } from './listing';
import { savedWhen } from './savedWhen';
import { useBook } from './useBook';

/** Shown of one revision before the rest is only counted. */
const shownChanges = 5;

/** Every saved revision, latest first, with what it changed against the one before. */
export function RevisionList({ entry }: { readonly entry: ListedEntry }) {
  const { view } = useBook();
  const revisions = view.revisions.value;
  if (revisions?.id !== entry.id) return null;
  return (
    <section>
      <h3>Revisions</h3>
      <ol class="book-revisions">
        {revisions.list.map((revision, index) => (
          <Revision
            key={revision.revision}
            entry={entry}
            revision={revision}
            before={revisions.list[index + 1] ?? null}
            isLatest={index === 0}
          />
        ))}
      </ol>
    </section>
  );
}

interface RevisionProps {
  readonly entry: ListedEntry;
  readonly revision: BookRevision;
  readonly before: BookRevision | null;
  readonly isLatest: boolean;
}

function Revision({ entry, revision, before, isLatest }: RevisionProps) {
  const { actions, locked } = useBook();
  const { revision: number, savedAtIso, note } = revision;
  const lines = revisionLines(revision, before);
  return (
    <li>
      <div class="book-revision-text">
        <p>
          <strong>rev {number}</strong> <span class="small soft">{savedWhen(savedAtIso, new Date())}</span>
        </p>
        {note && <p class="book-revision-note">{note}</p>}
        <ul class="small">
          {lines.map((line) => (
            <li key={line}>{line}</li>
          ))}
        </ul>
      </div>
      {!isLatest && revision.kind === 'readable' && (
        <button
          type="button"
          disabled={locked}
          aria-label={`Restore revision ${number}`}
          onClick={() => void actions.restore(entry, number)}
        >
          Restore
        </button>
      )}
    </li>
  );
}

function revisionLines(revision: BookRevision, before: BookRevision | null): readonly string[] {
  if (revision.kind === 'unreadable') return [`Cannot be read. ${revision.message}`];
  if (before === null) return revision.note ? [] : ['First revision'];
  if (before.kind === 'unreadable') return ['The one before cannot be read, so there is nothing to compare with.'];
  const changes = changesBetween(before.candidate, revision.candidate);
  if (changes.length === 0) return ['Nothing changed'];
  const rest = changes.length - shownChanges;
  return rest > 1 ? [...changes.slice(0, shownChanges), `and ${rest} more`] : changes;
}
