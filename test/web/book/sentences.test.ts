import { describe, expect, it } from 'vitest';
import { blankCandidate } from '../../../core/index';
import { orbitLine, orbitSummary } from '../../../web/book/orbitSummary';
import { savedWhen } from '../../../web/book/savedWhen';
import { countText, estimateText, headlineParts, type OpenOrbit } from '../../../web/book/sentences';

const sentence = (count: number, open: OpenOrbit) => Object.values(headlineParts(count, open)).join('');

describe('the headline', () => {
  it('says how many there are and what is open', () => {
    const open = { name: 'Skerry B, winter pass', inBook: true, changed: true };
    expect(sentence(6, open)).toBe('Six orbits in this book; Skerry B, winter pass is open and has unsaved changes.');
    expect(sentence(1, { ...open, changed: false })).toBe(
      'One orbit in this book; Skerry B, winter pass is open, as saved.',
    );
    expect(sentence(120, { ...open, name: ' ' })).toBe(
      '120 orbits in this book; An orbit without a name is open and has unsaved changes.',
    );
  });
  it('says so when the book is empty', () => {
    expect(sentence(0, { name: 'New orbit', inBook: false, changed: false })).toBe(
      'This book is empty; New orbit is open and not saved yet.',
    );
  });
  it('makes plurals', () => {
    expect([countText(1, 'match'), countText(2, 'match'), countText(13, 'change')]).toEqual([
      'One match',
      'Two matches',
      '13 changes',
    ]);
  });
});

describe('dates and sizes', () => {
  const now = new Date(2028, 2, 27, 18, 0);
  it('gives the time alone on the same day', () => {
    expect(savedWhen(new Date(2028, 2, 27, 9, 5).toISOString(), now)).toBe('today 09:05');
    expect(savedWhen(new Date(2027, 11, 3, 14, 2).toISOString(), now)).toBe('3 Dec 2027, 14:02');
    expect(savedWhen('long ago', now)).toBe('long ago');
  });
  it('gives room in sizes people know', () => {
    expect(estimateText({ usedBytes: 412_000, availableBytes: 2.5e9 })).toBe('0.4 MB used, about 2.5 GB free.');
    expect(estimateText({ usedBytes: 12e6, availableBytes: -5 })).toBe('12 MB used, about 0.0 MB free.');
  });
});

describe('the line of an orbit', () => {
  const candidate = blankCandidate({ id: 'one', name: 'one' });
  it('gives altitudes and inclination in the unit asked for', () => {
    const summary = orbitSummary(candidate);
    expect(orbitLine(summary, 'km')).toBe('550.0 × 550.0 km, 97.600°');
    expect(orbitLine(summary, 'NM')).toBe('297.0 × 297.0 NM, 97.600°');
  });
  it('names another body', () => {
    expect(orbitLine(orbitSummary({ ...candidate, body: 'mars' }), 'km')).toMatch(/^Mars: 550\.0 × 550\.0 km/);
  });
  it('says why there is no orbit', () => {
    const texts = { ...candidate.entry.texts, inclination: 'soon' };
    const summary = orbitSummary({ ...candidate, entry: { ...candidate.entry, texts } });
    expect(orbitLine(summary, 'km')).toBe('No orbit yet');
    expect(summary.kind === 'unsettled' && summary.message.length).toBeGreaterThan(10);
  });
});
