import { describe, expect, it } from 'vitest';
import { blankCandidate } from '../../../core/record/blankCandidate';
import { parseCandidate } from '../../../core/record/candidateSchema';
import { canonicalText } from '../../../core/record/canonicalText';
import { migrateCandidate, migrateThrough } from '../../../core/record/migrate';

const blank = blankCandidate({ id: 'a1', name: 'Skerry' });
const paths = (input: unknown) => {
  const result = parseCandidate(input);
  return result.ok ? [] : result.errors.map(({ path }) => path);
};

describe('parsing a candidate', () => {
  it('returns a blank candidate unchanged, through its text and back', () => {
    expect(parseCandidate(JSON.parse(canonicalText(blank)))).toEqual({ ok: true, candidate: blank });
  });

  it('keeps keys it does not know inside conditions, limits and plans', () => {
    const later = {
      ...blank,
      conditions: [{ kind: 'later', deep: { list: [1, null, true] } }],
      limits: [{ reading: 'nodeRate', below: 2 }],
      plans: { upkeep: { burns: [{ epoch: 'x' }] } },
    };
    expect(parseCandidate(later)).toEqual({ ok: true, candidate: later });
  });

  it('names every field that is wrong at its own path', () => {
    const wrong = {
      ...blank,
      name: 7,
      body: 'pluto',
      entry: { ...blank.entry, form: 'guess', texts: { ...blank.entry.texts, node: null } },
    };
    expect(paths(wrong)).toEqual(['name', 'body', 'entry.form', 'entry.texts.node']);
  });

  it('says what is missing', () => {
    const { entry: _, ...rest } = blank;
    expect(parseCandidate(rest)).toMatchObject({
      ok: false,
      errors: [{ path: 'entry', message: expect.stringContaining('Missing') }],
    });
  });

  it('fills an absent text with an empty one', () => {
    const { bodyJ4: _, ...texts } = blank.entry.texts;
    expect(parseCandidate({ ...blank, entry: { ...blank.entry, texts } })).toEqual({ ok: true, candidate: blank });
  });

  it('refuses texts, names and notes beyond their caps, and takes them at the cap', () => {
    const long = (count: number) => 'x'.repeat(count);
    const withTexts = (twoLine: string) => ({
      ...blank,
      entry: { ...blank.entry, texts: { ...blank.entry.texts, twoLine } },
    });
    expect(paths({ ...blank, name: long(200), notes: long(20_000) })).toEqual([]);
    expect(paths({ ...blank, name: long(201), notes: long(20_001) })).toEqual(['name', 'notes']);
    expect(paths(withTexts(long(20_000)))).toEqual([]);
    expect(paths(withTexts(long(10_000_000)))).toEqual(['entry.texts.twoLine']);
  });

  it('refuses plans that are too deep or too large without exhausting the stack', () => {
    let deep: unknown = 1;
    for (let level = 0; level < 100_000; level++) deep = { deep };
    expect(paths({ ...blank, plans: { deep } })).toEqual(['plans']);
    expect(paths({ ...blank, plans: { list: Array(30_000).fill(0) } })).toEqual(['plans']);
    expect(paths({ ...blank, limits: [{ bound: Number.NaN }] })).toEqual(['limits.0']);
  });

  it.each([null, undefined, 3, 'text', [], [blank]])('refuses %j as a whole', (input) => {
    expect(paths(input)).toEqual(['']);
  });
});

describe('migrating a candidate', () => {
  it('leaves a record of the current version as it is', () => {
    expect(migrateCandidate(blank)).toEqual({ ok: true, record: blank });
  });

  it('refuses a newer record in plain words', () => {
    const result = parseCandidate({ ...blank, schema: 2, fromTheFuture: true });
    expect(result).toMatchObject({
      ok: false,
      errors: [{ path: 'schema', message: expect.stringContaining('newer Driftbook') }],
    });
  });

  it.each([undefined, 0, -1, 1.5, '1', Number.NaN])('refuses schema %j', (schema) => {
    expect(paths({ ...blank, schema })).toEqual(['schema']);
  });

  it('walks every step from an old version to the target', () => {
    const chain = [(record: object) => ({ ...record, second: true }), (record: object) => ({ ...record, third: true })];
    expect(migrateThrough({ schema: 1 }, chain, 3)).toEqual({
      ok: true,
      record: { schema: 3, second: true, third: true },
    });
    expect(migrateThrough({ schema: 2 }, chain, 3)).toEqual({ ok: true, record: { schema: 3, third: true } });
  });
});

describe('the canonical text', () => {
  it('is the same whatever order the keys were built in', () => {
    const turned = Object.fromEntries(Object.entries(blank).reverse()) as unknown as typeof blank;
    expect(canonicalText(turned)).toBe(canonicalText(blank));
  });
});
