/** The mission in numbers: dial, events, ledger, tables, second look. */
import { useApp } from '../../state/appContext';
import { EventsList } from './eventsList';
import { Ledger } from './ledger';
import { LocalTimeDial } from './localTimeDial';
import { type MissionViewProps, useStaleClass } from './missionPicture';
import { MissionCursorTable, MissionSpanTable } from './missionTables';
import type { MissionView } from './missionView';
import { SecondLookView } from './secondLook';

export function MissionNumbers({ mission, view, sample }: MissionViewProps) {
  const stale = useStaleClass(mission);
  return (
    <>
      <div class={`mission-day${stale}`}>
        <LocalTimeDial view={view} sample={sample} />
        <EventsList view={view} sample={sample} />
      </div>
      <div class={`mission-parts${stale}`}>
        <Ledger result={view.result} settings={mission.settings.value} />
        <MissionCursorTable view={view} sample={sample} />
        <MissionSpanTable view={view} />
      </div>
      <SecondLookView mission={mission} />
      <MissionNotes view={view} />
    </>
  );
}

function MissionNotes({ view }: { readonly view: MissionView }) {
  const { document } = useApp();
  const { history, sky } = view.result;
  const notices = document.notices.value.filter(({ field }) => field === undefined);
  const light = sky?.light;
  return (
    <section class="drift-notes" aria-label="Notes">
      {history.cautions.map(({ message }) => (
        <p key={message} class="is-caution">
          {message}
        </p>
      ))}
      {notices.map(({ id, severity, text }) => (
        <p key={id} class={severity === 'caution' ? 'is-caution' : ''}>
          {text}
        </p>
      ))}
      <h2>How the lines are made</h2>
      <p>
        Heavy: mean elements by the averaged method. Long dashes: second order held; dots: first order held. Rings: the
        second look, integrated. Flags on the upper edge: events. Local time is of the mean Sun.
      </p>
      {light && <p>{light.ok ? light.source : light.message}</p>}
    </section>
  );
}
