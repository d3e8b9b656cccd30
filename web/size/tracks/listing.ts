/** Which tracks are listed and in which order: indices into the columns that were found, so that nothing is copied. */
import { type Body, trackSpacingAt, twoPi } from '../../../core/index';
import type { TrackColumns } from '../../work/searchTracks';
import type { TrackFilter } from './wishes';

export const sortColumns = ['cycle', 'altitude', 'inclination', 'spacing', 'across', 'neighbour', 'perDay'] as const;
export type SortColumn = (typeof sortColumns)[number];

export interface SortOrder {
  readonly column: SortColumn;
  readonly falls: boolean;
}

export interface Tracks {
  readonly body: Body;
  readonly columns: TrackColumns;
  /** Between neighbouring tracks, square to them, at the filter's latitude; NaN beyond their reach. */
  readonly acrossKm: Float64Array;
}

/** One track out of the columns. */
export interface TrackRow {
  readonly revolutions: number;
  readonly days: number;
  readonly semiMajorAxisKm: number;
  readonly inclinationRad: number;
  readonly neighbourDays: number;
  readonly spacingKm: number;
  readonly acrossKm: number;
}

export function acrossTracks(columns: TrackColumns, body: Body, latitudeRad: number): Float64Array {
  const tracksStep = (body.rotationRadPerS ?? 0) < 0 ? 'east' : 'west';
  return Float64Array.from(columns.days, (days, index) => {
    const revolutions = columns.revolutions[index] ?? Number.NaN;
    const inclinationRad = columns.inclinationRad[index] ?? Number.NaN;
    const grid = { revolutions, days, inclinationRad, tracksStep } as const;
    return trackSpacingAt(body, grid, latitudeRad)?.acrossTrackKm ?? Number.NaN;
  });
}

export function rowAt({ body, columns, acrossKm }: Tracks, index: number): TrackRow {
  const revolutions = columns.revolutions[index] ?? Number.NaN;
  return {
    revolutions,
    days: columns.days[index] ?? Number.NaN,
    semiMajorAxisKm: columns.semiMajorAxisKm[index] ?? Number.NaN,
    inclinationRad: columns.inclinationRad[index] ?? Number.NaN,
    neighbourDays: columns.neighbourDays[index] ?? Number.NaN,
    spacingKm: (twoPi * body.equatorialRadiusKm) / revolutions,
    acrossKm: acrossKm[index] ?? Number.NaN,
  };
}

/** Tracks that the filter lets through, in the order in which they were found. */
export function kept(tracks: Tracks, filter: TrackFilter): Uint32Array {
  const { columns, body } = tracks;
  const aroundKm = twoPi * body.equatorialRadiusKm;
  const found = new Uint32Array(columns.days.length);
  let count = 0;
  for (let index = 0; index < found.length; index += 1) {
    const days = columns.days[index] ?? 0;
    const revolutions = columns.revolutions[index] ?? 0;
    const spacingKm = aroundKm / revolutions;
    if (days < filter.shortestDays || spacingKm < filter.narrowestKm || spacingKm > filter.widestKm) continue;
    if (filter.cycle && (filter.cycle.days !== days || filter.cycle.revolutions !== revolutions)) continue;
    found[count] = index;
    count += 1;
  }
  return found.subarray(0, count);
}

/** Those of them whose swaths meet at the filter's latitude; all where no swath is asked for. */
export function withoutGap({ acrossKm }: Tracks, listed: Uint32Array, { swathKm }: TrackFilter): Uint32Array {
  if (swathKm === null) return listed;
  return listed.filter((index) => (acrossKm[index] ?? Number.NaN) <= swathKm);
}

/** Sorted by a column; among equals as found, by days and then by a. What has no value comes last. */
export function sorted(tracks: Tracks, listed: Uint32Array, { column, falls }: SortOrder): Uint32Array {
  const key = keyOf(tracks, column);
  const sign = falls ? -1 : 1;
  const keys = new Float64Array(tracks.columns.days.length);
  for (const index of listed) {
    const value = sign * key(index);
    keys[index] = Number.isNaN(value) ? Number.POSITIVE_INFINITY : value;
  }
  return listed.slice().sort((one, other) => {
    const [keyOne, keyOther] = [keys[one] ?? 0, keys[other] ?? 0];
    return keyOne === keyOther ? one - other : keyOne < keyOther ? -1 : 1;
  });
}

function keyOf({ columns, acrossKm }: Tracks, column: SortColumn): (index: number) => number {
  const at = (values: ArrayLike<number>) => (index: number) => values[index] ?? Number.NaN;
  const days = at(columns.days);
  const revolutions = at(columns.revolutions);
  switch (column) {
    case 'cycle':
      return days;
    case 'altitude':
      return at(columns.semiMajorAxisKm);
    case 'inclination':
      return at(columns.inclinationRad);
    case 'spacing':
      return (index) => -revolutions(index);
    case 'across':
      return at(acrossKm);
    case 'neighbour':
      return at(columns.neighbourDays);
    case 'perDay':
      return (index) => revolutions(index) / days(index);
  }
}

/** The index with the least value of a column, or null where there is none. */
export function least(tracks: Tracks, listed: Uint32Array, column: SortColumn): number | null {
  const key = keyOf(tracks, column);
  let best: number | null = null;
  for (const index of listed) if (key(index) < (best === null ? Number.POSITIVE_INFINITY : key(best))) best = index;
  return best;
}
