import { EntryRow } from './entryRow';
import { countText } from './sentences';
import { useBook } from './useBook';

/** The entries that the search leaves, or what to do where there are none. */
export function EntryList() {
  const { view } = useBook();
  if (view.stored.value === null) return null;
  const [listed, shown] = [view.listed.value, view.shown.value];
  const isSearching = view.query.value.trim() !== '';
  return (
    <>
      <p class="book-found small soft" role="status">
        {isSearching && shown.length > 0 && `${countText(shown.length, 'match')} of ${listed.length}`}
      </p>
      {shown.length === 0 && isSearching && <NoMatch />}
      <ul class="book-entries">
        {shown.map((entry) => (
          <li key={entry.id}>
            <EntryRow entry={entry} />
          </li>
        ))}
      </ul>
      {view.stored.value.length === 0 && (
        <p class="book-empty soft">
          Nothing is saved yet. Enter an orbit in Size and save it there or here; it then stays in this book with every
          later revision.
        </p>
      )}
    </>
  );
}

function NoMatch() {
  const { view } = useBook();
  return (
    <div class="book-empty">
      <p>
        Nothing matches “{view.query.value.trim()}”. Every word is looked for in names, notes and fingerprints, whatever
        its case and accents.
      </p>
      <button
        type="button"
        onClick={() => {
          view.query.value = '';
          view.focusOn.value = view.selectedId.value;
        }}
      >
        Show all
      </button>
    </div>
  );
}
