/** What a search for events is given and what it finds. */
import type { Body } from '../bodies/body';
import type { DatedMean, HistoryCurve } from './historyCurve';
import type { LightHistory } from './lightHistory';

export type EventKind =
  | 'boxLeft'
  | 'boxEntered'
  | 'outsideBox'
  | 'localTimeBack'
  | 'perigeeNorth'
  | 'perigeeSouth'
  | 'perigeeEquator'
  | 'betaGreatest'
  | 'betaLeast'
  | 'betaZero'
  | 'eclipsesBegin'
  | 'eclipsesEnd'
  | 'altitudeBelow'
  | 'decay'
  | 'escape';

/** A number that goes with an event; the quantity's name holds its unit. */
export interface EventValue {
  readonly quantity: 'localTimeH' | 'betaRad' | 'altitudeKm' | 'perigeeRad';
  readonly amount: number;
}

export interface MissionEvent {
  readonly kind: EventKind;
  /** Since the epoch. */
  readonly days: number;
  /** Julian date, UTC. */
  readonly jd: number;
  /** What happens, without numbers and dates. */
  readonly words: string;
  readonly value: EventValue | null;
}

/** Before the date is put in words. */
export type FoundEvent = Omit<MissionEvent, 'jd'>;

/** The box that the local time of a node must stay in. */
export interface LocalTimeBox {
  readonly node: 'ascending' | 'descending';
  readonly allowedMinutes: number;
  /** Middle of the box, mean local time; the one at the start where left out. */
  readonly targetH?: number | undefined;
}

/** A height that is not to be undercut, above the equatorial radius. */
export interface AltitudeLimit {
  readonly of: 'perigee' | 'mean';
  readonly km: number;
}

export interface EventsRequest {
  readonly body: Body;
  /** Julian date, UTC. */
  readonly epochJd: number;
  /** Mean elements over time, frame of the epoch. */
  readonly samples: readonly DatedMean[];
  readonly endedBy?: 'span' | 'decay' | 'escape';
  readonly box?: LocalTimeBox;
  readonly altitude?: AltitudeLimit;
  /** Made here where left out: a day's pace. */
  readonly light?: LightHistory;
}

export interface MissionEvents {
  /** In the order of time. */
  readonly events: readonly MissionEvent[];
  /** Kinds that this body cannot have, each with its reason. */
  readonly leftOut: readonly { readonly what: 'localTime' | 'light'; readonly reason: string }[];
}

/** What each kind of event is searched in. */
export interface EventSearch {
  readonly body: Body;
  readonly epochJd: number;
  readonly curve: HistoryCurve;
  /** Days to look at, rising. */
  readonly grid: Float64Array;
  readonly first: DatedMean;
}

export type EventsOrReason =
  | { readonly ok: true; readonly events: readonly FoundEvent[] }
  | { readonly ok: false; readonly message: string };
