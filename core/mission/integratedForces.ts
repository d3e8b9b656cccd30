/**
 * The forces of the integrated level: the same as the averaged level's, J2 among them, along the true orbit. What the
 * averaged level leaves out for want of a model is left out here too, in the same words.
 */
import type { Body } from '../bodies/body';
import { dragForce } from '../forces/drag';
import type { Force } from '../forces/force';
import { moonPlace, smoothedPlace, sunPlace } from '../forces/skyPlaces';
import { moonForce, sunForce } from '../forces/thirdBody';
import { zonalForce } from '../forces/zonal';
import { historyModel, type LeftOutForce } from './historyForces';
import type { HistoryForces } from './historyRequest';

export interface IntegratedForces {
  /** Besides the central attraction. */
  readonly forces: readonly Force[];
  readonly leftOut: readonly LeftOutForce[];
}

export function integratedForces(body: Body, asked: HistoryForces, epochJdUtc: number): IntegratedForces {
  const { leftOut } = historyModel(body, asked, epochJdUtc);
  const acts = (force: LeftOutForce['force']) => !leftOut.some((each) => each.force === force);
  const forces: Force[] = [];
  const degree = Math.min(asked.zonalDegree, body.zonals.length - 1);
  if (degree >= 2) forces.push(zonalForce(body, { from: 2, to: degree }));
  // The integrator asks for a new date each time: the places are read from a cubic.
  if (asked.sun && acts('sun')) forces.push(sunForce(epochJdUtc, smoothedPlace(sunPlace(epochJdUtc), epochJdUtc)));
  if (asked.moon && acts('moon')) forces.push(moonForce(epochJdUtc, smoothedPlace(moonPlace(epochJdUtc), epochJdUtc)));
  if (asked.drag && acts('drag')) forces.push(dragForce(body, asked.drag, { along: 'true' }));
  return { forces, leftOut };
}
