/** The curves as strokes: hue says what, weight what is held; the long dash is that of second order in every plot. */
import type { ChartSurface } from '../../parts/chartCanvas';
import type { ChartInk } from '../../parts/chartInk';
import type { ShownCurve } from './chartCurvesShown';
import type { PixelLine } from './labels';
import type { Mapping } from './plotBox';

interface Stroke {
  readonly colour: string;
  readonly widthPx: number;
  readonly alpha: number;
}

export function strokeOf({ curve, isHeld }: ShownCurve, ink: ChartInk): Stroke {
  const { condition } = curve;
  // In sunlight there are no greys: soft is as dark as ink.
  const weak = ink.soft === ink.ink ? 1 : 0.7;
  const held = (colour: string): Stroke => ({ colour, widthPx: ink.heavyPx, alpha: 1 });
  switch (condition.kind) {
    case 'sunSynchronous':
      return isHeld ? held(ink.node) : { colour: ink.node, widthPx: ink.midPx, alpha: 1 };
    case 'critical':
      return isHeld ? held(ink.perigee) : { colour: ink.perigee, widthPx: ink.midPx, alpha: 1 };
    case 'polar':
      return isHeld ? held(ink.node) : { colour: ink.node, widthPx: ink.thinPx, alpha: 1 };
    case 'nodeRate':
      return isHeld ? held(ink.node) : { colour: ink.node, widthPx: 0.8 * ink.thinPx, alpha: weak };
    case 'repeat':
      if (isHeld) return held(ink.ink);
      return condition.days === 1
        ? { colour: ink.ink, widthPx: 0.9 * ink.thinPx, alpha: 1 }
        : { colour: ink.soft, widthPx: 0.7 * ink.thinPx, alpha: weak };
  }
}

const longDash = [13, 5];

/** A curve in pixels. */
export interface DrawnCurve {
  readonly shown: ShownCurve;
  readonly pixels: PixelLine;
}

export function drawCurves(
  { context, ink }: ChartSurface,
  mapping: Mapping,
  curves: readonly ShownCurve[],
): DrawnCurve[] {
  const { box } = mapping;
  const drawn = curves.map((shown) => ({ shown, pixels: pixelsOf(shown, mapping) }));
  context.save();
  context.beginPath();
  context.rect(box.left, box.top, box.right - box.left, box.bottom - box.top);
  context.clip();
  // What is named first lies on top.
  for (const { shown, pixels } of [...drawn].reverse()) {
    const stroke = strokeOf(shown, ink);
    // 90° is 90° by any method.
    context.setLineDash(shown.curve.condition.kind === 'polar' ? [] : longDash);
    context.strokeStyle = stroke.colour;
    context.lineWidth = stroke.widthPx;
    context.globalAlpha = stroke.alpha;
    trace(context, pixels);
  }
  context.restore();
  return drawn;
}

function pixelsOf({ line }: ShownCurve, mapping: Mapping): PixelLine {
  return { x: line.inclinationRad.map(mapping.x), y: line.altitudeKm.map(mapping.y) };
}

function trace(context: CanvasRenderingContext2D, { x, y }: PixelLine): void {
  context.beginPath();
  let isDown = false;
  for (let index = 0; index < x.length; index += 1) {
    const [px, py] = [x[index] ?? Number.NaN, y[index] ?? Number.NaN];
    if (Number.isNaN(px + py)) isDown = false;
    else if (isDown) context.lineTo(px, py);
    else {
      context.moveTo(px, py);
      isDown = true;
    }
  }
  context.stroke();
}
