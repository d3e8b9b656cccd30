/** What lies on a plot beside its lines: a band, separate points, moments on the upper edge. */
import type { PlotModel } from './plotModel';
import { heightIn } from './plotScale';

export const percent = (part: number): string => `${part * 100}%`;

export const isDrawn = ({ range }: PlotModel, value: number): boolean =>
  value >= range.least && value <= range.greatest;

interface OfModel {
  readonly model: PlotModel;
}

function across({ x }: PlotModel, at: number): number {
  const [first, last] = [x[0] ?? 0, x[x.length - 1] ?? 1];
  return (at - first) / (last - first);
}

/** Shaded between its edges; an edge outside the plot is not drawn. */
export function Band({ model }: OfModel) {
  const { band, range } = model;
  if (!band) return null;
  const place = (value: number) => Math.max(0, Math.min(1, heightIn(range, value)));
  const edges = `${isDrawn(model, band.low) ? ' has-low' : ''}${isDrawn(model, band.high) ? ' has-high' : ''}`;
  const box = { bottom: percent(place(band.low)), top: percent(1 - place(band.high)) };
  return <div class={`plot-band${edges}`} style={box} />;
}

export function Points({ model }: OfModel) {
  return model.points?.map(({ id, x, values, hue }) => (
    <div key={id} class={`plot-points mark-${hue}`} aria-hidden="true">
      {Array.from(x, (at, index) => ({ left: across(model, at), value: values[index] ?? Number.NaN }))
        .filter(({ left, value }) => left <= 1 && isDrawn(model, value))
        .map(({ left, value }) => (
          <i key={left} style={{ left: percent(left), bottom: percent(heightIn(model.range, value)) }} />
        ))}
    </div>
  ));
}

export function Events({ model }: OfModel) {
  return model.events
    ?.filter(({ x }) => across(model, x) >= 0 && across(model, x) <= 1)
    .map(({ id, x }) => <i key={id} class="plot-event" style={{ left: percent(across(model, x)) }} />);
}
