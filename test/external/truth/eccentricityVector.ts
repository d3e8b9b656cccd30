/** The eccentricity vector along an orbit integrated with odex, averaged over windows of whole days or revolutions. */
import { Outcome, Solver } from 'odex';
import { cross, dot } from './osculating';
import type { Triple } from './zonalField';
import { seriesAcceleration, type ZonalSeries } from './zonalSeries';

export interface AveragedVector {
  /** Middle of the window, s from the start. */
  readonly timeS: number;
  readonly eCosine: number;
  readonly eSine: number;
}

interface Start {
  readonly positionKm: readonly number[];
  readonly velocityKmPerS: readonly number[];
}

/**
 * Averages of the osculating (e cos ω, e sin ω) over `windows` windows that follow one another.
 *
 * Weight (1 − cos 2πt/T)³: after 8 revolutions within a window 1e-6 of a short-period term is left.
 */
export function averagedVectors(
  field: ZonalSeries,
  state: Start,
  { windows, windowS }: { readonly windows: number; readonly windowS: number },
): readonly AveragedVector[] {
  const acceleration = seriesAcceleration(field);
  const mu = field.muKm3PerS2;
  const derivative = (t: number, y: number[]): number[] => {
    const position = triple(y, 0);
    const velocity = triple(y, 3);
    const extra = acceleration(...position);
    const pull = -mu / Math.hypot(...position) ** 3;
    const weight = 0.4 * (1 - Math.cos((2 * Math.PI * t) / windowS)) ** 3;
    const [eCosine, eSine] = eccentricityVector(mu, position, velocity);
    const total = position.map((value, axis) => pull * value + (extra[axis] ?? Number.NaN));
    return [...velocity, ...total, (weight * eCosine) / windowS, (weight * eSine) / windowS];
  };
  const averages: AveragedVector[] = [];
  let motion = [...state.positionKm, ...state.velocityKmPerS];
  for (let window = 0; window < windows; window += 1) {
    const solver = new Solver(8);
    solver.maxSteps = 1e6;
    solver.initialStepSize = 60;
    solver.relativeTolerance = 1e-12;
    solver.absoluteTolerance = 1e-12;
    const { y, outcome } = solver.solve(derivative, 0, [...motion, 0, 0], windowS);
    if (outcome !== Outcome.Converged) throw new Error(`odex stopped at outcome ${outcome} in window ${window}`);
    const [eCosine = Number.NaN, eSine = Number.NaN] = y.slice(6);
    averages.push({ timeS: (window + 0.5) * windowS, eCosine, eSine });
    motion = y.slice(0, 6);
  }
  return averages;
}

/** Components along the ascending node and 90° ahead of it. */
function eccentricityVector(mu: number, position: Triple, velocity: Triple): readonly [number, number] {
  const momentum = cross(position, velocity);
  const r = Math.hypot(...position);
  const turned = cross(velocity, momentum);
  const vector: Triple = [
    turned[0] / mu - position[0] / r,
    turned[1] / mu - position[1] / r,
    turned[2] / mu - position[2] / r,
  ];
  const across = Math.hypot(momentum[0], momentum[1]);
  const node: Triple = [-momentum[1] / across, momentum[0] / across, 0];
  return [dot(vector, node), dot(vector, cross(momentum, node)) / Math.hypot(...momentum)];
}

/**
 * Centre about which the vector turns at a known rate (rad/s): the least-squares c of e(t) = c + d exp(iνt).
 * Linear in c and d.
 */
export function centreOf(
  samples: readonly AveragedVector[],
  turnRadPerS: number,
): { readonly eCosine: number; readonly eSine: number; readonly radius: number } {
  // Normal equations with u = exp(iνt): Σe = N c + d Σu, Σ ū e = c Σū + N d.
  const count = samples.length;
  const sum = { ur: 0, ui: 0, er: 0, ei: 0, pr: 0, pi: 0 };
  for (const { timeS, eCosine, eSine } of samples) {
    const [c, s] = [Math.cos(turnRadPerS * timeS), Math.sin(turnRadPerS * timeS)];
    sum.ur += c;
    sum.ui += s;
    sum.er += eCosine;
    sum.ei += eSine;
    sum.pr += c * eCosine + s * eSine;
    sum.pi += c * eSine - s * eCosine;
  }
  const determinant = count * count - sum.ur ** 2 - sum.ui ** 2;
  const dr = (count * sum.pr - (sum.ur * sum.er + sum.ui * sum.ei)) / determinant;
  const di = (count * sum.pi - (sum.ur * sum.ei - sum.ui * sum.er)) / determinant;
  return {
    eCosine: (sum.er - (sum.ur * dr - sum.ui * di)) / count,
    eSine: (sum.ei - (sum.ur * di + sum.ui * dr)) / count,
    radius: Math.hypot(dr, di),
  };
}

function triple(values: readonly number[], from: number): Triple {
  return [values[from] ?? Number.NaN, values[from + 1] ?? Number.NaN, values[from + 2] ?? Number.NaN];
}
