/** β at its extremes and zero, and eclipse seasons beginning and ending. */
import { sunSeenFrom } from '../bodies/sunSeenFrom';
import { crossingsOnGrid } from '../numerics/crossings';
import type { EventSearch, EventsOrReason, FoundEvent } from './event';
import { betaUnder } from './light';
import type { LightHistory } from './lightHistory';

/** Half the span of the difference that stands for β's slope, days. */
const slopeDays = 0.05;
/** Neighbouring extremes that differ by less (rad, 0.05°) are ripples of the Moon's pull, not seasons of β. */
const rippleRad = 9e-4;

export function lightEvents(search: EventSearch, light: LightHistory): EventsOrReason {
  const { body, epochJd, curve, grid } = search;
  const model = sunSeenFrom(body, epochJd);
  if (!model.ok) return model;
  if (!light.ok) return light;
  const betaAt = (days: number) => betaUnder(curve(days), model.sunAt(epochJd + days));
  const zeros = crossingsOnGrid(betaAt, grid).map(({ x, rising }): FoundEvent => {
    const words = rising
      ? 'The Sun passes to the north side of the orbit plane'
      : 'The Sun passes to the south side of the orbit plane';
    return { kind: 'betaZero', days: x, words, value: { quantity: 'betaRad', amount: 0 } };
  });
  const slope = (days: number) => betaAt(days + slopeDays) - betaAt(days - slopeDays);
  const extremes = crossingsOnGrid(slope, grid).map(({ x, rising }): FoundEvent => {
    const words = rising ? 'β is at its least' : 'β is at its greatest';
    return {
      kind: rising ? 'betaLeast' : 'betaGreatest',
      days: x,
      words,
      value: { quantity: 'betaRad', amount: betaAt(x) },
    };
  });
  return { ok: true, events: [...zeros, ...withoutRipples(extremes), ...seasonEvents(search, light)] };
}

/** Leaves out pairs of neighbours that hardly differ. */
function withoutRipples(extremes: readonly FoundEvent[]): readonly FoundEvent[] {
  const kept: FoundEvent[] = [];
  for (const event of extremes) {
    const before = kept.at(-1);
    if (before && Math.abs((event.value?.amount ?? 0) - (before.value?.amount ?? 0)) < rippleRad) kept.pop();
    else kept.push(event);
  }
  return kept;
}

function seasonEvents({ grid }: EventSearch, light: LightHistory & { readonly ok: true }): readonly FoundEvent[] {
  const from = grid[0] ?? 0;
  const to = grid[grid.length - 1] ?? 0;
  const value = null;
  return light.summary.eclipseSeasons.flatMap(({ fromDays, toDays }): readonly FoundEvent[] => [
    ...(fromDays > from ? [{ kind: 'eclipsesBegin', days: fromDays, words: 'Eclipses begin', value } as const] : []),
    ...(toDays < to ? [{ kind: 'eclipsesEnd', days: toDays, words: 'Eclipses end', value } as const] : []),
  ]);
}
