/**
 * Mean elements over a mission: the averaged level.
 *
 * Rates: J2 and J2² in closed form with their long-period part, averaged zonals from J3 and their secular products with J2,
 * averaged Sun, Moon and drag, whichever are on. Sun and Moon are averaged over the orbit, not over their own motion: they
 * stand where they are at that moment, so fortnightly and yearly terms come out. Steps of two days at most, shorter where
 * J2 turns the orbit fast or drag bites. Left out: tesserals, tides, radiation pressure, products of J2 with Sun, Moon and
 * drag. Errors against integrated orbits are held in test/external/missionHistory.test.ts and stated in the README.
 */
import { isoFromJulianDate } from '../bodies/julianDate';
import { historyModel, type LeftOutForce } from './historyForces';
import {
  type HistoryMessage,
  type HistoryRequest,
  HistoryRequestError,
  historyCautions,
  historyProblems,
} from './historyRequest';
import { type HistoryEnd, type HistoryTrack, historyTrack } from './historyTrack';

/** Samples lie `sampleDays` apart from the start on; the last one lies at the end. */
export interface MissionHistory extends HistoryTrack {
  /** Julian date, UTC. */
  readonly endJd: number;
  /** In words, where it did not reach the span; else empty. */
  readonly endMessage: string;
  /** Forces that were asked for and do not act. */
  readonly leftOut: readonly LeftOutForce[];
  readonly cautions: readonly HistoryMessage[];
}

export interface HistoryOptions {
  /** Called now and then with the share of the span that is done, 0 to 1. */
  readonly onProgress?: (share: number) => void;
  /** Longest step, days. */
  readonly longestStepDays?: number;
}

/**
 * Perigee height (km) at which drag has won: below it an orbit does not last, and averages say nothing. Common practice, no
 * source.
 */
export const decayHeightKm = 120;

/**
 * Distance (km) of an Earth orbit's apogee beyond which the Moon, 356 400 km away at its nearest, changes the orbit within a
 * revolution. Our own bound: two thirds of that.
 */
const ceilingKm = 240_000;

/** The Moon comes back to where it was, for its strongest term, in 13.6 days: two days are 53° of it. */
export const usualLongestStepDays = 2;

/**
 * The history of mean elements (km, rad) over a span, in the frame of the epoch.
 *
 * @throws HistoryRequestError with a message for each field that is out of range.
 */
export function missionHistory(request: HistoryRequest, options: HistoryOptions = {}): MissionHistory {
  const problems = historyProblems(request);
  if (problems.length > 0) throw new HistoryRequestError(problems);
  const { body, forces, epochJd } = request;
  const model = historyModel(body, forces, epochJd);
  const floorKm = model.forces.some(({ id }) => id === 'drag') ? decayHeightKm : 0;
  const track = historyTrack(request, model, {
    floorKm,
    ceilingKm: model.forces.some(({ id }) => id === 'moon') ? ceilingKm : Number.POSITIVE_INFINITY,
    longestStepDays: options.longestStepDays ?? usualLongestStepDays,
    onProgress: options.onProgress ?? (() => undefined),
  });
  const endJd = epochJd + track.endDays;
  const endMessage = endWords(track.endedBy, endJd, floorKm);
  return { ...track, endJd, endMessage, leftOut: model.leftOut, cautions: historyCautions(request) };
}

function endWords(endedBy: HistoryEnd, jd: number, floorKm: number): string {
  if (endedBy === 'span') return '';
  const date = isoFromJulianDate(jd).slice(0, 10);
  if (endedBy === 'escape') return `On ${date} averages over a revolution end: the apogee comes too near the Moon.`;
  const floor = floorKm > 0 ? `sinks below ${floorKm} km` : 'meets the surface';
  return `On ${date} the perigee ${floor}.`;
}
