import { describe, expect, it } from 'vitest';
import { type SweptElement, unitOf } from '../../../../core/index';
import { rangeAround, rangeInUnit, readRange, roundGrid } from '../../../../web/size/sweep/sweepRange';
import { candidateWith, resolved } from '../candidates';

const point = resolved(candidateWith({ perigeeAltitude: '540', apogeeAltitude: '560', inclination: '97.6' }));
const deg = unitOf('angle');
const km = unitOf('length');

function read(from: string, to: string, element: SweptElement = 'inclination') {
  const unit = element === 'inclination' ? deg : element === 'eccentricity' ? unitOf('ratio') : km;
  const result = readRange({ range: { from, to, unit: unit.id }, element, point, unit, most: 201 });
  return result.ok
    ? [result.grid.length, result.grid[0], result.grid.at(-1)]
    : Object.fromEntries(Object.entries(result.errors).map(([field, error]) => [field, error.message]));
}

describe('the range of a sweep', () => {
  it('is a grid of round places from end to end', () => {
    expect(read('93', '103')).toEqual([201, 93, 103]);
    expect(read('97,5', '98.1')).toEqual([121, 97.5, 98.1]);
    const grid = roundGrid(0, 1 / 3, 201);
    expect(grid.at(-1)).toBeCloseTo(1 / 3, 12);
    expect(grid.length).toBeLessThanOrEqual(202);
    expect([...roundGrid(93, 103, 201).slice(0, 4)]).toEqual([93, 93.05, 93.1, 93.15]);
  });

  it('that is empty or no number says so at each end', () => {
    expect(read('', 'wide')).toEqual({
      from: expect.stringContaining('From: Nothing is typed yet'),
      to: expect.stringContaining('To: “wide” is not a number'),
    });
  });

  it('upside down, or of no width, is said at its end', () => {
    expect(read('103', '93')).toEqual({ to: expect.stringContaining('upside down: type an end above 103°') });
    expect(read('97', '97')).toEqual({ to: expect.stringContaining('upside down') });
    expect(read('97', '97.0000001')).toEqual({ to: expect.stringContaining('too narrow') });
  });

  it('beyond where the element exists says where it does', () => {
    expect(read('-5', '190')).toEqual({
      from: 'Inclination lies between 0° and 180°; type a value in there.',
      to: 'Inclination lies between 0° and 180°; type a value in there.',
    });
    expect(read('0', '1', 'eccentricity')).toEqual({ to: expect.stringContaining('between 0 and 0.99') });
    expect(read('300', '600', 'perigeeAltitude')).toEqual({ to: expect.stringContaining('between 0 km and 560 km') });
    expect(read('-1', '1e300', 'meanAltitude')).toMatchObject({ from: expect.anything(), to: expect.anything() });
  });

  it('that reads two ways offers both', () => {
    const range = { from: '1,234', to: '2000', unit: 'km' };
    const result = readRange({ range, element: 'meanAltitude', point, unit: km, most: 201 });
    expect(!result.ok && result.errors.from?.choices?.map(({ text }) => text)).toEqual(['1.234', '1234']);
  });

  it('starts around the orbit, and follows a change of unit', () => {
    const around = rangeAround(point, 'meanAltitude', km);
    expect(around).toEqual({ from: '400', to: '700', unit: 'km' });
    const miles = rangeInUnit(around, 'meanAltitude', unitOf('length', 'NM'));
    expect(miles.from).toBe('215.9827214');
    expect(rangeInUnit(miles, 'meanAltitude', km)).toMatchObject({ from: '400', to: '700' });
    expect(rangeInUnit({ ...around, from: 'x' }, 'meanAltitude', unitOf('length', 'NM')).from).toBe('x');
  });
});
