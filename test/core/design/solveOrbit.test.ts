import { describe, expect, it } from 'vitest';
import { bodies } from '../../../core/bodies/bodies';
import { customBody } from '../../../core/bodies/customBody';
import { gravitySets } from '../../../core/bodies/earth';
import type { OrbitCondition } from '../../../core/design/conditions/registry';
import { conditionWorkings } from '../../../core/design/conditionWorkings';
import { frozenOrbit } from '../../../core/design/frozen';
import { type SolveInput, solveOrbit } from '../../../core/design/solveOrbit';
import { periods } from '../../../core/orbit/periods';
import { secularRates } from '../../../core/orbit/secularRates';

const earth = gravitySets.EGM2008;
const degPerRad = 180 / Math.PI;
const start = {
  semiMajorAxisKm: 7078.137,
  eccentricity: 0,
  inclinationRad: 98 / degPerRad,
  nodeRad: 1,
  perigeeRad: 0.5,
  meanAnomalyRad: 0.25,
};
const sun: OrbitCondition = { kind: 'sunSynchronous' };
const still: OrbitCondition = { kind: 'perigeeStationary' };

function asked(changes: Partial<SolveInput>): SolveInput {
  return { body: earth, theory: 'second', start, free: ['inclinationRad'], conditions: [sun], ...changes };
}

function reasonOf(changes: Partial<SolveInput>) {
  const answer = solveOrbit(asked(changes));
  if (answer.ok) throw new Error(`expected a reason, got ${JSON.stringify(answer.mean)}`);
  return { ...answer.reason, nearest: answer.nearest };
}

function orbitOf(changes: Partial<SolveInput>) {
  const answer = solveOrbit(asked(changes));
  if (!answer.ok) throw new Error(`expected an orbit, got ${answer.reason.text}`);
  return answer;
}

const track = (revolutions: number, days: number): OrbitCondition => ({ kind: 'repeat', revolutions, days });
const perigee = (km: number): OrbitCondition => ({ kind: 'perigeeAltitude', km });
const apogee = (km: number): OrbitCondition => ({ kind: 'apogeeAltitude', km });

describe('solveOrbit', () => {
  it('gives every solution, the one nearest to the start first', () => {
    for (const inclinationRad of [1, 2]) {
      const { mean, all } = orbitOf({ conditions: [still], start: { ...start, inclinationRad } });
      expect(all).toHaveLength(2);
      expect(mean).toBe(all[0]);
      const i = mean.inclinationRad * degPerRad;
      expect(Math.abs(i - (inclinationRad < 1.5 ? 63.43 : 116.57))).toBeLessThan(0.1);
    }
  });

  it('finds both inclinations of one nodal period, and the one eccentricity of a node rate at a held a', () => {
    const period = periods(earth, { ...start, inclinationRad: 1 }, 'second').nodalS;
    expect(orbitOf({ conditions: [{ kind: 'nodalPeriod', s: period }] }).all).toHaveLength(2);
    const held = { ...start, semiMajorAxisKm: 20_000, inclinationRad: 1.3 };
    const at = (eccentricity: number) => secularRates(earth, { ...held, eccentricity }, 'second').nodeRadPerS;
    const { all } = orbitOf({
      free: ['eccentricity'],
      conditions: [{ kind: 'nodeRate', radPerS: at(0.3) }],
      start: held,
    });
    expect(all.map(({ eccentricity }) => eccentricity)).toEqual([expect.closeTo(0.3, 9)]);
  });

  it('leaves alone what is held, node and anomaly too', () => {
    const { mean } = orbitOf({});
    expect(mean).toEqual({ ...start, inclinationRad: mean.inclinationRad });
  });

  it('works on a retrograde rotator', () => {
    const conditions = [track(3000, 1)];
    const { mean } = orbitOf({
      body: bodies.venus,
      free: ['semiMajorAxisKm'],
      conditions,
      start: { ...start, semiMajorAxisKm: 7000 },
    });
    const rates = secularRates(bodies.venus, mean, 'second');
    const spin = bodies.venus.rotationRadPerS;
    expect((rates.meanAnomalyRadPerS + rates.perigeeRadPerS) / Math.abs((spin ?? 0) - rates.nodeRadPerS)).toBeCloseTo(
      3000,
      6,
    );
  });

  it('settles perigee with a frozen eccentricity, alone and under other conditions', () => {
    const alone = orbitOf({ free: ['eccentricity'], conditions: [{ kind: 'frozen' }] }).mean;
    const plain = frozenOrbit(earth, start);
    expect(plain).toMatchObject({ ok: true, eccentricity: alone.eccentricity, perigeeRad: alone.perigeeRad });
    const free = ['semiMajorAxisKm', 'eccentricity', 'inclinationRad'] as const;
    const { mean } = orbitOf({ free, conditions: [sun, track(501, 35), { kind: 'frozen' }] });
    const held = frozenOrbit(earth, mean);
    if (!held.ok) throw new Error(held.message);
    expect(Math.abs(mean.eccentricity - held.eccentricity)).toBeLessThan(1e-12);
    expect(mean.perigeeRad).toBe(held.perigeeRad);
    const sunRadPerS = (2 * Math.PI) / (365.2422 * 86_400);
    expect(secularRates(earth, mean, 'second').nodeRadPerS / sunRadPerS).toBeCloseTo(1, 10);
    expect(
      orbitOf({ free: ['eccentricity', 'semiMajorAxisKm'], conditions: [perigee(700), { kind: 'frozen' }] }).ok,
    ).toBe(true);
  });

  it('takes 28 revolutions in 2 days for 14 in 1, and says so', () => {
    const two = orbitOf({ free: ['semiMajorAxisKm'], conditions: [track(28, 2)] });
    const one = orbitOf({ free: ['semiMajorAxisKm'], conditions: [track(14, 1)] });
    expect(two.mean).toEqual(one.mean);
    expect(one.notes).toEqual([]);
    expect(two.notes).toEqual(['28 revolutions in 2 days are the same track as 14 in 1: solved as that.']);
  });

  it('answers an orbit that hits the ground, and says that it does', () => {
    const { notes } = orbitOf({
      free: ['semiMajorAxisKm'],
      start: { ...start, eccentricity: 0.2, inclinationRad: 98.6 / degPerRad },
    });
    expect(notes.join()).toMatch(/perigee is 50\d\.\d km below the surface/);
  });
});

