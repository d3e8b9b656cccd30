import { twoPi } from '../../numerics/angles';
import { formatNumber, quotedNumber } from '../../numerics/numberWords';
import { latitudeRateAt, type ShapeRates } from '../shapeRates';
import type { Condition, ConditionContext, Prepared } from './condition';

export interface NodalPeriodInput {
  readonly kind: 'nodalPeriod';
  /** From ascending node to ascending node. */
  readonly s: number;
}

export function nodalPeriod({ s }: NodalPeriodInput, { body }: ConditionContext): Prepared {
  if (!(typeof s === 'number' && s > 0 && s < Infinity)) {
    return {
      ok: false,
      kind: 'badInput',
      text: `A nodal period has to be more than 0 s, but it is ${quotedNumber(s)}.`,
    };
  }
  const condition: Condition = {
    kind: 'nodalPeriod',
    label: `Nodal period ${write(s)}`,
    formula: '2π / (Ṁ + ω̇) = given period',
    family: 'period',
    target: s,
    measure,
    scale: (shape, theta) => s + measure(shape, theta),
    write,
    quantity: 'nodal period',
    notes: [],
    axisGuessKm: Math.cbrt(body.muKm3PerS2 * (s / twoPi) ** 2),
  };
  return { ok: true, condition };
}

function measure(shape: ShapeRates, theta: number): number {
  return twoPi / latitudeRateAt(shape, theta);
}

function write(seconds: number, more = 0): string {
  return `${formatNumber(seconds / 60, { digits: 3 + more })} min`;
}
