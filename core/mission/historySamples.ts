/** Samples of a history, read from its steps: evenly spaced, with node and perigee unwound. */
import { secondsPerDay, wrapPi } from '../numerics/angles';
import type { MeanElements } from '../orbit/elements';
import { type AveragedStep, valuesWithin } from './averagedStep';
import { elementsFromEquinoctial, type Sense } from './equinoctial';

export interface HistorySample {
  /** Since the epoch. */
  readonly days: number;
  /** Node and perigee are unwound: they go on past a whole turn. Frame of the epoch. */
  readonly mean: MeanElements;
}

export interface SampleTaker {
  /** Everything so far. */
  readonly samples: readonly HistorySample[];
  /** Takes the samples that lie within the first `reachedS` of a step; `last` adds one at that moment. */
  readonly take: (step: AveragedStep, reachedS: number, last: boolean) => void;
}

/** Nearer than this to the end, days, a sample is the end: a tenth of a second. */
const sameDays = 1e-6;

/** The turn of an angle nearest to where it should be. */
function unwound(angleRad: number, expectedRad: number): number {
  return expectedRad + wrapPi(angleRad - expectedRad);
}

/** Starts with the elements given, as they are given. */
export function sampleTaker(mean: MeanElements, sampleDays: number, sense: Sense): SampleTaker {
  const samples: HistorySample[] = [{ days: 0, mean }];
  let { nodeRad, perigeeRad } = mean;
  const read = (step: AveragedStep, timeS: number): MeanElements => {
    const found = elementsFromEquinoctial(valuesWithin(step, timeS), sense);
    const { nodeRadPerS, perigeeLongitudeRadPerS } = step.turn;
    const perigeeRate = perigeeLongitudeRadPerS - sense * nodeRadPerS;
    return {
      ...found,
      nodeRad: unwound(found.nodeRad, nodeRad + nodeRadPerS * timeS),
      perigeeRad: unwound(found.perigeeRad, perigeeRad + perigeeRate * timeS),
    };
  };
  const take = (step: AveragedStep, reachedS: number, last: boolean): void => {
    const endDays = step.startDays + reachedS / secondsPerDay;
    for (let days = samples.length * sampleDays; days < endDays - sameDays; days = samples.length * sampleDays) {
      samples.push({ days, mean: read(step, (days - step.startDays) * secondsPerDay) });
    }
    const end = read(step, reachedS);
    if (last) samples.push({ days: endDays, mean: end });
    ({ nodeRad, perigeeRad } = end);
  };
  return { samples, take };
}
