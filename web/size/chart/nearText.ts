/** What lies near the orbit, in words: the text that stands in for looking at the chart. */
import {
  type ChartPoint,
  type ChartScale,
  degPerRad,
  distanceToLinePx,
  formatNumber,
  unitOf,
} from '../../../core/index';
import type { ShownCurve } from './chartCurvesShown';
import { curveName, type NameUnits } from './curveNames';

export interface NearUnits extends NameUnits {
  readonly lengthUnit: 'km' | 'NM';
}

/** Shares of a degree and of a kilometre by which an orbit that was snapped may be off its curve. */
const onDeg = 1e-5;
const onKm = 1e-3;

/** The curves that the orbit lies on, to the rounding of what is typed. */
export function curvesUnder(at: ChartPoint, curves: readonly ShownCurve[], scale: ChartScale): ShownCurve[] {
  return curves.filter(({ curve, line }) => {
    if (distanceToLinePx(line, at, scale) > 6) return false;
    const there = curve.inclinationAt?.(at.altitudeKm) ?? null;
    if (there !== null) return Math.abs(there - at.inclinationRad) * degPerRad < onDeg;
    const km = curve.altitudeAt?.(at.inclinationRad) ?? null;
    return km !== null && Math.abs(km - at.altitudeKm) < onKm;
  });
}

export interface Surroundings {
  readonly point: ChartPoint;
  readonly shown: readonly ShownCurve[];
  /** Those of them that the orbit lies on. */
  readonly under: readonly ShownCurve[];
  readonly scale: ChartScale;
}

/** Such as "On Sun-synchronous. Near: 15/1 repeat 3.1 km lower." */
export function nearText({ point, shown, under, scale }: Surroundings, units: NearUnits): string {
  const others = shown.filter((each) => !under.includes(each));
  const near = [nearestOf(point, others, scale, false), nearestOf(point, others, scale, true)].flatMap((each) =>
    each ? [awayText(point, each, units)] : [],
  );
  const names = under.map((each) => named(each, units)).join(' and ');
  const sentences = [under.length > 0 ? `On ${names}.` : '', near.length > 0 ? `Near: ${near.join(', ')}.` : ''];
  return sentences.filter(Boolean).join(' ') || 'Near none of the curves.';
}

/** As far from the mark as one looks for a neighbour. */
const nearPx = 90;

function nearestOf(at: ChartPoint, shown: readonly ShownCurve[], scale: ChartScale, repeats: boolean) {
  let best: { readonly shown: ShownCurve; readonly px: number } | null = null;
  for (const each of shown) {
    if ((each.curve.condition.kind === 'repeat') !== repeats) continue;
    const px = distanceToLinePx(each.line, at, scale);
    if (px < (best?.px ?? Number.POSITIVE_INFINITY)) best = { shown: each, px };
  }
  return best && best.px < nearPx ? best.shown : null;
}

const named = ({ curve }: ShownCurve, units: NearUnits): string =>
  curve.condition.kind === 'repeat' ? `${curveName(curve.condition, units)} repeat` : curveName(curve.condition, units);

function awayText(at: ChartPoint, shown: ShownCurve, units: NearUnits): string {
  const name = named(shown, units);
  const { curve } = shown;
  const there = curve.inclinationAt?.(at.altitudeKm) ?? null;
  if (there !== null) {
    const away = Math.abs(there - at.inclinationRad) * degPerRad;
    return `${name} ${formatNumber(away, { digits: digitsFor(away) })}° away`;
  }
  const km = curve.altitudeAt?.(at.inclinationRad) ?? null;
  if (km === null) return name;
  const { symbol, perCore } = unitOf('length', units.lengthUnit);
  const away = Math.abs(km - at.altitudeKm) * perCore;
  const sense = km < at.altitudeKm ? 'lower' : 'higher';
  return `${name} ${formatNumber(away, { digits: Math.min(2, digitsFor(away)) })} ${symbol} ${sense}`;
}

/** Two figures or more of a small distance. */
function digitsFor(size: number): number {
  if (size >= 10) return 0;
  if (size >= 1) return 1;
  return size >= 0.01 ? 2 : 4;
}
