/** Which curves of the chart the candidate's conditions keep it on, and which elements they leave free. */
import { type Candidate, type ChartCondition, readConditions, type SettledElement } from '../../../core/index';

export interface Held {
  readonly conditions: readonly ChartCondition[];
  readonly settled: ReadonlySet<SettledElement>;
}

/** The critical inclination is held on the side where the orbit is. */
export function heldBy(candidate: Candidate, isForward: boolean): Held {
  const readable = readConditions(candidate).flatMap((each) => (each.ok ? [each] : []));
  return {
    settled: new Set(readable.map(({ entry }) => entry.settles)),
    conditions: readable.flatMap(({ condition }): ChartCondition[] => {
      switch (condition.kind) {
        case 'sunSynchronous':
          return [{ kind: 'sunSynchronous' }];
        case 'perigeeStationary':
          return [{ kind: 'critical', side: isForward ? -1 : 1 }];
        case 'nodeRate':
        case 'sameNodeRate':
          return [condition.radPerS === 0 ? { kind: 'polar' } : { kind: 'nodeRate', radPerS: condition.radPerS }];
        case 'repeat':
          return isCount(condition.revolutions) && isCount(condition.days)
            ? [{ kind: 'repeat', revolutions: condition.revolutions, days: condition.days }]
            : [];
        default:
          return [];
      }
    }),
  };
}

/** A half-typed number, 0 or 14.3, is no track to draw. */
const isCount = (value: number): boolean => Number.isSafeInteger(value) && value >= 1;

export function sameCondition(one: ChartCondition, other: ChartCondition): boolean {
  if (one.kind === 'nodeRate' && other.kind === 'nodeRate') {
    return Math.abs(one.radPerS - other.radPerS) <= 1e-9 * Math.abs(one.radPerS);
  }
  if (one.kind === 'repeat' && other.kind === 'repeat') {
    return one.revolutions * other.days === other.revolutions * one.days;
  }
  if (one.kind === 'critical' && other.kind === 'critical') return one.side === other.side;
  return one.kind === other.kind;
}
