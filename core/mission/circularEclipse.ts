/**
 * Shadow of a circular orbit behind a cylinder, in closed form: the working behind the eclipse, and a check on it.
 *
 * f = (1/π) acos(√(h² + 2Rh) / ((R + h) cos β)), none where sin|β| ≥ R/(R + h). Source: Wertz, Space Mission Analysis and
 * Design, section 5.1 (from memory).
 */
export interface CircularShadow {
  readonly radiusKm: number;
  readonly heightKm: number;
  readonly betaRad: number;
}

/** Share of a revolution in shadow, 0 to 1; needs a height above 0. */
export function circularEclipseShare({ radiusKm, heightKm, betaRad }: CircularShadow): number {
  const cosine = Math.sqrt(heightKm * (heightKm + 2 * radiusKm)) / ((radiusKm + heightKm) * Math.cos(betaRad));
  return cosine >= 1 ? 0 : Math.acos(cosine) / Math.PI;
}

/** |β| (rad) from which a circular orbit of this height has no eclipse. */
export function eclipseFreeBetaRad({ radiusKm, heightKm }: Omit<CircularShadow, 'betaRad'>): number {
  return Math.asin(radiusKm / (radiusKm + heightKm));
}
