/** The averaged method's answer and the stack of its plots: one time axis, one cursor. */
import type { Signal } from '@preact/signals';
import { apsisName, forcesText, type HeadlineSpan } from '../../../core/index';
import { Plot } from '../../parts/plot';
import '../../parts/plot.css';
import { useApp } from '../../state/appContext';
import type { Mission } from '../../state/mission';
import { leftOutSum, sizeText } from './effectWords';
import { judgedOf } from './lookWords';
import './mission.css';
import type { MissionPlot } from './missionPlots';
import { MissionStatusLine } from './missionStatusLine';
import type { MissionView } from './missionView';

export interface MissionViewProps {
  readonly mission: Mission;
  readonly view: MissionView;
  readonly sample: Signal<number>;
}

/** A result that is not of what stands in the fields now is drawn pale. */
export function useStaleClass(mission: Mission): string {
  const { document } = useApp();
  return mission.stale.value || document.stale.value ? ' is-stale' : '';
}

export function MissionPicture({ mission, view, sample }: MissionViewProps) {
  const stale = useStaleClass(mission);
  return (
    <>
      <MissionAnswer mission={mission} view={view} stale={stale} />
      <MissionStatusLine mission={mission} />
      <div class={`plots${stale}`}>
        {view.plots.map((plot) => (
          <MissionFigure key={plot.id} plot={plot} view={view} sample={sample} />
        ))}
      </div>
    </>
  );
}

function MissionAnswer({ mission, view, stale }: Omit<MissionViewProps, 'sample'> & { readonly stale: string }) {
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
