/** The rate chart: all its curves, as often as they are drawn anew while it is panned or pinched. */
import {
  bodies,
  type ChartCondition,
  type ChartShape,
  chartCurve,
  chartLine,
  chartRepeats,
  snapPoint,
} from '../../core/index';
import type { Task } from './measure';

const { earth } = bodies;
const shape: ChartShape = { kind: 'eccentricity', eccentricity: 0.001 };
const degPerDay = Math.PI / 180 / 86_400;
const rates = [-8, -6, -4, -2, 2, 4, 6, 8];
const conditions: readonly ChartCondition[] = [
  { kind: 'sunSynchronous' },
  { kind: 'polar' },
  { kind: 'critical', side: -1 },
  { kind: 'critical', side: 1 },
  ...rates.map((rate): ChartCondition => ({ kind: 'nodeRate', radPerS: rate * degPerDay })),
];
const charts = 10;

function curvesAt(floorKm: number) {
  const window = { fromRad: 0, toRad: Math.PI, fromKm: floorKm, toKm: floorKm + 1700 };
  const named = conditions.flatMap((condition) => chartCurve(earth, shape, condition) ?? []);
  const curves = [...named, ...chartRepeats(earth, shape, window, { gapKm: 90, most: 9 })];
  return { curves, lines: curves.map((curve) => chartLine(earth, shape, curve, window)) };
}

function allCurves(): number {
  let sum = 0;
  for (let chart = 0; chart < charts; chart += 1) sum += curvesAt(-10 * chart).lines.length;
  return sum;
}

const snaps = 200;

function snapping(): number {
  const { curves } = curvesAt(0);
  const scale = { perRad: 190, perKm: 0.25 };
  let sum = 0;
  for (let snap = 0; snap < snaps; snap += 1) {
    const at = { inclinationRad: 0.1 + (2.9 * snap) / snaps, altitudeKm: 300 + 5 * snap };
    sum += snapPoint({ at, curves, scale, reach: { curve: 9, crossing: 15 } }).point.altitudeKm;
  }
  return sum;
}

export function chartTasks(): readonly Task[] {
  return [
    { name: 'all curves of the chart', calls: charts, run: allCurves },
    { name: 'snapPoint, all curves', calls: snaps, run: snapping },
  ];
}

/** The curves within one frame of the slowest tablet meant, with as much again left for drawing them. */
export const chartLimits = [{ name: 'all curves of the chart', microseconds: 8000 }] as const;
