/** Drift of node, perigee and local time: rates now, never a claim about years ahead. */
import { secondsPerDay, twoPi } from '../../numerics/angles';
import { localTimeDriftSPerS } from '../../orbit/localTime';
import { periods } from '../../orbit/periods';
import { secularRates } from '../../orbit/secularRates';
import { add, type Expr, frac, group, mul, neg, num } from '../formula';
import { rateWorking } from '../workings/build';
import type { LineSpec } from '../workings/working';
import type { Alternate, ReadingPoint, ReadingSpec } from './reading';
import { noRotation, twoPiExpr } from './time';

const perDay = (rate: Expr | string): Expr => mul(rate, num(secondsPerDay, '86400'), frac(180, num(Math.PI, 'π')));

function rateAlternates({ body, mean }: ReadingPoint, value: number): readonly Alternate[] {
  const perRevolution = value * periods(body, mean, 'second').nodalS;
  return [
    { label: 'Per revolution', quantity: 'smallAngle', value: perRevolution },
    { label: 'Per day', quantity: 'angleRate', value, unit: 'deg/day' },
    { label: 'Per year', quantity: 'angleRate', value, unit: 'deg/yr' },
  ];
}

/** A perigee that takes longer than this to go round stands still for every purpose here. */
export const stationaryYears = 1000;
const stationaryS = stationaryYears * 365.25 * secondsPerDay;

export const driftReadings: readonly ReadingSpec[] = [
  {
    id: 'nodeRate',
    label: 'Node rate',
    symbol: 'Ω̇',
    quantity: 'angleRate',
    mark: 'node',
    ordered: true,
    evaluate: ({ body, mean }, theory) => secularRates(body, mean, theory).nodeRadPerS,
    alternates: rateAlternates,
    working: (point) =>
      rateWorking(point, { rates: ['nodeRate'], closing: [['nodePerDay', perDay('nodeRate')]], result: 'nodeRate' }),
  },
  {
    id: 'perigeeRate',
    label: 'Perigee rate',
    symbol: 'ω̇',
    quantity: 'angleRate',
    mark: 'perigee',
    ordered: true,
    evaluate: ({ body, mean }, theory) => secularRates(body, mean, theory).perigeeRadPerS,
    alternates: rateAlternates,
    working: (point) =>
      rateWorking(point, {
        rates: ['perigeeRate'],
        closing: [['perigeePerDay', perDay('perigeeRate')]],
        result: 'perigeeRate',
      }),
  },
  {
    id: 'apsidalPeriod',
    label: 'Apsidal period',
    symbol: 'T_ω',
    quantity: 'longDuration',
    mark: 'perigee',
    ordered: true,
    evaluate: ({ body, mean }, theory) => twoPi / Math.abs(secularRates(body, mean, theory).perigeeRadPerS),
    remark: (_, value) =>
      value > stationaryS
        ? `Perigee stands still now: no turn within ${stationaryYears} years at this rate.`
        : undefined,
    working: apsidalWorking,
  },
  {
    id: 'localTimeDrift',
    label: 'Drift of local time',
    symbol: 'τ̇',
    quantity: 'localTimeDrift',
    mark: 'node',
    ordered: true,
    missing: (point) =>
      point.body.yearDays === null ? `Needs the length of the year of ${point.body.name}.` : noRotation(point),
    evaluate: ({ body, mean }, theory) => {
      const drift = localTimeDriftSPerS(secularRates(body, mean, theory).nodeRadPerS, body);
      return drift ?? Number.NaN;
    },
    working: driftWorking,
  },
];

function apsidalWorking(point: ReadingPoint) {
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

const magnitude: Expr = {
  kind: 'sqrt',
  of: { kind: 'pow', base: { kind: 'sym', id: 'perigeeRate' }, exponent: 2 },
};

function driftWorking(point: ReadingPoint) {
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
