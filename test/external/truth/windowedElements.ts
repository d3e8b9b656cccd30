/**
 * Osculating elements averaged over whole stretches of an orbit integrated with odex.
 *
 * The averages ride along as extra equations, weighted with 0.4 (1 − cos 2πt/T)³: after ten revolutions within T a
 * short-period term is left at about 1e-7 of its size, and the average belongs to the middle of the window.
 */
import { Outcome, Solver } from 'odex';
import type { Motion } from './fullField';

/** Averages of osculating elements over a window: km, rad; the eccentricity vector along the node and 90° ahead of it. */
export interface WindowedElements {
  /** Middle of the window, days from the epoch. */
  readonly days: number;
  readonly semiMajorAxisKm: number;
  readonly eCosine: number;
  readonly eSine: number;
  readonly inclinationRad: number;
  /** Within half a turn of the value at the window's start, which lies in (−π, π]. */
  readonly nodeRad: number;
}

export interface TruthSetting {
  readonly motion: Motion;
  readonly muKm3PerS2: number;
  readonly relativeTolerance: number;
}

/** Carries position (km) and velocity (km/s) from one time (s) to another. */
export function carried(setting: TruthSetting, state: readonly number[], fromS: number, toS: number): number[] {
  if (toS === fromS) return [...state];
  return solved(setting, setting.motion as (t: number, y: number[]) => number[], state, fromS, toS);
}

/** Averages over the window from `fromS` to `toS`, and the state at its end. */
export function windowed(
  setting: TruthSetting,
  state: readonly number[],
  fromS: number,
  toS: number,
): { readonly elements: WindowedElements; readonly state: readonly number[] } {
  const lengthS = toS - fromS;
  const reference = osculating(setting.muKm3PerS2, state).nodeRad;
  const derivative = (t: number, y: number[]) => {
    const rates = setting.motion(t, y);
    const now = osculating(setting.muKm3PerS2, y);
    const weight = (0.4 * (1 - Math.cos((2 * Math.PI * (t - fromS)) / lengthS)) ** 3) / lengthS;
    const turn = Math.atan2(Math.sin(now.nodeRad - reference), Math.cos(now.nodeRad - reference));
    rates.push(weight * now.semiMajorAxisKm, weight * now.eCosine, weight * now.eSine, weight * now.inclinationRad);
    rates.push(weight * turn);
    return rates;
  };
  const y = solved(setting, derivative, [...state, 0, 0, 0, 0, 0], fromS, toS);
  const [semiMajorAxisKm = 0, eCosine = 0, eSine = 0, inclinationRad = 0, turn = 0] = y.slice(6);
  const days = (0.5 * (fromS + toS)) / 86_400;
  return {
    elements: { days, semiMajorAxisKm, eCosine, eSine, inclinationRad, nodeRad: reference + turn },
    state: y.slice(0, 6),
  };
}

function solved(
  { relativeTolerance }: TruthSetting,
  derivative: (t: number, y: number[]) => number[],
  state: readonly number[],
  fromS: number,
  toS: number,
): number[] {
  const solver = new Solver(state.length);
  solver.maxSteps = 1e8;
  solver.maxExtrapolationColumns = 11;
  solver.initialStepSize = Math.min(60, toS - fromS);
  solver.relativeTolerance = relativeTolerance;
  // Components pass through zero: a floor below a micrometre and a nanometre a second in the sum over a year.
  solver.absoluteTolerance = relativeTolerance;
  const { y, outcome } = solver.solve(derivative, fromS, [...state], toS);
  if (outcome !== Outcome.Converged) throw new Error(`odex stopped at outcome ${outcome} before ${toS} s`);
  return y.slice();
}

/** Osculating elements of position (km) and velocity (km/s); for orbits off the equator. */
export function osculating(mu: number, y: readonly number[]) {
  const [x = 0, py = 0, z = 0, vx = 0, vy = 0, vz = 0] = y;
  const r = Math.sqrt(x * x + py * py + z * z);
  const v2 = vx * vx + vy * vy + vz * vz;
  const radial = x * vx + py * vy + z * vz;
  const hx = py * vz - z * vy;
  const hy = z * vx - x * vz;
  const hz = x * vy - py * vx;
  const across = Math.sqrt(hx * hx + hy * hy);
  const h = Math.sqrt(across * across + hz * hz);
  // e = ((v² − μ/r) r − (r·v) v) / μ
  const ex = ((v2 - mu / r) * x - radial * vx) / mu;
  const ey = ((v2 - mu / r) * py - radial * vy) / mu;
  const ez = ((v2 - mu / r) * z - radial * vz) / mu;
  return {
    semiMajorAxisKm: 1 / (2 / r - v2 / mu),
    eCosine: (-hy * ex + hx * ey) / across,
    // Along h × node: node is (−hy, hx, 0)/across.
    eSine: (-hz * hx * ex - hz * hy * ey + across * across * ez) / (across * h),
    inclinationRad: Math.atan2(across, hz),
    nodeRad: Math.atan2(hx, -hy),
  };
}
