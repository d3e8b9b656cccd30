import { createContext } from 'preact';
import { useContext } from 'preact/hooks';
import type { AppState } from './appState';

const AppContext = createContext<AppState | null>(null);
export const AppProvider = AppContext.Provider;

/** The app's state, from the provider at the top of the page. */
export function useApp(): AppState {
  const app = useContext(AppContext);
  if (!app) throw new Error('useApp expects an AppProvider above it, got none');
  return app;
}
