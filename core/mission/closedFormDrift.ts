/**
 * Node, perigee and local time drifting at the closed form's rates of now, held constant.
 *
 * This draws what a rate means; it is no forecast. Sun, Moon, drag and the higher zonals change
 * the rates over a mission, and the closed form knows none of them.
 */
import type { Body } from '../bodies/body';
import { secondsPerDay } from '../numerics/angles';
import type { MeanElements, Theory } from '../orbit/elements';
import { localTimeDriftSPerS } from '../orbit/localTime';
import { secularRates } from '../orbit/secularRates';

/** Changes since the start, one entry a sample. */
export interface DriftLines {
  readonly nodeRad: Float64Array;
  readonly perigeeRad: Float64Array;
  /** Seconds of mean local time; null where the body's year is unknown. */
  readonly localTimeS: Float64Array | null;
}

export interface ClosedFormDrift {
  readonly days: Float64Array;
  readonly first: DriftLines;
  readonly second: DriftLines;
}

/** Drift of mean elements (km, rad) over `spanDays`, at `samples` evenly spaced moments, both ends included. */
export function closedFormDrift({
  body,
  mean,
  spanDays,
  samples,
}: {
  readonly body: Body;
  readonly mean: MeanElements;
  readonly spanDays: number;
  readonly samples: number;
}): ClosedFormDrift {
  if (!(spanDays > 0 && samples >= 2)) {
    throw new Error(`drift needs a span above 0 and at least 2 samples, got ${spanDays} d and ${samples}`);
  }
  const days = Float64Array.from({ length: samples }, (_, k) => (spanDays * k) / (samples - 1));
  const lines = (theory: Theory): DriftLines => {
    const rates = secularRates(body, mean, theory);
    const line = (perS: number) => days.map((day) => perS * secondsPerDay * day);
    const localTime = localTimeDriftSPerS(rates.nodeRadPerS, body);
    return {
      nodeRad: line(rates.nodeRadPerS),
      perigeeRad: line(rates.perigeeRadPerS),
      localTimeS: localTime === null ? null : line(localTime),
    };
  };
  return { days, first: lines('first'), second: lines('second') };
}
