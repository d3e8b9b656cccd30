/**
 * Limits: bounds that the user sets on readings, as typed, and how much is left of each.
 *
 * A limit is kept as its text with a unit tag, as every input is; an entry that this version does not know is
 * kept too, and said. Angles and local times are judged as plain numbers, 0 to 360° and 00:00 to 24:00.
 */
import type { Candidate } from './candidate';
import { readLocalTime } from './entry/localTimeText';
import { fieldReader } from './readFields';
import type { Reading, ReadingId } from './readings/reading';
import { readingSpec } from './readings/readings';
import type { FieldError } from './resolved';
import { unitOf } from './units';

export type LimitBound = 'atLeast' | 'atMost';

/** A limit as typed; lies in `Candidate.limits`. */
export interface LimitEntry {
  readonly reading: ReadingId;
  readonly bound: LimitBound;
  readonly text: string;
  /** Id of the display unit that the text is in. */
  readonly unit: string;
}

/** A limit as a number in the reading's core unit: km, s, rad, and hours for a local time. */
export interface Limit {
  readonly reading: ReadingId;
  readonly bound: LimitBound;
  readonly value: number;
}

/** `place` is the index in `Candidate.limits`. */
export type ReadLimit =
  | { readonly ok: true; readonly place: number; readonly entry: LimitEntry; readonly limit: Limit }
  | { readonly ok: false; readonly place: number; readonly entry: LimitEntry | null; readonly error: FieldError };

/** Each limit of the candidate in turn, as a number or with the message that its field shows. */
export function readLimits({ limits }: Pick<Candidate, 'limits'>): ReadLimit[] {
  return limits.map((stored, place) => {
    const entry = limitEntry(stored);
    if (entry === null) {
      const name = String(stored['reading'] ?? 'without a name').slice(0, 40);
      const message = `This version does not know the limit of “${name}”. It is kept as it is.`;
      return { ok: false, place, entry: null, error: { message } };
    }
    const { reading, bound } = entry;
    const read = limitValue(entry);
    if (typeof read !== 'number') return { ok: false, place, entry, error: read };
    return { ok: true, place, entry, limit: { reading, bound, value: read } };
  });
}

/** The limits of a candidate that can be read, as numbers in core units. */
export function knownLimits(candidate: Pick<Candidate, 'limits'>): Limit[] {
  return readLimits(candidate).flatMap((each) => (each.ok ? [each.limit] : []));
}

/** The stored limit as one that this version knows; null for any other. */
function limitEntry(stored: Readonly<Record<string, unknown>>): LimitEntry | null {
  const spec = readingSpec(stored['reading']);
  const { bound, text, unit } = stored;
  if (!spec || (bound !== 'atLeast' && bound !== 'atMost') || typeof text !== 'string') return null;
  return { reading: spec.id, bound, text, unit: unitOf(spec.quantity, String(unit)).id };
}

/** In the core unit, or the message for the field. */
function limitValue({ reading, text, unit }: LimitEntry): number | FieldError {
  const spec = readingSpec(reading);
  if (!spec) throw new Error(`Expected a known reading, got ${reading}`);
  if (spec.quantity === 'localTime') {
    return readLocalTime(text) ?? { message: 'Limit: type a local time from 00:00 to 23:59, such as 10:30.' };
  }
  const { perCore, symbol } = unitOf(spec.quantity, unit);
  const expected = symbol === '' ? 'a number' : `a number in ${symbol.replace(/^deg\b/, '°')}`;
  const reader = fieldReader({ limit: text });
  const value = reader.number({ field: 'limit', label: 'Limit', expected });
  return value === null ? (reader.errors.limit ?? { message: `Limit: type ${expected}.` }) : value / perCore;
}

export interface LimitMargin {
  readonly place: number;
  readonly entry: LimitEntry;
  readonly limit: Limit;
  /** What is left up to the limit, in the reading's core unit; negative where it is broken. */
  readonly margin: number;
  /** `atEdge`: the reading meets the limit to the last digit that is shown, which keeps to it. */
  readonly state: 'kept' | 'atEdge' | 'broken';
}

/** The margin of each readable limit whose reading the orbit has, in the order of the candidate. */
export function limitMargins(read: readonly ReadLimit[], readings: readonly Reading[]): LimitMargin[] {
  return read.flatMap((each) => {
    const reading = each.ok ? readings.find(({ id }) => id === each.limit.reading) : undefined;
    return each.ok && reading ? [marginOf(each, reading)] : [];
  });
}

function marginOf({ place, entry, limit }: Extract<ReadLimit, { ok: true }>, reading: Reading): LimitMargin {
  const margin = marginLeft(limit, reading.value);
  // A clock is shown to the second.
  const { perCore, digits } = reading.quantity === 'localTime' ? clockSeconds : unitOf(reading.quantity, entry.unit);
  const isEdge = Math.abs(margin * perCore) < 0.5 * 10 ** -digits;
  return { place, entry, limit, margin, state: isEdge ? 'atEdge' : margin < 0 ? 'broken' : 'kept' };
}

const clockSeconds = { perCore: 3600, digits: 0 };

/** What is left between a value and its limit, both in the core unit; negative beyond it. */
export function marginLeft({ bound, value: limit }: Limit, value: number): number {
  return bound === 'atMost' ? limit - value : value - limit;
}
