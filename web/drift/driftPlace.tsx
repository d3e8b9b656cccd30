/** What does the orbit do over the mission? Rates now in a sentence, then drawn, then as tables. */
import { useSignal } from '@preact/signals';
import { driftHeadline, firstOrderSentence } from '../../core/index';
import { useApp } from '../state/appContext';
import { hashOf } from '../state/route';
import { CursorTable } from './cursorTable';
import './drift.css';
import { DriftNotes } from './driftNotes';
import { DriftPlots } from './driftPlots';
import { type DriftView, useDriftView } from './driftView';
import { SpanChoice } from './spanChoice';
import { SpanTable } from './spanTable';

export function DriftPlace() {
  const view = useDriftView();
  return view ? <Drawn view={view} /> : <Empty />;
}

function Drawn({ view }: { readonly view: DriftView }) {
  const { document } = useApp();
  const last = view.drift.days.length - 1;
  const sample = useSignal(last);
  const stale = document.stale.value ? ' is-stale' : '';
  return (
    <>
      <section class="picture drift-picture" aria-label="Drift of node, perigee and local time">
        {document.stale.value && (
          <p class="stale-says">
            Drawn for the last good entry: something in <a href={hashOf('size')}>Size</a> cannot be read yet.
          </p>
        )}
        <Answer view={view} stale={stale} />
        <DriftPlots view={view} sample={sample} stale={stale} />
      </section>
      <aside class="numbers drift-numbers" aria-label="Span and values">
        <SpanChoice />
        <CursorTable view={view} sample={sample} stale={stale} />
        <SpanTable view={view} stale={stale} />
        <DriftNotes view={view} />
      </aside>
    </>
  );
}

function Answer({ view, stale }: { readonly view: DriftView; readonly stale: string }) {
  const { rateUnit } = useApp().preferences.values.value;
  return (
    <div class={`drift-answer${stale}`}>
      <h1 class="headline">
        {driftHeadline(view.orbit, rateUnit).map(({ text, mark }, index) =>
          // The sentence is short and always the same shape: its spans have no other name than their place.
          mark ? (
            <span key={`${index}${mark}`} class={`mark-${mark}`}>
              {text}
            </span>
          ) : (
            text
          ),
        )}
      </h1>
      <p class="small soft">{firstOrderSentence(view.orbit, rateUnit)}</p>
    </div>
  );
}

function Empty() {
  return (
    <>
      <section class="picture drift-picture" aria-label="Drift of node, perigee and local time">
        <h1 class="headline">No orbit yet, so nothing drifts.</h1>
        <p class="drift-empty">
          Enter one in <a href={hashOf('size')}>Size</a>: perigee and apogee altitude and an inclination are enough, or
          paste a state vector or two-line elements. With an epoch, the drift is drawn over dates.
        </p>
      </section>
      <aside class="numbers drift-numbers" aria-label="Span and values">
        <SpanChoice />
      </aside>
    </>
  );
}
