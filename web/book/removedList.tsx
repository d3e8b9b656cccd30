import { savedWhen } from './savedWhen';
import { useBook } from './useBook';

/** Removed entries, which stay for 30 days, so that a removal can be taken back after its message is gone. */
export function RemovedList() {
  const { view, actions, locked } = useBook();
  const removed = view.removed.value;
  if (removed.length === 0) return null;
  return (
    <details class="book-fold">
      <summary>Removed in the last 30 days ({removed.length})</summary>
      <ul class="book-lines">
        {removed.map(({ id, name, deletedAtIso }) => (
          <li key={id}>
            <span>
              {name || 'No name'}
              {deletedAtIso && <span class="small soft book-block">removed {savedWhen(deletedAtIso, new Date())}</span>}
            </span>
            <button type="button" disabled={locked} onClick={() => void actions.bringBack(id, name)}>
              Bring back
            </button>
          </li>
        ))}
      </ul>
    </details>
  );
}
