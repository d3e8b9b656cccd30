/** What does the orbit do over the mission? The answer in a sentence, then drawn, then as tables. */
import { useSignal } from '@preact/signals';
import { useEffect } from 'preact/hooks';
import { driftHeadline, firstOrderSentence } from '../../core/index';
import { useApp } from '../state/appContext';
import type { Mission } from '../state/mission';
import { hashOf } from '../state/route';
import { CursorTable } from './cursorTable';
import './drift.css';
import { DriftNotes } from './driftNotes';
import { DriftPlots } from './driftPlots';
import { type DriftView, useDriftView } from './driftView';
import { ForcesPanel } from './mission/forcesPanel';
import { MissionPlace } from './mission/missionPlace';
import { MissionStatusLine } from './mission/missionStatusLine';
import { useMissionView } from './mission/missionView';
import { SpanChoice } from './spanChoice';
import { SpanTable } from './spanTable';

export function DriftPlace() {
  const mission = useMission();
  const missionView = useMissionView(mission);
  const view = useDriftView();
  if (mission && missionView) return <MissionPlace mission={mission} view={missionView} />;
  return view ? <Drawn view={view} mission={mission} /> : <Empty />;
}

/** Fetched with this place; null until it is there. */
function useMission(): Mission | null {
  const { mission: link } = useApp();
  const mission = link.mission.value;
  useEffect(() => {
    void link.open();
  }, [link]);
  useEffect(() => mission?.watch(), [mission]);
  return mission;
}

/** Rates of now held: for an orbit without an epoch, and until its history is there. */
function Drawn({ view, mission }: { readonly view: DriftView; readonly mission: Mission | null }) {
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
        {mission && <MissionStatusLine mission={mission} />}
        <DriftPlots view={view} sample={sample} stale={stale} />
      </section>
      <aside class="numbers drift-numbers" aria-label="Span and values">
        <SpanChoice />
        {mission && <ForcesPanel mission={mission} />}
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
