/**
 * Draws the map: land, grid, swath, track, crossings, start and end. Equirectangular, so that longitudes and latitudes
 * can be read off with a straight edge.
 */
import type { GroundLine } from '../../../core/index';
import type { ChartSurface } from '../../parts/chartCanvas';
import type { Land, Shore } from './land';
import { swathQuads } from './swath';
import { crossingOf, type MapPoint, type TrackDrawn } from './trackDrawn';

export interface MapStyle {
  readonly legs: 'both' | 'ascending' | 'descending';
  /** Half the swath as an angle at the body's centre; null where none is drawn. */
  readonly swathHalfRad: number | null;
}

export interface MapDrawing {
  readonly land: Land | null;
  readonly track: TrackDrawn;
  readonly style: MapStyle;
}

const degree = Math.PI / 180;

type Sheet = ChartSurface;
type MapSize = Pick<ChartSurface, 'widthPx' | 'heightPx'>;

export function drawMap(sheet: Sheet, { land, style, track }: MapDrawing): void {
  const { context, ink, widthPx, heightPx } = sheet;
  context.fillStyle = ink.sheet;
  context.fillRect(0, 0, widthPx, heightPx);
  drawLand(sheet, land);
  drawGrid(sheet);
  const shown = { ...track, lines: track.lines.filter(({ ascending }) => isDrawn(ascending, style)) };
  if (style.swathHalfRad !== null) drawSwath(sheet, shown.lines, style.swathHalfRad);
  drawTrack(sheet, shown);
  drawCrossings(sheet, shown);
  drawEnds(sheet, track);
}

const isDrawn = (ascending: boolean, { legs }: MapStyle) => legs === 'both' || ascending === (legs === 'ascending');

const xOf = ({ widthPx }: MapSize, longitudeRad: number) => (longitudeRad / (2 * Math.PI) + 0.5) * widthPx;
const yOf = ({ heightPx }: MapSize, latitudeRad: number) => (0.5 - latitudeRad / Math.PI) * heightPx;

function drawLand(sheet: Sheet, land: Land | null): void {
  if (!land) return;
  const { context: pen, ink } = sheet;
  pen.beginPath();
  for (const { area } of land) addShore(sheet, area);
  pen.globalAlpha = 0.3;
  pen.fillStyle = ink.hair;
  // Inner shores are holes.
  pen.fill('evenodd');
  pen.globalAlpha = 1;
  pen.beginPath();
  for (const { line } of land) addShore(sheet, line);
  pen.strokeStyle = ink.control;
  pen.lineWidth = ink.rulePx * 0.6;
  pen.stroke();
}

function addShore(sheet: Sheet, shore: Shore['line']): void {
  const { context: pen, widthPx } = sheet;
  for (const shiftPx of [-widthPx, 0, widthPx]) {
    for (const [index, [longitude, latitude]] of shore.entries()) {
      const [x, y] = [xOf(sheet, longitude * degree) + shiftPx, yOf(sheet, latitude * degree)];
      if (index === 0) pen.moveTo(x, y);
      else pen.lineTo(x, y);
    }
  }
}

function drawGrid(sheet: Sheet): void {
  const { context: pen, ink, widthPx, heightPx } = sheet;
  pen.strokeStyle = ink.faint;
  pen.lineWidth = ink.rulePx;
  pen.beginPath();
  for (let longitude = -150; longitude < 180; longitude += 30) {
    const x = Math.round(xOf(sheet, longitude * degree)) + 0.5;
    pen.moveTo(x, 0);
    pen.lineTo(x, heightPx);
  }
  for (const latitude of [-60, -30, 30, 60]) {
    const y = Math.round(yOf(sheet, latitude * degree)) + 0.5;
    pen.moveTo(0, y);
    pen.lineTo(widthPx, y);
  }
  pen.stroke();
  pen.strokeStyle = ink.soft;
  pen.beginPath();
  pen.moveTo(0, heightPx / 2);
  pen.lineTo(widthPx, heightPx / 2);
  pen.stroke();
}

