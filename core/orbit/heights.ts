/**
 * Height above the reference ellipsoid along one revolution.
 *
 * Positions are osculating (mean elements with the short-period J2 terms put back), because those move
 * the height by kilometres; perigee and node are held for the one revolution.
 */
import type { Body } from '../bodies/body';
import type { Vec3 } from '../numerics/vectors';
import type { MeanElements } from './elements';
import { meanFromTrue } from './kepler';
import { stateFromMean } from './meanState';

export interface HeightRange {
  readonly leastKm: number;
  readonly greatestKm: number;
}

/** Turns of the height near its extremes are slower than this many samples a revolution can miss. */
const samples = 72;

/** Least and greatest height (km) over one revolution. Errors as `stateFromMean`. */
export function heightsAlongOrbit(body: Body, mean: MeanElements): HeightRange {
  const heightAt = (index: number) => {
    const meanAnomalyRad = sampledAnomalyRad(index, mean.eccentricity);
    return ellipsoidHeightKm(body, stateFromMean(body, { ...mean, meanAnomalyRad }).positionKm);
  };
  const heights = Array.from({ length: samples }, (_, index) => heightAt(index));
  const lowest = heights.indexOf(Math.min(...heights));
  const highest = heights.indexOf(Math.max(...heights));
  return {
    leastKm: refinedExtreme(heightAt, lowest),
    greatestKm: refinedExtreme(heightAt, highest),
  };
}

/**
 * Mean anomaly (rad) of a sample, rising evenly with the true anomaly on the half of the plane that perigee lies in and with
 * the eccentric anomaly on the other: an even pace in time would leap over the perigee of a steep ellipse.
 */
function sampledAnomalyRad(index: number, eccentricity: number): number {
  const half = samples / 2;
  const fromPerigee = index - samples * Math.round(index / samples);
  if (Math.abs(fromPerigee) <= half / 2) return meanFromTrue((Math.PI * fromPerigee) / half, eccentricity);
  // E where the true anomaly is 90°, and evenly on from there to apogee.
  const side = Math.acos(eccentricity);
  const share = (Math.abs(fromPerigee) - half / 2) / (half / 2);
  const eccentric = Math.sign(fromPerigee) * (side + (Math.PI - side) * share);
  return eccentric - eccentricity * Math.sin(eccentric);
}

/** Vertex of parabolas through three points, the spacing shrinking each time. */
function refinedExtreme(heightAt: (index: number) => number, start: number): number {
  let centre = start;
  let value = heightAt(start);
  for (const spacing of [1, 0.3, 0.1]) {
    const before = heightAt(centre - spacing);
    const after = heightAt(centre + spacing);
    const curvature = before - 2 * value + after;
    if (curvature === 0) return value;
    // The vertex is trusted no further than the three points reach.
    const shift = Math.max(-1, Math.min(1, (before - after) / (2 * curvature)));
    centre += spacing * shift;
    value = heightAt(centre);
  }
  return value;
}

/**
 * Height (km) of a point (km, equatorial axes) above the body's ellipsoid, along its normal.
 *
 * Fixed-point iteration on the geodetic latitude; it gains a factor of about the flattening a step.
 * Source: Vallado, Fundamentals of Astrodynamics and Applications, 4th ed., algorithm 12 (from memory).
 */
export function ellipsoidHeightKm(body: Body, position: Vec3): number {
  const e2 = body.flattening * (2 - body.flattening);
  const across = Math.hypot(position[0], position[1]);
  const z = position[2];
  let latitude = Math.atan2(z, across * (1 - e2));
  let normalRadius = body.equatorialRadiusKm;
  for (let step = 0; step < 40; step += 1) {
    normalRadius = body.equatorialRadiusKm / Math.sqrt(1 - e2 * Math.sin(latitude) ** 2);
    const next = Math.atan2(z + normalRadius * e2 * Math.sin(latitude), across);
    const change = Math.abs(next - latitude);
    latitude = next;
    if (change < 1e-14) break;
  }
  const c = Math.cos(latitude);
  const s = Math.sin(latitude);
  // across·cos + z·sin − N(1 − e² sin²), good at the poles and the equator alike.
  return across * c + z * s - normalRadius * (1 - e2 * s * s);
}