describe('conditionWorkings', () => {
  it('shows what has to hold, what was asked and what the orbit has', () => {
    const conditions = [sun, track(143, 10), perigee(700), { kind: 'frozen' }] as const;
    const { mean } = orbitOf({ free: ['semiMajorAxisKm', 'inclinationRad'], conditions: [sun, track(143, 10)] });
    const [node, closure, height, frozen] = conditionWorkings({ body: earth, theory: 'second', mean, conditions });
    expect(node).toMatchObject({ formula: 'Ω̇ = 2π / year', asked: '0.9856°/day', reached: '0.9856°/day' });
    expect(Math.abs(node?.residual ?? 1)).toBeLessThan(1e-12);
    expect(closure).toMatchObject({ label: 'Repeat of 143 revolutions in 10 days', asked: closure?.reached });
    expect(height).toMatchObject({ quantity: 'perigee altitude', asked: '700.000 km' });
    expect(height?.residual).toBeCloseTo((mean.semiMajorAxisKm - 6378.137 - 700) / 7078.137, 12);
    expect(frozen?.residual).toBeLessThan(0);
  });
});

describe('no orbit: the reason and the nearest thing that exists', () => {
  it('names the cosine that it would take and where such orbits end', () => {
    const high = { ...start, semiMajorAxisKm: 6378.137 + 6100 };
    const { kind, text, nearest } = reasonOf({ theory: 'first', start: high });
    expect(kind).toBe('noSolution');
    expect(text).toBe(
      'cos i would have to be −1.04 at a mean altitude of 6100 km: the node rate there reaches at most 0.9513°/day at i 180°; circular Sun-synchronous orbits end at a mean altitude of 5974 km.',
    );
    expect(nearest?.inclinationRad).toBe(Math.PI);
  });

  it('gives the range of what can be had, and the inclination nearest to it', () => {
    const { text, nearest } = reasonOf({ conditions: [{ kind: 'perigeeRate', radPerS: -1e-6 }] });
    expect(text).toMatch(
      /^The perigee rate runs from −3\.\d+°\/day to 13\.\d+°\/day, whatever the inclination; −4\.9504°/,
    );
    expect((nearest?.inclinationRad ?? 0) * degPerRad).toBeCloseTo(90, 6);
  });

  it('says how far below the surface an orbit would be', () => {
    const { text } = reasonOf({ free: ['semiMajorAxisKm'], conditions: [{ kind: 'nodalPeriod', s: 4900 }] });
    expect(text).toMatch(/mean a of 62\d\d km and e 0, whose p .* less than the radius of Earth, 6378 km/);
  });

  it('offers nothing below the surface unless the start lies there', () => {
    const low = (semiMajorAxisKm: number) =>
      reasonOf({
        free: ['semiMajorAxisKm'],
        conditions: [{ kind: 'nodalPeriod', s: 4900 }],
        start: { ...start, semiMajorAxisKm, eccentricity: 0.3 },
      }).nearest;
    const perigeeRadiusKm = (semiMajorAxisKm: number) => 0.7 * (low(semiMajorAxisKm)?.semiMajorAxisKm ?? Number.NaN);
    expect(perigeeRadiusKm(10_000)).toBeGreaterThan(6378.136);
    expect(perigeeRadiusKm(8000)).toBeLessThan(6378.136);
  });

  it('says what the nearest misses', () => {
    const { text } = reasonOf({ free: ['semiMajorAxisKm'], conditions: [{ kind: 'nodalPeriod', s: 4900 }] });
    expect(text).toMatch(/ The nearest orbit, a 63\d\d km, e 0 and i 98\.000°, does not meet this: nodal period /);
  });

  it('writes minutes, degrees a day and the true minus', () => {
    const { text } = reasonOf({ free: ['semiMajorAxisKm'], conditions: [{ kind: 'nodalPeriod', s: 4900 }] });
    expect(text).toContain('nodal period 84.');
    expect(text).toMatch(/ min\.$/);
    expect(reasonOf({ conditions: [track(-14, 1)] }).text).toMatch(/but it is −14\.$/);
  });

  it('names an eccentricity that no orbit has, and the circle as the nearest', () => {
    const { text, nearest } = reasonOf({ free: ['eccentricity'], conditions: [perigee(800)] });
    expect(text).toMatch(/would need an eccentricity of −0\.0141/);
    expect(nearest?.eccentricity).toBe(0);
  });

  it('says of a line of shapes that even its best is not enough', () => {
    const free = ['semiMajorAxisKm', 'eccentricity', 'inclinationRad'] as const;
    const { text, nearest } = reasonOf({ free, conditions: [perigee(9000), sun, still] });
    expect(text).toMatch(/^cos i would even at best have to be −\d\.\d\d at a mean altitude of 9000 km/);
    expect(nearest?.inclinationRad).toBe(Math.PI);
  });
});

