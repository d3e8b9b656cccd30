/** Problems that have a solution because the elements came first, and residuals that owe nothing to core's own. */

import { bodies } from '../../../core/bodies/bodies';
import type { Body } from '../../../core/bodies/body';
import { gravitySets } from '../../../core/bodies/earth';
import type { OrbitCondition } from '../../../core/design/conditions/registry';
import type { FreeElement } from '../../../core/design/solve/problem';
import type { MeanElements, Theory } from '../../../core/orbit/elements';
import { periods } from '../../../core/orbit/periods';
import { secularRates } from '../../../core/orbit/secularRates';

export interface Solvable {
  readonly body: Body;
  readonly theory: Theory;
  readonly truth: MeanElements;
  readonly start: MeanElements;
  readonly free: readonly FreeElement[];
  readonly conditions: readonly OrbitCondition[];
}

/** Lehmer's generator: x ← 48271 x mod (2³¹ − 1) (Park, Miller, Stockmeyer, CACM 36, 1993, from memory). */
export function seeded(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state * 48_271) % 2_147_483_647;
    return state / 2_147_483_647;
  };
}

/** How far a mean orbit misses a condition, as a share of what is asked for (of its size where that is zero). */
export function missOf(
  body: Body,
  theory: Theory,
  mean: MeanElements,
  condition: OrbitCondition,
  signed = false,
): number {
  const miss = signedMiss(body, theory, mean, condition);
  return signed ? miss : Math.abs(miss);
}

function signedMiss(body: Body, theory: Theory, mean: MeanElements, condition: OrbitCondition): number {
  const rates = secularRates(body, mean, theory);
  const share = (value: number, wanted: number) => (value - wanted) / Math.abs(wanted);
  const surface = body.equatorialRadiusKm;
  switch (condition.kind) {
    case 'sunSynchronous':
      return share(rates.nodeRadPerS, (2 * Math.PI) / ((body.yearDays ?? Number.NaN) * 86_400));
    case 'nodeRate':
    case 'sameNodeRate':
      return share(rates.nodeRadPerS, condition.radPerS);
    case 'perigeeRate':
      return share(rates.perigeeRadPerS, condition.radPerS);
    case 'perigeeStationary':
      return rates.perigeeRadPerS / secularRates(body, { ...mean, inclinationRad: 0 }, theory).perigeeRadPerS;
    case 'nodalPeriod':
      return share(periods(body, mean, theory).nodalS, condition.s);
    case 'repeat': {
      const { nodalS, nodalDayS } = periods(body, mean, theory);
      return share(condition.revolutions * nodalS, condition.days * (nodalDayS ?? Number.NaN));
    }
    case 'perigeeAltitude':
      return share(mean.semiMajorAxisKm * (1 - mean.eccentricity), surface + condition.km);
    case 'apogeeAltitude':
      return share(mean.semiMajorAxisKm * (1 + mean.eccentricity), surface + condition.km);
    case 'frozen':
      throw new Error('frozen orbits are not read off elements here');
  }
}

type Kind = 'node' | 'same' | 'perigee' | 'stationary' | 'period' | 'repeat' | 'sun' | 'low' | 'high';

