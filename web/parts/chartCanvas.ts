/** One layer of a chart: a canvas in the screen's own pixels that is drawn again when its size, the lighting or its data change. */
import { type ChartInk, chartInkOf } from './chartInk';
import type { Frame } from './frame';

export interface ChartSurface {
  /** Scaled so that units are CSS pixels, and cleared. */
  readonly context: CanvasRenderingContext2D;
  readonly widthPx: number;
  readonly heightPx: number;
  readonly ink: ChartInk;
}

export interface ChartLayer {
  /** Draws in the coming frame; asked for within a frame, in that one. */
  invalidate(): void;
  /** The tokens may have changed with a class: read them anew. */
  relight(): void;
  end(): void;
}

export interface LayerParts {
  readonly canvas: HTMLCanvasElement;
  readonly frame: Frame;
  readonly draw: (surface: ChartSurface) => void;
  /** Told before the first drawing, and when the size or the size of the text changes. */
  readonly onSize?: (surface: Pick<ChartSurface, 'widthPx' | 'heightPx' | 'ink'>) => void;
}

export function chartLayer({ canvas, frame, draw, onSize }: LayerParts): ChartLayer {
  const context = canvas.getContext('2d');
  if (!context) throw new Error('a 2d canvas was expected, the browser gave none');
  let ink: ChartInk | null = null;
  const redraw = () => {
    const { clientWidth: widthPx, clientHeight: heightPx } = canvas;
    if (widthPx === 0 || heightPx === 0) return;
    ink ??= chartInkOf(canvas);
    fitPixels(canvas, widthPx, heightPx);
    const ratio = canvas.width / widthPx;
    context.setTransform(ratio, 0, 0, ratio, 0, 0);
    context.clearRect(0, 0, widthPx, heightPx);
    draw({ context, widthPx, heightPx, ink });
  };
  const invalidate = () => frame.request(redraw);
  const relight = () => {
    ink = null;
    invalidate();
  };
  const sizes = new ResizeObserver(() => {
    ink = chartInkOf(canvas);
    onSize?.({ widthPx: canvas.clientWidth, heightPx: canvas.clientHeight, ink });
    invalidate();
  });
  sizes.observe(canvas);
  const lighting = new MutationObserver(relight);
  lighting.observe(document.documentElement, { attributes: true, attributeFilter: ['data-lighting'] });
  return {
    invalidate,
    relight,
    end: () => {
      sizes.disconnect();
      lighting.disconnect();
    },
  };
}

/** Setting a canvas's size costs its content and memory, so only where it differs. */
function fitPixels(canvas: HTMLCanvasElement, widthPx: number, heightPx: number): void {
  const ratio = window.devicePixelRatio || 1;
  const [width, height] = [Math.round(widthPx * ratio), Math.round(heightPx * ratio)];
  if (canvas.width !== width) canvas.width = width;
  if (canvas.height !== height) canvas.height = height;
}
