/** Local time against its box, and the node back where it started from the Sun. */
import { crossingsOnGrid } from '../numerics/crossings';
import type { EventSearch, EventsOrReason, FoundEvent, LocalTimeBox } from './event';
import { localTimeModel } from './localTimeHistory';

/** Later (positive) or earlier than a time of day, h in [−12, 12]. */
function hoursFrom(targetH: number, hours: number): number {
  const apart = hours - targetH;
  return apart - 24 * Math.round(apart / 24);
}

/** Where no box is given only the return to the starting local time is told. */
export function localTimeEvents(search: EventSearch, box: LocalTimeBox | undefined): EventsOrReason {
  const { body, epochJd, curve, grid, first } = search;
  const node = box?.node ?? 'ascending';
  const model = localTimeModel({ body, epochJd, node, sun: 'mean' }, first.mean.nodeRad);
  if (!model.ok) return model;
  const hoursAt = (days: number) => model.hoursAt(days, curve(days).nodeRad);
  const startH = hoursAt(first.days);
  const back = crossingsOnGrid((days) => Math.sin((Math.PI * (hoursAt(days) - startH)) / 24), grid);
  const events = back.map(({ x }): FoundEvent => {
    const words = 'The node is back at its starting local time';
    return { kind: 'localTimeBack', days: x, words, value: localTime(startH) };
  });
  if (!box) return { ok: true, events };
  return { ok: true, events: [...events, ...boxEvents(search, { ...box, targetH: box.targetH ?? startH }, hoursAt)] };
}

function localTime(hours: number): FoundEvent['value'] {
  return { quantity: 'localTimeH', amount: hours - 24 * Math.floor(hours / 24) };
}

function boxEvents(
  { grid, first }: EventSearch,
  { allowedMinutes, targetH }: LocalTimeBox & { readonly targetH: number },
  hoursAt: (days: number) => number,
): readonly FoundEvent[] {
  const outsideH = (days: number) => Math.abs(hoursFrom(targetH, hoursAt(days))) - allowedMinutes / 60;
  const events = crossingsOnGrid(outsideH, grid).map(({ x, rising }): FoundEvent => {
    const hours = hoursAt(x);
    const side = hoursFrom(targetH, hours) > 0 ? 'late' : 'early';
    const words = rising
      ? `Local time leaves the box on its ${side} side`
      : `Local time comes back into the box on its ${side} side`;
    return { kind: rising ? 'boxLeft' : 'boxEntered', days: x, words, value: localTime(hours) };
  });
  if (outsideH(first.days) <= 1e-9) return events;
  const words = 'Local time starts outside the box';
  return [{ kind: 'outsideBox', days: first.days, words, value: localTime(hoursAt(first.days)) }, ...events];
}
