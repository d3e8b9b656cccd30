/** All that a computed mission shows, made once for a result, a second look and a unit of lengths. */
import { useMemo } from 'preact/hooks';
import { apsisName, closedFormDrift, type HeadlineSpan, missionHeadline } from '../../../core/index';
import { useApp } from '../../state/appContext';
import type { Mission, MissionResult } from '../../state/mission';
import { outcomeOf } from '../../state/missionOutcome';
import type { TakenLook } from '../../state/secondLook';
import { momentText, type TimeSpan } from '../timeAxis';
import { type MissionPlot, missionPlots } from './missionPlots';
import { type Quantity, quantitiesOf } from './quantities';

export interface MissionView {
  readonly result: MissionResult;
  readonly time: TimeSpan;
  readonly headline: readonly HeadlineSpan[];
  readonly plots: readonly MissionPlot[];
  readonly quantities: readonly Quantity[];
  readonly last: number;
  /** The moment of a sample in words. */
  readonly moment: (sample: number) => string;
}

/** Null while there is no result, or one of an orbit that was over as it began. */
export function useMissionView(mission: Mission | null): MissionView | null {
  const { preferences } = useApp();
  const { lengthUnit } = preferences.values.value;
  const result = mission?.result.value ?? null;
  const look = mission && !mission.secondLook.stale.value ? mission.secondLook.taken.value : null;
  return useMemo(() => result && viewOf(result, look, lengthUnit), [result, look, lengthUnit]);
}

function viewOf(result: MissionResult, look: TakenLook | null, lengthUnit: 'km' | 'NM'): MissionView | null {
  const { request, history, sky } = result;
  const { days } = history.columns;
  const spanDays = days.at(-1) ?? 0;
  if (days.length < 2) return null;
  const time = { epochJd: request.epochJd, spanDays };
  const closed = closedFormDrift({ body: request.body, mean: request.mean, spanDays, samples: days.length });
  const lines = { result, closed, time, look, lengthUnit, apsis: apsisName(request.body) };
  return {
    result,
    time,
    headline: missionHeadline(outcomeOf(request, history, sky)),
    plots: missionPlots(lines),
    quantities: quantitiesOf(lines),
    last: days.length - 1,
    moment: (sample) => momentText(time, days[sample] ?? 0),
  };
}
