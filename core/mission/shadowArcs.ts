/**
 * Where along one revolution an orbit lies in shadow.
 *
 * The half of the mean ellipse behind the body is searched for every crossing of the cone: none, two, or four where a steep
 * ellipse leaves the shadow and enters it again. Each is then moved to the true orbit, short-period J2 terms included,
 * which stand for some seconds; where the orbit grazes the cone, so that they decide whether there is a shadow at all, the
 * search itself runs on the true orbit.
 */
import type { Body } from '../bodies/body';
import type { SunSeen } from '../bodies/sunSeenFrom';
import { rootsOnGrid } from '../numerics/roots';
import type { MeanElements } from '../orbit/elements';
import { meanFromTrue } from '../orbit/kepler';
import { stateFromMean } from '../orbit/meanState';
import { type Cone, gapAt, gapOnEllipse, type LitOrbit, litOrbit, type ShadowPart, shadowCone } from './shadow';

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

/** The arcs of one revolution of mean elements under the Sun seen so, in order. */
export function shadowArcs(body: Body, mean: MeanElements, sun: SunSeen, part: ShadowPart): readonly ShadowArc[] {
  const cone = shadowCone(body, sun, part);
  const orbit = litOrbit(mean, sun);
  if (passesBy(orbit, cone)) return [];
  const anomalyAt = (phi: number) => meanFromTrue(phi - orbit.perigeeRad, orbit.eccentricity);
  const trueGap = (phi: number) =>
    gapAt(stateFromMean(body, { ...mean, meanAnomalyRad: anomalyAt(phi) }).positionKm, sun, cone);
  const crossings = crossingsOf(orbit, cone, trueGap);
  const arcs: ShadowArc[] = [];
  for (let index = 0; index + 1 < crossings.length; index += 2) {
    arcs.push({ fromRad: anomalyAt(crossings[index] as number), toRad: anomalyAt(crossings[index + 1] as number) });
  }
  return arcs;
}

/** The orbit's least distance from the axis of the shadow is at least r sin|β|. */
function passesBy({ sinBeta, parameterKm, eccentricity }: LitOrbit, { sizeKm, widening }: Cone): boolean {
  const [perigeeKm, apogeeKm] = [parameterKm / (1 + eccentricity), parameterKm / (1 - eccentricity)];
  const widest = sizeKm + Math.max(0, widening) * apogeeKm;
  return perigeeKm * (Math.abs(sinBeta) - grazing) > widest;
}

function crossingsOf(orbit: LitOrbit, cone: Cone, trueGap: (phi: number) => number): readonly number[] {
  const grid = gridFor(orbit.eccentricity);
  let least = Infinity;
  const onEllipse = (phi: number) => {
    const gap = gapOnEllipse(orbit, cone, phi);
    least = Math.min(least, gap);
    return gap;
  };
  const { roots } = rootsOnGrid(onEllipse, grid, { touching: 0 });
  if (roots.length === 0 && least > grazing) return [];
  const moved = isSteep(roots) ? movedTo(roots, (phi) => gapOnEllipse(orbit, cone, phi), trueGap) : null;
  return moved ?? rootsOnGrid(trueGap, grid, { touching: 0 }).roots;
}

function isSteep(roots: readonly number[]): boolean {
  if (roots.length === 0 || roots.length % 2 !== 0) return false;
  return roots.every((root, index) => index === 0 || root - (roots[index - 1] as number) > wide);
}

/** The crossings of the true orbit near those of the mean one; null where one of them is not found at once. */
function movedTo(
  roots: readonly number[],
  meanGap: (phi: number) => number,
  trueGap: (phi: number) => number,
): readonly number[] | null {
  const moved: number[] = [];
  for (const root of roots) {
    const slope = (meanGap(root + 1e-4) - meanGap(root - 1e-4)) / 2e-4;
    // One step leaves some 1e-5 rad, a hundredth of a second: the slope hardly differs between the two orbits.
    const move = -trueGap(root) / slope;
    if (!(Math.abs(move) < farthestMove)) return null;
    moved.push(root + move);
  }
  return moved;
}

/** Even in φ, with more points where a steep ellipse makes the distance change fast with it. */
function gridFor(eccentricity: number): Float64Array {
  const points = 1 + 2 * Math.ceil(Math.min(256, 16 / Math.sqrt(1 - eccentricity)));
  return Float64Array.from({ length: points }, (_, index) => Math.PI * (index / (points - 1) - 0.5));
}
