/** What the two altitudes share: heights of perigee and apogee above the body's equatorial radius, from mean a and e. */
import type { Body } from '../../bodies/body';
import { formatNumber, quotedNumber } from '../../numerics/numberWords';
import type { Condition, Prepared } from './condition';

export interface Apsis {
  readonly kind: 'perigeeAltitude' | 'apogeeAltitude';
  readonly name: 'Perigee' | 'Apogee';
  /** r/a = 1 + side · e. */
  readonly side: -1 | 1;
}

export function preparedAltitude(body: Body, km: number, { kind, name, side }: Apsis): Prepared {
  if (!(typeof km === 'number' && Number.isFinite(km))) {
    return {
      ok: false,
      kind: 'badInput',
      text: `An altitude has to be a number in km, but it is ${quotedNumber(km)}.`,
    };
  }
  const surfaceKm = body.equatorialRadiusKm;
  const radiusKm = surfaceKm + km;
  if (radiusKm <= 0) {
    const text = `${name} altitude ${write(km)} lies below the centre of ${body.name}, ${write(surfaceKm)} down.`;
    return { ok: false, kind: 'badInput', text };
  }
  const condition: Condition = {
    kind,
    label: `${name} altitude ${write(km)}`,
    formula: `a(1 ${side < 0 ? '−' : '+'} e) − R = given altitude`,
    family: 'altitude',
    target: km,
    measure: ({ semiMajorAxisKm, eccentricity }) => semiMajorAxisKm * (1 + side * eccentricity) - surfaceKm,
    scale: () => radiusKm,
    write,
    quantity: `${name.toLowerCase()} altitude`,
    notes: [],
    axisKmAt: (eccentricity) => radiusKm / (1 + side * eccentricity),
    eccentricityAt: (semiMajorAxisKm) => side * (radiusKm / semiMajorAxisKm - 1),
  };
  return { ok: true, condition };
}

function write(km: number, more = 0): string {
  return `${formatNumber(km, { digits: 3 + more })} km`;
}
