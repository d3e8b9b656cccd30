/** Limits in words, the same on the screen, in the book and on paper. */
import type { LimitEntry, LimitMargin, ReadLimit } from './limits';
import { readNumber } from './numberText';
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

/** A limit as it stands in the record, whether or not it can be read: "Perigee altitude at most 600 km". */
export function storedLimitText(stored: Readonly<Record<string, unknown>>): string {
  const { reading, bound, text, unit } = stored;
  const spec = readingSpec(reading);
  if (!spec) return 'a limit of another version';
  const { symbol } = unitOf(spec.quantity, String(unit));
  return `${spec.label} ${bound === 'atLeast' ? 'at least' : 'at most'} ${String(text) || 'empty'} ${symbol.replace(/^deg\b/, '°')}`.trim();
}

/** The same limit typed in another unit of its reading; a text that is no number stays as it is typed. */
export function limitInUnit(entry: LimitEntry, unitId: string): LimitEntry {
  const quantity = quantityOf(entry);
  const [from, to] = [unitOf(quantity, entry.unit), unitOf(quantity, unitId)];
  return { ...entry, unit: to.id, text: convertedText(entry.text, to.perCore / from.perCore) };
}

/** A typed number times a factor, with the decimal comma where it was typed with one; any other text as it is. */
export function convertedText(text: string, factor: number): string {
  const number = readNumber(text);
  if (!number.ok || factor === 1) return text;
  const plain = String(Number((number.value * factor).toPrecision(10)));
  return text.includes(',') && !text.includes('.') ? plain.replace('.', ',') : plain;
}

function quantityOf({ reading }: LimitEntry): Quantity {
  const spec = readingSpec(reading);
  if (!spec) throw new Error(`Expected a known reading, got ${reading}`);
  return spec.quantity;
}
