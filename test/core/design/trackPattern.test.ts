import { describe, expect, it } from 'vitest';
import { bodies } from '../../../core/bodies/bodies';
import { customBody } from '../../../core/bodies/customBody';
import { readCycle } from '../../../core/design/trackCycle';
import { equatorCrossings, trackPattern, trackStepOf } from '../../../core/design/trackPattern';

const twoPi = 2 * Math.PI;
const divisor = (a: number, b: number): number => (b === 0 ? a : divisor(b, a % b));

/** Coprime cycles from one revolution in two days to 16 a day. */
const cycles = [1, 2, 3, 4, 5, 7, 10, 11, 16, 29].flatMap((days) =>
  [0.5, 0.9, 1, 2, 7.3, 12.7, 14.2, 14.9, 15.5, 16]
    .map((rate) => ({ revolutions: Math.max(1, Math.round(rate * days)), days }))
    .filter(({ revolutions }) => divisor(revolutions, days) === 1),
);

/** East longitude of a pass in spacings, in [0, N), by turning the Earth under it: west stepping. */
const placeOf = (pass: number, { revolutions, days }: (typeof cycles)[number]) =>
  (((-pass * days) % revolutions) + revolutions) % revolutions;

describe('the pattern of a cycle', () => {
  it.each(cycles)('$revolutions in $days: neighbours are those found by looking at every pass', (cycle) => {
    const { revolutions, days } = cycle;
    const pattern = trackPattern(cycle);
    const passes = Array.from({ length: revolutions }, (_, index) => index + 1);
    const east = passes.find((pass) => placeOf(pass, cycle) === 1 % revolutions);
    const west = passes.find((pass) => placeOf(pass, cycle) === revolutions - 1);
    expect(pattern.eastNeighbour.pass).toBe(east);
    expect(pattern.westNeighbour.pass).toBe(west);
    expect(pattern.eastNeighbour.afterDays).toBeCloseTo(((east ?? 0) * days) / revolutions, 12);
    expect(Math.abs(pattern.eastNeighbour.afterDays - pattern.eastNeighbour.wholeDays)).toBeLessThanOrEqual(
      1 / revolutions + 1e-12,
    );
    if (revolutions > 1) expect(pattern.eastNeighbour.pass + pattern.westNeighbour.pass).toBe(revolutions);
  });

  it.each(cycles.filter(({ revolutions, days }) => revolutions > days))(
    '$revolutions in $days: sub-cycles are the days with a pass nearer than any before',
    (cycle) => {
      const { revolutions, days } = cycle;
      let nearest = Number.POSITIVE_INFINITY;
      const expected: { days: number; distance: number }[] = [];
      for (let day = 1; day <= days; day += 1) {
        const distances = Array.from({ length: revolutions }, (_, index) => index + 1)
          .filter((pass) => Math.abs((pass * days) / revolutions - day) <= 0.5)
          .map((pass) => Math.min(placeOf(pass, cycle), revolutions - placeOf(pass, cycle)));
        const distance = Math.min(...distances);
        if (distance < nearest) expected.push({ days: day, distance });
        nearest = Math.min(nearest, distance);
      }
      const { subCycles } = trackPattern(cycle);
      expect(subCycles.map((each) => ({ days: each.days, distance: Math.abs(each.eastSpacings) }))).toEqual(expected);
      expect(subCycles.at(-1)).toEqual({ days, eastSpacings: 0 });
    },
  );

  it.each(cycles)('$revolutions in $days: each slot of a step is flown on one day, at its place', (cycle) => {
    const { dayOfSlot } = trackPattern(cycle);
    expect([...dayOfSlot].sort((a, b) => a - b)).toEqual(Array.from({ length: cycle.days }, (_, day) => day));
    dayOfSlot.forEach((day, slot) => {
      expect((day * cycle.revolutions - slot) % cycle.days).toBe(0);
    });
  });

  it('of 143 in 10 days: neighbours after 7 days to the east, 3 to the west', () => {
    const { eastNeighbour, westNeighbour, revolutionsADay, subCycles } = trackPattern({ revolutions: 143, days: 10 });
    expect(eastNeighbour).toEqual({ pass: 100, afterDays: 1000 / 143, wholeDays: 7 });
    expect(westNeighbour).toEqual({ pass: 43, afterDays: 430 / 143, wholeDays: 3 });
    expect(revolutionsADay).toBe(14.3);
    expect(subCycles).toEqual([
      { days: 1, eastSpacings: 3 },
      { days: 3, eastSpacings: -1 },
      { days: 10, eastSpacings: 0 },
    ]);
  });

  it('is mirrored where tracks step east', () => {
    const west = trackPattern({ revolutions: 143, days: 10 });
    const east = trackPattern({ revolutions: 143, days: 10 }, 'east');
    expect(east.eastNeighbour).toEqual(west.westNeighbour);
    expect(east.stepRad).toBe(-west.stepRad);
    expect(east.subCycles.map(({ eastSpacings }) => eastSpacings)).toEqual([-3, 1, 0]);
  });

  it.each([
    { revolutions: 286, days: 20 },
    { revolutions: 14.3, days: 1 },
    { revolutions: 0, days: 1 },
  ])('of %j is refused: coprime whole numbers were expected', (cycle) => {
    expect(() => trackPattern(cycle)).toThrow(/coprime/);
    expect(() => equatorCrossings(cycle)).toThrow(/coprime/);
  });
});

