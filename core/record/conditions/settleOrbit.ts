/**
 * Lets the conditions of a candidate settle its elements, starting from the orbit as typed.
 *
 * Each condition settles one element; the others are held as typed. What comes out is one orbit with the
 * elements that were settled, or the reason why there is none, at the condition that is in the way.
 */
import { solveOrbit } from '../../design/solveOrbit';
import { clashText, wishNames } from '../../design/wishClash';
import type { MeanElements } from '../../orbit/elements';
import type { Candidate } from '../candidate';
import type { ResolvedOrbit } from '../resolved';
import { elementNames, type SettledElement, settledElements } from './kinds';
import { type ReadCondition, readConditions } from './readConditions';

export type Settlement =
  | {
      readonly ok: true;
      readonly conditions: readonly ReadCondition[];
      readonly orbit: ResolvedOrbit;
      readonly settled: readonly SettledElement[];
      /** Every orbit that meets the conditions, the one taken among them. */
      readonly all: readonly MeanElements[];
      /** What was changed in reading the wishes, in words. */
      readonly notes: readonly string[];
    }
  | {
      readonly ok: false;
      readonly conditions: readonly ReadCondition[];
      /** Why no orbit meets the conditions, in words with the numbers; empty where a field is in the way. */
      readonly message: string;
      /** The nearest thing that exists. */
      readonly nearest: MeanElements | null;
    };

/** Settles the conditions of a candidate whose entry came to `start`. */
export function settleOrbit(candidate: Candidate, start: ResolvedOrbit): Settlement {
  const conditions = readConditions(candidate);
  const readable = conditions.flatMap((each) => (each.ok ? [each] : []));
  if (readable.length < conditions.length) return { ok: false, conditions, message: '', nearest: null };
  const settled = readable.map(({ entry }) => entry.settles);
  const twice = settled.find((element, index) => settled.indexOf(element) !== index);
  if (twice !== undefined) return { ok: false, conditions, message: twiceText(readable, twice, start), nearest: null };
  const result = solveOrbit({
    body: start.body,
    theory: 'second',
    start: start.mean,
    free: settled,
    conditions: readable.map(({ condition }) => condition),
  });
  if (!result.ok) return { ok: false, conditions, message: result.reason.text, nearest: result.nearest ?? null };
  const isFrozen = readable.some(({ condition }) => condition.kind === 'frozen');
  const orbit: ResolvedOrbit = { ...start, mean: result.mean, ...(isFrozen ? { frozen: true } : {}) };
  return { ok: true, conditions, orbit, settled, all: result.all, notes: result.notes };
}

type Readable = Extract<ReadCondition, { readonly ok: true }>;

/** Which wishes settle one and the same element, and what to do about it; first of all that they clash, if they do. */
function twiceText(readable: readonly Readable[], twice: SettledElement, { body }: ResolvedOrbit): string {
  const context = { body, theory: 'second' } as const;
  const wishes = readable.map(({ condition }) => condition);
  const clash = clashText(wishes, context);
  if (clash !== null) return clash;
  const onOne = readable.filter(({ entry }) => entry.settles === twice).map(({ condition }) => condition);
  const count = ['Two', 'Three', 'Four'][onOne.length - 2] ?? String(onOne.length);
  const opening = `${count} conditions settle ${elementNames[twice]}, ${wishNames(onOne, context)}`;
  if (readable.length > settledElements.length) {
    return `${opening}: ${readable.length} conditions cannot be met by ${settledElements.length} elements; drop one.`;
  }
  const open = settledElements.filter((element) => !readable.some(({ entry }) => entry.settles === element));
  const others = open.map((element) => elementNames[element]).join(' or ');
  return `${opening}: let one of them settle ${others}, or drop one.`;
}
