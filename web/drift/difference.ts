/** What the second order adds to the first, of node and perigee in degrees: the error of the first. Pure. */
import { type ClosedFormDrift, formatNumber } from '../../core/index';
import { degrees, localTimeUnit } from './changes';

export interface Difference {
  readonly apsis: string;
  readonly node: Float64Array;
  readonly perigee: Float64Array;
}

export function differenceOf({ first, second }: ClosedFormDrift, apsis: string): Difference {
  const apart = (two: Float64Array, one: Float64Array) =>
    two.map((value, sample) => (value - (one[sample] ?? 0)) * degrees.perCore);
  return { apsis, node: apart(second.nodeRad, first.nodeRad), perigee: apart(second.perigeeRad, first.perigeeRad) };
}

/** “node −5.11°, perigee +3.20°” at a sample. */
export function differenceText({ apsis, node, perigee }: Difference, sample: number): string {
  return `node ${threeFigures(node[sample] ?? 0)}°, ${apsis} ${threeFigures(perigee[sample] ?? 0)}°`;
}

/** As above at the end, and what the node's part is in local time. */
export function differenceCaption(drift: ClosedFormDrift, difference: Difference, spanText: string): string {
  const { first, second } = drift;
  const end = drift.days.length - 1;
  const apartS = (second.localTimeS?.[end] ?? 0) - (first.localTimeS?.[end] ?? 0);
  const unit = localTimeUnit(Math.abs(apartS));
  const localTime =
    second.localTimeS === null ? '' : `, local time ${threeFigures(apartS * unit.perCore)}${unit.symbol}`;
  return `Rates of now held ${spanText}: ${differenceText(difference, end)}${localTime}.`;
}

function threeFigures(value: number): string {
  const size = Math.abs(value);
  const digits = size < 1e-6 ? 2 : Math.max(0, Math.min(6, 2 - Math.floor(Math.log10(size))));
  return formatNumber(value, { digits, plus: true });
}