function drawSwath(sheet: Sheet, lines: readonly GroundLine[], halfRad: number): void {
  const { context: pen, ink, widthPx } = sheet;
  pen.beginPath();
  for (const line of lines) {
    for (const quad of swathQuads(line, halfRad)) {
      // A swath reaches over the edge of the map, and comes in again at the other.
      for (const shiftPx of [-widthPx, 0, widthPx]) {
        const corners = quad.map(({ longitudeRad, latitudeRad }): readonly [number, number] => [
          xOf(sheet, longitudeRad) + shiftPx,
          yOf(sheet, latitudeRad),
        ]);
        if (corners.every(([x]) => x < 0) || corners.every(([x]) => x > widthPx)) continue;
        corners.forEach(([x, y], index) => {
          if (index === 0) pen.moveTo(x, y);
          else pen.lineTo(x, y);
        });
        pen.closePath();
      }
    }
  }
  pen.globalAlpha = 0.22;
  pen.fillStyle = ink.node;
  pen.fill();
  pen.globalAlpha = 1;
}

/** Tracks that stand closer than a few strokes are drawn finer, so that they stay apart. */
function strokeOf({ ink, widthPx }: Sheet, { revolutions }: TrackDrawn): number {
  const apartPx = widthPx / (2 * revolutions);
  return ink.thinPx * Math.min(1.3, Math.max(0.35, apartPx / 4));
}

function drawTrack(sheet: Sheet, track: TrackDrawn): void {
  const { context: pen, ink } = sheet;
  pen.strokeStyle = ink.ink;
  pen.lineWidth = strokeOf(sheet, track);
  pen.lineJoin = 'round';
  for (const ascending of [true, false]) {
    pen.setLineDash(ascending ? [] : [4, 3]);
    pen.beginPath();
    for (const line of track.lines) if (line.ascending === ascending) addLine(sheet, line);
    pen.stroke();
  }
  pen.setLineDash([]);
}

function addLine(sheet: Sheet, { longitudeRad, latitudeRad }: GroundLine): void {
  const { context: pen } = sheet;
  for (let index = 0; index < longitudeRad.length; index += 1) {
    const x = xOf(sheet, longitudeRad[index] ?? Number.NaN);
    const y = yOf(sheet, latitudeRad[index] ?? Number.NaN);
    if (index === 0) pen.moveTo(x, y);
    else pen.lineTo(x, y);
  }
}

/** Ascending crossings as squares above the equator, descending ones as strokes below it. */
function drawCrossings(sheet: Sheet, { lines, revolutions }: TrackDrawn): void {
  const { context: pen, ink, heightPx, widthPx } = sheet;
  const half = Math.min(3, Math.max(0.75, widthPx / (4 * revolutions)));
  pen.fillStyle = ink.node;
  for (const line of lines) {
    const longitudeRad = crossingOf(line);
    if (Number.isNaN(longitudeRad)) continue;
    const x = xOf(sheet, longitudeRad);
    if (line.ascending) pen.fillRect(x - half, heightPx / 2 - half, 2 * half, 2 * half);
    else pen.fillRect(x - half / 3, heightPx / 2, (2 * half) / 3, 6);
  }
}

/** Start as a full mark, end as a ring around where it lies: a closed track has the ring around the mark. */
function drawEnds(sheet: Sheet, { start, end, isWhole }: TrackDrawn): void {
  const { context: pen, ink } = sheet;
  const at = ({ longitudeRad, latitudeRad }: MapPoint) => [xOf(sheet, longitudeRad), yOf(sheet, latitudeRad)] as const;
  const [x, y] = at(start);
  pen.fillStyle = ink.node;
  pen.strokeStyle = ink.sheet;
  pen.lineWidth = 2;
  pen.beginPath();
  pen.arc(x, y, 5, 0, 2 * Math.PI);
  pen.fill();
  pen.stroke();
  const [endX, endY] = at(end);
  pen.strokeStyle = ink.node;
  pen.lineWidth = ink.thinPx * 2;
  pen.beginPath();
  pen.arc(endX, endY, isWhole ? 9 : 5, 0, 2 * Math.PI);
  pen.stroke();
}
