/**
 * Elements kept as an orbit frame: regular at e = 0, i = 0 and i = 180°.
 *
 * Node, perigee and anomaly each lose their meaning somewhere; the position direction and the plane
 * never do. An orbit is held as three unit vectors and the eccentricity split along them:
 * `along` points to where a body moving at the mean rate would be (argument of latitude M + ω),
 * `normal` along the angular momentum, `ahead` = normal × along.
 */
import { wrapTwoPi } from '../numerics/angles';
import { combine, cross, type Vec3 } from '../numerics/vectors';
import type { KeplerianElements } from './elements';

export interface OrbitFrame {
  readonly semiMajorAxisKm: number;
  /** e cos M and e sin M. */
  readonly eCosM: number;
  readonly eSinM: number;
  readonly along: Vec3;
  readonly ahead: Vec3;
  readonly normal: Vec3;
}

/** The frame of elements (km, rad). */
export function frameFromElements(elements: KeplerianElements): OrbitFrame {
  const { eccentricity, inclinationRad, nodeRad, perigeeRad, meanAnomalyRad } = elements;
  const [node, across] = nodeFrame(inclinationRad, nodeRad);
  const latitude = perigeeRad + meanAnomalyRad;
  const along = combine(Math.cos(latitude), node, Math.sin(latitude), across);
  const normal = cross(node, across);
  return {
    semiMajorAxisKm: elements.semiMajorAxisKm,
    eCosM: eccentricity * Math.cos(meanAnomalyRad),
    eSinM: eccentricity * Math.sin(meanAnomalyRad),
    along,
    ahead: cross(normal, along),
    normal,
  };
}

/** Unit vectors in the orbit plane: to the ascending node, and 90° ahead of it. */
export function nodeFrame(inclinationRad: number, nodeRad: number): readonly [Vec3, Vec3] {
  const co = Math.cos(nodeRad);
  const so = Math.sin(nodeRad);
  const ci = Math.cos(inclinationRad);
  return [
    [co, so, 0],
    [-so * ci, co * ci, Math.sin(inclinationRad)],
  ];
}

/** The elements (km, rad) of a frame; node 0 where the plane is the equator, perigee 0 where e = 0. */
export function elementsFromFrame(frame: OrbitFrame): KeplerianElements {
  const { normal, along, eCosM, eSinM } = frame;
  const sine = Math.hypot(normal[0], normal[1]);
  const inclinationRad = Math.atan2(sine, normal[2]);
  const nodeRad = sine === 0 ? 0 : wrapTwoPi(Math.atan2(normal[0], -normal[1]));
  const node: Vec3 = [Math.cos(nodeRad), Math.sin(nodeRad), 0];
  const across = cross(normal, node);
  const latitude = Math.atan2(
    along[0] * across[0] + along[1] * across[1] + along[2] * across[2],
    along[0] * node[0] + along[1] * node[1],
  );
  const eccentricity = Math.hypot(eCosM, eSinM);
  const anomaly = eccentricity === 0 ? latitude : Math.atan2(eSinM, eCosM);
  return {
    semiMajorAxisKm: frame.semiMajorAxisKm,
    eccentricity,
    inclinationRad,
    nodeRad,
    perigeeRad: eccentricity === 0 ? 0 : wrapTwoPi(latitude - anomaly),
    meanAnomalyRad: wrapTwoPi(anomaly),
  };
}
