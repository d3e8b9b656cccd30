import { describe, expect, it } from 'vitest';
import {
  add,
  evaluate,
  fn,
  frac,
  group,
  mapSymbols,
  mul,
  neg,
  num,
  pow,
  sqrt,
  sym,
  symbolsIn,
} from '../../../core/record/formula';
import { formulaText } from '../../../core/record/formulaText';

const rate = mul(neg(frac(3, 2)), 'n', pow(group(frac('R', 'p')), 2), fn('cos', 'i'));

describe('a formula', () => {
  it('evaluates to what it says', () => {
    expect(evaluate(rate, { n: 2, R: 3, p: 6, i: 0 })).toBeCloseTo(-0.75, 15);
    expect(evaluate(add(sqrt(16), neg('x'), num(1)), { x: 2 })).toBe(3);
  });

  it('refuses a symbol without a value', () => {
    expect(() => evaluate(sym('n'), {})).toThrow('"n"');
  });

  it('lists its symbols once each', () => {
    expect(symbolsIn(mul(rate, 'n'))).toEqual(['n', 'R', 'p', 'i']);
  });

  it('reads as one line of text, with brackets where the line needs them', () => {
    expect(formulaText(rate, (id) => id)).toBe('−(3 / 2) · n · (R / p)^2 · cos(i)');
    expect(formulaText(add(mul(5, pow('c', 2)), num(-1)), (id) => id)).toBe('5 · c^2 − 1');
  });

  it('takes numbers in place of its symbols', () => {
    const numbers = mapSymbols(frac('R', 'p'), () => num(2));
    expect(evaluate(numbers, {})).toBe(1);
  });
});
