import { describe, expect, it } from 'vitest';
import { crossingsOnGrid, turningPlace } from '../../../core/numerics/crossings';

const grid = Array.from({ length: 21 }, (_, index) => index / 2);

describe('crossings on a grid', () => {
  it('are found with their sense, in order', () => {
    const found = crossingsOnGrid((x) => Math.sin(x - 0.1), grid);
    expect(found.map(({ rising }) => rising)).toEqual([true, false, true, false]);
    found.forEach(({ x }, index) => {
      expect(x).toBeCloseTo(0.1 + index * Math.PI, 12);
    });
  });

  it('count a zero that a sample hits once, and none that is only touched', () => {
    expect(crossingsOnGrid((x) => x - 2, grid)).toEqual([{ x: 2, rising: true }]);
    expect(crossingsOnGrid((x) => (x - 2) ** 2, grid)).toEqual([]);
  });

  it('do not count a start at zero, and count a stretch of zeros where it begins', () => {
    expect(crossingsOnGrid((x) => x, grid)).toEqual([]);
    expect(crossingsOnGrid((x) => Math.max(0, x - 5) + Math.min(0, x - 3), grid)).toEqual([{ x: 3, rising: true }]);
    expect(crossingsOnGrid(() => 0, grid)).toEqual([]);
  });

  it('leave out a sign that jumps', () => {
    expect(crossingsOnGrid((x) => (x < 3.3 ? -1 : 1), grid)).toEqual([]);
  });
});

describe('the place where something turns', () => {
  it('is found as closely as asked, either way', () => {
    const bounds = { from: 0, to: 10, within: 1e-6 };
    expect(turningPlace((x) => x > Math.PI, bounds)).toBeCloseTo(Math.PI, 6);
    expect(turningPlace((x) => x < Math.PI, bounds)).toBeCloseTo(Math.PI, 6);
  });
});
