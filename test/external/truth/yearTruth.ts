/** One orbit carried for a year by odex, with averages of its osculating elements at stations along the way. */
import { gravitySets, stateFromMean } from '../../../core/index';
import { equationsOfMotion } from './fullField';
import { skyTable } from './skyTable';
import { carried, type TruthSetting, type WindowedElements, windowed } from './windowedElements';
import { meanOf, type YearOrbit } from './yearOrbits';

const earth = gravitySets.EGM2008;

/** Middle of each window after the first, days; the first begins at the epoch. */
export const stationDays = [10, 91, 183, 274, 366];
export const truthDegree = 14;
export const truthTolerance = 1e-12;
const secondsPerDay = 86_400;

export interface YearTruth {
  readonly orbit: YearOrbit;
  /** Where odex started: km, km/s, mean equator and equinox of the epoch. */
  readonly start: readonly number[];
  readonly windowDays: number;
  readonly stations: readonly WindowedElements[];
}

/** Osculating start of the orbit's mean elements; the truth takes these six numbers as they are. */
export function startOf(orbit: YearOrbit): readonly number[] {
  const { positionKm, velocityKmPerS } = stateFromMean(earth, meanOf(orbit));
  return [...positionKm, ...velocityKmPerS];
}

/** Twelve revolutions, of a long one eight. */
export function windowDaysOf({ semiMajorAxisKm }: YearOrbit): number {
  const period = 2 * Math.PI * Math.sqrt(semiMajorAxisKm ** 3 / earth.muKm3PerS2);
  return ((period > 15_000 ? 8 : 12) * period) / secondsPerDay;
}

export function yearTruth(orbit: YearOrbit, start: readonly number[], lastDay: number): YearTruth {
  const windowDays = windowDaysOf(orbit);
  const setting: TruthSetting = {
    motion: equationsOfMotion({
      zonals: earth,
      degree: truthDegree,
      sky: skyTable(new Date(orbit.epoch), lastDay + windowDays),
      drag: null,
    }),
    muKm3PerS2: earth.muKm3PerS2,
    relativeTolerance: truthTolerance,
  };
  const first = windowed(setting, start, 0, windowDays * secondsPerDay);
  const stations = [first.elements];
  let { state } = first;
  let timeS = windowDays * secondsPerDay;
  for (const days of stationDays.filter((day) => day <= lastDay)) {
    const fromS = (days - 0.5 * windowDays) * secondsPerDay;
    const toS = (days + 0.5 * windowDays) * secondsPerDay;
    const window = windowed(setting, carried(setting, state, timeS, fromS), fromS, toS);
    stations.push(window.elements);
    state = window.state;
    timeS = toS;
  }
  return { orbit, start, windowDays, stations };
}
