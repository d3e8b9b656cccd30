/**
 * The only module that knows uPlot: it draws lines, grid and axis labels. Cursor, marks and labels
 * at line ends are elements above the canvas, so that moving the cursor redraws nothing.
 *
 * Loaded when a plot is first shown. Its import throws in a browser whose language is not a
 * language tag, since uPlot formats numbers with it at once: whoever loads it must expect that.
 */
import uPlot from 'uplot';
import { inkOf, type PlotInk } from './plotInk';
import type { PlotLine, PlotModel } from './plotModel';
import { valueTicks } from './plotScale';

export interface PlotHandle {
  show(model: PlotModel): void;
  end(): void;
}

/** Where the canvas goes, and the element whose box is the plotting area: the style sheet decides its size. */
export interface PlotPlace {
  readonly host: HTMLElement;
  readonly area: HTMLElement;
}

/** Draws the model into its place and again whenever its size or the lighting changes. */
export function drawPlot(place: PlotPlace, first: PlotModel): PlotHandle {
  let model = first;
  let plot: uPlot | null = null;
  const rebuild = () => {
    plot?.destroy();
    const options = place.host.clientWidth > 0 ? optionsFor(place, () => model) : null;
    plot = options && new uPlot(options, dataOf(model), place.host);
  };
  const sizes = new ResizeObserver(rebuild);
  sizes.observe(place.host);
  sizes.observe(place.area);
  const lighting = new MutationObserver(rebuild);
  lighting.observe(document.documentElement, { attributes: true, attributeFilter: ['data-lighting'] });
  return {
    show: (next) => {
      const isSameShape = shapeOf(next) === shapeOf(model);
      model = next;
      if (isSameShape && plot) plot.setData(dataOf(model));
      else rebuild();
    },
    end: () => {
      sizes.disconnect();
      lighting.disconnect();
      plot?.destroy();
      plot = null;
    },
  };
}

const dataOf = (model: PlotModel): uPlot.AlignedData => [model.x, ...model.lines.map(({ values }) => withGaps(values))];

/** A gap is null to uPlot; it would draw a line across what is not a number. */
const withGaps = (values: Float64Array): Float64Array | (number | null)[] =>
  values.some(Number.isNaN) ? Array.from(values, (value) => (Number.isNaN(value) ? null : value)) : values;

const shapeOf = (model: PlotModel): string =>
  JSON.stringify([model.hasXLabels, model.lines.map(({ id, pattern, hue, weak }) => [id, pattern, hue, weak])]);

function optionsFor({ host, area }: PlotPlace, modelNow: () => PlotModel): uPlot.Options {
  const ink = inkOf(host);
  const inset = insets(host, area);
  const model = modelNow();
  return {
    width: host.clientWidth,
    height: host.clientHeight,
    padding: [inset.top, inset.right, model.hasXLabels ? 0 : inset.bottom, 0],
    legend: { show: false },
    cursor: { show: false },
    scales: {
      x: { time: false, range: () => endsOf(modelNow().x) },
      y: { range: () => [modelNow().range.least, modelNow().range.greatest] },
    },
    axes: [xAxis(modelNow, ink, model.hasXLabels ? inset.bottom : 0), valueAxis(modelNow, ink, inset.left)],
    series: [{}, ...model.lines.map((line) => seriesFor(line, ink))],
  };
}

/** Distances in px from the host's edges to the plotting area. */
function insets(host: HTMLElement, area: HTMLElement) {
  return {
    left: area.offsetLeft - host.offsetLeft,
    top: area.offsetTop - host.offsetTop,
    right: host.offsetLeft + host.clientWidth - area.offsetLeft - area.offsetWidth,
    bottom: host.offsetTop + host.clientHeight - area.offsetTop - area.offsetHeight,
  };
}

function endsOf(x: Float64Array): uPlot.Range.MinMax {
  return [x[0] ?? 0, x[x.length - 1] ?? 1];
}

function xAxis(modelNow: () => PlotModel, ink: PlotInk, sizePx: number): uPlot.Axis {
  // A label of ten figures and its space.
  const ticks = (plot: uPlot) => modelNow().xTicks(Math.max(2, Math.floor(plot.width / (ink.fontPx * 7))));
  return {
    ...axisInk(ink),
    size: sizePx,
    gap: 8,
    splits: (plot) => ticks(plot).map(({ at }) => at),
    values: (plot) => ticks(plot).map(({ text }) => (sizePx > 0 ? text : '')),
  };
}

function valueAxis(modelNow: () => PlotModel, ink: PlotInk, sizePx: number): uPlot.Axis {
  const ticks = (plot: uPlot) => {
    const heightPx = plot.height - sizeOfXAxis(plot);
    return valueTicks(modelNow().range, Math.max(2, Math.floor(heightPx / (ink.fontPx * 1.6))), {
      plus: modelNow().isSigned,
    });
  };
  const look = axisInk(ink);
  return {
    ...look,
    // The zero line is an element above the canvas, stronger than the grid.
    grid: { ...look.grid, filter: (_, splits) => splits.map((at) => (at === 0 ? null : at)) },
    size: sizePx,
    gap: 8,
    splits: (plot) => ticks(plot).map(({ at }) => at),
    values: (plot) => ticks(plot).map(({ text }) => text),
  };
}

const sizeOfXAxis = (plot: uPlot): number => {
  const size = plot.axes[0]?.size;
  return typeof size === 'function' ? size(plot, [], 0, 0) : (size ?? 0);
};

function axisInk(ink: PlotInk) {
  return {
    stroke: ink.label,
    font: ink.font,
    grid: { stroke: ink.grid, width: ink.rulePx },
    ticks: { show: false },
    border: { show: false },
  };
}

/** uPlot scales widths to the screen's pixels, but not dashes. */
function seriesFor({ pattern, hue, weak }: PlotLine, ink: PlotInk): uPlot.Series {
  const widthPx = { averaged: ink.heavyPx, first: ink.dotPx, second: ink.thinPx, geometry: ink.thinPx }[pattern];
  const dashPx = pattern === 'first' ? [0, 2.6 * widthPx + 1] : pattern === 'second' ? [13, 5] : [];
  return {
    stroke: ink[hue],
    width: widthPx,
    dash: dashPx.map((length) => length * window.devicePixelRatio),
    cap: pattern === 'first' ? 'round' : 'butt',
    alpha: weak ? 0.6 : 1,
    points: { show: false },
  };
}
