/**
 * A central body: one gravity set kept whole, with the shape, spin and year that go with it.
 *
 * mu, radius and zonals belong together. Numbers of two sets are never mixed, because J_n is
 * defined relative to the set's own reference radius.
 */
export interface Body {
  /** Stable identifier, such as `earth`; `custom` for a body of the user's own. */
  readonly id: string;
  readonly name: string;
  /** Name of the gravity set, such as `EGM2008`. */
  readonly gravitySet: string;
  readonly muKm3PerS2: number;
  /** Reference radius of the gravity set, which J_n refer to. Not the datum of altitudes. */
  readonly radiusKm: number;
  /** `zonals[n]` is the unnormalised J_n; entries 0 and 1 are 0. Absent degrees are not in the set. */
  readonly zonals: readonly number[];
  /** Equatorial radius of the reference ellipsoid: altitudes are counted from here. */
  readonly equatorialRadiusKm: number;
  /** Flattening of the reference ellipsoid; 0 for a sphere. */
  readonly flattening: number;
  /** Sidereal rotation, negative for a retrograde rotator; null where the user gave none. */
  readonly rotationRadPerS: number | null;
  /** Tropical year in days of 86 400 s: one turn of the mean Sun seen from the body; null if unknown. */
  readonly yearDays: number | null;
  /** Where each constant comes from. */
  readonly source: string;
}
