import type { ConditionContext, Prepared } from './condition';
import { nodeCondition, preparedRate, rateWords } from './rates';

export interface NodeRateInput {
  readonly kind: 'nodeRate';
  /** Of the ascending node, inertial, positive eastwards. */
  readonly radPerS: number;
}

export function nodeRate({ radPerS }: NodeRateInput, { body }: ConditionContext): Prepared {
  return preparedRate(body, radPerS, (rate) =>
    nodeCondition(rate, { kind: 'nodeRate', label: `Node rate ${rateWords(rate)}`, formula: 'Ω̇ = given rate' }),
  );
}
