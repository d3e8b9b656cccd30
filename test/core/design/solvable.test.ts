import { describe, expect, it } from 'vitest';
import { solveOrbit } from '../../../core/design/solveOrbit';
import type { MeanElements } from '../../../core/orbit/elements';
import { missOf, type Solvable, seeded, solvableProblem } from './solvable';

const count = 2000;
/** Largest miss of a solution, as a share of what each condition asks for. */
const accepted = 1e-10;

/** In first order both rates have one factor n/p² in a and e: at a held inclination one follows from the other. */
function isDegenerate({ theory, free, conditions }: Solvable): boolean {
  const rates = conditions.filter(({ kind }) => /node|perigeeRate|Stationary|sun/i.test(kind));
  return theory === 'first' && !free.includes('inclinationRad') && rates.length > 1;
}

describe('problems made from their solution', () => {
  const random = seeded(2026);
  const problems = Array.from({ length: count }, () => solvableProblem(random)).filter((one) => !isDegenerate(one));
  const answers = problems.map((problem) => ({ problem, answer: solveOrbit(problem) }));
  const name = ({ body, theory, free, conditions, truth }: Solvable) =>
    JSON.stringify({ body: body.id, theory, free, conditions, truth });

  it('are solved, 99 % and more, and the rest say that they did not converge', () => {
    const open = answers.filter(({ answer }) => !answer.ok);
    for (const { answer, problem } of open) {
      if (!answer.ok) expect(answer.reason.kind, name(problem)).toBe('didNotConverge');
    }
    expect(open.length).toBeLessThanOrEqual(0.01 * problems.length);
  });

  it('every solution meets every condition', () => {
    let worst = 0;
    for (const { problem, answer } of answers) {
      if (!answer.ok) continue;
      for (const mean of answer.all) {
        for (const condition of problem.conditions) {
          const miss = missOf(problem.body, problem.theory, mean, condition);
          worst = Math.max(worst, miss);
          expect(miss, `${condition.kind} ${name(problem)}`).toBeLessThanOrEqual(accepted);
        }
      }
    }
    expect(worst).toBeLessThanOrEqual(accepted);
  });

  it('the solution it was made from is among them', () => {
    const missing = answers.filter(
      ({ problem, answer }) => answer.ok && !answer.all.some((mean) => isNear(problem, mean)),
    );
    expect(missing.length).toBeLessThanOrEqual(0.01 * problems.length);
  });

  it('the nearest comes first, and held elements stay as they were', () => {
    for (const { problem, answer } of answers) {
      if (!answer.ok) continue;
      expect(answer.mean).toBe(answer.all[0]);
      for (const element of ['semiMajorAxisKm', 'eccentricity', 'inclinationRad', 'nodeRad', 'perigeeRad'] as const) {
        const isFree = (problem.free as readonly string[]).includes(element);
        if (!isFree) for (const mean of answer.all) expect(mean[element]).toBe(problem.start[element]);
      }
    }
  });
});

function isNear({ truth }: Solvable, mean: { semiMajorAxisKm: number; eccentricity: number; inclinationRad: number }) {
  return (
    Math.abs(mean.semiMajorAxisKm / truth.semiMajorAxisKm - 1) < 1e-4 &&
    Math.abs(mean.eccentricity - truth.eccentricity) < 1e-3 &&
    Math.abs(mean.inclinationRad - truth.inclinationRad) < 1e-3
  );
}

/** Where solutions of one free element may lie: p from the radius up, a to a thousand radii. */
function denseGrid({ body, start, free }: Solvable): readonly MeanElements[] {
  const count = 20_000;
  const [element] = free;
  const floor = Math.min(body.radiusKm, body.equatorialRadiusKm);
  const { semiMajorAxisKm: a, eccentricity: e } = start;
  return Array.from({ length: count + 1 }, (_, k) => {
    const share = k / count;
    if (element === 'inclinationRad') return { ...start, inclinationRad: Math.PI * share };
    if (element === 'eccentricity') return { ...start, eccentricity: Math.sqrt(Math.max(0, 1 - floor / a)) * share };
    const lowest = floor / (1 - e * e);
    return { ...start, semiMajorAxisKm: lowest * ((1000 * floor) / lowest) ** share };
  });
}

describe('all solutions', () => {
  it('of one condition are as many as a dense grid shows changes of sign', () => {
    const random = seeded(65_537);
    let compared = 0;
    while (compared < 150) {
      const problem = solvableProblem(random);
      const [condition] = problem.conditions;
      if (problem.free.length > 1 || !condition) continue;
      const signs = denseGrid(problem).map((mean) =>
        Math.sign(missOf(problem.body, problem.theory, mean, condition, true)),
      );
      // Solutions at the very ends of the grid change no sign on it.
      if (problem.truth.eccentricity === 0 && problem.free[0] === 'eccentricity') continue;
      const changes = signs.filter((sign, k) => k > 0 && sign !== signs[k - 1]).length;
      const answer = solveOrbit(problem);
      expect(answer.ok && answer.all.length, JSON.stringify(problem.conditions)).toBe(changes);
      compared += 1;
    }
  });
});
