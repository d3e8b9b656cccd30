/** Which part of the chart is shown: the whole, or what pinching and panning made of it. */
import { type Body, type ChartShape, type ChartWindow, chartFloor } from '../../../core/index';

/** Tops of a whole chart, as shares of the body's radius that come to round numbers at the Earth (1600 km). */
const roundSteps = [1, 1.2, 1.6, 2, 2.4, 3, 4, 5, 6, 8, 10] as const;

function roundUp(value: number): number {
  const power = 10 ** Math.floor(Math.log10(value));
  return (roundSteps.find((step) => step * power >= value * (1 - 1e-9)) ?? 10) * power;
}

/** Share of the chart's height left below the lowest orbit, to show that there is a floor. */
const belowFloor = 0.055;

/** All inclinations, from a little below the lowest orbit to well above this one. */
export function wholeWindow(body: Body, shape: ChartShape, altitudeKm: number): ChartWindow {
  const floor = chartFloor(body, shape).altitudeKm;
  const floorKm = Number.isFinite(floor) ? floor : Math.min(0, altitudeKm);
  const usualKm = body.equatorialRadiusKm / 4;
  const spanKm = roundUp(Math.max(usualKm, 1.35 * (altitudeKm - floorKm)));
  return { fromRad: 0, toRad: Math.PI, fromKm: floorKm - belowFloor * spanKm, toKm: floorKm + spanKm };
}

/** True while the orbit can stay in a chart of this whole without a new one being drawn up. */
export function isWithin({ fromKm, toKm }: ChartWindow, altitudeKm: number): boolean {
  return altitudeKm > fromKm && altitudeKm < fromKm + 0.98 * (toKm - fromKm);
}

export interface Around {
  readonly inclinationRad: number;
  readonly altitudeKm: number;
}

const leastSpanRad = (0.02 * Math.PI) / 180;
const leastSpanKm = 2;
/** How far out the chart goes: past the synchronous orbit of the Earth. */
const mostRadii = 8;

/** `factor` above 1 shows less, around a point that stays where it is. */
export function zoomed(window: ChartWindow, factor: number, around: Around, body: Body): ChartWindow {
  const widest = mostRadii * body.equatorialRadiusKm;
  const spanRad = clamp((window.toRad - window.fromRad) / factor, leastSpanRad, Math.PI);
  const spanKm = clamp((window.toKm - window.fromKm) / factor, leastSpanKm, widest);
  const shareX = (around.inclinationRad - window.fromRad) / (window.toRad - window.fromRad);
  const shareY = (around.altitudeKm - window.fromKm) / (window.toKm - window.fromKm);
  return inside(body, {
    fromRad: around.inclinationRad - shareX * spanRad,
    toRad: around.inclinationRad + (1 - shareX) * spanRad,
    fromKm: around.altitudeKm - shareY * spanKm,
    toKm: around.altitudeKm + (1 - shareY) * spanKm,
  });
}

export function panned(window: ChartWindow, byRad: number, byKm: number, body: Body): ChartWindow {
  return inside(body, {
    fromRad: window.fromRad + byRad,
    toRad: window.toRad + byRad,
    fromKm: window.fromKm + byKm,
    toKm: window.toKm + byKm,
  });
}

/** Pushed back whole where it left what there is: 0° to 180°, a little underground to far out. */
function inside(body: Body, { fromRad, toRad, fromKm, toKm }: ChartWindow): ChartWindow {
  const sideways = shift(fromRad, toRad, 0, Math.PI);
  const spanKm = toKm - fromKm;
  const deepest = -0.3 * spanKm;
  const upwards = shift(fromKm, toKm, deepest, Math.max(deepest + spanKm, mostRadii * body.equatorialRadiusKm));
  return {
    fromRad: fromRad + sideways,
    toRad: toRad + sideways,
    fromKm: fromKm + upwards,
    toKm: toKm + upwards,
  };
}

function shift(from: number, to: number, least: number, greatest: number): number {
  if (from < least) return least - from;
  return to > greatest ? greatest - to : 0;
}

function clamp(value: number, least: number, greatest: number): number {
  return Math.min(greatest, Math.max(least, value));
}
