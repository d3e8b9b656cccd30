import { describe, expect, it } from 'vitest';
import type { FieldId } from '../../../core/record/candidate';
import { readingsOf } from '../../../core/record/readings/readings';
import { warningsOf } from '../../../core/record/warnings';
import { resolved } from './candidates';

const ids = (texts: Partial<Record<FieldId, string>>, change: Parameters<typeof resolved>[1] = {}) => {
  const orbit = resolved(texts, change);
  return warningsOf(orbit, readingsOf(orbit)).map(({ id }) => id);
};
const high = { perigeeAltitude: '700', apogeeAltitude: '1100' };
const circle = (km: number) => ({ perigeeAltitude: String(km), apogeeAltitude: String(km) });

describe('warnings', () => {
  it('are silent where the closed form holds', () => {
    expect(ids(high)).toEqual([]);
  });

  it.each([
    ['perigeeBelowSurface', { ...high, perigeeAltitude: '-1' }],
    ['denseAtmosphere', { ...high, perigeeAltitude: '120' }],
    ['drag', { ...high, perigeeAltitude: '400' }],
    ['nearCriticalInclination', { ...high, inclination: '61' }],
    ['nearCriticalInclination', { ...high, inclination: '117' }],
    ['nearEquator', { ...high, inclination: '14' }],
    ['nearEquator', { ...high, inclination: '170' }],
  ])('say %s, and that alone', (id, texts) => {
    expect(ids(texts)).toEqual([id]);
  });

  it('say that perigee drift means little on a near-circle', () => {
    expect(ids(circle(700))).toEqual(['smallEccentricity']);
  });

  it('say that high orbits belong to Sun and Moon too, and name resonance at one and two turns a day', () => {
    expect(ids({ ...circle(20_182), inclination: '55' })).toEqual([
      'smallEccentricity',
      'tesseralResonance',
      'sunAndMoon',
    ]);
    expect(ids({ ...circle(35_786), inclination: '30' })).toContain('tesseralResonance');
  });

  it('say that Sun and Moon dominate far out, and that the equator has no node', () => {
    expect(ids({ ...circle(100_000), inclination: '55' })).toEqual(['smallEccentricity', 'sunAndMoonDominate']);
    expect(ids({ ...high, inclination: '0' })).toEqual(['nearEquator', 'noNode']);
    expect(ids({ ...high, inclination: '180' })).toContain('noNode');
  });

  it('speak of the apsides of the body, and of the Moon with its article', () => {
    const said = (body: 'mars' | 'moon', texts = {}) => {
      const orbit = resolved({ ...high, apogeeAltitude: '710', ...texts }, { body });
      return warningsOf(orbit, readingsOf(orbit))
        .map(({ text }) => text)
        .join(' ');
    };
    expect(said('mars')).toContain('periapsis drift');
    expect(said('mars', { perigeeAltitude: '-5' })).not.toMatch(/perigee/i);
    expect(said('moon')).toContain('At the Moon J2');
  });

  it('say resonance near synchronous orbits at Mars', () => {
    expect(ids({ ...circle(17_032), inclination: '30' }, { body: 'mars' })).toContain('tesseralResonance');
  });

  it.each(['moon', 'venus', 'mercury'] as const)('say at the %s that J2 does not dominate', (body) => {
    expect(ids(high, { body })).toContain('weakOblateness');
  });

  it('each say what to do', () => {
    const orbit = resolved({ ...circle(100), inclination: '2' });
    for (const { text } of warningsOf(orbit, readingsOf(orbit))) expect(text).toMatch(/[a-z]\.$/);
  });
});
