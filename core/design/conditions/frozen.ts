import { degPerRad } from '../../numerics/angles';
import { formatNumber } from '../../numerics/numberWords';
import { frozenOrbit } from '../frozen';
import type { FrozenOrbit, FrozenShape } from '../frozenResult';
import type { Condition, ConditionContext, Prepared, Settled } from './condition';

/** Eccentricity and perigee stand still under the odd zonals; settles both. */
export interface FrozenInput {
  readonly kind: 'frozen';
}

export function frozen(_input: FrozenInput, { body }: ConditionContext): Prepared {
  const settle = (semiMajorAxisKm: number, inclinationRad: number): Settled => {
    const result = frozenOrbit(body, { semiMajorAxisKm, inclinationRad });
    if (result.ok) return { ...result, notes: [foundText(result), ...result.cautions] };
    return { ok: false, converged: result.reason !== 'notConverged', text: result.message };
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
    write,
    quantity: 'eccentricity beyond the frozen one',
    notes: [],
    settle,
  };
  return { ok: true, condition };
}

function foundText({ eccentricity, perigeeRad, degree, hand }: FrozenOrbit): string {
  const handPerigee = hand.perigeeRad === perigeeRad ? '' : ` at ${degreesText(hand)}`;
  return (
    `Frozen: e ${write(eccentricity)}, perigee rests at ${degreesText({ eccentricity, perigeeRad })} ` +
    `(zonals to degree ${degree}); J3 alone gives e ${write(hand.eccentricity)}${handPerigee}.`
  );
}

function degreesText({ perigeeRad }: FrozenShape): string {
  return `${formatNumber(perigeeRad * degPerRad, { digits: 0 })}°`;
}

function write(eccentricity: number): string {
  return formatNumber(eccentricity, { digits: 6 });
}
