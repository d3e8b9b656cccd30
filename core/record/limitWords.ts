/** Limits in words, the same on the screen, in the book and on paper. */
import type { LimitEntry, LimitMargin, ReadLimit } from './limits';
import type { Reading } from './readings/reading';
import { readingSpec } from './readings/readings';
import { formatClock, formatNumber, formatSignificant, type Quantity, unitOf } from './units';

const boundSigns = { atLeast: '≥', atMost: '≤' } as const;

/** Digits of a limit: what anybody types, and clear of rounding noise. */
const limitDigits = 7;

/** Such as "≤ 600": the limit in the given display unit, without the unit's symbol. */
export function limitText({ entry, limit }: Extract<ReadLimit, { ok: true }> | LimitMargin, unitId?: string): string {
  const quantity = quantityOf(entry);
  const value =
    quantity === 'localTime'
      ? formatClock(limit.value).replace(/:00$/, '')
      : formatSignificant(limit.value * unitOf(quantity, unitId).perCore, limitDigits);
  return `${boundSigns[limit.bound]} ${value}`;
}

/** Such as "limit ≤ 600: 25.0 left", "limit ≤ 600: over by 3.20" or "at the limit ≥ 500", in the given display unit. */
export function marginText(margin: LimitMargin, unitId?: string): string {
  const limit = limitText(margin, unitId);
  if (margin.state === 'atEdge') return `at the limit ${limit}`;
  const size = sizeText(quantityOf(margin.entry), Math.abs(margin.margin), unitId);
  if (margin.state === 'kept') return `limit ${limit}: ${size} left`;
  return `limit ${limit}: ${margin.limit.bound === 'atMost' ? 'over' : 'under'} by ${size}`;
}

/** Three figures are as much as a margin is looked at for; a margin of local time is in minutes. */
function sizeText(quantity: Quantity, size: number, unitId: string | undefined): string {
  if (quantity === 'localTime') return `${formatNumber(size * 60, { digits: 1 })} min`;
  const { perCore, digits } = unitOf(quantity, unitId);
  const shown = size * perCore;
  const leading = Math.floor(Math.log10(shown || 1));
  return formatNumber(shown, { digits: Math.min(digits, Math.max(0, 2 - leading)) });
}

/** What is known of the limits of an orbit. */
export interface LimitsJudged {
  readonly read: readonly ReadLimit[];
  readonly margins: readonly LimitMargin[];
}

/**
 * Such as "2 limits broken: Node rate, Perigee altitude. 1 limit not judged: Local time of the ascending node.": what is wrong
 * with limits, with each reading's label at this body; empty where nothing is.
 */
export function limitsSentence(
  { read, margins }: LimitsJudged,
  readings: readonly Pick<Reading, 'id' | 'label'>[],
): string {
  const labelOf = (entry: LimitEntry | null) =>
    readings.find(({ id }) => id === entry?.reading)?.label ??
    readingSpec(entry?.reading)?.label ??
    'a reading of another version';
  const broken = margins.filter(({ state }) => state === 'broken');
  const judged = new Set(margins.map(({ place }) => place));
  const others = read.filter(({ place }) => !judged.has(place));
  return [
    ...counted(
      'broken',
      broken.map(({ entry }) => labelOf(entry)),
    ),
    ...counted(
      'not judged',
      others.map(({ entry }) => labelOf(entry)),
    ),
  ].join(' ');
}

function counted(what: string, labels: readonly string[]): string[] {
  if (labels.length === 0) return [];
  return [`${labels.length} ${labels.length === 1 ? 'limit' : 'limits'} ${what}: ${[...new Set(labels)].join(', ')}.`];
}

/** Throws for a reading that this version does not know: `readLimits` gives no entry then. */
export function quantityOf({ reading }: Pick<LimitEntry, 'reading'>): Quantity {
  const spec = readingSpec(reading);
  if (!spec) throw new Error(`Expected a known reading, got ${reading}`);
  return spec.quantity;
}
