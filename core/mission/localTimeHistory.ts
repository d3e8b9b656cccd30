/**
 * Local time of a node over a history: node of the date against the mean Sun of the date.
 *
 * The history's node is counted from the equinox of its epoch; general precession in right ascension is added. What the tilt
 * of the equator adds beside (up to 0.0056° a year times cot i) is left out, as nutation is.
 */
import type { Body } from '../bodies/body';
import { nodePrecessionRadPerS } from '../bodies/precession';
import { meanSunRightAscensionRad, sunPosition } from '../bodies/sun';
import { secondsPerDay, twoPi, wrapPi } from '../numerics/angles';
import { type LocalTimeOptions, localTimeOfNodeH } from '../orbit/localTime';
import type { DatedMean } from './historyCurve';

/** Only to tell the turn. */
const aboutAYearDays = 365.25;

export interface LocalTimeRequest extends LocalTimeOptions {
  readonly body: Body;
  /** Julian date, UTC. */
  readonly epochJd: number;
}

/**
 * Local time (h) of a node (rad, frame of the epoch, unwound) at days after the epoch. In [0, 24) at the epoch for `startNodeRad`;
 * from there it goes on without wrapping.
 */
export type LocalTimeAt = (days: number, nodeRad: number) => number;

export type LocalTimeModel =
  | { readonly ok: true; readonly hoursAt: LocalTimeAt }
  | { readonly ok: false; readonly reason: 'earthOnly'; readonly message: string };

export function localTimeModel({ body, epochJd, node, sun }: LocalTimeRequest, startNodeRad: number): LocalTimeModel {
  if (body.id !== 'earth') {
    const message = `Local time is told for the Earth only: ${body.name} has no clock here.`;
    return { ok: false, reason: 'earthOnly', message };
  }
  const sunRad = (jd: number) => (sun === 'mean' ? meanSunRightAscensionRad(jd) : sunPosition(jd).rightAscensionRad);
  const startSunRad = sunRad(epochJd);
  const startH = localTimeOfNodeH(startNodeRad, epochJd, { node, sun });
  return {
    ok: true,
    hoursAt: (days, nodeRad) => {
      // The true Sun strays 4° at most from an even pace: that tells the turn.
      const evenRad = (twoPi * days) / aboutAYearDays;
      const sunMovedRad = evenRad + wrapPi(sunRad(epochJd + days) - startSunRad - evenRad);
      const nodeMovedRad = nodeRad - startNodeRad + nodePrecessionRadPerS * secondsPerDay * days;
      return startH + ((nodeMovedRad - sunMovedRad) / twoPi) * 24;
    },
  };
}

export interface LocalTimePoint {
  readonly days: number;
  /** h; not wrapped. */
  readonly hours: number;
}

export type LocalTimeHistory =
  | { readonly ok: true; readonly points: readonly LocalTimePoint[] }
  | { readonly ok: false; readonly reason: 'earthOnly'; readonly message: string };

/** Local time at each sample of a history. */
export function localTimeHistory(
  request: LocalTimeRequest & { readonly samples: readonly DatedMean[] },
): LocalTimeHistory {
  const [first] = request.samples;
  if (!first) return { ok: true, points: [] };
  const model = localTimeModel(request, first.mean.nodeRad);
  if (!model.ok) return model;
  const points = request.samples.map(({ days, mean }) => ({ days, hours: model.hoursAt(days, mean.nodeRad) }));
  return { ok: true, points };
}
