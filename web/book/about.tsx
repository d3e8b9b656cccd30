/** What this is, which version, what is kept where, and what it must not be used for. */
import { useEffect, useState } from 'preact/hooks';
import { candidateSchema } from '../../core/index';
import type { OfflineStatus } from '../offline/offline';
import { useApp } from '../state/appContext';
import type { StorageEstimateBytes } from '../store/persistence';
import { version } from '../version';
import { estimateText, persistenceTexts } from './sentences';

const offlineTexts: Readonly<Record<OfflineStatus, string>> = {
  ready: 'Ready: every file is on this device, checked.',
  installing: 'Files are being put on this device; wait for “ready offline” before you leave the network.',
  failed: 'Not ready: some files could not be kept. Load the page again while you have a network.',
  unsupported: 'This browser cannot keep the app. Open it over HTTPS, not in a private window.',
};

export function About() {
  return (
    <details class="book-fold book-about">
      <summary>About Driftbook</summary>
      <AboutText />
    </details>
  );
}

function AboutText() {
  const { store, offline } = useApp();
  return (
    <>
      <p>
        A tool for sizing orbits, not for flight decisions. For those, the flight-dynamics team, the licensing authority
        and your local rules have the last word.
      </p>
      <dl class="book-facts">
        <Fact label="Version">{version}</Fact>
        <Fact label="Constants">EGM2008, unless an orbit names another set</Fact>
        <Fact label="Schema">{`version ${candidateSchema} of the saved record`}</Fact>
        <Fact label="Offline">
          {offlineTexts[offline.status.value]}
          {offline.updateWaiting.value && ' A new version waits.'}
        </Fact>
        <Fact label="Storage">
          {store.state.value === 'memory'
            ? 'Nothing is kept on this device; the book lives in this tab only.'
            : persistenceTexts[store.persistence.answer.value]}{' '}
          <Estimate />
        </Fact>
      </dl>
      <p>
        <a class="book-link" href="./notices.txt">
          Third-party notices
        </a>
      </p>
    </>
  );
}

function Fact({ label, children }: { readonly label: string; readonly children: preact.ComponentChildren }) {
  return (
    <div>
      <dt>{label}</dt>
      <dd>{children}</dd>
    </div>
  );
}

function Estimate() {
  const { store } = useApp();
  const [estimate, setEstimate] = useState<StorageEstimateBytes | null>(null);
  useEffect(() => {
    void store.persistence.estimate().then(setEstimate);
  }, [store]);
  return estimate ? estimateText(estimate) : null;
}
