import { useState } from 'preact/hooks';
import { useBook } from './useBook';

/** What the demo book is, and the way to be rid of it. */
export function DemoBook() {
  const { view, actions, locked } = useBook();
  const [isAsking, setAsking] = useState(false);
  const count = (view.stored.value ?? []).filter(({ demo }) => demo).length;
  if (count === 0) return null;
  const remove = async () => {
    setAsking(false);
    await actions.removeDemoBook();
  };
  return (
    <div class="book-demo">
      <p class="small soft">
        Entries marked “demo” belong to Skerry, an invented mission to try things on. Those you have saved over are
        yours.
      </p>
      {!isAsking && (
        <button type="button" disabled={locked} onClick={() => setAsking(true)}>
          Remove the demo book
        </button>
      )}
      {isAsking && (
        <fieldset class="book-ask">
          <legend>
            This takes out {count === 1 ? 'the one demo entry' : `the ${count} demo entries`} for good; there is no
            undo. What you have changed and saved stays.
          </legend>
          <button type="button" disabled={locked} onClick={() => void remove()}>
            Remove for good
          </button>
          <FocusedButton onClick={() => setAsking(false)}>Keep it</FocusedButton>
        </fieldset>
      )}
    </div>
  );
}

/** The safe answer has the focus, so that a second press of the same key destroys nothing. */
function FocusedButton({ onClick, children }: { readonly onClick: () => void; readonly children: string }) {
  return (
    <button type="button" ref={(button) => button?.focus()} onClick={onClick}>
      {children}
    </button>
  );
}
