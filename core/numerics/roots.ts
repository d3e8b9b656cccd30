/**
 * All roots of a function over a sampled interval.
 *
 * Every change of sign between neighbouring samples gives a bracket. Where three samples of one sign dip towards zero, the
 * lowest point is sought: it may touch zero, or cross it twice. Two roots within one interval that leave no dip in the
 * samples are missed: the grid has to be finer than the function's own turns. NaN means "not defined here".
 */
import { rootInBracket } from './bracket';

export interface GridRoots {
  readonly roots: readonly number[];
  /** The sample, or the bottom of a dip, whose value is smallest; null where the function is nowhere defined. */
  readonly least: { readonly x: number; readonly value: number } | null;
  /** The largest size of a sample; 0 where the function is nowhere defined. */
  readonly greatest: number;
  /** Changes of sign that led to no root and to no pole. */
  readonly unresolved: number;
}

export interface RootOptions {
  /** Values at or below this count as zero where the function touches zero without crossing it. */
  readonly touching: number;
}

interface Sample {
  readonly x: number;
  readonly value: number;
}

interface Gathered {
  readonly roots: number[];
  least: Sample | null;
  greatest: number;
  unresolved: number;
}

/** Roots in rising order of the grid. */
export function rootsOnGrid(f: (x: number) => number, grid: ArrayLike<number>, options: RootOptions): GridRoots {
  const found: Gathered = { roots: [], least: null, greatest: 0, unresolved: 0 };
  let before: Sample | null = null;
  let here: Sample | null = null;
  for (let index = 0; index < grid.length; index += 1) {
    const x = grid[index] as number;
    const value = f(x);
    const next = Number.isFinite(value) ? { x, value } : null;
    if (next) {
      noteLeast(found, next);
      found.greatest = Math.max(found.greatest, Math.abs(value));
    }
    if (here && next && here.value * next.value < 0) noteBetween(f, { left: here, right: next }, found);
    if (before && here && next) {
      if (isLow(before, here, next)) noteDip(f, { left: before, middle: here, right: next }, options, found);
    } else if (here) noteEnd(here, options, found);
    before = here;
    here = next;
  }
  if (here) noteEnd(here, options, found);
  return { ...found, roots: found.roots.sort((p, q) => p - q) };
}

function noteLeast(found: Gathered, sample: Sample): void {
  if (!found.least || Math.abs(sample.value) < Math.abs(found.least.value)) found.least = sample;
}

function noteBetween(
  f: (x: number) => number,
  { left, right }: { left: Sample; right: Sample },
  found: Gathered,
): void {
  const result = rootInBracket(f, { low: left.x, high: right.x, atLow: left.value, atHigh: right.value });
  if (result.ok) {
    found.roots.push(result.x);
    noteLeast(found, result);
  } else if (result.reason === 'didNotConverge') found.unresolved += 1;
}

/** An end of the stretch where the function is defined may itself be a root, to rounding. */
function noteEnd(sample: Sample, { touching }: RootOptions, found: Gathered): void {
  if (Math.abs(sample.value) <= touching) found.roots.push(sample.x);
}

interface Dip {
  readonly left: Sample;
  readonly middle: Sample;
  readonly right: Sample;
}

/** Zero itself, or nearer to it than both neighbours on the same side. */
function isLow(left: Sample, middle: Sample, right: Sample): boolean {
  const size = Math.abs(middle.value);
  if (size === 0) return true;
  if (left.value * middle.value <= 0 || right.value * middle.value <= 0) return false;
  return size <= Math.abs(left.value) && size <= Math.abs(right.value);
}

function noteDip(f: (x: number) => number, dip: Dip, options: RootOptions, found: Gathered): void {
  const { left, middle, right } = dip;
  if (middle.value === 0) {
    found.roots.push(middle.x);
    return;
  }
  if (!mayReachZero(dip)) return;
  const bottom = bottomOfDip(f, dip);
  if (!bottom) return;
  noteLeast(found, bottom);
  if (bottom.value * middle.value < 0) {
    noteBetween(f, { left, right: bottom }, found);
    noteBetween(f, { left: bottom, right }, found);
  } else if (Math.abs(bottom.value) <= options.touching) found.roots.push(bottom.x);
}

/** The parabola through the three samples comes within half the dip's depth of zero, or crosses it. */
function mayReachZero({ left, middle, right }: Dip): boolean {
  const sign = Math.sign(middle.value);
  const hl = left.x - middle.x;
  const hr = right.x - middle.x;
  const sl = (left.value - middle.value) / hl;
  const sr = (right.value - middle.value) / hr;
  const curvature = (sr - sl) / (hr - hl);
  const slope = sl - curvature * hl;
  if (curvature * sign <= 0) return false;
  const bottom = sign * (middle.value - (slope * slope) / (4 * curvature));
  const depth = Math.max(Math.abs(left.value), Math.abs(right.value)) - bottom;
  return bottom <= 0.5 * depth;
}

const goldenShare = (3 - Math.sqrt(5)) / 2;

/** Golden-section search on |f|; ends at once where the sign turns. */
function bottomOfDip(f: (x: number) => number, dip: Dip): Sample | null {
  const sign = Math.sign(dip.middle.value);
  let { x: low } = dip.left;
  let { x: high } = dip.right;
  let best = dip.middle;
  for (let step = 0; step < 80 && high - low > 1e-9 * (Math.abs(low) + Math.abs(high)); step += 1) {
    const wider = high - best.x > best.x - low;
    const x = wider ? best.x + goldenShare * (high - best.x) : best.x - goldenShare * (best.x - low);
    const value = f(x);
    if (!Number.isFinite(value)) return null;
    if (value * sign < Math.abs(best.value)) {
      if (wider) low = best.x;
      else high = best.x;
      best = { x, value };
      if (value * sign <= 0) return best;
    } else if (wider) high = x;
    else low = x;
  }
  return best;
}
