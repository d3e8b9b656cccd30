import { secondsPerDay, twoPi } from '../../numerics/angles';
import type { ConditionContext, Prepared } from './condition';
import { nodeCondition, preparedRate } from './rates';

export interface SunSynchronousInput {
  readonly kind: 'sunSynchronous';
}

/** The node goes round once in the body's year, eastwards, as the mean Sun does. */
export function sunSynchronous(_input: SunSynchronousInput, { body }: ConditionContext): Prepared {
  if (body.yearDays === null) {
    return { ok: false, kind: 'missing', text: `Sun-synchronous needs the year of ${body.name}, which is not known.` };
  }
  return preparedRate(body, twoPi / (body.yearDays * secondsPerDay), (rate) =>
    nodeCondition(rate, { kind: 'sunSynchronous', label: 'Sun-synchronous', formula: 'Ω̇ = 2π / year' }),
  );
}
