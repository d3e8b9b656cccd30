import { describe, expect, it } from 'vitest';
import { type Reading, unitOf } from '../../../core/index';
import { doubtText, quantityText, roundedText } from '../../../web/parts/readingText';
import { documentOf } from '../state/support';

const readingOf = (id: string): Reading => {
  const found = documentOf().readings.value.find((reading) => reading.id === id);
  if (!found) throw new Error(`Expected a reading ${id}`);
  return found;
};

describe('a quantity as text', () => {
  it('is in the unit asked for, with the sign of degrees', () => {
    expect(quantityText('length', 1852, 'km')).toMatchObject({ value: expect.stringMatching(/1.?852/), unit: 'km' });
    expect(Number(quantityText('length', 1852, 'NM').value.replace(/[^\d.]/g, ''))).toBeCloseTo(1000, 3);
    expect(quantityText('angle', Math.PI / 2).unit).toMatch(/^°/);
    expect(quantityText('angleRate', 1e-7, 'deg/yr').unit).toMatch(/^°\//);
  });
});

describe('a rounded figure', () => {
  const perKm = 1 / unitOf('length', 'km').perCore;
  const text = (value: number, plus = false) => roundedText('length', value * perKm, { unitId: 'km', plus });

  it('has two significant figures', () => {
    expect(text(1.234)).toBe('1.2');
    expect(text(0.001234)).toBe('0.0012');
    expect(text(0.1)).toBe('0.10');
    expect(text(9.5)).toBe('9.5');
  });

  it('has no decimals above ten, seven at most, and zero is zero', () => {
    expect(text(12.34)).toBe('12');
    expect(text(1e-12)).toBe('0.0000000');
    expect(Number(text(0))).toBe(0);
  });

  it('carries its sign where it is a change', () => {
    expect(text(1.25, true)).toMatch(/^\+1\.[23]$/);
    expect(text(-1.2, true)).toMatch(/^[-−]1\.2$/);
  });
});

describe('the doubt of a reading', () => {
  it('is empty where no figure is known, or it is none', () => {
    const reading = readingOf('nodeRate');
    expect(doubtText({ ...reading, doubt: null })).toBe('');
  });

  it('stands behind a plus and minus sign', () => {
    const reading = documentOf().readings.value.find(
      ({ doubt }) => doubt !== undefined && doubt !== null && doubt.size > 0,
    );
    if (!reading) throw new Error('Expected a reading whose doubt is known');
    expect(doubtText(reading)).toMatch(/^± \d/);
  });
});
