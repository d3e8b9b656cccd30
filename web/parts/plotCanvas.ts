/**
 * Lines, grid and axis labels of a plot. Cursor, marks and labels at line ends are elements above the canvas, so that
 * moving the cursor redraws nothing.
 */
import { type ChartSurface, chartLayer } from './chartCanvas';
import type { ChartInk } from './chartInk';
import { createFrame } from './frame';
import type { PlotLine, PlotModel } from './plotModel';
import { heightIn, valueTicks } from './plotScale';

export interface PlotHandle {
  show(model: PlotModel): void;
  end(): void;
}

/** The canvas, and the element whose box is the plotting area: the style sheet decides its size. */
export interface PlotPlace {
  readonly canvas: HTMLCanvasElement;
  readonly area: HTMLElement;
}

/** Draws the model into its place and again whenever its size or the lighting changes. */
export function drawPlot({ canvas, area }: PlotPlace, first: PlotModel): PlotHandle {
  let model = first;
  const frame = createFrame();
  const draw = (surface: ChartSurface) => drawModel(surface, boxOf(canvas, area), model);
  const layer = chartLayer({ canvas, frame, draw });
  const sizes = new ResizeObserver(layer.invalidate);
  sizes.observe(area);
  return {
    show: (next) => {
      model = next;
      layer.invalidate();
    },
    end: () => {
      sizes.disconnect();
      layer.end();
      frame.end();
    },
  };
}

interface PlotBox {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

/** The plotting area in px of the canvas. */
function boxOf(canvas: HTMLElement, area: HTMLElement): PlotBox {
  const [outer, inner] = [canvas.getBoundingClientRect(), area.getBoundingClientRect()];
  const [left, top] = [inner.left - outer.left, inner.top - outer.top];
  return { left, top, right: left + inner.width, bottom: top + inner.height };
}

function drawModel(surface: ChartSurface, box: PlotBox, model: PlotModel): void {
  if (box.right <= box.left || box.bottom <= box.top) return;
  const { context, ink } = surface;
  context.font = `${ink.fontPx}px ${ink.fontFamily}`;
  context.fillStyle = ink.soft;
  context.strokeStyle = ink.faint;
  context.lineWidth = ink.rulePx;
  drawXAxis(surface, box, model);
  drawValueAxis(surface, box, model);
  for (const line of model.lines) drawLine(surface, box, model, line);
}

/** Room between a label and the plotting area. */
const gapPx = 8;

function drawXAxis({ context, ink, widthPx }: ChartSurface, box: PlotBox, model: PlotModel): void {
  // A label of ten figures and its space.
  const ticks = model.xTicks(Math.max(2, Math.floor(widthPx / (ink.fontPx * 7))));
  context.textAlign = 'center';
  context.textBaseline = 'top';
  context.beginPath();
  for (const { at, text } of ticks) {
    const x = xOf(box, model, at);
    context.moveTo(crisp(x), box.top);
    context.lineTo(crisp(x), box.bottom);
    if (model.hasXLabels) context.fillText(text, x, box.bottom + gapPx);
  }
  context.stroke();
}

function drawValueAxis({ context, ink }: ChartSurface, box: PlotBox, model: PlotModel): void {
  const most = Math.max(2, Math.floor((box.bottom - box.top) / (ink.fontPx * 1.6)));
  context.textAlign = 'right';
  context.textBaseline = 'middle';
  context.beginPath();
  for (const { at, text } of valueTicks(model.range, most, { plus: model.isSigned })) {
    const y = yOf(box, model, at);
    context.fillText(text, box.left - gapPx, y);
    // The zero line is an element above the canvas, stronger than the grid.
    if (at === 0) continue;
    context.moveTo(box.left, crisp(y));
    context.lineTo(box.right, crisp(y));
  }
  context.stroke();
}

/** A thin line between two rows of pixels would be drawn pale across both. */
const crisp = (px: number): number => Math.round(px) + 0.5;

function xOf({ left, right }: PlotBox, { x }: PlotModel, at: number): number {
  const [first, last] = [x[0] ?? 0, x[x.length - 1] ?? 1];
  return left + ((at - first) / (last - first)) * (right - left);
}

const yOf = ({ top, bottom }: PlotBox, { range }: PlotModel, value: number): number =>
  bottom - heightIn(range, value) * (bottom - top);

/** A value that is not a number leaves a gap. */
function drawLine({ context, ink }: ChartSurface, box: PlotBox, model: PlotModel, line: PlotLine): void {
  context.save();
  const half = style(context, line, ink) / 2;
  context.beginPath();
  context.rect(box.left - half, box.top - half, box.right - box.left + 2 * half, box.bottom - box.top + 2 * half);
  context.clip();
  context.beginPath();
  let isDown = false;
  line.values.forEach((value, index) => {
    if (Number.isFinite(value)) {
      const [x, y] = [xOf(box, model, model.x[index] ?? 0), yOf(box, model, value)];
      if (isDown) context.lineTo(x, y);
      else context.moveTo(x, y);
    }
    isDown = Number.isFinite(value);
  });
  context.stroke();
  context.restore();
}

/** Answers the width in px. */
function style(context: CanvasRenderingContext2D, { pattern, hue, weak }: PlotLine, ink: ChartInk): number {
  const widthPx = { averaged: ink.heavyPx, first: ink.midPx, second: ink.thinPx, geometry: ink.thinPx }[pattern];
  context.strokeStyle = ink[hue];
  context.lineWidth = widthPx;
  context.lineJoin = 'round';
  context.lineCap = pattern === 'first' ? 'round' : 'butt';
  context.globalAlpha = weak ? 0.6 : 1;
  context.setLineDash(pattern === 'first' ? [0, 2.6 * widthPx + 1] : pattern === 'second' ? [13, 5] : []);
  return widthPx;
}
