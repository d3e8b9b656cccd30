import { useEffect, useId, useRef, useState } from 'preact/hooks';
import { lengthCaps } from '../../core/index';
import type { ListedEntry } from './listing';
import { useBook } from './useBook';

/** A new name for an entry: Enter keeps it, Escape leaves the old one. */
export function NameEditor({ entry, onDone }: { readonly entry: ListedEntry; readonly onDone: () => void }) {
  const { actions, locked } = useBook();
  const [problem, setProblem] = useState<string | null>(null);
  const field = useRef<HTMLInputElement>(null);
  const id = useId();
  useEffect(() => field.current?.select(), []);
  const keep = async () => {
    const wrong = await actions.rename(entry, field.current?.value ?? '');
    if (wrong === null) return onDone();
    setProblem(wrong);
    field.current?.focus();
  };
  return (
    <form
      class="book-naming"
      onSubmit={(event) => {
        event.preventDefault();
        void keep();
      }}
      onKeyDown={(event) => {
        if (event.key === 'Escape') onDone();
      }}
    >
      <label for={id}>New name</label>
      <input
        id={id}
        ref={field}
        defaultValue={entry.name}
        maxLength={lengthCaps.name}
        enterkeyhint="done"
        aria-invalid={problem !== null}
        aria-describedby={`${id}-problem`}
      />
      <p id={`${id}-problem`} class="book-caution small" role="alert">
        {problem}
      </p>
      <div class="book-tools-row">
        <button type="submit" class="primary" disabled={locked}>
          Keep this name
        </button>
        <button type="button" onClick={onDone}>
          Cancel
        </button>
      </div>
    </form>
  );
}
