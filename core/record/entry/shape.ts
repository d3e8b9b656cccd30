import type { Body } from '../../bodies/body';
import type { OrbitEntry } from '../candidate';
import { kmPerNauticalMile } from '../units';

/** Size and shape of the ellipse. */
export interface Shape {
  readonly semiMajorAxisKm: number;
  readonly eccentricity: number;
}

export function kmPerLengthUnit(entry: Pick<OrbitEntry, 'lengthUnit'>): number {
  return entry.lengthUnit === 'NM' ? kmPerNauticalMile : 1;
}

/** Farther out than this no orbit around a planet exists; keeps every formula finite. */
export const largestRadiusKm = 1e9;

/** Altitude of perigee above the body's equatorial radius. */
export function perigeeAltitudeKm(body: Body, shape: Shape): number {
  return shape.semiMajorAxisKm * (1 - shape.eccentricity) - body.equatorialRadiusKm;
}

export function apogeeAltitudeKm(body: Body, shape: Shape): number {
  return shape.semiMajorAxisKm * (1 + shape.eccentricity) - body.equatorialRadiusKm;
}
