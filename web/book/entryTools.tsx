import { useEffect, useRef, useState } from 'preact/hooks';
import type { ListedEntry } from './listing';
import { NameEditor } from './nameEditor';
import { useBook } from './useBook';

/** Rename, duplicate, remove. */
export function EntryTools({ entry }: { readonly entry: ListedEntry }) {
  const { actions, locked } = useBook();
  const [isNaming, setNaming] = useState(false);
  const renameButton = useRef<HTMLButtonElement>(null);
  const wasNaming = useRef(false);
  useEffect(() => {
    if (wasNaming.current && !isNaming) renameButton.current?.focus();
    wasNaming.current = isNaming;
  }, [isNaming]);
  if (isNaming) return <NameEditor entry={entry} onDone={() => setNaming(false)} />;
  const isReadable = entry.content.kind === 'readable';
  return (
    <div class="book-tools-row">
      {isReadable && (
        <button type="button" ref={renameButton} disabled={locked} onClick={() => setNaming(true)}>
          Rename
        </button>
      )}
      {isReadable && entry.saved && (
        <button type="button" disabled={locked} onClick={() => void actions.duplicate(entry)}>
          Duplicate
        </button>
      )}
      {entry.saved && (
        <button type="button" disabled={locked} onClick={() => void actions.remove(entry)}>
          Remove
        </button>
      )}
    </div>
  );
}
