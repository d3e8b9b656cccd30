/** Ranges and round ticks for an axis of values. Pure; any unit. */
import { formatNumber } from '../../core/index';

export interface Tick {
  readonly at: number;
  readonly text: string;
}

export interface Range {
  readonly least: number;
  readonly greatest: number;
}

/** Room above and below the lines, as a part of the range, so that no line runs along the edge. */
const margin = 0.1;

/**
 * The range that holds zero and all values, with a margin; at least `smallest` wide, so that
 * rounding noise on a line that stands still is not drawn as a slope.
 */
export function valueRange(lines: readonly ArrayLike<number>[], smallest: number): Range {
  let least = 0;
  let greatest = 0;
  for (const line of lines) {
    for (let k = 0; k < line.length; k += 1) {
      const value = line[k] ?? 0;
      if (value < least) least = value;
      if (value > greatest) greatest = value;
    }
  }
  if (greatest - least < smallest) return { least: -smallest / 2, greatest: smallest / 2 };
  const room = (greatest - least) * margin;
  return { least: least - room, greatest: greatest + room };
}

/** The range that holds all values that are numbers, and with them those of the others that widen it to at most twice itself. */
export function closeRange(lines: readonly ArrayLike<number>[], others: readonly number[], smallest: number): Range {
  const known = lines.flatMap((line) => Array.from(line)).filter(Number.isFinite);
  let [least, greatest] = known.length > 0 ? [Math.min(...known), Math.max(...known)] : [0, 0];
  const reach = Math.max(greatest - least, smallest);
  for (const other of others) {
    if (other < least - reach || other > greatest + reach) continue;
    least = Math.min(least, other);
    greatest = Math.max(greatest, other);
  }
  const middle = (least + greatest) / 2;
  const half = Math.max(greatest - least, smallest) * (0.5 + margin);
  return { least: middle - half, greatest: middle + half };
}

/** The step of 1, 2 or 5 times a power of ten that puts at most `most` ticks on the range. */
export function roundStep(width: number, most: number): number {
  const rough = width / Math.max(1, most);
  const power = 10 ** Math.floor(Math.log10(rough));
  return power * ([1, 2, 5].find((factor) => factor * power >= rough) ?? 10);
}

/** Ticks at round values inside the range, written with a sign where they are changes. */
export function valueTicks({ least, greatest }: Range, most: number, { plus }: { readonly plus: boolean }): Tick[] {
  const step = roundStep(greatest - least, most);
  const digits = Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
  const ticks: Tick[] = [];
  for (let k = Math.ceil(least / step); k * step <= greatest; k += 1) {
    ticks.push({ at: k * step, text: k === 0 ? '0' : formatNumber(k * step, { digits, plus }) });
  }
  return ticks;
}

/** How far up the range a value lies: 0 at its foot, 1 at its head. */
export function heightIn({ least, greatest }: Range, value: number): number {
  return (value - least) / (greatest - least);
}
