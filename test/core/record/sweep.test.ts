import { describe, expect, it } from 'vitest';
import { bodies } from '../../../core/bodies/bodies';
import { solveOrbit } from '../../../core/design/solveOrbit';
import { degPerRad, radPerDeg } from '../../../core/numerics/angles';
import type { MeanElements } from '../../../core/orbit/elements';
import type { Limit } from '../../../core/record/limits';
import { readingSpec } from '../../../core/record/readings/readings';
import { limitCrossings, type Sweep, type SweepRequest, sweepReading } from '../../../core/record/sweep';
import { sweepSentence } from '../../../core/record/sweepHeadline';
import { meanWith, startingRange, sweptElements, sweptWords } from '../../../core/record/sweptElements';

const mean: MeanElements = {
  semiMajorAxisKm: 6938.137,
  eccentricity: 0.0012,
  inclinationRad: 97.6 * radPerDeg,
  nodeRad: 1,
  perigeeRad: 1.5,
  meanAnomalyRad: 0,
};
const point = { body: bodies.earth, mean, epochJd: null };

function placesBetween(from: number, to: number, count: number): Float64Array {
  return Float64Array.from({ length: count }, (_, index) => from + ((to - from) * index) / (count - 1));
}
const inclinations = placesBetween(93 * radPerDeg, 103 * radPerDeg, 101);

function swept(request: Partial<SweepRequest> = {}): Sweep {
  const result = sweepReading({ point, reading: 'nodeRate', element: 'inclination', places: inclinations, ...request });
  if (!result.ok) throw new Error(`expected a sweep, got: ${result.reason}`);
  return result.sweep;
}
const sunRate = (360 / 365.2421897 / 86_400) * radPerDeg;
const atSunRate: Limit = { reading: 'nodeRate', bound: 'atMost', value: sunRate };

describe('a sweep', () => {
  it('is the reading itself at every place, in both orders', () => {
    const { values, first } = swept();
    const evaluate = readingSpec('nodeRate')?.evaluate;
    for (const index of [0, 37, 100]) {
      const there = { ...point, mean: { ...mean, inclinationRad: inclinations[index] ?? 0 } };
      expect(values[index]).toBe(evaluate?.(there, 'second'));
      expect(first?.[index]).toBe(evaluate?.(there, 'first'));
    }
  });

  it('has one line where no theory comes in', () => {
    expect(
      swept({ reading: 'perigeeAltitude', element: 'eccentricity', places: placesBetween(0, 0.01, 5) }).first,
    ).toBe(null);
  });

  it('meets a limit where the orbit that solves for it lies', () => {
    const solved = solveOrbit({
      body: point.body,
      theory: 'second',
      start: mean,
      free: ['inclinationRad'],
      conditions: [{ kind: 'nodeRate', radPerS: sunRate }],
    });
    const [crossing, ...others] = limitCrossings(swept(), atSunRate);
    expect(others).toEqual([]);
    expect(solved.ok && solved.mean.inclinationRad).toBeCloseTo(crossing ?? 0, 12);
  });

  it('meets a limit twice where the reading turns between', () => {
    const sweep = swept({ reading: 'nodeRate', places: placesBetween(0, Math.PI, 181) });
    const slow: Limit = { reading: 'perigeeRate', bound: 'atLeast', value: 0 };
    expect(limitCrossings(sweep, { ...slow, reading: 'nodeRate' })).toHaveLength(1);
    const perigee = swept({ reading: 'perigeeRate', places: placesBetween(0, Math.PI, 181) });
    const critical = limitCrossings(perigee, slow).map((rad) => rad * degPerRad);
    expect(critical).toHaveLength(2);
    expect(critical[0]).toBeCloseTo(63.4, 0);
    expect((critical[0] ?? 0) + (critical[1] ?? 0)).toBeCloseTo(180, 6);
  });

  it('is not a number where there is no such orbit', () => {
    const altitudes = placesBetween(-50, 50, 3);
    expect([...swept({ element: 'meanAltitude', places: altitudes }).values].map(Number.isFinite)).toEqual([
      false,
      true,
      true,
    ]);
    const none = swept({ settle: () => null });
    expect([...none.values].some(Number.isFinite)).toBe(false);
    expect(sentence(none)).toBe('No orbit meets the conditions as inclination goes from 93° to 103°.');
  });

  it('keeps conditions by settling each point anew', () => {
    const synchronous = (start: MeanElements) => {
      const solved = solveOrbit({
        body: point.body,
        theory: 'second',
        start,
        free: ['inclinationRad'],
        conditions: [{ kind: 'nodeRate', radPerS: sunRate }],
      });
      return solved.ok ? solved.mean : null;
    };
    const { values } = swept({ element: 'meanAltitude', places: placesBetween(400, 900, 11), settle: synchronous });
    for (const value of values) expect(value).toBeCloseTo(sunRate, 15);
  });

  it('of a reading that the orbit lacks says why', () => {
    expect(sweepReading({ point, reading: 'localTimeAscending', element: 'node', places: inclinations })).toEqual({
      ok: false,
      reason: 'Needs an epoch.',
    });
  });

  it('of 61 heights takes less than a quarter of a second', () => {
    let bestMs = Number.POSITIVE_INFINITY;
    for (let round = 0; round < 5; round += 1) {
      const start = performance.now();
      swept({ reading: 'leastHeight', element: 'meanAltitude', places: placesBetween(300, 900, 61) });
      bestMs = Math.min(bestMs, performance.now() - start);
    }
    console.log(`61 heights: ${bestMs.toFixed(0)} ms`);
    expect(bestMs).toBeLessThan(250);
  });
});

