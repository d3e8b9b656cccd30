import { useApp } from '../state/appContext';
import type { AppState } from '../state/appState';
import { type BookActions, bookActions } from './bookActions';
import { type BookView, bookViewOf } from './bookView';

export interface BookParts {
  readonly app: AppState;
  readonly view: BookView;
  readonly actions: BookActions;
  /** True while another tab, or a newer version, holds the book: look, but change nothing. */
  readonly locked: boolean;
}

/** One set of actions an app, so that they know of each other. */
const actionsOfApps = new WeakMap<AppState, BookActions>();

function actionsOf(app: AppState): BookActions {
  const actions = actionsOfApps.get(app) ?? bookActions(app);
  actionsOfApps.set(app, actions);
  return actions;
}

export function useBook(): BookParts {
  const app = useApp();
  const { store } = app;
  const locked = store.tabs.editorElsewhere.value || store.state.value === 'superseded';
  return { app, view: bookViewOf(app), actions: actionsOf(app), locked };
}