describe('equator crossings', () => {
  it.each(cycles)(
    '$revolutions in $days: ascending ones are evenly spaced, each flown once, days in order',
    (cycle) => {
      const { revolutions, days } = cycle;
      const crossings = equatorCrossings(cycle, { firstLongitudeRad: 0.3 });
      const ascending = crossings.filter(({ node }) => node === 'ascending');
      expect(crossings.length).toBe(2 * revolutions);
      const places = ascending.map(({ longitudeRad }) => ((longitudeRad - 0.3) / twoPi) * revolutions);
      const slots = places.map((place) => ((Math.round(place) % revolutions) + revolutions) % revolutions);
      places.forEach((place) => {
        expect(Math.abs(place - Math.round(place))).toBeLessThan(1e-9);
      });
      expect(new Set(slots).size).toBe(revolutions);
      ascending.forEach(({ day, pass }) => {
        expect(day).toBe(Math.floor((pass * days) / revolutions) + 1);
        expect(slots[pass]).toBe(placeOf(pass, cycle));
      });
      crossings.forEach(({ longitudeRad }) => {
        expect(longitudeRad >= -Math.PI && longitudeRad < Math.PI).toBe(true);
      });
    },
  );

  it('descend half a turn on, less what the ground turns meanwhile', () => {
    const [up, down] = equatorCrossings({ revolutions: 15, days: 1 });
    expect((down?.longitudeRad ?? 0) - (up?.longitudeRad ?? 0)).toBeCloseTo(Math.PI - twoPi / 30, 12);
  });
});

describe('a typed cycle', () => {
  it('is taken as it is where it is coprime', () => {
    expect(readCycle({ revolutions: 143, days: 10 })).toEqual({
      ok: true,
      cycle: { revolutions: 143, days: 10 },
      note: null,
    });
  });

  it('is reduced, and said to be, where it is not', () => {
    const result = readCycle({ revolutions: 286, days: 20 });
    expect(result).toMatchObject({ ok: true, cycle: { revolutions: 143, days: 10 } });
    expect(result.ok && result.note).toMatch(/286 revolutions in 20 days close already after 143 in 10/);
  });

  it.each([
    [{ revolutions: 0, days: 1 }, 'revolutions'],
    [{ revolutions: -14, days: 1 }, 'revolutions'],
    [{ revolutions: 14.5, days: 1 }, 'revolutions'],
    [{ revolutions: 1e300, days: 1 }, 'revolutions'],
    [{ revolutions: Number.NaN, days: 1 }, 'revolutions'],
    [{ revolutions: 14, days: 0 }, 'days'],
    [{ revolutions: 14, days: 401 }, 'days'],
    [{ revolutions: 14, days: Number.POSITIVE_INFINITY }, 'days'],
  ] as const)('%j says what %s was expected to be', (cycle, field) => {
    const result = readCycle(cycle);
    expect(result).toMatchObject({ ok: false, field });
    expect(result.ok ? '' : result.message).toMatch(/whole number from 1/);
  });
});

describe('the way tracks step', () => {
  const mean = {
    semiMajorAxisKm: 8000,
    eccentricity: 0,
    inclinationRad: 1,
    nodeRad: 0,
    perigeeRad: 0,
    meanAnomalyRad: 0,
  };

  it('is west on the Earth, east on a retrograde rotator, unknown without a rotation', () => {
    expect(trackStepOf(bodies.earth, mean, 'second')).toBe('west');
    expect(trackStepOf(bodies.venus, mean, 'second')).toBe('east');
    const body = customBody({ name: 'still', muKm3PerS2: 4e5, radiusKm: 6000, zonals: [0, 0, 1e-3] });
    expect(trackStepOf(body, mean, 'second')).toBeNull();
  });
});
