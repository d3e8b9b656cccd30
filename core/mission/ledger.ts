/**
 * The effects ledger: what each effect adds by the end of the span to node, local time, inclination, perigee, eccentricity
 * and altitude, when the effects are switched on one after another. The rows add up to what the whole history does.
 *
 * Local time counts against the mean Sun, whose way along the equator is in the first row: a Sun-synchronous orbit's J2 then
 * shows how far J2 alone misses the Sun, and the rows add up to the drift of local time. Precession moves the equinox that
 * local time is counted from, and nothing in the frame of the epoch.
 */
import type { Body } from '../bodies/body';
import { nodePrecessionRadPerS } from '../bodies/precession';
import { meanSunRightAscensionRad } from '../bodies/sun';
import { secondsPerDay, twoPi, wrapPi } from '../numerics/angles';
import type { MeanElements } from '../orbit/elements';
import { type HistoryRequest, HistoryRequestError, historyProblems } from './historyRequest';
import { historyTrack } from './historyTrack';
import { type LedgerEffect, ledgerStages } from './ledgerStages';
import { type LeftOutBound, leftOutBounds } from './leftOutBounds';
import { type HistoryOptions, type MissionHistory, missionHistory, usualLongestStepDays } from './missionHistory';

export interface EffectChange {
  readonly nodeRad: number;
  /** Seconds of mean local time of the node; null where the body's year or rotation is unknown. */
  readonly localTimeS: number | null;
  readonly inclinationRad: number;
  /** Whole turns counted; means little where `perigeeIsVague`. */
  readonly perigeeRad: number;
  readonly eccentricity: number;
  /** Of the mean altitude a − R. */
  readonly altitudeKm: number;
}

export interface LedgerRow {
  readonly effect: LedgerEffect;
  readonly change: EffectChange;
}

export interface EffectsLedger {
  readonly rows: readonly LedgerRow[];
  readonly sum: EffectChange;
  /** The end that all rows belong to: of the span, or of the orbit. */
  readonly endDays: number;
  /** At small e the perigee's rows hang on the order of the effects: look at the eccentricity vector instead. */
  readonly perigeeIsVague: boolean;
  /** Effects that no row holds, and how much they may come to. */
  readonly bounds: readonly LeftOutBound[];
  /** The history with everything on. */
  readonly history: MissionHistory;
}

/** Below this e the perigee of a low orbit swings about its frozen place. */
const vagueEccentricity = 0.02;

/**
 * The ledger of a history, in the frame of the epoch; `history` saves the last run where it is there already.
 *
 * @throws HistoryRequestError as `missionHistory`.
 */
export function effectsLedger(
  request: HistoryRequest,
  { history: known, ...options }: HistoryOptions & { readonly history?: MissionHistory } = {},
): EffectsLedger {
  const problems = historyProblems(request);
  if (problems.length > 0) throw new HistoryRequestError(problems);
  const history = known ?? missionHistory(request, options);
  const { endDays } = history;
  const end = history.samples.at(-1)?.mean ?? request.mean;
  const ends = stageEnds(request, endDays, end, options);
  const rows: LedgerRow[] = [];
  let before = request.mean;
  for (const { effect, mean } of ends) {
    rows.push({ effect, change: changeBetween(request.body, before, mean) });
    before = mean;
  }
  const withSun = addSun(rows, request, endDays);
  const sum = withSun.reduce((total, { change }) => added(total, change), noChange(request.body));
  const perigeeIsVague = Math.min(request.mean.eccentricity, end.eccentricity) < vagueEccentricity;
  const bounds = leftOutBounds({ request, rows: withSun, endDays });
  return { rows: withSun, sum, endDays, perigeeIsVague, bounds, history };
}

interface StageEnd {
  readonly effect: LedgerEffect;
  readonly mean: MeanElements;
}

