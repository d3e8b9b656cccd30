/**
 * The integrated level: what a field of zonals must keep, and the orbit against odex with force code of the tests' own (zonals
 * as explicit powers, the pulls of Sun and Moon as plain differences; their places are those of core, as constants would be).
 */
import { Outcome, Solver } from 'odex';
import { describe, expect, it } from 'vitest';
import {
  bodies,
  gravitySets,
  integrateOrbit,
  type MeanElements,
  type MoonPosition,
  moonPosition,
  precessionMatrix,
  stateFromMean,
  sunPosition,
  transform,
} from '../../core/index';
import { seriesAcceleration } from './truth/zonalSeries';

const earth = gravitySets.EGM2008;
const mu = earth.muKm3PerS2;
const epochJd = 2_461_193.25;
const radPerDeg = Math.PI / 180;

/** Promised: energy and polar angular momentum over 30 days, and metres over one day. */
const tolerances = { kept: 1e-10, metres: 1 } as const;

const orbits = [
  { name: 'Sun-synchronous', a: 7000, e: 0.001, i: 97.9 },
  { name: '28°', a: 6800, e: 0.01, i: 28 },
  { name: 'transfer ellipse', a: 24_400, e: 0.72, i: 28 },
  { name: '12 hours', a: 26_554, e: 0.7, i: 63.4 },
  { name: 'equator', a: 7200, e: 0.002, i: 0.01 },
] as const;

function meanOf({ a, e, i }: { readonly a: number; readonly e: number; readonly i: number }): MeanElements {
  return {
    semiMajorAxisKm: a,
    eccentricity: e,
    inclinationRad: i * radPerDeg,
    nodeRad: 1,
    perigeeRad: 4,
    meanAnomalyRad: 2,
  };
}

type State = ReturnType<typeof stateFromMean>;

/** Legendre polynomials by their own recursion; the potential itself, not its gradient. */
function energy({ positionKm: [x, y, z], velocityKmPerS: [vx, vy, vz] }: State): number {
  const r = Math.hypot(x, y, z);
  const s = z / r;
  let [below, here] = [1, s];
  let potential = 1;
  for (let n = 2; n <= 14; n += 1) {
    [below, here] = [here, ((2 * n - 1) * s * here - (n - 1) * below) / n];
    potential -= (earth.zonals[n] ?? Number.NaN) * (earth.radiusKm / r) ** n * here;
  }
  return 0.5 * (vx * vx + vy * vy + vz * vz) - (mu / r) * potential;
}

const polarMomentum = ({ positionKm: [x, y], velocityKmPerS: [vx, vy] }: State) => x * vy - y * vx;

describe('integrateOrbit in a field of zonals', () => {
  it.each(orbits)('keeps energy and polar angular momentum over 30 days: $name', (orbit) => {
    const state = stateFromMean(earth, meanOf(orbit));
    const forces = { zonalDegree: 14, sun: false, moon: false };
    const { samples, endedBy } = integrateOrbit({
      body: earth,
      state,
      epochJd,
      spanDays: 30,
      forces,
      sampleDays: 0.31,
    });
    expect(endedBy).toBe('span');
    const worst = (of: (state: State) => number) =>
      Math.max(...samples.map((sample) => Math.abs(of(sample.state) / of(state) - 1)));
    const [energyOff, momentumOff] = [worst(energy), worst(polarMomentum)];
    console.log(`${orbit.name}: energy ${energyOff.toExponential(1)}, momentum ${momentumOff.toExponential(1)}`);
    expect(energyOff).toBeLessThan(tolerances.kept);
    expect(momentumOff).toBeLessThan(tolerances.kept);
  });
});

/** Pull at a point for a unit of μ, less that at the Earth's centre. */
function pullOf(seen: MoonPosition, jd: number, at: readonly number[]): readonly number[] {
  const { directionMeanOfDate, distanceKm } = seen;
  const place = transform(precessionMatrix(jd, epochJd), directionMeanOfDate).map((part) => part * distanceKm);
  const away = Math.hypot(...at.map((part, index) => (place[index] ?? 0) - part));
  return at.map((part, index) => {
    const far = place[index] ?? 0;
    return (far - part) / away ** 3 - far / distanceKm ** 3;
  });
}

/** Position (km) after a time, by odex. */
function truth(state: State, timeS: number): readonly number[] {
  const zonals = seriesAcceleration({ muKm3PerS2: mu, radiusKm: earth.radiusKm, zonals: earth.zonals });
  const solver = new Solver(6);
  solver.maxSteps = 1e6;
  solver.maxExtrapolationColumns = 11;
  solver.initialStepSize = 30;
  solver.relativeTolerance = 1e-13;
  solver.absoluteTolerance = 1e-12;
  const derivative = (t: number, y: number[]) => {
    const [x = 0, py = 0, z = 0, vx = 0, vy = 0, vz = 0] = y;
    const jd = epochJd + t / 86_400;
    const at = [x, py, z];
    const extra = zonals(x, py, z);
    const sun = pullOf(sunPosition(jd), jd, at);
    const moon = pullOf(moonPosition(jd), jd, at);
    const pulls = at.map(
      (part, index) =>
        (-mu * part) / Math.hypot(...at) ** 3 +
        (extra[index] ?? 0) +
        1.32712440018e11 * (sun[index] ?? 0) +
        bodies.moon.muKm3PerS2 * (moon[index] ?? 0),
    );
    return [vx, vy, vz, ...pulls];
  };
  const { y, outcome } = solver.solve(derivative, 0, [...state.positionKm, ...state.velocityKmPerS], timeS);
  if (outcome !== Outcome.Converged) throw new Error(`odex stopped at outcome ${outcome}`);
  return y.slice(0, 3);
}

describe('integrateOrbit with zonals to 14, Sun and Moon, against odex', () => {
  it.each(orbits)('stays within a metre over a day: $name', (orbit) => {
    const state = stateFromMean(earth, meanOf(orbit));
    const forces = { zonalDegree: 14, sun: true, moon: true };
    const { samples } = integrateOrbit({ body: earth, state, epochJd, spanDays: 1, forces, sampleDays: 0.43 });
    const offs = samples.slice(1).map((sample) => {
      const exact = truth(state, sample.days * 86_400);
      return 1000 * Math.hypot(...sample.state.positionKm.map((part, index) => part - (exact[index] ?? Number.NaN)));
    });
    console.log(`${orbit.name}: ${offs.map((off) => (1000 * off).toFixed(2)).join(', ')} mm`);
    expect(offs).toHaveLength(3);
    for (const off of offs) expect(off).toBeLessThan(tolerances.metres);
  });
});
