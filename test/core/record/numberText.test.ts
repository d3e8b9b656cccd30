import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readNumber } from '../../../core/record/numberText';

function read(text: string): number {
  const result = readNumber(text);
  if (!result.ok) throw new Error(result.message);
  return result.value;
}

function problemOf(text: string): string {
  const result = readNumber(text);
  return result.ok ? `read as ${result.value}` : result.problem;
}

describe('readNumber', () => {
  it.each([
    ['97.679', 97.679],
    ['97,67', 97.67],
    ['1.234', 1.234],
    ['0,234', 0.234],
    ['7078,123', 7078.123],
    ['.5', 0.5],
    [',5', 0.5],
    ['5.', 5],
    ['007', 7],
    ['-0', 0],
    ['+12', 12],
    [' 42\t', 42],
    ['\u221212.5', -12.5],
    ['\u201312.5', -12.5],
    ['- 3', -3],
    ['1e-3', 0.001],
    ['1.0826E-3', 1.0826e-3],
    ['1,08e+3', 1080],
    ['1.0826 × 10^-3', 1.0826e-3],
    ['1.5e\u22123', 0.0015],
    ['7 078.137', 7078.137],
    ['7\u202f078,137', 7078.137],
    ['7\u2009078\u2009137', 7078137],
    ["7'078.1", 7078.1],
    ['7\u2019078.1', 7078.1],
    ['1.234,5', 1234.5],
    ['1,234.5', 1234.5],
    ['1.234,567', 1234.567],
    ['1,234.567', 1234.567],
    ['1,234,567', 1234567],
    ['1.234.567', 1234567],
    ['1.234.567,8', 1234567.8],
    ['398 600.441 5', 398600.4415],
    ['0.001 082 626', 0.001082626],
    ['1e-400', 0],
  ])('reads %s as %d', (text, value) => {
    expect(Object.is(read(text), value)).toBe(true);
  });

  it.each(['', ' ', '\u00a0'])('calls "%s" empty', (text) => {
    expect(problemOf(text)).toBe('empty');
  });

  it.each([
    'abc',
    'NaN',
    'Infinity',
    '-inf',
    '1e',
    'e5',
    '--1',
    '1-',
    '1.2.3',
    '1,23,4',
    '12,34.5',
    '1.234,5.6',
    '1 2',
    '7 07.5',
    '1.2 3',
    '0x10',
    '97.4 km',
    '1e5.5',
    '.',
    ',',
    '-',
    "'5",
    '1..2',
    '1, 2',
    '٣',
  ])('calls "%s" not a number', (text) => {
    expect(problemOf(text)).toBe('notANumber');
  });

  it.each(['1e400', '-1e309', `${'9'.repeat(30)}e300`])('calls %s too large', (text) => {
    expect(problemOf(text)).toBe('tooLarge');
  });

  it('does not look into a huge paste, and says how long it is', () => {
    const result = readNumber('1'.repeat(10_000_000));
    expect(result).toMatchObject({ ok: false, problem: 'notANumber' });
    expect(result.ok ? '' : result.message).toContain('10000000 characters');
  });

  it.each([
    ['1,234', ['1.234', '1234']],
    ['-97,679', ['-97.679', '-97679']],
    ['\u2212123,456', ['-123.456', '-123456']],
    ['1,234e-3', ['1.234e-3', '1234e-3']],
  ])('asks which reading of %s is meant', (text, texts) => {
    const result = readNumber(text);
    if (result.ok) throw new Error('expected a question');
    expect(result.problem).toBe('ambiguous');
    expect(result.readings?.map((reading) => reading.text)).toEqual(texts);
    for (const reading of result.readings ?? []) expect(read(reading.text)).toBe(reading.value);
  });

  it('reads back whatever the language itself writes', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
        expect(read(String(value))).toBe(value + 0);
      }),
    );
  });

  it('reads a comma as it reads a point, unless it asks', () => {
    fc.assert(
      fc.property(fc.double({ min: -1e5, max: 1e5, noNaN: true }), fc.integer({ min: 0, max: 9 }), (value, digits) => {
        const text = value.toFixed(digits);
        const result = readNumber(text.replace('.', ','));
        if (result.ok) expect(result.value).toBe(Number(text) + 0);
        else expect(result.readings?.[0]?.value).toBe(Number(text));
      }),
    );
  });

  it('reads numbers grouped as in several countries', () => {
    const styles = [
      { thousands: ',', decimal: '.' },
      { thousands: '.', decimal: ',' },
      { thousands: '\u202f', decimal: ',' },
      { thousands: '\u2019', decimal: '.' },
    ];
    fc.assert(
      fc.property(fc.integer({ min: 1000, max: 99_999_999 }), fc.constantFrom(...styles), (whole, style) => {
        const grouped = String(whole).replace(/\B(?=(\d{3})+$)/g, style.thousands);
        expect(read(`${grouped}${style.decimal}25`)).toBe(whole + 0.25);
      }),
    );
  });

  it('never throws, whatever is typed', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 90 }), (text) => {
        expect(typeof readNumber(text).ok).toBe('boolean');
      }),
    );
  });
});
