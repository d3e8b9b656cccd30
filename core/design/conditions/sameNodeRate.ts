import type { ConditionContext, Prepared } from './condition';
import { nodeCondition, preparedRate } from './rates';

/** A plane that stays aligned with another orbit's. */
export interface SameNodeRateInput {
  readonly kind: 'sameNodeRate';
  /** Node rate of the other orbit, in the theory that is solved with. */
  readonly radPerS: number;
  /** Name of the other orbit. */
  readonly label?: string;
}

export function sameNodeRate({ radPerS, label }: SameNodeRateInput, { body }: ConditionContext): Prepared {
  return preparedRate(body, radPerS, (rate) =>
    nodeCondition(rate, {
      kind: 'sameNodeRate',
      label: `Same node rate as ${label ?? 'the other orbit'}`,
      formula: 'Ω̇ = Ω̇ of the other orbit',
    }),
  );
}
