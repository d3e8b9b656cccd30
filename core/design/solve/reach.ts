/** What orbits there are where the other conditions hold: sampled, for sentences and for the nearest orbit. */

import type { ShapeRates } from '../shapeRates';
import { shapesLeft } from './lines';
import { isInDomain, type Point, type Problem } from './problem';
import type { Division } from './search';

export interface ReachedPoint extends Point {
  /** Of the condition sought, in its unit; NaN where none is. */
  readonly value: number;
}

const inclinations = 91;
/** Down to the floor itself, where most quantities have their extremes. */
const sampling = { density: 4, share: 1 };

export function reachOf(problem: Problem, division: Division): readonly ReachedPoint[] {
  const shapes = shapesLeft(problem, sampling);
  const points: ReachedPoint[] = [];
  const condition = division.sought ?? division.thetaFrom;
  const add = (shape: ShapeRates, theta: number) => {
    const { semiMajorAxisKm, eccentricity } = shape;
    const point = { semiMajorAxisKm, eccentricity, theta };
    if (isInDomain(problem.body, point))
      points.push({ ...point, value: condition?.measure(shape, theta) ?? Number.NaN });
  };
  if (shapes.kind === 'single') {
    for (const shape of shapes.shapes) for (const theta of thetasOf(problem, shape, division)) add(shape, theta);
    return points;
  }
  for (const rule of division.rules) {
    for (const s of shapes.line.grid) {
      const shape = shapes.line.shapeAt(s, rule);
      if (shape) add(shape, rule(shape));
    }
  }
  return points;
}

function thetasOf(problem: Problem, shape: ShapeRates, { rules }: Division): readonly number[] {
  if (!problem.free.includes('inclinationRad')) return rules.map((rule) => rule(shape));
  return Array.from({ length: inclinations }, (_, k) => Math.cos((Math.PI * k) / (inclinations - 1)));
}