function sentence(sweep: Sweep, limits: readonly Limit[] = [], readingUnit?: string): string {
  return sweepSentence(sweep, {
    label: readingSpec(sweep.request.reading)?.label ?? '',
    readingUnit,
    elementUnit: undefined,
    limits: limits.map((limit) => ({
      limit,
      entry: { reading: limit.reading, bound: limit.bound, text: '', unit: '' },
    })),
  });
}

describe('the sentence of a sweep', () => {
  it('says how the reading goes and where it crosses a limit', () => {
    expect(sentence(swept(), [atSunRate])).toMatch(
      /^Node rate rises from \+0\.38\d+ to \+1\.6\d+ °\/day as inclination goes from 93° to 103°; it crosses your limit ≤ 0\.9856474 at 97\.6\d+°\.$/,
    );
  });

  it('falls, lies between, or stays', () => {
    expect(sentence(swept({ reading: 'localTimeDrift', places: placesBetween(Math.PI / 2, Math.PI, 3) }))).toContain(
      'rises from',
    );
    expect(sentence(swept({ reading: 'perigeeRate', places: placesBetween(0, 1, 11) }))).toContain('falls from');
    expect(sentence(swept({ reading: 'perigeeRate', places: placesBetween(0, Math.PI, 31) }))).toContain(
      'lies between',
    );
    expect(sentence(swept({ reading: 'nodeRate', element: 'perigee', places: placesBetween(0, 3, 4) }))).toContain(
      'stays at',
    );
  });

  it('says that all of it keeps or breaks a limit', () => {
    expect(sentence(swept(), [{ ...atSunRate, value: 1 }])).toContain('all of it keeps your limit');
    expect(sentence(swept(), [{ ...atSunRate, value: 0 }])).toContain('all of it breaks your limit');
  });
});

describe('the elements of a sweep', () => {
  it('are put where they are read', () => {
    for (const element of sweptElements) {
      const { from, to } = sweptWords[element].domain(point);
      const value = from + 0.37 * (Math.min(to, 2000) - from);
      const there = meanWith(point, element, value);
      expect(there && sweptWords[element].valueOf({ ...point, mean: there })).toBeCloseTo(value, 9);
    }
  });

  it('hold the apogee while the perigee moves', () => {
    const there = meanWith(point, 'perigeeAltitude', 300);
    expect(there && there.semiMajorAxisKm * (1 + there.eccentricity)).toBeCloseTo(6938.137 * 1.0012, 9);
  });

  it('do not exist beyond their domain', () => {
    expect(meanWith(point, 'eccentricity', -0.001)).toBeNull();
    expect(meanWith(point, 'eccentricity', 1)).toBeNull();
    expect(meanWith(point, 'inclination', 3.2)).toBeNull();
    expect(meanWith(point, 'perigeeAltitude', 600)).toBeNull();
    expect(meanWith(point, 'meanAltitude', Number.NaN)).toBeNull();
  });

  it('start from a round range that holds the orbit', () => {
    for (const element of sweptElements) {
      const { from, to } = startingRange(point, element, element === 'meanAltitude' ? 1 / 1.852 : 1);
      const value = sweptWords[element].valueOf(point);
      expect(from).toBeLessThan(to);
      expect(from).toBeLessThanOrEqual(value);
      expect(to).toBeGreaterThanOrEqual(value - 1e-9);
      expect(meanWith(point, element, from)).not.toBeNull();
      expect(meanWith(point, element, to)).not.toBeNull();
    }
    const deg = startingRange(point, 'inclination', degPerRad);
    expect([deg.from * degPerRad, deg.to * degPerRad].map((each) => Number(each.toFixed(9)))).toEqual([93, 103]);
  });
});
