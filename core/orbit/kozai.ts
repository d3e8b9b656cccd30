import { gravitySets } from '../bodies/earth';

/**
 * From the Kozai mean motion that two-line elements carry to Brouwer's, and to the semi-major axis.
 *
 * Source: Hoots and Roehrich, Spacetrack Report no. 3 (1980), section 6, the recovery of n₀″ and
 * a₀″; constants of WGS 72, with which the elements are made. Kozai's mean motion holds part of
 * the secular J2 term, so that taking a from it directly is wrong by up to some kilometres.
 */
export interface KozaiInput {
  readonly meanMotionKozaiRadPerS: number;
  readonly eccentricity: number;
  readonly inclinationRad: number;
}

export interface BrouwerSize {
  readonly meanMotionRadPerS: number;
  readonly semiMajorAxisKm: number;
}

/** Needs 0 ≤ e < 1 and a mean motion above 0, rad/s. */
export function brouwerFromKozai({ meanMotionKozaiRadPerS, eccentricity, inclinationRad }: KozaiInput): BrouwerSize {
  const { muKm3PerS2, radiusKm, zonals } = gravitySets.WGS72;
  const k2 = (zonals[2] ?? 0) / 2;
  const shape = (1.5 * k2 * (3 * Math.cos(inclinationRad) ** 2 - 1)) / (1 - eccentricity ** 2) ** 1.5;
  const a1 = Math.cbrt(muKm3PerS2 / meanMotionKozaiRadPerS ** 2) / radiusKm;
  const delta1 = shape / a1 ** 2;
  const a0 = a1 * (1 - delta1 / 3 - delta1 ** 2 - (134 / 81) * delta1 ** 3);
  const meanMotionRadPerS = meanMotionKozaiRadPerS / (1 + shape / a0 ** 2);
  return { meanMotionRadPerS, semiMajorAxisKm: Math.cbrt(muKm3PerS2 / meanMotionRadPerS ** 2) };
}
