import { describe, expect, it } from 'vitest';
import { bodies } from '../../../core/bodies/bodies';
import { customBody } from '../../../core/bodies/customBody';
import { meanSiderealTimeRad } from '../../../core/bodies/siderealTime';
import { repeatTracks } from '../../../core/design/repeatTracks';
import { equatorCrossings } from '../../../core/design/trackPattern';
import { type GroundTrackRequest, groundTrack } from '../../../core/mission/groundTrack';
import { wrapPi } from '../../../core/numerics/angles';
import type { MeanElements } from '../../../core/orbit/elements';
import { secularRates } from '../../../core/orbit/secularRates';
import { stateFromElements } from '../../../core/orbit/state';

const { earth } = bodies;
const radPerDeg = Math.PI / 180;
const mean: MeanElements = {
  semiMajorAxisKm: 7153,
  eccentricity: 0.02,
  inclinationRad: 1.72,
  nodeRad: 2,
  perigeeRad: 0.7,
  meanAnomalyRad: 4,
};
const request: GroundTrackRequest = {
  body: earth,
  theory: 'second',
  mean,
  span: { kind: 'seconds', s: 43_200 },
  origin: { kind: 'firstNode', longitudeRad: 0 },
};

function trackOf(change: Partial<GroundTrackRequest> = {}) {
  const result = groundTrack({ ...request, ...change });
  if (!result.ok) throw new Error(result.message);
  return result;
}

function pointsOf(track: ReturnType<typeof trackOf>) {
  return track.lines.flatMap((line) =>
    [...line.longitudeRad].map((longitude, index) => ({
      longitude,
      latitude: line.latitudeRad[index] ?? Number.NaN,
      ascending: line.ascending,
      pass: line.pass,
    })),
  );
}

