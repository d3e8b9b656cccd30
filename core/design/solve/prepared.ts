import type { Condition, ConditionContext } from '../conditions/condition';
import { type OrbitCondition, preparedCondition } from '../conditions/registry';
import { type NoOrbit, noOrbit } from './answer';

/** The conditions that wishes state, in their order; or what is wrong with the first that states none. */
export function preparedAll(
  wishes: readonly OrbitCondition[],
  context: ConditionContext,
): readonly Condition[] | NoOrbit {
  const ready: Condition[] = [];
  for (const [place, wish] of wishes.entries()) {
    const prepared = preparedCondition(wish, context);
    if (!prepared.ok) return noOrbit(prepared.kind, prepared.text, [place]);
    ready.push(prepared.condition);
  }
  return ready;
}
