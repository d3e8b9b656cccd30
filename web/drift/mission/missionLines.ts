/** Lines of a mission in the units they are drawn in. Pure. */
import { type ClosedFormDrift, degPerRad, secondsPerDay, secularRates } from '../../../core/index';
import type { MissionResult } from '../../state/mission';
import type { TakenLook } from '../../state/secondLook';
import type { ElementColumns } from '../../work/columns';
import { localTimeUnit } from '../changes';
import type { TimeSpan } from '../timeAxis';

/** What plots and tables are made of. */
export interface MissionLines {
  readonly result: MissionResult;
  readonly closed: ClosedFormDrift;
  readonly time: TimeSpan;
  readonly look: TakenLook | null;
  readonly lengthUnit: 'km' | 'NM';
  /** What the points nearest to and farthest from the body are called there. */
  readonly apsis: string;
}

export interface MethodLines {
  readonly averaged: Float64Array;
  readonly second?: Float64Array;
  readonly first?: Float64Array;
}

const from = (values: Float64Array, per: number): Float64Array =>
  values.map((value) => (value - (values[0] ?? 0)) * per);

/** Changes of local time in minutes, hours or days; null where the body has no clock. */
export function localTimeLines({ result, closed }: MissionLines) {
  const { localTimeH } = result.history;
  const [first, second] = [closed.first.localTimeS, closed.second.localTimeS];
  if (!localTimeH || !first || !second) return null;
  const largestS = Math.max(...localTimeH.map((hours) => Math.abs(hours - (localTimeH[0] ?? 0)))) * 3600;
  const unit = localTimeUnit(largestS);
  const per = unit.perCore;
  return { unit, averaged: from(localTimeH, 3600 * per), second: from(second, per), first: from(first, per) };
}

/** Rates of now at second order, degrees a day. */
export function evenRates({ result }: Pick<MissionLines, 'result'>) {
  const { body, mean } = result.request;
  const { nodeRadPerS, perigeeRadPerS } = secularRates(body, mean, 'second');
  const perDay = degPerRad * secondsPerDay;
  return { node: nodeRadPerS * perDay, perigee: perigeeRadPerS * perDay };
}

/** Degrees ahead of the second order held: of node or perigee. */
export function aheadOf(lines: MissionLines, element: 'node' | 'perigee'): MethodLines {
  const { closed, result } = lines;
  const key = element === 'node' ? 'nodeRad' : 'perigeeRad';
  const even = closed.second[key];
  const ahead = (values: Float64Array) =>
    values.map((value, at) => (value - (values[0] ?? 0) - ((even[at] ?? 0) - (even[0] ?? 0))) * degPerRad);
  return {
    averaged: ahead(result.history.columns[key]),
    second: new Float64Array(even.length),
    first: ahead(closed.first[key]),
  };
}

/** The same at moments of the second look. */
export function lookAhead(lines: MissionLines, columns: ElementColumns, element: 'node' | 'perigee'): Float64Array {
  const values = element === 'node' ? columns.nodeRad : columns.perigeeRad;
  const rate = evenRates(lines)[element];
  return values.map((value, at) => (value - (values[0] ?? 0)) * degPerRad - rate * (columns.days[at] ?? 0));
}

export function heights({ result, lengthUnit }: MissionLines, columns: ElementColumns) {
  const { equatorialRadiusKm } = result.request.body;
  const per = lengthUnit === 'NM' ? 1 / 1.852 : 1;
  const at = (sign: 1 | -1) =>
    columns.semiMajorAxisKm.map((a, k) => (a * (1 + sign * (columns.eccentricity[k] ?? 0)) - equatorialRadiusKm) * per);
  return { perigee: at(-1), apogee: at(1) };
}

/** Thousandths: e cos ω and e sin ω. */
export function eccentricityVector({ eccentricity, perigeeRad }: ElementColumns) {
  const part = (of: (angle: number) => number) => eccentricity.map((e, k) => 1000 * e * of(perigeeRad[k] ?? 0));
  return { along: part(Math.cos), across: part(Math.sin) };
}
