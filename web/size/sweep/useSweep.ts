/** The sweep as chosen: its range, what is in the way of it, and the last one that could be drawn. */
import { useMemo, useRef } from 'preact/hooks';
import {
  type DisplayUnit,
  type ResolvedOrbit,
  type SweptElement,
  sweptElements,
  sweptWords,
  unitOf,
} from '../../../core/index';
import { usePreferredUnit } from '../../parts/readingText';
import { useApp } from '../../state/appContext';
import { settle } from '../../state/settler';
import type { SweepRange } from '../../state/sweepChoice';
import { drawSweep, type SweepDrawn, type SweepInputs, settledReason } from './drawSweep';
import type { SweepShown } from './sweepModel';
import { rangeAround, rangeInUnit } from './sweepRange';

export interface SweepState extends SweepDrawn {
  readonly element: SweptElement;
  readonly elementUnit: DisplayUnit;
  readonly range: SweepRange;
  /** The last that could be drawn. */
  readonly last: SweepShown | null;
}

export function useSweep(orbit: ResolvedOrbit): SweepState {
  const { document, sweep } = useApp();
  const preferred = usePreferredUnit();
  const candidate = document.draft.value;
  const { reading: id, element: chosen, range: typed } = sweep.value;
  const element = chosen ?? sweptElements.find((each) => settledReason(candidate, each) === '') ?? 'node';
  const { quantity } = sweptWords[element];
  const elementUnit = unitOf(quantity, preferred(quantity));
  const around = useRangeAround(orbit, element, elementUnit);
  const range = typed ? rangeInUnit(typed, element, elementUnit) : around;
  const reading = document.readings.value.find((each) => each.id === id);
  const readingUnit = reading && preferred(reading.quantity);
  const limits = document.limits.margins.value;
  const drawn = useDrawn({ candidate, orbit, id, reading, element, range, elementUnit, readingUnit, limits, settle });
  const absent = document.absentReadings.value.find((each) => each.id === id);
  const reason = drawn.reason || (absent ? `${absent.label}: ${absent.reason}` : '');
  return { ...drawn, reason, element, elementUnit, range, last: useLast(drawn.shown, candidate.id) };
}

/** Drawn anew only where something that counts has changed; while the entry is in error, not at all. */
function useDrawn(inputs: SweepInputs): SweepDrawn {
  const isStale = useApp().document.stale.value;
  const before = useRef<SweepDrawn | null>(null);
  const { candidate, orbit, id, element, range, elementUnit, readingUnit, limits } = inputs;
  const drawn = useMemo(
    () => (isStale && before.current ? before.current : drawSweep(inputs)),
    [isStale, candidate.conditions, orbit, id, element, range.from, range.to, elementUnit, readingUnit, limits],
  );
  before.current = drawn;
  return drawn;
}

/** A range that stays as it is until the orbit leaves it. */
function useRangeAround(orbit: ResolvedOrbit, element: SweptElement, unit: DisplayUnit): SweepRange {
  const { id } = useApp().document.draft.value;
  const kept = useRef<{ readonly key: string; readonly range: SweepRange } | null>(null);
  const key = [id, element, unit.id].join(' ');
  const value = sweptWords[element].valueOf(orbit) * unit.perCore;
  const range = kept.current?.key === key ? kept.current.range : null;
  if (range && value >= Number(range.from) && value <= Number(range.to)) return range;
  const next = rangeAround(orbit, element, unit);
  kept.current = { key, range: next };
  return next;
}

/** The last sweep of this candidate. */
function useLast(shown: SweepShown | null, id: string): SweepShown | null {
  const last = useRef<{ readonly id: string; readonly shown: SweepShown } | null>(null);
  if (shown) last.current = { id, shown };
  return last.current?.id === id ? last.current.shown : null;
}
