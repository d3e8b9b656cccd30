/** The stack of plots: one time axis, one cursor in step. */
import type { Signal } from '@preact/signals';
import { Plot } from '../parts/plot';
import '../parts/plot.css';
import type { DriftView } from './driftView';
import type { DriftPlot } from './plotModels';

export interface DriftPlotsProps {
  readonly view: DriftView;
  readonly sample: Signal<number>;
  readonly stale: string;
}

export function DriftPlots({ view, sample, stale }: DriftPlotsProps) {
  return (
    <div class={`plots${stale}`}>
      {view.plots.map((plot) => (
        <DriftFigure key={plot.id} plot={plot} view={view} sample={sample} />
      ))}
    </div>
  );
}

function DriftFigure({ plot, view, sample }: { plot: DriftPlot; view: DriftView; sample: Signal<number> }) {
  return (
    <figure class={`drift-figure of-${plot.id}`}>
      <figcaption>
        <h2 class={plot.hue === 'ink' ? '' : `mark-${plot.hue}`}>{plot.title}</h2>
        <p class="soft">{plot.caption}</p>
      </figcaption>
      <Plot
        name={plot.title}
        model={plot.model}
        sample={sample.value}
        momentText={view.moment(sample.value)}
        valueText={plot.valueText(sample.value)}
        onSample={(next) => {
          sample.value = next;
        }}
      />
    </figure>
  );
}
