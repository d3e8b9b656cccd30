/** The plotting area within the canvas, and the way from orbits to pixels and back. */
import type { ChartPoint, ChartScale, ChartWindow } from '../../../core/index';

export interface PlotBox {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

export interface ChartSize {
  readonly widthPx: number;
  readonly heightPx: number;
  readonly fontPx: number;
}

/** Room for labels around the plot, in sizes of the text: altitudes left, names above, inclinations below. */
export function plotBoxOf({ widthPx, heightPx, fontPx }: ChartSize): PlotBox {
  return {
    left: Math.round(3.4 * fontPx + 10),
    top: Math.round(1.4 * fontPx + 12),
    right: Math.round(widthPx - 1.2 * fontPx),
    bottom: Math.round(heightPx - 1.6 * fontPx - 10),
  };
}

export interface Mapping {
  readonly box: PlotBox;
  readonly window: ChartWindow;
  readonly scale: ChartScale;
  x(inclinationRad: number): number;
  y(altitudeKm: number): number;
  pointAt(x: number, y: number): ChartPoint;
}

export function mappingOf(box: PlotBox, window: ChartWindow): Mapping {
  const perRad = Math.max(1, box.right - box.left) / (window.toRad - window.fromRad);
  const perKm = Math.max(1, box.bottom - box.top) / (window.toKm - window.fromKm);
  return {
    box,
    window,
    scale: { perRad, perKm },
    x: (inclinationRad) => box.left + (inclinationRad - window.fromRad) * perRad,
    y: (altitudeKm) => box.bottom - (altitudeKm - window.fromKm) * perKm,
    pointAt: (x, y) => ({
      inclinationRad: window.fromRad + (x - box.left) / perRad,
      altitudeKm: window.fromKm + (box.bottom - y) / perKm,
    }),
  };
}
