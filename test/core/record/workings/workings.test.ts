import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bodies } from '../../../../core/bodies/bodies';
import type { Body } from '../../../../core/bodies/body';
import { twoPi } from '../../../../core/numerics/angles';
import { periods } from '../../../../core/orbit/periods';
import { secularRates } from '../../../../core/orbit/secularRates';
import { type Expr, evaluate, mapSymbols, mul, num, symbolsIn } from '../../../../core/record/formula';
import { formulaText } from '../../../../core/record/formulaText';
import type { ReadingId } from '../../../../core/record/readings/reading';
import { readingsOf } from '../../../../core/record/readings/readings';
import { formatSignificant } from '../../../../core/record/units';
import type { Working, WorkingLine, WorkingValue } from '../../../../core/record/workings/working';
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

type Shape = readonly [semiMajorAxisKm: number, eccentricity: number, inclinationDeg: number, perigeeDeg: number];
const deg = Math.PI / 180;
const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** The number a reader of the line types into a calculator, in the unit shown. */
function typedIn({ symbol, value }: WorkingValue): number {
  const plain = formatSignificant(value * symbol.perCore, 10)
    .replace(/\u2009/g, '')
    .replace('−', '-')
    .replace(/ × 10(⁻?)(.*)$/, (_, sign, digits) => {
      const power = [...digits].map((digit) => superscripts.indexOf(digit)).join('');
      return `e${sign === '⁻' ? '-' : ''}${power}`;
    });
  return Number(plain);
}

/** A calculator set to degrees: what is inside cos and sin is in degrees, all else stands as shown. */
function inDegrees(tree: Expr, working: Working): Expr {
  if (tree.kind !== 'fn') return 'of' in tree ? { ...tree, of: inDegrees(tree.of, working) } : inParts(tree, working);
  const isDegrees = symbolsIn(tree.of).every((id) =>
    working.inputs.some(({ symbol }) => symbol.id === id && symbol.unit === 'deg'),
  );
  return isDegrees ? { ...tree, of: mapSymbols(tree.of, (id) => mul(id, num(deg))) } : tree;
}

function inParts(tree: Expr, working: Working): Expr {
  const inner = (part: Expr) => inDegrees(part, working);
  switch (tree.kind) {
    case 'add':
      return { ...tree, terms: tree.terms.map(inner) };
    case 'mul':
      return { ...tree, factors: tree.factors.map(inner) };
    case 'frac':
      return { ...tree, over: inner(tree.over), under: inner(tree.under) };
    case 'pow':
      return { ...tree, base: inner(tree.base) };
    default:
      return tree;
  }
}

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
      { numRuns: 100 },
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

  const shapes: readonly (readonly [string, Body, Shape])[] = [
    ['a low orbit of the Earth', bodies.earth, [6928.137, 0, 97.679, 90]],
    ['a polar one', bodies.earth, [7078, 0.001, 90, 270]],
    ['one near the critical inclination', bodies.earth, [26_560, 0.72, 63.435, 270]],
    ['an ellipse', bodies.earth, [12_345.678, 0.4321, 28.5, 123.4567]],
    ['Mars', bodies.mars, [3796.19, 0.01, 92.9, 45]],
    ['Venus', bodies.venus, [6601.8, 0.05, 120, 200]],
    ['Jupiter', bodies.jupiter, [150_000, 0.3, 5, 33]],
  ];
  it.each(shapes)('reproduce on a pocket calculator from the numbers as shown, line by line: %s', (_, where, shape) => {
    const [semiMajorAxisKm, eccentricity, inclination, perigee] = shape;
    const angles = { inclinationRad: inclination * deg, perigeeRad: perigee * deg, nodeRad: 77.68 * deg };
    const point = { body: where, mean: { semiMajorAxisKm, eccentricity, ...angles, meanAnomalyRad: 0 }, epochJd };
    for (const { id } of readingsOf(point)) {
      const working = workingOf(point, id);
      for (const lines of [working.lines, working.secondLines]) {
        const shown: Record<string, number> = {};
        for (const row of [...working.inputs, ...working.constants]) shown[row.symbol.id] = typedIn(row);
        for (const { expr, ...row } of lines) {
          const onCalculator = evaluate(inDegrees(expr, working), shown);
          expect(Math.abs(onCalculator - typedIn(row)), `${id}, ${row.symbol.id}`).toBeLessThanOrEqual(
            1e-8 * Math.abs(onCalculator),
          );
          shown[row.symbol.id] = typedIn(row);
        }
        const result = lines.find(({ symbol }) => symbol.id === working.result);
        const exact = lines === working.lines ? working.firstOrder : working.secondOrder;
        if (result && id !== 'apsidalPeriod')
          expectClose(
            result.value / 1e4,
            (exact ?? 0) / 1e4,
            Math.abs(exact ?? 0) + (id === 'localTimeDrift' ? 1e-3 : 1e-6),
          );
      }
    }
  });

  it('name each line apart from what is put into it, and write signs once', () => {
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
      for (const lines of [working.lines, working.secondLines]) {
        const rows = [...working.inputs, ...working.constants, ...lines].map(({ symbol }) => symbol);
        const glyphs = rows.map(({ glyph, sub = '' }) => `${glyph}|${sub}`);
        expect(new Set(glyphs).size, `${id}: ${glyphs.join(' ')}`).toBe(glyphs.length);
        expect(glyphs.join('')).not.toContain('_');
        const text = lines.map(({ expr }) => formulaText(expr, (name) => name)).join('\n');
        expect(text).not.toMatch(/[+−] −|^0 \+/m);
        expect(JSON.stringify(lines)).not.toMatch(/"terms":\[[^\]]*\},\{"kind":"num","value":-/);
      }
    }
  });

  it('name each source once', () => {
    for (const body of [bodies.earth, bodies.mars]) {
      const mean = {
        semiMajorAxisKm: 7178,
        eccentricity: 0.001,
        inclinationRad: 1.72,
        nodeRad: 1,
        perigeeRad: 2,
        meanAnomalyRad: 0,
      };
      const sources = workingOf({ body, mean, epochJd }, 'westwardShift').constants.map(({ source }) => source);
      expect(new Set(sources).size).toBe(1);
      expect(sources[0]?.match(new RegExp(body.gravitySet, 'g'))).toHaveLength(1);
    }
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
    expect(last('nodeRate')?.value).toBeCloseTo((find('nodeRate')?.value ?? 0) * 86_400 * (180 / Math.PI), 9);
    expect(last('nodalPeriod')?.value).toBeCloseTo(periods(bodies.earth, mean, 'second').nodalS / 60, 7);
    expect(last('westwardShift')?.symbol.unit).toBe('km');
  });
});
