/**
 * From what a calculation was asked to take into account to the forces that do it: the same for the averaged and the
 * integrated level. What a body lacks is named, never silently zero.
 */
import type { Body } from '../bodies/body';
import type { Force } from './force';
import { highestZonalDegree, zonalForce } from './zonal';

export interface DragRequest {
  readonly massKg: number;
  readonly areaM2: number;
  readonly dragCoefficient: number;
  /** Level of the atmosphere, or a factor on the mean one. */
  readonly density: 'low' | 'mean' | 'high' | number;
}

export interface ForceRequest {
  /** Highest zonal, 2 to 14; 0 for a point mass. */
  readonly zonalDegree: number;
  readonly sun: boolean;
  readonly moon: boolean;
  readonly drag?: DragRequest | undefined;
}

/** A force that was asked for and that can't be had. */
export interface ForceLeftOut {
  readonly id: 'sun' | 'moon' | 'drag';
  readonly reason: string;
}

export interface ForcesFound {
  readonly forces: readonly Force[];
  readonly leftOut: readonly ForceLeftOut[];
}

/**
 * The forces besides the central attraction. `fromDegree` is 2, or 3 where J2 is taken in closed form.
 *
 * @throws Error for a degree that is not a whole number of 0 or 2 to 14.
 */
export function forcesFor(body: Body, request: ForceRequest, fromDegree: 2 | 3): ForcesFound {
  const { zonalDegree } = request;
  const allowed = zonalDegree === 0 || (zonalDegree >= 2 && zonalDegree <= highestZonalDegree);
  if (!(allowed && Number.isInteger(zonalDegree))) {
    throw new Error(`the zonal degree must be 0 or 2 to ${highestZonalDegree}, got ${zonalDegree}`);
  }
  const forces: Force[] = [];
  if (zonalDegree >= fromDegree) forces.push(zonalForce(body, { from: fromDegree, to: zonalDegree }));
  return { forces, leftOut: [] };
}
