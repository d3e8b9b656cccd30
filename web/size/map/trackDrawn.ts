/** The track to be drawn: for how long, from where, and how nearly it ends where it began. */
import {
  type Cycle,
  degPerRad,
  formatNumber,
  type GroundLine,
  type GroundTrackProblem,
  groundTrack,
  type ResolvedOrbit,
  wrapPi,
} from '../../../core/index';

export type DrawnSpan = 'cycle' | 'day';

export interface TrackDrawn {
  readonly ok: true;
  readonly lines: readonly GroundLine[];
  readonly revolutions: number;
  /** True where all of the cycle is drawn, so that start and end can be compared. */
  readonly isWhole: boolean;
  readonly start: MapPoint;
  readonly end: MapPoint;
  /** From start to end in longitude, as a length along the equator, east positive. */
  readonly gapKm: number;
  /** East longitude of the first ascending crossing. */
  readonly firstNodeRad: number;
  /** False: without an epoch the ground below is not known, and the first node is put on longitude 0. */
  readonly isPlaced: boolean;
}

export interface MapPoint {
  readonly longitudeRad: number;
  readonly latitudeRad: number;
}

/** More revolutions make the map black. */
const mostRevolutions = 500;

export interface DrawnRequest {
  readonly orbit: ResolvedOrbit;
  readonly cycle: Cycle | null;
  readonly span: DrawnSpan;
  readonly revolutionsADay: number;
}

export function trackDrawn({ orbit, cycle, span, revolutionsADay }: DrawnRequest): TrackDrawn | GroundTrackProblem {
  const { body, mean, epochJd } = orbit;
  const isPlaced = body.id === 'earth' && epochJd !== null;
  const wholeCycle = span === 'cycle' && cycle !== null;
  const wanted = wholeCycle ? cycle.revolutions : revolutionsADay;
  const revolutions = Math.min(wanted, mostRevolutions);
  const track = groundTrack({
    body,
    theory: 'second',
    mean,
    span: { kind: 'revolutions', count: revolutions },
    origin: isPlaced ? { kind: 'greenwich', epochJd } : { kind: 'firstNode', longitudeRad: 0 },
    samplesPerRevolution: revolutions > 200 ? 40 : revolutions > 50 ? 72 : 120,
  });
  if (!track.ok) return track;
  const [start, end] = endsOf(track.lines);
  const gapRad = wrapPi(end.longitudeRad - start.longitudeRad);
  return {
    ok: true,
    lines: track.lines,
    revolutions,
    isWhole: wholeCycle && revolutions === wanted,
    start,
    end,
    gapKm: gapRad * body.equatorialRadiusKm,
    firstNodeRad: firstNodeOf(track.lines),
    isPlaced,
  };
}

function endsOf(lines: readonly GroundLine[]): readonly [MapPoint, MapPoint] {
  const at = (line: GroundLine | undefined, place: number) => ({
    longitudeRad: line?.longitudeRad.at(place) ?? Number.NaN,
    latitudeRad: line?.latitudeRad.at(place) ?? Number.NaN,
  });
  return [at(lines[0], 0), at(lines.at(-1), -1)];
}

/** Where a leg meets the equator; NaN where it does not. */
export function crossingOf({ latitudeRad, longitudeRad }: GroundLine): number {
  for (let index = 1; index < latitudeRad.length; index += 1) {
    const [before = 0, after = 0] = [latitudeRad[index - 1], latitudeRad[index]];
    if (before === after || before * after > 0) continue;
    const [from = 0, to = 0] = [longitudeRad[index - 1], longitudeRad[index]];
    return from + (before / (before - after)) * (to - from);
  }
  return Number.NaN;
}

function firstNodeOf(lines: readonly GroundLine[]): number {
  for (const line of lines) {
    if (!line.ascending || line.pass < 0) continue;
    const longitudeRad = crossingOf(line);
    if (!Number.isNaN(longitudeRad)) return longitudeRad;
  }
  return 0;
}

/** Such as 12.3° W. */
export function longitudeText(longitudeRad: number, digits: number): string {
  const degrees = wrapPi(longitudeRad) * degPerRad;
  const text = formatNumber(Math.abs(degrees), { digits });
  if (!/[1-9]/.test(text) || text === '180') return `${text}°`;
  return `${text}° ${degrees < 0 ? 'W' : 'E'}`;
}