describe('conditions that cannot count together', () => {
  const shape = ['semiMajorAxisKm', 'eccentricity'] as const;
  const all = [...shape, 'inclinationRad'] as const;
  const cases: readonly [string, Partial<SolveInput>, string, RegExp, (readonly number[])?][] = [
    [
      'two node rates',
      { free: ['semiMajorAxisKm', 'inclinationRad'], conditions: [sun, { kind: 'nodeRate', radPerS: -1e-6 }] },
      'conflict',
      /^Sun-synchronous and node rate −4\.9504°\/day conflict: .* 0\.9856°\/day against −4\.9504/,
      [0, 1],
    ],
    [
      'the same twice',
      { free: shape, conditions: [sun, sun] },
      'redundant',
      /^Sun-synchronous and Sun-synchronous ask for the same node rate/,
      [0, 1],
    ],
    [
      'a node rate typed as the one that follows the Sun',
      { free: shape, conditions: [sun, { kind: 'nodeRate', radPerS: 0.985647 / degPerRad / 86_400 }] },
      'redundant',
      /^Sun-synchronous and node rate 0\.9856°\/day ask for the same node rate: one of them is redundant/,
      [0, 1],
    ],
    [
      'a node rate a little off',
      { free: shape, conditions: [sun, { kind: 'nodeRate', radPerS: 0.98561 / degPerRad / 86_400 }] },
      'conflict',
      /conflict: .* 0\.98565°\/day against 0\.98561°\/day/,
      [0, 1],
    ],
    [
      'the same track twice',
      { free: all, conditions: [track(14, 1), sun, track(28, 2)] },
      'redundant',
      /Repeat of 14 revolutions in 1 day and repeat of 14/,
      [0, 2],
    ],
    [
      'another track',
      { free: shape, conditions: [track(14, 1), track(43, 3)] },
      'conflict',
      /14\.000000 a nodal day against 14\.333333/,
      [0, 1],
    ],
    [
      'altitudes upside down',
      { free: shape, conditions: [perigee(800), apogee(600)] },
      'conflict',
      /perigee lies above apogee/,
      [0, 1],
    ],
    [
      'both altitudes for one element',
      { free: ['semiMajorAxisKm', 'inclinationRad'], conditions: [perigee(500), apogee(600)] },
      'conflict',
      /both settle the semi-major axis/,
      [0, 1],
    ],
    [
      'a repeat, its period and another node rate',
      { free: all, conditions: [track(14, 1), { kind: 'nodalPeriod', s: 6100 }, sun] },
      'conflict',
      /^Repeat of 14 .* and Sun-synchronous conflict/,
      [0, 2],
    ],
    [
      'perigee still and a perigee rate',
      { free: shape, conditions: [still, { kind: 'perigeeRate', radPerS: 1e-7 }] },
      'conflict',
      /0°\/day against 0\.4950/,
      [0, 1],
    ],
    [
      'more conditions than free elements',
      { conditions: [sun, track(14, 1)] },
      'tooMany',
      /2 conditions cannot be met by 1 free element \(inclination\): free the semi-major axis and eccentricity/,
    ],
    ['fewer', { free: all, conditions: [sun] }, 'tooFew', /1 for 3 free elements/],
    [
      'an altitude with the shape held',
      { conditions: [perigee(500)] },
      'held',
      /turns on semi-major axis and eccentricity, and both are held/,
      [0],
    ],
    [
      'frozen with e held',
      { free: ['semiMajorAxisKm'], conditions: [{ kind: 'frozen' }] },
      'held',
      /Frozen settles the eccentricity/,
      [0],
    ],
    [
      'frozen with both altitudes',
      { free: all, conditions: [perigee(500), apogee(600), { kind: 'frozen' }] },
      'conflict',
      /^Perigee altitude .*, apogee altitude .* and Frozen conflict: all three settle the/,
    ],
    [
      'both rates at a held inclination in first order',
      {
        theory: 'first',
        free: shape,
        conditions: [
          { kind: 'nodeRate', radPerS: -5e-7 },
          { kind: 'perigeeRate', radPerS: (-5e-7 * (5 * 0.25 - 1)) / (-2 * 0.5) },
        ],
        start: { ...start, inclinationRad: Math.PI / 3 },
      },
      'redundant',
      /redundant/,
    ],
    [
      'a still perigee at the critical inclination',
      {
        theory: 'first',
        free: ['semiMajorAxisKm'],
        conditions: [still],
        start: { ...start, inclinationRad: Math.acos(Math.sqrt(0.2)) },
      },
      'undetermined',
      /holds whatever the semi-major axis/,
      [0],
    ],
  ];
  for (const [name, changes, kind, text, conditions] of cases) {
    it(`${name}: ${kind}`, () => {
      const reason = reasonOf(changes);
      expect(reason.text).toMatch(text);
      expect(reason.kind).toBe(kind);
      if (conditions) expect(reason.conditions).toEqual(conditions);
    });
  }
});

