/** Periods, revolutions and the ground below: everything counted in time. */
import { secondsPerDay } from '../../numerics/angles';
import { periods } from '../../orbit/periods';
import { secularRates } from '../../orbit/secularRates';
import { inSentence } from '../bodyWords';
import type { ReadingPoint, ReadingSpec } from './reading';

export function noRotation({ body }: ReadingPoint): string | null {
  return body.rotationRadPerS === null ? `Needs the length of the day of ${inSentence(body)}.` : null;
}

/** (rad/s) Throws where `noRotation` has a reason. */
export function rotationOf({ body }: ReadingPoint): number {
  if (body.rotationRadPerS === null) throw new Error(`Expected a rotation of ${body.name}, got none`);
  return body.rotationRadPerS;
}

const period = { quantity: 'duration', mark: 'none' } as const;

export const timeReadings: readonly ReadingSpec[] = [
  {
    ...period,
    id: 'keplerianPeriod',
    label: 'Keplerian period',
    symbol: 'T',
    ordered: false,
    evaluate: ({ body, mean }) => periods(body, mean, 'first').keplerianS,
  },
  {
    ...period,
    id: 'anomalisticPeriod',
    label: 'Anomalistic period',
    symbol: 'Tₐ',
    ordered: true,
    evaluate: ({ body, mean }, theory) => periods(body, mean, theory).anomalisticS,
  },
  {
    ...period,
    id: 'nodalPeriod',
    label: 'Nodal period',
    symbol: 'Tₙ',
    mark: 'node',
    ordered: true,
    evaluate: ({ body, mean }, theory) => periods(body, mean, theory).nodalS,
  },
  {
    id: 'revolutionsPerDay',
    label: 'Revolutions in 24 h',
    symbol: 'N',
    quantity: 'revolutions',
    mark: 'none',
    ordered: true,
    evaluate: ({ body, mean }, theory) => secondsPerDay / periods(body, mean, theory).nodalS,
  },
  {
    id: 'revolutionsPerNodalDay',
    label: 'Revolutions a nodal day',
    symbol: 'Nₙ',
    quantity: 'revolutions',
    mark: 'none',
    ordered: true,
    missing: noRotation,
    evaluate: revolutionsPerNodalDay,
  },
  {
    id: 'westwardShift',
    label: 'Westward shift a revolution',
    symbol: 'Δλ',
    quantity: 'angle',
    mark: 'none',
    ordered: true,
    missing: noRotation,
    evaluate: westwardShiftRad,
    alternates: ({ body }, value) => [
      { label: 'At the equator', quantity: 'length', value: value * body.equatorialRadiusKm },
    ],
  },
];

function revolutionsPerNodalDay({ body, mean }: ReadingPoint, theory: 'first' | 'second'): number {
  const { nodalDayS, nodalS } = periods(body, mean, theory);
  return nodalDayS === null ? Number.NaN : nodalDayS / nodalS;
}

function westwardShiftRad(point: ReadingPoint, theory: 'first' | 'second'): number {
  const { body, mean } = point;
  return (rotationOf(point) - secularRates(body, mean, theory).nodeRadPerS) * periods(body, mean, theory).nodalS;
}
