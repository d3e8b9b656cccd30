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
  const at = (x: number): Trial | null => {
    const shape = ratesOf(problem, { semiMajorAxisKm: Math.exp(x), eccentricity });
    if (!shape) return null;
    const value = Math.atanh(residualOf(condition, shape, theta(shape)));
    return Number.isFinite(value) ? { x, value, shape } : null;
  };
  // A tenth below the range the power law still holds, which is all that a first step needs.
  let here = at(Math.min(highest, Math.max(lowest, Math.log(question.guessKm))));
  let before = here && at(here.x + firstChange);
  for (let step = 0; step < maxSteps && here && before && Math.abs(here.value) > 1e-15; step += 1) {
    const change = (-here.value * (here.x - before.x)) / (here.value - before.value);
    const x = Math.min(highest + 0.1, Math.max(lowest - 0.1, here.x + change));
    if (x === here.x || Math.abs(change) < 2e-16 * Math.abs(x)) break;
    before = here;
    here = at(x);
  }
  return here && Math.abs(here.value) < 1e-11 && isInside(problem, here.shape) ? here.shape : null;
}

interface Trial {
  /** ln a */
  readonly x: number;
  readonly value: number;
  readonly shape: ShapeRates;
}

function isInside({ body }: Problem, shape: ShapeRates): boolean {
  return parameterKm(shape) >= searchShare * floorKm(body) && shape.semiMajorAxisKm <= ceilingKm(body);
}
