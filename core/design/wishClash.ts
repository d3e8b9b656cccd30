/** What can be said of wishes before any of them is solved for. */
import type { ConditionContext } from './conditions/condition';
import type { OrbitCondition } from './conditions/registry';
import { conflictBetween, inSentence } from './solve/conflicts';
import { preparedAll } from './solve/prepared';

/** Why wishes make no sense or cannot both count, in words; null where nothing is known against them. */
export function clashText(wishes: readonly OrbitCondition[], context: ConditionContext): string | null {
  const prepared = preparedAll(wishes, context);
  const problem = 'ok' in prepared ? prepared : conflictBetween(prepared);
  return problem?.reason.text ?? null;
}

/** “Sun-synchronous and node rate −5.0000°/day”; only for wishes that make sense. */
export function wishNames(wishes: readonly OrbitCondition[], context: ConditionContext): string {
  const prepared = preparedAll(wishes, context);
  if ('ok' in prepared) throw new Error(`expected wishes that make sense, got: ${prepared.reason.text}`);
  return prepared.map(({ label }, place) => (place === 0 ? label : inSentence(label))).join(' and ');
}
