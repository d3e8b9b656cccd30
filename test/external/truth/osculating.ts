/**
 * Osculating quantities and Gauss's rates of them, from position and velocity: the tests' own, apart from `core`.
 *
 * Source: Gauss's planetary equations with components along radius, transverse and normal, as in Vallado,
 * Fundamentals of Astrodynamics and Applications, 4th ed., section 9.3 (from memory).
 */
import type { Triple } from './zonalField';

/** Osculating semi-major axis, km (vis-viva). */
export function semiMajorAxisKm(muKm3PerS2: number, position: Triple, velocity: Triple): number {
  return 1 / (2 / Math.hypot(...position) - dot(velocity, velocity) / muKm3PerS2);
}

export interface AngleRates {
  readonly nodeRadPerS: number;
  readonly perigeeRadPerS: number;
  /** Of the true argument of latitude; its long-run mean is that of M + ω. */
  readonly latitudeRadPerS: number;
}

/** Rates of the osculating node, argument of perigee and argument of latitude. */
export function angleRates(mu: number, position: Triple, velocity: Triple, perturbation: Triple): AngleRates {
  const momentum = cross(position, velocity);
  const h = Math.hypot(...momentum);
  const r = Math.hypot(...position);
  const radialSpeed = dot(position, velocity) / r;
  const radial = dot(perturbation, position) / r;
  const normal = dot(perturbation, momentum) / h;
  const transverse = dot(perturbation, cross(momentum, position)) / (h * r);
  const p = (h * h) / mu;
  const sine = Math.hypot(momentum[0], momentum[1]) / h;
  const cosine = momentum[2] / h;
  const latitudeSine = position[2] / (r * sine);
  const eCosF = p / r - 1;
  const eSinF = (radialSpeed * h) / mu;
  const e2 = eCosF * eCosF + eSinF * eSinF;
  const nodeRadPerS = (r * normal * latitudeSine) / (h * sine);
  return {
    nodeRadPerS,
    perigeeRadPerS: (h * (-radial * eCosF + transverse * (1 + r / p) * eSinF)) / (mu * e2) - cosine * nodeRadPerS,
    latitudeRadPerS: h / (r * r) - cosine * nodeRadPerS,
  };
}

export function dot(a: Triple, b: Triple): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
}

export function cross(a: Triple, b: Triple): Triple {
  return [a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]];
}
