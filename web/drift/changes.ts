/** The closed form's lines in units a reader can hold: minutes or hours, degrees or turns. Pure. */
import { type ClosedFormDrift, formatNumber } from '../../core/index';

export type ChangeId = 'localTime' | 'node' | 'perigee';

export interface ChangeUnit {
  readonly perCore: number;
  /** Set right after the number. */
  readonly symbol: string;
  /** In the head of a table. */
  readonly short: string;
  /** Written in the title of the axis. */
  readonly name: string;
}

export interface Change {
  readonly id: ChangeId;
  readonly title: string;
  readonly unit: ChangeUnit;
  /** Digits after the point that show the difference of the two orders to about three figures. */
  readonly digits: number;
  readonly first: Float64Array;
  readonly second: Float64Array;
}

/** A thin space at which no line breaks. */
const thin = '\u202f';
const worded = (perCore: number, short: string, name: string): ChangeUnit => ({
  perCore,
  symbol: thin + short,
  short,
  name,
});
export const degrees: ChangeUnit = { perCore: 180 / Math.PI, symbol: '°', short: '°', name: 'degrees' };
const turns = worded(1 / (2 * Math.PI), 'turns', 'turns');
const minutes = worded(1 / 60, 'min', 'minutes');
const hours = worded(1 / 3600, 'h', 'hours');
const clockDays = worded(1 / 86_400, 'd', 'days of 24 h');

/** Degrees up to ten turns. */
export const angleUnit = (largestRad: number): ChangeUnit => (largestRad > 20 * Math.PI ? turns : degrees);

/** Minutes up to five hours, hours up to four days, then days. */
export function localTimeUnit(largestS: number): ChangeUnit {
  if (largestS <= 5 * 3600) return minutes;
  return largestS <= 4 * 86_400 ? hours : clockDays;
}

/** Local time where the body has one, node, perigee (by the name it has at the body): in the order they are drawn. */
export function changesOf({ first, second }: ClosedFormDrift, apsis: string): Change[] {
  const change = (id: ChangeId, title: string, unitFor: (largest: number) => ChangeUnit, lines: OrderedLines) => {
    const unit = unitFor(Math.max(largestOf(lines.first), largestOf(lines.second)));
    const scaled = (line: Float64Array) => line.map((value) => value * unit.perCore);
    const drawn = { first: scaled(lines.first), second: scaled(lines.second) };
    return { id, title, unit, ...drawn, digits: digitsFor(drawn) };
  };
  const changes = [
    change('node', 'Node', angleUnit, { first: first.nodeRad, second: second.nodeRad }),
    change('perigee', apsis.charAt(0).toUpperCase() + apsis.slice(1), angleUnit, {
      first: first.perigeeRad,
      second: second.perigeeRad,
    }),
  ];
  if (first.localTimeS === null || second.localTimeS === null) return changes;
  const lines = { first: first.localTimeS, second: second.localTimeS };
  return [change('localTime', 'Local time', localTimeUnit, lines), ...changes];
}

interface OrderedLines {
  readonly first: Float64Array;
  readonly second: Float64Array;
}

/** Lines start at zero and are straight: the end is the largest. */
const largestOf = (line: Float64Array): number => Math.abs(line.at(-1) ?? 0);

/** More figures than these are noise to a reader. */
const mostFigures = 6;

function digitsFor({ first, second }: OrderedLines): number {
  const difference = Math.abs((second.at(-1) ?? 0) - (first.at(-1) ?? 0));
  const size = difference > 1e-9 ? difference : Math.max(largestOf(second) / 100, 1e-3);
  const wanted = 2 - Math.floor(Math.log10(size));
  const most = mostFigures - 1 - Math.floor(Math.log10(Math.max(1, largestOf(first), largestOf(second))));
  return Math.max(1, Math.min(6, wanted, most));
}

/** Second order, first order and second minus first at a sample, signed; the unit is said elsewhere. */
export function numbersAt({ first, second, digits }: Change, sample: number) {
  const write = (value: number) => formatNumber(value, { digits, plus: true });
  const one = first[sample] ?? 0;
  const two = second[sample] ?? 0;
  return { first: write(one), second: write(two), difference: write(two - one) };
}

/** “+1805.12° second order, +1802.30° first” at a sample. */
export function ordersText(change: Change, sample: number): string {
  const { first, second } = numbersAt(change, sample);
  const { symbol } = change.unit;
  return `${second}${symbol} second order, ${first}${symbol === '°' ? symbol : ''} first`;
}

/** “Rates of now held 5 years: +1805.12° second order, +1802.30° first; 2.82° apart.” */
export function changeCaption(change: Change, spanText: string): string {
  const end = change.second.length - 1;
  const apart = numbersAt(change, end).difference.replace(/^[+\u2212]/, '');
  return `Rates of now held ${spanText}: ${ordersText(change, end)}; ${apart}${change.unit.symbol} apart.`;
}
