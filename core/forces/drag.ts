/**
 * Air drag in an atmosphere that turns with the Earth: −½ ρ (Cd A/m) |v_rel| v_rel, v_rel = v − ω × r.
 *
 * Density by height above the ellipsoid. Cd and area are held constant; wind, bulge of the day side and solar cycle are not
 * in it: uncertain by a factor of two and more.
 */
import { airDensityKgPerM3, type DensityLevel, densityFactor, scaleHeightKm } from '../bodies/atmosphere';
import type { Body } from '../bodies/body';
import type { Force } from './force';

/** Mass over drag area: as one number, or as its parts. */
export type DragShape =
  | { readonly ballisticKgPerM2: number }
  | { readonly massKg: number; readonly areaM2: number; readonly dragCoefficient: number };

export type DragInput = DragShape & { readonly density: DensityLevel };

/** m/(Cd A), kg/m². */
export function ballisticKgPerM2(drag: DragShape): number {
  return 'ballisticKgPerM2' in drag ? drag.ballisticKgPerM2 : drag.massKg / (drag.dragCoefficient * drag.areaM2);
}

export interface DragOptions {
  /**
   * What the points lie on: the `true` orbit, or the `mean` one of the averaged level. On the mean one the short-period J2
   * term of the radius is put back before the density is read: it moves the height by up to 10 km.
   */
  readonly along: 'true' | 'mean';
}

/** Drag about a body that has both rotation and the Earth's air. @throws Error where the rotation is unknown. */
export function dragForce(body: Body, drag: DragInput, { along }: DragOptions): Force {
  const { rotationRadPerS } = body;
  if (rotationRadPerS === null) throw new Error('drag needs the rotation of the body');
  // kg/m³ times m²/kg times km²/s² is 1000 times km/s².
  const factor = (-500 * densityFactor(drag.density)) / ballisticKgPerM2(drag);
  const heightOf = along === 'mean' ? heightOnMeanOrbit(body) : (motion: Float64Array) => plainHeightKm(body, motion);
  const add = (sum: Float64Array, motion: Float64Array): void => {
    const vx = (motion[3] as number) + rotationRadPerS * (motion[1] as number);
    const vy = (motion[4] as number) - rotationRadPerS * (motion[0] as number);
    const vz = motion[5] as number;
    const pull = factor * airDensityKgPerM3(heightOf(motion)) * Math.sqrt(vx * vx + vy * vy + vz * vz);
    sum[0] = (sum[0] as number) + pull * vx;
    sum[1] = (sum[1] as number) + pull * vy;
    sum[2] = (sum[2] as number) + pull * vz;
  };
  return { id: 'drag', add, averagingPoints: (a, e) => pointsFor(body, a, e) };
}

/**
 * Density falls from perigee as exp(−(ae/H)(1 − cos E)), whose harmonics die out beyond √(2 ae/H · ln 1/tolerance); the
 * flattening and the layers' corners add some. Doubling changes the rates by less than 1e-4 of themselves (tests).
 */
function pointsFor(body: Body, a: number, e: number): number {
  const perigeeKm = a * (1 - e) - body.equatorialRadiusKm;
  const steepness = (a * e + body.equatorialRadiusKm * body.flattening) / scaleHeightKm(perigeeKm);
  return 4 * Math.ceil((24 + 5 * Math.sqrt(steepness)) / 4);
}

/** Height (km) above the ellipsoid along the radius: 3 m from that along the normal at 500 km. */
function plainHeightKm({ equatorialRadiusKm, flattening }: Body, motion: Float64Array): number {
  const x = motion[0] as number;
  const y = motion[1] as number;
  const z = motion[2] as number;
  const r2 = x * x + y * y + z * z;
  const e2 = flattening * (2 - flattening);
  const polar = equatorialRadiusKm * (1 - flattening);
  return Math.sqrt(r2) - polar / Math.sqrt(1 - (e2 * (x * x + y * y)) / r2);
}

/**
 * The same with the first-order short-period term of the radius (Brouwer 1959, from memory),
 *   δr = (J2 R²/4p) {sin²i cos 2u − (2 − 3 sin²i)(2ηr/p + (p/r − 1)/(1 + η) + 1)},
 * all of which follow from position and velocity.
 */
function heightOnMeanOrbit(body: Body): (motion: Float64Array) => number {
  const { muKm3PerS2: mu, radiusKm } = body;
  const quarter = 0.25 * (body.zonals[2] ?? 0) * radiusKm * radiusKm;
  return (motion) => {
    const [x, y, z] = [motion[0] as number, motion[1] as number, motion[2] as number];
    const [vx, vy, vz] = [motion[3] as number, motion[4] as number, motion[5] as number];
    const r = Math.sqrt(x * x + y * y + z * z);
    const v2 = vx * vx + vy * vy + vz * vz;
    const along = x * vx + y * vy + z * vz;
    const h2 = r * r * v2 - along * along;
    const p = h2 / mu;
    const axial = x * vy - y * vx;
    const sine2 = 1 - (axial * axial) / h2;
    const sineU2 = (z * z) / (r * r);
    // η² = p/a, 1/a = 2/r − v²/μ.
    const eta = Math.sqrt(Math.max(0, p * (2 / r - v2 / mu)));
    const bracket = (2 * eta * r) / p + (p / r - 1) / (1 + eta) + 1;
    const shift = (quarter / p) * (sine2 - 2 * sineU2 - (2 - 3 * sine2) * bracket);
    return plainHeightKm(body, motion) + shift;
  };
}
