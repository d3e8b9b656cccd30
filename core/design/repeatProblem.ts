/** What a search for repeat ground tracks is asked, and what keeps it from being answered. */
import type { Body } from '../bodies/body';
import { radPerDeg } from '../numerics/angles';
import { formatNumber, formatSignificant } from '../numerics/numberWords';
import type { Theory } from '../orbit/elements';

/** `sunSynchronous`: i follows a so that the node keeps with the mean Sun. `fixed`: i stays. */
export type TrackInclination =
  | { readonly kind: 'sunSynchronous' }
  | {
      readonly kind: 'fixed';
      /** Inclination, rad, 0 to π. */
      readonly rad: number;
    };

export interface RepeatRequest {
  readonly body: Body;
  readonly theory: Theory;
  readonly eccentricity: number;
  readonly inclination: TrackInclination;
  /** Mean altitudes a − R above the body's equatorial radius, both ends of the band included. */
  readonly minAltitudeKm: number;
  readonly maxAltitudeKm: number;
  /** Longest cycle, in nodal days: a whole number from 1 to 400. */
  readonly maxDays: number;
}

/** Longest cycle that is searched for, nodal days. */
export const longestCycleDays = 400;

/** More tracks than this answer no question and fill the memory of a tablet. */
export const mostTracks = 1_000_000;

export type RepeatReason =
  /** A number of the request makes no sense; `field` says which. */
  | 'badInput'
  /** The body lacks its rotation or its year. */
  | 'missing'
  /** The band has no altitude at which perigee clears the surface. */
  | 'belowSurface'
  /** No inclination is Sun-synchronous anywhere in the band. */
  | 'noSunSynchronous'
  | 'tooMany';

export type RepeatField = keyof RepeatRequest;

export interface RepeatProblem {
  readonly ok: false;
  readonly reason: RepeatReason;
  readonly field: RepeatField;
  /** In plain words: what was expected, or what nature allows, with the numbers. */
  readonly message: string;
}

/** The same, thrown where the caller asked for a plain array. */
export class RepeatTracksError extends Error {
  readonly reason: RepeatReason;
  readonly field: RepeatField;

  constructor({ reason, field, message }: RepeatProblem) {
    super(message);
    this.name = 'RepeatTracksError';
    this.reason = reason;
    this.field = field;
  }
}

export function repeatProblem(reason: RepeatReason, field: RepeatField, message: string): RepeatProblem {
  return { ok: false, reason, field, message };
}

/** First thing wrong with the request, or null. */
export function problemOfRequest(request: RepeatRequest): RepeatProblem | null {
  return (
    problemOfBody(request) ??
    problemOfShape(request) ??
    problemOfBand(request) ??
    problemOfCycle('maxDays', request.maxDays)
  );
}

export type BodyAndInclination = Pick<RepeatRequest, 'body' | 'inclination'>;

export function problemOfBody({ body, inclination }: BodyAndInclination): RepeatProblem | null {
  if (!body.rotationRadPerS) {
    const what = body.rotationRadPerS === 0 ? 'does not rotate' : 'has no known rotation';
    return repeatProblem('missing', 'body', `${body.name} ${what}: a repeat ground track needs the length of its day.`);
  }
  if (inclination.kind === 'sunSynchronous' && !body.yearDays) {
    return repeatProblem('missing', 'body', `${body.name} has no known year: Sun-synchronous orbits need its length.`);
  }
  return null;
}

export type ShapeAndInclination = Pick<RepeatRequest, 'eccentricity' | 'inclination'>;

export function problemOfShape({ eccentricity, inclination }: ShapeAndInclination): RepeatProblem | null {
  if (!(eccentricity >= 0 && eccentricity < 1)) {
    return repeatProblem(
      'badInput',
      'eccentricity',
      `Eccentricity has to be from 0 to below 1${notThis(eccentricity)}.`,
    );
  }
  if (inclination.kind === 'fixed' && !(inclination.rad >= 0 && inclination.rad <= Math.PI)) {
    const given = notThis(inclination.rad / radPerDeg, '°');
    return repeatProblem('badInput', 'inclination', `Inclination has to be from 0° to 180°${given}.`);
  }
  return null;
}

function problemOfBand({ body, minAltitudeKm: low, maxAltitudeKm: high }: RepeatRequest): RepeatProblem | null {
  if (!Number.isFinite(low))
    return repeatProblem('badInput', 'minAltitudeKm', 'The lowest altitude has to be a number.');
  if (!Number.isFinite(high)) {
    return repeatProblem('badInput', 'maxAltitudeKm', 'The highest altitude has to be a number.');
  }
  if (low < 0) {
    const text = `The band starts ${kilometres(-low)} below the surface of ${body.name}: the lowest altitude has to be 0 km or more.`;
    return repeatProblem('badInput', 'minAltitudeKm', text);
  }
  if (low > high) {
    const text = `The band is upside down: its lowest altitude, ${kilometres(low)}, lies above its highest, ${kilometres(high)}.`;
    return repeatProblem('badInput', 'minAltitudeKm', text);
  }
  return null;
}

/** A cycle length in days: whole, from 1 to the longest. */
export function problemOfCycle(field: RepeatField, days: number): RepeatProblem | null {
  if (Number.isInteger(days) && days >= 1 && days <= longestCycleDays) return null;
  const text = `The longest cycle has to be a whole number of days from 1 to ${longestCycleDays}${notThis(days)}.`;
  return repeatProblem('badInput', field, text);
}

/** What was given instead, where it is a number at all. */
function notThis(value: number, unit = ''): string {
  return Number.isFinite(value) ? `, not ${formatSignificant(value)}${unit}` : '';
}

export function kilometres(km: number): string {
  return `${formatNumber(km, { digits: 1 })} km`;
}
