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
import { highestZonalDegree, zonalForce } from '../forces/zonal';
import { averagedRates } from '../mission/averagedRates';
import { equinoctialFromElements, senseOf } from '../mission/equinoctial';
import { type FrozenInput, frozenCautions, frozenObstacle, surfaceKm } from './frozenChecks';
import { type FrozenResult, type FrozenShape, refuse } from './frozenResult';
import { nearestRoot } from './nearestRoot';

export interface FrozenOptions {
  /** Highest degree of the zonals, 3 to 14; 14 if left out. */
  readonly toDegree?: number;
}

/** Inclination below which node and perigee are told apart at this small tilt instead; e is then about 1e-9 as well. */
const leastTiltRad = 1e-6;

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
  const root = nearestRoot(perigeeForce(body, input, degree), most);
  const hand = handShape(body, input);
  if (root.ok) {
    return { ok: true, ...shapeOf(root.x), degree, hand, cautions: frozenCautions(body, input, degree) };
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

/** d(e cos ω)/dt over the mean motion at e sin ω = x, e cos ω = 0. */
function perigeeForce(body: Body, input: FrozenInput, degree: number): (x: number) => number {
  const { semiMajorAxisKm } = input;
  const inclinationRad = Math.min(Math.max(input.inclinationRad, leastTiltRad), Math.PI - leastTiltRad);
  const sense = senseOf(inclinationRad);
  const forces = [zonalForce(body, { from: 3, to: Math.max(degree, 3) })];
  const fillRates = averagedRates({ body, sense, oblateness: 'second', forces });
  const circle = { semiMajorAxisKm, eccentricity: 0, inclinationRad, nodeRad: 0, perigeeRad: 0, meanAnomalyRad: 0 };
  const values = equinoctialFromElements(circle, sense);
  const tilt = values[4] as number;
  const rates = new Float64Array(6);
  return (x) => {
    values[1] = x;
    fillRates(rates, values, 0);
    // With the node at 0 its rate is that of p over q; it turns what longitudes are counted from.
    const nodeRate = (rates[3] as number) / tilt;
    return ((rates[2] as number) + sense * x * nodeRate) / Math.sqrt(body.muKm3PerS2 / semiMajorAxisKm ** 3);
  };
}

function handShape(body: Body, { semiMajorAxisKm, inclinationRad }: FrozenInput): FrozenShape {
  const share = (-0.5 * (body.zonals[3] ?? 0)) / (body.zonals[2] ?? 0);
  return shapeOf(share * (body.radiusKm / semiMajorAxisKm) * Math.sin(inclinationRad));
}

/** The shape of a signed e sin ω. */
function shapeOf(signed: number): FrozenShape {
  return { eccentricity: Math.abs(signed), perigeeRad: (signed < 0 ? 1.5 : 0.5) * Math.PI };
}