/** Sets of one to three kinds with free elements that they settle. */
const plans: readonly (readonly [readonly FreeElement[], readonly (readonly Kind[])[]])[] = [
  [['semiMajorAxisKm'], [['node'], ['perigee'], ['period'], ['repeat'], ['low'], ['high'], ['same']]],
  [['eccentricity'], [['node'], ['perigee'], ['low'], ['high'], ['period'], ['repeat']]],
  [['inclinationRad'], [['node'], ['perigee'], ['stationary'], ['period'], ['sun'], ['repeat']]],
  [
    ['semiMajorAxisKm', 'eccentricity'],
    [
      ['low', 'high'],
      ['low', 'node'],
      ['high', 'node'],
      ['low', 'period'],
      ['high', 'repeat'],
      ['node', 'period'],
      ['node', 'repeat'],
      ['perigee', 'period'],
      ['perigee', 'repeat'],
      ['low', 'perigee'],
      ['low', 'repeat'],
      ['high', 'perigee'],
      ['high', 'period'],
    ],
  ],
  [
    ['semiMajorAxisKm', 'inclinationRad'],
    [
      ['node', 'perigee'],
      ['node', 'period'],
      ['node', 'repeat'],
      ['perigee', 'period'],
      ['perigee', 'repeat'],
      ['stationary', 'repeat'],
      ['stationary', 'node'],
      ['sun', 'repeat'],
      ['sun', 'perigee'],
      ['low', 'node'],
      ['high', 'perigee'],
      ['low', 'repeat'],
      ['high', 'period'],
      ['low', 'sun'],
    ],
  ],
  [
    ['eccentricity', 'inclinationRad'],
    [
      ['node', 'perigee'],
      ['node', 'low'],
      ['perigee', 'high'],
      ['stationary', 'node'],
      ['low', 'sun'],
      ['stationary', 'low'],
      ['node', 'period'],
      ['perigee', 'repeat'],
      ['low', 'repeat'],
    ],
  ],
  [
    ['semiMajorAxisKm', 'eccentricity', 'inclinationRad'],
    [
      ['low', 'high', 'node'],
      ['low', 'high', 'stationary'],
      ['low', 'node', 'perigee'],
      ['low', 'node', 'period'],
      ['high', 'perigee', 'repeat'],
      ['node', 'perigee', 'period'],
      ['node', 'perigee', 'repeat'],
      ['sun', 'repeat', 'low'],
      ['sun', 'repeat', 'perigee'],
      ['stationary', 'repeat', 'low'],
      ['stationary', 'repeat', 'node'],
      ['node', 'repeat', 'high'],
      ['low', 'high', 'sun'],
      ['low', 'high', 'perigee'],
      ['sun', 'stationary', 'low'],
      ['perigee', 'repeat', 'period'],
      ['low', 'repeat', 'period'],
      ['low', 'high', 'repeat'],
      ['low', 'high', 'period'],
    ],
  ],
];

const everyBody = [...Object.values(bodies), gravitySets.WGS84, gravitySets.WGS72, gravitySets.EGM2008, bodies.mars];

/** The `index`-th random problem: body, theory and plan by turns, the rest at random. */
export function solvableProblem(random: () => number): Solvable {
  const pick = <T>(items: readonly T[]): T => items[Math.floor(random() * items.length)] as T;
  for (;;) {
    const body = pick(everyBody);
    const theory = pick(['first', 'second'] as const);
    const [free, sets] = pick(plans);
    const kinds = pick(sets);
    const shaped = adjusted(body, theory, randomOrbit(body, random), kinds);
    if (!shaped) continue;
    const { truth, body: fitted } = shaped;
    const conditions = kinds.map((kind) => readOff(fitted, theory, truth, kind));
    const start = startNear(truth, free, random);
    return { body: fitted, theory, truth, start, free, conditions };
  }
}

function randomOrbit(body: Body, random: () => number): MeanElements {
  const eccentricity = random() < 0.15 ? 0 : 0.75 * random() ** 2;
  const perigeeKm = body.equatorialRadiusKm * (1.02 + 0.5 * random() ** 2 + (random() < 0.2 ? 4 * random() : 0));
  return {
    semiMajorAxisKm: perigeeKm / (1 - eccentricity),
    eccentricity,
    inclinationRad: Math.PI * random(),
    nodeRad: 6 * random(),
    perigeeRad: 6 * random(),
    meanAnomalyRad: 6 * random(),
  };
}

