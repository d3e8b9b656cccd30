import { preparedAltitude } from './altitudes';
import type { ConditionContext, Prepared } from './condition';

export interface PerigeeAltitudeInput {
  readonly kind: 'perigeeAltitude';
  /** Above the equatorial radius. */
  readonly km: number;
}

export function perigeeAltitude({ km }: PerigeeAltitudeInput, { body }: ConditionContext): Prepared {
  return preparedAltitude(body, km, { kind: 'perigeeAltitude', name: 'Perigee', side: -1 });
}
