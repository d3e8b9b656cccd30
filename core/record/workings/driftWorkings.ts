/** Workings of the drift of node, perigee and local time. */
import { secondsPerDay } from '../../numerics/angles';
import { secularRates } from '../../orbit/secularRates';
import { add, type Expr, frac, group, mul, neg, num, pow, sqrt } from '../formula';
import type { ReadingPoint } from '../readings/reading';
import { rateWorking, twoPiExpr } from './build';
import type { LineSpec, Working } from './working';

const perDay = (rate: string): Expr => mul(rate, num(secondsPerDay, '86400'), frac(180, num(Math.PI, 'π')));

export const driftWorkings = {
  nodeRate: (point: ReadingPoint) =>
    rateWorking(point, { rates: ['nodeRate'], closing: [['nodePerDay', perDay('nodeRate')]], result: 'nodeRate' }),
  perigeeRate: (point: ReadingPoint) =>
    rateWorking(point, {
      rates: ['perigeeRate'],
      closing: [['perigeePerDay', perDay('perigeeRate')]],
      result: 'perigeeRate',
    }),
  apsidalPeriod: apsidalWorking,
  localTimeDrift: localTimeDriftWorking,
} as const;

function apsidalWorking(point: ReadingPoint): Working {
  const first = secularRates(point.body, point.mean, 'first').perigeeRadPerS;
  const second = secularRates(point.body, point.mean, 'second').perigeeRadPerS;
  // The magnitude, written as the square root of the square where the two orders differ in sign.
  const size: Expr =
    first < 0 && second < 0 ? neg('perigeeRate') : first > 0 && second > 0 ? add('perigeeRate') : magnitude;
  return rateWorking(point, {
    rates: ['perigeeRate'],
    closing: [
      ['apsidal', frac(twoPiExpr, size)],
      ['apsidalDays', frac('apsidal', num(secondsPerDay, '86400'))],
    ],
    result: 'apsidal',
    note: 'The time perigee takes to go round 360° at its rate now.',
  });
}

const magnitude: Expr = sqrt(pow('perigeeRate', 2));

function localTimeDriftWorking(point: ReadingPoint): Working {
  const backwards = (point.body.rotationRadPerS ?? 0) < 0;
  const gain = backwards ? group('sunRate', neg('nodeRate')) : group('nodeRate', neg('sunRate'));
  const lines: LineSpec[] = [
    ['sunRate', frac(twoPiExpr, 'year')],
    ['drift', frac(mul(gain, 'day'), twoPiExpr)],
    ['driftPerYear', mul('drift', num(365.25), frac('day', 60))],
  ];
  return rateWorking(point, {
    rates: ['nodeRate'],
    closing: lines,
    constants: ['year', 'day'],
    result: 'drift',
    note: 'The node against the mean Sun, as time of day; per year of 365.25 days.',
  });
}
