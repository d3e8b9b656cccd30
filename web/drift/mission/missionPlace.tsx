/** The place where a history is there: the averaged method's answer, plots, dial, events, ledger and second look. */
import { type Signal, useSignal } from '@preact/signals';
import { useEffect } from 'preact/hooks';
import { apsisName, forcesText, type HeadlineSpan } from '../../../core/index';
import { Plot } from '../../parts/plot';
import '../../parts/plot.css';
import { useApp } from '../../state/appContext';
import type { Mission } from '../../state/mission';
import { hashOf } from '../../state/route';
import { SpanChoice } from '../spanChoice';
import { leftOutSum, sizeText } from './effectWords';
import { EventsList } from './eventsList';
import { ForcesPanel } from './forcesPanel';
import { Ledger } from './ledger';
import { LocalTimeDial } from './localTimeDial';
import { judgedOf } from './lookWords';
import './mission.css';
import type { MissionPlot } from './missionPlots';
import { MissionStatusLine } from './missionStatusLine';
import { MissionCursorTable, MissionSpanTable } from './missionTables';
import type { MissionView } from './missionView';
import { SecondLookAction, SecondLookView } from './secondLook';

interface PlaceProps {
  readonly mission: Mission;
  readonly view: MissionView;
}

export function MissionPlace({ mission, view }: PlaceProps) {
  const { document } = useApp();
  const sample = useSignal(view.last);
  useEffect(() => {
    if (sample.peek() > view.last) sample.value = view.last;
  }, [sample, view.last]);
  const stale = mission.stale.value || document.stale.value ? ' is-stale' : '';
  return (
    <>
      <section class="picture drift-picture" aria-label="The orbit over the mission">
        {document.stale.value && (
          <p class="stale-says">
            Drawn for the last good entry: something in <a href={hashOf('size')}>Size</a> cannot be read yet.
          </p>
        )}
        <MissionAnswer mission={mission} view={view} stale={stale} />
        <MissionStatusLine mission={mission} />
        <div class={`plots${stale}`}>
          {view.plots.map((plot) => (
            <MissionFigure key={plot.id} plot={plot} view={view} sample={sample} />
          ))}
        </div>
      </section>
      <aside class="numbers drift-numbers mission-numbers" aria-label="Span, events, effects and values">
        <SpanChoice />
        <ForcesPanel mission={mission} />
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
        <SecondLookAction mission={mission} />
      </aside>
    </>
  );
}

function MissionAnswer({ mission, view, stale }: PlaceProps & { readonly stale: string }) {
  const { history, ledger, request } = view.result;
  const left = ledger && leftOutSum(ledger.bounds);
  const clock = left && history.localTimeH ? `, local time by ${sizeText(left.localTimeMin)} min` : '';
  const spread = left ? ` What is left out moves the node by ${sizeText(left.nodeDeg)}°${clock} at most.` : '';
  const { taken, stale: lookIsStale } = mission.secondLook;
  const judged = taken.value && !lookIsStale.value ? judgedOf(taken.value, apsisName(request.body)) : null;
  return (
    <div class={`drift-answer${stale}`}>
      <h1 class="headline">
        {view.headline.map((span, index) => (
          // The sentence is short: its spans have no other name than their place.
          <span key={`${index}${span.mark}`} class={spanClass(span)}>
            {span.text}
          </span>
        ))}
      </h1>
      <p class="small soft">
        By the averaged method: {forcesText(request.forces, history.leftOut)}.{spread}
      </p>
      <div role="status">{judged && <p class="small">Second look: {judged.sentence}</p>}</div>
    </div>
  );
}

/** A date or a number does not break across lines; a sentence may. */
const shortText = 16;

const spanClass = ({ text, mark, strong }: HeadlineSpan): string =>
  [mark ? `mark-${mark}` : '', strong ? 'strong' : '', text.length <= shortText ? 'whole' : '']
    .filter((name) => name !== '')
    .join(' ');

interface FigureProps {
  readonly plot: MissionPlot;
  readonly view: MissionView;
  readonly sample: Signal<number>;
}

function MissionFigure({ plot, view, sample }: FigureProps) {
  const at = Math.min(sample.value, view.last);
  return (
    <figure class={`drift-figure mission-figure of-${plot.id}`}>
      <figcaption>
        <h2 class={plot.hue === 'ink' ? '' : `mark-${plot.hue}`}>{plot.title}</h2>
        <p class="soft small">{plot.caption}</p>
      </figcaption>
      <Plot
        name={plot.title}
        model={plot.model}
        sample={at}
        momentText={view.moment(at)}
        valueText={plot.valueText(at)}
        onSample={(next) => {
          sample.value = next;
        }}
      />
    </figure>
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
