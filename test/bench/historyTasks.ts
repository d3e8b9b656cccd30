/** The averaged level over a mission, and its ledger. */
import { bodies, effectsLedger, type HistoryRequest, missionHistory } from '../../core/index';
import type { Task } from './measure';

const year: HistoryRequest = {
  body: bodies.earth,
  mean: {
    semiMajorAxisKm: 7000,
    eccentricity: 0.001,
    inclinationRad: 1.7079,
    nodeRad: 1,
    perigeeRad: 1.5,
    meanAnomalyRad: 0,
  },
  epochJd: 2_461_193,
  spanDays: 366,
  sampleDays: 2,
  forces: { zonalDegree: 14, sun: true, moon: true },
};

const mission: HistoryRequest = { ...year, spanDays: 5479, sampleDays: 5 };

function nodeAtEnd(request: HistoryRequest): number {
  return missionHistory(request).samples.at(-1)?.mean.nodeRad ?? Number.NaN;
}

export function historyTasks(): readonly Task[] {
  return [
    { name: 'missionHistory, a year', calls: 1, run: () => nodeAtEnd(year) },
    { name: 'missionHistory, 15 years', calls: 1, run: () => nodeAtEnd(mission) },
    { name: 'history and ledger, 15 years', calls: 1, run: () => effectsLedger(mission).sum.nodeRad },
  ];
}

/** At most so many microseconds; zonals to 14, Sun and Moon. */
export const historyLimits = [
  { name: 'missionHistory, a year', microseconds: 50_000 },
  { name: 'missionHistory, 15 years', microseconds: 800_000 },
] as const;

/** `name` may take at most `times` as long as `yardstick`. */
export const historyBounds = [
  { name: 'history and ledger, 15 years', yardstick: 'missionHistory, 15 years', times: 5 },
] as const;