describe('a ground track', () => {
  it.each([
    { revolutions: 43, days: 3, body: earth },
    { revolutions: 15, days: 1, body: earth },
    { revolutions: 1, days: 1, body: earth },
    { revolutions: 25, days: 2, body: bodies.mars },
    { revolutions: 2500, days: 1, body: bodies.venus },
  ])('of $revolutions in $days days crosses the equator where the pattern says, and ends where it began', (row) => {
    const { body, ...cycle } = row;
    const inclinationRad = 1.1;
    const found = repeatTracks({
      body,
      theory: 'second',
      eccentricity: 0,
      inclination: { kind: 'fixed', rad: inclinationRad },
      minAltitudeKm: 200,
      maxAltitudeKm: 40_000,
      maxDays: row.days,
    }).find(({ revolutions, days }) => revolutions === row.revolutions && days === row.days);
    if (!found) throw new Error('the track was expected');
    const start = {
      semiMajorAxisKm: found.semiMajorAxisKm,
      eccentricity: 0,
      inclinationRad,
      nodeRad: 1,
      perigeeRad: 0,
    };
    const track = trackOf({
      body,
      mean: { ...start, meanAnomalyRad: 0 },
      span: { kind: 'revolutions', count: row.revolutions },
      origin: { kind: 'firstNode', longitudeRad: 0.5 },
      samplesPerRevolution: 60,
    });
    const points = pointsOf(track);
    const onEquator = points.filter(({ latitude }) => Math.abs(latitude) < 1e-9);
    const crossings = equatorCrossings(cycle, {
      firstLongitudeRad: 0.5,
      tracksStep: body === bodies.venus ? 'east' : 'west',
    });
    crossings.forEach(({ longitudeRad, node, pass }, index) => {
      const point = onEquator[index];
      expect(Math.abs(wrapPi((point?.longitude ?? Number.NaN) - longitudeRad))).toBeLessThan(1e-7);
      expect(point?.ascending).toBe(node === 'ascending');
      expect(point?.pass).toBe(pass);
    });
    expect(onEquator.length).toBe(crossings.length + 1);
    expect(Math.abs(wrapPi((points.at(-1)?.longitude ?? 0) - (points[0]?.longitude ?? 1)))).toBeLessThan(1e-7);
  });

  it('from Greenwich begins and ends below the state of the mean orbit', () => {
    const epochJd = 2_461_193.25;
    const spanS = 43_200;
    const points = pointsOf(trackOf({ origin: { kind: 'greenwich', epochJd }, span: { kind: 'seconds', s: spanS } }));
    const rates = secularRates(earth, mean, 'second');
    for (const [timeS, point] of [
      [0, points[0]],
      [spanS, points.at(-1)],
    ] as const) {
      const [x, y, z] = stateFromElements(earth.muKm3PerS2, {
        ...mean,
        nodeRad: mean.nodeRad + rates.nodeRadPerS * timeS,
        perigeeRad: mean.perigeeRad + rates.perigeeRadPerS * timeS,
        meanAnomalyRad: mean.meanAnomalyRad + rates.meanAnomalyRadPerS * timeS,
      }).positionKm;
      const longitude = Math.atan2(y, x) - meanSiderealTimeRad(epochJd) - 7.292115e-5 * timeS;
      expect(Math.abs(wrapPi((point?.longitude ?? Number.NaN) - longitude))).toBeLessThan(1e-9);
      // Geodetic and geocentric latitude differ by 0.2° at most.
      expect(Math.abs((point?.latitude ?? 9) - Math.asin(z / Math.hypot(x, y, z)))).toBeLessThan(0.2 * radPerDeg);
    }
  });

  it('puts the first ascending crossing at the longitude asked for, and passes before it below 0', () => {
    const track = trackOf({ origin: { kind: 'firstNode', longitudeRad: 1 } });
    const points = pointsOf(track);
    const node = points.find(({ pass, ascending, latitude }) => pass === 0 && ascending && Math.abs(latitude) < 1e-9);
    expect(node?.longitude).toBeCloseTo(1, 9);
    expect(track.firstNodeS).toBeGreaterThan(0);
    expect(track.firstNodeS).toBeLessThan(6100);
    expect(points[0]?.pass).toBe(-1);
  });

  it.each([0, 0.01, 1, Math.PI / 2, 1.72, 3, Math.PI])('at i = %s rad never leaps across the map', (inclinationRad) => {
    const track = trackOf({ mean: { ...mean, inclinationRad } });
    for (const { longitudeRad, latitudeRad, ascending } of track.lines) {
      longitudeRad.forEach((longitude, index) => {
        expect(Math.abs(longitude)).toBeLessThanOrEqual(Math.PI);
        expect(Math.abs(latitudeRad[index] ?? 9)).toBeLessThanOrEqual(Math.PI / 2);
        if (index === 0) return;
        expect(Math.abs(longitude - (longitudeRad[index - 1] ?? 9))).toBeLessThan(1);
        const rise = (latitudeRad[index] ?? 9) - (latitudeRad[index - 1] ?? 9);
        expect(ascending ? rise : -rise).toBeGreaterThanOrEqual(-1e-12);
      });
    }
  });

  it('reaches the geodetic latitude of its inclination', () => {
    const latitudes = pointsOf(trackOf({ mean: { ...mean, inclinationRad: 1, eccentricity: 0 } })).map(
      (p) => p.latitude,
    );
    const geocentric = 1;
    const most = Math.max(...latitudes);
    expect(most - geocentric).toBeGreaterThan(0.1 * radPerDeg);
    expect(most - geocentric).toBeLessThan(0.19 * radPerDeg);
  });

  it('with short-period terms lies within 0.3° of the one without', () => {
    const [plain, full] = [trackOf(), trackOf({ shortPeriod: true })].map(pointsOf);
    expect(full?.length).toBe(plain?.length);
    const apart = plain?.map((point, index) => Math.abs(point.latitude - (full?.[index]?.latitude ?? 9))) ?? [];
    expect(Math.max(...apart)).toBeGreaterThan(1e-5);
    expect(Math.max(...apart)).toBeLessThan(0.3 * radPerDeg);
  });

  it.each([
    [{ span: { kind: 'seconds', s: 0 } }, 'badInput', /above 0/],
    [{ span: { kind: 'revolutions', count: Number.NaN } }, 'badInput', /above 0/],
    [{ span: { kind: 'revolutions', count: 1e6 } }, 'tooLong', /At most 8333 revolutions/],
    [{ samplesPerRevolution: 50 }, 'badInput', /multiple of 4/],
    [{ body: bodies.mars, origin: { kind: 'greenwich', epochJd: 2_461_193 } }, 'badInput', /no Greenwich/],
    [{ body: customBody({ name: 'still', muKm3PerS2: 4e5, radiusKm: 6000, zonals: [] }) }, 'missing', /rotation/],
  ] as const)('%j is answered with the reason', (change, reason, words) => {
    const result = groundTrack({ ...request, ...change } as GroundTrackRequest);
    expect(result).toMatchObject({ ok: false, reason });
    expect(result.ok ? '' : result.message).toMatch(words);
  });
});
