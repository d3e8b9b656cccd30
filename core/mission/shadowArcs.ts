/**
 * Where along one revolution an orbit lies in shadow.
 *
 * The half of the mean ellipse behind the body is searched for every crossing of the cone: none or two on an orbit that clears
 * the surface, more are taken in pairs. Each is then moved to the true orbit, short-period J2 terms included, which stand for
 * some seconds; where the orbit grazes the cone, so that they decide whether there is a shadow at all, the search itself
 * runs on the true orbit.
 */
import type { Body } from '../bodies/body';
import type { SunSeen } from '../bodies/sunSeenFrom';
import { rootsOnGrid } from '../numerics/roots';
import type { MeanElements } from '../orbit/elements';
import { meanFromTrue } from '../orbit/kepler';
import { stateFromMean } from '../orbit/meanState';
import { type Cone, gapAt, gapOnEllipse, type LitOrbit, litOrbit, shadowCone } from './shadow';

/** From entry to exit in mean anomaly, rad, rising; not wrapped. */
export interface ShadowArc {
  readonly fromRad: number;
  readonly toRad: number;
}

/** More than the short-period terms can move a gap: below this the orbit may graze. */
const grazing = 0.01;
/** An arc's crossings are steep enough to be moved one by one if it is wider than this (rad). */
const wide = 0.3;
/** Largest move that is believed, rad. */
const farthestMove = 0.05;

export interface ShadowArcs {
  readonly umbra: readonly ShadowArc[];
  /** Umbra included: from first to last touch. */
  readonly penumbra: readonly ShadowArc[];
}

const noShadow: ShadowArcs = { umbra: [], penumbra: [] };

/** The arcs of one revolution of mean elements under the Sun seen so, in order. */
export function shadowArcs(body: Body, mean: MeanElements, sun: SunSeen): ShadowArcs {
  const orbit = litOrbit(mean, sun);
  const outer = shadowCone(body, sun, 'penumbra');
  if (passesBy(orbit, outer)) return noShadow;
  const anomalyAt = (phi: number) => meanFromTrue(phi - orbit.perigeeRad, orbit.eccentricity);
  const truly = (cone: Cone) => (phi: number) =>
    gapAt(stateFromMean(body, { ...mean, meanAnomalyRad: anomalyAt(phi) }).positionKm, sun, cone);
  const touches = crossingsOf(orbit, outer, truly(outer), null);
  if (touches.phis.length === 0) return noShadow;
  const inner = shadowCone(body, sun, 'umbra');
  const hides = crossingsOf(orbit, inner, truly(inner), touches.shifts);
  return { umbra: arcsBetween(hides.phis, anomalyAt), penumbra: arcsBetween(touches.phis, anomalyAt) };
}

function arcsBetween(phis: readonly number[], anomalyAt: (phi: number) => number): readonly ShadowArc[] {
  const arcs: ShadowArc[] = [];
  for (let index = 0; index + 1 < phis.length; index += 2) {
    arcs.push({ fromRad: anomalyAt(phis[index] as number), toRad: anomalyAt(phis[index + 1] as number) });
  }
  return arcs;
}

/** The orbit's least distance from the axis of the shadow is at least r sin|β|. */
function passesBy({ sinBeta, parameterKm, eccentricity }: LitOrbit, { sizeKm, widening }: Cone): boolean {
  const [perigeeKm, apogeeKm] = [parameterKm / (1 + eccentricity), parameterKm / (1 - eccentricity)];
  const widest = sizeKm + Math.max(0, widening) * apogeeKm;
  return perigeeKm * (Math.abs(sinBeta) - grazing) > widest;
}

interface Crossings {
  /** Where the true orbit crosses the cone, rad, rising. */
  readonly phis: readonly number[];
  /** What the short-period terms add to the gap at each; null where the search ran on the true orbit. */
  readonly shifts: readonly number[] | null;
}

/** `shifts` of the other cone serve for this one too: umbra and penumbra are crossed a few seconds apart. */
function crossingsOf(
  orbit: LitOrbit,
  cone: Cone,
  trueGap: (phi: number) => number,
  shifts: readonly number[] | null,
): Crossings {
  const grid = gridFor(orbit.eccentricity);
  let least = Infinity;
  const meanGap = (phi: number) => {
    const gap = gapOnEllipse(orbit, cone, phi);
    least = Math.min(least, gap);
    return gap;
  };
  const { roots } = rootsOnGrid(meanGap, grid, { touching: 0 });
  if (roots.length === 0 && least > grazing) return { phis: [], shifts: null };
  if (isSteep(roots)) {
    const known = shifts?.length === roots.length ? shifts : roots.map(trueGap);
    const phis = movedBy(known, roots, meanGap);
    if (phis) return { phis, shifts: known };
  }
  return { phis: rootsOnGrid(trueGap, grid, { touching: 0 }).roots, shifts: null };
}

function isSteep(roots: readonly number[]): boolean {
  if (roots.length === 0 || roots.length % 2 !== 0) return false;
  return roots.every((root, index) => index === 0 || root - (roots[index - 1] as number) > wide);
}

/** Where the gap is zero once the shifts are added; null where that is not near. */
function movedBy(
  shifts: readonly number[],
  roots: readonly number[],
  meanGap: (phi: number) => number,
): readonly number[] | null {
  const moved = roots.map((root, index) => {
    const slope = (meanGap(root + 1e-4) - meanGap(root - 1e-4)) / 2e-4;
    // One step leaves some 1e-5 rad, a hundredth of a second: the slope hardly differs between the two orbits.
    return root - (shifts[index] as number) / slope;
  });
  return moved.every((phi, index) => Math.abs(phi - (roots[index] as number)) < farthestMove) ? moved : null;
}

/** Even in φ, with more points where a steep ellipse makes the distance change fast with it. */
function gridFor(eccentricity: number): Float64Array {
  const points = 1 + 2 * Math.ceil(Math.min(256, 16 / Math.sqrt(1 - eccentricity)));
  return Float64Array.from({ length: points }, (_, index) => Math.PI * (index / (points - 1) - 0.5));
}
