import type { ConditionContext, Prepared } from './condition';
import { perigeeCondition, preparedRate, rateWords } from './rates';

export interface PerigeeRateInput {
  readonly kind: 'perigeeRate';
  /** Of the argument of perigee, counted from the moving node. */
  readonly radPerS: number;
}

export function perigeeRate({ radPerS }: PerigeeRateInput, { body }: ConditionContext): Prepared {
  return preparedRate(body, radPerS, (rate) =>
    perigeeCondition(rate, {
      kind: 'perigeeRate',
      label: `Perigee rate ${rateWords(rate)}`,
      formula: 'ω̇ = given rate',
    }),
  );
}
