/** How an orbit stands to its conditions, for whoever wants to check: what has to hold, what was asked, what it has. */
import type { Body } from '../bodies/body';
import type { MeanElements, Theory } from '../orbit/elements';
import { residualOf } from './conditions/condition';
import { type OrbitCondition, preparedCondition } from './conditions/registry';
import { shapeRates } from './shapeRates';

export interface ConditionWorking {
  readonly kind: string;
  /** Starts with a capital, no full stop. */
  readonly label: string;
  /** What has to hold, in the trade's symbols. */
  readonly formula: string;
  /** The condition's quantity, asked for and of this orbit, with units. */
  readonly quantity: string;
  readonly asked: string;
  readonly reached: string;
  /** (reached − asked) over the condition's scale: 0 where it is met. */
  readonly residual: number;
}

export interface WorkingsInput {
  readonly body: Body;
  readonly theory: Theory;
  /** km, rad. */
  readonly mean: MeanElements;
  readonly conditions: readonly OrbitCondition[];
}

/** One a condition; those that make no sense, or lack a constant of the body, are left out. Errors as `secularRates`. */
export function conditionWorkings({ body, theory, mean, conditions }: WorkingsInput): readonly ConditionWorking[] {
  const shape = shapeRates(body, theory, mean);
  const theta = Math.cos(mean.inclinationRad);
  return conditions.flatMap((wish) => {
    const prepared = preparedCondition(wish, { body, theory });
    if (!prepared.ok) return [];
    const { condition } = prepared;
    const { kind, label, formula, quantity, write, target } = condition;
    const reached = write(condition.measure(shape, theta));
    return [
      { kind, label, formula, quantity, asked: write(target), reached, residual: residualOf(condition, shape, theta) },
    ];
  });
}
