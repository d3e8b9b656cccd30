/**
 * From wishes to orbits: the elements that meet conditions on node, perigee, track and altitude, all of them.
 *
 * Closed-form rates of either order, mean elements. As many conditions as free elements. Altitudes tie a and e, a rate
 * gives cos i from its polynomial, a period gives a; what is left is sought along one line with brackets, so that every
 * solution is found and none is taken for one that is not.
 */
import type { Body } from '../bodies/body';
import type { MeanElements, Theory } from '../orbit/elements';
import type { OrbitCondition } from './conditions/registry';
import type { SolveResult } from './solve/answer';
import { conflictBetween, mismatch, withoutTwoPeriods } from './solve/conflicts';
import { explained, type Failure } from './solve/explain';
import { frozenSolutions, type PointsResult } from './solve/frozenLoop';
import { inputProblem } from './solve/inputProblem';
import { preparedAll } from './solve/prepared';
import { type FreeElement, meanOf, type Problem } from './solve/problem';
import { repeatPeriodText } from './solve/repeatPeriod';
import { dividedProblem, search } from './solve/search';
import { settled } from './solve/settle';
import { surfaceNotes } from './solve/surfaceNotes';

export interface SolveInput {
  readonly body: Body;
  readonly theory: Theory;
  /** Mean elements (km, rad): held elements are taken from here, and the nearest solution is nearest to this. */
  readonly start: MeanElements;
  readonly free: readonly FreeElement[];
  readonly conditions: readonly OrbitCondition[];
}

/** Every orbit that meets the conditions; or why there is none, and the nearest thing that exists. Never throws on input. */
export function solveOrbit(input: SolveInput): SolveResult {
  const answer = solved(input);
  if (answer.ok || !(answer.reason.kind === 'noSolution' || answer.reason.kind === 'conflict')) return answer;
  const more = repeatPeriodText(input, solved);
  return more === null ? answer : { ...answer, reason: { ...answer.reason, text: `${answer.reason.text} ${more}` } };
}

function solved(input: SolveInput): SolveResult {
  const bad = inputProblem(input);
  if (bad) return bad;
  const prepared = preparedAll(input.conditions, input);
  if ('ok' in prepared) return prepared;
  const conflict = conflictBetween(prepared) ?? mismatch(prepared, input.free);
  if (conflict) return conflict;
  const conditions = withoutTwoPeriods(prepared, input.body);
  const implied = conditions === prepared ? null : conflictBetween(conditions);
  if (implied) return implied;
  const { body, theory, start, free } = input;
  const problem: Problem = { body, theory, start, free, conditions };
  const frozen = conditions.find(({ family }) => family === 'frozen');
  const found = frozen ? frozenSolutions(problem, frozen, solvedPoints) : plainSolutions(problem);
  if (!found.ok) return found;
  const all = [...found.means].sort((one, other) => distance(input, one) - distance(input, other));
  const [mean] = all;
  if (!mean) throw new Error('expected a solution or a reason, got neither');
  const held = frozen?.settle?.(mean.semiMajorAxisKm, mean.inclinationRad);
  const notes = [...prepared.flatMap((each) => each.notes), ...(held?.ok ? held.notes : [])];
  return { ok: true, mean, all, notes: [...notes, ...surfaceNotes(body, mean)] };
}

function plainSolutions(problem: Problem) {
  const found = solvedPoints(problem);
  return found.ok ? { ok: true as const, means: found.points.map((point) => meanOf(problem, point)) } : found;
}

/** Before it is said that there is none, the search is made again this much finer. */
const finer = 8;

function solvedPoints(problem: Problem): PointsResult {
  const first = attempt(problem, 1);
  if (isAnswer(first)) return { ok: true, points: first.settlement.solutions };
  const last = first.holdsEverywhere || first.division.shapes.kind === 'single' ? first : attempt(problem, finer);
  return isAnswer(last) ? { ok: true, points: last.settlement.solutions } : explained(last);
}

function attempt(problem: Problem, density: number): Failure {
  const division = dividedProblem(problem, density);
  const found = search(division);
  return { problem, division, settlement: settled(problem, found), holdsEverywhere: found.holdsEverywhere };
}

function isAnswer({ settlement, holdsEverywhere }: Failure): boolean {
  return settlement.solutions.length > 0 && !holdsEverywhere;
}

/** Logarithm of a, e and i count alike: 1 is a large change of each. */
function distance({ start, free }: SolveInput, mean: MeanElements): number {
  const apart = (element: FreeElement, change: number) =>
    free.includes(element) && Number.isFinite(change) ? change : 0;
  return Math.hypot(
    apart('semiMajorAxisKm', Math.log(mean.semiMajorAxisKm / start.semiMajorAxisKm)),
    apart('eccentricity', mean.eccentricity - start.eccentricity),
    apart('inclinationRad', mean.inclinationRad - start.inclinationRad),
  );
}
