/** What the sweep shows: kept while the app is open, so that looking at another picture loses nothing. */
import type { ReadingId, SweptElement } from '../../core/index';

export interface SweepChoice {
  readonly reading: ReadingId;
  /** Null until one is chosen: then the first that no condition settles. */
  readonly element: SweptElement | null;
  /** The ends as typed, and the unit they are typed in; null for a range around the orbit. */
  readonly range: SweepRange | null;
}

export interface SweepRange {
  readonly from: string;
  readonly to: string;
  readonly unit: string;
}

export const firstSweep: SweepChoice = { reading: 'nodeRate', element: null, range: null };
