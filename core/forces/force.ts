/**
 * What pulls at an orbit besides the body's central attraction: an acceleration at a point.
 *
 * One interface for the averaged level, which samples it along the mean orbit, and the integrated level,
 * which samples it along the true one. Adding a force is one file that makes one of these.
 */
export interface Force {
  readonly id: string;
  /**
   * Adds its acceleration (km/s²) to `sum[0..2]`.
   *
   * `motion` holds position (km) and velocity (km/s), six numbers; both, as the acceleration, in the inertial
   * equatorial frame of the body at the orbit's epoch. `jd` is the Julian date in UTC. Arrays belong to the caller, who
   * reuses them; a force may remember what depends on `jd` alone.
   */
  readonly add: (sum: Float64Array, motion: Float64Array, jd: number) => void;
  /** Points of eccentric anomaly that an average over one revolution of such an orbit needs. */
  readonly averagingPoints: (semiMajorAxisKm: number, eccentricity: number) => number;
}
