/** Workings of periods, revolutions and the ground below. */
import { secularRates } from '../../orbit/secularRates';
import { add, frac, group, mul, neg, num } from '../formula';
import type { ReadingPoint } from '../readings/reading';
import { rotationOf } from '../readings/time';
import { plainWorking, rateWorking, twoPiExpr } from './build';
import { meanMotion } from './rates';
import type { LineSpec } from './working';

const minutes = (of: 'keplerian' | 'anomalistic' | 'nodal'): LineSpec => ['minutes', frac(of, 60)];
const nodalPeriod: LineSpec = ['nodal', frac(twoPiExpr, add('anomalyRate', 'perigeeRate'))];

export const timeWorkings = {
  keplerianPeriod: (point: ReadingPoint) =>
    plainWorking(point, {
      inputs: { a: point.mean.semiMajorAxisKm },
      constants: ['mu'],
      lines: [meanMotion, ['keplerian', frac(twoPiExpr, 'n')], minutes('keplerian')],
      result: 'keplerian',
      note: 'Two bodies only: the period that the mean semi-major axis would have without J2.',
    }),
  anomalisticPeriod: (point: ReadingPoint) =>
    rateWorking(point, {
      rates: ['anomalyRate'],
      closing: [['anomalistic', frac(twoPiExpr, 'anomalyRate')], minutes('anomalistic')],
      result: 'anomalistic',
      note: 'Perigee to perigee.',
    }),
  nodalPeriod: (point: ReadingPoint) =>
    rateWorking(point, {
      rates: ['perigeeRate', 'anomalyRate'],
      closing: [nodalPeriod, minutes('nodal')],
      result: 'nodal',
      note: 'Ascending node to ascending node.',
    }),
  revolutionsPerDay: (point: ReadingPoint) =>
    rateWorking(point, {
      rates: ['perigeeRate', 'anomalyRate'],
      closing: [nodalPeriod, ['revolutions', frac('day', 'nodal')]],
      constants: ['day'],
      result: 'revolutions',
      note: 'Nodal revolutions in a day of 86 400 s.',
    }),
  revolutionsPerNodalDay: (point: ReadingPoint) =>
    rateWorking(point, {
      rates: ['nodeRate', 'perigeeRate', 'anomalyRate'],
      closing: [nodalPeriod, nodalDayLine(point), ['revolutions', frac('nodalDay', 'nodal')]],
      constants: ['bodyRate'],
      result: 'revolutions',
      note: 'A nodal day is one turn of the body under the orbit plane; a whole ratio closes the ground track.',
    }),
  westwardShift: (point: ReadingPoint) =>
    rateWorking(point, {
      rates: ['nodeRate', 'perigeeRate', 'anomalyRate'],
      closing: [
        nodalPeriod,
        ['shift', mul(group('bodyRate', neg('nodeRate')), 'nodal')],
        ['shiftDegrees', mul('shift', frac(180, num(Math.PI, 'π')))],
        ['shiftKm', mul('shift', 'Req')],
      ],
      constants: ['bodyRate', 'Req'],
      result: 'shift',
      note: 'How far the body turns under the node in one nodal revolution; at the equator, the angle in rad times the radius.',
    }),
} as const;

/** Counted positive on either sense of rotation. */
function nodalDayLine(point: ReadingPoint): LineSpec {
  const forward = rotationOf(point) > secularRates(point.body, point.mean, 'first').nodeRadPerS;
  return ['nodalDay', frac(twoPiExpr, forward ? add('bodyRate', neg('nodeRate')) : add('nodeRate', neg('bodyRate')))];
}
