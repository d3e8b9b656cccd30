/** Where a point of the chart snaps to: a curve or a crossing of two, near by as the chart is drawn. */
import { radPerDeg } from '../numerics/angles';
import type { ChartCurve } from './chartCurves';

export interface ChartPoint {
  readonly inclinationRad: number;
  readonly altitudeKm: number;
}

/** How the chart is drawn: pixels for a radian and for a kilometre, both > 0. */
export interface ChartScale {
  readonly perRad: number;
  readonly perKm: number;
}

export interface SnapRequest {
  readonly at: ChartPoint;
  readonly curves: readonly ChartCurve[];
  readonly scale: ChartScale;
  /** How near, in pixels, a curve and a crossing have to be. */
  readonly reach: { readonly curve: number; readonly crossing: number };
  /** The curve that the point may not leave. */
  readonly held?: ChartCurve | undefined;
}

export interface Snapped {
  readonly point: ChartPoint;
  /** The curves it lies on, the held one among them; none where it is free. */
  readonly curves: readonly ChartCurve[];
}

/** What a free coordinate is rounded to: fine enough for any plan, short enough to be read out. */
const altitudeSteps = 10;
const inclinationSteps = 1000;

const roundedKm = (km: number) => Math.round(km * altitudeSteps) / altitudeSteps;
const roundedRad = (rad: number) => (Math.round((rad / radPerDeg) * inclinationSteps) / inclinationSteps) * radPerDeg;

/** The point itself, rounded to 0.1 km and 0.001°, where nothing is near. */
export function snapPoint(request: SnapRequest): Snapped {
  const { at, held, scale, reach } = request;
  const start = held ? (footOn(held, at, scale) ?? at) : at;
  const near = request.curves
    .filter((curve) => curve !== held)
    .flatMap((curve) => {
      const foot = footOn(curve, start, scale);
      return foot ? [{ curve, distance: distancePx(foot, start, scale) }] : [];
    })
    .sort((one, other) => one.distance - other.distance);
  const crossing = nearestCrossing(request, start, near);
  if (crossing) return crossing;
  if (held) return { point: onCurve(held, start, scale), curves: [held] };
  const [nearest] = near;
  if (!nearest || nearest.distance > reach.curve) {
    const point = { inclinationRad: roundedRad(start.inclinationRad), altitudeKm: roundedKm(start.altitudeKm) };
    return { point, curves: [] };
  }
  return { point: onCurve(nearest.curve, start, scale), curves: [nearest.curve] };
}

interface Near {
  readonly curve: ChartCurve;
  readonly distance: number;
}

function nearestCrossing({ held, scale, reach }: SnapRequest, at: ChartPoint, near: readonly Near[]): Snapped | null {
  // A crossing in reach has both its curves in reach.
  const around = near.filter(({ distance }) => distance <= reach.crossing).map(({ curve }) => curve);
  const pairs = held
    ? around.map((curve) => [held, curve] as const)
    : around.flatMap((curve, index) => around.slice(index + 1).map((other) => [curve, other] as const));
  let best: (Snapped & { readonly distance: number }) | null = null;
  for (const [one, other] of pairs) {
    const point = crossingNear(one, other, at);
    if (!point) continue;
    const distance = distancePx(point, at, scale);
    if (distance <= reach.crossing && distance < (best?.distance ?? Number.POSITIVE_INFINITY)) {
      best = { point, curves: [one, other], distance };
    }
  }
  return best && { point: best.point, curves: best.curves };
}

export function distancePx(one: ChartPoint, other: ChartPoint, { perRad, perKm }: ChartScale): number {
  const x = (one.inclinationRad - other.inclinationRad) * perRad;
  return Math.hypot(x, (one.altitudeKm - other.altitudeKm) * perKm);
}

/** One coordinate given, the other from the curve. */
type Along = (coordinate: number) => ChartPoint | null;

interface Course {
  readonly along: Along;
  readonly by: 'altitude' | 'inclination';
}

