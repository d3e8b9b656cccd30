/** A computed mission as its sentence needs it. Pure. */
import type { MissionOutcome } from '../../core/index';
import type { HistoryPart, MissionRequest, SkyPart } from '../work/missionCalls';

export function outcomeOf(request: MissionRequest, history: HistoryPart, sky: SkyPart | null): MissionOutcome {
  const { columns, localTimeH } = history;
  const first = (values: Float64Array) => values[0] ?? 0;
  const last = (values: Float64Array) => values.at(-1) ?? 0;
  return {
    localTime: localTimeH && { startH: first(localTimeH), endH: last(localTimeH), node: request.node },
    nodeChangeRad: last(columns.nodeRad) - first(columns.nodeRad),
    startInclinationRad: first(columns.inclinationRad),
    endInclinationRad: last(columns.inclinationRad),
    spanDays: history.endDays,
    boxMinutes: request.boxMinutes,
    events: sky?.events.events ?? null,
    endMessage: history.endMessage,
  };
}
