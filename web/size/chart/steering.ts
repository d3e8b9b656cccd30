/** Moving the view over the chart. */
import type { Chart } from './chartState';
import { panned, zoomed } from './chartWindow';

/** Pixels from the upper left corner of the chart. */
export interface Spot {
  readonly x: number;
  readonly y: number;
}

export const distance = (one: Spot, other: Spot): number => Math.hypot(one.x - other.x, one.y - other.y);

/** The chart follows the finger by so many pixels. */
export function pannedBy(chart: Chart, by: Spot): void {
  const mapping = chart.mapping.peek();
  const body = chart.body.peek();
  if (!mapping || !body) return;
  const { window, scale } = mapping;
  chart.zoom.value = panned(window, -by.x / scale.perRad, by.y / scale.perKm, body);
}

export interface Pinch {
  readonly before: Spot;
  readonly now: Spot;
  /** Where the finger is that did not move. */
  readonly other: Spot;
}

/** The middle of two fingers pans, their distance zooms. */
export function pinchedBy(chart: Chart, { before, now, other }: Pinch): void {
  pannedBy(chart, { x: (now.x - before.x) / 2, y: (now.y - before.y) / 2 });
  const factor = Math.max(1, distance(now, other)) / Math.max(1, distance(before, other));
  zoomAt(chart, factor, { x: (now.x + other.x) / 2, y: (now.y + other.y) / 2 });
}

/** Around a spot of the chart, or its mark where none is given. */
export function zoomAt(chart: Chart, factor: number, spot?: Spot): void {
  const mapping = chart.mapping.peek();
  const body = chart.body.peek();
  const around = spot ? mapping?.pointAt(spot.x, spot.y) : chart.point.peek();
  if (mapping && body && around) chart.zoom.value = zoomed(mapping.window, factor, around, body);
}
