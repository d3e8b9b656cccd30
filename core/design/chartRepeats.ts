/** Which repeat tracks a chart names: the shortest cycles of the window, as many as there is room for. */

import type { Body } from '../bodies/body';
import { coprime } from '../numerics/integers';
import { type ChartCurve, chartCurve } from './chartCurves';
import type { ChartWindow } from './chartLines';
import { type ChartShape, chartFloor, eccentricityAt } from './chartShape';
import { latitudeRateAt, nodeRateAt, shapeRatesAt } from './shapeRates';

export interface RepeatRoom {
  /** Least distance between two at the window's left edge, km. */
  readonly gapKm: number;
  readonly most: number;
}

/** Every cycle up to this is looked at, longer ones only while fewer than `enough` are found. */
const usualDays = 3;
const longestDays = 40;
const enough = 5;
/** A body that turns this slowly has so many tracks that single ones say nothing. */
const mostADay = 60;

/** Shortest cycles first. None where the body has no rotation. */
export function chartRepeats(body: Body, shape: ChartShape, window: ChartWindow, room: RepeatRoom): ChartCurve[] {
  const bottomKm = Math.max(window.fromKm, chartFloor(body, shape).altitudeKm);
  const [fastest, slowest] = [bottomKm, window.toKm].map((km) => paceAt(body, shape, km, window.fromRad));
  if (!(fastest && slowest && fastest - slowest < mostADay)) return [];
  const taken: { readonly curve: ChartCurve; readonly km: number }[] = [];
  const isFree = (km: number) =>
    km > bottomKm + room.gapKm / 2 &&
    km < window.toKm - room.gapKm / 2 &&
    taken.every((other) => Math.abs(other.km - km) >= room.gapKm);
  for (let days = 1; days <= longestDays && (days <= usualDays || taken.length < enough); days += 1) {
    for (let revolutions = Math.ceil(slowest * days); revolutions <= fastest * days; revolutions += 1) {
      if (taken.length >= room.most) return taken.map(({ curve }) => curve);
      if (revolutions < 1 || !coprime(revolutions, days)) continue;
      const curve = chartCurve(body, shape, { kind: 'repeat', revolutions, days });
      const km = curve?.altitudeAt?.(window.fromRad) ?? Number.NaN;
      if (curve && isFree(km)) taken.push({ curve, km });
    }
  }
  return taken.map(({ curve }) => curve);
}

/** Revolutions in a nodal day, or null where there is no orbit or no day. */
function paceAt(body: Body, shape: ChartShape, altitudeKm: number, inclinationRad: number): number | null {
  const eccentricity = eccentricityAt(body, shape, altitudeKm);
  if (eccentricity === null || !body.rotationRadPerS) return null;
  const axisKm = body.equatorialRadiusKm + altitudeKm;
  const rates = shapeRatesAt(body, 'second', { semiMajorAxisKm: axisKm, eccentricity }, inclinationRad);
  const theta = Math.cos(inclinationRad);
  return latitudeRateAt(rates, theta) / Math.abs(body.rotationRadPerS - nodeRateAt(rates, theta));
}
