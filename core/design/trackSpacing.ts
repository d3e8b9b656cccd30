/**
 * How far apart the tracks of a complete cycle lie, and whether a swath closes the gaps between them.
 *
 * Ascending tracks among themselves; descending ones lie as far apart. Two distances: along the parallel, and across the
 * track, which is what a swath (a width square to the track) has to cover. On a sphere of the body's equatorial radius, at
 * geocentric latitudes, with the orbit turning evenly (a circle); on the Earth's ellipsoid parallels are up to 0.3 % longer.
 * Swath in km on the ground, track not bent within a swath's width.
 */
import type { Body } from '../bodies/body';
import { twoPi } from '../numerics/angles';
import { formatSignificant } from '../numerics/numberWords';
import type { Cycle } from './closingOrbit';
import type { TrackStep } from './trackPattern';

export interface TrackGrid extends Cycle {
  readonly inclinationRad: number;
  /** West unless the body or the node turns the other way. */
  readonly tracksStep?: TrackStep;
}

export interface TrackSpacing {
  readonly alongParallelKm: number;
  readonly acrossTrackKm: number;
}

/** Latitude that the track just reaches, rad. */
export function greatestLatitudeRad({ inclinationRad }: Pick<TrackGrid, 'inclinationRad'>): number {
  return Math.min(inclinationRad, Math.PI - inclinationRad);
}

/** Between neighbouring tracks at a latitude (rad), or null beyond the greatest latitude of the track. */
export function trackSpacingAt(body: Body, grid: TrackGrid, latitudeRad: number): TrackSpacing | null {
  const latitude = Math.abs(latitudeRad);
  if (!(latitude <= greatestLatitudeRad(grid))) return null;
  const c = Math.cos(latitude);
  const alongParallelKm = (twoPi * body.equatorialRadiusKm * c) / grid.revolutions;
  // Speeds over the ground in units of the orbit's own turn: cos i = cos φ · sin(azimuth), less the ground's D/N cos φ.
  const west = grid.tracksStep === 'east' ? -1 : 1;
  const east = Math.cos(grid.inclinationRad) / c - (west * grid.days * c) / grid.revolutions;
  const north = Math.sqrt(Math.max(0, 1 - (Math.cos(grid.inclinationRad) / c) ** 2));
  return { alongParallelKm, acrossTrackKm: (alongParallelKm * north) / Math.hypot(north, east) };
}

export type SwathFit =
  | {
      readonly ok: true;
      readonly fits: boolean;
      readonly spacing: TrackSpacing;
      /** Swath less spacing across the track; negative: the width of the gap. */
      readonly overlapKm: number;
      /** The same as a share of the swath. */
      readonly overlapShare: number;
    }
  | { readonly ok: false; readonly reason: 'badSwath' | 'beyondTrack'; readonly message: string };

/** Whether neighbouring swaths (km, whole width across the track) meet at a latitude (rad; 0 is the equator). */
export function swathFit(body: Body, grid: TrackGrid, swathKm: number, latitudeRad = 0): SwathFit {
  const problem = problemOfSwath(swathKm);
  if (problem) return problem;
  const spacing = trackSpacingAt(body, grid, latitudeRad);
  if (!spacing) {
    const most = degrees(greatestLatitudeRad(grid));
    const message = `The track reaches ${most}° of latitude, so that nothing passes at ${degrees(Math.abs(latitudeRad))}°.`;
    return { ok: false, reason: 'beyondTrack', message };
  }
  const overlapKm = swathKm - spacing.acrossTrackKm;
  return { ok: true, fits: overlapKm >= 0, spacing, overlapKm, overlapShare: overlapKm / swathKm };
}

const steps = 720;
const halvings = 50;

/**
 * The least latitude (rad) from which on, up to the greatest of the track, neighbouring swaths meet: 0 where they do so
 * everywhere; the typed problem for a swath that is no width.
 */
export function closedFromLatitude(
  body: Body,
  grid: TrackGrid,
  swathKm: number,
): { readonly ok: true; readonly latitudeRad: number } | Extract<SwathFit, { ok: false }> {
  const problem = problemOfSwath(swathKm);
  if (problem) return problem;
  const greatest = greatestLatitudeRad(grid);
  const gaps = (latitude: number) => (trackSpacingAt(body, grid, latitude)?.acrossTrackKm ?? 0) > swathKm;
  // From the top down: the spacing may have a hump where the track runs along a meridian.
  let index = steps;
  while (index >= 0 && !gaps((greatest * index) / steps)) index -= 1;
  if (index < 0) return { ok: true, latitudeRad: 0 };
  let [open, closed] = [(greatest * index) / steps, (greatest * Math.min(steps, index + 1)) / steps];
  for (let step = 0; step < halvings; step += 1) {
    const middle = 0.5 * (open + closed);
    if (gaps(middle)) open = middle;
    else closed = middle;
  }
  return { ok: true, latitudeRad: closed };
}

function problemOfSwath(swathKm: number): Extract<SwathFit, { ok: false }> | null {
  if (swathKm > 0 && swathKm < Number.POSITIVE_INFINITY) return null;
  const got = Number.isFinite(swathKm) ? `, not ${formatSignificant(swathKm)}` : '';
  return { ok: false, reason: 'badSwath', message: `A swath has to be a width in km above 0${got}.` };
}

function degrees(rad: number): string {
  return formatSignificant((rad * 360) / twoPi, 4);
}
