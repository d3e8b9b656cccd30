/** The forces that a history averages, and those asked for that this body has no model of. */
import type { Body } from '../bodies/body';
import { dragForce } from '../forces/drag';
import type { Force } from '../forces/force';
import { moonForce, sunForce } from '../forces/thirdBody';
import { zonalForce } from '../forces/zonal';
import type { HistoryForces } from './historyRequest';
import type { OblatenessOrder } from './oblateness';

/** A force that was asked for and does not act. */
export interface LeftOutForce {
  readonly force: 'zonals' | 'sun' | 'moon' | 'drag';
  readonly reason: string;
}

export interface HistoryModel {
  /** J2 in closed form, with its square in a history; alone only in the ledger. */
  readonly oblateness: OblatenessOrder | 'none';
  /** Highest zonal whose product with J2 counts; 0 where there is none. */
  readonly coupledDegree: number;
  /** Averaged by quadrature. */
  readonly forces: readonly Force[];
  readonly leftOut: readonly LeftOutForce[];
}

/** Models of Sun, Moon and air exist for the Earth alone. */
export function historyModel(body: Body, asked: HistoryForces, epochJdUtc: number): HistoryModel {
  const forces: Force[] = [];
  const leftOut: LeftOutForce[] = [];
  const { zonalDegree, sun, moon, drag } = asked;
  const known = body.zonals.length - 1;
  const highest = Math.min(zonalDegree, known);
  const higher = highest >= 3 && body.zonals.some((zonal, n) => n >= 3 && n <= highest && zonal !== 0);
  if (higher) {
    forces.push(zonalForce(body, { from: 3, to: highest }));
  }
  if (zonalDegree > known) {
    leftOut.push({ force: 'zonals', reason: `${body.gravitySet} has zonals to degree ${Math.max(known, 0)} only.` });
  }
  const isEarth = body.id === 'earth';
  const why = (what: string) => `There is no model of ${what} ${body.name} here.`;
  if (sun && isEarth) forces.push(sunForce(epochJdUtc));
  else if (sun) leftOut.push({ force: 'sun', reason: why('the Sun as seen from') });
  if (moon && isEarth) forces.push(moonForce(epochJdUtc));
  else if (moon) leftOut.push({ force: 'moon', reason: why('a moon of') });
  if (drag && isEarth) forces.push(dragForce(body, drag, { along: 'mean' }));
  else if (drag) leftOut.push({ force: 'drag', reason: why('the air of') });
  const oblateness = zonalDegree >= 2 ? 'second' : 'none';
  return { oblateness, coupledDegree: higher ? highest : 0, forces, leftOut };
}
