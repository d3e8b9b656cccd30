/**
 * Orbits integrated with odex (Hairer and Wanner's extrapolation method), together with integrals along them.
 *
 * A quadrature rides along as an extra equation, so that an average has the integrator's own accuracy and needs no
 * samples, no interpolation and no unwrapped angles.
 */
import { Outcome, Solver } from 'odex';
import { perturbingAcceleration, type Triple, type ZonalField } from './zonalField';

export interface Motion {
  readonly timeS: number;
  readonly positionKm: Triple;
  readonly velocityKmPerS: Triple;
  /** Integrals since `timeS` was 0, of whatever the integrands gave. */
  readonly integrals: readonly number[];
}

/** Rates of the integrals at a time (s), from position (km), velocity (km/s) and the perturbation (km/s²). */
export type Integrands = (timeS: number, position: Triple, velocity: Triple, perturbation: Triple) => readonly number[];

export const noIntegrands: Integrands = () => [];

export function startOf(
  state: { readonly positionKm: readonly number[]; readonly velocityKmPerS: readonly number[] },
  integrals = 0,
): Motion {
  return {
    timeS: 0,
    positionKm: triple(state.positionKm, 0),
    velocityKmPerS: triple(state.velocityKmPerS, 0),
    integrals: new Array<number>(integrals).fill(0),
  };
}

/** Carries a motion to `timeS`, forwards or backwards. */
export function integrateTo(field: ZonalField, motion: Motion, timeS: number, integrands: Integrands): Motion {
  if (timeS === motion.timeS) return motion;
  const solver = new Solver(6 + motion.integrals.length);
  solver.maxSteps = 1e6;
  solver.maxExtrapolationColumns = 11;
  solver.initialStepSize = Math.min(60, Math.abs(timeS - motion.timeS));
  solver.relativeTolerance = 1e-13;
  // Components pass through zero: an absolute floor far below a millimetre and a micrometre a second.
  solver.absoluteTolerance = 1e-12;
  const derivative = (t: number, y: number[]): number[] => {
    const position = triple(y, 0);
    const velocity = triple(y, 3);
    const extra = perturbingAcceleration(field, ...position);
    const pull = -field.muKm3PerS2 / Math.hypot(...position) ** 3;
    return [
      ...velocity,
      pull * position[0] + extra[0],
      pull * position[1] + extra[1],
      pull * position[2] + extra[2],
      ...integrands(t, position, velocity, extra),
    ];
  };
  const start = [...motion.positionKm, ...motion.velocityKmPerS, ...motion.integrals];
  const { y, outcome } = solver.solve(derivative, motion.timeS, start, timeS);
  if (outcome !== Outcome.Converged) throw new Error(`odex stopped at outcome ${outcome} before ${timeS} s`);
  return { timeS, positionKm: triple(y, 0), velocityKmPerS: triple(y, 3), integrals: y.slice(6) };
}

function triple(values: readonly number[], from: number): Triple {
  return [values[from] ?? Number.NaN, values[from + 1] ?? Number.NaN, values[from + 2] ?? Number.NaN];
}
