/** Every kind of condition, once. */
import { type ApogeeAltitudeInput, apogeeAltitude } from './apogeeAltitude';
import type { ConditionContext, Prepared } from './condition';
import { type FrozenInput, frozen } from './frozen';
import { type NodalPeriodInput, nodalPeriod } from './nodalPeriod';
import { type NodeRateInput, nodeRate } from './nodeRate';
import { type PerigeeAltitudeInput, perigeeAltitude } from './perigeeAltitude';
import { type PerigeeRateInput, perigeeRate } from './perigeeRate';
import { type PerigeeStationaryInput, perigeeStationary } from './perigeeStationary';
import { type RepeatInput, repeat } from './repeat';
import { type SameNodeRateInput, sameNodeRate } from './sameNodeRate';
import { type SunSynchronousInput, sunSynchronous } from './sunSynchronous';

export type OrbitCondition =
  | SunSynchronousInput
  | NodeRateInput
  | SameNodeRateInput
  | RepeatInput
  | PerigeeStationaryInput
  | PerigeeRateInput
  | PerigeeAltitudeInput
  | ApogeeAltitudeInput
  | NodalPeriodInput
  | FrozenInput;

type KindTable = {
  readonly [Kind in OrbitCondition['kind']]: (
    input: Extract<OrbitCondition, { kind: Kind }>,
    context: ConditionContext,
  ) => Prepared;
};

const kinds: KindTable = {
  sunSynchronous,
  nodeRate,
  sameNodeRate,
  repeat,
  perigeeStationary,
  perigeeRate,
  perigeeAltitude,
  apogeeAltitude,
  nodalPeriod,
  frozen,
};

export const conditionKinds = Object.keys(kinds) as readonly OrbitCondition['kind'][];

/** The condition that a wish states, or what is wrong with it. */
export function preparedCondition<Kind extends OrbitCondition['kind']>(
  input: Extract<OrbitCondition, { kind: Kind }>,
  context: ConditionContext,
): Prepared {
  const kind = (input as { readonly kind?: unknown } | null)?.kind;
  if (!(typeof kind === 'string' && Object.hasOwn(kinds, kind))) {
    const known = conditionKinds.join(', ');
    return { ok: false, kind: 'badInput', text: `There is no condition of kind ${String(kind)}; known are ${known}.` };
  }
  return (kinds[input.kind as Kind] as (wish: typeof input, context: ConditionContext) => Prepared)(input, context);
}
