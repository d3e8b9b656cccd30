/** What the curves of the chart are called, in labels and in sentences. */
import { type ChartCondition, type ConditionEntry, formatNumber, unitOf } from '../../../core/index';

export interface NameUnits {
  readonly rateUnit: 'degPerDay' | 'degPerYear';
}

const rateUnitOf = ({ rateUnit }: NameUnits) => unitOf('angleRate', rateUnit === 'degPerYear' ? 'deg/yr' : 'deg/day');

/** A round rate, such as "+2", without its unit. */
export function rateNumber(radPerS: number, units: NameUnits): string {
  const value = Number((radPerS * rateUnitOf(units).perCore).toPrecision(9));
  const digits = /\.(\d+)$/.exec(String(value))?.[1]?.length ?? 0;
  return formatNumber(value, { digits: Math.min(digits, 6), plus: true });
}

export const rateSymbol = (units: NameUnits): string => rateUnitOf(units).symbol.replace('deg', '°');

/** Short, for a label beside the curve. */
export function curveLabel(condition: ChartCondition, units: NameUnits): string {
  switch (condition.kind) {
    case 'sunSynchronous':
      return 'Sun-synchronous';
    case 'polar':
      return 'polar';
    case 'critical':
      return 'critical inclination';
    case 'nodeRate':
      return rateNumber(condition.radPerS, units);
    case 'repeat':
      return `${condition.revolutions}/${condition.days}`;
  }
}

/** For a button or the middle of a sentence. */
export function curveName(condition: ChartCondition, units: NameUnits): string {
  if (condition.kind === 'nodeRate') return `node ${rateNumber(condition.radPerS, units)} ${rateSymbol(units)}`;
  return curveLabel(condition, units);
}

/** The wish that keeps an orbit on the curve. */
export function wishOf(condition: ChartCondition): Pick<ConditionEntry, 'kind' | 'texts'> {
  const degPerDay = unitOf('angleRate', 'deg/day').perCore;
  switch (condition.kind) {
    case 'sunSynchronous':
      return { kind: 'sunSynchronous', texts: {} };
    case 'polar':
      return { kind: 'nodeRate', texts: { rate: '0' } };
    case 'critical':
      return { kind: 'perigeeStationary', texts: {} };
    case 'nodeRate':
      return { kind: 'nodeRate', texts: { rate: String(Number((condition.radPerS * degPerDay).toPrecision(9))) } };
    case 'repeat':
      return {
        kind: 'repeat',
        texts: { revolutions: String(condition.revolutions), days: String(condition.days) },
      };
  }
}
