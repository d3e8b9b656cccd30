/** What a sweep draws and says, in display units. Pure. */
import {
  type Limit,
  type LimitMargin,
  limitText,
  marginLeft,
  placeText,
  type Quantity,
  type Reading,
  type Sweep,
  type SweepWriting,
  signedQuantities,
  sweptWords,
  unitOf,
} from '../../../core/index';
import type { PlotLevel, PlotLine, PlotModel } from '../../parts/plotModel';
import { closeRange, valueTicks } from '../../parts/plotScale';
import { quantityText } from '../../parts/readingText';

export type LimitOf = Pick<LimitMargin, 'entry' | 'limit'>;

export interface SweepShown {
  readonly sweep: Sweep;
  readonly reading: Pick<Reading, 'label' | 'quantity' | 'mark' | 'value'>;
  /** Places in the display unit of the element. */
  readonly grid: Float64Array;
  readonly writing: SweepWriting & { readonly limits: readonly LimitOf[] };
}

/** A clock has no unit of its own; on an axis it is hours. */
const perCoreOf = (quantity: Quantity, unit: string | undefined): number => unitOf(quantity, unit).perCore;

const marks = { node: 'square', perigee: 'diamond', none: 'circle' } as const;

export function sweepModel({ sweep, reading, grid, writing }: SweepShown): PlotModel {
  const perCore = perCoreOf(reading.quantity, writing.readingUnit);
  const look = { hue: reading.mark === 'none' ? 'ink' : reading.mark, mark: marks[reading.mark], weak: false } as const;
  const inUnit = (values: Float64Array) => values.map((value) => value * perCore);
  const lines: PlotLine[] = sweep.first
    ? [
        { id: 'first', values: inUnit(sweep.first), pattern: 'first', label: ['1st', ' order'], ...look },
        { id: 'second', values: inUnit(sweep.values), pattern: 'second', label: ['2nd', ' order'], ...look },
      ]
    : [{ id: 'value', values: inUnit(sweep.values), pattern: 'geometry', label: ['', ''], ...look }];
  const { digits } = unitOf(reading.quantity, writing.readingUnit);
  const range = closeRange(
    lines.map(({ values }) => values),
    writing.limits.map(({ limit }) => limit.value * perCore),
    20 * 10 ** -digits,
  );
  const { element, point } = sweep.request;
  const elementPerCore = perCoreOf(sweptWords[element].quantity, writing.elementUnit);
  return {
    x: grid,
    lines,
    range,
    levels: writing.limits.map((limit, index) => levelOf(limit, index, writing, perCore)),
    point: { x: sweptWords[element].valueOf(point) * elementPerCore, value: reading.value * perCore },
    xTicks: (most) => valueTicks({ least: grid[0] ?? 0, greatest: grid.at(-1) ?? 1 }, most, { plus: false }),
    hasXLabels: true,
    isSigned: signedQuantities.has(reading.quantity),
  };
}

function levelOf(limit: LimitOf, index: number, writing: SweepWriting, perCore: number): PlotLevel {
  return {
    id: `limit${index}`,
    at: limit.limit.value * perCore,
    beyond: limit.limit.bound === 'atMost' ? 'above' : 'below',
    label: limitText({ ok: true, place: 0, ...limit }, writing.readingUnit),
  };
}

/** One place of the sweep in words. */
export interface SweepRow {
  readonly place: string;
  readonly value: string;
  readonly first: string | null;
  /** Which limits the reading breaks there. */
  readonly broken: readonly string[];
}

export function sweepRow({ sweep, reading, writing }: SweepShown, sample: number): SweepRow {
  const value = sweep.values[sample] ?? Number.NaN;
  const write = (core: number) =>
    Number.isFinite(core) ? quantityText(reading.quantity, core, writing.readingUnit).value : 'no such orbit';
  return {
    place: placeText(sweep, sweep.request.places[sample] ?? 0, writing),
    value: write(value),
    first: sweep.first ? write(sweep.first[sample] ?? Number.NaN) : null,
    broken: writing.limits
      .filter(({ limit }) => isBroken(limit, value))
      .map((limit) => limitText({ ok: true, place: 0, ...limit }, writing.readingUnit)),
  };
}

const isBroken = (limit: Limit, value: number): boolean => marginLeft(limit, value) < 0;

/** What the cursor reads out. */
export function cursorText(shown: SweepShown, sample: number): string {
  const { value, first, broken } = sweepRow(shown, sample);
  const { unit } = quantityText(shown.reading.quantity, 0, shown.writing.readingUnit);
  const breaks = broken.length > 0 ? `; breaks your limit ${broken.join(' and ')}` : '';
  return `${value}${unit === '' ? '' : ` ${unit}`}${first === null ? '' : `, first order ${first}`}${breaks}`;
}

/** Samples of a table of about nine rows, both ends among them. */
export function tableSamples(length: number): number[] {
  const rows = Math.min(9, length);
  return Array.from({ length: rows }, (_, row) => Math.round((row * (length - 1)) / (rows - 1)));
}

/** The sample nearest to a value. */
export function nearestSample(grid: Float64Array, value: number): number {
  const [first, last] = [grid[0] ?? 0, grid.at(-1) ?? 1];
  const place = Math.round(((value - first) / (last - first)) * (grid.length - 1));
  return Math.max(0, Math.min(grid.length - 1, place));
}
