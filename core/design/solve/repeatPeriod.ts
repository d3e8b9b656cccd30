import type { Body } from '../../bodies/body';
import { degPerRad } from '../../numerics/angles';
import { formatNumber } from '../../numerics/numberWords';
import type { MeanElements, Theory } from '../../orbit/elements';
import type { OrbitCondition } from '../conditions/registry';
import { shapeRates } from '../shapeRates';
import type { SolveResult } from './answer';
import { inSentence } from './conflicts';
import { preparedAll } from './prepared';
import type { FreeElement } from './problem';
import { eccentricityText } from './words';

interface Asked {
  readonly body: Body;
  readonly theory: Theory;
  readonly start: MeanElements;
  readonly free: readonly FreeElement[];
  readonly conditions: readonly OrbitCondition[];
}

/** Where a repeat and a nodal period are both asked for: the period that the track takes at the start's e and i. */
export function repeatPeriodText(asked: Asked, solve: (asked: Asked) => SolveResult): string | null {
  const closure = asked.conditions.find(({ kind }) => kind === 'repeat');
  const period = asked.conditions.find(({ kind }) => kind === 'nodalPeriod');
  if (!closure || !period) return null;
  const alone = solve({ ...asked, free: ['semiMajorAxisKm'], conditions: [closure] });
  const prepared = preparedAll([closure, period], asked);
  if (!alone.ok || 'ok' in prepared) return null;
  const [track, wanted] = prepared;
  if (!track || !wanted) return null;
  const { eccentricity, inclinationRad } = alone.mean;
  const needed = wanted.measure(shapeRates(asked.body, asked.theory, alone.mean), Math.cos(inclinationRad));
  const place = `i ${formatNumber(inclinationRad * degPerRad, { digits: 3 })}° and e ${eccentricityText(eccentricity)}`;
  return `At ${place} a ${inSentence(track.label)} takes a nodal period of ${wanted.write(needed)}.`;
}
