import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { localTimeText, readLocalTime } from '../../../../core/record/entry/localTimeText';

describe('a local time as text', () => {
  it.each([
    ['10:30', 10.5],
    ['10:30:36', 10.51],
    [' 9:05 ', 9 + 5 / 60],
    ['10,5', 10.5],
    ['0', 0],
    ['23:59:59.5', 24 - 0.5 / 3600],
    ['1030', 10.5],
    ['0930', 9.5],
    ['10h30', 10.5],
    ['10 h 30 min', 10.5],
    ['10H30m36s', 10.51],
  ])('%j reads as %d h', (text, hours) => {
    expect(readLocalTime(text)).toBeCloseTo(hours, 12);
  });

  it.each(['24:00', '10:60', '10:30:60', '-1', '24', '10:3a', '10:', '', '2430', '1060', '930'])(
    '%j is refused',
    (text) => {
      expect(readLocalTime(text)).toBeNull();
    },
  );

  it('is written without a fraction where there is none', () => {
    expect(localTimeText(10.5)).toBe('10:30');
    expect(localTimeText(23.9999999999999)).toBe('00:00');
  });

  it('leaves the noise of a conversion out', () => {
    expect(localTimeText(10.5 - 1e-6 / 3600)).toBe('10:30');
    expect(localTimeText(10.5 - 1.2e-3 / 3600)).toBe('10:30');
    expect(localTimeText(10.51)).toBe('10:30:36');
    expect(localTimeText(10.5 + 0.25 / 3600)).toBe('10:30:00.25');
  });

  it('reads back to 1.5 ms, and closer where asked', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 23.9999, noNaN: true }), (hours) => {
        expect(Math.abs((readLocalTime(localTimeText(hours)) ?? 0) - hours) * 3600).toBeLessThan(1.6e-3);
        const close = readLocalTime(localTimeText(hours, (written) => Math.abs(written - hours) * 3600 < 1e-5)) ?? 0;
        expect(Math.abs(close - hours) * 3600).toBeLessThan(1.1e-5);
      }),
    );
  });
});
