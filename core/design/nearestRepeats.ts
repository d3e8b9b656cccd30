/**
 * The repeat tracks nearest to an orbit that is there already: for each length of cycle the next one above and below, with
 * the change of a that closes it.
 *
 * Eccentricity is held; so is the inclination, or else the Sun-synchronous rate of the node. Closed form of either order.
 */
import type { Body } from '../bodies/body';
import { twoPi } from '../numerics/angles';
import { coprime } from '../numerics/integers';
import type { MeanElements, Theory } from '../orbit/elements';
import { type BandCell, bandCells } from './bandCells';
import { type Cycle, cellHolds, closingOrbit } from './closingOrbit';
import {
  problemOfBody,
  problemOfCycle,
  problemOfShape,
  type RepeatProblem,
  repeatProblem,
  type TrackInclination,
} from './repeatProblem';
import type { RepeatTrack } from './repeatTracks';
import { type CurveRequest, type TrackCurve, type TrackPoint, trackCurve } from './trackCurve';

export interface NearestRequest {
  readonly body: Body;
  readonly theory: Theory;
  /** The orbit that is there, km and rad. */
  readonly mean: MeanElements;
  /** What stays while a changes, besides e. */
  readonly keep: 'inclination' | 'sunSynchronous';
  /** Longest cycle, in nodal days: a whole number from 1 to 400. */
  readonly maxDays: number;
  /** Shortest cycle; 1 if left out. */
  readonly minDays?: number;
}

export interface NearestRepeat extends RepeatTrack {
  /** New less present semi-major axis. */
  readonly axisChangeKm: number;
  /** New less present inclination: 0 where it is kept. */
  readonly inclinationChangeRad: number;
}

export type NearestResult = { readonly ok: true; readonly repeats: readonly NearestRepeat[] } | RepeatProblem;

/** By the size of the change of a, smallest first; at most two of each length. */
export function nearestRepeats(request: NearestRequest): NearestResult {
  const { body, theory, mean, maxDays, minDays = 1 } = request;
  const inclination: TrackInclination =
    request.keep === 'sunSynchronous' ? { kind: 'sunSynchronous' } : { kind: 'fixed', rad: mean.inclinationRad };
  const curveRequest: CurveRequest = { body, theory, eccentricity: mean.eccentricity, inclination };
  const problem = problemOf(curveRequest, request);
  if (problem) return problem;
  // As it flies now, whatever is kept while it changes.
  const present = trackCurve({ ...curveRequest, inclination: { kind: 'fixed', rad: mean.inclinationRad } });
  const here = present(mean.semiMajorAxisKm);
  if (!here) return repeatProblem('badInput', 'body', `The zonals of ${body.name} are too large for the closed form.`);
  const curve = trackCurve(curveRequest);
  const cells = bandCells(curve, bandAround(body, mean));
  const repeats: NearestRepeat[] = [];
  for (let days = minDays; days <= maxDays; days += 1) {
    for (const cycle of cyclesAround(here, days)) {
      const orbit = nearestOrbit(curve, cells, cycle, mean.semiMajorAxisKm);
      if (orbit) repeats.push(asRepeat(orbit, cycle, body, mean));
    }
  }
  repeats.sort((one, other) => Math.abs(one.axisChangeKm) - Math.abs(other.axisChangeKm) || one.days - other.days);
  return { ok: true, repeats };
}

function problemOf(curve: CurveRequest, { mean, maxDays, minDays = 1 }: NearestRequest): RepeatProblem | null {
  const problem = problemOfBody(curve) ?? problemOfShape(curve) ?? problemOfCycle('maxDays', maxDays);
  if (problem) return problem;
  if (!(Number.isInteger(minDays) && minDays >= 1 && minDays <= maxDays)) {
    const text = `The shortest cycle has to be a whole number of days from 1 to the longest, ${maxDays}.`;
    return repeatProblem('badInput', 'maxDays', text);
  }
  const perigeeKm = mean.semiMajorAxisKm * (1 - mean.eccentricity) - curve.body.equatorialRadiusKm;
  if (perigeeKm >= 0 && perigeeKm < Number.POSITIVE_INFINITY) return null;
  const text = `The orbit's perigee has to lie above the surface of ${curve.body.name} for its track to be flown.`;
  return repeatProblem('belowSurface', 'minAltitudeKm', text);
}

/** One revolution a cycle less raises a by a factor of 2^⅔ at most: from two revolutions a cycle to one. */
const furthestUp = 2 ** (2 / 3) * 1.1;

function bandAround(body: Body, { semiMajorAxisKm: a, eccentricity: e }: MeanElements) {
  return { lowKm: body.equatorialRadiusKm / (1 - e), highKm: a * furthestUp };
}

/** The next cycles of so many days in lowest terms, slower and quicker than the orbit; one if it is flown already. */
function cyclesAround({ daysPerRevolution }: TrackPoint, days: number): readonly Cycle[] {
  const exact = days / Math.abs(daysPerRevolution);
  const whole = Math.round(exact);
  if (Math.abs(exact - whole) <= 1e-12 * exact && coprime(whole, days)) return [{ revolutions: whole, days }];
  let below = Math.floor(exact);
  let above = below + 1;
  while (below > 0 && !coprime(below, days)) below -= 1;
  while (!coprime(above, days)) above += 1;
  return [below, above].filter((revolutions) => revolutions > 0).map((revolutions) => ({ revolutions, days }));
}

function nearestOrbit(curve: TrackCurve, cells: readonly BandCell[], cycle: Cycle, axisKm: number): TrackPoint | null {
  let nearest: TrackPoint | null = null;
  const distance = (point: TrackPoint) => Math.abs(point.semiMajorAxisKm - axisKm);
  for (const cell of cells) {
    if (!cellHolds(cell, cycle)) continue;
    const orbit = closingOrbit(curve, cell, cycle);
    if (!nearest || distance(orbit) < distance(nearest)) nearest = orbit;
  }
  return nearest;
}

function asRepeat(orbit: TrackPoint, { revolutions, days }: Cycle, body: Body, mean: MeanElements): NearestRepeat {
  return {
    revolutions,
    days,
    semiMajorAxisKm: orbit.semiMajorAxisKm,
    inclinationRad: orbit.inclinationRad,
    trackSpacingKm: (twoPi * body.equatorialRadiusKm) / revolutions,
    axisChangeKm: orbit.semiMajorAxisKm - mean.semiMajorAxisKm,
    inclinationChangeRad: orbit.inclinationRad - mean.inclinationRad,
  };
}
