import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bodies } from '../../../core/bodies/bodies';
import type { Body } from '../../../core/bodies/body';
import { customBody } from '../../../core/bodies/customBody';
import { type RepeatRequest, RepeatTracksError } from '../../../core/design/repeatProblem';
import { type RepeatTrack, repeatTrackSearch, repeatTracks, tryRepeatTracks } from '../../../core/design/repeatTracks';
import type { Theory } from '../../../core/orbit/elements';
import { secularRates } from '../../../core/orbit/secularRates';

const { earth } = bodies;
const radPerDeg = Math.PI / 180;

const band: RepeatRequest = {
  body: earth,
  theory: 'second',
  eccentricity: 0.001,
  inclination: { kind: 'sunSynchronous' },
  minAltitudeKm: 300,
  maxAltitudeKm: 1500,
  maxDays: 60,
};

function ratesOf(body: Body, theory: Theory, a: number, e: number, i: number) {
  const mean = { semiMajorAxisKm: a, eccentricity: e, inclinationRad: i, nodeRad: 0, perigeeRad: 0, meanAnomalyRad: 0 };
  return secularRates(body, mean, theory);
}

const yearRate = (body: Body) => (2 * Math.PI) / ((body.yearDays ?? Number.NaN) * 86_400);

/** Zero of a function that changes sign once, halved down to rounding or so many times. */
function halved(value: (x: number) => number, low: number, high: number, steps = 60): number {
  let [below, above] = [low, high];
  const sign = Math.sign(value(low));
  for (let step = 0; step < steps; step += 1) {
    const middle = 0.5 * (below + above);
    if (middle === below || middle === above) break;
    if (Math.sign(value(middle)) === sign) below = middle;
    else above = middle;
  }
  return 0.5 * (below + above);
}

/** Sun-synchronous inclination by halving the angle itself, between polar and equatorial retrograde. */
function sunSynchronousRad({ body, theory, eccentricity }: RepeatRequest, a: number): number {
  const excess = (i: number) => ratesOf(body, theory, a, eccentricity, i).nodeRadPerS - yearRate(body);
  return halved(excess, Math.PI / 2, Math.PI);
}

/** Turns over the same ground in one turn of the orbit, counted in frequencies. */
function revolutionsADay(request: RepeatRequest, a: number): number {
  const { body, theory, eccentricity, inclination } = request;
  const i = inclination.kind === 'fixed' ? inclination.rad : sunSynchronousRad(request, a);
  const rates = ratesOf(body, theory, a, eccentricity, i);
  return (
    (rates.perigeeRadPerS + rates.meanAnomalyRadPerS) /
    Math.abs((body.rotationRadPerS ?? Number.NaN) - rates.nodeRadPerS)
  );
}

/**
 * Every fraction of the band by trying all N for all D: a cycle is there wherever the revolutions a day pass N/D between two
 * altitudes 1 km apart; fractions not in lowest terms are known by their value, which a shorter cycle had already.
 */
function bruteForce(request: RepeatRequest): ReadonlyMap<string, number> {
  const fromKm = request.body.equatorialRadiusKm + request.minAltitudeKm;
  const steps = request.maxAltitudeKm - request.minAltitudeKm;
  const rates = Array.from({ length: steps + 1 }, (_, index) => revolutionsADay(request, fromKm + index));
  const seen = new Set<number>();
  const found = new Map<string, number>();
  for (let days = 1; days <= request.maxDays; days += 1) {
    for (let revolutions = 1; revolutions <= 20 * days; revolutions += 1) {
      const wanted = revolutions / days;
      if (seen.has(wanted)) continue;
      seen.add(wanted);
      for (let index = 0; index < steps; index += 1) {
        const [here, next] = [rates[index] ?? Number.NaN, rates[index + 1] ?? Number.NaN];
        if (here >= wanted === next >= wanted) continue;
        const excess = (a: number) => revolutionsADay(request, a) - wanted;
        found.set(`${revolutions}/${days}`, halved(excess, fromKm + index, fromKm + index + 1, 32));
      }
    }
  }
  return found;
}

const key = ({ revolutions, days }: RepeatTrack) => `${revolutions}/${days}`;

/** Loosest of what halving an inclination to rounding leaves in a: 1 mm. */
const axisToleranceKm = 1e-6;

