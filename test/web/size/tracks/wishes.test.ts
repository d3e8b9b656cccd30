import { describe, expect, it } from 'vitest';
import { bodies, radPerDeg } from '../../../../core/index';
import { readWishes, type TrackTexts } from '../../../../web/size/tracks/wishes';

const texts: TrackTexts = {
  lowest: '500',
  highest: '700',
  longest: '12',
  swath: '290',
  latitude: '0',
  shortest: '',
  narrowest: '',
  widest: '',
  cycle: '',
};
const read = (change: Partial<TrackTexts> = {}, kmPerUnit = 1) =>
  readWishes({
    texts: { ...texts, ...change },
    inclination: 'sunSynchronous',
    kmPerUnit,
    body: bodies.earth,
    eccentricity: 0.0011,
    inclinationRad: 97.6 * radPerDeg,
  });

describe('what the list is asked', () => {
  it('is a search and a filter', () => {
    const { request, filter, errors } = read();
    expect(errors).toEqual({});
    expect(request).toMatchObject({ minAltitudeKm: 500, maxAltitudeKm: 700, maxDays: 12, eccentricity: 0.0011 });
    expect(filter).toMatchObject({ swathKm: 290, latitudeRad: 0, shortestDays: 1, cycle: null });
  });

  it('reads lengths in the unit shown', () => {
    const { request, filter } = read({ swath: '100' }, 1.852);
    expect(request?.minAltitudeKm).toBeCloseTo(926, 9);
    expect(filter?.swathKm).toBeCloseTo(185.2, 9);
  });

  it('takes no swath for any', () => expect(read({ swath: '' }).filter?.swathKm).toBeNull());

  it.each([
    ['swath', '-5'],
    ['swath', '0'],
    ['swath', 'wide'],
    ['latitude', '91'],
    ['shortest', '-1'],
    ['widest', 'x'],
    ['cycle', '15'],
    ['cycle', '0/1'],
    ['cycle', '15.5/1'],
    ['cycle', '-15/1'],
    ['cycle', 'a/b'],
  ] as const)('says at %s what is wrong with “%s”, and the search goes on', (field, text) => {
    const { request, filter, errors } = read({ [field]: text });
    expect(Object.keys(errors)).toEqual([field]);
    expect(errors[field]?.message).toMatch(/\w{3,}/);
    expect(filter).toBeNull();
    expect(request).not.toBeNull();
  });

  it.each(['', 'ten', '1e999'])('waits with the search while an altitude is “%s”', (lowest) => {
    const { request, filter, errors } = read({ lowest });
    expect(request).toBeNull();
    expect(filter).not.toBeNull();
    expect(Object.keys(errors)).toEqual(['lowest']);
  });

  it('brings a cycle to lowest terms and says so', () => {
    const { filter, note } = read({ cycle: ' 30 / 2 ' });
    expect(filter?.cycle).toEqual({ revolutions: 15, days: 1 });
    expect(note).toContain('15 in 1');
  });
});
