import { useApp } from '../state/appContext';

/** What to do where nothing outlasts the tab; why it is so stands above every place. */
export function StorageCaution() {
  const { store } = useApp();
  if (store.state.value !== 'memory') return null;
  return (
    <p class="book-caution">
      This book is gone when the tab closes. To keep it, open Driftbook in an ordinary window where sites may store
      data, or add it to the home screen; until then, write down what you need.
    </p>
  );
}
