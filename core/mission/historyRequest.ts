/** What a history is asked for, and what is wrong with the asking: messages by field, before anything is computed. */
import type { Body } from '../bodies/body';
import { seriesSpan } from '../bodies/julianDate';
import { ballisticKgPerM2, type DragInput } from '../forces/drag';
import { highestZonalDegree } from '../forces/zonal';
import type { MeanElements } from '../orbit/elements';

export interface HistoryForces {
  /** Highest zonal: 0 for none, else 2 to 14. J2 comes in closed form with its square, J3 and above averaged. */
  readonly zonalDegree: number;
  readonly sun: boolean;
  readonly moon: boolean;
  readonly drag?: DragInput | undefined;
}

export interface HistoryRequest {
  readonly body: Body;
  /** Mean elements at the epoch (km, rad), inertial equatorial frame of the epoch. */
  readonly mean: MeanElements;
  /** Julian date, UTC. */
  readonly epochJd: number;
  readonly spanDays: number;
  readonly forces: HistoryForces;
  /** Days between samples. */
  readonly sampleDays: number;
}

export type HistoryField = 'mean' | 'epochJd' | 'spanDays' | 'sampleDays' | 'zonalDegree' | 'drag';

/** Plain words for the field: what was expected. */
export interface HistoryMessage {
  readonly field: HistoryField;
  readonly message: string;
}

/** Fifteen years, days. */
export const longestSpanDays = 5479;

/** Samples at most: ten a day over the longest span. */
const mostSamples = 60_000;

/** Everything that keeps a history from being computed; empty where it can be. */
export function historyProblems(request: HistoryRequest): readonly HistoryMessage[] {
  const { epochJd, spanDays, sampleDays, forces } = request;
  const found: HistoryMessage[] = [];
  const note = (field: HistoryField, message: string) => found.push({ field, message });
  if (!(spanDays > 0 && spanDays <= longestSpanDays)) {
    note('spanDays', `The span must be above 0 and at most 15 years (${longestSpanDays} days), not ${spanDays}.`);
  } else if (!(sampleDays > 0 && spanDays / sampleDays <= mostSamples)) {
    note('sampleDays', `The samples must lie at least ${(spanDays / mostSamples).toPrecision(2)} days apart.`);
  }
  if (!Number.isFinite(epochJd)) note('epochJd', 'The history needs an epoch, as a Julian date.');
  const { zonalDegree } = forces;
  if (
    !(zonalDegree === 0 || (Number.isInteger(zonalDegree) && zonalDegree >= 2 && zonalDegree <= highestZonalDegree))
  ) {
    note(
      'zonalDegree',
      `The highest zonal must be 0 or a whole number from 2 to ${highestZonalDegree}, not ${zonalDegree}.`,
    );
  }
  found.push(...meanProblems(request.mean), ...dragProblems(forces.drag));
  return found;
}

function meanProblems(mean: MeanElements): readonly HistoryMessage[] {
  const { semiMajorAxisKm: a, eccentricity: e, inclinationRad: i } = mean;
  const message = (text: string): HistoryMessage => ({ field: 'mean', message: text });
  if (mean.kind !== undefined && mean.kind !== 'mean') return [message('A history starts from mean elements.')];
  if (!(a > 0 && a < Infinity)) return [message(`The semi-major axis must be a positive number of km, not ${a}.`)];
  if (!(e >= 0 && e < 1)) return [message(`A history needs a closed orbit, eccentricity from 0 to below 1, not ${e}.`)];
  if (!(i >= 0 && i <= Math.PI)) return [message('The inclination must lie between 0° and 180°.')];
  const angles = [mean.nodeRad, mean.perigeeRad, mean.meanAnomalyRad];
  return angles.every(Number.isFinite) ? [] : [message('Node, perigee and mean anomaly must be numbers.')];
}

function dragProblems(drag: DragInput | undefined): readonly HistoryMessage[] {
  if (!drag) return [];
  const found: HistoryMessage[] = [];
  const ballistic = ballisticKgPerM2(drag);
  const parts = 'ballisticKgPerM2' in drag ? [ballistic] : [drag.massKg, drag.areaM2, drag.dragCoefficient, ballistic];
  if (!parts.every((part) => part > 0 && part < Infinity)) {
    const what = 'Mass, area and drag coefficient, or m/(Cd·A), must be positive numbers';
    found.push({ field: 'drag', message: `${what}; m/(Cd·A) came out as ${ballistic} kg/m².` });
  }
  const { density } = drag;
  if (typeof density === 'number' && !(density >= 0 && density < Infinity)) {
    found.push({ field: 'drag', message: `The density factor must be a number from 0 up, not ${density}.` });
  }
  return found;
}

/** kg/m²: balloons lie below, solid metal spheres of a metre above. */
const usualBallistic = { least: 1, most: 2000 } as const;

/** Apogee (km) beyond which the Moon's pull is no small addition to an Earth orbit: about a quarter of its distance. */
const farKm = 100_000;

/** What is computed, but should be taken with care. */
export function historyCautions({ body, mean, epochJd, spanDays, forces }: HistoryRequest): readonly HistoryMessage[] {
  const found: HistoryMessage[] = [];
  const sky = body.id === 'earth' && (forces.sun || forces.moon);
  if (sky && (epochJd < seriesSpan.firstJd || epochJd + spanDays > seriesSpan.lastJd)) {
    found.push({
      field: 'epochJd',
      message: 'Part of the span lies outside 1950–2100, where Sun and Moon are not checked.',
    });
  }
  if (sky && mean.semiMajorAxisKm * (1 + mean.eccentricity) > farKm) {
    const reach = `The apogee lies beyond ${farKm} km`;
    found.push({ field: 'mean', message: `${reach}, where the Moon is too strong for an average over a revolution.` });
  }
  if (forces.drag) {
    const ballistic = ballisticKgPerM2(forces.drag);
    if (ballistic < usualBallistic.least || ballistic > usualBallistic.most) {
      const range = `${usualBallistic.least}–${usualBallistic.most} kg/m²`;
      found.push({
        field: 'drag',
        message: `m/(Cd·A) of ${ballistic.toPrecision(3)} kg/m² is outside the usual ${range}.`,
      });
    }
  }
  return found;
}

/** A history that cannot be computed as asked. */
export class HistoryRequestError extends Error {
  constructor(readonly problems: readonly HistoryMessage[]) {
    super(problems.map(({ field, message }) => `${field}: ${message}`).join(' '));
    this.name = 'HistoryRequestError';
  }
}
