import { describe, expect, it } from 'vitest';
import { formatClock, formatNumber, formatQuantity, formatSignificant, unitOf } from '../../../core/record/units';

describe('writing numbers', () => {
  it('uses the true minus sign and no minus before a zero', () => {
    expect(formatNumber(-1.25, { digits: 2 })).toBe('−1.25');
    expect(formatNumber(-0.001, { digits: 2 })).toBe('0.00');
  });

  it('parts thousands by a thin space from five figures on', () => {
    expect(formatNumber(1234567.5, { digits: 1 })).toBe('1\u2009234\u2009567.5');
    expect(formatNumber(6928.137, { digits: 3 })).toBe('6928.137');
  });

  it('shows the sign of a rate', () => {
    expect(formatQuantity('angleRate', 1.99e-7)).toBe('+0.985121');
    expect(formatQuantity('angleRate', -1.99e-7, 'deg/yr')).toMatch(/^−359\./);
  });

  it('writes infinity and what is no number', () => {
    expect(formatNumber(Number.NEGATIVE_INFINITY, { digits: 2 })).toBe('−∞');
    expect(formatNumber(Number.NaN, { digits: 2 })).toBe('–');
  });

  it('gives no digits to a perigee that takes over 1000 years to go round', () => {
    expect(formatQuantity('longDuration', 7e15)).toBe('over 365\u2009250');
    expect(formatQuantity('longDuration', 7e15, 'yr')).toBe('over 1000');
    expect(formatQuantity('longDuration', 86_400 * 100)).toBe('100.00');
  });

  it('writes formula numbers by significant digits', () => {
    expect(formatSignificant(0.00108262617)).toBe('0.00108262617');
    expect(formatSignificant(7.292115e-5)).toBe('7.292115 × 10⁻⁵');
    expect(formatSignificant(398600.4415)).toBe('398600.4415');
    expect(formatSignificant(-0.5)).toBe('−0.5');
  });

  it('rounds a clock over midnight', () => {
    expect(formatClock(10.5)).toBe('10:30:00');
    expect(formatClock(23.99999)).toBe('00:00:00');
    expect(formatClock(-0.5)).toBe('23:30:00');
  });

  it('falls back to the first unit where the asked one does not fit', () => {
    expect(unitOf('angle', 'km').symbol).toBe('deg');
    expect(formatQuantity('length', 1.852, 'NM')).toBe('1.000');
  });
});
