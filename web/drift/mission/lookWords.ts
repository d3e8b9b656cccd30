/** What the second look judges, in words and numbers. Pure. */
import { closedFormDrift, degPerRad, formatNumber } from '../../../core/index';
import type { TakenLook } from '../../state/secondLook';

export interface LookRow {
  readonly id: string;
  readonly title: string;
  readonly unit: string;
  readonly hue: 'node' | 'perigee' | 'ink';
  /** Change over the days of the look, integrated. */
  readonly integrated: string;
  /** Each method less the integrated. */
  readonly averaged: string;
  readonly second: string;
  readonly first: string;
}

export interface LookJudged {
  readonly days: number;
  readonly sentence: string;
  readonly rows: readonly LookRow[];
}

interface Change {
  readonly integrated: number;
  readonly averaged: number;
  readonly second: number;
  readonly first: number;
}

export function judgedOf({ request, look }: TakenLook, apsis: string): LookJudged | null {
  const days = look.integrated.days.at(-1) ?? 0;
  if (days <= 0) return null;
  const closed = closedFormDrift({ body: request.body, mean: request.mean, spanDays: days, samples: 2 });
  const moved = (values: Float64Array, per: number) => ((values.at(-1) ?? 0) - (values[0] ?? 0)) * per;
  const turned = (key: 'nodeRad' | 'perigeeRad'): Change => ({
    integrated: moved(look.integrated[key], degPerRad),
    averaged: moved(look.averaged[key], degPerRad),
    second: (closed.second[key][1] ?? 0) * degPerRad,
    first: (closed.first[key][1] ?? 0) * degPerRad,
  });
  const held = (key: 'inclinationRad' | 'semiMajorAxisKm' | 'eccentricity', per: number): Change => ({
    integrated: moved(look.integrated[key], per),
    averaged: moved(look.averaged[key], per),
    second: 0,
    first: 0,
  });
  const node = turned('nodeRad');
  const rows = [
    rowOf({ id: 'node', title: 'Node', unit: '°', hue: 'node' }, node, 4),
    rowOf(
      { id: 'perigee', title: apsis.charAt(0).toUpperCase() + apsis.slice(1), unit: '°', hue: 'perigee' },
      turned('perigeeRad'),
      2,
    ),
    rowOf({ id: 'inclination', title: 'Inclination', unit: '°', hue: 'ink' }, held('inclinationRad', degPerRad), 4),
    rowOf({ id: 'a', title: 'a', unit: 'm', hue: 'ink' }, held('semiMajorAxisKm', 1000), 0),
    rowOf({ id: 'e', title: 'e', unit: '10⁻⁶', hue: 'ink' }, held('eccentricity', 1e6), 0),
  ];
  return { days, sentence: sentenceOf(days, node), rows };
}

function rowOf(
  words: Pick<LookRow, 'id' | 'title' | 'unit' | 'hue'>,
  { integrated, averaged, second, first }: Change,
  digits: number,
): LookRow {
  const write = (value: number) => formatNumber(value, { digits, plus: true });
  return {
    ...words,
    integrated: write(integrated),
    averaged: write(averaged - integrated),
    second: write(second - integrated),
    first: write(first - integrated),
  };
}

/** “After 30 days the closed form’s node is 0.04° ahead (second order; …”. */
function sentenceOf(days: number, { integrated, averaged, second, first }: Change): string {
  const count = formatNumber(days, { digits: Number.isInteger(days) ? 0 : 1 });
  const sense = integrated < 0 ? -1 : 1;
  const apart = (value: number) => {
    const ahead = (value - integrated) * sense;
    const size = Math.abs(ahead);
    if (size < 5e-5) return 'within 0.0001°';
    const digits = Math.max(2, Math.min(4, 1 - Math.floor(Math.log10(size))));
    return `${formatNumber(size, { digits })}° ${ahead > 0 ? 'ahead' : 'behind'}`;
  };
  return (
    `After ${count} days the closed form’s node is ${apart(second)} (second order; first order ${apart(first)}), ` +
    `the averaged one ${apart(averaged)}, against the orbit integrated.`
  );
}