describe('all repeat tracks', () => {
  it.each([
    { name: 'Sun-synchronous', inclination: { kind: 'sunSynchronous' }, theory: 'second' },
    { name: 'Sun-synchronous, first order', inclination: { kind: 'sunSynchronous' }, theory: 'first' },
    { name: '28.5°', inclination: { kind: 'fixed', rad: 28.5 * radPerDeg }, theory: 'second' },
    { name: '66.04°', inclination: { kind: 'fixed', rad: 66.04 * radPerDeg }, theory: 'second' },
    { name: '120°', inclination: { kind: 'fixed', rad: 120 * radPerDeg }, theory: 'second' },
  ] as const)('of 300 to 1500 km up to 60 days are those of a brute-force search: $name', (row) => {
    const request = { ...band, inclination: row.inclination, theory: row.theory };
    const tracks = repeatTracks(request);
    const expected = bruteForce(request);
    console.log(`${row.name}: ${tracks.length} tracks, ${expected.size} by brute force`);
    expect(new Set(tracks.map(key))).toEqual(new Set(expected.keys()));
    expect(tracks.length).toBe(expected.size);
    const worst = Math.max(
      ...tracks.map((track) => Math.abs(track.semiMajorAxisKm - (expected.get(key(track)) ?? Number.NaN))),
    );
    expect(worst).toBeLessThan(axisToleranceKm);
  });

  it('number about 170 000 up to 400 days', () => {
    const tracks = repeatTracks({ ...band, maxDays: 400 });
    expect(tracks.length).toBeGreaterThan(165_000);
    expect(tracks.length).toBeLessThan(175_000);
    expect(new Set(tracks.map(key)).size).toBe(tracks.length);
  });
});

const divisor = (a: number, b: number): number => (b === 0 ? a : divisor(b, a % b));

const requests = fc.record({
  body: fc.constantFrom(...Object.values(bodies)),
  theory: fc.constantFrom<Theory>('first', 'second'),
  eccentricity: fc.double({ min: 0, max: 0.7, noNaN: true }),
  inclination: fc.oneof(
    fc.constant({ kind: 'sunSynchronous' } as const),
    fc.record({ kind: fc.constant('fixed' as const), rad: fc.double({ min: 0, max: Math.PI, noNaN: true }) }),
  ),
  minAltitudeKm: fc.double({ min: 0, max: 5000, noNaN: true }),
  maxAltitudeKm: fc.double({ min: 5000, max: 60_000, noNaN: true }),
  maxDays: fc.integer({ min: 1, max: 5 }),
});

