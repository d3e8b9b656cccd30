/** The nearest orbit that exists where none meets the conditions, and what it misses. */
import { degPerRad } from '../../numerics/angles';
import { formatNumber } from '../../numerics/numberWords';
import { residualOf } from '../conditions/condition';
import { floorKm, isInDomain, meanOf, type Point, type Problem, ratesOf, residualsAt } from './problem';
import { eccentricityText, kmText } from './words';

/** Of the points the one with the least residuals; none below the surface unless the start itself is. */
export function nearestPoint(problem: Problem, points: readonly Point[]): Point | null {
  const mayDive = dives(problem, problem.start);
  let best: Point | null = null;
  let least = Infinity;
  for (const point of points) {
    if (!isInDomain(problem.body, point)) continue;
    if (!mayDive && dives(problem, point)) continue;
    const residuals = residualsAt(problem, point);
    const size = residuals ? Math.hypot(...residuals) : Infinity;
    if (size < least) [best, least] = [point, size];
  }
  return best;
}

const rounding = 1e-9;

/** Perigee lies below the lowest orbit that is looked at: the surface, but for metres between two radii of a body. */
function dives({ body }: Problem, { semiMajorAxisKm, eccentricity }: Omit<Point, 'theta'>): boolean {
  return semiMajorAxisKm * (1 - eccentricity) < floorKm(body) * (1 - rounding);
}

const met = 1e-9;

/** “ The nearest orbit, a 6378 km, e 0 and i 98.000°, does not meet this: nodal period …”; empty where it misses nothing. */
export function missedText(problem: Problem, point: Point): string {
  const shape = ratesOf(problem, point);
  if (!shape) throw new Error('expected rates at the nearest orbit, got none');
  const missed = problem.conditions.filter((each) => Math.abs(residualOf(each, shape, point.theta)) > met);
  const values = missed.map(({ quantity, write, measure }) => `${quantity} ${write(measure(shape, point.theta))}`);
  const { semiMajorAxisKm, eccentricity, inclinationRad } = meanOf(problem, point);
  const inclination = formatNumber(inclinationRad * degPerRad, { digits: 3 });
  const orbit = `a ${kmText(semiMajorAxisKm)}, e ${eccentricityText(eccentricity)} and i ${inclination}°`;
  return missed.length === 0 ? '' : ` The nearest orbit, ${orbit}, does not meet this: ${values.join(', ')}.`;
}
