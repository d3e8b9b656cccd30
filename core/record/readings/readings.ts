/** The registry: every reading of an orbit, in the order in which they are shown. */
import type { Theory } from '../../orbit/elements';
import { apsidesAt } from '../bodyWords';
import { doubtOf } from './doubt';
import { driftReadings } from './drift';
import { type HeightId, heightValues, isHeight } from './heights';
import { nodeReadings } from './node';
import type { Alternate, Reading, ReadingId, ReadingPoint, ReadingSpec } from './reading';
import { sensitivitiesOf } from './sensitivity';
import { shapeReadings } from './shape';
import { timeReadings } from './time';

/** What an orbit is chosen by comes first, what it is made of last. */
const shownOrder = {
  nodeRate: 0,
  localTimeDrift: 1,
  perigeeRate: 2,
  nodalPeriod: 3,
  revolutionsPerDay: 4,
  westwardShift: 5,
  perigeeAltitude: 6,
  apogeeAltitude: 7,
  leastHeight: 8,
  greatestHeight: 9,
  eCos: 10,
  eSin: 11,
  apsidalPeriod: 12,
  nodeAtEpoch: 13,
  localTimeAscending: 14,
  localTimeDescending: 15,
  revolutionsPerNodalDay: 16,
  anomalisticPeriod: 17,
  keplerianPeriod: 18,
  speedAtPerigee: 19,
  semiMajorAxis: 20,
  eccentricity: 21,
  inclination: 22,
} as const satisfies Readonly<Record<ReadingId, number>>;

const specs: readonly ReadingSpec[] = [...driftReadings, ...nodeReadings, ...timeReadings, ...shapeReadings].sort(
  (one, other) => shownOrder[one.id] - shownOrder[other.id],
);

/** How the reading of that name is worked out; undefined for a name that this version does not know. */
export function readingSpec(id: unknown): ReadingSpec | undefined {
  return specs.find((spec) => spec.id === id);
}

/** All readings the orbit has, at the given level; what a lacking epoch, day or year rules out is in `absentReadings`. */
export function readingsOf(orbit: ReadingPoint, theory: Theory = 'second'): Reading[] {
  const heights = heightValues(orbit);
  return specs
    .filter((spec) => !spec.missing?.(orbit))
    .filter(({ id }) => heights !== null || !isHeight(id))
    .map((spec) => readingOf(spec, orbit, theory, heights?.[spec.id as HeightId]));
}

export interface AbsentReading {
  readonly id: ReadingId;
  readonly label: string;
  readonly reason: string;
}

/** Readings the orbit does not have, each with the reason; given those it has, heights need no second walk along it. */
export function absentReadings(orbit: ReadingPoint, present?: readonly Reading[]): AbsentReading[] {
  const noHeights = present ? !present.some(({ id }) => isHeight(id)) : heightValues(orbit) === null;
  return specs.flatMap((spec) => {
    const reason =
      noHeights && isHeight(spec.id) ? 'J2 is too large a correction on this orbit.' : spec.missing?.(orbit);
    return reason ? [{ id: spec.id, label: apsidesAt(spec.label, orbit.body), reason }] : [];
  });
}

function readingOf(spec: ReadingSpec, orbit: ReadingPoint, theory: Theory, known: number | undefined): Reading {
  const { id, symbol, quantity, mark, ordered } = spec;
  const orders = ordered ? { first: spec.evaluate(orbit, 'first'), second: spec.evaluate(orbit, 'second') } : null;
  const value = orders?.[theory] ?? known ?? spec.evaluate(orbit, theory);
  const remark = spec.remark?.(orbit, value);
  const alternates: readonly Alternate[] = spec.alternates?.(orbit, value) ?? [];
  return {
    id,
    label: apsidesAt(spec.label, orbit.body),
    symbol,
    quantity,
    value,
    level: ordered ? theory : 'geometry',
    mark,
    orders,
    sensitivities: () =>
      spec.sensitive === false
        ? null
        : sensitivitiesOf(orbit, spec.slopeOf?.(orbit) ?? ((point) => spec.evaluate(point, theory))),
    alternates,
    doubt: doubtOf(id, orbit, theory),
    ...(remark === undefined ? {} : { remark: apsidesAt(remark, orbit.body) }),
  };
}