/** Where each stage leads; the last one is the history that is known already. */
function stageEnds(
  request: HistoryRequest,
  endDays: number,
  end: MeanElements,
  options: HistoryOptions,
): readonly StageEnd[] {
  const stages = ledgerStages(request);
  return stages.map(({ effect, body, model }, index) => {
    if (index === stages.length - 1) return { effect, mean: end };
    if (endDays === 0) return { effect, mean: request.mean };
    const track = historyTrack({ ...request, body, spanDays: endDays, sampleDays: endDays }, model, {
      // A stage that lacks what lifts the perigee goes on through the surface: only its end counts.
      floorKm: Number.NEGATIVE_INFINITY,
      ceilingKm: Number.POSITIVE_INFINITY,
      // Without the Moon nothing turns faster than the year: twice the step loses nothing.
      longestStepDays: (effect === 'moon' ? 1 : 2) * (options.longestStepDays ?? usualLongestStepDays),
      onProgress: (share) => options.onProgress?.((index + share) / stages.length),
    });
    return { effect, mean: track.samples.at(-1)?.mean ?? request.mean };
  });
}

function hasLocalTime({ yearDays, rotationRadPerS }: Body): boolean {
  return yearDays !== null && rotationRadPerS !== null;
}

function noChange(body: Body): EffectChange {
  const localTimeS = hasLocalTime(body) ? 0 : null;
  return { nodeRad: 0, localTimeS, inclinationRad: 0, perigeeRad: 0, eccentricity: 0, altitudeKm: 0 };
}

/** Seconds of local time per rad of right ascension; clocks run the other way on a retrograde rotator. */
function clockSPerRad({ rotationRadPerS }: Body): number {
  return ((rotationRadPerS ?? 0) < 0 ? -1 : 1) * (secondsPerDay / twoPi);
}

function changeBetween(body: Body, from: MeanElements, to: MeanElements): EffectChange {
  const nodeRad = to.nodeRad - from.nodeRad;
  return {
    nodeRad,
    localTimeS: hasLocalTime(body) ? nodeRad * clockSPerRad(body) : null,
    inclinationRad: to.inclinationRad - from.inclinationRad,
    perigeeRad: to.perigeeRad - from.perigeeRad,
    eccentricity: to.eccentricity - from.eccentricity,
    altitudeKm: to.semiMajorAxisKm - from.semiMajorAxisKm,
  };
}

function added(one: EffectChange, other: EffectChange): EffectChange {
  return {
    nodeRad: one.nodeRad + other.nodeRad,
    localTimeS: one.localTimeS === null || other.localTimeS === null ? null : one.localTimeS + other.localTimeS,
    inclinationRad: one.inclinationRad + other.inclinationRad,
    perigeeRad: one.perigeeRad + other.perigeeRad,
    eccentricity: one.eccentricity + other.eccentricity,
    altitudeKm: one.altitudeKm + other.altitudeKm,
  };
}

/** The Sun's way put into the first row, and precession added as the last. */
function addSun(rows: readonly LedgerRow[], { body, epochJd }: HistoryRequest, endDays: number): readonly LedgerRow[] {
  if (!hasLocalTime(body)) return rows;
  const perRad = clockSPerRad(body);
  const sunS = -perRad * sunAdvanceRad(body, epochJd, endDays);
  const out = rows.map((row, index) =>
    index === 0 ? { ...row, change: { ...row.change, localTimeS: (row.change.localTimeS ?? 0) + sunS } } : row,
  );
  // Precession is known for the Earth alone.
  if (body.id !== 'earth') return out;
  const localTimeS = perRad * nodePrecessionRadPerS * endDays * secondsPerDay;
  return [...out, { effect: 'precession', change: { ...noChange(body), localTimeS } }];
}

/** How far the mean Sun goes along the equator, rad, whole turns counted. */
function sunAdvanceRad(body: Body, epochJd: number, days: number): number {
  const even = (twoPi * days) / (body.yearDays ?? Number.POSITIVE_INFINITY);
  if (body.id !== 'earth') return even;
  return even + wrapPi(meanSunRightAscensionRad(epochJd + days) - meanSunRightAscensionRad(epochJd) - even);
}
