/** Perigee over the northernmost and southernmost point and the equator, and the altitude under its limit. */
import { crossingsOnGrid } from '../numerics/crossings';
import type { MeanElements } from '../orbit/elements';
import type { AltitudeLimit, EventSearch, FoundEvent } from './event';

/** Nearer to the equator than this (rad) an orbit has no north and south. */
const equatorialRad = 1e-4;

/**
 * Read from the eccentricity vector, so that e = 0 is no obstacle. A perigee that swings about its northernmost point, as on a
 * frozen orbit, is told once, not at each swing: it comes there again only after the equator.
 */
export function apsisEvents({ body, curve, grid, first }: EventSearch): readonly FoundEvent[] {
  if (Math.sin(first.mean.inclinationRad) < equatorialRad) return [];
  const apsis = body.id === 'earth' ? 'Perigee' : 'Periapsis';
  const northward = (days: number) => part(curve(days), Math.sin);
  const extremes = crossingsOnGrid((days) => part(curve(days), Math.cos), grid).map(({ x }): FoundEvent => {
    const north = northward(x) > 0;
    const words = `${apsis} is at its ${north ? 'northernmost' : 'southernmost'}`;
    return { kind: north ? 'perigeeNorth' : 'perigeeSouth', days: x, words, value: argument(curve(x)) };
  });
  const equator = crossingsOnGrid(northward, grid).map(({ x, rising }): FoundEvent => {
    const words = `${apsis} passes the equator, going ${rising ? 'north' : 'south'}`;
    return { kind: 'perigeeEquator', days: x, words, value: argument(curve(x)) };
  });
  const all = [...extremes, ...equator].sort((a, b) => a.days - b.days);
  return all.filter(({ kind }, index) => kind === 'perigeeEquator' || all[index - 1]?.kind !== kind);
}

function part({ eccentricity, perigeeRad }: MeanElements, of: (angle: number) => number): number {
  return eccentricity * of(perigeeRad);
}

function argument({ perigeeRad }: MeanElements): FoundEvent['value'] {
  return { quantity: 'perigeeRad', amount: perigeeRad };
}

/** Each time that the altitude falls below; at the start where it lies below already. */
export function altitudeEvents(
  { body, curve, grid, first }: EventSearch,
  limit: AltitudeLimit | undefined,
): readonly FoundEvent[] {
  if (!limit) return [];
  const heightKm = ({ semiMajorAxisKm: a, eccentricity: e }: MeanElements) =>
    (limit.of === 'perigee' ? a * (1 - e) : a) - body.equatorialRadiusKm;
  const above = (days: number) => heightKm(curve(days)) - limit.km;
  const apsis = body.id === 'earth' ? 'Perigee' : 'Periapsis';
  const words = limit.of === 'perigee' ? `${apsis} sinks below its limit` : 'The mean altitude sinks below its limit';
  const event = (days: number): FoundEvent => ({
    kind: 'altitudeBelow',
    days,
    words,
    value: { quantity: 'altitudeKm', amount: limit.km },
  });
  const falls = crossingsOnGrid(above, grid).filter(({ rising }) => !rising);
  return [...(above(first.days) < 0 ? [first.days] : []), ...falls.map(({ x }) => x)].map(event);
}
