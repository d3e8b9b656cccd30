/** Which orbit? The answer, its picture, the entry and the readings. */
import { headlineOf, type Reading, type ReadingId } from '../../core/index';
import { later } from '../parts/later';
import { useReadingText } from '../parts/readingText';
import { useScrollFocus } from '../parts/useScrollFocus';
import { useApp } from '../state/appContext';
import type { AppState } from '../state/appState';
import { EntryPanel } from './entryPanel';
import { Pictures } from './pictures';
import { ReadingsList } from './readingsList';
import './entry.css';
import './readings.css';
import './size.css';

const WorkingView = later(async () => (await import('./workingView')).WorkingView);

export function SizePlace() {
  const { document, openWorking } = useApp();
  const orbit = document.orbit.value;
  const reading = document.readings.value.find(({ id }) => id === openWorking.value);
  return (
    <>
      <section class="picture" aria-label="The orbit" ref={useScrollFocus<HTMLElement>('y')}>
        <div class="answer">
          {orbit && document.stale.value && (
            <p class="answer-stale">Of the last good entry: what is typed now comes to no orbit.</p>
          )}
          <Headline />
          <BrokenLimits />
          <KeyReadings />
        </div>
        {orbit && reading ? <WorkingView orbit={orbit} reading={reading} /> : <Pictures />}
      </section>
      <aside class="numbers" aria-label="Entry and readings">
        <EntryPanel />
        <ReadingsList />
        <Actions />
      </aside>
    </>
  );
}

function Headline() {
  const { document, preferences, mission } = useApp();
  const orbit = document.orbit.value;
  if (!orbit) return <h1 class="headline">{noOrbitText(document)}</h1>;
  const { rateUnit } = preferences.values.value;
  const spans = headlineOf(orbit, document.readings.value, {
    rateUnit: rateUnit === 'degPerYear' ? 'deg/yr' : 'deg/day',
    localTime: mission.mission.value?.claim.value ?? null,
  });
  return (
    <h1 class={`headline${document.stale.value ? ' is-stale' : ''}`}>
      {spans.map((span, index) => (
        <span key={`${index}${span.mark}`} class={spanClass(span)}>
          {span.text.replace('deg/', '°/')}
        </span>
      ))}
    </h1>
  );
}

/** Opened without a last good orbit: what keeps there from being one. */
function noOrbitText({ entered, draft, conditions }: AppState['document']): string {
  const settlement = conditions.settlement.value;
  if (!entered.value.ok || draft.value.conditions.length === 0) {
    return 'Type or paste an orbit to read how its node and perigee drift.';
  }
  if (!settlement) return 'The conditions are being settled.';
  return (!settlement.ok && settlement.message) || 'One of the conditions cannot be read yet.';
}

/** Only what is wrong: limits that are kept stand at their readings. */
function BrokenLimits() {
  const { document } = useApp();
  const { reader, read, margins } = document.limits;
  const judged = { read: read.value, margins: margins.value };
  const text = reader.value?.limitsSentence(judged, document.readings.value);
  return <div role="status">{text && <p class="limits-broken">{text}</p>}</div>;
}

type Span = ReturnType<typeof headlineOf>[number];

const spanClass = ({ mark, strong }: Span): string =>
  [mark ? `mark-${mark}` : '', strong ? 'strong' : ''].filter(Boolean).join(' ');

const keyIds: ReadonlySet<ReadingId> = new Set(['nodeRate', 'perigeeRate', 'localTimeDrift', 'nodalPeriod']);

/** The readings that stay in view while the on-screen keyboard is open. */
function KeyReadings() {
  const { document } = useApp();
  return (
    <dl class={`key-readings${document.stale.value ? ' is-stale' : ''}`}>
      {document.readings.value
        .filter(({ id }) => keyIds.has(id))
        .map((reading) => (
          <KeyReading key={reading.id} reading={reading} />
        ))}
    </dl>
  );
}

function KeyReading({ reading }: { readonly reading: Reading }) {
  const text = useReadingText(reading);
  return (
    <div>
      <dt>{reading.label}</dt>
      <dd>
        {text.value} <span class="unit">{text.unit}</span>
      </dd>
    </div>
  );
}

function Actions() {
  const { document, saving, store } = useApp();
  const changed = document.changed.value || document.baseRevision.value === null;
  const blocked = store.tabs.editorElsewhere.value;
  return (
    <div class="actions">
      <button
        type="button"
        disabled={!document.changed.value || document.baseRevision.value === null || blocked}
        onClick={() => void saving.discardChanges()}
      >
        Discard changes
      </button>
      <button
        type="button"
        class="primary"
        disabled={!changed || blocked || saving.status.value.kind === 'saving'}
        onClick={() => void saving.save()}
      >
        {changed ? 'Save' : 'Saved'}
      </button>
    </div>
  );
}
