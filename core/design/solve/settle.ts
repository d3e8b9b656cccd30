/** From candidates to solutions: each checked against every condition, polished where rounding needs it, none twice. */
import { dampedNewton } from '../../numerics/newton';
import { isInDomain, largestResidual, type Point, type Problem, pointOf, residualsAt } from './problem';
import type { Search } from './search';

export interface Settlement {
  readonly solutions: readonly Point[];
  /** Candidates that meet all but the limits of their branch or of the domain. */
  readonly rejected: readonly Point[];
  /** Some search ended without an answer either way. */
  readonly inDoubt: boolean;
}

/** Residuals that a solution may have; in doubles, 1e-15 to 1e-13 is usual. */
const accepted = 1e-11;
/** A residual this small away from a solution means that one is near, or that the search failed beside it. */
export const suspicious = 1e-7;
/** cos i this far beyond ±1 may be rounding, where the conditions hardly tell one orbit from the next; they judge. */
const edge = 1e-7;

export function settled(problem: Problem, found: Search): Settlement {
  const solutions: Point[] = [];
  const rejected: Point[] = [];
  let inDoubt = found.unresolved > 0;
  for (const candidate of found.candidates) {
    const outcome = checked(problem, candidate);
    if (outcome.solution) keep(solutions, outcome.solution);
    else rejected.push(candidate);
    inDoubt ||= outcome.inDoubt;
  }
  if (solutions.length > 0) return { solutions, rejected, inDoubt: false };
  for (const start of [...found.closest, ...found.candidates, pointOf(problem)]) {
    const outcome = newtonFrom(problem, start);
    if (outcome.solution) keep(solutions, outcome.solution);
    inDoubt ||= outcome.inDoubt;
  }
  return { solutions, rejected, inDoubt };
}

interface Outcome {
  readonly solution: Point | null;
  readonly inDoubt: boolean;
}

const nothing: Outcome = { solution: null, inDoubt: false };

function checked(problem: Problem, candidate: Point): Outcome {
  const point = withinEdge(candidate);
  const residual = largestResidual(problem, point);
  if (residual <= accepted) return { solution: isInDomain(problem.body, point) ? point : null, inDoubt: false };
  return residual < suspicious ? newtonFrom(problem, point) : nothing;
}

function withinEdge(point: Point): Point {
  const beyond = Math.abs(point.theta) - 1;
  return beyond > 0 && beyond < edge ? { ...point, theta: Math.sign(point.theta) } : point;
}

/** Newton over the free elements: ln a, e and cos i, each within its own limits. */
function newtonFrom(problem: Problem, start: Point): Outcome {
  if (!isInDomain(problem.body, start)) return nothing;
  const { free } = problem;
  const pointFrom = (x: readonly number[]): Point => {
    const entry = (name: (typeof free)[number], held: number) => x[free.indexOf(name)] ?? held;
    return {
      semiMajorAxisKm: Math.exp(entry('semiMajorAxisKm', Math.log(start.semiMajorAxisKm))),
      eccentricity: entry('eccentricity', start.eccentricity),
      theta: entry('inclinationRad', start.theta),
    };
  };
  const logged = {
    semiMajorAxisKm: Math.log(start.semiMajorAxisKm),
    eccentricity: start.eccentricity,
    inclinationRad: start.theta,
  };
  const result = dampedNewton({
    start: free.map((name) => logged[name]),
    scales: free.map(() => 1),
    maxStep: 0.2,
    tolerance: accepted / 10,
    maxIterations: 30,
    residuals: (x) => {
      const point = pointFrom(x);
      return isInDomain(problem.body, point) ? residualsAt(problem, point) : null;
    },
  });
  if (result.converged) return { solution: pointFrom(result.x), inDoubt: false };
  if (result.residual <= accepted) return { solution: pointFrom(result.x), inDoubt: false };
  return { solution: null, inDoubt: result.residual < suspicious };
}

const sameAxisShare = 1e-7;
const sameEccentricity = 1e-6;
const sameTheta = 1e-8;

function keep(solutions: Point[], point: Point): void {
  const known = solutions.some(
    (other) =>
      Math.abs(other.semiMajorAxisKm / point.semiMajorAxisKm - 1) < sameAxisShare &&
      Math.abs(other.eccentricity - point.eccentricity) < sameEccentricity &&
      Math.abs(other.theta - point.theta) < sameTheta,
  );
  if (!known) solutions.push(point);
}
