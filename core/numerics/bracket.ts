/**
 * One root between two points of opposite sign.
 *
 * Chandrupatla, Adv. Eng. Software 28, 145 (1997), from memory: inverse quadratic interpolation where it is safe, halving
 * where it is not. Never leaves the bracket, never slower than a few times halving.
 */
export interface Bracket {
  readonly low: number;
  readonly high: number;
  readonly atLow: number;
  readonly atHigh: number;
}

export type RootResult =
  | { readonly ok: true; readonly x: number; readonly value: number }
  /** `noSignChange`: there is nothing to look for. `pole`: the sign changes through a jump. */
  | { readonly ok: false; readonly reason: 'noSignChange' | 'pole' | 'didNotConverge' };

const maxSteps = 120;
/** A root's value is far below those at the ends of its bracket; that of a jump is not. */
const poleShare = 1e-3;

/** The root of `f` in the bracket, to the rounding of x. Values that are not finite end the search. */
export function rootInBracket(f: (x: number) => number, bracket: Bracket): RootResult {
  const { low, high, atLow, atHigh } = bracket;
  if (atLow === 0) return { ok: true, x: low, value: 0 };
  if (atHigh === 0) return { ok: true, x: high, value: 0 };
  if (!(atLow * atHigh < 0)) return { ok: false, reason: 'noSignChange' };
  const largest = Math.max(Math.abs(atLow), Math.abs(atHigh));
  // a is the newest point, b the other end of the bracket, c the one before.
  let [b, a, fb, fa] = [low, high, atLow, atHigh];
  let c = b;
  let fc = fb;
  let share = 0.5;
  for (let step = 0; step < maxSteps; step += 1) {
    const x = a + share * (b - a);
    const fx = f(x);
    if (!Number.isFinite(fx)) return { ok: false, reason: 'didNotConverge' };
    [c, fc] = [a, fa];
    if (fx > 0 !== fa > 0) [c, fc, b, fb] = [b, fb, a, fa];
    [a, fa] = [x, fx];
    const [best, value] = Math.abs(fa) < Math.abs(fb) ? [a, fa] : [b, fb];
    const finest = (2 * Number.EPSILON * Math.abs(best) + Number.MIN_VALUE) / Math.abs(b - a);
    if (value === 0 || finest > 0.5) {
      return Math.abs(value) > poleShare * largest ? { ok: false, reason: 'pole' } : { ok: true, x: best, value };
    }
    share = Math.min(1 - finest, Math.max(finest, nextShare({ a, b, c, fa, fb, fc })));
  }
  return { ok: false, reason: 'didNotConverge' };
}

interface Triple {
  readonly a: number;
  readonly b: number;
  readonly c: number;
  readonly fa: number;
  readonly fb: number;
  readonly fc: number;
}

/** Where to look next, as a share of the way from a to b. */
function nextShare({ a, b, c, fa, fb, fc }: Triple): number {
  const xi = (a - b) / (c - b);
  const phi = (fa - fb) / (fc - fb);
  if (!(phi * phi < xi && (1 - phi) * (1 - phi) < 1 - xi)) return 0.5;
  return (fa / (fb - fa)) * (fc / (fb - fc)) + ((c - a) / (b - a)) * (fa / (fc - fa)) * (fb / (fc - fb));
}
