/** Lines from the candidate to both axes, with its numbers in place of the axis labels there. */
import { type ChartPoint, degPerRad, formatNumber, unitOf } from '../../../core/index';
import type { ChartSurface } from '../../parts/chartCanvas';
import { altitudeTicks, inclinationTicks } from './chartTicks';
import { clearPieces, type LabelBox } from './labels';
import type { Mapping } from './plotBox';

export interface ReachParts {
  readonly mapping: Mapping;
  readonly point: ChartPoint;
  readonly lengthUnit: 'km' | 'NM';
  /** Labels that the lines leave out. */
  readonly written: readonly LabelBox[];
}

export function drawReach(surface: ChartSurface, parts: ReachParts): void {
  const { context, ink } = surface;
  const { box } = parts.mapping;
  const x = parts.mapping.x(parts.point.inclinationRad);
  const y = parts.mapping.y(parts.point.altitudeKm);
  context.beginPath();
  const across = parts.written.filter(({ top, bottom }) => top < y && bottom > y);
  for (const [from, to] of clearPieces(
    box.left,
    x,
    across.map(({ left, right }) => [left, right] as const),
  )) {
    context.moveTo(from, y);
    context.lineTo(to, y);
  }
  const down = parts.written.filter(({ left, right }) => left < x && right > x);
  for (const [from, to] of clearPieces(
    y,
    box.bottom,
    down.map(({ top, bottom }) => [top, bottom] as const),
  )) {
    context.moveTo(x, from);
    context.lineTo(x, to);
  }
  context.strokeStyle = ink.ink;
  context.lineWidth = ink.thinPx;
  context.stroke();
  context.textBaseline = 'middle';
  altitudeTag(surface, parts, y);
  inclinationTag(surface, parts, x);
}

function altitudeTag({ context, ink }: ChartSurface, { mapping, point, lengthUnit }: ReachParts, y: number): void {
  const { box } = mapping;
  const digits = point.altitudeKm < 9999 ? 1 : 0;
  const text = formatNumber(point.altitudeKm * unitOf('length', lengthUnit).perCore, { digits });
  const height = ink.fontPx * 1.35;
  const covered = altitudeTicks(mapping, ink.fontPx, lengthUnit)
    .map(({ at }) => mapping.y(at))
    .filter((tick) => Math.abs(tick - y) < height);
  const [top, bottom] = [Math.min(y, ...covered) - height / 2, Math.max(y, ...covered) + height / 2];
  clear({ context, ink }, { left: 0, right: box.left - 2, top, bottom });
  context.font = `600 ${ink.fontPx}px ${ink.fontFamily}`;
  context.fillStyle = ink.ink;
  context.textAlign = 'right';
  context.fillText(text, box.left - 6, y + 1);
}

function inclinationTag({ context, ink }: ChartSurface, { mapping, point }: ReachParts, x: number): void {
  const { box } = mapping;
  const text = `${formatNumber(point.inclinationRad * degPerRad, { digits: 3 })}°`;
  context.font = `600 ${ink.fontPx}px ${ink.fontFamily}`;
  const half = context.measureText(text).width / 2 + 5;
  const middle = Math.min(Math.max(x, half), box.right + ink.fontPx - half);
  const [top, bottom] = [box.bottom + 3, box.bottom + 9 + ink.fontPx * 1.35];
  const tickHalf = ink.fontPx * 1.3;
  const covered = inclinationTicks(mapping, ink.fontPx)
    .map(({ at }) => mapping.x(at))
    .filter((tick) => Math.abs(tick - middle) < half + tickHalf);
  clear(
    { context, ink },
    {
      left: Math.min(middle - half, ...covered.map((tick) => tick - tickHalf)),
      right: Math.max(middle + half, ...covered.map((tick) => tick + tickHalf)),
      top,
      bottom,
    },
  );
  context.fillStyle = ink.ink;
  context.textAlign = 'center';
  context.fillText(text, middle, box.bottom + 9 + ink.fontPx / 2);
}

function clear({ context, ink }: Pick<ChartSurface, 'context' | 'ink'>, { left, right, top, bottom }: LabelBox): void {
  context.fillStyle = ink.paper;
  context.fillRect(left, top, right - left, bottom - top);
}
