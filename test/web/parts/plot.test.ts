import { describe, expect, it } from 'vitest';
import { sampleAfterKey, sampleAt, steersCursor } from '../../../web/parts/plotCursor';
import { spreadLabels } from '../../../web/parts/plotLabels';
import { heightIn, roundStep, valueRange, valueTicks } from '../../../web/parts/plotScale';

describe('the range of values', () => {
  it('holds zero and every value, with room at both ends', () => {
    const { least, greatest } = valueRange(
      [
        [0, 5, 10],
        [0, 6, 12],
      ],
      0.001,
    );
    expect(least).toBeLessThan(0);
    expect(greatest).toBeGreaterThan(12);
  });

  it('does not blow up rounding noise into a slope', () => {
    expect(valueRange([[0, 1e-17]], 0.001)).toEqual({ least: -0.0005, greatest: 0.0005 });
  });

  it('puts its foot at 0 and its head at 1', () => {
    expect(heightIn({ least: -5, greatest: 15 }, -5)).toBe(0);
    expect(heightIn({ least: -5, greatest: 15 }, 15)).toBe(1);
    expect(heightIn({ least: -5, greatest: 15 }, 0)).toBe(0.25);
  });
});

describe('ticks of values', () => {
  it('take steps of 1, 2 or 5 times a power of ten', () => {
    expect(roundStep(20.4, 3)).toBe(10);
    expect(roundStep(0.9, 5)).toBeCloseTo(0.2, 12);
    expect(roundStep(2163, 5)).toBe(500);
  });

  it('write a true minus sign and only the digits that the step needs', () => {
    const texts = valueTicks({ least: -22, greatest: 2 }, 3, { plus: true }).map(({ text }) => text);
    expect(texts).toEqual(['\u221220', '\u221210', '0']);
    const fine = valueTicks({ least: 0, greatest: 0.0011 }, 3, { plus: true }).map(({ text }) => text);
    expect(fine).toEqual(['0', '+0.0005', '+0.0010']);
  });

  it('are never more than asked for by one', () => {
    for (const most of [2, 3, 5, 8]) {
      for (const greatest of [0.37, 1, 9.9, 1802, 54_321]) {
        const ticks = valueTicks({ least: -greatest / 10, greatest }, most, { plus: true });
        expect(ticks.length).toBeGreaterThan(0);
        expect(ticks.length).toBeLessThanOrEqual(most + 1);
      }
    }
  });
});

describe('labels at line ends', () => {
  it('stay at their lines where there is room', () => {
    expect(spreadLabels([20, 80], 18, 100)).toEqual([20, 80]);
  });

  it('move apart about their middle where they would overlap, keeping their order', () => {
    const [upper = 0, lower = 0] = spreadLabels([52, 50], 18, 100);
    expect(upper - lower).toBeCloseTo(18, 12);
    expect((upper + lower) / 2).toBeCloseTo(51, 12);
  });

  it('stay inside the plot with half their height', () => {
    expect(spreadLabels([1, 2], 18, 100)).toEqual([9, 27]);
    expect(spreadLabels([99], 18, 100)).toEqual([91]);
  });

  it('push their neighbours on', () => {
    const placed = spreadLabels([40, 45, 60], 18, 200);
    expect((placed[1] ?? 0) - (placed[0] ?? 0)).toBeCloseTo(18, 12);
    expect((placed[2] ?? 0) - (placed[1] ?? 0)).toBeCloseTo(18, 12);
  });
});

describe('the cursor', () => {
  it('moves by a sample, a tenth, or to an end by key, and stays inside', () => {
    expect(sampleAfterKey('ArrowRight', 10, 240)).toBe(11);
    expect(sampleAfterKey('ArrowLeft', 0, 240)).toBe(0);
    expect(sampleAfterKey('PageDown', 100, 240)).toBe(76);
    expect(sampleAfterKey('Home', 100, 240)).toBe(0);
    expect(sampleAfterKey('End', 100, 240)).toBe(240);
    expect(sampleAfterKey('Tab', 100, 240)).toBeNull();
  });

  it('goes to the sample nearest to a finger, and to an end beyond the edge', () => {
    expect(sampleAt(250, 500, 240)).toBe(120);
    expect(sampleAt(-30, 500, 240)).toBe(0);
    expect(sampleAt(999, 500, 240)).toBe(240);
    expect(sampleAt(3, 0, 240)).toBe(0);
  });

  it('waits for a finger to move across, since it may only want to scroll', () => {
    expect(steersCursor('touch', 2)).toBe(false);
    expect(steersCursor('touch', -7)).toBe(true);
    expect(steersCursor('mouse', 0)).toBe(true);
  });
});
