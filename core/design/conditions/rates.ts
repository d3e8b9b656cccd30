/** What the conditions on rates share. */
import type { Body } from '../../bodies/body';
import { degPerRad, secondsPerDay } from '../../numerics/angles';
import { formatNumber, formatSignificant, quotedNumber } from '../../numerics/numberWords';
import { nodeRateAt, perigeeRateAt } from '../shapeRates';
import type { Condition, Prepared } from './condition';

/** A rate with its unit: four digits, more where it is slow. */
export function rateWords(radPerS: number, more = 0): string {
  if (radPerS === 0) return '0°/day';
  const degPerDay = radPerS * degPerRad * secondsPerDay;
  const slow = Math.abs(degPerDay) < 0.01;
  return `${slow ? formatSignificant(degPerDay, 4 + more) : formatNumber(degPerDay, { digits: 4 + more })}°/day`;
}

type Wording = Pick<Condition, 'kind' | 'label' | 'formula'>;

/** Ω̇ = target. */
export function nodeCondition(radPerS: number, { kind, label, formula }: Wording): Condition {
  return {
    kind,
    label,
    formula,
    family: 'node',
    target: radPerS,
    measure: nodeRateAt,
    scale: (shape, theta) => (radPerS === 0 ? shape.size : Math.abs(radPerS) + Math.abs(nodeRateAt(shape, theta))),
    write: rateWords,
    quantity: 'node rate',
    notes: [],
  };
}

/** ω̇ = target. */
export function perigeeCondition(radPerS: number, { kind, label, formula }: Wording): Condition {
  return {
    kind,
    label,
    formula,
    family: 'perigee',
    target: radPerS,
    measure: perigeeRateAt,
    scale: (shape) => Math.abs(radPerS) + shape.size,
    write: rateWords,
    quantity: 'perigee rate',
    notes: [],
  };
}

/** Rates of node and perigee exist only with a J2. */
export function preparedRate(body: Body, radPerS: number, make: (radPerS: number) => Condition): Prepared {
  if (!(typeof radPerS === 'number' && Number.isFinite(radPerS))) {
    return {
      ok: false,
      kind: 'badInput',
      text: `A rate has to be a number in rad/s, but it is ${quotedNumber(radPerS)}.`,
    };
  }
  const condition = make(radPerS);
  if ((body.zonals[2] ?? 0) === 0) {
    return { ok: false, kind: 'missing', text: `${condition.label} needs the J2 of ${body.name}, which is not known.` };
  }
  return { ok: true, condition };
}
