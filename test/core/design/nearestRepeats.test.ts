import { describe, expect, it } from 'vitest';
import { bodies } from '../../../core/bodies/bodies';
import { customBody } from '../../../core/bodies/customBody';
import { type NearestRequest, nearestRepeats } from '../../../core/design/nearestRepeats';
import { repeatTracks } from '../../../core/design/repeatTracks';
import type { MeanElements } from '../../../core/orbit/elements';
import { periods } from '../../../core/orbit/periods';

const { earth } = bodies;
const orbit: MeanElements = {
  semiMajorAxisKm: 7166,
  eccentricity: 0.001,
  inclinationRad: 1.72,
  nodeRad: 0,
  perigeeRad: 0,
  meanAnomalyRad: 0,
};
const request: NearestRequest = { body: earth, theory: 'second', mean: orbit, keep: 'inclination', maxDays: 16 };

function repeatsOf(change: Partial<NearestRequest> = {}) {
  const result = nearestRepeats({ ...request, ...change });
  if (!result.ok) throw new Error(result.message);
  return result.repeats;
}

describe('nearest repeats of an orbit', () => {
  it.each(['inclination', 'sunSynchronous'] as const)(
    'are, for each length, those of the whole list: %s kept',
    (keep) => {
      const repeats = repeatsOf({ keep });
      const inclination = keep === 'inclination' ? ({ kind: 'fixed', rad: 1.72 } as const) : ({ kind: keep } as const);
      const all = repeatTracks({ ...request, eccentricity: 0.001, inclination, minAltitudeKm: 0, maxAltitudeKm: 1900 });
      for (let days = 1; days <= 16; days += 1) {
        const changes = all.filter((track) => track.days === days).map((track) => track.semiMajorAxisKm - 7166);
        const up = Math.min(...changes.filter((change) => change > 0));
        const down = Math.max(...changes.filter((change) => change < 0));
        const found = repeats.filter((track) => track.days === days).map(({ axisChangeKm }) => axisChangeKm);
        expect(found.length).toBe(2);
        // Keeping the node's rate changes i, and with it where "above" begins: by far less than tracks lie apart.
        expect(Math.max(...found)).toBeCloseTo(up, 7);
        expect(Math.min(...found)).toBeCloseTo(down, 7);
      }
    },
  );

  it('close, and come by the size of the change', () => {
    const repeats = repeatsOf({ maxDays: 40 });
    repeats.forEach((track, index) => {
      const { nodalS, nodalDayS } = periods(earth, { ...orbit, ...track }, 'second');
      expect((track.revolutions * nodalS) / (track.days * (nodalDayS ?? 0))).toBeCloseTo(1, 12);
      expect(track.semiMajorAxisKm - track.axisChangeKm).toBeCloseTo(7166, 9);
      expect(track.inclinationChangeRad).toBe(0);
      const before = repeats[index - 1];
      if (before) expect(Math.abs(track.axisChangeKm)).toBeGreaterThanOrEqual(Math.abs(before.axisChangeKm));
    });
  });

  it('hold an orbit that closes already, with no change', () => {
    const [track] = repeatTracks({
      ...request,
      eccentricity: 0.001,
      inclination: { kind: 'fixed', rad: 1.72 },
      minAltitudeKm: 780,
      maxAltitudeKm: 790,
      maxDays: 10,
    }).filter(({ days }) => days === 10);
    if (!track) throw new Error('a track of ten days was expected');
    const [nearest] = repeatsOf({ mean: { ...orbit, semiMajorAxisKm: track.semiMajorAxisKm } });
    expect(nearest?.revolutions).toBe(track.revolutions);
    expect(Math.abs(nearest?.axisChangeKm ?? 1)).toBeLessThan(1e-8);
  });

  it('reach from low orbits to beyond the synchronous one', () => {
    const mean = { ...orbit, semiMajorAxisKm: 45_000, inclinationRad: 0.1 };
    const repeats = repeatsOf({ mean, maxDays: 3 });
    expect(repeats.map(({ revolutions, days }) => `${revolutions}/${days}`)).toContain('1/1');
    const low = { ...orbit, semiMajorAxisKm: 6380, eccentricity: 0 };
    // What lies quicker would be below the surface.
    expect(repeatsOf({ mean: low, maxDays: 1 }).map(({ revolutions }) => revolutions)).toEqual([17]);
  });

  it('exist on every body', () => {
    for (const body of Object.values(bodies)) {
      const mean = { ...orbit, semiMajorAxisKm: body.equatorialRadiusKm * 1.2, inclinationRad: 1 };
      expect(repeatsOf({ body, mean, maxDays: 5 }).length).toBeGreaterThanOrEqual(8);
    }
  });

  it.each([
    [{ maxDays: 0 }, 'badInput', 'maxDays'],
    [{ maxDays: 401 }, 'badInput', 'maxDays'],
    [{ minDays: 17 }, 'badInput', 'maxDays'],
    [{ minDays: 1.5 }, 'badInput', 'maxDays'],
    [{ mean: { ...orbit, eccentricity: 0.5 } }, 'belowSurface', 'minAltitudeKm'],
    [{ mean: { ...orbit, eccentricity: 1 } }, 'badInput', 'eccentricity'],
    [{ mean: { ...orbit, semiMajorAxisKm: Number.NaN } }, 'belowSurface', 'minAltitudeKm'],
    [{ body: customBody({ name: 'still', muKm3PerS2: 4e5, radiusKm: 6000, zonals: [0, 0, 1e-3] }) }, 'missing', 'body'],
  ] as const)('%j is answered with the reason', (change, reason, field) => {
    expect(nearestRepeats({ ...request, ...change } as NearestRequest)).toMatchObject({ ok: false, reason, field });
  });
});
