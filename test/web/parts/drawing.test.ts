import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { arcPath, arcSpanDays, arrowHead, diamondPath, niceTicks, squarePath } from '../../../web/parts/drawing';

const ranges = fc
  .tuple(fc.double({ min: -1e6, max: 1e6, noNaN: true }), fc.double({ min: 1e-6, max: 1e6, noNaN: true }))
  // A range far narrower than its place on the axis has no digits left for its ticks.
  .filter(([low, width]) => width > Math.abs(low) * 1e-4)
  // An end that is zero but for rounding is taken for zero.
  .map(([low, width]) => [Math.abs(low) < width * 1e-6 ? 0 : low, low + width] as const)
  .filter(([low, high]) => Math.abs(high) > (high - low) * 1e-6);

describe('ticks', () => {
  it('are round, rise evenly and stay in the range', () => {
    fc.assert(
      fc.property(ranges, fc.integer({ min: 2, max: 12 }), ([low, high], count) => {
        const ticks = niceTicks(low, high, count);
        const step = (ticks[1] ?? 1) - (ticks[0] ?? 0);
        const rounding = (high - low) * 1e-6;
        for (const [place, tick] of ticks.entries()) {
          expect(tick).toBeGreaterThanOrEqual(low - rounding);
          expect(tick).toBeLessThanOrEqual(high + rounding);
          expect(Math.abs(tick - (ticks[0] ?? 0) - place * step)).toBeLessThan(rounding);
        }
        if (ticks.length > 1) expect(step.toExponential(3)).toMatch(/^[125]\.000e/);
      }),
    );
  });

  it('are none where the range is empty', () => {
    expect(niceTicks(5, 5, 4)).toEqual([]);
    expect(niceTicks(0, 0, 4)).toEqual([]);
  });

  it('are about as many as asked for', () => {
    fc.assert(
      fc.property(ranges, fc.integer({ min: 2, max: 12 }), ([low, high], count) => {
        const { length } = niceTicks(low, high, count);
        expect(length).toBeLessThanOrEqual(count + 1);
        expect(length).toBeGreaterThanOrEqual(Math.floor(count / 2.5));
      }),
    );
  });

  it('have zero among them, as a plain 0, where it is in the range', () => {
    expect(niceTicks(-5, 5, 5)).toEqual([-4, -2, 0, 2, 4]);
    expect(niceTicks(0, 0.3, 3)).toEqual([0, 0.1, 0.2, 0.3]);
    fc.assert(
      fc.property(ranges, fc.integer({ min: 2, max: 12 }), ([low, high], count) => {
        const ticks = niceTicks(low, high, count);
        expect(ticks.some((tick) => Math.abs(tick) === 0)).toBe(low <= 0 && high >= 0);
      }),
    );
  });
});

describe('the span of the arcs', () => {
  it('is the longest in which nothing sweeps more than half a turn', () => {
    expect(arcSpanDays(0.0172)).toBe(100);
    expect(arcSpanDays(0.0172, -0.06)).toBe(30);
    expect(arcSpanDays(-2)).toBe(1);
    expect(arcSpanDays(0)).toBe(3650);
  });

  it('is the shortest one where even a day sweeps more', () => {
    expect(arcSpanDays(50)).toBe(1);
  });

  it('never lets an arc go round, unless a day is too long already', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: -3, max: 3, noNaN: true }), { minLength: 1, maxLength: 3 }), (rates) => {
        const days = arcSpanDays(...rates);
        if (days > 1) for (const rate of rates) expect(Math.abs(rate) * days).toBeLessThan(Math.PI);
      }),
    );
  });
});

describe('paths', () => {
  it('close squares and diamonds around their centre', () => {
    expect(squarePath(10, 20, 3)).toBe('M7 17h6v6h-6z');
    expect(diamondPath(10, 20, 3)).toBe('M10 17l3 3l-3 3l-3 -3z');
  });

  it('turn arcs counter-clockwise on a screen whose y points down', () => {
    expect(arcPath([0, 0], 10, 0, Math.PI / 2)).toBe('M10 0A10 10 0 0 0 0 -10');
    expect(arcPath([0, 0], 10, 0, -Math.PI / 2)).toBe('M10 0A10 10 0 0 1 0 10');
    expect(arcPath([0, 0], 10, 0, 1.5 * Math.PI)).toBe('M10 0A10 10 0 1 0 0 10');
  });

  it('put the tip of an arrow on the arc', () => {
    expect(arrowHead([0, 0], 10, 0, true)).toBe('M14.5 9L10 0L5.5 9');
    expect(arrowHead([0, 0], 10, 0, false)).toBe('M14.5 -9L10 0L5.5 -9');
  });
});