describe('bad input', () => {
  const counts: readonly [number, number][] = [
    [0, 1],
    [14, 0],
    [-14, 1],
    [14.5, 1],
    [14, Number.NaN],
    [1e9, 7e7],
    [Number.POSITIVE_INFINITY, 1],
  ];
  for (const [revolutions, days] of counts) {
    it(`${revolutions} revolutions in ${days} days are refused in words`, () => {
      const { kind, text } = reasonOf({ free: ['semiMajorAxisKm'], conditions: [track(revolutions, days)] });
      expect(kind).toBe('badInput');
      expect(text).toMatch(/whole number of|at most/);
    });
  }

  it('says what a body of the user lacks', () => {
    const bare = customBody({ name: 'Skerry', muKm3PerS2: 4e5, radiusKm: 6400, zonals: [0, 0, 1e-3] });
    expect(reasonOf({ body: bare })).toMatchObject({
      kind: 'missing',
      text: 'Sun-synchronous needs the year of Skerry, which is not known.',
    });
    expect(reasonOf({ body: bare, conditions: [track(14, 1)] })).toMatchObject({
      kind: 'missing',
      text: 'A repeat ground track needs the rotation of Skerry, which is not known.',
    });
    const round = customBody({ name: 'Skerry', muKm3PerS2: 4e5, radiusKm: 6400, zonals: [] });
    expect(reasonOf({ body: round, conditions: [still] }).text).toBe(
      'Perigee stationary needs the J2 of Skerry, which is not known.',
    );
    expect(orbitOf({ body: bare, conditions: [still] }).all).toHaveLength(2);
  });

  it('refuses rates, periods, altitudes, names and held elements that make no sense', () => {
    const kinds: readonly Partial<SolveInput>[] = [
      { conditions: [{ kind: 'nodeRate', radPerS: Number.NaN }] },
      { conditions: [{ kind: 'nodalPeriod', s: -1 }] },
      { free: ['semiMajorAxisKm'], conditions: [perigee(-7000)] },
      { free: ['semiMajorAxisKm'], conditions: [perigee(Number.POSITIVE_INFINITY)] },
      { conditions: [{ kind: 'geostationary' } as unknown as OrbitCondition] },
      { conditions: [null as unknown as OrbitCondition] },
      { free: [] },
      { free: ['inclinationRad', 'inclinationRad'] },
      { free: ['nodeRad' as 'inclinationRad'] },
      { start: { ...start, eccentricity: 1 } },
      { start: { ...start, semiMajorAxisKm: -7000 } },
      { free: ['semiMajorAxisKm'], start: { ...start, inclinationRad: 4 } },
    ];
    for (const changes of kinds) expect(reasonOf(changes), JSON.stringify(changes)).toMatchObject({ kind: 'badInput' });
  });

  it('needs no start for what is free', () => {
    const { mean } = orbitOf({ start: { ...start, inclinationRad: Number.NaN } });
    expect(mean.inclinationRad * degPerRad).toBeCloseTo(98.21, 1);
  });
});
