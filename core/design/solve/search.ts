/** Every orbit that meets the conditions, by one search along at most one line of shapes. */

import { type GridRoots, rootsOnGrid } from '../../numerics/roots';
import { type Condition, residualOf } from '../conditions/condition';
import type { ShapeRates } from '../shapeRates';
import { type ThetaRule, thetaBranches } from './inclinations';
import { type Line, type Shapes, shapesLeft } from './lines';
import { floorKm, type Point, type Problem, pointOf, ratesOf, searchShare } from './problem';

export interface Search {
  /** Where the search says all conditions hold; still to be checked, since branches run on beyond their ends. */
  readonly candidates: readonly Point[];
  /** Where the last condition came closest along each branch. */
  readonly closest: readonly Point[];
  /** The last condition, where it holds all along a branch. */
  readonly holdsEverywhere: Condition | null;
  /** Changes of sign that led nowhere. */
  readonly unresolved: number;
}

/** What is left to do at the shapes: which condition gives θ, and which is sought along the line. */
export interface Division {
  readonly shapes: Shapes;
  readonly thetaFrom: Condition | null;
  readonly rules: readonly ThetaRule[];
  readonly sought: Condition | null;
}

/** Values of a residual that count as zero where it touches zero or ends. */
const touching = 2e-13;
const zeroEverywhere = 1e-11;

export function dividedProblem(problem: Problem, density = 1): Division {
  const shapes = shapesLeft(problem, { density, share: searchShare });
  const spent = shapes.kind === 'line' ? shapes.line.spent : null;
  const rest = problem.conditions.filter((condition) => condition.family !== 'altitude' && condition !== spent);
  const { theta } = pointOf(problem);
  const held: readonly ThetaRule[] = [() => theta];
  if (!problem.free.includes('inclinationRad')) {
    return { shapes, thetaFrom: null, rules: held, sought: rest[0] ?? null };
  }
  const thetaFrom =
    rest.find(({ family }) => family === 'node') ?? rest.find(({ family }) => family === 'perigee') ?? null;
  const sought = rest.find((condition) => condition !== thetaFrom) ?? null;
  return { shapes, thetaFrom, rules: thetaFrom ? branchesOf(problem, thetaFrom) : [], sought };
}

/** Near the floor, and there more than anywhere, J4 may bend the rates so that further branches exist. */
const probes = [0, 0.5, 0.9];

function branchesOf(problem: Problem, condition: Condition): readonly ThetaRule[] {
  const low = searchShare * floorKm(problem.body);
  const shapes = probes.map((e) => ratesOf(problem, { semiMajorAxisKm: low / (1 - e * e), eccentricity: e }));
  return thetaBranches(condition).filter((rule) => shapes.some((shape) => shape && !Number.isNaN(rule(shape))));
}

export function search(division: Division): Search {
  const { shapes, rules, sought } = division;
  const found: Gathered = { candidates: [], closest: [], holdsEverywhere: null, unresolved: 0 };
  if (shapes.kind === 'single') {
    for (const shape of shapes.shapes) searchInclination(division, shape, found);
    return found;
  }
  if (!sought) return found;
  for (const theta of rules) searchLine(shapes.line, { theta, sought }, found);
  return found;
}

interface Gathered {
  readonly candidates: Point[];
  readonly closest: Point[];
  holdsEverywhere: Condition | null;
  unresolved: number;
}

/** Closer together towards the equator, where θ hardly changes with i. */
const thetaGrid = Float64Array.from({ length: 41 }, (_, k) => -Math.cos((Math.PI * k) / 40));

/** One shape: θ follows from a rate's branches, from a period by a search over all θ, or is held. */
function searchInclination({ rules, thetaFrom, sought }: Division, shape: ShapeRates, found: Gathered): void {
  if (thetaFrom || !sought) {
    for (const theta of rules) {
      const point = pointAt(shape, theta);
      if (!Number.isNaN(point.theta)) found.candidates.push(point);
    }
    return;
  }
  const residual = (theta: number) => residualOf(sought, shape, theta);
  const result = rootsOnGrid(residual, thetaGrid, { touching });
  note(result, { sought, found, at: (theta) => pointAt(shape, () => theta) });
}

interface LineSearch {
  readonly theta: ThetaRule;
  readonly sought: Condition;
}

function searchLine(line: Line, { theta, sought }: LineSearch, found: Gathered): void {
  const residual = (s: number): number => {
    const shape = line.shapeAt(s, theta);
    return shape ? residualOf(sought, shape, theta(shape)) : Number.NaN;
  };
  const result = rootsOnGrid(residual, line.grid, { touching });
  note(result, {
    sought,
    found,
    at: (s) => {
      const shape = line.shapeAt(s, theta);
      return shape ? pointAt(shape, theta) : null;
    },
  });
}

interface Noting {
  readonly sought: Condition;
  readonly found: Gathered;
  readonly at: (s: number) => Point | null;
}

function note(result: GridRoots, { sought, found, at }: Noting): void {
  found.unresolved += result.unresolved;
  if (result.least && result.greatest < zeroEverywhere) {
    found.holdsEverywhere = sought;
    return;
  }
  for (const root of result.roots) {
    const point = at(root);
    if (point) found.candidates.push(point);
  }
  const closest = result.least ? at(result.least.x) : null;
  if (closest) found.closest.push(closest);
}

function pointAt(shape: ShapeRates, theta: ThetaRule): Point {
  const { semiMajorAxisKm, eccentricity } = shape;
  return { semiMajorAxisKm, eccentricity, theta: theta(shape) };
}
