/**
 * The ground track of a mean orbit, for drawing: lines of longitude and latitude, cut where they turn north or south and at
 * the antimeridian.
 *
 * Secular rates of the chosen order carry the elements; on request the short-period J2 terms are put back (kilometres).
 * East longitudes in rad, body-fixed; geodetic latitudes in rad on the body's ellipsoid. Counted from Greenwich the Earth turns
 * evenly from the mean sidereal time of the epoch: nutation (0.005°) and UT1 − UTC (0.004°) are left out. Sun, Moon and drag
 * are not known here, so that a track over many days is that of an orbit which is kept.
 */
import type { Body } from '../bodies/body';
import { meanSiderealTimeRad } from '../bodies/siderealTime';
import { twoPi } from '../numerics/angles';
import { formatNumber } from '../numerics/numberWords';
import type { MeanElements, Theory } from '../orbit/elements';
import { type GroundLine, linesWithinMap } from './groundLines';
import { type TrackMotion, trackMotion } from './groundMotion';

export interface GroundTrackRequest {
  readonly body: Body;
  readonly theory: Theory;
  /** At the epoch, km and rad. */
  readonly mean: MeanElements;
  /** How far to draw from the epoch: time, or turns of the argument of latitude. */
  readonly span:
    | { readonly kind: 'seconds'; readonly s: number }
    | { readonly kind: 'revolutions'; readonly count: number };
  /** `firstNode`: longitudes are counted so that the first ascending crossing lies at `longitudeRad`. */
  readonly origin:
    | { readonly kind: 'firstNode'; readonly longitudeRad: number }
    | { readonly kind: 'greenwich'; readonly epochJd: number };
  /** A multiple of 4, so that crossings and turns are among the samples; 120 if left out. */
  readonly samplesPerRevolution?: number;
  readonly shortPeriod?: boolean;
}

export interface GroundTrack {
  readonly ok: true;
  readonly lines: readonly GroundLine[];
  /** Ascending crossings of the equator, the first at pass 0. */
  readonly firstNodeS: number;
}

export interface GroundTrackProblem {
  readonly ok: false;
  readonly reason: 'badInput' | 'missing' | 'tooLong';
  readonly message: string;
}

/** What a map can still show, and a tablet still hold. */
const mostPoints = 1_000_000;

/** The track, or why there is none to draw. Errors as `secularRates` for elements that are no orbit. */
export function groundTrack(request: GroundTrackRequest): GroundTrack | GroundTrackProblem {
  const problem = problemOf(request);
  if (problem) return problem;
  const { body, mean, origin, samplesPerRevolution = 120 } = request;
  const motion = trackMotion(request);
  const startRad = motion.startLatitudeArgumentRad;
  const firstNodeRad = twoPi * Math.ceil(startRad / twoPi);
  const firstNodeS = motion.timeS(firstNodeRad);
  const rotationRadPerS = body.rotationRadPerS ?? Number.NaN;
  const turnedAtEpochRad =
    origin.kind === 'greenwich'
      ? meanSiderealTimeRad(origin.epochJd)
      : mean.nodeRad + motion.rates.nodeRadPerS * firstNodeS - rotationRadPerS * firstNodeS - origin.longitudeRad;
  const endRad = endOf(request, motion);
  if (((endRad - startRad) / twoPi) * samplesPerRevolution > mostPoints) return tooLong(samplesPerRevolution);
  const lines: GroundLine[] = [];
  for (const leg of legsBetween(startRad, endRad)) {
    const points = samplesOf(leg, samplesPerRevolution).map((u) => motion.point(u, turnedAtEpochRad));
    const pass = Math.floor(leg.index / 2) - firstNodeRad / twoPi;
    lines.push(...linesWithinMap(points, { ascending: leg.index % 2 === 0, pass }));
  }
  return { ok: true, lines, firstNodeS };
}

interface Leg {
  /** Of the crossing at argument of latitude index · π; even ones ascend. */
  readonly index: number;
  readonly fromRad: number;
  readonly toRad: number;
}

/** Legs stop short of the turn by so much (6 m on the ground): over a pole the longitude has no value. */
const shortOfTurnRad = 1e-6;

function legsBetween(startRad: number, endRad: number): readonly Leg[] {
  const legs: Leg[] = [];
  const last = Math.ceil(endRad / Math.PI - 0.5);
  for (let index = Math.floor(startRad / Math.PI + 0.5); index <= last; index += 1) {
    const fromRad = Math.max(startRad, (index - 0.5) * Math.PI + shortOfTurnRad);
    const toRad = Math.min(endRad, (index + 0.5) * Math.PI - shortOfTurnRad);
    if (toRad > fromRad) legs.push({ index, fromRad, toRad });
  }
  return legs;
}

function samplesOf({ fromRad, toRad }: Leg, samplesPerRevolution: number): readonly number[] {
  const step = twoPi / samplesPerRevolution;
  const samples = [fromRad];
  for (let index = Math.floor(fromRad / step) + 1; index * step < toRad - shortOfTurnRad; index += 1) {
    // Both ends come as they are.
    if (index * step > fromRad + shortOfTurnRad) samples.push(index * step);
  }
  samples.push(toRad);
  return samples;
}

function endOf({ span }: GroundTrackRequest, motion: TrackMotion): number {
  if (span.kind === 'seconds') return motion.latitudeArgumentRad(span.s);
  return motion.startLatitudeArgumentRad + twoPi * span.count;
}

function problemOf({ body, span, origin, samplesPerRevolution = 120 }: GroundTrackRequest): GroundTrackProblem | null {
  if (body.rotationRadPerS === null) {
    const message = `${body.name} has no known rotation: its ground cannot be followed.`;
    return { ok: false, reason: 'missing', message };
  }
  const length = span.kind === 'seconds' ? span.s : span.count;
  if (!(length > 0 && length < Number.POSITIVE_INFINITY)) {
    return { ok: false, reason: 'badInput', message: 'A ground track has to go on for a time above 0.' };
  }
  if (origin.kind === 'greenwich' && body.id !== 'earth') {
    return { ok: false, reason: 'badInput', message: `${body.name} has no Greenwich: count from the first node.` };
  }
  if (!(Number.isInteger(samplesPerRevolution / 4) && samplesPerRevolution > 0)) {
    const message = `Samples a revolution have to be a multiple of 4, not ${samplesPerRevolution}.`;
    return { ok: false, reason: 'badInput', message };
  }
  return null;
}

function tooLong(samplesPerRevolution: number): GroundTrackProblem {
  const most = formatNumber(Math.floor(mostPoints / samplesPerRevolution), { digits: 0 });
  return { ok: false, reason: 'tooLong', message: `At most ${most} revolutions can be drawn at once.` };
}
