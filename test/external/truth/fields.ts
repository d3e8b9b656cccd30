/** Earth cut down to J2, or to J2 and J4: once as a body for `core`, once as a field for the integration. */
import { type Body, gravitySets } from '../../../core/index';
import type { ZonalField } from './zonalField';

const earth = gravitySets.EGM2008;

export interface CutField {
  readonly body: Body;
  readonly field: ZonalField;
}

export function cutField(degree: 2 | 4): CutField {
  const j2 = earth.zonals[2] ?? Number.NaN;
  const j4 = degree === 4 ? (earth.zonals[4] ?? Number.NaN) : 0;
  return {
    body: { ...earth, zonals: [0, 0, j2, 0, j4] },
    field: { muKm3PerS2: earth.muKm3PerS2, radiusKm: earth.radiusKm, j2, j4 },
  };
}
