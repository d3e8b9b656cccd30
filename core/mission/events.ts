/**
 * What happens over a mission, with dates: read from a history of mean elements, of whichever method made it.
 *
 * Each kind is a function of time whose sign turns at the event, searched at a pace of a day and refined between samples
 * (`historyCurve`). The date is as good as the history itself; two events of one kind within a day may be missed.
 */
import type { EventSearch, EventsRequest, FoundEvent, MissionEvents } from './event';
import { type DatedMean, historyCurve } from './historyCurve';
import { lightEvents } from './lightEvents';
import { lightHistory, pacedDays } from './lightHistory';
import { localTimeEvents } from './localTimeEvents';
import { altitudeEvents, apsisEvents } from './orbitEvents';

/** The events of a history. @throws Error for samples that are none or not in the order of time. */
export function missionEvents(request: EventsRequest): MissionEvents {
  const { body, epochJd, samples } = request;
  const curve = historyCurve(samples);
  const first = samples[0] as DatedMean;
  const search: EventSearch = { body, epochJd, curve, grid: pacedDays(samples, paceOf(samples)), first };
  const light = lightEvents(search, request.light ?? lightHistory({ body, epochJd, samples }));
  const localTime = localTimeEvents(search, request.box);
  const found = [
    ...(localTime.ok ? localTime.events : []),
    ...apsisEvents(search),
    ...(light.ok ? light.events : []),
    ...altitudeEvents(search, request.altitude),
    ...endEvents(request),
  ];
  const leftOut: { what: 'localTime' | 'light'; reason: string }[] = [];
  if (!localTime.ok) leftOut.push({ what: 'localTime', reason: localTime.message });
  if (!light.ok) leftOut.push({ what: 'light', reason: light.message });
  const events = found.sort((a, b) => a.days - b.days).map((event) => ({ ...event, jd: epochJd + event.days }));
  return { events, leftOut };
}

/** A day, or less over a short history. */
function paceOf(samples: readonly DatedMean[]): number {
  const span = (samples.at(-1)?.days ?? 0) - (samples[0]?.days ?? 0);
  return Math.min(1, Math.max(span / 32, 1e-6));
}

function endEvents({ samples, endedBy }: EventsRequest): readonly FoundEvent[] {
  const days = samples.at(-1)?.days ?? 0;
  if (endedBy === 'decay') return [{ kind: 'decay', days, words: 'The orbit decays', value: null }];
  if (endedBy === 'escape') return [{ kind: 'escape', days, words: 'The orbit is lost: it opens', value: null }];
  return [];
}
