import { render } from 'preact';
import { version } from './version';

const host = document.getElementById('app');
if (!host) throw new Error('The page has no element with the id "app"');
render(
  <main>
    <h1>Driftbook</h1>
    <p>Version {version}</p>
  </main>,
  host,
);
