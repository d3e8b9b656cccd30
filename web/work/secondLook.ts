/** The second look as the worker takes it: the orbit integrated, and the averaged one beside it at the same moments. */
import {
  type IntegratedOrbit,
  integrateOrbit,
  type LeftOutForce,
  localTimeHistory,
  meanOfSteady,
  missionHistory,
  stateFromMean,
} from '../../core/index';
import { columnsOf, type ElementColumns } from './columns';
import { averageOf, type MissionRequest } from './missionCalls';

export type SecondLookRequest = Omit<MissionRequest, 'stretches' | 'boxMinutes'>;

export interface SecondLook {
  readonly integrated: ElementColumns;
  readonly averaged: ElementColumns;
  /** Hours at the integrated samples; null where the body has no clock. */
  readonly localTimeH: Float64Array<ArrayBuffer> | null;
  readonly endedBy: IntegratedOrbit['endedBy'];
  readonly endDays: number;
  readonly leftOut: readonly LeftOutForce[];
  readonly tookMs: number;
}

const samplesAcross = 30;

export function secondLook(request: SecondLookRequest, onProgress: (share: number) => void): SecondLook {
  const startMs = performance.now();
  const { body, mean, epochJd, spanDays, forces, node } = request;
  const sampleDays = spanDays / samplesAcross;
  // An integration that is to follow a design's averages starts from the state that keeps them.
  const state = stateFromMean(
    body,
    request.isAverage && forces.zonalDegree >= 2 ? meanOfSteady(body, mean, forces.zonalDegree) : mean,
  );
  const orbit = integrateOrbit({ body, state, epochJd, spanDays, forces, sampleDays }, { onProgress });
  const history = missionHistory({ body, mean: averageOf(request), epochJd, spanDays, forces, sampleDays });
  const local = localTimeHistory({ body, epochJd, node, sun: 'mean', samples: orbit.samples });
  return {
    integrated: columnsOf(orbit.samples),
    averaged: columnsOf(history.samples),
    localTimeH: local.ok ? Float64Array.from(local.points, ({ hours }) => hours) : null,
    endedBy: orbit.endedBy,
    endDays: orbit.endDays,
    leftOut: orbit.leftOut,
    tookMs: performance.now() - startMs,
  };
}