/** Whether the curve is followed by altitude or by inclination: by whichever it runs along as it is drawn. */
function courseOf(
  { inclinationAt, altitudeAt }: ChartCurve,
  at: ChartPoint,
  { perRad, perKm }: ChartScale,
): Course | null {
  const byAltitude: Along = (altitudeKm) => {
    const inclinationRad = inclinationAt?.(altitudeKm) ?? null;
    return inclinationRad === null ? null : { inclinationRad, altitudeKm };
  };
  const byInclination: Along = (inclinationRad) => {
    const altitudeKm = altitudeAt?.(inclinationRad) ?? null;
    return altitudeKm === null ? null : { inclinationRad, altitudeKm };
  };
  if (!altitudeAt) return { along: byAltitude, by: 'altitude' };
  const here = byAltitude(at.altitudeKm);
  const above = byAltitude(at.altitudeKm + 1 / perKm);
  const isSteep = here && above && Math.abs(above.inclinationRad - here.inclinationRad) * perRad < 1;
  return isSteep ? { along: byAltitude, by: 'altitude' } : { along: byInclination, by: 'inclination' };
}

const footSteps = 3;

/** The foot of the perpendicular, as drawn, by steps along the tangent. */
export function footOn(curve: ChartCurve, at: ChartPoint, scale: ChartScale): ChartPoint | null {
  const course = courseOf(curve, at, scale);
  if (!course) return null;
  const { along, by } = course;
  let coordinate = by === 'altitude' ? at.altitudeKm : at.inclinationRad;
  const onePx = by === 'altitude' ? 1 / scale.perKm : 1 / scale.perRad;
  let foot = along(coordinate);
  for (let step = 0; step < footSteps && foot; step += 1) {
    const ahead = along(coordinate + onePx) ?? along(coordinate - onePx);
    if (!ahead) return foot;
    const sense = ahead === null || along(coordinate + onePx) ? 1 : -1;
    const tangentX = (ahead.inclinationRad - foot.inclinationRad) * scale.perRad * sense;
    const tangentY = (ahead.altitudeKm - foot.altitudeKm) * scale.perKm * sense;
    const offX = (at.inclinationRad - foot.inclinationRad) * scale.perRad;
    const offY = (at.altitudeKm - foot.altitudeKm) * scale.perKm;
    coordinate += (onePx * (offX * tangentX + offY * tangentY)) / (tangentX ** 2 + tangentY ** 2);
    foot = along(coordinate) ?? foot;
  }
  return foot;
}

/** The point of the curve near the given one, its free coordinate rounded and the other exact. */
function onCurve(curve: ChartCurve, at: ChartPoint, scale: ChartScale): ChartPoint {
  const foot = footOn(curve, at, scale) ?? at;
  const course = courseOf(curve, foot, scale);
  const round = course?.by === 'altitude' ? roundedKm(foot.altitudeKm) : roundedRad(foot.inclinationRad);
  return course?.along(round) ?? foot;
}

const crossingSteps = 40;
const crossingKm = 1e-9;

/** The crossing that is reached from a point: the secant for the altitude at which one curve meets the other. */
export function crossingNear(one: ChartCurve, other: ChartCurve, at: ChartPoint): ChartPoint | null {
  const [lead, follow] = one.inclinationAt && other.altitudeAt ? [one, other] : [other, one];
  const { inclinationAt } = lead;
  const { altitudeAt } = follow;
  if (!inclinationAt || !altitudeAt) return null;
  const missKm = (km: number) => {
    const rad = inclinationAt(km);
    const there = rad === null ? null : altitudeAt(rad);
    return there === null ? Number.NaN : there - km;
  };
  let [beforeKm, nowKm] = [at.altitudeKm, at.altitudeKm + 0.5];
  let [before, now] = [missKm(beforeKm), missKm(nowKm)];
  for (let step = 0; step < crossingSteps; step += 1) {
    if (Math.abs(now) < crossingKm) {
      const inclinationRad = inclinationAt(nowKm);
      return inclinationRad === null ? null : { inclinationRad, altitudeKm: nowKm };
    }
    const nextKm = nowKm - (now * (nowKm - beforeKm)) / (now - before);
    if (!Number.isFinite(nextKm)) return null;
    [beforeKm, before] = [nowKm, now];
    [nowKm, now] = [nextKm, missKm(nextKm)];
  }
  return null;
}
