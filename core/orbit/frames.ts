import { earthRotationRadPerS } from '../bodies/earth';
import { type Matrix3, precessionFromJ2000, transform, transpose } from '../bodies/precession';
import { meanSiderealTimeRad } from '../bodies/siderealTime';
import { wrapTwoPi } from '../numerics/angles';
import { add, cross, dot, rotateAboutZ, type Vec3 } from '../numerics/vectors';
import type { KeplerianElements, StateVector } from './elements';

/**
 * Into and out of the working frame: mean equator and equinox of the epoch, held inertial.
 *
 * TEME, the frame of two-line elements, is taken as mean of date: they differ by nutation, 0.005°
 * at most, which is left out everywhere. Earth-fixed is turned by Greenwich mean sidereal time
 * about the mean pole, with UTC as UT1; polar motion (15 m) is left out.
 */
export type InertialFrame = 'meanOfDate' | 'j2000' | 'teme';
export type StateFrame = InertialFrame | 'earthFixed';

export interface FrameAtEpoch<Frame> {
  readonly frame: Frame;
  /** Julian date, UTC. */
  readonly epochJd: number;
}

const earthSpin: Vec3 = [0, 0, earthRotationRadPerS];

/** State, km and km/s, from the frame it was given in to the mean equator and equinox of its epoch. */
export function stateToMeanOfDate(state: StateVector, { frame, epochJd }: FrameAtEpoch<StateFrame>): StateVector {
  if (frame === 'earthFixed') {
    const turnRad = meanSiderealTimeRad(epochJd);
    const spun = add(state.velocityKmPerS, cross(earthSpin, state.positionKm));
    return {
      positionKm: rotateAboutZ(state.positionKm, turnRad),
      velocityKmPerS: rotateAboutZ(spun, turnRad),
    };
  }
  return frame === 'j2000' ? transformState(precessionFromJ2000(epochJd), state) : state;
}

/** The inverse of `stateToMeanOfDate`. */
export function stateFromMeanOfDate(state: StateVector, { frame, epochJd }: FrameAtEpoch<StateFrame>): StateVector {
  if (frame === 'earthFixed') {
    const turnRad = -meanSiderealTimeRad(epochJd);
    const positionKm = rotateAboutZ(state.positionKm, turnRad);
    const spun = cross(earthSpin, positionKm);
    const velocityKmPerS = rotateAboutZ(state.velocityKmPerS, turnRad);
    return { positionKm, velocityKmPerS: add(velocityKmPerS, [-spun[0], -spun[1], -spun[2]]) };
  }
  return frame === 'j2000' ? transformState(transpose(precessionFromJ2000(epochJd)), state) : state;
}

/** Elements from the frame they were given in to the mean equator and equinox of the epoch (Julian date, UTC). */
export function elementsToMeanOfDate<E extends KeplerianElements>(
  elements: E,
  frame: InertialFrame,
  epochJd: number,
): E {
  return frame === 'j2000' ? transformElements(precessionFromJ2000(epochJd), elements) : elements;
}

/** The inverse of `elementsToMeanOfDate`. */
export function elementsFromMeanOfDate<E extends KeplerianElements>(
  elements: E,
  frame: InertialFrame,
  epochJd: number,
): E {
  return frame === 'j2000' ? transformElements(transpose(precessionFromJ2000(epochJd)), elements) : elements;
}

function transformState(matrix: Matrix3, { positionKm, velocityKmPerS }: StateVector): StateVector {
  return { positionKm: transform(matrix, positionKm), velocityKmPerS: transform(matrix, velocityKmPerS) };
}

/** Turns the plane and the line of apsides; size, shape and place on the orbit stay. */
function transformElements<E extends KeplerianElements>(matrix: Matrix3, elements: E): E {
  const { inclinationRad, nodeRad, perigeeRad } = elements;
  const toNode: Vec3 = [Math.cos(nodeRad), Math.sin(nodeRad), 0];
  const normal: Vec3 = [
    Math.sin(inclinationRad) * Math.sin(nodeRad),
    -Math.sin(inclinationRad) * Math.cos(nodeRad),
    Math.cos(inclinationRad),
  ];
  const turnedNormal = transform(matrix, normal);
  const turnedNode = transform(matrix, toNode);
  const tilt = Math.hypot(turnedNormal[0], turnedNormal[1]);
  const newNodeRad = tilt > planeTolerance ? wrapTwoPi(Math.atan2(turnedNormal[0], -turnedNormal[1])) : 0;
  const newToNode: Vec3 = [Math.cos(newNodeRad), Math.sin(newNodeRad), 0];
  // How far the old node's direction now lies ahead of the new node, along the orbit.
  const shiftRad = Math.atan2(dot(cross(turnedNormal, newToNode), turnedNode), dot(newToNode, turnedNode));
  const round = elements.eccentricity === 0;
  return {
    ...elements,
    inclinationRad: Math.atan2(tilt, turnedNormal[2]),
    nodeRad: newNodeRad,
    perigeeRad: round ? 0 : wrapTwoPi(perigeeRad + shiftRad),
    meanAnomalyRad: wrapTwoPi(elements.meanAnomalyRad + (round ? perigeeRad + shiftRad : 0)),
  };
}

/** Below this sine of the inclination the node is lost in rounding and set to 0 by convention. */
const planeTolerance = 1e-14;
