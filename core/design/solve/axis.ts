import { type Condition, residualOf } from '../conditions/condition';
import type { ShapeRates } from '../shapeRates';
import type { ThetaRule } from './inclinations';
import { ceilingKm, floorKm, type Problem, parameterKm, ratesOf, searchShare } from './problem';

const maxSteps = 16;
const firstChange = 1e-3;

interface AxisQuestion {
  readonly condition: Condition;
  readonly eccentricity: number;
  readonly theta: ThetaRule;
  /** km; the closer, the fewer steps. */
  readonly guessKm: number;
}

/**
 * The shape whose a meets a condition on a period or the node rate, at a known e; null where none is found.
 *
 * Both follow a power of a but for a share of J2, so the secant runs on their logarithm over ln a, where it is nearly
 * straight: artanh((x − t)/(x + t)) = ½ ln(x/t).
 */
export function shapeAtAxis(problem: Problem, question: AxisQuestion): ShapeRates | null {
  const { condition, eccentricity, theta } = question;
  const lowest = Math.log((searchShare * floorKm(problem.body)) / ((1 - eccentricity) * (1 + eccentricity)));
  const highest = Math.log(ceilingKm(problem.body));
  let shape: ShapeRates | null = null;
  const logAt = (x: number): number => {
    shape = ratesOf(problem, { semiMajorAxisKm: Math.exp(x), eccentricity });
    return shape ? Math.atanh(residualOf(condition, shape, theta(shape))) : Number.NaN;
  };
  // Half a unit below the range the power law still holds, which is all that a first step needs.
  let x = Math.min(highest, Math.max(lowest, Math.log(question.guessKm)));
  let value = logAt(x);
  let before = x + firstChange;
  let valueBefore = logAt(before);
  for (let step = 0; step < maxSteps; step += 1) {
    const change = (-value * (x - before)) / (value - valueBefore);
    if (value === 0 || Math.abs(change) < 2e-16 * Math.abs(x)) break;
    [before, valueBefore] = [x, value];
    x = Math.min(highest + 0.1, Math.max(lowest - 0.1, x + change));
    value = logAt(x);
    if (!Number.isFinite(value)) return null;
    if (Math.abs(value) < 1e-15 || x === before) break;
  }
  shape = ratesOf(problem, { semiMajorAxisKm: Math.exp(x), eccentricity });
  return Math.abs(value) < 1e-11 && shape && isInside(problem, shape) ? shape : null;
}

function isInside({ body }: Problem, shape: ShapeRates): boolean {
  return parameterKm(shape) >= searchShare * floorKm(body) && shape.semiMajorAxisKm <= ceilingKm(body);
}
