/**
 * Every repeat ground track of a band of altitudes.
 *
 * Closed form of either order; Sun, Moon and drag are left out, so these are the orbits to start from, to be held by
 * track keeping. Altitudes are mean ones, a − R with R the body's equatorial radius.
 */
import { twoPi } from '../numerics/angles';
import { coprime } from '../numerics/integers';
import { type BandCell, bandCells } from './bandCells';
import { cellHolds, closingOrbit } from './closingOrbit';
import { belowSurface, clearBand, noOrbits, problemOfNumber, revolutionsADay } from './repeatLimits';
import { problemOfRequest, type RepeatProblem, type RepeatRequest, RepeatTracksError } from './repeatProblem';
import { type TrackCurve, trackCurve } from './trackCurve';

export interface RepeatTrack {
  /** N and D, coprime: nodal periods and nodal days after which the track closes. */
  readonly revolutions: number;
  readonly days: number;
  readonly semiMajorAxisKm: number;
  readonly inclinationRad: number;
  /** Between neighbouring ascending crossings of the equator, along it: 2πR/N. */
  readonly trackSpacingKm: number;
}

/** Mean altitudes that were searched: the band, less what lies below the surface or past the last orbit there is. */
export interface SearchedBand {
  readonly minAltitudeKm: number;
  readonly maxAltitudeKm: number;
}

export interface RepeatTracksFound {
  readonly ok: true;
  /** By days, then by rising a. */
  readonly tracks: readonly RepeatTrack[];
  readonly searched: readonly SearchedBand[];
}

export interface RepeatChunk {
  readonly tracks: readonly RepeatTrack[];
  /** How much of the search is done, 0 to 1. */
  readonly share: number;
}

export interface RepeatSearch {
  readonly ok: true;
  readonly searched: readonly SearchedBand[];
  /** Runs the search piece by piece: to be stopped between any two, simply by asking for no more. */
  readonly chunks: Generator<RepeatChunk, void>;
}

/**
 * Every coprime N/D in the band up to `maxDays`, by days and then by rising a; lengths in km, angles in rad.
 *
 * Empty where nature has none: no Sun-synchronous inclination in the band, or perigee below the surface throughout.
 *
 * @throws RepeatTracksError with `reason`, `field` and a sentence for a request that makes no sense, a body without the
 * rotation or year it takes, or more than a million tracks.
 */
export function repeatTracks(request: RepeatRequest): readonly RepeatTrack[] {
  const result = tryRepeatTracks(request);
  if (result.ok) return result.tracks;
  if (result.reason === 'noSunSynchronous' || result.reason === 'belowSurface') return [];
  throw new RepeatTracksError(result);
}

/** As `repeatTracks`, with what was searched, and every failure as a result with its reason. */
export function tryRepeatTracks(request: RepeatRequest): RepeatTracksFound | RepeatProblem {
  const search = repeatTrackSearch(request);
  if (!search.ok) return search;
  const tracks: RepeatTrack[] = [];
  for (const chunk of search.chunks) for (const track of chunk.tracks) tracks.push(track);
  return { ok: true, tracks, searched: search.searched };
}

/** As `tryRepeatTracks`, found piece by piece so that the caller can show progress and stop. */
export function repeatTrackSearch(request: RepeatRequest): RepeatSearch | RepeatProblem {
  const problem = problemOfRequest(request);
  if (problem) return problem;
  const band = clearBand(request);
  if (band.lowKm > band.highKm) return belowSurface(request, band);
  const curve = trackCurve(request);
  const cells = bandCells(curve, band);
  if (cells.length === 0) return noOrbits(request, band);
  const excess = problemOfNumber(cells, request);
  if (excess) return excess;
  return { ok: true, searched: searchedBands(cells, request), chunks: search(curve, cells, request) };
}

/** Tracks in a piece, about. */
const chunkSize = 2000;

function* search(curve: TrackCurve, cells: readonly BandCell[], request: RepeatRequest): Generator<RepeatChunk, void> {
  const aroundKm = twoPi * request.body.equatorialRadiusKm;
  const whole = request.maxDays * (request.maxDays + 1);
  let tracks: RepeatTrack[] = [];
  for (let days = 1; days <= request.maxDays; days += 1) {
    for (const cell of cells) {
      for (const revolutions of revolutionsWithin(cell, days)) {
        const { semiMajorAxisKm, inclinationRad } = closingOrbit(curve, cell, { revolutions, days });
        tracks.push({ revolutions, days, semiMajorAxisKm, inclinationRad, trackSpacingKm: aroundKm / revolutions });
        if (tracks.length < chunkSize) continue;
        yield { tracks, share: (days * (days - 1)) / whole };
        tracks = [];
      }
    }
  }
  yield { tracks, share: 1 };
}

/** Revolutions of the cycles of so many days that lie in a cell, in order of rising a. */
function revolutionsWithin(cell: BandCell, days: number): readonly number[] {
  const [least, most] = revolutionsADay(cell);
  const found: number[] = [];
  const last = Math.ceil(most * days);
  for (let revolutions = Math.max(1, Math.floor(least * days)); revolutions <= last; revolutions += 1) {
    if (cellHolds(cell, { revolutions, days }) && coprime(revolutions, days)) found.push(revolutions);
  }
  const falls = Math.abs(cell.high.daysPerRevolution) > Math.abs(cell.low.daysPerRevolution);
  return falls ? found.reverse() : found;
}

function searchedBands(cells: readonly BandCell[], { body }: RepeatRequest): readonly SearchedBand[] {
  // To the millimetre, so that the band's own ends come back as they were given.
  const heightKm = (axisKm: number) => Math.round((axisKm - body.equatorialRadiusKm) * 1e6) / 1e6;
  let startKm = cells[0]?.low.semiMajorAxisKm ?? Number.NaN;
  return cells.flatMap(({ high, closed }, index) => {
    if (!closed) return [];
    const band = { minAltitudeKm: heightKm(startKm), maxAltitudeKm: heightKm(high.semiMajorAxisKm) };
    startKm = cells[index + 1]?.low.semiMajorAxisKm ?? Number.NaN;
    return [band];
  });
}
