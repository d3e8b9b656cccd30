/** The sentence above a sweep: how the reading goes, and where it meets its limits. */
import { type Limit, type LimitMargin, marginLeft } from './limits';
import { limitText } from './limitWords';
import { readingSpec } from './readings/readings';
import { limitCrossings, type Sweep } from './sweep';
import { sweptWords } from './sweptElements';
import { formatNumber, formatQuantity, type Quantity, signedQuantities, unitOf } from './units';

export interface SweepWriting {
  /** How the reading is called at this body. */
  readonly label: string;
  /** Display units of the reading and of the element. */
  readonly readingUnit: string | undefined;
  readonly elementUnit: string | undefined;
  /** The limits of this reading. */
  readonly limits: readonly Pick<LimitMargin, 'entry' | 'limit'>[];
}

/** Such as "Node rate rises from −0.31 to +1.86 °/day as inclination goes from 92° to 103°; it crosses your limit ≤ 1 at 97.78°." */
export function sweepSentence(sweep: Sweep, writing: SweepWriting): string {
  const places = sweep.request.places;
  const span = `as ${elementLabel(sweep)} goes from ${placeText(sweep, places[0] ?? 0, writing)} to ${placeText(sweep, places.at(-1) ?? 0, writing)}`;
  const course = courseText(sweep, writing);
  if (course === '') return `No orbit meets the conditions ${span}.`;
  const limits = writing.limits.map((each) => limitClause(sweep, each, writing)).filter((text) => text !== '');
  return `${writing.label} ${course} ${span}${limits.length > 0 ? `; ${limits.join(', ')}` : ''}.${gapText(sweep)}`;
}

/** A place of the sweep in the element's unit, such as "97.61°" or "560 km". */
export function placeText({ request }: Pick<Sweep, 'request'>, place: number, { elementUnit }: SweepWriting): string {
  const { quantity } = sweptWords[request.element];
  const { perCore, symbol } = unitOf(quantity, elementUnit);
  const digits = { length: 2, angle: 3, ratio: 6 }[quantity];
  return withUnit(trimmedZeros(formatNumber(place * perCore, { digits })), symbol);
}

function trimmedZeros(number: string): string {
  return number.includes('.') ? number.replace(/\.?0+$/, '') : number;
}

function withUnit(number: string, symbol: string): string {
  if (symbol === 'deg') return `${number}°`;
  return symbol === '' ? number : `${number} ${symbol.replace(/^deg\b/, '°')}`;
}

function elementLabel({ request }: Sweep): string {
  return sweptWords[request.element].label.toLowerCase();
}

/** Figures enough to tell the ends apart; empty where there is no orbit at all. */
function courseText(sweep: Sweep, writing: SweepWriting): string {
  const known = [...sweep.values].filter(Number.isFinite);
  const [start, end] = [known[0], known.at(-1)];
  if (start === undefined || end === undefined) return '';
  const [least, greatest] = [Math.min(...known), Math.max(...known)];
  const { quantity, perCore, symbol, digits } = readingUnitOf(sweep, writing);
  const write = (value: number) => shortText(quantity, value, { unit: writing.readingUnit, spread: greatest - least });
  const of = (value: number) => withUnit(write(value), symbol);
  if ((greatest - least) * perCore < 0.5 * 10 ** -digits) return `stays at ${of(start)}`;
  const slack = 1e-9 * (greatest - least);
  if (Math.abs(start - least) <= slack && Math.abs(end - greatest) <= slack)
    return `rises from ${write(start)} to ${of(end)}`;
  if (Math.abs(start - greatest) <= slack && Math.abs(end - least) <= slack)
    return `falls from ${write(start)} to ${of(end)}`;
  return `lies between ${write(least)} and ${of(greatest)}`;
}

function readingUnitOf({ request }: Sweep, { readingUnit }: SweepWriting) {
  const quantity = readingSpec(request.reading)?.quantity ?? 'ratio';
  const unit = unitOf(quantity, readingUnit);
  return quantity === 'localTime' ? { quantity, ...unit, perCore: 3600 } : { quantity, ...unit };
}

interface Shortness {
  readonly unit: string | undefined;
  /** What the values differ by, in the core unit. */
  readonly spread: number;
}

/** As many decimals as tell a thousandth of the spread, at most the unit's own. */
export function shortText(quantity: Quantity, value: number, { unit, spread }: Shortness): string {
  if (quantity === 'localTime') return formatQuantity(quantity, value);
  const { perCore, digits } = unitOf(quantity, unit);
  const wanted = Math.ceil(-Math.log10((spread * perCore) / 1000));
  return formatNumber(value * perCore, {
    digits: Math.min(digits, Math.max(0, wanted)),
    plus: signedQuantities.has(quantity),
  });
}

function limitClause(
  sweep: Sweep,
  { entry, limit }: Pick<LimitMargin, 'entry' | 'limit'>,
  writing: SweepWriting,
): string {
  const name = `your limit ${limitText({ ok: true, place: 0, entry, limit }, writing.readingUnit)}`;
  const crossings = limitCrossings(sweep, limit);
  if (crossings.length === 0) return allBroken(sweep, limit) ? `all of it breaks ${name}` : `all of it keeps ${name}`;
  const shown = crossings.slice(0, mostCrossings).map((place) => placeText(sweep, place, writing));
  const more = crossings.length > mostCrossings ? ` and ${crossings.length - mostCrossings} more` : '';
  return `it crosses ${name} at ${shown.join(more ? ', ' : ' and ')}${more}`;
}

const mostCrossings = 2;

function allBroken({ values }: Sweep, limit: Limit): boolean {
  return values.some((value) => marginLeft(limit, value) < 0);
}

function gapText({ values }: Sweep): string {
  const missing = values.filter((value) => !Number.isFinite(value)).length;
  return missing === 0 ? '' : ` There is no such orbit at ${missing} of the ${values.length} points.`;
}
