import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readNumber } from '../../../core/index';
import { signTurned, stepped, steppedClock } from '../../../web/parts/stepping';

const steps = fc.constantFrom(10, 1, 0.1, 0.01, 0.001, 0.0001);
const counts = fc.integer({ min: -50, max: 50 });

/** A number as people type it, with at least as many decimals as the finest step, so that no step adds any. */
const typedFinely = fc
  .tuple(fc.integer({ min: -99_999_999, max: 99_999_999 }), fc.integer({ min: 4, max: 7 }))
  .map(([digits, decimals]) => (digits / 10 ** decimals).toFixed(decimals))
  .filter((text) => Number(text) !== 0);

const numberIn = (text: string | null): number => {
  const number = text === null ? null : readNumber(text);
  if (!number?.ok) throw new Error(`Expected a number, got ${text}`);
  return number.value;
};

describe('stepping a number', () => {
  it('there and back, in one stride or in many, returns the text', () => {
    fc.assert(
      fc.property(typedFinely, steps, counts, (text, step, count) => {
        const there = stepped(text, step, count) ?? '';
        expect(stepped(there, step, -count)).toBe(text);
        let walked = text;
        for (let taken = 0; taken < Math.abs(count); taken++) walked = stepped(walked, step, Math.sign(count)) ?? '';
        expect(walked).toBe(there);
      }),
    );
  });

  it('moves by the step to the last digit shown', () => {
    fc.assert(
      fc.property(typedFinely, steps, counts, (text, step, count) => {
        expect(numberIn(stepped(text, step, count))).toBeCloseTo(Number(text) + step * count, 6);
      }),
    );
  });

  it('keeps the decimals of the text, or takes those of the step', () => {
    expect(stepped('561.0', 1, 1)).toBe('562.0');
    expect(stepped('97', 0.01, 1)).toBe('97.01');
    expect(stepped('0.1', 0.1, 2)).toBe('0.3');
    expect(stepped('-0.01', 0.01, 1)).toBe('0.00');
    expect(stepped('0', 0.0001, -1)).toBe('-0.0001');
    expect(stepped(' 12.50 ', 1, 1)).toBe('13.50');
    expect(stepped('−5', 1, 1)).toBe('-4');
  });

  it('keeps a comma, and the text can be stepped on', () => {
    expect(stepped('97,68', 0.01, 1)).toBe('97,69');
    expect(stepped('1 234,5', 1, 1)).toBe('1235,5');
    expect(stepped('1.234,5', 1, 1)).toBe('1235.5');
    fc.assert(
      fc.property(
        fc.integer({ min: -9_999_999, max: 9_999_999 }),
        fc.integer({ min: 1, max: 5 }),
        steps,
        counts,
        (digits, decimals, step, count) => {
          const text = (digits / 10 ** decimals).toFixed(decimals).replace('.', ',');
          const there = stepped(text, step, count);
          if (!readNumber(text).ok) {
            expect(there).toBeNull();
            return;
          }
          expect(there).toContain(',');
          expect(numberIn(there)).toBeCloseTo(numberIn(text) + step * count, 5);
          expect(numberIn(stepped(there ?? '', step, -count))).toBeCloseTo(numberIn(text), 5);
        },
      ),
    );
  });

  it('never comes to a text that reads two ways', () => {
    expect(stepped('0,500', 1, 1)).toBe('1,5000');
    expect(stepped('1000,250', 1, -1)).toBe('999,2500');
    expect(stepped('-0,500', 1, -1)).toBe('-1,5000');
  });

  it('stays within bounds, the bounds among them', () => {
    expect(stepped('179.99', 0.01, 1, [0, 180])).toBe('180.00');
    expect(stepped('180', 0.01, 1, [0, 180])).toBeNull();
    expect(stepped('0', 0.01, -1, [0, 180])).toBeNull();
    fc.assert(
      fc.property(typedFinely, steps, counts, (text, step, count) => {
        const next = stepped(text, step, count, [-50, 50]);
        if (next !== null) expect(Math.abs(Number(next))).toBeLessThanOrEqual(50);
      }),
    );
  });

  it('gives nothing for a text that is no number', () => {
    for (const text of ['', ' ', 'high', '1,234', '--5', '1.2.3', '12:30']) expect(stepped(text, 1, 1)).toBeNull();
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 90 }), (text) => {
        expect(stepped(text, 1, 1) === null).toBe(!readNumber(text).ok);
      }),
    );
  });
});

describe('stepping a local time', () => {
  const two = (value: number) => String(value).padStart(2, '0');
  const clock = fc
    .tuple(fc.integer({ min: 0, max: 23 }), fc.integer({ min: 0, max: 59 }))
    .map(([hours, minutes]) => `${two(hours)}:${two(minutes)}`);

  it('there and back returns the text, over midnight too', () => {
    fc.assert(
      fc.property(
        clock,
        fc.constantFrom('', ':00', ':07.25', ':59'),
        fc.integer({ min: -5000, max: 5000 }),
        (time, seconds, minutes) => {
          const text = time + seconds;
          const there = steppedClock(text, minutes) ?? '';
          expect(there).toMatch(/^([01]\d|2[0-3]):[0-5]\d/);
          expect(there.endsWith(seconds)).toBe(true);
          expect(steppedClock(there, -minutes)).toBe(text);
        },
      ),
    );
  });

  it('wraps at midnight', () => {
    expect(steppedClock('23:59', 1)).toBe('00:00');
    expect(steppedClock('00:00', -1)).toBe('23:59');
    expect(steppedClock('12:00', 1440 * 3)).toBe('12:00');
  });

  it('makes a clock of decimal hours, and of a clock with another mark or none', () => {
    expect(steppedClock('10.5', 1)).toBe('10:31');
    expect(steppedClock('10,5', -1)).toBe('10:29');
    expect(steppedClock('9:05', 1)).toBe('09:06');
    for (const text of ['1030', '10h30', '10 : 30']) expect(steppedClock(text, 1)).toBe('10:31');
  });

  it('gives nothing for a text that is no time', () => {
    for (const text of ['', 'noon', '10:', ':30', '10:30:', '1:2:3:4']) expect(steppedClock(text, 1)).toBeNull();
  });
});

describe('turning the sign', () => {
  it('twice returns the text', () => {
    fc.assert(
      fc.property(typedFinely, (text) => {
        expect(signTurned(signTurned(text))).toBe(text);
        expect(Number(signTurned(text))).toBe(-Number(text));
      }),
    );
  });

  it('takes a true minus and a plus for what they are', () => {
    expect(signTurned('−5')).toBe('5');
    expect(signTurned(' +5 ')).toBe('-5');
    expect(signTurned('')).toBe('-');
    expect(signTurned('-')).toBe('');
  });
});
