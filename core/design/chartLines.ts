/** A chart's curves as polylines: enough points for a smooth stroke, no more, so that all are redrawn within a frame. */
import type { Body } from '../bodies/body';
import type { ChartCurve } from './chartCurves';
import { type ChartShape, chartFloor } from './chartShape';

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
