/** Central differences of the reading itself; one-sided where the other side does not exist. */
import { radPerDeg } from '../../numerics/angles';
import type { MeanElements } from '../../orbit/elements';
import type { ReadingPoint, Sensitivities } from './reading';

/** Steps wide against rounding and narrow against curvature. */
const stepShare = 1e-5;
const stepInclinationRad = 1e-3 * radPerDeg;
const stepEccentricity = 1e-5;

export function sensitivitiesOf(point: ReadingPoint, evaluate: (point: ReadingPoint) => number): Sensitivities {
  const { semiMajorAxisKm, eccentricity, inclinationRad } = point.mean;
  const at = (change: Partial<MeanElements>) => evaluate({ ...point, mean: { ...point.mean, ...change } });
  const inclination = sides(inclinationRad, stepInclinationRad, 0, Math.PI);
  const shape = sides(eccentricity, stepEccentricity, 0, Math.max(eccentricity, 1 - stepEccentricity));
  const stepKm = stepShare * semiMajorAxisKm;
  const perKm = slope([semiMajorAxisKm - stepKm, semiMajorAxisKm + stepKm], (value) => at({ semiMajorAxisKm: value }));
  return {
    perKm,
    perHundredthDegree: 0.01 * radPerDeg * slope(inclination, (value) => at({ inclinationRad: value })),
    perThousandth: 1e-3 * slope(shape, (value) => at({ eccentricity: value })),
  };
}

type Sides = readonly [below: number, above: number];

/** At a bound the step goes inward only. */
function sides(value: number, step: number, least: number, greatest: number): Sides {
  return [Math.max(least, value - step), Math.min(greatest, value + step)];
}

function slope([below, above]: Sides, evaluate: (value: number) => number): number {
  return (evaluate(above) - evaluate(below)) / (above - below);
}
