import type { ConditionContext, Prepared } from './condition';
import { perigeeCondition, preparedRate } from './rates';

/** The critical inclination: 63.43° or 116.57° in first order. */
export interface PerigeeStationaryInput {
  readonly kind: 'perigeeStationary';
}

export function perigeeStationary(_input: PerigeeStationaryInput, { body }: ConditionContext): Prepared {
  return preparedRate(body, 0, () =>
    perigeeCondition(0, { kind: 'perigeeStationary', label: 'Perigee stationary', formula: 'ω̇ = 0' }),
  );
}
