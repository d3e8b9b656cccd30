/**
 * Frozen orbits: the eccentricity, with perigee at 90° or 270°, that zonals leave where it is.
 *
 * The eccentricity vector (e cos ω, e sin ω) stands still. With perigee on the axis of symmetry e sin ω does so by
 * itself; what is solved is d(e cos ω)/dt = 0 for the signed value e sin ω. Rates: J2 and J2² in closed form (the
 * secular part and the long-period part, which at small e are equally large) and J3 to J14 averaged by Gauss. Products
 * of J2 with J3 and above are left out, about a thousandth of e.
 *
 * For comparison by hand, J3 and J2 alone: e = −(J3/2J2)(R/a) sin i, from Kaula's long-period term of J3 (Cook, Planet.
 * Space Sci. 14, 433 (1966), from memory).
 */
import type { Body } from '../bodies/body';
import { highestZonalDegree } from '../forces/zonal';
import { type FrozenInput, frozenCautions, frozenObstacle, surfaceKm } from './frozenChecks';
import { type FrozenResult, type FrozenShape, refuse } from './frozenResult';
import { nearestRoot } from './nearestRoot';
import { perigeeMotion } from './perigeeMotion';

export interface FrozenOptions {
  /** Highest degree of the zonals, 3 to 14; 14 if left out. */
  readonly toDegree?: number;
}

type Motion = ReturnType<typeof perigeeMotion>;

/**
 * The frozen orbit of this semi-major axis (km) and inclination (rad), mean elements, inertial equatorial frame.
 *
 * Of several solutions the one of smallest e; or the reason why there is none: input out of range, J2 or J3 unknown,
 * orbit inside the body, within 2.5° of the critical inclination, no solution with its perigee above the surface.
 */
export function frozenOrbit(
  body: Body,
  input: FrozenInput,
  { toDegree = highestZonalDegree }: FrozenOptions = {},
): FrozenResult {
  const obstacle = frozenObstacle(body, input);
  if (obstacle) return obstacle;
  const degree = Math.min(toDegree, body.zonals.length - 1);
  const most = 1 - surfaceKm(body) / input.semiMajorAxisKm;
  const motion = perigeeMotion(body, input, degree);
  const root = nearestRoot((x) => motion({ eCosine: 0, eSine: x }).eCosine, most);
  const hand = handShape(body, input);
  if (root.ok) {
    const stable = goesRound(motion, root.x, most);
    return { ok: true, ...shapeOf(root.x), degree, hand, cautions: frozenCautions(body, input, { degree, stable }) };
  }
  if (root.reason === 'notConverged') {
    return refuse(
      'notConverged',
      `the search for the frozen eccentricity did not converge near ${root.near.toFixed(6)}`,
    );
  }
  return refuse(
    'noSolution',
    `no eccentricity below ${most.toFixed(5)}, where the perigee touches the surface, keeps the perigee still; ` +
      `J3 alone would ask for ${hand.eccentricity.toFixed(5)}`,
  );
}

/** Share of the room for e by which the vector is moved to see whether it comes back. */
const nudgeShare = 1e-4;

/** True where a vector beside the frozen point goes round it; false where it leaves: the rates' slopes of one sign. */
function goesRound(motion: Motion, x: number, most: number): boolean {
  const nudge = nudgeShare * most;
  const across = motion({ eCosine: nudge, eSine: x }).eSine;
  const along = motion({ eCosine: 0, eSine: x + nudge }).eCosine - motion({ eCosine: 0, eSine: x - nudge }).eCosine;
  return across * along < 0;
}

function handShape(body: Body, { semiMajorAxisKm, inclinationRad }: FrozenInput): FrozenShape {
  const share = (-0.5 * (body.zonals[3] ?? 0)) / (body.zonals[2] ?? 0);
  return shapeOf(share * (body.radiusKm / semiMajorAxisKm) * Math.sin(inclinationRad));
}

/** The shape of a signed e sin ω. */
function shapeOf(signed: number): FrozenShape {
  return { eccentricity: Math.abs(signed), perigeeRad: (signed < 0 ? 1.5 : 0.5) * Math.PI };
}
