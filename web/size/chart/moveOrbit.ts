/** Putting the candidate at a point of the chart: snapped, kept on what is held, written into the entry. */
import {
  type ChartCurve,
  type ChartPoint,
  chartFloor,
  distanceToLinePx,
  eccentricityAt,
  footOn,
  newCondition,
  readConditions,
  type SnapRequest,
  snapPoint,
} from '../../../core/index';
import { takeElements } from '../../state/entryActions';
import type { ShownCurve } from './chartCurvesShown';
import type { Chart } from './chartState';
import { wishOf } from './curveNames';
import type { Held } from './heldCurves';

/** Distances, in px, from which a curve and a crossing draw the mark in, at a quick drag. */
const curveReach = 9;
const crossingReach = 15;
/** A slow drag is drawn in from this share of them: one can stop close beside a curve. */
const slowShare = 0.3;

/** `pull` 0: no snapping; above, by the drag's gain. */
export function moveTo(chart: Chart, at: ChartPoint, pull: number): void {
  const mapping = chart.mapping.peek();
  if (!mapping || chart.app.store.tabs.editorElsewhere.peek()) return;
  const { curve, isFixed } = heldCurve(chart);
  if (isFixed) return;
  const share = pull === 0 ? 0 : slowShare + (1 - slowShare) * pull;
  const start = withinReason(chart, kept(chart, at, curve));
  const request: SnapRequest = {
    at: start,
    curves: canSnap(chart, curve) ? curvesAround(chart, start, crossingReach) : [],
    scale: mapping.scale,
    reach: { curve: share * curveReach, crossing: share * crossingReach },
    held: curve,
  };
  write(chart, withinReason(chart, snapPoint(request).point));
}

/** To the nearest curve or crossing in sight, for those who move by keys. */
export function snapToNearest(chart: Chart): void {
  const point = chart.point.peek();
  const mapping = chart.mapping.peek();
  const { curve, isFixed } = heldCurve(chart);
  if (!point || !mapping || isFixed || !canSnap(chart, curve)) return;
  const reach = { curve: 60, crossing: 24 };
  const curves = curvesAround(chart, point, reach.curve);
  write(chart, snapPoint({ at: point, curves, scale: mapping.scale, reach, held: curve }).point);
}

/** Those whose drawn line comes near the point, or near the foot of the point on what is held. */
function curvesAround(chart: Chart, at: ChartPoint, reachPx: number): ChartCurve[] {
  const mapping = chart.mapping.peek();
  if (!mapping) return [];
  const { scale } = mapping;
  const { curve: held } = heldCurve(chart);
  const around = held ? (footOn(held, at, scale) ?? at) : at;
  // The line cuts the curve's corners by less than a few pixels.
  return chart.curves
    .peek()
    .filter(({ line }) => distanceToLinePx(line, around, scale) < reachPx + 6)
    .map(({ curve }) => curve);
}

interface HeldCurve {
  readonly curve: ChartCurve | undefined;
  /** Conditions settle both coordinates. */
  readonly isFixed: boolean;
}

export function heldCurve(chart: Chart, held: Held = chart.held.peek()): HeldCurve {
  const { settled } = held;
  const coordinates = Number(settled.has('semiMajorAxisKm')) + Number(settled.has('inclinationRad'));
  const shown = coordinates === 1 ? chart.curves.peek().find(({ isHeld }) => isHeld) : undefined;
  return { curve: shown?.curve, isFixed: coordinates === 2 };
}

/** Where a condition without a curve here settles a coordinate, crossings cannot be told. */
function canSnap(chart: Chart, curve: ChartCurve | undefined): boolean {
  const { settled } = chart.held.peek();
  return curve !== undefined || !(settled.has('semiMajorAxisKm') || settled.has('inclinationRad'));
}

/** A coordinate that is settled without a curve stays. */
function kept(chart: Chart, at: ChartPoint, curve: ChartCurve | undefined): ChartPoint {
  const point = chart.point.peek();
  if (curve || !point) return at;
  const { settled } = chart.held.peek();
  return {
    inclinationRad: settled.has('inclinationRad') ? point.inclinationRad : at.inclinationRad,
    altitudeKm: settled.has('semiMajorAxisKm') ? point.altitudeKm : at.altitudeKm,
  };
}

/** No lower than the lowest orbit, no further than 180°. */
function withinReason(chart: Chart, { inclinationRad, altitudeKm }: ChartPoint): ChartPoint {
  const body = chart.body.peek();
  const shape = chart.shape.peek();
  const floorKm = body && shape ? chartFloor(body, shape).altitudeKm : 0;
  return {
    inclinationRad: Math.min(Math.PI, Math.max(0, inclinationRad)),
    altitudeKm: Number.isFinite(floorKm) ? Math.max(floorKm, altitudeKm) : altitudeKm,
  };
}

function write(chart: Chart, { inclinationRad, altitudeKm }: ChartPoint): void {
  const body = chart.body.peek();
  const shape = chart.shape.peek();
  if (!body || !shape) return;
  const eccentricity = eccentricityAt(body, shape, altitudeKm);
  const settlesShape = chart.held.peek().settled.has('eccentricity');
  takeElements(chart.app.document, {
    semiMajorAxisKm: body.equatorialRadiusKm + altitudeKm,
    inclinationRad,
    ...(settlesShape || eccentricity === null ? {} : { eccentricity }),
  });
}

/** Makes conditions of the curves that the orbit lies on. */
export function holdCurves(chart: Chart, shown: readonly ShownCurve[]): void {
  const { document } = chart.app;
  for (const { curve } of shown) {
    const present = readConditions(document.draft.peek()).flatMap(({ entry }) => (entry ? [entry] : []));
    const { kind, texts } = wishOf(curve.condition);
    document.conditions.add(newCondition(kind, present, texts));
  }
}
