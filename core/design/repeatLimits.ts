/** How far a search for repeat tracks can reach: the surface, the last Sun-synchronous orbit, and sheer number. */
import { coprimePairs } from '../numerics/integers';
import { formatNumber, formatSignificant } from '../numerics/numberWords';
import type { Band, BandCell } from './bandCells';
import { kilometres, mostTracks, type RepeatProblem, type RepeatRequest, repeatProblem } from './repeatProblem';
import { sunSynchronousAt } from './trackCurve';

/** The band of semi-major axes, from where perigee clears the surface; upside down where it never does. */
export function clearBand({ body, eccentricity, minAltitudeKm, maxAltitudeKm }: RepeatRequest): Band {
  const radiusKm = body.equatorialRadiusKm;
  return {
    lowKm: Math.max(radiusKm + minAltitudeKm, radiusKm / (1 - eccentricity)),
    highKm: radiusKm + maxAltitudeKm,
  };
}

export function belowSurface({ body, eccentricity }: RepeatRequest, { lowKm }: Band): RepeatProblem {
  const from = kilometres(lowKm - body.equatorialRadiusKm);
  const text = `With e ${formatSignificant(eccentricity)} perigee clears the surface of ${body.name} only from a mean altitude of ${from} up: the band lies below.`;
  return repeatProblem('belowSurface', 'maxAltitudeKm', text);
}

/** Fewest and most revolutions a nodal day in a cell. */
export function revolutionsADay({ low, high }: BandCell): readonly [number, number] {
  const [one, other] = [1 / Math.abs(low.daysPerRevolution), 1 / Math.abs(high.daysPerRevolution)];
  return one < other ? [one, other] : [other, one];
}

/** What is wrong with the number of tracks to expect, about the revolutions a day spanned times φ(1) + … + φ(D). */
export function problemOfNumber(cells: readonly BandCell[], request: RepeatRequest): RepeatProblem | null {
  const { body, maxDays } = request;
  if (cells.some(({ low, high }) => low.daysPerRevolution * high.daysPerRevolution <= 0)) {
    const text = `In this band the node can keep up with the rotation of ${body.name}, and near that altitude cycles crowd without end: choose a band without it.`;
    return repeatProblem('tooMany', 'maxAltitudeKm', text);
  }
  const spanned = cells.reduce((sum, cell) => {
    const [least, most] = revolutionsADay(cell);
    return sum + most - least;
  }, 0);
  const expected = spanned * coprimePairs(maxDays);
  if (expected <= mostTracks) return null;
  // The number grows about as the square of the days; a little less is on the safe side.
  const days = Math.max(1, Math.floor(0.95 * maxDays * Math.sqrt(mostTracks / expected)));
  const text = `The band has about ${count(expected)} repeat tracks of up to ${maxDays} days, more than the ${count(mostTracks)} that can be listed: choose a narrower band, or at most ${days} days.`;
  return repeatProblem('tooMany', 'maxDays', text);
}

function count(tracks: number): string {
  return formatNumber(Number(tracks.toPrecision(2)), { digits: 0 });
}

const halvings = 60;

/** Why the band has no orbit of the wanted inclination, and where the last one is. */
export function noOrbits(request: RepeatRequest, { lowKm }: Band): RepeatProblem {
  const { body, eccentricity, inclination } = request;
  const radiusKm = body.equatorialRadiusKm;
  if (inclination.kind === 'fixed') {
    return repeatProblem('belowSurface', 'body', `The zonals of ${body.name} are too large for the closed form here.`);
  }
  const cosine = formatNumber(sunSynchronousAt(request, lowKm).cosine, { digits: 3 });
  const here = `At a mean altitude of ${kilometres(lowKm - radiusKm)} cos i would have to be ${cosine}`;
  const lastKm = lastSunSynchronousKm(request, radiusKm / (1 - eccentricity), lowKm);
  const end = lastKm
    ? `Sun-synchronous orbits of e ${formatSignificant(eccentricity)} end at a mean altitude of ${kilometres(lastKm - radiusKm)}.`
    : `No orbit above the surface of ${body.name} is Sun-synchronous at e ${formatSignificant(eccentricity)}.`;
  return repeatProblem('noSunSynchronous', 'inclination', `${here}. ${end}`);
}

function lastSunSynchronousKm(request: RepeatRequest, surfaceKm: number, aboveKm: number): number | null {
  const exists = (axisKm: number) => sunSynchronousAt(request, axisKm).inclinationRad !== null;
  if (!exists(surfaceKm)) return null;
  let [inside, outside] = [surfaceKm, aboveKm];
  for (let step = 0; step < halvings; step += 1) {
    const middle = 0.5 * (inside + outside);
    if (exists(middle)) inside = middle;
    else outside = middle;
  }
  return inside;
}
