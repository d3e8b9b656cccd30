/**
 * One plot, alone or of a stack: a canvas for lines and axes, and above it the cursor, the bounds, the marks and
 * labels at line ends. It is a slider for keyboard and screen reader: its value is the place of the cursor.
 */
import { useRef } from 'preact/hooks';
import { sampleAfterKey } from './plotCursor';
import { spreadLabels } from './plotLabels';
import { Band, Events, isDrawn, Points, percent } from './plotMarks';
import type { PlotLine, PlotModel } from './plotModel';
import { heightIn } from './plotScale';
import { useCursorDrag } from './useCursorDrag';
import { useHeights } from './useHeights';
import { usePlotCanvas } from './usePlotCanvas';

export interface PlotProps {
  readonly name: string;
  readonly model: PlotModel;
  /** Index of the sample that the cursor stands on. */
  readonly sample: number;
  /** Where the cursor stands, such as a moment, and the values there, in words. */
  readonly momentText: string;
  readonly valueText: string;
  readonly onSample: (sample: number) => void;
}

export function Plot({ name, model, sample, momentText, valueText, onSample }: PlotProps) {
  const host = useRef<HTMLDivElement>(null);
  const area = useRef<HTMLDivElement>(null);
  const failed = usePlotCanvas({ host, area }, model);
  const last = model.x.length - 1;
  const drag = useCursorDrag(last, onSample);
  const onKeyDown = (event: KeyboardEvent) => {
    const next = event.altKey || event.ctrlKey || event.metaKey ? null : sampleAfterKey(event.key, sample, last);
    if (next === null) return;
    event.preventDefault();
    onSample(next);
  };
  if (failed) return <p class="plot-failed">Not drawn, since this browser cannot: the tables hold the same values.</p>;
  return (
    <div class={`plot${model.hasXLabels ? ' has-x' : ''}`}>
      <div class="plot-canvas" ref={host} aria-hidden="true" />
      <div
        class="plot-area"
        ref={area}
        role="slider"
        tabIndex={0}
        aria-label={`${name}: cursor`}
        aria-valuemin={0}
        aria-valuemax={last}
        aria-valuenow={sample}
        aria-valuetext={`${momentText}: ${valueText}`}
        onKeyDown={onKeyDown}
        {...drag}
      >
        <Band model={model} />
        <Levels model={model} />
        <Zero model={model} />
        <OwnPoint model={model} />
        <Points model={model} />
        <Events model={model} />
        <Cursor model={model} sample={sample} momentText={momentText} />
        <LineEnds model={model} />
      </div>
    </div>
  );
}

const valueAt = (line: PlotLine, sample: number): number => line.values[sample] ?? 0;

function Cursor({ model, sample, momentText }: Pick<PlotProps, 'model' | 'sample' | 'momentText'>) {
  const left = percent(sample / (model.x.length - 1));
  return (
    <div class="plot-cursor" style={{ left }}>
      {model.lines
        .filter((line) => isDrawn(model, valueAt(line, sample)))
        .map((line) => (
          <i
            key={line.id}
            class={`plot-dot mark-${line.hue} is-${line.pattern}`}
            style={{ bottom: percent(heightIn(model.range, valueAt(line, sample))) }}
          />
        ))}
      {model.hasXLabels && <span class="plot-moment">{momentText}</span>}
    </div>
  );
}

function Zero({ model }: { readonly model: PlotModel }) {
  if (!isDrawn(model, 0)) return null;
  return <div class="plot-zero" style={{ bottom: percent(heightIn(model.range, 0)) }} />;
}

/** Bounds, each with the side beyond it hatched. */
function Levels({ model }: { readonly model: PlotModel }) {
  return model.levels?.map(({ id, at, beyond }) => {
    const height = Math.max(0, Math.min(1, heightIn(model.range, at)));
    const box = beyond === 'above' ? { top: 0, bottom: percent(height) } : { bottom: 0, top: percent(1 - height) };
    return <div key={id} class={`plot-beyond is-${beyond}${isDrawn(model, at) ? ' has-edge' : ''}`} style={box} />;
  });
}

function OwnPoint({ model }: { readonly model: PlotModel }) {
  const [first, last] = [model.x[0] ?? 0, model.x[model.x.length - 1] ?? 1];
  const { point } = model;
  if (!point || !(point.x >= first && point.x <= last) || !isDrawn(model, point.value)) return null;
  const left = percent((point.x - first) / (last - first));
  return <i class="plot-own" style={{ left, bottom: percent(heightIn(model.range, point.value)) }} />;
}

/** Marks where the lines end, and beside them what each line is; the same for the bounds across the plot. */
function LineEnds({ model }: { readonly model: PlotModel }) {
  const ends = useRef<HTMLDivElement>(null);
  const { heightPx, linePx } = useHeights(ends);
  const levels = (model.levels ?? []).filter(({ at }) => isDrawn(model, at));
  const parts = [...model.lines.map(lastValue), ...levels.map(({ at }) => at)].map((at) =>
    Math.max(0, Math.min(1, heightIn(model.range, at))),
  );
  const wantedPx = parts.map((part) => (1 - part) * heightPx);
  const placedPx = spreadLabels(wantedPx, linePx, heightPx);
  return (
    <div class="plot-ends" ref={ends} aria-hidden="true">
      {model.lines.map((line, index) => (
        <span key={line.id} class={`mark-${line.hue}`}>
          <i class={`plot-mark is-${line.mark} is-${line.pattern}`} style={{ bottom: percent(parts[index] ?? 0) }} />
          <span class="plot-label" style={{ top: `${placedPx[index] ?? 0}px` }}>
            {line.label[0]}
            <span class="plot-label-rest">{line.label[1]}</span>
          </span>
        </span>
      ))}
      {levels.map(({ id, label }, index) => (
        <span key={id} class="plot-label is-level" style={{ top: `${placedPx[model.lines.length + index] ?? 0}px` }}>
          {label}
        </span>
      ))}
    </div>
  );
}

/** Where the line ends; its last stretch may have nothing to draw. */
function lastValue({ values }: PlotLine): number {
  return values.findLast(Number.isFinite) ?? 0;
}
