import { describe, expect, it } from 'vitest';
import {
  type Candidate,
  limitMargins,
  type ReadingId,
  readingsOf,
  readLimits,
  type SweptElement,
  settleOrbit,
  sweepSentence,
  sweptWords,
  unitOf,
} from '../../../../core/index';
import { drawSweep, settledReason } from '../../../../web/size/sweep/drawSweep';
import { cursorText, nearestSample, sweepModel, sweepRow, tableSamples } from '../../../../web/size/sweep/sweepModel';
import { candidateWith, resolved } from '../candidates';

const plain = candidateWith({ perigeeAltitude: '550', apogeeAltitude: '570', inclination: '97.6' });
const synchronous: Candidate = {
  ...plain,
  conditions: [{ kind: 'sunSynchronous', settles: 'inclinationRad', texts: {} }],
};
const limited: Candidate = {
  ...plain,
  limits: [
    { reading: 'nodeRate', bound: 'atMost', text: '1', unit: 'deg/day' },
    { reading: 'perigeeAltitude', bound: 'atLeast', text: '500', unit: 'km' },
  ],
};

interface Wanted {
  readonly candidate?: Candidate;
  readonly id?: ReadingId;
  readonly element?: SweptElement;
  readonly range?: readonly [string, string];
}

function drawn({ candidate = plain, id = 'nodeRate', element = 'inclination', range = ['96', '100'] }: Wanted = {}) {
  const entered = resolved(candidate);
  const settled = settleOrbit(candidate, entered);
  const orbit = settled.ok ? settled.orbit : entered;
  const readings = readingsOf(orbit);
  const elementUnit = unitOf(sweptWords[element].quantity);
  return drawSweep({
    candidate,
    orbit,
    id,
    reading: readings.find((reading) => reading.id === id),
    element,
    range: { from: range[0], to: range[1], unit: elementUnit.id },
    elementUnit,
    readingUnit: undefined,
    limits: limitMargins(readLimits(candidate), readings),
    settle: settleOrbit,
  });
}

function shownOf(wanted: Wanted = {}) {
  const { shown, reason } = drawn(wanted);
  if (!shown) throw new Error(`expected a sweep, got: ${reason}`);
  return shown;
}

describe('a sweep as drawn', () => {
  it('has both orders in the line language, the limit of its reading alone, and the orbit as a point on it', () => {
    const shown = shownOf({ candidate: limited });
    const model = sweepModel(shown);
    expect(model.lines.map(({ pattern, hue, mark }) => [pattern, hue, mark])).toEqual([
      ['first', 'node', 'square'],
      ['second', 'node', 'square'],
    ]);
    expect(model.levels).toMatchObject([{ beyond: 'above', label: '≤ 1' }]);
    expect(model.levels?.[0]?.at).toBeCloseTo(1, 12);
    expect(model.point?.x).toBeCloseTo(97.6, 9);
    const second = model.lines[1]?.values;
    const at = nearestSample(shown.grid, 97.6);
    expect(second?.[at]).toBeCloseTo(model.point?.value ?? 0, 6);
    expect(model.isSigned).toBe(true);
  });

  it('is one solid line where no theory comes in', () => {
    const model = sweepModel(shownOf({ id: 'speedAtPerigee', element: 'meanAltitude', range: ['400', '700'] }));
    expect(model.lines.map(({ pattern, hue, mark }) => [pattern, hue, mark])).toEqual([['geometry', 'ink', 'circle']]);
    expect(model.isSigned).toBe(false);
  });

  it('says each place in words, with what it breaks', () => {
    const shown = shownOf({ candidate: limited });
    const last = shown.grid.length - 1;
    expect(sweepRow(shown, last)).toMatchObject({ place: '100°', broken: ['≤ 1'] });
    expect(sweepRow(shown, 0)).toMatchObject({ place: '96°', broken: [] });
    expect(cursorText(shown, last)).toMatch(/^\+1\.28\d+ °\/day, first order \+1\.28\d+; breaks your limit ≤ 1$/);
  });

  it('keeps the conditions along the way', () => {
    const shown = shownOf({ candidate: synchronous, element: 'meanAltitude', range: ['400', '900'] });
    const { values } = shown.sweep;
    expect(Math.max(...values) - Math.min(...values)).toBeLessThan(1e-14);
    expect(sweepSentence(shown.sweep, shown.writing)).toContain('stays at +0.985647 °/day');
  });

  it('leaves a gap where the conditions have no orbit', () => {
    const shown = shownOf({ candidate: synchronous, element: 'meanAltitude', range: ['4000', '8000'] });
    expect(sweepSentence(shown.sweep, shown.writing)).toMatch(/There is no such orbit at \d+ of the \d+ points\.$/);
    const last = sweepRow(shown, shown.grid.length - 1);
    expect(last).toMatchObject({ value: 'no such orbit' });
    expect(Number.isNaN(sweepModel(shown).lines[1]?.values.at(-1))).toBe(true);
  });

  it('is refused for an element that a condition settles, in words', () => {
    expect(drawn({ candidate: synchronous })).toMatchObject({
      shown: null,
      reason:
        'Inclination is settled by the condition “Sun-synchronous”: drop it, or let it settle another element, to sweep this.',
    });
    const frozen = { ...plain, conditions: [{ kind: 'frozen', settles: 'eccentricity', texts: {} }] };
    expect(settledReason(frozen, 'perigee')).toContain('“Frozen”: drop it to sweep this');
    expect(settledReason(frozen, 'perigeeAltitude')).toContain('Perigee altitude is settled');
    expect(settledReason(frozen, 'meanAltitude')).toBe('');
  });

  it('is not drawn from a range in error', () => {
    expect(drawn({ range: ['100', '96'] })).toMatchObject({ shown: null, reason: '', read: { ok: false } });
  });

  it('has a table of nine rows from end to end', () => {
    expect(tableSamples(201)).toEqual([0, 25, 50, 75, 100, 125, 150, 175, 200]);
    expect(tableSamples(9)).toHaveLength(9);
  });

  it('finds the place nearest to a value', () => {
    const { grid } = shownOf();
    expect(nearestSample(grid, 90)).toBe(0);
    expect(nearestSample(grid, 120)).toBe(grid.length - 1);
    expect(grid[nearestSample(grid, 98.01)]).toBeCloseTo(98, 1);
  });
});
