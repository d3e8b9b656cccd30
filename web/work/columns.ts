/** Mean elements over time as columns of numbers: they cross from the worker without a copy and are drawn as they are. */
import type { MeanElements } from '../../core/index';

export interface ElementColumns {
  readonly days: Float64Array<ArrayBuffer>;
  readonly semiMajorAxisKm: Float64Array<ArrayBuffer>;
  readonly eccentricity: Float64Array<ArrayBuffer>;
  readonly inclinationRad: Float64Array<ArrayBuffer>;
  /** Unwound, frame of the epoch. */
  readonly nodeRad: Float64Array<ArrayBuffer>;
  /** Unwound. */
  readonly perigeeRad: Float64Array<ArrayBuffer>;
}

export interface DatedElements {
  readonly days: number;
  readonly mean: MeanElements;
}

export function columnsOf(samples: readonly DatedElements[]): ElementColumns {
  const column = (value: (sample: DatedElements) => number) => Float64Array.from(samples, value);
  return {
    days: column(({ days }) => days),
    semiMajorAxisKm: column(({ mean }) => mean.semiMajorAxisKm),
    eccentricity: column(({ mean }) => mean.eccentricity),
    inclinationRad: column(({ mean }) => mean.inclinationRad),
    nodeRad: column(({ mean }) => mean.nodeRad),
    perigeeRad: column(({ mean }) => mean.perigeeRad),
  };
}
