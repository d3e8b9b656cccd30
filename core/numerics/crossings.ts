/**
 * Where a function changes sign over a grid, and which way.
 *
 * For functions that turn slowly against the grid: two changes within one interval are not seen. A stretch of zeros counts
 * once, where it begins, and only if the sign behind it differs from that before it.
 */
import { rootInBracket } from './bracket';

export interface Crossing {
  readonly x: number;
  readonly rising: boolean;
}

/** Crossings in the order of the grid, to the rounding of x. */
export function crossingsOnGrid(f: (x: number) => number, grid: ArrayLike<number>): readonly Crossing[] {
  const found: Crossing[] = [];
  // The last sample that is not zero, and where the zeros after it began.
  let before: { readonly x: number; readonly value: number } | null = null;
  let zeroFrom: number | null = null;
  for (let index = 0; index < grid.length; index += 1) {
    const x = grid[index] as number;
    const value = f(x);
    if (value === 0) {
      zeroFrom ??= x;
      continue;
    }
    if (before && before.value * value < 0) {
      const at = zeroFrom ?? crossingBetween(f, before, { x, value });
      if (at !== null) found.push({ x: at, rising: value > 0 });
    }
    before = { x, value };
    zeroFrom = null;
  }
  return found;
}

interface Point {
  readonly x: number;
  readonly value: number;
}

/** Null where the sign changes by a jump. */
function crossingBetween(f: (x: number) => number, low: Point, high: Point): number | null {
  const result = rootInBracket(f, { low: low.x, high: high.x, atLow: low.value, atHigh: high.value });
  return result.ok ? result.x : null;
}

/** The first place between where `holds` is false and where it is true, to `within`; by halving. */
export function turningPlace(
  holds: (x: number) => boolean,
  { from, to, within }: { readonly from: number; readonly to: number; readonly within: number },
): number {
  const atStart = holds(from);
  let [low, high] = [from, to];
  while (Math.abs(high - low) > within) {
    const middle = 0.5 * (low + high);
    if (middle === low || middle === high) break;
    if (holds(middle) === atStart) low = middle;
    else high = middle;
  }
  return 0.5 * (low + high);
}
