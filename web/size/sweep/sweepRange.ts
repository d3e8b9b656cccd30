/** The range of a sweep: from texts to a round grid, or a message at the field that is in the way. Pure. */
import {
  convertedText,
  type DisplayUnit,
  type FieldError,
  formatSignificant,
  type ReadingPoint,
  readNumber,
  type SweptElement,
  startingRange,
  sweptWords,
  unitOf,
} from '../../../core/index';
import { roundStep } from '../../parts/plotScale';
import type { SweepRange } from '../../state/sweepChoice';

export type RangeField = 'from' | 'to';

export type ReadRange =
  /** Places in the display unit, rising evenly. */
  | { readonly ok: true; readonly grid: Float64Array }
  | { readonly ok: false; readonly errors: Partial<Record<RangeField, FieldError>> };

/** A range around the orbit, as texts. */
export function rangeAround(point: ReadingPoint, element: SweptElement, unit: DisplayUnit): SweepRange {
  const { from, to } = startingRange(point, element, unit.perCore);
  const text = (value: number) => String(Number((value * unit.perCore).toPrecision(9)));
  return { from: text(from), to: text(to), unit: unit.id };
}

/** The same range in another unit of the element. */
export function rangeInUnit(range: SweepRange, element: SweptElement, unit: DisplayUnit): SweepRange {
  if (range.unit === unit.id) return range;
  const factor = unit.perCore / unitOf(sweptWords[element].quantity, range.unit).perCore;
  return { from: convertedText(range.from, factor), to: convertedText(range.to, factor), unit: unit.id };
}

export interface RangeRequest {
  readonly range: SweepRange;
  readonly element: SweptElement;
  readonly point: ReadingPoint;
  readonly unit: DisplayUnit;
  /** Places at most, both ends counted. */
  readonly most: number;
}

export function readRange({ range, element, point, unit, most }: RangeRequest): ReadRange {
  const ends = { from: readEnd(range.from, 'From'), to: readEnd(range.to, 'To') };
  const { from, to } = ends;
  if (typeof from !== 'number' || typeof to !== 'number') {
    return {
      ok: false,
      errors: { ...(typeof from === 'number' ? {} : { from }), ...(typeof to === 'number' ? {} : { to }) },
    };
  }
  const { label, domain } = sweptWords[element];
  const there = domain(point);
  const [least, greatest] = [there.from * unit.perCore, there.to * unit.perCore];
  const slack = 1e-9 * Math.max(1, Math.abs(greatest));
  const lies = `${label} lies between ${boundText(least, unit)} and ${boundText(greatest, unit)}; type a value in there.`;
  const errors: Partial<Record<RangeField, FieldError>> = {};
  if (from < least - slack || from > greatest + slack) errors.from = { message: lies };
  if (to < least - slack || to > greatest + slack) errors.to = { message: lies };
  if (to <= from) {
    errors.to ??= {
      message: `The range is upside down: type an end above ${boundText(from, unit)}, or a smaller start.`,
    };
  } else if (to - from < 1e-7 * Math.max(1, Math.abs(to))) {
    errors.to ??= { message: 'The range is too narrow to draw; type an end farther from the start.' };
  }
  return Object.keys(errors).length > 0 ? { ok: false, errors } : { ok: true, grid: roundGrid(from, to, most) };
}

function readEnd(text: string, label: string): number | FieldError {
  const read = readNumber(text);
  if (read.ok) return read.value;
  const choices = read.readings?.map((reading) => ({ text: reading.text, label: reading.text }));
  return { message: `${label}: ${read.message}`, ...(choices ? { choices } : {}) };
}

const boundText = (value: number, { symbol }: DisplayUnit): string =>
  `${formatSignificant(value, 7)}${symbol === 'deg' ? '°' : ` ${symbol}`}`.trim();

/** Evenly from end to end, at round values where the ends are round. */
export function roundGrid(from: number, to: number, most: number): Float64Array {
  const steps = Math.max(8, Math.round((to - from) / roundStep(to - from, most - 1)));
  return Float64Array.from({ length: steps + 1 }, (_, index) =>
    Number((from + ((to - from) * index) / steps).toPrecision(12)),
  );
}
