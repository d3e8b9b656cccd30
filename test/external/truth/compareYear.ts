/** Averaged histories and closed forms beside the integrated year: what each misses by. */
import {
  gravitySets,
  type HistoryRequest,
  julianDateFromIso,
  type MeanElements,
  meanFromState,
  missionHistory,
  secularRates,
  stateFromMean,
  steadyMean,
  type Theory,
} from '../../../core/index';
import { osculating, type WindowedElements } from './windowedElements';
import type { YearTruth } from './yearTruth';

const earth = gravitySets.EGM2008;
const samples = 192;

/** Truth less model: km, rad. */
export interface Miss {
  readonly semiMajorAxisKm: number;
  readonly eCosine: number;
  readonly eSine: number;
  readonly inclinationRad: number;
  readonly nodeRad: number;
}

const wrapped = (rad: number) => Math.atan2(Math.sin(rad), Math.cos(rad));

export function epochOf({ orbit }: YearTruth): number {
  const read = julianDateFromIso(orbit.epoch);
  if (!read.ok) throw new Error(read.message);
  return read.jd;
}

/** Mean elements of the truth's very first state, by core's conversion alone. */
export function meanOfStart({ start: [x = 0, y = 0, z = 0, vx = 0, vy = 0, vz = 0] }: YearTruth): MeanElements {
  return meanFromState(earth, { positionKm: [x, y, z], velocityKmPerS: [vx, vy, vz] });
}

/** Averages of osculating elements that belong to mean ones: the truth knows no mean elements, only such averages. */
export function missOf(mean: MeanElements, truth: WindowedElements): Miss {
  const sum = { semiMajorAxisKm: 0, eCosine: 0, eSine: 0, inclinationRad: 0, turn: 0 };
  for (let k = 0; k < samples; k += 1) {
    const meanAnomalyRad = (2 * Math.PI * k) / samples;
    const { positionKm, velocityKmPerS } = stateFromMean(earth, { ...mean, meanAnomalyRad });
    const now = osculating(earth.muKm3PerS2, [...positionKm, ...velocityKmPerS]);
    sum.semiMajorAxisKm += now.semiMajorAxisKm / samples;
    sum.eCosine += now.eCosine / samples;
    sum.eSine += now.eSine / samples;
    sum.inclinationRad += now.inclinationRad / samples;
    sum.turn += wrapped(now.nodeRad - mean.nodeRad) / samples;
  }
  return {
    semiMajorAxisKm: truth.semiMajorAxisKm - sum.semiMajorAxisKm,
    eCosine: truth.eCosine - sum.eCosine,
    eSine: truth.eSine - sum.eSine,
    inclinationRad: truth.inclinationRad - sum.inclinationRad,
    nodeRad: wrapped(truth.nodeRad - mean.nodeRad - sum.turn),
  };
}

/** Where a history from these mean elements is after so many days. */
export function meanAfter(truth: YearTruth, mean: MeanElements, days: number): MeanElements {
  const request: HistoryRequest = {
    body: earth,
    mean,
    epochJd: epochOf(truth),
    spanDays: days,
    sampleDays: days,
    forces: { zonalDegree: 14, sun: true, moon: true },
  };
  const last = missionHistory(request).samples.at(-1);
  if (!last) throw new Error('a history has samples');
  return last.mean;
}

/** Mean elements at the epoch from which a history meets the averages of the first window. */
export function meanOfFirstWindow(truth: YearTruth): MeanElements {
  const [first] = truth.stations;
  if (!first) throw new Error('the truth begins with a window');
  let mean = meanOfStart(truth);
  for (let round = 0; round < 2; round += 1) {
    const miss = missOf(meanAfter(truth, mean, first.days), first);
    const eCosine = mean.eccentricity * Math.cos(mean.perigeeRad) + miss.eCosine;
    const eSine = mean.eccentricity * Math.sin(mean.perigeeRad) + miss.eSine;
    mean = {
      ...mean,
      semiMajorAxisKm: mean.semiMajorAxisKm + miss.semiMajorAxisKm,
      eccentricity: Math.hypot(eCosine, eSine),
      perigeeRad: Math.atan2(eSine, eCosine),
      inclinationRad: mean.inclinationRad + miss.inclinationRad,
      nodeRad: mean.nodeRad + miss.nodeRad,
    };
  }
  return mean;
}

/** Mean elements of the first state, with the a that the orbit keeps. */
export function steadyOfStart(truth: YearTruth): MeanElements {
  return steadyMean(earth, meanOfStart(truth), 14);
}

/** The closed form's rates of the start, held for so many days. */
export function closedFormAfter(mean: MeanElements, theory: Theory, days: number): MeanElements {
  const { nodeRadPerS, perigeeRadPerS } = secularRates(earth, mean, theory);
  const seconds = days * 86_400;
  return {
    ...mean,
    nodeRad: mean.nodeRad + nodeRadPerS * seconds,
    perigeeRad: mean.perigeeRad + perigeeRadPerS * seconds,
  };
}
