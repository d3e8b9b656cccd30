import { describe, expect, it } from 'vitest';
import { bodies } from '../../../core/bodies/bodies';
import {
  closedFromLatitude,
  greatestLatitudeRad,
  swathFit,
  type TrackGrid,
  trackSpacingAt,
} from '../../../core/design/trackSpacing';

const { earth } = bodies;
const radPerDeg = Math.PI / 180;
const twoPi = 2 * Math.PI;
const grid: TrackGrid = { revolutions: 143, days: 10, inclinationRad: 98.57 * radPerDeg };

/** A point of a circular track on the turning unit sphere, u from the ascending node. */
function place({ inclinationRad: i, days, revolutions, tracksStep }: TrackGrid, u: number) {
  const turned = ((tracksStep === 'east' ? -1 : 1) * u * days) / revolutions;
  const latitude = Math.asin(Math.sin(i) * Math.sin(u));
  return { latitude, longitude: Math.atan2(Math.cos(i) * Math.sin(u), Math.cos(u)) - turned };
}

/** Across the track, by the slope of the track in steps of 1e-6 rad. */
function acrossByDifference(track: TrackGrid, latitude: number): number {
  const u = Math.asin(Math.sin(latitude) / Math.sin(track.inclinationRad));
  const [before, after] = [place(track, u - 1e-6), place(track, u + 1e-6)];
  const north = after.latitude - before.latitude;
  const east = (after.longitude - before.longitude) * Math.cos(latitude);
  const along = (twoPi * earth.equatorialRadiusKm * Math.cos(latitude)) / track.revolutions;
  return (along * north) / Math.hypot(north, east);
}

describe('track spacing', () => {
  it.each([
    { ...grid },
    { ...grid, inclinationRad: 1 },
    { ...grid, inclinationRad: 1.2, tracksStep: 'east' as const },
    { revolutions: 2, days: 1, inclinationRad: 1.1 },
  ])('across the track agrees with the slope of a drawn track: %j', (track) => {
    for (const share of [0, 0.2, 0.5, 0.8, 0.97]) {
      const latitude = share * greatestLatitudeRad(track);
      const spacing = trackSpacingAt(earth, track, latitude);
      expect(spacing?.acrossTrackKm).toBeCloseTo(acrossByDifference(track, latitude), 3);
      expect(spacing?.alongParallelKm).toBeCloseTo(
        (twoPi * earth.equatorialRadiusKm * Math.cos(latitude)) / track.revolutions,
        9,
      );
      expect(trackSpacingAt(earth, track, -latitude)).toEqual(spacing);
    }
  });

  it('is null beyond the greatest latitude, and nothing across the track at it', () => {
    expect(trackSpacingAt(earth, grid, 82 * radPerDeg)).toBeNull();
    expect(trackSpacingAt(earth, grid, greatestLatitudeRad(grid))?.acrossTrackKm).toBeCloseTo(0, 4);
    expect(trackSpacingAt(earth, grid, Number.NaN)).toBeNull();
  });
});

describe('a swath', () => {
  it('of 290 km closes 143 tracks at the equator, one of 200 km only from some latitude on', () => {
    const wide = swathFit(earth, grid, 290);
    if (!wide.ok) throw new Error(wide.message);
    expect(wide.fits).toBe(true);
    expect(wide.overlapKm).toBeCloseTo(290 - wide.spacing.acrossTrackKm, 9);
    expect(wide.overlapShare).toBeCloseTo(wide.overlapKm / 290, 12);
    expect(closedFromLatitude(earth, grid, 290)).toEqual({ ok: true, latitudeRad: 0 });

    const narrow = swathFit(earth, grid, 200);
    expect(narrow).toMatchObject({ ok: true, fits: false });
    const closed = closedFromLatitude(earth, grid, 200);
    if (!closed.ok) throw new Error(closed.message);
    expect(closed.latitudeRad).toBeGreaterThan(0.5);
    expect(trackSpacingAt(earth, grid, closed.latitudeRad)?.acrossTrackKm).toBeCloseTo(200, 6);
    expect(swathFit(earth, grid, 200, closed.latitudeRad + 1e-6)).toMatchObject({ fits: true });
    expect(swathFit(earth, grid, 200, closed.latitudeRad - 1e-6)).toMatchObject({ fits: false });
  });

  it('leaves no gap anywhere above the latitude from which it is closed, on any grid', () => {
    for (const inclinationDeg of [10, 50, 84, 87, 90, 98, 130, 170]) {
      for (const tracksStep of ['west', 'east'] as const) {
        const track: TrackGrid = { revolutions: 29, days: 2, inclinationRad: inclinationDeg * radPerDeg, tracksStep };
        const closed = closedFromLatitude(earth, track, 900);
        if (!closed.ok) throw new Error(closed.message);
        const greatest = greatestLatitudeRad(track);
        for (let share = 0; share <= 1; share += 0.001) {
          const latitude = closed.latitudeRad + share * (greatest - closed.latitudeRad);
          expect(trackSpacingAt(earth, track, latitude)?.acrossTrackKm ?? 0).toBeLessThanOrEqual(900 * (1 + 1e-9));
        }
      }
    }
  });

  it('that is no width, or looks beyond the track, is answered with the reason', () => {
    for (const km of [0, -1, Number.NaN, Number.POSITIVE_INFINITY]) {
      expect(swathFit(earth, grid, km)).toMatchObject({ ok: false, reason: 'badSwath' });
      expect(closedFromLatitude(earth, grid, km)).toMatchObject({ ok: false, reason: 'badSwath' });
    }
    const beyond = swathFit(earth, grid, 290, 85 * radPerDeg);
    expect(beyond).toMatchObject({ ok: false, reason: 'beyondTrack' });
    expect(beyond.ok ? '' : beyond.message).toMatch(/reaches 81.43° .* at 85°/);
  });
});
