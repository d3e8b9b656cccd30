/** The part of the chart whose orbits break a limit: hatched against the grain of what does not exist, and named. */
import {
  type Body,
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
}

/** A stretch of one row that is outside the limits, in pixels. */
interface Run {
  readonly left: number;
  readonly right: number;
  readonly y: number;
}

const rowPx = 3;
const columns = 32;
const halvings = 6;

/** Row by row: a coarse walk across, and where the answer changes the place of the change. */
export function runsOutside({ mapping, body, shape, ground }: LimitParts): Run[] {
  const { box } = mapping;
  const runs: Run[] = [];
  for (let y = box.top + rowPx / 2; y < box.bottom; y += rowPx) {
    const { altitudeKm } = mapping.pointAt(box.left, y);
    const eccentricity = eccentricityAt(body, shape, altitudeKm);
    if (eccentricity === null) continue;
    const semiMajorAxisKm = body.equatorialRadiusKm + altitudeKm;
    const isOutside = (x: number) => {
      const { inclinationRad } = mapping.pointAt(x, y);
      const mean = { ...ground.angles, semiMajorAxisKm, eccentricity, inclinationRad };
      return violatesAt(body, mean, ground.epochJd, ground.limits);
    };
    runs.push(...rowRuns(box, isOutside).map(([left, right]) => ({ left, right, y })));
  }
  return runs;
}

function rowRuns({ left, right }: Mapping['box'], isOutside: (x: number) => boolean): [number, number][] {
  const runs: [number, number][] = [];
  let [before, wasOutside] = [left, isOutside(left)];
  let start = left;
  for (let column = 1; column <= columns; column += 1) {
    const x = left + ((right - left) * column) / columns;
    const isNow = isOutside(x);
    if (isNow !== wasOutside) {
      const edge = edgeBetween(before, x, (at) => isOutside(at) === wasOutside);
      if (wasOutside) runs.push([start, edge]);
      start = edge;
    }
    [before, wasOutside] = [x, isNow];
  }
  if (wasOutside) runs.push([start, right]);
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
