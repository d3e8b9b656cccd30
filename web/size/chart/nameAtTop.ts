/** Square and diamond where the curves of the trade leave the chart upwards or end, their names beside them. */
import type { ChartCondition } from '../../../core/index';
import type { ChartSurface } from '../../parts/chartCanvas';
import { curveLabel } from './curveNames';
import { type DrawnCurve, strokeOf } from './drawCurves';
import { boxAround } from './labels';
import { type NameParts, nameAlong, writeLabel } from './nameCurves';

const rank: readonly ChartCondition['kind'][] = ['sunSynchronous', 'critical', 'polar'];
const rankOf = ({ shown }: DrawnCurve) => rank.indexOf(shown.curve.condition.kind);

interface TopMark {
  readonly curve: DrawnCurve;
  readonly x: number;
  readonly y: number;
  /** Within the plot: the curve ends there. */
  readonly isEnd: boolean;
}

export function nameAtTop(surface: ChartSurface, parts: NameParts): void {
  const named = parts.drawn.filter((each) => rankOf(each) >= 0).sort((one, other) => rankOf(one) - rankOf(other));
  const marks = named.flatMap((curve) => topOf(curve, parts));
  for (const mark of marks) {
    drawTopMark(surface, mark);
    parts.places.take(boxAround(mark.x, mark.y, { width: 13, height: 13 }));
  }
  surface.context.font = `600 ${surface.ink.fontPx * 0.93}px ${surface.ink.fontFamily}`;
  const isNamed = new Set(marks.filter((mark) => nameMark(surface, parts, mark)).map(({ curve }) => curve));
  for (const curve of named) {
    if (!isNamed.has(curve)) nameAlong(surface, parts, { curve, text: curveLabel(curve.shown.curve.condition, parts) });
  }
}

function topOf(curve: DrawnCurve, { mapping }: NameParts): TopMark[] {
  const { box } = mapping;
  const [x, y] = [curve.pixels.x[0] ?? Number.NaN, curve.pixels.y[0] ?? Number.NaN];
  const isInside = x >= box.left && x <= box.right && y >= box.top - 1 && y <= box.bottom;
  return isInside ? [{ curve, x, y: Math.max(y, box.top), isEnd: y > box.top + 1 }] : [];
}

function drawTopMark({ context, ink }: ChartSurface, { curve, x, y }: TopMark): void {
  const { kind } = curve.shown.curve.condition;
  context.fillStyle = kind === 'critical' ? ink.perigee : ink.node;
  context.beginPath();
  if (kind === 'critical') {
    context.moveTo(x, y - 7);
    context.lineTo(x + 7, y);
    context.lineTo(x, y + 7);
    context.lineTo(x - 7, y);
  } else {
    const half = kind === 'sunSynchronous' ? 5 : 3;
    context.rect(x - half, y - half, 2 * half, 2 * half);
  }
  context.fill();
}

/** Above the mark, else to a side; answers whether there was room. */
function nameMark(surface: ChartSurface, parts: NameParts, { curve, x, y, isEnd }: TopMark): boolean {
  const { context, ink, widthPx } = surface;
  const label = curveLabel(curve.shown.curve.condition, parts);
  // "Critical" alone says enough where there is little room.
  for (const text of isEnd ? [`${label} ends`] : [label, label.replace(' inclination', '')]) {
    const half = context.measureText(text).width / 2 + 4;
    const room = { width: 2 * half, height: ink.fontPx * 1.1 };
    const place = [0, -half - 6, half + 6]
      .map((shift) => ({ x: x + shift, y: y - 10 - ink.fontPx / 2 }))
      .find((spot) => {
        const candidate = boxAround(spot.x, spot.y, room);
        return candidate.left >= 0 && candidate.right <= widthPx && parts.places.isFree(candidate);
      });
    if (!place) continue;
    const { colour } = strokeOf(curve.shown, ink);
    writeLabel(surface, { text, ...place, room, colour, onSheet: isEnd }, parts.places);
    return true;
  }
  return false;
}
