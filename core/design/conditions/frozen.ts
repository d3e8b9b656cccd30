import { formatNumber } from '../../numerics/numberWords';
import { frozenOrbit } from '../frozen';
import type { Condition, ConditionContext, Prepared, Settled } from './condition';

/** Eccentricity and perigee stand still under the odd zonals; settles both. */
export interface FrozenInput {
  readonly kind: 'frozen';
}

export function frozen(_input: FrozenInput, { body }: ConditionContext): Prepared {
  const settle = (semiMajorAxisKm: number, inclinationRad: number): Settled => {
    const result = frozenOrbit(body, { semiMajorAxisKm, inclinationRad });
    return result.ok ? result : { ok: false, converged: result.reason !== 'notConverged', text: result.message };
  };
  const condition: Condition = {
    kind: 'frozen',
    label: 'Frozen',
    formula: 'mean rates of e cos ω and e sin ω = 0',
    family: 'frozen',
    target: 0,
    measure: ({ semiMajorAxisKm, eccentricity }, theta) => {
      const held = settle(semiMajorAxisKm, Math.acos(Math.min(1, Math.max(-1, theta))));
      return held.ok ? eccentricity - held.eccentricity : Number.NaN;
    },
    scale: () => 1,
    write: (value) => formatNumber(value, { digits: 6 }),
    quantity: 'eccentricity beyond the frozen one',
    notes: [],
    settle,
  };
  return { ok: true, condition };
}
