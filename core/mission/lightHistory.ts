/**
 * Light over a history: β and shadow day by day, and the seasons with and without eclipse.
 *
 * Frame: the history's own, that of its epoch; the Sun is turned into it. Elements between samples come from `historyCurve`.
 * A season that lasts less than the pace of the days (one, unless asked otherwise) may be missed.
 */
import type { Body } from '../bodies/body';
import { type SunAt, sunSeenFrom } from '../bodies/sunSeenFrom';
import { turningPlace } from '../numerics/crossings';
import { type DatedMean, type HistoryCurve, historyCurve } from './historyCurve';
import { betaUnder, type EclipseTimes, eclipseUnder } from './light';
import { shadowArcs } from './shadowArcs';

export interface LightRequest {
  readonly body: Body;
  /** Julian date, UTC. */
  readonly epochJd: number;
  /** Mean elements over time, frame of the epoch. */
  readonly samples: readonly DatedMean[];
  /** Pace of the rows, days; 1 where left out. */
  readonly stepDays?: number;
}

/** One revolution's light. */
export interface LightRow extends EclipseTimes {
  readonly days: number;
  readonly betaRad: number;
  /** Of the revolution, 0 to 1. */
  readonly umbraShare: number;
}

/** A stretch of days, its ends to a minute; one at an end of the history may go on beyond it. */
export interface Season {
  readonly fromDays: number;
  readonly toDays: number;
}

export interface LightSummary {
  /** Stretches in which each revolution meets umbra or penumbra, and those in which none does. */
  readonly eclipseSeasons: readonly Season[];
  readonly freeSeasons: readonly Season[];
  readonly firstFreeDays: number | null;
  readonly lastFreeDays: number | null;
  /** Of the time, 0 to 1. */
  readonly freeShare: number;
  /** The revolution with most umbra; null where there is none at all. */
  readonly longest: LightRow | null;
}

export type LightHistory =
  | { readonly ok: true; readonly rows: readonly LightRow[]; readonly summary: LightSummary; readonly source: string }
  | { readonly ok: false; readonly reason: 'noSunModel'; readonly message: string };

/** A minute, days. */
const seasonEndDays = 1 / 1440;

export function lightHistory({ body, epochJd, samples, stepDays = 1 }: LightRequest): LightHistory {
  const model = sunSeenFrom(body, epochJd);
  if (!model.ok) return model;
  const sky: Sky = { body, epochJd, curve: historyCurve(samples), sunAt: model.sunAt };
  const rows = Array.from(pacedDays(samples, stepDays), (days) => rowAt(sky, days));
  return { ok: true, rows, summary: summaryOf(rows, (days) => isEclipsed(sky, days)), source: model.source };
}

/** Evenly from the first sample to the last, at most `stepDays` apart; both ends are in it. */
export function pacedDays(samples: readonly DatedMean[], stepDays: number): Float64Array {
  const from = samples[0]?.days ?? 0;
  const span = (samples[samples.length - 1]?.days ?? 0) - from;
  const count = Math.max(1, Math.ceil(span / stepDays - 1e-9));
  if (span === 0) return Float64Array.of(from);
  return Float64Array.from({ length: count + 1 }, (_, index) => from + (span * index) / count);
}

interface Sky {
  readonly body: Body;
  readonly epochJd: number;
  readonly curve: HistoryCurve;
  readonly sunAt: SunAt;
}

function rowAt({ body, epochJd, curve, sunAt }: Sky, days: number): LightRow {
  const mean = curve(days);
  const sun = sunAt(epochJd + days);
  const { umbraS, penumbraS, revolutionS } = eclipseUnder(body, mean, sun);
  return { days, betaRad: betaUnder(mean, sun), umbraS, penumbraS, umbraShare: umbraS / revolutionS };
}

function isEclipsed({ body, epochJd, curve, sunAt }: Sky, days: number): boolean {
  return shadowArcs(body, curve(days), sunAt(epochJd + days)).penumbra.length > 0;
}

function summaryOf(rows: readonly LightRow[], eclipsed: (days: number) => boolean): LightSummary {
  const inShadow = (row: LightRow) => row.umbraS + row.penumbraS > 0;
  const seasons: { readonly dark: boolean; readonly season: Season }[] = [];
  let [start] = rows;
  rows.forEach((row, index) => {
    const next = rows[index + 1];
    if (!start || (next && inShadow(next) === inShadow(row))) return;
    const turn = { from: row.days, to: next?.days ?? row.days, within: seasonEndDays };
    const toDays = next ? turningPlace(eclipsed, turn) : row.days;
    const fromDays = seasons.at(-1)?.season.toDays ?? start.days;
    seasons.push({ dark: inShadow(row), season: { fromDays, toDays } });
    start = next;
  });
  const freeSeasons = seasons.filter(({ dark }) => !dark).map(({ season }) => season);
  const span = (rows.at(-1)?.days ?? 0) - (rows[0]?.days ?? 0);
  const free = freeSeasons.reduce((sum, { fromDays, toDays }) => sum + toDays - fromDays, 0);
  return {
    eclipseSeasons: seasons.filter(({ dark }) => dark).map(({ season }) => season),
    freeSeasons,
    firstFreeDays: freeSeasons[0]?.fromDays ?? null,
    lastFreeDays: freeSeasons.at(-1)?.toDays ?? null,
    freeShare: span > 0 ? free / span : freeSeasons.length,
    longest: rows.reduce<LightRow | null>((most, row) => (row.umbraS > (most?.umbraS ?? 0) ? row : most), null),
  };
}
