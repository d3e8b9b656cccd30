/** What does the orbit do over the mission? The answer in a sentence, then drawn, then as tables. */
import { type Signal, signal } from '@preact/signals';
import { useEffect, useMemo } from 'preact/hooks';
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
import { MissionNumbers } from './mission/missionNumbers';
import { MissionPicture } from './mission/missionPicture';
import { MissionStatusLine } from './mission/missionStatusLine';
import { useMissionView } from './mission/missionView';
import { SecondLookAction } from './mission/secondLookAction';
import { SpanChoice } from './spanChoice';
import { SpanTable } from './spanTable';

export function DriftPlace() {
  const { document } = useApp();
  const mission = useMission();
  const missionView = useMissionView(mission);
  const view = useDriftView();
  const sample = useCursor((missionView ? missionView.last : view && view.drift.days.length - 1) ?? 0);
  const isStale = document.stale.value;
  const parts = { mission, view, sample, stale: isStale ? ' is-stale' : '' };
  // What is typed in stays the same element whichever method answers.
  return (
    <>
      <section class="picture drift-picture" aria-label="The orbit over the mission">
        {isStale && view && (
          <p class="stale-says">
            Drawn for the last good entry: something in <a href={hashOf('size')}>Size</a> cannot be read yet.
          </p>
        )}
        {mission && missionView ? (
          <MissionPicture mission={mission} view={missionView} sample={sample} />
        ) : (
          <ClosedFormPicture {...parts} />
        )}
      </section>
      <aside class="numbers drift-numbers" aria-label="Span and values">
        <SpanChoice />
        {mission && view && <ForcesPanel mission={mission} />}
        {mission && missionView ? (
          <MissionNumbers mission={mission} view={missionView} sample={sample} />
        ) : (
          <ClosedFormNumbers {...parts} />
        )}
        {mission && view && <SecondLookAction mission={mission} />}
      </aside>
    </>
  );
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

/** The sample that all plots and tables speak of; at the end wherever samples are counted anew. */
function useCursor(last: number): Signal<number> {
  return useMemo(() => signal(last), [last]);
}

interface ClosedFormProps {
  readonly mission: Mission | null;
  readonly view: DriftView | null;
  readonly sample: Signal<number>;
  readonly stale: string;
}

/** Rates of now held: for an orbit without an epoch, and until its history is there. */
function ClosedFormPicture({ mission, view, sample, stale }: ClosedFormProps) {
  if (!view) return <Empty />;
  return (
    <>
      <Answer view={view} stale={stale} />
      {mission && <MissionStatusLine mission={mission} />}
      <DriftPlots view={view} sample={sample} stale={stale} />
    </>
  );
}

function ClosedFormNumbers({ view, sample, stale }: ClosedFormProps) {
  if (!view) return null;
  return (
    <>
      <CursorTable view={view} sample={sample} stale={stale} />
      <SpanTable view={view} stale={stale} />
      <DriftNotes view={view} />
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
      <h1 class="headline">No orbit yet, so nothing drifts.</h1>
      <p class="drift-empty">
        Enter one in <a href={hashOf('size')}>Size</a>: perigee and apogee altitude and an inclination are enough, or
        paste a state vector or two-line elements. With an epoch, the drift is drawn over dates.
      </p>
    </>
  );
}
