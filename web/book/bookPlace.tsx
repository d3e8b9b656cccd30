/** The place Book: which orbits are kept here, and what was done to each. */
import { useSignalEffect } from '@preact/signals';
import { About } from './about';
import { DemoBook } from './demoBook';
import { Details } from './details';
import { EntryList } from './entryList';
import { Headline } from './headline';
import { ListTools } from './listTools';
import { RemovedList } from './removedList';
import { StorageCaution } from './storageCaution';
import { useBook } from './useBook';
import './book.css';
import './bookDetails.css';
import './bookList.css';

export function BookPlace() {
  const { app, view, actions, locked } = useBook();
  const { changes } = app.store.book;
  useSignalEffect(() => {
    if (changes.value >= 0) void view.readBook();
  });
  useSignalEffect(() => {
    const id = view.selectedId.value;
    if (changes.value >= 0 && id !== null) void view.readRevisions(id);
  });
  const inFront = view.detailsInFront.value;
  const selected = view.selected.value;
  return (
    <>
      <section class="picture book-list" data-front={!inFront} aria-label="Orbits in this book">
        <Headline />
        <StorageCaution />
        <ListTools />
        <EntryList />
        <RemovedList />
        <DemoBook />
      </section>
      <aside class="numbers book-side" data-front={inFront} aria-label="The chosen orbit">
        {selected && <Details key={selected.id} entry={selected} />}
        <About />
        <div class="actions book-actions">
          <button type="button" class="book-back" onClick={() => leaveDetails(view)}>
            Back to the list
          </button>
          <button type="button" class="book-new" disabled={locked} onClick={() => void actions.startNew()}>
            New orbit
          </button>
          {selected?.content.kind === 'readable' && (
            <button
              type="button"
              class="primary book-open"
              disabled={locked}
              onClick={() => void actions.open(selected)}
            >
              {selected.isOpen ? 'Go on with it' : 'Open'}
            </button>
          )}
        </div>
      </aside>
    </>
  );
}

function leaveDetails(view: ReturnType<typeof useBook>['view']): void {
  view.focusOn.value = view.selectedId.value;
  view.detailsInFront.value = false;
}
