/** Names in the plot: at the left end of a repeat track, along a node rate where it is clear. */
import type { ChartSurface } from '../../parts/chartCanvas';
import { curveLabel, type NameUnits, rateNumber, rateSymbol } from './curveNames';
import { type DrawnCurve, strokeOf } from './drawCurves';
import { type BoxSize, boxAround, type LabelBox, type LabelPlaces, touches } from './labels';
import type { Mapping } from './plotBox';

export interface NameParts extends NameUnits {
  readonly mapping: Mapping;
  readonly drawn: readonly DrawnCurve[];
  readonly places: LabelPlaces;
}

interface Written {
  readonly text: string;
  readonly x: number;
  readonly y: number;
  readonly room: BoxSize;
  readonly colour: string;
  /** Within the plot the label clears its ground; the line is broken there. */
  readonly onSheet: boolean;
}

/** Centred, its place taken. */
export function writeLabel({ context, ink }: ChartSurface, label: Written, places: LabelPlaces): void {
  const { text, x, y, room, colour, onSheet } = label;
  const box = boxAround(x, y, room);
  places.take(box);
  if (onSheet) {
    context.fillStyle = ink.sheet;
    context.fillRect(box.left, box.top, room.width, room.height);
  }
  context.fillStyle = colour;
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  context.fillText(text, x, y);
}

/** In the line itself, where it comes in from the left. */
export function nameRepeats(surface: ChartSurface, parts: NameParts): void {
  const { context, ink } = surface;
  const { box } = parts.mapping;
  for (const { shown, pixels } of parts.drawn) {
    const { condition } = shown.curve;
    if (condition.kind !== 'repeat') continue;
    context.font = `${shown.isHeld ? '600 ' : ''}${ink.fontPx * 0.93}px ${ink.fontFamily}`;
    const text = curveLabel(condition, parts);
    const room = { width: context.measureText(text).width + 10, height: ink.fontPx * 1.1 };
    const first = pixels.y.findIndex((y) => y > box.top + ink.fontPx / 2 && y < box.bottom - ink.fontPx / 2);
    const y = pixels.y[first] ?? Number.NaN;
    const x = Math.max(box.left, pixels.x[first] ?? box.left) + room.width / 2;
    if (Number.isNaN(y) || !parts.places.isFree(boxAround(x, y, room))) continue;
    const colour = condition.days === 1 || shown.isHeld ? ink.ink : ink.soft;
    writeLabel(surface, { text, x, y, room, colour, onSheet: true }, parts.places);
  }
}

/** The outermost of either sign says the unit. */
export function nameRates(surface: ChartSurface, parts: NameParts): void {
  const { context, ink } = surface;
  context.font = `${ink.fontPx * 0.93}px ${ink.fontFamily}`;
  const signsWithUnit = new Set<number>();
  for (const curve of parts.drawn) {
    const { condition } = curve.shown.curve;
    if (condition.kind !== 'nodeRate') continue;
    const sign = Math.sign(condition.radPerS);
    const number = rateNumber(condition.radPerS, parts);
    const text = signsWithUnit.has(sign) ? number : `${number} ${rateSymbol(parts)}`;
    if (nameAlong(surface, parts, { curve, text })) signsWithUnit.add(sign);
  }
}

interface Naming {
  readonly curve: DrawnCurve;
  readonly text: string;
}

/** Somewhere along the line where the label meets no other line and no other label; answers whether there was room. */
export function nameAlong(surface: ChartSurface, parts: NameParts, { curve, text }: Naming): boolean {
  const { context, ink } = surface;
  const room = { width: context.measureText(text).width + 8, height: ink.fontPx * 1.1 };
  const place = clearPlace(parts, curve, room);
  if (!place) return false;
  const { colour } = strokeOf(curve.shown, ink);
  writeLabel(surface, { text, ...place, room, colour, onSheet: true }, parts.places);
  return true;
}

/** From the lower end upwards, so that the rates stand in a row where they can. */
function clearPlace({ mapping, drawn, places }: NameParts, { pixels }: DrawnCurve, room: BoxSize) {
  const { box } = mapping;
  const inPlot = ({ left, right, top, bottom }: LabelBox) =>
    left > box.left + 2 && right < box.right - 2 && top > box.top + 2 && bottom < box.bottom - 4;
  const others = drawn.filter((other) => other.pixels !== pixels);
  for (let index = pixels.x.length - 1; index >= 0; index -= 1) {
    const [x, y] = [pixels.x[index] ?? 0, pixels.y[index] ?? 0];
    const candidate = boxAround(x, y, room);
    if (!inPlot(candidate) || !places.isFree(candidate)) continue;
    if (!others.some((other) => touches(other.pixels, candidate))) return { x, y };
  }
  return null;
}
