/** The answer to the question of the list, in one sentence. */
import { degPerRad, formatNumber, kmPerLengthUnit, type RepeatRequest } from '../../../core/index';
import { least, rowAt, type TrackRow, type Tracks, withoutGap } from './listing';
import type { TrackFilter } from './wishes';

export interface AnswerInput {
  readonly tracks: Tracks;
  readonly request: RepeatRequest;
  readonly filter: TrackFilter;
  /** What the filter lets through, swath left aside. */
  readonly listed: Uint32Array;
  readonly lengthUnit: 'km' | 'NM';
}

export interface AnswerSpan {
  readonly text: string;
  readonly strong?: true;
}

export function answerOf(input: AnswerInput): readonly AnswerSpan[] {
  const { tracks, filter, listed } = input;
  const fitting = withoutGap(tracks, listed, filter);
  const lowest = least(tracks, fitting, 'altitude');
  if (lowest === null) return filter.swathKm === null || listed.length === 0 ? nothing(input) : narrowestGap(input);
  const count = fitting.length;
  const does = filter.swathKm === null ? '' : ` ${count === 1 ? 'leaves' : 'leave'} no gap ${place(input)}`;
  const row = rowAt(tracks, lowest);
  return [
    { text: `${formatNumber(count, { digits: 0 })} repeat ${count === 1 ? 'cycle' : 'cycles'}`, strong: true },
    { text: `${limits(input)}${does}; ${count === 1 ? 'it is' : 'the lowest is'} ` },
    { text: `${row.revolutions}/${row.days}`, strong: true },
    { text: ` at ${altitude(row, input)}.` },
  ];
}

const nothing = (input: AnswerInput): readonly AnswerSpan[] => [
  { text: 'No repeat cycle', strong: true },
  { text: `${limits(input)} lies between ${band(input)}.` },
];

function narrowestGap(input: AnswerInput): readonly AnswerSpan[] {
  const { tracks, filter, listed } = input;
  const nearest = least(tracks, listed, 'across');
  if (nearest === null) {
    return [{ text: 'No track', strong: true }, { text: ` of these cycles reaches ${latitude(filter)} latitude.` }];
  }
  const row = rowAt(tracks, nearest);
  return [
    { text: 'No repeat cycle', strong: true },
    { text: `${limits(input)} closes its gaps ${place(input)}; the narrowest gap, ` },
    { text: length(row.acrossKm - (filter.swathKm ?? 0), input.lengthUnit) },
    { text: ', is left by ' },
    { text: `${row.revolutions}/${row.days}`, strong: true },
    { text: ` at ${altitude(row, input)}.` },
  ];
}

function limits({ request, filter }: AnswerInput): string {
  const { maxDays } = request;
  const most = maxDays === 1 ? '1 day' : `${maxDays} days or less`;
  return filter.shortestDays > 1 ? ` of ${filter.shortestDays} to ${maxDays} days` : ` of ${most}`;
}

function place({ filter, lengthUnit }: AnswerInput): string {
  const where = filter.latitudeRad === 0 ? 'at the equator' : `at ${latitude(filter)} latitude`;
  return `${where} with a ${trimmed(length(filter.swathKm ?? 0, lengthUnit))} swath`;
}

const latitude = ({ latitudeRad }: TrackFilter) => `${trimmed(formatNumber(latitudeRad * degPerRad, { digits: 2 }))}°`;

function band({ request, lengthUnit }: AnswerInput): string {
  const low = trimmed(length(request.minAltitudeKm, lengthUnit)).replace(/ (km|NM)$/, '');
  return `${low} and ${trimmed(length(request.maxAltitudeKm, lengthUnit))}`;
}

function altitude({ semiMajorAxisKm }: TrackRow, { tracks, lengthUnit }: AnswerInput): string {
  const km = semiMajorAxisKm - tracks.body.equatorialRadiusKm;
  return `${rounded(km, lengthUnit, 0)} ${lengthUnit}`;
}

/** A length in the unit shown, without digits that say nothing. */
export function rounded(km: number, lengthUnit: 'km' | 'NM', digits: number): string {
  if (Number.isNaN(km)) return '–';
  return formatNumber(km / kmPerLengthUnit({ lengthUnit }), { digits });
}

function length(km: number, lengthUnit: 'km' | 'NM'): string {
  return `${rounded(km, lengthUnit, 1)} ${lengthUnit}`;
}

const trimmed = (text: string) => text.replace(/\.0+(?=\D|$)/, '');
