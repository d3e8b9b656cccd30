/** The walk from the epoch to the end of a history, step by step. */
import { secondsPerDay } from '../numerics/angles';
import { type AveragedRates, averagedRates, NotAnOrbitError } from './averagedRates';
import { type AveragedStep, averagedStep, type StepStart, valuesWithin } from './averagedStep';
import { equinoctialFromElements, senseOf } from './equinoctial';
import type { HistoryModel } from './historyForces';
import type { HistoryRequest } from './historyRequest';
import { type HistorySample, sampleTaker } from './historySamples';
import { apogeeKm, perigeeHeightKm, stepLimit } from './historyStepLimit';
import { zonalCoupling } from './zonalCoupling';

/** `escape`: the apogee came too near the Moon, or the orbit opened: averaging over a revolution has lost its meaning. */
export type HistoryEnd = 'span' | 'decay' | 'escape';

export interface HistoryTrack {
  readonly samples: readonly HistorySample[];
  readonly endedBy: HistoryEnd;
  readonly endDays: number;
}

export interface TrackSetting {
  /** Perigee height (km) at which the walk ends in decay. */
  readonly floorKm: number;
  /** Distance of the apogee (km) at which it ends in escape. */
  readonly ceilingKm: number;
  readonly longestStepDays: number;
  readonly onProgress: (share: number) => void;
}

/** Steps between two calls of `onProgress`. */
const progressSteps = 16;

/** A step that would have to be shorter, s, follows nothing that an average can describe. */
const shortestStepS = 10;

interface Place {
  readonly days: number;
  readonly values: Float64Array;
  readonly rates: Float64Array;
}

export function historyTrack(request: HistoryRequest, model: HistoryModel, setting: TrackSetting): HistoryTrack {
  const { body, mean, spanDays, epochJd } = request;
  const sense = senseOf(mean.inclinationRad);
  const coupling = model.coupledDegree > 2 ? zonalCoupling(body, model.coupledDegree, sense) : undefined;
  const rates = averagedRates({ body, sense, oblateness: model.oblateness, forces: model.forces, coupling });
  const taker = sampleTaker(mean, request.sampleDays, sense);
  const ended = (endedBy: HistoryEnd, endDays: number): HistoryTrack => ({ samples: taker.samples, endedBy, endDays });
  const drags = model.forces.some(({ id }) => id === 'drag');
  const height = (values: Float64Array) => perigeeHeightKm(body, values) - setting.floorKm;
  const room = (values: Float64Array) => setting.ceilingKm - apogeeKm(values);
  let place: Place = { days: 0, values: equinoctialFromElements(mean, sense), rates: new Float64Array(6) };
  if (height(place.values) <= 0) return ended('decay', 0);
  if (room(place.values) <= 0) return ended('escape', 0);
  rates(place.rates, place.values, epochJd);
  for (let count = 1; ; count += 1) {
    const longestS = setting.longestStepDays * secondsPerDay;
    const limit = stepLimit({ body, sense, values: place.values, rates: place.rates, drags, longestS });
    const leftS = (spanDays - place.days) * secondsPerDay;
    // Even steps to the end, rather than a short last one.
    const lengthS = leftS / Math.ceil(leftS / limit.lengthS);
    const start = { epochJd, days: place.days, values: place.values, startRates: place.rates, turn: limit.turn };
    const step = lengthS < Math.min(shortestStepS, leftS) ? null : stepOrShorter(rates, start, lengthS);
    if (!step) return ended('escape', place.days);
    const values = valuesWithin(step, step.lengthS);
    const last = step.lengthS === leftS;
    const exit = height(values) <= 0 ? height : room(values) <= 0 ? room : null;
    if (exit) {
      const reachedS = crossingS(step, exit);
      taker.take(step, reachedS, true);
      return ended(exit === height ? 'decay' : 'escape', place.days + reachedS / secondsPerDay);
    }
    taker.take(step, step.lengthS, last);
    if (last) return ended('span', spanDays);
    place = { days: place.days + step.lengthS / secondsPerDay, values, rates: step.endRates };
    if (count % progressSteps === 0) setting.onProgress(place.days / spanDays);
  }
}

/** The step, or a shorter one where a stage of it is no orbit; null where none is short enough. */
function stepOrShorter(rates: AveragedRates, start: StepStart, longestS: number): AveragedStep | null {
  for (let lengthS = longestS; lengthS >= shortestStepS; lengthS *= 0.5) {
    try {
      return averagedStep(rates, start, lengthS);
    } catch (problem) {
      if (!(problem instanceof NotAnOrbitError)) throw problem;
    }
  }
  return null;
}

/** Moment within the step (s) at which a falling quantity is zero, to 0.1 s. */
function crossingS(step: AveragedStep, quantity: (values: Float64Array) => number): number {
  let low = 0;
  let high = step.lengthS;
  while (high - low > 0.1) {
    const middle = 0.5 * (low + high);
    if (quantity(valuesWithin(step, middle)) > 0) low = middle;
    else high = middle;
  }
  return high;
}
