/** Spans of the drift plots: five to choose from, and any other in days. Pure. */
import { type FieldError, formatNumber, readNumber } from '../../core/index';

/** Years of 365.25 days, the years that rates are quoted in. */
export const spans = [
  { id: 'day', label: '1 day', days: 1 },
  { id: 'month', label: '30 days', days: 30 },
  { id: 'year', label: '1 year', days: 365.25 },
  { id: 'fiveYears', label: '5 years', days: 5 * 365.25 },
  { id: 'fifteenYears', label: '15 years', days: 15 * 365.25 },
] as const;

export type SpanId = (typeof spans)[number]['id'] | 'other';

const leastDays = 1;
export const mostDays = 5479;
/** A span of whole days counts as the years it rounds. */
const slackDays = 1.3;

/** The choice that a span in days is. */
export function spanIdOf(days: number): SpanId {
  return spans.find((span) => Math.abs(span.days - days) <= (span.days > 300 ? slackDays : 0))?.id ?? 'other';
}

/** “5 years” or “1217.5 days”. */
export function spanText(days: number): string {
  const known = spans.find(({ id }) => id === spanIdOf(days));
  return known ? known.label : `${daysNumber(days)} days`;
}

/** Days with no more figures than they have, at most two after the point. */
export function daysNumber(days: number): string {
  const digits = [0, 1, 2].find((count) => Math.abs(days - Number(days.toFixed(count))) < 1e-9) ?? 2;
  return formatNumber(days, { digits });
}

export type SpanResult =
  | { readonly ok: true; readonly days: number }
  | { readonly ok: false; readonly error: FieldError };

/** Reads a span in days from a text as typed. */
export function readSpan(text: string): SpanResult {
  const read = readNumber(text);
  const expected = `Type a span from 1 to ${formatNumber(mostDays, { digits: 0 })} days, which is 15 years.`;
  if (!read.ok) {
    const choices = read.readings?.map((reading) => ({ text: reading.text, label: `${reading.text} days` }));
    return {
      ok: false,
      error: { message: read.problem === 'ambiguous' ? read.message : expected, ...(choices && { choices }) },
    };
  }
  return read.value >= leastDays && read.value <= mostDays
    ? { ok: true, days: read.value }
    : { ok: false, error: { message: expected } };
}
