import { describe, expect, it } from 'vitest';
import { bodies, type MeanElements, type ResolvedOrbit, radPerDeg, repeatTracks } from '../../../../core/index';
import { cycleAtHand } from '../../../../web/size/map/cycleAtHand';
import { swathQuads } from '../../../../web/size/map/swath';
import { longitudeText, trackDrawn } from '../../../../web/size/map/trackDrawn';

const [track] = repeatTracks({
  body: bodies.earth,
  theory: 'second',
  eccentricity: 0,
  inclination: { kind: 'fixed', rad: 66 * radPerDeg },
  minAltitudeKm: 500,
  maxAltitudeKm: 1400,
  maxDays: 10,
}).filter(({ days }) => days === 10);
if (!track) throw new Error('a cycle of 10 days was expected');
const mean: MeanElements = {
  semiMajorAxisKm: track.semiMajorAxisKm,
  eccentricity: 0,
  inclinationRad: track.inclinationRad,
  nodeRad: 1,
  perigeeRad: 0,
  meanAnomalyRad: 0.4,
};
const orbitOf = (change: Partial<MeanElements> = {}, epochJd: number | null = 2462000.5): ResolvedOrbit => ({
  body: bodies.earth,
  mean: { ...mean, ...change },
  epochJd,
  theory: 'Brouwer',
  origin: 'elements',
  typedAs: 'mean',
});
const cycle = { revolutions: track.revolutions, days: track.days };
const drawn = (orbit: ResolvedOrbit, span: 'cycle' | 'day' = 'cycle') => {
  const result = trackDrawn({ orbit, cycle, span, revolutionsADay: cycle.revolutions / cycle.days });
  if (!result.ok) throw new Error(result.message);
  return result;
};

describe('the track that is drawn', () => {
  it('of a repeat cycle ends where it began', () => {
    const { gapKm, start, end, isWhole } = drawn(orbitOf());
    expect(isWhole).toBe(true);
    expect(Math.abs(gapKm)).toBeLessThan(0.001);
    expect(end.latitudeRad).toBeCloseTo(start.latitudeRad, 9);
  });

  it('of an orbit 1 km higher ends west, by what the longer period makes of it', () => {
    const { gapKm } = drawn(orbitOf({ semiMajorAxisKm: track.semiMajorAxisKm + 1 }));
    // The period grows by 3/2 Δa/a, and the ground goes on below for D days.
    const expectedKm = -1.5 * (1 / track.semiMajorAxisKm) * 10 * 2 * Math.PI * 6378;
    expect(gapKm / expectedKm).toBeGreaterThan(0.9);
    expect(gapKm / expectedKm).toBeLessThan(1.2);
  });

  it('has its first node on longitude 0 where no epoch places it', () => {
    const { firstNodeRad, isPlaced } = drawn(orbitOf({}, null));
    expect(isPlaced).toBe(false);
    expect(firstNodeRad).toBeCloseTo(0, 6);
  });

  it('of one day is not the whole', () => {
    const { isWhole, revolutions } = drawn(orbitOf(), 'day');
    expect(isWhole).toBe(false);
    expect(revolutions).toBeCloseTo(cycle.revolutions / 10, 9);
  });
});

describe('the cycle at hand', () => {
  const held = { kind: 'repeat', settles: 'semiMajorAxisKm', texts: { revolutions: '254', days: '20' } };

  it('is the one held by a condition, in lowest terms', () => {
    const atHand = cycleAtHand(orbitOf(), { conditions: [held] }, false);
    expect(atHand).toEqual({ ok: true, cycle: { revolutions: 127, days: 10 }, nearest: null });
  });

  it('else is the nearest', () => {
    for (const isStale of [false, true]) {
      const atHand = cycleAtHand(orbitOf(), { conditions: isStale ? [held] : [] }, isStale);
      expect(atHand).toMatchObject({ ok: true, cycle });
    }
  });

  it('is none where the body has no known day', () => {
    const orbit = { ...orbitOf(), body: { ...bodies.earth, rotationRadPerS: null } };
    expect(cycleAtHand(orbit, { conditions: [] }, false)).toMatchObject({ ok: false, reason: 'missing' });
  });
});

describe('a swath', () => {
  it('reaches half its width to either side, square to the track', () => {
    const line = {
      ascending: true,
      pass: 0,
      longitudeRad: Float64Array.of(0.1, 0.1, 0.1),
      latitudeRad: Float64Array.of(-0.01, 0, 0.01),
    };
    const [first] = swathQuads(line, 0.02);
    expect(swathQuads(line, 0.02)).toHaveLength(2);
    expect(first?.[1]?.longitudeRad).toBeCloseTo(0.08, 12);
    expect(first?.[2]?.longitudeRad).toBeCloseTo(0.12, 12);
    expect(first?.[1]?.latitudeRad).toBeCloseTo(0, 12);
  });

  it('is left out over a pole', () => {
    const line = {
      ascending: true,
      pass: 0,
      longitudeRad: Float64Array.of(0, 0),
      latitudeRad: Float64Array.of(1.56, 1.565),
    };
    expect(swathQuads(line, 0.02)).toEqual([]);
  });
});

describe('longitudes in words', () => {
  it.each([
    [12.34, '12.3° E'],
    [-70, '70.0° W'],
    [190, '170.0° W'],
    [0.01, '0.0°'],
  ])('%d is %s', (degrees, text) => expect(longitudeText(degrees * radPerDeg, 1)).toBe(text));
});
