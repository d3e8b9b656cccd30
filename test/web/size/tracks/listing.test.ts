import { beforeAll, describe, expect, it } from 'vitest';
import { bodies, type RepeatRequest, radPerDeg, swathFit } from '../../../../core/index';
import { answerOf } from '../../../../web/size/tracks/answer';
import {
  acrossTracks,
  kept,
  least,
  rowAt,
  sortColumns,
  sorted,
  type Tracks,
  withoutGap,
} from '../../../../web/size/tracks/listing';
import type { TrackFilter } from '../../../../web/size/tracks/wishes';
import { searchTracks } from '../../../../web/work/searchTracks';

const request: RepeatRequest = {
  body: bodies.earth,
  theory: 'second',
  eccentricity: 0,
  inclination: { kind: 'sunSynchronous' },
  minAltitudeKm: 500,
  maxAltitudeKm: 700,
  maxDays: 12,
};
const filter: TrackFilter = {
  swathKm: 290,
  latitudeRad: 0,
  shortestDays: 1,
  narrowestKm: 0,
  widestKm: Number.POSITIVE_INFINITY,
  cycle: null,
};
let tracks: Tracks;

beforeAll(() => {
  const answer = searchTracks(request, () => {});
  if (!answer.ok) throw new Error(answer.message);
  tracks = { body: bodies.earth, columns: answer.columns, acrossKm: acrossTracks(answer.columns, bodies.earth, 0) };
});

const rows = (listed: Uint32Array) => Array.from(listed, (index) => rowAt(tracks, index));
const sentence = (change: Partial<TrackFilter>) => {
  const asked = { ...filter, ...change };
  return answerOf({ tracks, request, filter: asked, listed: kept(tracks, asked), lengthUnit: 'km' })
    .map(({ text }) => text)
    .join('');
};

describe('the list', () => {
  it('without a gap holds exactly the tracks whose swaths meet', () => {
    const fits = (index: number) => {
      const { revolutions, days, inclinationRad } = rowAt(tracks, index);
      const fit = swathFit(bodies.earth, { revolutions, days, inclinationRad }, 290);
      return fit.ok && fit.fits;
    };
    const all = kept(tracks, filter);
    expect([...withoutGap(tracks, all, filter)]).toEqual([...all].filter(fits));
    expect(all.length).toBe(tracks.columns.days.length);
  });

  it('keeps to the spacing, the shortest cycle and the one cycle that was asked for', () => {
    const spaced = rows(kept(tracks, { ...filter, narrowestKm: 230, widestKm: 250, shortestDays: 11 }));
    expect(spaced.length).toBeGreaterThan(0);
    for (const { spacingKm, days } of spaced) {
      expect(spacingKm).toBeGreaterThanOrEqual(230);
      expect(spacingKm).toBeLessThanOrEqual(250);
      expect(days).toBeGreaterThanOrEqual(11);
    }
    const one = rows(kept(tracks, { ...filter, cycle: { revolutions: 181, days: 12 } }));
    expect(one.map(({ revolutions, days }) => `${revolutions}/${days}`)).toEqual(['181/12']);
  });

  it.each(sortColumns)('sorts by %s, both ways, and loses nothing', (column) => {
    const all = kept(tracks, filter);
    const up = sorted(tracks, all, { column, falls: false });
    const down = sorted(tracks, all, { column, falls: true });
    expect([...up].sort((one, other) => one - other)).toEqual([...all]);
    expect(up[0]).toBe(least(tracks, all, column));
    const key = (index: number | undefined) => {
      const row = rowAt(tracks, index ?? -1);
      const keys = {
        cycle: row.days,
        altitude: row.semiMajorAxisKm,
        inclination: row.inclinationRad,
        spacing: row.spacingKm,
        across: row.acrossKm,
        neighbour: row.neighbourDays,
        perDay: row.revolutions / row.days,
      };
      return keys[column];
    };
    for (let place = 1; place < up.length; place += 1) {
      expect(key(up[place])).toBeGreaterThanOrEqual(key(up[place - 1]));
      expect(key(down[place])).toBeLessThanOrEqual(key(down[place - 1]));
    }
  });

  it('puts what has no value last, whichever way it is sorted', () => {
    const beyond = { ...tracks, acrossKm: acrossTracks(tracks.columns, bodies.earth, 82.2 * radPerDeg) };
    const all = kept(beyond, filter);
    for (const falls of [false, true]) {
      const values = Array.from(
        sorted(beyond, all, { column: 'across', falls }),
        (index) => beyond.acrossKm[index] ?? 0,
      );
      const first = values.findIndex(Number.isNaN);
      expect(first).toBeGreaterThan(0);
      expect(values.slice(first).every(Number.isNaN)).toBe(true);
    }
  });
});

describe('the answer', () => {
  it('counts the cycles without a gap and names the lowest', () => {
    expect(sentence({})).toBe(
      '13 repeat cycles of 12 days or less leave no gap at the equator with a 290 km swath; the lowest is 167/11 at 505 km.',
    );
  });

  it('names the narrowest gap where each cycle leaves one', () => {
    expect(sentence({ swathKm: 100 })).toMatch(
      /^No repeat cycle of 12 days or less closes its gaps at the equator with a 100 km swath; the narrowest gap, [\d.]+ km, is left by \d+\/12 at \d+ km\.$/,
    );
  });

  it('says so where nothing is listed at all', () => {
    expect(sentence({ narrowestKm: 1e5 })).toBe('No repeat cycle of 12 days or less lies between 500 and 700 km.');
  });

  it('names the latitude', () => {
    expect(sentence({ latitudeRad: 60 * radPerDeg })).toContain('at 60° latitude');
  });
});
