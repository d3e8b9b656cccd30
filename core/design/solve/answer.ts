/** What `solveOrbit` gives back. */
import type { MeanElements } from '../../orbit/elements';

/**
 * `badInput`: a number or name makes no sense; `missing`: the body lacks a constant; `tooMany`, `tooFew`: conditions do
 * not match the free elements in number; `conflict`, `redundant`: two conditions cannot both count; `held`: what a
 * condition turns on is held; `undetermined`: every orbit along a line meets them; `noSolution`: there is none;
 * `didNotConverge`: there may be one, and it was not found.
 */
export type ReasonKind =
  | 'badInput'
  | 'missing'
  | 'tooMany'
  | 'tooFew'
  | 'conflict'
  | 'redundant'
  | 'held'
  | 'undetermined'
  | 'noSolution'
  | 'didNotConverge';

export interface NoOrbitReason {
  readonly kind: ReasonKind;
  /** In words, with the numbers. */
  readonly text: string;
  /** Which of the conditions asked for it is about, by their place; empty where it is about all. */
  readonly conditions: readonly number[];
}

export interface SolvedOrbit {
  readonly ok: true;
  /** Of `all`, the one nearest to the start. */
  readonly mean: MeanElements;
  /** Every solution, nearest to the start first. */
  readonly all: readonly MeanElements[];
  /** What was changed in reading the conditions, and what to know about the orbit. */
  readonly notes: readonly string[];
}

export interface NoOrbit {
  readonly ok: false;
  readonly reason: NoOrbitReason;
  /** The nearest thing that exists. */
  readonly nearest?: MeanElements;
}

export type SolveResult = SolvedOrbit | NoOrbit;

export function noOrbit(kind: ReasonKind, text: string, conditions: readonly number[] = []): NoOrbit {
  return { ok: false, reason: { kind, text, conditions } };
}
