/**
 * The zero of a function nearest to 0 within ±most, found by walking outwards on both sides at once.
 *
 * Walking outwards meets zeros in the order of their size, so that the first bracket holds the answer. Steps widen with
 * the square of the distance: fine where zeros are expected to lie close together, coarse where they are not. A pair of
 * zeros between two steps is not seen.
 */
import { type RootResult, rootInBracket } from '../numerics/bracket';

export type NearestRoot =
  | { readonly ok: true; readonly x: number }
  | { readonly ok: false; readonly reason: 'none' }
  | { readonly ok: false; readonly reason: 'notConverged'; readonly near: number };

type Point = { readonly x: number; readonly value: number };

const steps = 32;

/** Looks within [−most, most]; `f` must be finite and continuous there. */
export function nearestRoot(f: (x: number) => number, most: number): NearestRoot {
  const middle: Point = { x: 0, value: f(0) };
  if (middle.value === 0) return { ok: true, x: 0 };
  let [right, left] = [middle, middle];
  for (let step = 1; step <= steps; step += 1) {
    const x = most * (step / steps) ** 2;
    const [beyondRight, beyondLeft] = [pointAt(f, x), pointAt(f, -x)];
    const found = [between(f, right, beyondRight), between(f, left, beyondLeft)].filter((result) => result !== null);
    const roots = found.flatMap((result) => (result.ok ? [result.x] : []));
    const [first] = roots.sort((one, other) => Math.abs(one) - Math.abs(other));
    if (first !== undefined) return { ok: true, x: first };
    if (found.length > 0) return { ok: false, reason: 'notConverged', near: x };
    [right, left] = [beyondRight, beyondLeft];
  }
  return { ok: false, reason: 'none' };
}

function pointAt(f: (x: number) => number, x: number): Point {
  return { x, value: f(x) };
}

/** The zero between two points, or null where the sign does not change. */
function between(f: (x: number) => number, from: Point, to: Point): RootResult | null {
  if (from.value * to.value > 0) return null;
  return rootInBracket(f, { low: from.x, high: to.x, atLow: from.value, atHigh: to.value });
}
