/** The layer that moves: the candidate with its lines to both axes, other saved orbits, the name of what it snapped to. */
import type { ChartPoint } from '../../../core/index';
import type { ChartSurface } from '../../parts/chartCanvas';
import { drawReach } from './drawReach';
import { boxAround, type LabelBox, labelPlaces } from './labels';
import type { OtherOrbit } from './otherOrbits';
import type { Mapping } from './plotBox';

export interface MarkParts {
  readonly mapping: Mapping;
  readonly point: ChartPoint;
  readonly others: readonly OtherOrbit[];
  /** Names of the curves that it lies on. */
  readonly on: readonly string[];
  readonly isOn: boolean;
  /** Where the layer below has labels. */
  readonly written: readonly LabelBox[];
  readonly isDragging: boolean;
  readonly lengthUnit: 'km' | 'NM';
}

const markRadius = 12;

export function drawMarks(surface: ChartSurface, parts: MarkParts): void {
  const { box } = parts.mapping;
  const x = parts.mapping.x(parts.point.inclinationRad);
  const y = parts.mapping.y(parts.point.altitudeKm);
  const isInside = x >= box.left - 1 && x <= box.right + 1 && y >= box.top - 1 && y <= box.bottom + 1;
  const mark = { x: Math.min(box.right, Math.max(box.left, x)), y: Math.min(box.bottom, Math.max(box.top, y)) };
  drawOthers(surface, parts, mark);
  if (isInside) drawReach(surface, parts);
  drawCandidate(surface, mark, { isInside, isOn: parts.isOn, isDragging: parts.isDragging });
  if (isInside && parts.on.length > 0) drawSnap(surface, parts, mark);
}

interface Spot {
  readonly x: number;
  readonly y: number;
}

interface CandidateLook {
  readonly isInside: boolean;
  readonly isOn: boolean;
  readonly isDragging: boolean;
}

function drawCandidate(
  { context, ink }: ChartSurface,
  { x, y }: Spot,
  { isInside, isOn, isDragging }: CandidateLook,
): void {
  context.beginPath();
  context.arc(x, y, isDragging ? markRadius + 3 : markRadius, 0, 2 * Math.PI);
  context.fillStyle = ink.sheet;
  context.globalAlpha = isDragging ? 0.7 : 1;
  context.fill();
  context.globalAlpha = 1;
  context.strokeStyle = ink.ink;
  context.lineWidth = isOn ? ink.heavyPx + 0.5 : ink.midPx;
  context.setLineDash(isInside ? [] : [3, 3]);
  context.stroke();
  context.setLineDash([]);
  context.beginPath();
  context.arc(x, y, isOn ? 4.5 : 3.2, 0, 2 * Math.PI);
  context.fillStyle = ink.ink;
  context.fill();
}

function drawSnap({ context, ink }: ChartSurface, { mapping, on }: MarkParts, { x, y }: Spot): void {
  const { box } = mapping;
  const text = on.join(' · ');
  context.font = `600 ${ink.fontPx}px ${ink.fontFamily}`;
  const width = context.measureText(text).width + 12;
  const height = ink.fontPx * 1.5;
  const goesRight = x + markRadius + 8 + width < box.right;
  const left = goesRight ? x + markRadius + 8 : Math.max(box.left + 2, x - markRadius - 8 - width);
  const top = Math.max(box.top + 2, y - markRadius - height);
  context.fillStyle = ink.sheet;
  context.fillRect(left, top, width, height);
  context.fillStyle = ink.ink;
  context.textAlign = 'left';
  context.textBaseline = 'middle';
  context.fillText(text, left + 6, top + height / 2 + 1);
}

const longestName = 18;

/** Small rings; a name is left out where it would meet another, and all are listed in the text beside the chart. */
function drawOthers({ context, ink }: ChartSurface, { mapping, others, written }: MarkParts, mark: Spot): void {
  const { box } = mapping;
  const places = labelPlaces();
  written.forEach(places.take);
  places.take(boxAround(mark.x, mark.y, { width: 2 * markRadius + 6, height: 2 * markRadius + 6 }));
  context.font = `${ink.fontPx * 0.93}px ${ink.fontFamily}`;
  context.textBaseline = 'middle';
  const height = ink.fontPx * 1.1;
  for (const { point, name } of others) {
    const [x, y] = [mapping.x(point.inclinationRad), mapping.y(point.altitudeKm)];
    if (x < box.left || x > box.right || y < box.top || y > box.bottom) continue;
    context.beginPath();
    context.arc(x, y, 4.5, 0, 2 * Math.PI);
    context.fillStyle = ink.sheet;
    context.fill();
    context.strokeStyle = ink.ink;
    context.lineWidth = ink.thinPx * 1.2;
    context.stroke();
    const text = name.length > longestName ? `${name.slice(0, longestName - 1).trimEnd()}…` : name;
    const width = context.measureText(text).width + 6;
    const centres = [x + 9 + width / 2, x - 9 - width / 2];
    const free = centres
      .map((centre) => boxAround(centre, y, { width, height }))
      .find((room) => room.left > box.left && room.right < box.right && places.isFree(room));
    places.take(boxAround(x, y, { width: 12, height: 12 }));
    if (!free) continue;
    places.take(free);
    context.fillStyle = ink.sheet;
    context.fillRect(free.left, free.top, width, height);
    context.fillStyle = ink.ink;
    context.textAlign = 'center';
    context.fillText(text, (free.left + free.right) / 2, y);
  }
}
