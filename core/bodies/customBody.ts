import type { Body } from './body';

export interface CustomBodyInput {
  readonly name: string;
  readonly muKm3PerS2: number;
  /** Reference radius of the zonals, km. */
  readonly radiusKm: number;
  /** `zonals[n]` is the unnormalised J_n; entries 0 and 1 are ignored; a degree that is not known is absent. */
  readonly zonals: readonly number[];
  /** Datum of altitudes, km; the reference radius if left out. */
  readonly equatorialRadiusKm?: number | undefined;
  /** Flattening of the datum; a sphere if left out. */
  readonly flattening?: number | undefined;
  /** Sidereal rotation, rad/s, negative for a retrograde rotator; unknown if left out. */
  readonly rotationRadPerS?: number | null | undefined;
  /** Year in days of 86 400 s; unknown if left out. */
  readonly yearDays?: number | null | undefined;
}

/**
 * A body of the user's own. What is not given stays null, so that nothing that needs a rotation
 * or a year is computed from a guess. Throws on a μ or radius that is not a positive number:
 * texts are checked, field by field, before they get here.
 */
export function customBody(input: CustomBodyInput): Body {
  requirePositive('muKm3PerS2', input.muKm3PerS2);
  requirePositive('radiusKm', input.radiusKm);
  return {
    id: 'custom',
    name: input.name,
    gravitySet: 'user',
    muKm3PerS2: input.muKm3PerS2,
    radiusKm: input.radiusKm,
    zonals: input.zonals.map((zonal, n) => (n < 2 ? 0 : zonal)),
    equatorialRadiusKm: input.equatorialRadiusKm ?? input.radiusKm,
    flattening: input.flattening ?? 0,
    rotationRadPerS: input.rotationRadPerS ?? null,
    yearDays: input.yearDays ?? null,
    source: 'As typed by the user.',
  };
}

function requirePositive(name: string, value: number): void {
  if (!(value > 0 && Number.isFinite(value))) {
    throw new Error(`customBody: ${name} must be a positive number, got ${value}`);
  }
}
