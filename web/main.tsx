import { render } from 'preact';
import { App } from './app';
import { createOffline } from './offline/offline';
import { followLighting } from './parts/lighting';
import { AppProvider } from './state/appContext';
import { createAppState } from './state/appState';
import { openStore } from './store/store';
import './style/tokens.css';
import './style/base.css';
import './style/shell.css';
import './style/narrow.css';
import './parts/fields.css';
import './parts/fold.css';

const host = document.getElementById('app');
if (!host) throw new Error('The page has no element with the id "app"');

const newId = () => crypto.randomUUID();
const store = await openStore({ clock: () => new Date(), newId });
const offline = createOffline({ canReload: async () => (await store.draft.flush()) !== 'failed' });
const app = await createAppState({ store, offline, page: window, newId });
followLighting(app.preferences, document);
render(
  <AppProvider value={app}>
    <App />
  </AppProvider>,
  host,
);
