/** From what is chosen to what is drawn, or the reason why nothing is. Pure but for being handed the solver. */
import {
  type Candidate,
  conditionWords,
  type DisplayUnit,
  type LimitMargin,
  type Reading,
  type ReadingId,
  type ResolvedOrbit,
  readConditions,
  type SweptElement,
  type settleOrbit,
  sweepReading,
  sweptWords,
} from '../../../core/index';
import type { SweepRange } from '../../state/sweepChoice';
import type { SweepShown } from './sweepModel';
import { type ReadRange, readRange } from './sweepRange';

/** Places of a sweep; a height along the orbit, or conditions that cannot be met, cost a hundred times the work of a rate. */
const mostPlaces = 201;
const mostCostlyPlaces = 61;

export interface SweepInputs {
  readonly candidate: Candidate;
  readonly orbit: ResolvedOrbit;
  readonly id: ReadingId;
  /** Undefined where the orbit lacks the reading. */
  readonly reading: Reading | undefined;
  readonly element: SweptElement;
  readonly range: SweepRange;
  readonly elementUnit: DisplayUnit;
  readonly readingUnit: string | undefined;
  readonly limits: readonly LimitMargin[];
  readonly settle: typeof settleOrbit;
}

export interface SweepDrawn {
  readonly read: ReadRange;
  /** Why this cannot be swept; empty where it can, or where the range is in the way. */
  readonly reason: string;
  readonly shown: SweepShown | null;
}

export function drawSweep(inputs: SweepInputs): SweepDrawn {
  const { candidate, orbit, id, reading, element, range, elementUnit } = inputs;
  const isCostly = id === 'leastHeight' || id === 'greatestHeight' || candidate.conditions.length > 0;
  const most = isCostly ? mostCostlyPlaces : mostPlaces;
  const read = readRange({ range, element, point: orbit, unit: elementUnit, most });
  const reason = settledReason(candidate, element);
  if (!read.ok || reason !== '' || !reading) return { read, reason, shown: null };
  const places = read.grid.map((place) => place / elementUnit.perCore);
  const swept = sweepReading({ point: orbit, reading: id, element, places, settle: settling(inputs) });
  if (!swept.ok) return { read, reason: swept.reason, shown: null };
  const writing = {
    label: reading.label,
    readingUnit: inputs.readingUnit,
    elementUnit: elementUnit.id,
    limits: inputs.limits.filter(({ entry }) => entry.reading === id),
  };
  return { read, reason: '', shown: { sweep: swept.sweep, reading, grid: read.grid, writing } };
}

/** Conditions are kept along the sweep: each place is settled anew. */
function settling({ candidate, orbit, settle }: SweepInputs) {
  if (candidate.conditions.length === 0) return undefined;
  return (mean: ResolvedOrbit['mean']) => {
    const settled = settle(candidate, { ...orbit, mean });
    return settled.ok ? settled.orbit.mean : null;
  };
}

/** Why a condition keeps an element from being swept; empty where none does. */
export function settledReason(candidate: Candidate, element: SweptElement): string {
  const { label, changes } = sweptWords[element];
  const holder = readConditions(candidate).find(
    ({ entry }) =>
      entry &&
      (changes.some((key) => key === entry.settles) || (entry.kind === 'frozen' && changes.includes('perigeeRad'))),
  );
  if (!holder?.entry) return '';
  const condition = conditionWords[holder.entry.kind].label;
  const way = holder.entry.kind === 'frozen' ? 'drop it' : 'drop it, or let it settle another element,';
  return `${label} is settled by the condition “${condition}”: ${way} to sweep this.`;
}
