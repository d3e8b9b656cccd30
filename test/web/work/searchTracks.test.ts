import { describe, expect, it } from 'vitest';
import { bodies, type RepeatRequest, repeatTracks } from '../../../core/index';
import { buffersOf, searchTracks } from '../../../web/work/searchTracks';

const request: RepeatRequest = {
  body: bodies.earth,
  theory: 'second',
  eccentricity: 0,
  inclination: { kind: 'sunSynchronous' },
  minAltitudeKm: 500,
  maxAltitudeKm: 700,
  maxDays: 60,
};

describe('searchTracks', () => {
  it('gives in columns what core gives in rows, and tells how far it has come', () => {
    const shares: number[] = [];
    const answer = searchTracks(request, (share) => shares.push(share));
    const rows = repeatTracks(request);
    if (!answer.ok) throw new Error(answer.message);
    const { columns } = answer;
    expect(columns.days).toHaveLength(rows.length);
    for (const [index, row] of rows.entries()) {
      expect(columns.revolutions[index]).toBe(row.revolutions);
      expect(columns.days[index]).toBe(row.days);
      expect(columns.semiMajorAxisKm[index]).toBe(row.semiMajorAxisKm);
      expect(columns.inclinationRad[index]).toBe(row.inclinationRad);
    }
    expect(shares.at(-1)).toBe(1);
    expect(buffersOf(columns)).toHaveLength(5);
  });

  it('hands on what core refuses, with the field', () => {
    const answer = searchTracks({ ...request, minAltitudeKm: 800 }, () => {});
    expect(answer).toMatchObject({ ok: false, field: 'minAltitudeKm', reason: 'badInput' });
  });
});
