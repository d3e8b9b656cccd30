/**
 * Orbital elements, always marked mean or osculating, so that the two never mix.
 *
 * Frame: inertial, equator and equinox of the orbit's epoch. Angles in rad, lengths in km.
 * At i = 0 or 180° the node is set to 0 by convention; at e = 0 the perigee is set to 0.
 */
export interface KeplerianElements {
  readonly semiMajorAxisKm: number;
  readonly eccentricity: number;
  readonly inclinationRad: number;
  /** Right ascension of the ascending node. */
  readonly nodeRad: number;
  /** Argument of perigee. */
  readonly perigeeRad: number;
  readonly meanAnomalyRad: number;
}

/** Brouwer's mean elements: the first-order short-period J2 terms removed. */
export interface MeanElements extends KeplerianElements {
  readonly kind?: 'mean';
}

/** Elements of the two-body orbit through one position and velocity. */
export interface OsculatingElements extends KeplerianElements {
  readonly kind: 'osculating';
}

/** Position and velocity in the inertial equatorial frame, three components each. */
export interface StateVector {
  readonly positionKm: readonly [number, number, number];
  readonly velocityKmPerS: readonly [number, number, number];
}

/** Which order of the closed form: J2 alone, or J2 + J2² + J4. */
export type Theory = 'first' | 'second';
