/** The part of the chart whose orbits break a limit: hatched against the grain of what does not exist, and named. */
import {
  type Body,
  type ChartPoint,
  type ChartShape,
  eccentricityAt,
  type Limit,
  type MeanElements,
  violatesAt,
} from '../../../core/index';
import type { ChartSurface } from '../../parts/chartCanvas';
import { boxAround, type LabelPlaces } from './labels';
import type { Mapping } from './plotBox';

/** What the limits are judged with beside inclination, altitude and eccentricity. */
export interface LimitGround {
  readonly limits: readonly Limit[];
  readonly angles: Pick<MeanElements, 'nodeRad' | 'perigeeRad' | 'meanAnomalyRad'>;
  readonly epochJd: number | null;
}

export interface LimitParts {
  readonly mapping: Mapping;
  readonly body: Body;
  readonly shape: ChartShape;
  readonly ground: LimitGround;
  /** Null where the orbit breaks a limit. */
  readonly mark?: LimitMark | null;
}

/** An orbit that keeps its limits. */
export interface LimitMark {
  readonly point: ChartPoint;
}

/** A stretch of one row that is outside the limits, in pixels. */
interface Run {
  readonly left: number;
  readonly right: number;
  readonly y: number;
}

const rowPx = 3;
const columnPx = 12;
const halvings = 5;

/**
 * Row by row, from the mark up and down: a walk across, and where the answer changes the place of the change. A strip
 * that is kept and narrower than a column, as along a curve of one node rate, is followed from each row to the next.
 */
export function runsOutside(parts: LimitParts): Run[] {
  const { box } = parts.mapping;
  const at = markOn(parts);
  const first = at?.y ?? box.top + rowPx / 2;
  const start = at ? rowAt(parts, first, [at.x]) : rowAt(parts, first, []);
  const rows = [start];
  for (const step of [-rowPx, rowPx]) {
    let before = start;
    for (let y = first + step; y > box.top && y < box.bottom; y += step) {
      before = rowAt(parts, y, strips(before, box));
      rows.push(before);
    }
  }
  return rows.flat().flatMap((run) => (at ? besideMark(run, at) : [run]));
}

/** Where on the canvas a mark that keeps the limits stands. */
function markOn({ mapping, mark }: LimitParts): { readonly x: number; readonly y: number } | null {
  if (!mark) return null;
  const { box } = mapping;
  const [x, y] = [mapping.x(mark.point.inclinationRad), mapping.y(mark.point.altitudeKm)];
  return x >= box.left && x <= box.right && y > box.top && y < box.bottom ? { x, y } : null;
}

/** The mark is known to keep its limits: what a row of a few pixels makes of its surroundings does not cover it. */
function besideMark(run: Run, { x, y }: { readonly x: number; readonly y: number }): Run[] {
  if (Math.abs(run.y - y) > 2 * rowPx) return [run];
  return [
    { ...run, right: Math.min(run.right, x - columnPx / 2) },
    { ...run, left: Math.max(run.left, x + columnPx / 2) },
  ].filter(({ left, right }) => right > left);
}

/** The middles of what is kept in a row, where it is too narrow to be sure of meeting it again. */
function strips(runs: readonly Run[], { left, right }: Mapping['box']): number[] {
  const ends = [left, ...runs.flatMap((run) => [run.left, run.right]), right];
  return ends.flatMap((end, index) => {
    const next = ends[index + 1];
    const isKept = index % 2 === 0 && next !== undefined && next > end;
    return isKept && next - end < 2 * columnPx ? [end, (end + next) / 2, next] : [];
  });
}

function rowAt({ mapping, body, shape, ground }: LimitParts, y: number, also: readonly number[]): Run[] {
  const { box } = mapping;
  const { altitudeKm } = mapping.pointAt(box.left, y);
  const eccentricity = eccentricityAt(body, shape, altitudeKm);
  if (eccentricity === null) return [];
  const semiMajorAxisKm = body.equatorialRadiusKm + altitudeKm;
  const isOutside = (x: number) => {
    const { inclinationRad } = mapping.pointAt(x, y);
    const mean = { ...ground.angles, semiMajorAxisKm, eccentricity, inclinationRad };
    return violatesAt(body, mean, ground.epochJd, ground.limits);
  };
  return rowRuns(places(box, also), isOutside).map(([left, right]) => ({ left, right, y }));
}

function places({ left, right }: Mapping['box'], also: readonly number[]): number[] {
  const columns = Math.max(1, Math.ceil((right - left) / columnPx));
  const even = Array.from({ length: columns + 1 }, (_, column) => left + ((right - left) * column) / columns);
  return also.length === 0 ? even : [...even, ...also].sort((one, other) => one - other);
}

function rowRuns(places: readonly number[], isOutside: (x: number) => boolean): [number, number][] {
  const runs: [number, number][] = [];
  let before = places[0] ?? 0;
  let wasOutside = isOutside(before);
  let start = before;
  for (const x of places.slice(1)) {
    const isNow = isOutside(x);
    if (isNow !== wasOutside) {
      const [from, was] = [before, wasOutside];
      const edge = edgeBetween(from, x, (at) => isOutside(at) === was);
      if (wasOutside) runs.push([start, edge]);
      start = edge;
    }
    [before, wasOutside] = [x, isNow];
  }
  if (wasOutside) runs.push([start, before]);
  return runs;
}

function edgeBetween(from: number, to: number, isAsAtFrom: (x: number) => boolean): number {
  let [low, high] = [from, to];
  for (let step = 0; step < halvings; step += 1) {
    const middle = (low + high) / 2;
    if (isAsAtFrom(middle)) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

const hatchPx = 9;

export function drawOutside({ context, ink }: ChartSurface, { box }: Mapping, runs: readonly Run[]): void {
  if (runs.length === 0) return;
  context.save();
  context.beginPath();
  for (const { left, right, y } of runs) context.rect(left, y - rowPx / 2, right - left, rowPx);
  context.clip();
  context.beginPath();
  const height = box.bottom - box.top;
  for (let x = box.left - height; x < box.right; x += hatchPx) {
    context.moveTo(x, box.top);
    context.lineTo(x + height, box.bottom);
  }
  context.strokeStyle = ink.caution;
  context.lineWidth = ink.rulePx;
  // In sunlight there are no half tones.
  context.globalAlpha = ink.soft === ink.ink ? 1 : 0.6;
  context.stroke();
  context.restore();
}

/** After the lines, in the widest place there is, so that the text stands clear of them. */
export function labelOutside(
  { context, ink }: ChartSurface,
  { box }: Mapping,
  { runs, places }: { readonly runs: readonly Run[]; readonly places: LabelPlaces },
): void {
  const text = 'outside limits';
  context.font = `600 ${ink.fontPx * 0.93}px ${ink.fontFamily}`;
  const half = { x: context.measureText(text).width / 2 + 7, y: ink.fontPx * 0.6 };
  const fits = runs.filter(
    ({ left, right, y }) => right - left > 2 * half.x && y - half.y > box.top && y + half.y < box.bottom,
  );
  const room = fits
    .sort((one, other) => other.right - other.left - (one.right - one.left))
    .map(({ left, right, y }) => boxAround((left + right) / 2, y, { width: 2 * half.x, height: 2 * half.y }))
    .find((box) => places.isFree(box));
  if (!room) return;
  places.take(room);
  context.fillStyle = ink.sheet;
  context.fillRect(room.left, room.top, room.right - room.left, room.bottom - room.top);
  context.fillStyle = ink.caution;
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  context.fillText(text, (room.left + room.right) / 2, (room.top + room.bottom) / 2);
}
