import { preparedAltitude } from './altitudes';
import type { ConditionContext, Prepared } from './condition';

export interface ApogeeAltitudeInput {
  readonly kind: 'apogeeAltitude';
  /** Above the equatorial radius. */
  readonly km: number;
}

export function apogeeAltitude({ km }: ApogeeAltitudeInput, { body }: ConditionContext): Prepared {
  return preparedAltitude(body, km, { kind: 'apogeeAltitude', name: 'Apogee', side: 1 });
}
