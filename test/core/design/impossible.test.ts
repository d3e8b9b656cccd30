/** Problems that have no solution, each with its proof: a bound in closed form, or a grid dense beside the function's slope. */
import { describe, expect, it } from 'vitest';
import { bodies } from '../../../core/bodies/bodies';
import type { Body } from '../../../core/bodies/body';
import { gravitySets } from '../../../core/bodies/earth';
import type { OrbitCondition } from '../../../core/design/conditions/registry';
import type { FreeElement } from '../../../core/design/solve/problem';
import { solveOrbit } from '../../../core/design/solveOrbit';
import type { MeanElements, Theory } from '../../../core/orbit/elements';
import { periods } from '../../../core/orbit/periods';
import { secularRates } from '../../../core/orbit/secularRates';
import { seeded } from './solvable';

const random = seeded(1787);
const between = (low: number, high: number) => low + (high - low) * random();
const pick = <T>(items: readonly T[]): T => items[Math.floor(random() * items.length)] as T;
/** Bodies whose J2 is far above J4, so that first-order bounds with a margin hold in second order. */
const oblate = [gravitySets.EGM2008, gravitySets.WGS84, bodies.mars, bodies.jupiter, bodies.saturn] as const;

interface Impossible {
  readonly proof: string;
  readonly body: Body;
  readonly theory: Theory;
  readonly start: MeanElements;
  readonly free: readonly FreeElement[];
  readonly conditions: readonly OrbitCondition[];
}

function orbitOf(body: Body): MeanElements {
  const eccentricity = pick([0, between(0, 0.5)]);
  return {
    semiMajorAxisKm: (body.equatorialRadiusKm * between(1.03, 3)) / (1 - eccentricity),
    eccentricity,
    inclinationRad: between(0.02, Math.PI - 0.02),
    nodeRad: 1,
    perigeeRad: 2,
    meanAnomalyRad: 3,
  };
}

const grid = (low: number, high: number, count: number) =>
  Array.from({ length: count + 1 }, (_, k) => low + ((high - low) * k) / count);

type Maker = (
  body: Body,
  theory: Theory,
  start: MeanElements,
) => Omit<Impossible, 'body' | 'theory' | 'start'> & { start?: MeanElements };

/** Over a dense grid of i; 1 % beyond covers what lies between two of 2000 points. */
function rangeOverI(value: (mean: MeanElements) => number, start: MeanElements) {
  const values = grid(0, Math.PI, 2000).map((inclinationRad) => value({ ...start, inclinationRad }));
  return { low: Math.min(...values), high: Math.max(...values) };
}

