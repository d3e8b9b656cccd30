/** The orbits of a cell whose ground track closes after N revolutions and D nodal days. */
import type { BandCell } from './bandCells';
import type { TrackCurve, TrackPoint } from './trackCurve';

export interface Cycle {
  readonly revolutions: number;
  /** Nodal days. */
  readonly days: number;
}

/** Nodal days too many after the cycle's revolutions. */
function excessDays({ daysPerRevolution }: TrackPoint, { revolutions, days }: Cycle): number {
  return Math.abs(daysPerRevolution) * revolutions - days;
}

/** Whether the cycle's orbit lies in the cell: its lower end included, its upper one only where the cell is closed. */
export function cellHolds({ low, high, closed }: BandCell, cycle: Cycle): boolean {
  const atLow = excessDays(low, cycle);
  const atHigh = excessDays(high, cycle);
  return atLow === 0 || atLow * atHigh < 0 || (closed && atHigh === 0);
}

const maxSteps = 100;
/** Shares of D, and of a, that are rounding. */
const rounding = 1e-15;

/** The orbit, by the secant kept inside a shrinking bracket; needs `cellHolds`. */
export function closingOrbit(curve: TrackCurve, { low, high }: BandCell, cycle: Cycle): TrackPoint {
  let [below, above] = [low, high];
  let [atBelow, atAbove] = [excessDays(low, cycle), excessDays(high, cycle)];
  if (atBelow === 0) return below;
  if (atAbove === 0) return above;
  let [before, atBefore] = Math.abs(atBelow) < Math.abs(atAbove) ? [below, atBelow] : [above, atAbove];
  let nextKm = secantKm(below, atBelow, above, atAbove);
  for (let step = 0; step < maxSteps; step += 1) {
    const inside = nextKm > below.semiMajorAxisKm && nextKm < above.semiMajorAxisKm;
    const axisKm = inside ? nextKm : 0.5 * (below.semiMajorAxisKm + above.semiMajorAxisKm);
    const point = curve(axisKm);
    if (!point) throw new Error(`an orbit was expected at a ${axisKm} km, between two that exist`);
    const value = excessDays(point, cycle);
    const moveKm = Math.abs(axisKm - before.semiMajorAxisKm);
    if (Math.abs(value) <= rounding * cycle.days || moveKm <= rounding * axisKm) return point;
    if (value > 0 === atAbove > 0) [above, atAbove] = [point, value];
    else [below, atBelow] = [point, value];
    nextKm = secantKm(before, atBefore, point, value);
    [before, atBefore] = [point, value];
  }
  throw new Error(`the cycle ${cycle.revolutions}/${cycle.days} was not closed within ${maxSteps} steps`);
}

function secantKm(one: TrackPoint, atOne: number, other: TrackPoint, atOther: number): number {
  const slopeInverse = (other.semiMajorAxisKm - one.semiMajorAxisKm) / (atOther - atOne);
  return other.semiMajorAxisKm - atOther * slopeInverse;
}
