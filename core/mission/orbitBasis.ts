/**
 * Unit vectors of the orbit plane that equinoctial elements count longitudes from: `f` at longitude 0, `g` 90° ahead,
 * `w` along the angular momentum. Inertial equatorial frame. Source: as the elements.
 */
import type { Sense } from './equinoctial';

/** Nine numbers: f, g, w. Fills and returns `basis`. */
export function fillOrbitBasis(basis: Float64Array, values: Float64Array, sense: Sense): Float64Array {
  const p = values[3] as number;
  const q = values[4] as number;
  const scale = 1 / (1 + p * p + q * q);
  basis[0] = scale * (1 - p * p + q * q);
  basis[1] = scale * 2 * p * q;
  basis[2] = -scale * 2 * p * sense;
  basis[3] = scale * 2 * p * q * sense;
  basis[4] = scale * (1 + p * p - q * q) * sense;
  basis[5] = scale * 2 * q;
  basis[6] = scale * 2 * p;
  basis[7] = -scale * 2 * q;
  basis[8] = scale * (1 - p * p - q * q) * sense;
  return basis;
}