describe('each repeat track', () => {
  it('closes: N nodal periods are D nodal days to 1e-10, on every body', () => {
    let seenTracks = 0;
    const seenBodies = new Set<string>();
    const worst = { closure: 0, node: 0, spacing: 0 };
    fc.assert(
      fc.property(requests, (request) => {
        const { body, theory, eccentricity: e } = request;
        for (const track of repeatTracks(request)) {
          const { semiMajorAxisKm: a, inclinationRad: i, revolutions, days } = track;
          const rates = ratesOf(body, theory, a, e, i);
          const nodalS = (2 * Math.PI) / (rates.meanAnomalyRadPerS + rates.perigeeRadPerS);
          const nodalDayS = (2 * Math.PI) / Math.abs((body.rotationRadPerS ?? 0) - rates.nodeRadPerS);
          const aroundKm = 2 * Math.PI * body.equatorialRadiusKm;
          worst.closure = Math.max(worst.closure, Math.abs((revolutions * nodalS) / (days * nodalDayS) - 1));
          worst.spacing = Math.max(worst.spacing, Math.abs((track.trackSpacingKm * revolutions) / aroundKm - 1));
          if (request.inclination.kind === 'sunSynchronous') {
            worst.node = Math.max(worst.node, Math.abs(rates.nodeRadPerS / yearRate(body) - 1));
          } else if (i !== request.inclination.rad) return false;
          if (divisor(revolutions, days) !== 1 || a * (1 - e) < body.equatorialRadiusKm * (1 - 1e-12)) return false;
          seenTracks += 1;
          seenBodies.add(body.id);
        }
        return true;
      }),
      { numRuns: 200, seed: 7 },
    );
    expect(worst.closure).toBeLessThan(1e-10);
    expect(worst.node).toBeLessThan(1e-12);
    expect(worst.spacing).toBeLessThan(1e-14);
    expect(seenTracks).toBeGreaterThan(1000);
    expect(seenBodies.size).toBe(7);
  });

  it('comes by days and rising a, and more revolutions a day lie lower', () => {
    const tracks = repeatTracks({ ...band, maxDays: 20 });
    tracks.slice(1).forEach((track, index) => {
      const before = tracks[index];
      if (!before) throw new Error('a track before each but the first was expected');
      const later = track.days > before.days;
      expect(later || (track.days === before.days && track.semiMajorAxisKm > before.semiMajorAxisKm)).toBe(true);
    });
    const byRate = [...tracks].sort((one, other) => one.revolutions / one.days - other.revolutions / other.days);
    byRate.slice(1).forEach((track, index) => {
      expect(track.semiMajorAxisKm).toBeLessThan(byRate[index]?.semiMajorAxisKm ?? 0);
      expect(track.inclinationRad).toBeLessThan(byRate[index]?.inclinationRad ?? 0);
    });
  });

  it('is there on both sides where the revolutions a day turn back within the band', () => {
    // A slow body whose node falls back about as fast as it turns: days last longest in between.
    const body = customBody({
      name: 'slow',
      muKm3PerS2: 4e5,
      radiusKm: 6000,
      zonals: [0, 0, 0.004],
      rotationRadPerS: 3e-6,
    });
    const request: RepeatRequest = {
      ...band,
      body,
      theory: 'first',
      eccentricity: 0,
      inclination: { kind: 'fixed', rad: 1 },
      maxAltitudeKm: 60_000,
      maxDays: 1,
    };
    const tracks = repeatTracks(request);
    // On a grid of 1 km, the whole numbers that the revolutions a day pass from one altitude to the next.
    const passed: string[] = [];
    for (let a = 6301; a <= 66_000; a += 1) {
      const [one, other] = [revolutionsADay(request, a - 1), revolutionsADay(request, a)];
      for (let n = Math.ceil(Math.min(one, other)); n < Math.max(one, other); n += 1) passed.push(`${n}/1`);
    }
    expect(tracks.map(key).sort()).toEqual(passed.sort());
    expect(new Set(tracks.map(key)).size).toBeLessThan(tracks.length);
  });
});

describe('the search piece by piece', () => {
  it('gives the same tracks, its share rising to 1, and stops when no more is asked for', () => {
    const request = { ...band, maxDays: 100 };
    const search = repeatTrackSearch(request);
    if (!search.ok) throw new Error(search.message);
    const shares: number[] = [];
    const tracks: RepeatTrack[] = [];
    for (const chunk of search.chunks) {
      shares.push(chunk.share);
      tracks.push(...chunk.tracks);
    }
    expect(tracks).toEqual(repeatTracks(request));
    expect(shares.length).toBeGreaterThan(4);
    expect(shares).toEqual([...shares].sort((one, other) => one - other));
    expect(shares.at(-1)).toBe(1);

    const stopped = repeatTrackSearch({ ...band, maxDays: 400 });
    if (!stopped.ok) throw new Error(stopped.message);
    for (const chunk of stopped.chunks) {
      expect(chunk.tracks.length).toBeLessThanOrEqual(2000);
      break;
    }
    expect(stopped.chunks.next().done).toBe(true);
  });
});

const without = (change: Partial<Body>): Body => ({ ...earth, ...change });

