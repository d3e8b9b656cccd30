/** A cycle as typed: N revolutions in D nodal days, brought to lowest terms. */
import { commonDivisor } from '../numerics/integers';
import { formatNumber, formatSignificant } from '../numerics/numberWords';
import type { Cycle } from './closingOrbit';
import { longestCycleDays } from './repeatProblem';

export type CycleResult =
  | {
      readonly ok: true;
      readonly cycle: Cycle;
      /** Says that N and D had a common divisor, and what they were reduced to; null where they had none. */
      readonly note: string | null;
    }
  | { readonly ok: false; readonly field: keyof Cycle; readonly message: string };

/** More revolutions than any body's 400 days hold above its surface. */
const mostRevolutions = 10_000_000;

const limits = {
  revolutions: { most: mostRevolutions, name: 'Revolutions' },
  days: { most: longestCycleDays, name: 'Days' },
} as const;

/** The coprime cycle, or what was expected of the field that is wrong. */
export function readCycle(typed: Cycle): CycleResult {
  for (const field of ['revolutions', 'days'] as const) {
    const value = typed[field];
    const { most, name } = limits[field];
    if (Number.isInteger(value) && value >= 1 && value <= most) continue;
    const got = Number.isFinite(value) ? `, not ${formatSignificant(value)}` : '';
    const message = `${name} of a cycle have to be a whole number from 1 to ${formatNumber(most, { digits: 0 })}${got}.`;
    return { ok: false, field, message };
  }
  const divisor = commonDivisor(typed.revolutions, typed.days);
  const cycle = { revolutions: typed.revolutions / divisor, days: typed.days / divisor };
  const from = `${typed.revolutions} revolutions in ${typed.days} days`;
  const note =
    divisor === 1 ? null : `${from} close already after ${cycle.revolutions} in ${cycle.days}: that cycle is taken.`;
  return { ok: true, cycle, note };
}
