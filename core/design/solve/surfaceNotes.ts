import type { Body } from '../../bodies/body';
import { formatNumber } from '../../numerics/numberWords';
import type { MeanElements } from '../../orbit/elements';

/** An orbit that meets its conditions and hits the ground is answered, and said to. */
export function surfaceNotes(body: Body, { semiMajorAxisKm, eccentricity }: MeanElements): readonly string[] {
  const altitudeKm = semiMajorAxisKm * (1 - eccentricity) - body.equatorialRadiusKm;
  if (altitudeKm >= 0) return [];
  return [
    `The orbit meets the ground: its perigee is ${formatNumber(-altitudeKm, { digits: 1 })} km below the surface.`,
  ];
}
