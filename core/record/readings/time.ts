/** Periods, revolutions and the ground below: everything counted in time. */
import { secondsPerDay } from '../../numerics/angles';
import { periods } from '../../orbit/periods';
import { secularRates } from '../../orbit/secularRates';
import { add, type Expr, frac, group, mul, neg, num } from '../formula';
import { plainWorking, rateWorking } from '../workings/build';
import { meanMotion } from '../workings/rates';
import type { LineSpec } from '../workings/working';
import type { ReadingPoint, ReadingSpec } from './reading';

export const twoPiExpr: Expr = mul(2, num(Math.PI, 'π'));
const minutes = (of: 'keplerian' | 'anomalistic' | 'nodal'): LineSpec => ['minutes', frac(of, 60)];
const nodalPeriod: LineSpec = ['nodal', frac(twoPiExpr, add('anomalyRate', 'perigeeRate'))];

export function noRotation({ body }: ReadingPoint): string | null {
  return body.rotationRadPerS === null ? `Needs the length of the day of ${body.name}.` : null;
}

function rotation({ body }: ReadingPoint): number {
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
    working: (point) =>
      plainWorking(point, {
        inputs: { a: point.mean.semiMajorAxisKm },
        constants: ['mu'],
        lines: [meanMotion, ['keplerian', frac(twoPiExpr, 'n')], minutes('keplerian')],
        result: 'keplerian',
        note: 'Two bodies only: the period that the mean semi-major axis would have without J2.',
      }),
  },
  {
    ...period,
    id: 'anomalisticPeriod',
    label: 'Anomalistic period',
    symbol: 'Tₐ',
    ordered: true,
    evaluate: ({ body, mean }, theory) => periods(body, mean, theory).anomalisticS,
    working: (point) =>
      rateWorking(point, {
        rates: ['anomalyRate'],
        closing: [['anomalistic', frac(twoPiExpr, 'anomalyRate')], minutes('anomalistic')],
        result: 'anomalistic',
        note: 'Perigee to perigee.',
      }),
  },
  {
    ...period,
    id: 'nodalPeriod',
    label: 'Nodal period',
    symbol: 'Tₙ',
    mark: 'node',
    ordered: true,
    evaluate: ({ body, mean }, theory) => periods(body, mean, theory).nodalS,
    working: (point) =>
      rateWorking(point, {
        rates: ['perigeeRate', 'anomalyRate'],
        closing: [nodalPeriod, minutes('nodal')],
        result: 'nodal',
        note: 'Ascending node to ascending node.',
      }),
  },
  {
    id: 'revolutionsPerDay',
    label: 'Revolutions in 24 h',
    symbol: 'N',
    quantity: 'revolutions',
    mark: 'none',
    ordered: true,
    evaluate: ({ body, mean }, theory) => secondsPerDay / periods(body, mean, theory).nodalS,
    working: (point) =>
      rateWorking(point, {
        rates: ['perigeeRate', 'anomalyRate'],
        closing: [nodalPeriod, ['revolutions', frac('day', 'nodal')]],
        constants: ['day'],
        result: 'revolutions',
        note: 'Nodal revolutions in a day of 86 400 s.',
      }),
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
    working: (point) =>
      rateWorking(point, {
        rates: ['nodeRate', 'perigeeRate', 'anomalyRate'],
        closing: [nodalPeriod, nodalDayLine(point), ['revolutions', frac('nodalDay', 'nodal')]],
        constants: ['bodyRate'],
        result: 'revolutions',
        note: 'A nodal day is one turn of the body under the orbit plane; a whole ratio closes the ground track.',
      }),
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
    working: (point) =>
      rateWorking(point, {
        rates: ['nodeRate', 'perigeeRate', 'anomalyRate'],
        closing: [
          nodalPeriod,
          ['shift', mul(group('bodyRate', neg('nodeRate')), 'nodal')],
          ['shiftKm', mul('shift', 'Req')],
        ],
        constants: ['bodyRate', 'Req'],
        result: 'shift',
        note: 'How far the body turns under the node in one nodal revolution; the angle in rad in the last line.',
      }),
  },
];

function revolutionsPerNodalDay({ body, mean }: ReadingPoint, theory: 'first' | 'second'): number {
  const { nodalDayS, nodalS } = periods(body, mean, theory);
  return nodalDayS === null ? Number.NaN : nodalDayS / nodalS;
}

/** Counted positive on either sense of rotation. */
function nodalDayLine(point: ReadingPoint): LineSpec {
  const forward = rotation(point) > secularRates(point.body, point.mean, 'first').nodeRadPerS;
  return ['nodalDay', frac(twoPiExpr, forward ? add('bodyRate', neg('nodeRate')) : add('nodeRate', neg('bodyRate')))];
}

function westwardShiftRad(point: ReadingPoint, theory: 'first' | 'second'): number {
  const { body, mean } = point;
  return (rotation(point) - secularRates(body, mean, theory).nodeRadPerS) * periods(body, mean, theory).nodalS;
}
