import { describe, expect, it } from 'vitest';
import { fingerprint, parseCandidate, readingsOf, resolveOrbit } from '../../../core/index';
import { skerryBook } from '../../../web/store/skerryBook';

const named = (id: string) => {
  const found = skerryBook.find((candidate) => candidate.id === id);
  if (!found) throw new Error(`Expected ${id} in the demo book`);
  return found;
};
const orbitOf = (id: string) => {
  const resolved = resolveOrbit(named(id));
  if (!resolved.ok) throw new Error(`Expected ${id} to resolve, got ${JSON.stringify(resolved.errors)}`);
  return resolved.orbit;
};
const degrees = (rad: number) => (rad * 180) / Math.PI;

describe('the Skerry book', () => {
  it.each(skerryBook.map((candidate) => [candidate.name, candidate] as const))(
    '%s resolves without an error',
    (_, candidate) => {
      expect(parseCandidate(candidate)).toEqual({ ok: true, candidate });
      const resolved = resolveOrbit(candidate);
      expect(resolved.ok ? {} : resolved.errors).toEqual({});
      expect(resolved.notices.filter(({ severity }) => severity === 'caution')).toEqual([]);
    },
  );

  it('has each way of entering an orbit, and another planet', () => {
    expect(new Set(skerryBook.map(({ entry }) => entry.form))).toEqual(
      new Set(['altitudes', 'elements', 'state', 'twoLine']),
    );
    expect(skerryBook.map(({ body }) => body)).toContain('mars');
  });

  it('has no name, identifier or orbit twice, and two sentences of notes each', () => {
    expect(new Set(skerryBook.map(({ id }) => id)).size).toBe(skerryBook.length);
    expect(new Set(skerryBook.map(({ name }) => name)).size).toBe(skerryBook.length);
    expect(new Set(skerryBook.map(({ id }) => fingerprint(orbitOf(id)))).size).toBe(skerryBook.length);
    for (const { notes } of skerryBook) expect(notes.match(/[.](?= |$)/g)).toHaveLength(2);
  });

  it('has a separation vector that means the orbit its notes speak of', () => {
    const { mean } = orbitOf('skerry-c');
    expect(mean.semiMajorAxisKm).toBeCloseTo(6946.137, 2);
    expect(degrees(mean.inclinationRad)).toBeCloseTo(97.66, 4);
    // Descending node at 10:30 mean local time on that day: the same node as an entry by local time gives.
    const { entry } = named('skerry-c');
    const sameDay = { ...named('skerry-a').entry.texts, epoch: entry.texts.epoch };
    const summer = resolveOrbit({ ...named('skerry-a'), entry: { ...named('skerry-a').entry, texts: sameDay } });
    expect(summer.ok && degrees(summer.orbit.mean.nodeRad)).toBeCloseTo(degrees(mean.nodeRad), 2);
  });

  it('has readings for every candidate, all of them numbers', () => {
    for (const { id } of skerryBook) expect(readingsOf(orbitOf(id)).length).toBeGreaterThan(10);
  });
});
