/** A chart's curves as polylines: enough points for a smooth stroke, no more, so that all are redrawn within a frame. */
import type { Body } from '../bodies/body';
import type { ChartCurve } from './chartCurves';
import { type ChartShape, chartFloor } from './chartShape';
import type { ChartPoint, ChartScale } from './chartSnap';

/** The part of the chart that is shown: inclinations in rad, mean altitudes in km. */
export interface ChartWindow {
  readonly fromRad: number;
  readonly toRad: number;
  readonly fromKm: number;
  readonly toKm: number;
}

export interface ChartLine {
  readonly inclinationRad: Float64Array;
  /** NaN breaks the line. */
  readonly altitudeKm: Float64Array;
}

const steps = 64;

/** The curve over the window's altitudes (or inclinations, where it is known by those), down to the floor. */
export function chartLine(body: Body, shape: ChartShape, curve: ChartCurve, window: ChartWindow): ChartLine {
  const floorKm = chartFloor(body, shape).altitudeKm;
  return curve.inclinationAt ? overAltitude(curve, window, floorKm) : overInclination(curve, window, floorKm);
}

/** Closer together towards the curve's end, where the inclination changes as the root of what is left. */
function overAltitude({ inclinationAt, endAltitudeKm }: ChartCurve, window: ChartWindow, floorKm: number): ChartLine {
  const topKm = Math.min(window.toKm, endAltitudeKm ?? window.toKm);
  const bottomKm = Math.max(window.fromKm, floorKm);
  if (!(topKm > bottomKm)) return { inclinationRad: new Float64Array(0), altitudeKm: new Float64Array(0) };
  const inclinationRad = new Float64Array(steps + 1);
  const altitudeKm = new Float64Array(steps + 1);
  for (let step = 0; step <= steps; step += 1) {
    const share = step / steps;
    const km = topKm - (topKm - bottomKm) * share * share;
    const found = inclinationAt?.(km) ?? Number.NaN;
    inclinationRad[step] = found;
    altitudeKm[step] = Number.isNaN(found) ? Number.NaN : km;
  }
  return { inclinationRad, altitudeKm };
}

function overInclination({ altitudeAt }: ChartCurve, window: ChartWindow, floorKm: number): ChartLine {
  const inclinationRad = new Float64Array(steps + 1);
  const altitudeKm = new Float64Array(steps + 1);
  for (let step = 0; step <= steps; step += 1) {
    const rad = window.fromRad + ((window.toRad - window.fromRad) * step) / steps;
    const km = altitudeAt?.(rad) ?? Number.NaN;
    inclinationRad[step] = rad;
    altitudeKm[step] = km >= floorKm ? km : Number.NaN;
  }
  return { inclinationRad, altitudeKm };
}

/** Distance, in pixels of the chart, from a point to the polyline: a quick look before a curve itself is worked out. */
export function distanceToLinePx({ inclinationRad, altitudeKm }: ChartLine, at: ChartPoint, scale: ChartScale): number {
  let least = Number.POSITIVE_INFINITY;
  let [x0, y0] = [Number.NaN, Number.NaN];
  for (let index = 0; index < altitudeKm.length; index += 1) {
    const x1 = ((inclinationRad[index] ?? 0) - at.inclinationRad) * scale.perRad;
    const y1 = ((altitudeKm[index] ?? 0) - at.altitudeKm) * scale.perKm;
    const [dx, dy] = [x1 - x0, y1 - y0];
    const length2 = dx * dx + dy * dy;
    const share = length2 > 0 ? Math.min(1, Math.max(0, -(x0 * dx + y0 * dy) / length2)) : 0;
    const [x, y] = [x0 + share * dx, y0 + share * dy];
    const square = x * x + y * y;
    if (square < least) least = square;
    [x0, y0] = [x1, y1];
  }
  return Math.sqrt(least);
}
