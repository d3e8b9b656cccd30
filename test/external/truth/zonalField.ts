/**
 * Acceleration in a field of J2 and J4, written out in Cartesian form: the tests' own force code.
 *
 * It shares constants with `core` and nothing else. Source: gradient of
 * U = (μ/r) [1 − Σ J_n (R/r)^n P_n(z/r)], n = 2, 4 (Kaula, Theory of Satellite Geodesy, 1966, §1).
 */
export interface ZonalField {
  readonly muKm3PerS2: number;
  readonly radiusKm: number;
  readonly j2: number;
  readonly j4: number;
}

export type Triple = [number, number, number];

/** What the zonals add to the two-body acceleration, km/s². */
export function perturbingAcceleration(field: ZonalField, x: number, y: number, z: number): Triple {
  const r2 = x * x + y * y + z * z;
  const r = Math.sqrt(r2);
  const s2 = (z * z) / r2;
  const ratio2 = (field.radiusKm * field.radiusKm) / r2;
  const scale = field.muKm3PerS2 / (r2 * r);
  const c2 = 1.5 * field.j2 * ratio2;
  const c4 = 1.875 * field.j4 * ratio2 * ratio2;
  const equatorial = scale * (c2 * (5 * s2 - 1) + c4 * (1 - 14 * s2 + 21 * s2 * s2));
  const axial = scale * (c2 * (5 * s2 - 3) + c4 * (5 - (70 / 3) * s2 + 21 * s2 * s2));
  return [equatorial * x, equatorial * y, axial * z];
}

/** Energy per unit mass (km²/s²) at a position and velocity: constant along a true orbit of the field. */
export function energy(field: ZonalField, [x, y, z]: Triple, [vx, vy, vz]: Triple): number {
  const r = Math.hypot(x, y, z);
  const s2 = (z / r) ** 2;
  const ratio2 = (field.radiusKm / r) ** 2;
  const p2 = 0.5 * (3 * s2 - 1);
  const p4 = 0.125 * (35 * s2 * s2 - 30 * s2 + 3);
  const potential = (field.muKm3PerS2 / r) * (1 - field.j2 * ratio2 * p2 - field.j4 * ratio2 * ratio2 * p4);
  return 0.5 * (vx * vx + vy * vy + vz * vz) - potential;
}