/** Stationary perigee, Sun-synchronous and a closed track hold for no random orbit: the orbit or the body is fitted to them. */
function adjusted(body: Body, theory: Theory, first: MeanElements, kinds: readonly Kind[]) {
  let truth = first;
  let fitted = body;
  if (kinds.includes('stationary')) {
    const inclinationRad = zeroNear(
      (i) => secularRates(body, { ...first, inclinationRad: i }, theory).perigeeRadPerS,
      first.inclinationRad < Math.PI / 2 ? 0.9 : 1.85,
      first.inclinationRad < Math.PI / 2 ? 1.29 : 2.24,
    );
    if (inclinationRad === null) return null;
    truth = { ...truth, inclinationRad };
  }
  if (kinds.includes('sun')) {
    // The year is set to what the node does: any body may have any year.
    const rate = secularRates(body, truth, theory).nodeRadPerS;
    if (!(rate > 0)) return null;
    fitted = { ...fitted, yearDays: (2 * Math.PI) / rate / 86_400 };
  }
  if (kinds.includes('repeat')) {
    // Likewise the day: so that 3 days hold the nearest whole number of revolutions.
    const { nodalS } = periods(body, truth, theory);
    const { nodeRadPerS } = secularRates(body, truth, theory);
    const { revolutions, days } = trackOf(body, truth, theory);
    const sense = Math.sign(body.rotationRadPerS ?? 1);
    const rotationRadPerS = nodeRadPerS + (sense * 2 * Math.PI * days) / (revolutions * nodalS);
    if (Math.sign(rotationRadPerS) !== sense) return null;
    fitted = { ...fitted, rotationRadPerS };
  }
  return { truth, body: fitted };
}

function trackOf(body: Body, mean: MeanElements, theory: Theory) {
  const { nodalS, nodalDayS } = periods(body, mean, theory);
  const days = 1 + (Math.round(mean.semiMajorAxisKm * 1000) % 20);
  return { days, revolutions: Math.max(1, Math.round((days * (nodalDayS ?? 86_400)) / nodalS)) };
}

function zeroNear(f: (x: number) => number, low: number, high: number): number | null {
  let [below, above] = [low, high];
  const sign = Math.sign(f(below));
  if (sign === Math.sign(f(above))) return null;
  for (let step = 0; step < 100; step += 1) {
    const middle = (below + above) / 2;
    if (Math.sign(f(middle)) === sign) below = middle;
    else above = middle;
  }
  return (below + above) / 2;
}

function readOff(body: Body, theory: Theory, mean: MeanElements, kind: Kind): OrbitCondition {
  const rates = secularRates(body, mean, theory);
  const { nodalS, nodalDayS } = periods(body, mean, theory);
  const surface = body.equatorialRadiusKm;
  switch (kind) {
    case 'node':
      return { kind: 'nodeRate', radPerS: rates.nodeRadPerS };
    case 'same':
      return { kind: 'sameNodeRate', radPerS: rates.nodeRadPerS, label: 'Skerry 2' };
    case 'perigee':
      return { kind: 'perigeeRate', radPerS: rates.perigeeRadPerS };
    case 'stationary':
      return { kind: 'perigeeStationary' };
    case 'period':
      return { kind: 'nodalPeriod', s: nodalS };
    case 'repeat': {
      const days = 1 + (Math.round(mean.semiMajorAxisKm * 1000) % 20);
      return { kind: 'repeat', days, revolutions: Math.round((days * (nodalDayS ?? Number.NaN)) / nodalS) };
    }
    case 'sun':
      return { kind: 'sunSynchronous' };
    case 'low':
      return { kind: 'perigeeAltitude', km: mean.semiMajorAxisKm * (1 - mean.eccentricity) - surface };
    case 'high':
      return { kind: 'apogeeAltitude', km: mean.semiMajorAxisKm * (1 + mean.eccentricity) - surface };
  }
}

function startNear(truth: MeanElements, free: readonly FreeElement[], random: () => number): MeanElements {
  const moved = (element: FreeElement, value: number) => (free.includes(element) ? value : truth[element]);
  return {
    ...truth,
    semiMajorAxisKm: moved('semiMajorAxisKm', truth.semiMajorAxisKm * (0.8 + 0.6 * random())),
    eccentricity: moved('eccentricity', 0.6 * random()),
    inclinationRad: moved('inclinationRad', Math.PI * random()),
  };
}