const makers: readonly Maker[] = [
  (body, theory, start) => {
    const { high } = rangeOverI((mean) => secularRates(body, mean, theory).nodeRadPerS, start);
    const radPerS = pick([1, -1]) * high * between(1.01, 5);
    return {
      proof: 'node rate beyond its range over i',
      free: ['inclinationRad'],
      conditions: [{ kind: 'nodeRate', radPerS }],
    };
  },
  (body, theory, start) => {
    const { low, high } = rangeOverI((mean) => secularRates(body, mean, theory).perigeeRadPerS, start);
    const size = high - low;
    const radPerS = pick([low - size * between(0.01, 3), high + size * between(0.01, 3)]);
    return {
      proof: 'perigee rate beyond its range over i',
      free: ['inclinationRad'],
      conditions: [{ kind: 'perigeeRate', radPerS }],
    };
  },
  (body, theory, start) => {
    const { low, high } = rangeOverI((mean) => periods(body, mean, theory).nodalS, start);
    const size = high - low;
    const s = pick([low - size * between(0.02, 5), high + size * between(0.02, 5)]);
    return {
      proof: 'nodal period beyond its range over i',
      free: ['inclinationRad'],
      conditions: [{ kind: 'nodalPeriod', s }],
    };
  },
  (_body, theory) => {
    // First order: i has to exceed 90° for an eastward node and stay below it for a westward one.
    const inclinationRad = between(0.05, 1.5);
    const start = { ...orbitOf(gravitySets.EGM2008), inclinationRad };
    return {
      proof: `a prograde node moves west, ${theory}`,
      start,
      free: ['semiMajorAxisKm'],
      conditions: [{ kind: 'sunSynchronous' }],
    };
  },
  (body) => {
    const perigee = between(0, 3000);
    const apogee = perigee - between(1, 500);
    return {
      proof: `apogee below perigee, ${body.id}`,
      free: ['semiMajorAxisKm', 'eccentricity'],
      conditions: [
        { kind: 'perigeeAltitude', km: perigee },
        { kind: 'apogeeAltitude', km: apogee },
      ],
    };
  },
  (body, _theory, start) => {
    const km = start.semiMajorAxisKm - body.equatorialRadiusKm + between(1, 5000);
    return { proof: 'perigee above a', free: ['eccentricity'], conditions: [{ kind: 'perigeeAltitude', km }] };
  },
  (body, _theory, start) => {
    const km = pick([
      start.semiMajorAxisKm * between(2.001, 4) - body.equatorialRadiusKm,
      start.semiMajorAxisKm * between(0.3, 0.999) - body.equatorialRadiusKm,
    ]);
    return {
      proof: 'apogee above 2a or below a',
      free: ['eccentricity'],
      conditions: [{ kind: 'apogeeAltitude', km }],
    };
  },
  (body) => {
    // The two-body period at the surface is a bound but for a share of J2, below 3 %.
    const surfaceS = 2 * Math.PI * Math.sqrt(body.radiusKm ** 3 / body.muKm3PerS2);
    const s = surfaceS * between(0.2, 0.93);
    return {
      proof: 'nodal period shorter than at the surface',
      free: ['semiMajorAxisKm', 'inclinationRad'],
      conditions: [
        { kind: 'nodalPeriod', s },
        { kind: 'nodeRate', radPerS: -1e-7 },
      ],
    };
  },
  (body, theory) => {
    const km = between(300, 2000);
    const start = { ...orbitOf(body), eccentricity: 0, semiMajorAxisKm: body.equatorialRadiusKm + km };
    const { high } = rangeOverI((mean) => secularRates(body, mean, theory).nodeRadPerS, start);
    return {
      proof: 'of all orbits with this perigee the circle has the fastest node',
      free: ['semiMajorAxisKm', 'eccentricity', 'inclinationRad'],
      conditions: [
        { kind: 'perigeeAltitude', km },
        { kind: 'nodeRate', radPerS: pick([1, -1]) * high * between(1.02, 3) },
        { kind: 'perigeeStationary' },
      ],
    };
  },
  (body, theory, start) => {
    const circle = { ...start, eccentricity: 0 };
    const size = Math.abs(secularRates(body, { ...circle, inclinationRad: 0 }, theory).nodeRadPerS);
    // |Ω̇| grows with e and is |cos i| ≈ 0.447 of the equator's where perigee stands still.
    const radPerS = pick([1, -1]) * size * between(0.05, 0.4);
    return {
      proof: 'a node slower than the circle has at the critical inclination',
      free: ['eccentricity', 'inclinationRad'],
      conditions: [{ kind: 'perigeeStationary' }, { kind: 'nodeRate', radPerS }],
    };
  },
  (body, theory) => {
    const semiMajorAxisKm = 2.2 * body.equatorialRadiusKm;
    const start = { ...orbitOf(body), semiMajorAxisKm };
    // Dense in both: p ≥ R, 120 × 120 points; the range is widened by 3 %, the most that lies between two points.
    const values = grid(0, Math.sqrt(1 - 1 / 2.2), 120).flatMap((eccentricity) =>
      grid(0, Math.PI, 120).map(
        (inclinationRad) => periods(body, { ...start, eccentricity, inclinationRad }, theory).nodalS,
      ),
    );
    const [low, high] = [Math.min(...values), Math.max(...values)];
    const s = pick([low - (high - low) * between(0.05, 1), high + (high - low) * between(0.05, 1)]);
    return {
      proof: 'nodal period beyond its range over e and i',
      start,
      free: ['eccentricity', 'inclinationRad'],
      conditions: [
        { kind: 'nodalPeriod', s },
        { kind: 'nodeRate', radPerS: secularRates(body, start, theory).nodeRadPerS },
      ],
    };
  },
];

function impossible(index: number): Impossible {
  const theory = pick(['first', 'second'] as const);
  const maker = makers[index % makers.length] as Maker;
  const body = pick(oblate);
  const start = orbitOf(body);
  const made = maker(body, theory, start);
  return {
    body: made.conditions[0]?.kind === 'sunSynchronous' ? gravitySets.EGM2008 : body,
    theory,
    ...made,
    start: made.start ?? start,
  };
}

describe('problems proved to have no solution', () => {
  const problems = Array.from({ length: 506 }, (_, index) => impossible(index));

  it('are never answered with an orbit', () => {
    for (const problem of problems) {
      const answer = solveOrbit(problem);
      const name = `${problem.proof} ${problem.theory} ${problem.body.id} ${JSON.stringify([problem.start, problem.conditions, answer])}`;
      expect(answer.ok, name).toBe(false);
    }
  });

  it('get a reason with numbers, and the nearest orbit where one is near', () => {
    for (const problem of problems) {
      const answer = solveOrbit(problem);
      if (answer.ok) continue;
      expect(answer.reason.kind, answer.reason.text).toMatch(/^(noSolution|conflict)$/);
      expect(answer.reason.text).toMatch(/\d/);
      if (answer.nearest)
        expect(() => secularRates(problem.body, answer.nearest as MeanElements, problem.theory)).not.toThrow();
    }
  });
});
