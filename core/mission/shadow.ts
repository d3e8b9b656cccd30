/**
 * The shadow of a sphere lit by the Sun's disc: two cones along the line from the Sun, umbra and penumbra.
 *
 * The sphere has the body's equatorial radius. Flattening (up to 21 km at the Earth's poles) and air, which dims and bends
 * light some tens of km outside, are left out: they pull opposite ways. Sources: Montenbruck and Gill, Satellite Orbits
 * (2000), section 3.4.2, for the cones; Vallado, Fundamentals of Astrodynamics and Applications, 4th ed., section 5.3.3.
 * Both from memory.
 */
import type { Body } from '../bodies/body';
import type { SunSeen } from '../bodies/sunSeenFrom';
import { cross, dot, norm, type Vec3 } from '../numerics/vectors';
import type { MeanElements } from '../orbit/elements';
import { nodeFrame } from '../orbit/orbitFrame';

/** Radius of the Sun, km: nominal, IAU 2015 resolution B3. */
const sunRadiusKm = 695_700;

/** Radius at a distance x behind the centre: size + widening · x. The umbra narrows. */
export interface Cone {
  readonly sizeKm: number;
  readonly widening: number;
}

export type ShadowPart = 'umbra' | 'penumbra';

export function shadowCone(body: Body, sun: SunSeen, part: ShadowPart): Cone {
  const radiusKm = body.equatorialRadiusKm;
  // The umbra's cone touches both globes from outside, the penumbra's between them.
  const sine = (part === 'umbra' ? radiusKm - sunRadiusKm : radiusKm + sunRadiusKm) / sun.distanceKm;
  const cosine = Math.sqrt(1 - sine * sine);
  return { sizeKm: radiusKm / cosine, widening: sine / cosine };
}

/** Distance outside the cone as a share of the distance from the centre; below 0 in the shadow. For points behind the centre. */
export function gapAt(position: Vec3, sun: SunSeen, cone: Cone): number {
  const behindKm = -dot(position, sun.direction);
  const besideKm = norm(cross(position, sun.direction));
  return (besideKm - cone.sizeKm - cone.widening * behindKm) / norm(position);
}

/** A mean orbit laid out against the Sun: angles φ in its plane count from where the body's shadow points. */
export interface LitOrbit {
  readonly cosBeta: number;
  readonly sinBeta: number;
  /** φ of perigee, rad. */
  readonly perigeeRad: number;
  readonly parameterKm: number;
  readonly eccentricity: number;
}

export function litOrbit(mean: MeanElements, sun: SunSeen): LitOrbit {
  const [node, across] = nodeFrame(mean.inclinationRad, mean.nodeRad);
  const alongNode = dot(sun.direction, node);
  const alongAcross = dot(sun.direction, across);
  const eccentricity = mean.eccentricity;
  return {
    cosBeta: Math.hypot(alongNode, alongAcross),
    sinBeta: dot(sun.direction, cross(node, across)),
    perigeeRad: mean.perigeeRad - Math.atan2(-alongAcross, -alongNode),
    parameterKm: mean.semiMajorAxisKm * (1 - eccentricity * eccentricity),
    eccentricity,
  };
}

/** `gapAt` on the mean ellipse at φ (rad), |φ| ≤ 90°. */
export function gapOnEllipse({ cosBeta, perigeeRad, parameterKm, eccentricity }: LitOrbit, cone: Cone, phi: number) {
  const behind = cosBeta * Math.cos(phi);
  const perKm = (1 + eccentricity * Math.cos(phi - perigeeRad)) / parameterKm;
  return Math.sqrt(Math.max(0, 1 - behind * behind)) - cone.sizeKm * perKm - cone.widening * behind;
}
