import { describe, expect, it } from 'vitest';
import { blankCandidate, fieldTexts } from '../../../core/index';
import { foldText, type ListedEntry, listedEntries, matches, sortEntries } from '../../../web/book/listing';
import { createSummaryKeeper, orbitSummary } from '../../../web/book/orbitSummary';
import type { BookEntry } from '../../../web/store/readStored';

const candidateOf = (name: string, { notes = '', perigee = '550', apogee = '560', inclination = '97.6' } = {}) => {
  const blank = blankCandidate({ id: name, name });
  const texts = {
    ...fieldTexts({ node: '0', perigee: '0', meanAnomaly: '0' }),
    perigeeAltitude: perigee,
    apogeeAltitude: apogee,
    inclination,
  };
  return { ...blank, notes, entry: { ...blank.entry, texts } };
};
const entryOf = (name: string, savedAtIso: string, options = {}): BookEntry => ({
  kind: 'readable',
  id: name,
  name,
  revision: 1,
  createdAtIso: savedAtIso,
  savedAtIso,
  demo: false,
  candidate: candidateOf(name, options),
});
const unreadable: BookEntry = {
  ...entryOf('Broken', '2028-01-04T00:00:00Z'),
  kind: 'unreadable',
  message: 'schema: written by a newer version',
};
const openOne = candidateOf('Open one');
const listOf = (entries: readonly BookEntry[]): ListedEntry[] =>
  listedEntries({
    entries,
    summaryOf: createSummaryKeeper(),
    openId: openOne.id,
    open: () => ({ candidate: openOne, summary: orbitSummary(openOne) }),
  });
const names = (entries: readonly ListedEntry[]) => entries.map(({ name }) => name);

describe('the list', () => {
  it('puts the open orbit in front where it was never saved', () => {
    const [first] = listOf([entryOf('Saved', '2028-01-01T00:00:00Z')]);
    expect(first).toMatchObject({ name: 'Open one', saved: null, isOpen: true });
  });

  it('marks the open orbit where it stands in the book', () => {
    const listed = listOf([entryOf('Open one', '2028-01-01T00:00:00Z')]);
    expect(listed).toHaveLength(1);
    expect(listed[0]).toMatchObject({ isOpen: true, saved: { revision: 1 } });
  });

  it('keeps an unreadable record with its message', () => {
    expect(listOf([unreadable]).at(-1)?.content).toEqual({ kind: 'unreadable', message: unreadable.message });
  });
});

describe('search', () => {
  const entry = listOf([entryOf('Ostsee Größe', '2028-01-01T00:00:00Z', { notes: 'Radar über Łódź' })])[1];
  if (!entry) throw new Error('Expected an entry');

  it.each(['ostsee', 'GROSSE', 'größe', 'uber lodz', 'radar ostsee', '', '  '])('finds it by “%s”', (query) => {
    expect(matches(entry, query)).toBe(true);
  });

  it('finds an orbit by its fingerprint, with or without the gap', () => {
    const { content } = entry;
    if (content.kind !== 'readable' || content.summary.kind !== 'orbit') throw new Error('Expected an orbit');
    const letters = content.summary.fingerprint;
    expect(letters).toMatch(/^[A-Z]{3} [A-Z]{4}$/);
    expect(matches(entry, letters.toLowerCase())).toBe(true);
    expect(matches(entry, letters.replace(' ', ''))).toBe(true);
  });

  it('needs every word', () => expect(matches(entry, 'radar nordsee')).toBe(false));
  it('finds an unreadable record by its name', () => {
    const broken = listOf([unreadable]).at(-1);
    expect(broken && matches(broken, 'broken')).toBe(true);
  });
  it('folds accents and letters that do not come apart', () => expect(foldText('Ærø Übung')).toBe('aero ubung'));
});

describe('order', () => {
  const entries = listOf([
    entryOf('Sat 10', '2028-01-03T00:00:00Z', { perigee: '500', apogee: '900', inclination: '60' }),
    entryOf('Sat 9', '2028-01-01T00:00:00Z', { perigee: '690', apogee: '700', inclination: '98' }),
    entryOf('atlas', '2028-01-02T00:00:00Z', { perigee: 'soon' }),
    unreadable,
  ]);

  it('by save puts the unsaved first, then the latest', () => {
    expect(names(sortEntries(entries, 'saved'))).toEqual(['Open one', 'Broken', 'Sat 10', 'atlas', 'Sat 9']);
  });
  it('by name counts in numbers and overlooks case', () => {
    expect(names(sortEntries(entries, 'name'))).toEqual(['atlas', 'Broken', 'Open one', 'Sat 9', 'Sat 10']);
  });
  it('by altitude takes the mean of both, and what has none last', () => {
    expect(names(sortEntries(entries, 'altitude'))).toEqual(['Open one', 'Sat 9', 'Sat 10', 'atlas', 'Broken']);
  });
  it('by inclination puts what has none last', () => {
    expect(names(sortEntries(entries, 'inclination'))).toEqual(['Sat 10', 'Open one', 'Sat 9', 'atlas', 'Broken']);
  });
});
