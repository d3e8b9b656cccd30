/** The order in which the effects ledger switches forces on, and the model that each stage ends with. */
import type { Body } from '../bodies/body';
import { type HistoryModel, historyModel } from './historyForces';
import type { HistoryForces, HistoryRequest } from './historyRequest';

/** In this order; those that are not asked for, or cannot be had, are not there. */
export type LedgerEffect = 'j2' | 'j2SquareAndJ4' | 'evenZonals' | 'oddZonals' | 'sun' | 'moon' | 'drag' | 'precession';

export interface LedgerStage {
  readonly effect: LedgerEffect;
  readonly body: Body;
  /** Everything switched on so far. */
  readonly model: HistoryModel;
}

/** The body with the zonals above J2 that pass. */
function sieved(body: Body, passes: (degree: number) => boolean): Body {
  return { ...body, zonals: body.zonals.map((zonal, n) => (n <= 2 || passes(n) ? zonal : 0)) };
}

export function ledgerStages({ body, forces, epochJd }: HistoryRequest): readonly LedgerStage[] {
  const stages: LedgerStage[] = [];
  const add = (effect: LedgerEffect, part: Body, on: HistoryForces, oblateness?: 'first') => {
    const model = historyModel(part, on, epochJd);
    stages.push({ effect, body: part, model: oblateness ? { ...model, oblateness } : model });
  };
  const { zonalDegree } = forces;
  const zonals = (degree: number): HistoryForces => ({ zonalDegree: degree, sun: false, moon: false });
  if (zonalDegree >= 2) {
    add('j2', body, zonals(2), 'first');
    const squareAndJ4 = sieved(body, (n) => n === 4);
    add('j2SquareAndJ4', squareAndJ4, zonals(zonalDegree >= 4 ? 4 : 2));
    const has = (passes: (n: number) => boolean) =>
      body.zonals.some((zonal, n) => n >= 3 && n <= zonalDegree && zonal !== 0 && passes(n));
    if (has((n) => n >= 6 && n % 2 === 0))
      add(
        'evenZonals',
        sieved(body, (n) => n % 2 === 0),
        zonals(zonalDegree),
      );
    if (has((n) => n % 2 === 1)) add('oddZonals', body, zonals(zonalDegree));
  }
  const isEarth = body.id === 'earth';
  let on = zonals(zonalDegree);
  for (const effect of ['sun', 'moon', 'drag'] as const) {
    if (!forces[effect] || !isEarth) continue;
    on = { ...on, [effect]: forces[effect] };
    add(effect, body, on);
  }
  return stages;
}
