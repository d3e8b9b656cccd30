import { useApp } from '../state/appContext';

/** What to do where nothing outlasts the tab; why it is so stands above every place. */
export function StorageCaution() {
  const { store } = useApp();
  if (store.state.value !== 'memory') return null;
  return (
    <p class="book-caution book-storage">
      To keep this book, open Driftbook in an ordinary window where sites may store data. Until then, write down what
      you need before the tab closes.
    </p>
  );
}
