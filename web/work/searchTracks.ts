/** A search for repeat tracks as the worker runs it: the tracks as columns of numbers, which cross to the page without a copy. */
import {
  neighbourDays,
  type RepeatProblem,
  type RepeatRequest,
  type RepeatTrack,
  repeatTrackSearch,
  type SearchedBand,
} from '../../core/index';

/** One entry a track in each column; by days, then by rising a. */
export interface TrackColumns {
  readonly revolutions: Uint32Array<ArrayBuffer>;
  readonly days: Uint16Array<ArrayBuffer>;
  readonly semiMajorAxisKm: Float64Array<ArrayBuffer>;
  readonly inclinationRad: Float64Array<ArrayBuffer>;
  /** Whole nodal days until a neighbouring track is passed. */
  readonly neighbourDays: Uint16Array<ArrayBuffer>;
}

export interface TracksFound {
  readonly ok: true;
  readonly columns: TrackColumns;
  readonly searched: readonly SearchedBand[];
  /** Wall time of the search in the worker. */
  readonly tookMs: number;
}

export type TracksAnswer = TracksFound | RepeatProblem;

/** Runs to the end; `onShare` hears how much is done, 0 to 1. */
export function searchTracks(request: RepeatRequest, onShare: (share: number) => void): TracksAnswer {
  const startMs = performance.now();
  const search = repeatTrackSearch(request);
  if (!search.ok) return search;
  const tracks: RepeatTrack[] = [];
  for (const chunk of search.chunks) {
    for (const track of chunk.tracks) tracks.push(track);
    onShare(chunk.share);
  }
  const columns = columnsOf(tracks);
  return { ok: true, columns, searched: search.searched, tookMs: performance.now() - startMs };
}

export function columnsOf(tracks: readonly RepeatTrack[]): TrackColumns {
  return {
    revolutions: Uint32Array.from(tracks, (track) => track.revolutions),
    days: Uint16Array.from(tracks, (track) => track.days),
    semiMajorAxisKm: Float64Array.from(tracks, (track) => track.semiMajorAxisKm),
    inclinationRad: Float64Array.from(tracks, (track) => track.inclinationRad),
    neighbourDays: Uint16Array.from(tracks, neighbourDays),
  };
}

export function buffersOf(columns: TrackColumns): ArrayBuffer[] {
  return Object.values(columns).map((column: { readonly buffer: ArrayBuffer }) => column.buffer);
}
