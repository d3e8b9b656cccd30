/** The chart's ground: plotting area, regions without an orbit, grid, axes. */
import { type Body, type ChartCurve, type ChartShape, chartFloor, unitOf } from '../../../core/index';
import type { ChartSurface } from '../../parts/chartCanvas';
import { altitudeTicks, inclinationTicks } from './chartTicks';
import type { LabelPlaces } from './labels';
import type { Mapping } from './plotBox';

export interface GroundParts {
  readonly mapping: Mapping;
  readonly body: Body;
  readonly shape: ChartShape;
  readonly lengthUnit: 'km' | 'NM';
  /** Held curves that end: above, nothing meets what is held. */
  readonly ending: readonly ChartCurve[];
  readonly nameOf: (curve: ChartCurve) => string;
}

export function drawGround(surface: ChartSurface, parts: GroundParts): void {
  const { context, ink } = surface;
  const { left, right, top, bottom } = parts.mapping.box;
  context.fillStyle = ink.sheet;
  context.fillRect(left, top, right - left, bottom - top);
  drawGrid(surface, parts);
  for (const region of regionsOf(parts)) hatch(surface, parts.mapping, region);
}

/** The name of the upright axis stands where the curves are named; they keep clear of it. */
export function nameAltitudes(
  { context, ink }: ChartSurface,
  { mapping, lengthUnit }: GroundParts,
  places: LabelPlaces,
): void {
  const { box } = mapping;
  const text = `mean altitude, ${unitOf('length', lengthUnit).symbol}`;
  context.font = `${ink.fontPx * 0.93}px ${ink.fontFamily}`;
  const width = context.measureText(text).width;
  const y = box.top - 10 - ink.fontPx / 2;
  places.take({ left: 0, right: width + 8, top: y - ink.fontPx * 0.55, bottom: y + ink.fontPx * 0.55 });
  context.fillStyle = ink.soft;
  context.textAlign = 'left';
  context.textBaseline = 'middle';
  context.fillText(text, 0, y);
}

/** After the curves, which end at it. */
export function drawFrame({ context, ink }: ChartSurface, { box }: Mapping): void {
  context.strokeStyle = ink.hair;
  context.lineWidth = ink.rulePx;
  context.strokeRect(box.left, box.top, box.right - box.left, box.bottom - box.top);
}

interface Region {
  readonly fromKm: number;
  readonly toKm: number;
  readonly label: string;
  readonly isFloor: boolean;
}

function regionsOf({ mapping, body, shape, ending, nameOf }: GroundParts): Region[] {
  const { fromKm, toKm } = mapping.window;
  const floor = chartFloor(body, shape);
  const apsis = body.id === 'earth' ? 'perigee' : 'periapsis';
  const floorLabel = floor.because === 'surface' ? `${apsis} below the surface` : `below its ${apsis}: no such orbit`;
  const below = { fromKm, toKm: Math.min(floor.altitudeKm, toKm), label: floorLabel, isFloor: true };
  const above = ending.flatMap((curve) =>
    curve.endAltitudeKm === null
      ? []
      : [{ fromKm: Math.max(curve.endAltitudeKm, fromKm), toKm, label: `no ${nameOf(curve)} orbit`, isFloor: false }],
  );
  return [below, ...above].filter((region) => region.toKm > region.fromKm);
}

const hatchPx = 10;

function hatch({ context, ink }: ChartSurface, { box, y }: Mapping, region: Region): void {
  const [top, bottom] = [y(region.toKm), y(region.fromKm)];
  context.save();
  context.beginPath();
  context.rect(box.left, top, box.right - box.left, bottom - top);
  context.fillStyle = ink.paper;
  context.fill();
  context.clip();
  context.beginPath();
  const height = bottom - top;
  for (let x = box.left - height; x < box.right; x += hatchPx) {
    context.moveTo(x, bottom);
    context.lineTo(x + height, top);
  }
  context.strokeStyle = ink.hair;
  context.lineWidth = ink.rulePx;
  context.stroke();
  context.restore();
  edge({ context, ink }, box, region.toKm < Number.POSITIVE_INFINITY ? top : bottom);
}

function edge({ context, ink }: Pick<ChartSurface, 'context' | 'ink'>, box: Mapping['box'], y: number): void {
  context.beginPath();
  context.moveTo(box.left, y);
  context.lineTo(box.right, y);
  context.strokeStyle = ink.control;
  context.lineWidth = ink.thinPx;
  context.stroke();
}

/** After the lines and before their names, which keep out of the region below. */
export function labelRegions({ context, ink }: ChartSurface, parts: GroundParts, places: LabelPlaces): void {
  const { box, y } = parts.mapping;
  context.font = `${ink.fontPx * 0.93}px ${ink.fontFamily}`;
  for (const region of regionsOf(parts)) {
    const height = y(region.fromKm) - y(region.toKm);
    if (region.isFloor) {
      places.take({ left: box.left, right: box.right, top: y(region.toKm) - 3, bottom: box.bottom });
    }
    if (height < ink.fontPx * 1.15) continue;
    const half = context.measureText(region.label).width / 2 + 7;
    const middle = { x: box.right - half - 10, y: y(region.fromKm) - Math.min(height / 2, ink.fontPx * 1.6) };
    const room = {
      left: middle.x - half,
      right: middle.x + half,
      top: middle.y - ink.fontPx * 0.6,
      bottom: middle.y + ink.fontPx * 0.6,
    };
    if (room.left < box.left) continue;
    places.take(room);
    context.fillStyle = ink.paper;
    context.fillRect(room.left, room.top, room.right - room.left, room.bottom - room.top);
    context.fillStyle = ink.soft;
    context.textAlign = 'center';
    context.textBaseline = 'middle';
    context.fillText(region.label, middle.x, middle.y);
  }
}

function drawGrid({ context, ink }: ChartSurface, { mapping, lengthUnit }: GroundParts): void {
  const { box } = mapping;
  context.font = `${ink.fontPx}px ${ink.fontFamily}`;
  context.fillStyle = ink.ink;
  context.textBaseline = 'middle';
  context.textAlign = 'right';
  context.beginPath();
  for (const { at, text } of altitudeTicks(mapping, ink.fontPx, lengthUnit)) {
    const y = mapping.y(at);
    context.moveTo(box.left, y);
    context.lineTo(box.right, y);
    context.fillText(text, box.left - 9, y);
  }
  context.textBaseline = 'top';
  context.textAlign = 'center';
  for (const { at, text } of inclinationTicks(mapping, ink.fontPx)) {
    const x = mapping.x(at);
    context.moveTo(x, box.top);
    context.lineTo(x, box.bottom);
    context.fillText(text, x, box.bottom + 9);
  }
  context.strokeStyle = ink.faint;
  context.lineWidth = ink.rulePx;
  context.stroke();
}
