import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bodies } from '../../../../core/bodies/bodies';
import { twoPi } from '../../../../core/numerics/angles';
import { periods } from '../../../../core/orbit/periods';
import { secularRates } from '../../../../core/orbit/secularRates';
import { evaluate, symbolsIn } from '../../../../core/record/formula';
import type { ReadingId } from '../../../../core/record/readings/reading';
import { readingsOf } from '../../../../core/record/readings/readings';
import type { Working, WorkingLine } from '../../../../core/record/workings/working';
import { workingOf } from '../../../../core/record/workings/workingOf';

const orbits = fc.record({
  /** Perigee radius over the body's: outside the body, where the second order is a small correction. */
  perigeeRadii: fc.double({ min: 1.05, max: 6, noNaN: true }),
  eccentricity: fc.double({ min: 0, max: 0.7, noNaN: true }),
  inclinationRad: fc.double({ min: 0, max: Math.PI, noNaN: true }),
  nodeRad: fc.double({ min: 0, max: 6.28, noNaN: true }),
  perigeeRad: fc.double({ min: 0, max: 6.28, noNaN: true }),
  meanAnomalyRad: fc.constant(0),
});
const body = fc.constantFrom(bodies.earth, bodies.mars, bodies.venus, bodies.jupiter);
const epochJd = 2461485.9375;

/** Follows the lines with nothing but the inputs, the constants and the lines above. */
function followed(working: Working, lines: readonly WorkingLine[]): number {
  const values: Record<string, number> = {};
  for (const { symbol, value } of [...working.inputs, ...working.constants]) values[symbol.id] = value;
  for (const { symbol, expr } of lines) values[symbol.id] = evaluate(expr, values);
  return values[working.result ?? ''] ?? Number.NaN;
}

/** 1e-12 relative, of the larger of the value and what it is the difference of. */
function expectClose(actual: number, expected: number, scale = Math.abs(expected)) {
  expect(Math.abs(actual - expected)).toBeLessThanOrEqual(1e-12 * Math.max(scale, Math.abs(expected)));
}

/** Where a reading is a difference of larger numbers, rounding counts against those. */
const scales: Partial<Record<ReadingId, number>> = {
  nodeRate: 1e-6,
  perigeeRate: 1e-6,
  eCos: 1,
  eSin: 1,
  perigeeAltitude: 1e6,
  apogeeAltitude: 1e6,
  localTimeDrift: 1,
  localTimeAscending: 24,
  localTimeDescending: 24,
};

describe('workings', () => {
  it('lead, line by line, to the reading by first and by second order', () => {
    fc.assert(
      fc.property(body, orbits, (where, { perigeeRadii, ...angles }) => {
        const semiMajorAxisKm = (perigeeRadii * where.equatorialRadiusKm) / (1 - angles.eccentricity);
        const mean = { ...angles, semiMajorAxisKm };
        const point = { body: where, mean, epochJd };
        for (const reading of readingsOf(point)) {
          // Near a stationary perigee the period is a number divided by a difference.
          if (reading.id === 'apsidalPeriod') continue;
          const working = workingOf(point, reading.id);
          if (working.result === null) continue;
          const scale = scales[reading.id] ?? 0;
          expectClose(followed(working, working.lines), reading.orders?.first ?? reading.value, scale);
          expectClose(working.firstOrder, reading.orders?.first ?? reading.value, scale);
          if (reading.orders === null) continue;
          expectClose(followed(working, working.secondLines), reading.orders.second, scale);
        }
      }),
      { numRuns: 200 },
    );
  });

  it('lead to the apsidal period away from a stationary perigee, to 1e-12', () => {
    const mean = {
      semiMajorAxisKm: 6718,
      eccentricity: 0.03,
      inclinationRad: 0.9,
      nodeRad: 0,
      perigeeRad: 1,
      meanAnomalyRad: 0,
    };
    const working = workingOf({ body: bodies.earth, mean, epochJd: null }, 'apsidalPeriod');
    expectClose(working.firstOrder, twoPi / secularRates(bodies.earth, mean, 'first').perigeeRadPerS);
    expectClose(working.secondOrder ?? 0, twoPi / secularRates(bodies.earth, mean, 'second').perigeeRadPerS);
  });

  it('use no symbol that is not an input, a constant or a line above', () => {
    const mean = {
      semiMajorAxisKm: 7178,
      eccentricity: 0.001,
      inclinationRad: 1.72,
      nodeRad: 1,
      perigeeRad: 2,
      meanAnomalyRad: 0,
    };
    const point = { body: bodies.earth, mean, epochJd };
    for (const { id } of readingsOf(point)) {
      const working = workingOf(point, id);
      const given = [...working.inputs, ...working.constants].map(({ symbol }) => symbol.id);
      for (const lines of [working.lines, working.secondLines]) {
        const known = new Set(given);
        for (const { expr, symbol } of lines) {
          expect(symbolsIn(expr).filter((id) => !known.has(id))).toEqual([]);
          known.add(symbol.id);
        }
      }
    }
  });

  it('close with a line in the units of people', () => {
    const mean = {
      semiMajorAxisKm: 7178.137,
      eccentricity: 0,
      inclinationRad: 1.72,
      nodeRad: 0,
      perigeeRad: 0,
      meanAnomalyRad: 0,
    };
    const point = { body: bodies.earth, mean, epochJd };
    const find = (id: ReadingId) => readingsOf(point).find((reading) => reading.id === id);
    const last = (id: ReadingId) => workingOf(point, id).secondLines.at(-1);
    expect(last('nodeRate')?.symbol.unit).toBe('deg/day');
    expect(last('nodeRate')?.value).toBeCloseTo((find('nodeRate')?.value ?? 0) * 86_400 * (180 / Math.PI), 12);
    expect(last('nodalPeriod')?.value).toBeCloseTo(periods(bodies.earth, mean, 'second').nodalS / 60, 10);
    expect(last('westwardShift')?.symbol.unit).toBe('km');
  });
});
