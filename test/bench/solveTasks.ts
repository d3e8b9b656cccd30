/** From wishes to orbits: one, two and three conditions. */
import { bodies, type FreeElement, type MeanElements, type OrbitCondition, solveOrbit } from '../../core/index';
import type { Task } from './measure';

const low: MeanElements = {
  semiMajorAxisKm: 7000,
  eccentricity: 0.001,
  inclinationRad: 1.7,
  nodeRad: 1,
  perigeeRad: 1.5,
  meanAnomalyRad: 0,
};
const steep: MeanElements = { ...low, semiMajorAxisKm: 26_554, eccentricity: 0.7, inclinationRad: 1.1 };

const calls = 500;

type Wishes = (index: number) => readonly OrbitCondition[];

/** The wishes change a little from call to call, as they do while a finger moves. */
function solving(name: string, start: MeanElements, free: readonly FreeElement[], wishes: Wishes): Task {
  const run = () => {
    let sum = 0;
    for (let index = 0; index < calls; index += 1) {
      const answer = solveOrbit({ body: bodies.earth, theory: 'second', start, free, conditions: wishes(index) });
      sum += answer.ok ? answer.mean.semiMajorAxisKm + answer.mean.inclinationRad : Number.NaN;
    }
    return sum;
  };
  return { name, calls, run };
}

const sun: OrbitCondition = { kind: 'sunSynchronous' };
const still: OrbitCondition = { kind: 'perigeeStationary' };
const track = (index: number): OrbitCondition => ({ kind: 'repeat', revolutions: 2101 + 2 * (index % 100), days: 150 });
const perigee = (index: number): OrbitCondition => ({ kind: 'perigeeAltitude', km: 500 + 0.1 * index });

export function solveTasks(): readonly Task[] {
  const all = ['semiMajorAxisKm', 'eccentricity', 'inclinationRad'] as const;
  return [
    solving('solve 1: i, Sun', low, ['inclinationRad'], () => [sun]),
    solving('solve 1: i, perigee still', low, ['inclinationRad'], () => [still]),
    solving('solve 1: a, Sun', low, ['semiMajorAxisKm'], () => [sun]),
    solving('solve 1: a, repeat', low, ['semiMajorAxisKm'], (index) => [track(index)]),
    solving('solve 1: e, node rate', steep, ['eccentricity'], (index) => [
      { kind: 'nodeRate', radPerS: -1.5e-8 * (1 + index / calls) },
    ]),
    solving('solve 2: Sun, repeat', low, ['semiMajorAxisKm', 'inclinationRad'], (index) => [sun, track(index)]),
    solving('solve 3: Sun, repeat, perigee', low, all, (index) => [sun, track(index % 30), perigee(index)]),
    solving('solve 3: still, repeat, perigee', steep, all, (index) => [
      still,
      { kind: 'repeat', revolutions: 2, days: 1 },
      perigee(index),
    ]),
    solving('solve 3: Sun, repeat, frozen', low, all, (index) => [sun, track(index % 30), { kind: 'frozen' }]),
    solving('solve 3: node, still, period', steep, all, (index) => [
      { kind: 'nodeRate', radPerS: -3e-8 },
      still,
      { kind: 'nodalPeriod', s: 43_000 + index },
    ]),
  ];
}

/** Most that one call may take, µs, by the number of conditions: far below what a dragged mark would show. */
const limitsUs = [20, 400, 400] as const;

export const solveLimits = solveTasks().map(({ name }) => ({
  name,
  microseconds: limitsUs[Number(name.charAt('solve '.length)) - 1] ?? Number.NaN,
}));
