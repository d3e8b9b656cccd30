import { describe, expect, it } from 'vitest';
import type { NearestRepeat } from '../../../../core/index';
import { worthNaming } from '../../../../web/size/tracks/nearestCycles';
import { placeAfter } from '../../../../web/size/tracks/useRowsInView';

describe('keys in the list', () => {
  it.each([
    ['ArrowDown', 4, 5],
    ['ArrowUp', 0, 0],
    ['PageDown', 4, 14],
    ['PageUp', 4, 0],
    ['Home', 70, 0],
    ['End', 3, 99],
    ['ArrowDown', 99, 99],
  ])('%s leads from %i to %i', (key, from, to) => expect(placeAfter(key, from, 10, 100)).toBe(to));

  it('leaves other keys alone', () => expect(placeAfter('a', 4, 10, 100)).toBeNull());
});

describe('tracks worth naming near an orbit', () => {
  const repeat = (revolutions: number, days: number, axisChangeKm: number): NearestRepeat => ({
    revolutions,
    days,
    axisChangeKm,
    semiMajorAxisKm: 7000,
    inclinationRad: 1,
    inclinationChangeRad: 0,
    trackSpacingKm: 1,
  });

  it('are those nearer than every shorter one', () => {
    const named = worthNaming([
      repeat(29, 2, 3),
      repeat(15, 1, -20),
      repeat(14, 1, 30),
      repeat(44, 3, 9),
      repeat(73, 5, -1),
    ]);
    expect(named.map(({ revolutions }) => revolutions)).toEqual([15, 29, 73]);
  });
});
