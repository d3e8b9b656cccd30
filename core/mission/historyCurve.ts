/**
 * Mean elements between the samples of a history: cubics through the four samples around.
 *
 * The eccentricity vector is read in axes that turn as perigee does between the two samples beside, so that a perigee going round
 * at an even pace is followed exactly and e = 0 is no obstacle. Outside the samples the last cubic goes on; stay near.
 */
import type { MeanElements } from '../orbit/elements';

/** One sample of a history; node and perigee unwound. */
export interface DatedMean {
  readonly days: number;
  readonly mean: MeanElements;
}

/** Mean elements at so many days; the mean anomaly is left at 0. */
export type HistoryCurve = (days: number) => MeanElements;

/** @throws Error for no samples, or samples that do not follow each other in time. */
export function historyCurve(samples: readonly DatedMean[]): HistoryCurve {
  const days = samples.map((sample) => sample.days);
  if (!days.every((day, index) => day > (days[index - 1] ?? -Infinity))) {
    throw new Error('the samples of a history must follow each other in time');
  }
  if (samples.length === 0) throw new Error('a history needs at least one sample');
  let left = 0;
  return (day) => {
    left = sampleBefore(days, day, left);
    return between(samples, left, day);
  };
}

/** Index of the last sample not after `day`, never the last of all; looked for from where the last call ended. */
function sampleBefore(days: readonly number[], day: number, from: number): number {
  let index = from;
  while (index > 0 && (days[index] as number) > day) index -= 1;
  while (index + 2 < days.length && (days[index + 1] as number) <= day) index += 1;
  return index;
}

function between(samples: readonly DatedMean[], left: number, day: number): MeanElements {
  const count = Math.min(4, samples.length);
  const first = Math.max(0, Math.min(left - 1, samples.length - count));
  const near = samples.slice(first, first + count);
  const weights = lagrangeWeights(near, day);
  const sum = (value: (sample: DatedMean) => number) =>
    near.reduce((total, sample, index) => total + (weights[index] as number) * value(sample), 0);
  const here = samples[left] as DatedMean;
  const next = samples[left + 1] ?? here;
  const rate = next === here ? 0 : (next.mean.perigeeRad - here.mean.perigeeRad) / (next.days - here.days);
  const expected = here.mean.perigeeRad + rate * (day - here.days);
  const ahead = ({ days, mean }: DatedMean) => mean.perigeeRad - expected - rate * (days - day);
  const along = sum((sample) => sample.mean.eccentricity * Math.cos(ahead(sample)));
  const across = sum((sample) => sample.mean.eccentricity * Math.sin(ahead(sample)));
  return {
    semiMajorAxisKm: sum(({ mean }) => mean.semiMajorAxisKm),
    eccentricity: Math.hypot(along, across),
    inclinationRad: sum(({ mean }) => mean.inclinationRad),
    nodeRad: sum(({ mean }) => mean.nodeRad),
    perigeeRad: expected + Math.atan2(across, along),
    meanAnomalyRad: 0,
  };
}

function lagrangeWeights(near: readonly DatedMean[], day: number): readonly number[] {
  return near.map((own) => {
    let weight = 1;
    for (const other of near) if (other !== own) weight *= (day - other.days) / (own.days - other.days);
    return weight;
  });
}
