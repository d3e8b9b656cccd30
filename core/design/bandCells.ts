/**
 * A band of semi-major axes cut into cells, in each of which the days in a revolution only rise or only fall.
 *
 * Where the line of orbits begins or ends, and where the days turn back, a node is put, so that a cycle lies in a cell
 * exactly if the days pass D/N between its two ends. A turn between two nodes and back is finer than the grid and missed:
 * that takes zonals that no body has.
 */
import type { TrackCurve, TrackPoint } from './trackCurve';

export interface BandCell {
  readonly low: TrackPoint;
  readonly high: TrackPoint;
  /** Whether the upper end belongs to this cell: it is the last one of its stretch. */
  readonly closed: boolean;
}

export interface Band {
  readonly lowKm: number;
  readonly highKm: number;
}

/** Cells of the band; each about 1/200 of it, evenly in log a. */
const intervals = 192;
const halvings = 60;

/** In order of rising a; none where the line has no orbit. */
export function bandCells(curve: TrackCurve, band: Band): readonly BandCell[] {
  return stretches(curve, band).flatMap((stretch) => cellsOf(withTurns(curve, stretch)));
}

/** Runs of neighbouring orbits that exist, each ended where the line ends. */
function stretches(curve: TrackCurve, { lowKm, highKm }: Band): readonly TrackPoint[][] {
  const found: TrackPoint[][] = [];
  let stretch: TrackPoint[] | null = null;
  let beforeKm = lowKm;
  for (let index = 0; index <= intervals; index += 1) {
    const axisKm = index === intervals ? highKm : lowKm * (highKm / lowKm) ** (index / intervals);
    const point = curve(axisKm);
    if (point) {
      if (!stretch) {
        stretch = index === 0 ? [] : [lastOrbit(curve, point, beforeKm)];
        found.push(stretch);
      }
      stretch.push(point);
    } else if (stretch) {
      const last = stretch.at(-1);
      if (last) stretch.push(lastOrbit(curve, last, axisKm));
      stretch = null;
    }
    beforeKm = axisKm;
  }
  return found;
}

/** The orbit nearest to `outsideKm`, where there is none. */
function lastOrbit(curve: TrackCurve, inside: TrackPoint, outsideKm: number): TrackPoint {
  let best = inside;
  let beyond = outsideKm;
  for (let step = 0; step < halvings; step += 1) {
    const middle = 0.5 * (best.semiMajorAxisKm + beyond);
    const point = curve(middle);
    if (point) best = point;
    else beyond = middle;
  }
  return best;
}

function withTurns(curve: TrackCurve, points: readonly TrackPoint[]): readonly TrackPoint[] {
  const turns = points.flatMap((middle, index) => {
    const before = points[index - 1];
    const after = points[index + 1];
    if (!before || !after) return [];
    const rise = middle.daysPerRevolution - before.daysPerRevolution;
    const fall = middle.daysPerRevolution - after.daysPerRevolution;
    return rise * fall > 0 ? [turningPoint(curve, { low: before, high: after, sign: Math.sign(rise) })] : [];
  });
  if (turns.length === 0) return points;
  return [...points, ...turns].sort((one, other) => one.semiMajorAxisKm - other.semiMajorAxisKm);
}

interface Turn {
  readonly low: TrackPoint;
  readonly high: TrackPoint;
  /** 1 for a greatest value between the two, −1 for a least. */
  readonly sign: number;
}

const golden = (Math.sqrt(5) - 1) / 2;

/** Golden-section search. */
function turningPoint(curve: TrackCurve, { low, high, sign }: Turn): TrackPoint {
  let from = low.semiMajorAxisKm;
  let to = high.semiMajorAxisKm;
  const at = (axisKm: number) => curve(axisKm) ?? low;
  let left = at(to - golden * (to - from));
  let right = at(from + golden * (to - from));
  for (let step = 0; step < halvings; step += 1) {
    if (sign * left.daysPerRevolution > sign * right.daysPerRevolution) {
      to = right.semiMajorAxisKm;
      right = left;
      left = at(to - golden * (to - from));
    } else {
      from = left.semiMajorAxisKm;
      left = right;
      right = at(from + golden * (to - from));
    }
  }
  return left;
}

function cellsOf(points: readonly TrackPoint[]): readonly BandCell[] {
  return points.flatMap((low, index) => {
    const high = points[index + 1];
    return high ? [{ low, high, closed: index === points.length - 2 }] : [];
  });
}
