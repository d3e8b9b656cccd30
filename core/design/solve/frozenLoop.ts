/**
 * Frozen orbits under further conditions.
 *
 * The frozen e hardly moves with a and i, and a and i hardly move with so small an e: solve the other conditions at an
 * e, take the frozen e there, and repeat. Each turn gains three digits or so.
 */
import { degPerRad } from '../../numerics/angles';
import { formatNumber } from '../../numerics/numberWords';
import type { MeanElements } from '../../orbit/elements';
import type { Condition } from '../conditions/condition';
import { type NoOrbit, noOrbit } from './answer';
import { meanOf, type Point, type Problem, pointOf } from './problem';

export type PointsResult = { readonly ok: true; readonly points: readonly Point[] } | NoOrbit;

const firstEccentricity = 1e-3;
const maxTurns = 12;
/** Absolute, of e. */
const settledWithin = 1e-13;

type SolveAt = (problem: Problem) => PointsResult;

export type FrozenSolutions = { readonly ok: true; readonly means: readonly MeanElements[] } | NoOrbit;

/** `solve` is the search for everything but `frozen`, with e held. */
export function frozenSolutions(problem: Problem, frozen: Condition, solve: SolveAt): FrozenSolutions {
  const rest: Problem = {
    ...problem,
    free: problem.free.filter((element) => element !== 'eccentricity'),
    conditions: problem.conditions.filter((condition) => condition !== frozen),
    start: { ...problem.start, eccentricity: firstEccentricity },
  };
  const first = solveRest(rest, solve);
  if (!first.ok) return first;
  const means: MeanElements[] = [];
  let failure: NoOrbit | null = null;
  for (const point of first.points) {
    const held = followed({ rest, frozen, solve }, point);
    if ('ok' in held) failure ??= held;
    else means.push({ ...meanOf(problem, held), perigeeRad: held.perigeeRad });
  }
  return means.length > 0 || !failure ? { ok: true, means } : failure;
}

function solveRest(rest: Problem, solve: SolveAt): PointsResult {
  return rest.free.length === 0 ? { ok: true, points: [pointOf(rest)] } : solve(rest);
}

interface Loop {
  readonly rest: Problem;
  readonly frozen: Condition;
  readonly solve: SolveAt;
}

function followed({ rest, frozen, solve }: Loop, first: Point): (Point & { readonly perigeeRad: number }) | NoOrbit {
  let point = first;
  for (let turn = 0; turn < maxTurns; turn += 1) {
    const inclinationRad = meanOf(rest, point).inclinationRad;
    const held = frozen.settle?.(point.semiMajorAxisKm, inclinationRad);
    if (!held) throw new Error('a frozen condition has to settle an eccentricity, got none');
    if (!held.ok) return noOrbit(held.converged ? 'noSolution' : 'didNotConverge', frozenText(held, point));
    if (Math.abs(held.eccentricity - point.eccentricity) <= settledWithin) {
      return { ...point, perigeeRad: held.perigeeRad };
    }
    const next = solveRest({ ...rest, start: { ...rest.start, eccentricity: held.eccentricity } }, solve);
    if (!next.ok) return next;
    point = nearestTo(point, next.points);
  }
  return noOrbit('didNotConverge', 'Frozen: the eccentricity did not converge together with the other conditions.');
}

function frozenText(
  { converged, text }: { converged: boolean; text: string },
  { semiMajorAxisKm, theta }: Point,
): string {
  const degrees = formatNumber(Math.acos(Math.min(1, Math.max(-1, theta))) * degPerRad, { digits: 3 });
  const said = converged ? '' : ' (the search did not converge)';
  return `Frozen at a ${formatNumber(semiMajorAxisKm, { digits: 3 })} km and i ${degrees}°: ${text}${said}.`;
}

function nearestTo({ semiMajorAxisKm, theta }: Point, points: readonly Point[]): Point {
  const distance = (other: Point) => Math.hypot(Math.log(other.semiMajorAxisKm / semiMajorAxisKm), other.theta - theta);
  return points.reduce((best, other) => (distance(other) < distance(best) ? other : best));
}
