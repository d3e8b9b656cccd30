import { describe, expect, it } from 'vitest';
import { blankCandidate, type Candidate, type OrbitEntry } from '../../../core/index';
import { changesBetween } from '../../../web/book/changesBetween';

const before = blankCandidate({ id: 'one', name: 'Skerry' });
const withEntry = (entry: Partial<OrbitEntry>): Candidate => ({ ...before, entry: { ...before.entry, ...entry } });
const withTexts = (texts: Partial<OrbitEntry['texts']>): Candidate =>
  withEntry({ texts: { ...before.entry.texts, ...texts } });

describe('changes between two revisions', () => {
  it('names no change where there is none', () => expect(changesBetween(before, { ...before })).toEqual([]));

  it('gives the field as typed before and after', () => {
    expect(changesBetween(before, withTexts({ inclination: '97.68', epoch: '2028-01-01' }))).toEqual([
      'Epoch empty → 2028-01-01',
      'Inclination 97.6 → 97.68',
    ]);
  });

  it('names the form, and counts what belongs to the form left behind', () => {
    const after = withEntry({
      form: 'state',
      texts: { ...before.entry.texts, x: '7000', perigeeAltitude: '', apogeeAltitude: '' },
    });
    expect(changesBetween(before, after)).toEqual([
      'Entered as altitudes → state vector',
      'Position x empty → 7000',
      '2 fields of other forms',
    ]);
  });

  it('does not print two-line elements', () => {
    const first = withEntry({ form: 'twoLine', texts: { ...before.entry.texts, twoLine: '1 …' } });
    const second = withEntry({ form: 'twoLine', texts: { ...before.entry.texts, twoLine: '2 …' } });
    expect(changesBetween(first, second)).toEqual(['Two-line elements replaced']);
    expect(changesBetween({ ...second, entry: { ...second.entry, texts: before.entry.texts } }, second)).toEqual([
      'Two-line elements empty → given',
    ]);
  });

  it('says what happened to name, notes, body, constants and plans', () => {
    const after: Candidate = {
      ...before,
      name: 'Skerry B',
      notes: 'written',
      body: 'mars',
      gravitySet: 'WGS72',
      plans: { delivery: 1 },
    };
    expect(changesBetween(before, after)).toEqual([
      'Name “Skerry” → “Skerry B”',
      'Body Earth → Mars',
      'Gravity set EGM2008 → WGS72',
      'Notes added',
      'Plans changed',
    ]);
  });

  it('says which limits were set and taken out', () => {
    const high = { reading: 'perigeeAltitude', bound: 'atMost', text: '600', unit: 'km' };
    const low = { reading: 'nodeRate', bound: 'atLeast', text: '0,9', unit: 'deg/day' };
    const limited: Candidate = { ...before, limits: [high] };
    expect(changesBetween(limited, { ...before, limits: [low] })).toEqual([
      'Limit taken out: Perigee altitude at most 600 km',
      'Limit set: Node rate at least 0,9 °/day',
    ]);
    expect(changesBetween(limited, { ...before, limits: [high] })).toEqual([]);
    expect(changesBetween({ ...before, limits: [high, low] }, { ...before, limits: [low, high] })).toEqual([
      'Limits changed',
    ]);
  });
});