describe('a request that makes no sense', () => {
  it.each([
    [{ minAltitudeKm: 2000 }, 'badInput', 'minAltitudeKm', /upside down/],
    [{ minAltitudeKm: -1 }, 'badInput', 'minAltitudeKm', /below the surface/],
    [{ minAltitudeKm: Number.NaN }, 'badInput', 'minAltitudeKm', /number/],
    [{ maxAltitudeKm: Number.POSITIVE_INFINITY }, 'badInput', 'maxAltitudeKm', /number/],
    [{ maxDays: 0 }, 'badInput', 'maxDays', /whole number of days from 1 to 400, not 0/],
    [{ maxDays: -3 }, 'badInput', 'maxDays', /not −3/],
    [{ maxDays: 2.5 }, 'badInput', 'maxDays', /not 2.5/],
    [{ maxDays: 1e9 }, 'badInput', 'maxDays', /from 1 to 400/],
    [{ maxDays: Number.NaN }, 'badInput', 'maxDays', /from 1 to 400/],
    [{ eccentricity: 1 }, 'badInput', 'eccentricity', /below 1/],
    [{ eccentricity: -0.1 }, 'badInput', 'eccentricity', /from 0/],
    [{ inclination: { kind: 'fixed', rad: 3.2 } }, 'badInput', 'inclination', /0° to 180°/],
    [{ body: without({ rotationRadPerS: null }) }, 'missing', 'body', /rotation/],
    [{ body: without({ rotationRadPerS: 0 }) }, 'missing', 'body', /does not rotate/],
    [{ body: without({ yearDays: null }) }, 'missing', 'body', /year/],
    [{ body: bodies.venus, inclination: { kind: 'fixed', rad: 1 }, maxDays: 400 }, 'tooMany', 'maxDays', /narrower/],
  ] as const)('%j is refused: %s of %s', (change, reason, field, words) => {
    const request = { ...band, ...change } as RepeatRequest;
    const result = tryRepeatTracks(request);
    expect(result).toMatchObject({ ok: false, reason, field });
    expect(result.ok ? '' : result.message).toMatch(words);
    expect(() => repeatTracks(request)).toThrow(RepeatTracksError);
  });

  it('for a body without a year is fine at a fixed inclination', () => {
    const request = { ...band, body: without({ yearDays: null }), inclination: { kind: 'fixed', rad: 1.2 } } as const;
    expect(repeatTracks(request).length).toBeGreaterThan(3000);
  });

  it('where the node keeps up with the body is refused with the reason', () => {
    const body = customBody({
      name: 'slow',
      muKm3PerS2: 4e5,
      radiusKm: 6000,
      zonals: [0, 0, 0.004],
      rotationRadPerS: 3e-6,
    });
    const result = tryRepeatTracks({ ...band, body, inclination: { kind: 'fixed', rad: 2.2 } });
    expect(result).toMatchObject({ ok: false, reason: 'tooMany', field: 'maxAltitudeKm' });
  });

  it('advises a longest cycle that can be listed', () => {
    const request: RepeatRequest = { ...band, body: bodies.moon, inclination: { kind: 'fixed', rad: 1 }, maxDays: 400 };
    const result = tryRepeatTracks(request);
    const advised = Number(/at most (\d+) days/.exec(result.ok ? '' : result.message)?.[1]);
    expect(advised).toBeGreaterThan(100);
    expect(tryRepeatTracks({ ...request, maxDays: advised }).ok).toBe(true);
  });
});

describe('where nature has none', () => {
  it('the reason says what cos i would have to be and where Sun-synchronous orbits end', () => {
    const request = { ...band, eccentricity: 0, minAltitudeKm: 6200, maxAltitudeKm: 9000 };
    const result = tryRepeatTracks(request);
    expect(result).toMatchObject({ ok: false, reason: 'noSunSynchronous', field: 'inclination' });
    expect(result.ok ? '' : result.message).toMatch(/cos i would have to be −1\.\d+.*end at a mean altitude of 598\d/);
    expect(repeatTracks(request)).toEqual([]);
  });

  it('Venus has no Sun-synchronous orbit at all', () => {
    const result = tryRepeatTracks({ ...band, body: bodies.venus });
    expect(result.ok ? '' : result.message).toMatch(/No orbit above the surface of Venus/);
  });

  it('a band with perigee below the surface is said to be so, and one that is partly so is searched from there', () => {
    expect(tryRepeatTracks({ ...band, eccentricity: 0.5 })).toMatchObject({ ok: false, reason: 'belowSurface' });
    expect(repeatTracks({ ...band, eccentricity: 0.5 })).toEqual([]);
    const partly = tryRepeatTracks({ ...band, eccentricity: 0.1 });
    expect(partly.ok && partly.searched).toEqual([{ minAltitudeKm: expect.closeTo(708.682, 3), maxAltitudeKm: 1500 }]);
  });

  it('the last Sun-synchronous orbit ends the search within a band', () => {
    const result = tryRepeatTracks({ ...band, eccentricity: 0, maxAltitudeKm: 9000, maxDays: 60 });
    if (!result.ok) throw new Error(result.message);
    expect(result.searched).toEqual([{ minAltitudeKm: 300, maxAltitudeKm: expect.closeTo(5981.7, 0) }]);
    const highest = Math.max(...result.tracks.map(({ inclinationRad }) => inclinationRad));
    expect(highest).toBeGreaterThan(175 * radPerDeg);
    expect(highest).toBeLessThanOrEqual(Math.PI);
  });
});
