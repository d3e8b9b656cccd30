/** Drift of node, perigee and local time: rates now, never a claim about years ahead. */
import { secondsPerDay, twoPi } from '../../numerics/angles';
import { localTimeDriftSPerS } from '../../orbit/localTime';
import { periods } from '../../orbit/periods';
import { secularRates } from '../../orbit/secularRates';
import { inSentence } from '../bodyWords';
import { perigeeRateInDoubt } from './doubt';
import type { Alternate, ReadingPoint, ReadingSpec } from './reading';
import { noRotation } from './time';

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
  },
  {
    id: 'apsidalPeriod',
    label: 'Apsidal period',
    symbol: 'Tω',
    quantity: 'longDuration',
    mark: 'perigee',
    ordered: true,
    evaluate: ({ body, mean }, theory) => twoPi / Math.abs(secularRates(body, mean, theory).perigeeRadPerS),
    remark: (point, value) => {
      if (value > stationaryS) return `Perigee stands still now: no turn within ${stationaryYears} years at this rate.`;
      return perigeeRateInDoubt(point)
        ? 'The perigee rate is no larger than its doubt: no turn can be told.'
        : undefined;
    },
  },
  {
    id: 'localTimeDrift',
    label: 'Drift of local time',
    symbol: 'τ̇',
    quantity: 'localTimeDrift',
    mark: 'node',
    ordered: true,
    missing: (point) =>
      point.body.yearDays === null ? `Needs the length of the year of ${inSentence(point.body)}.` : noRotation(point),
    evaluate: ({ body, mean }, theory) => {
      const drift = localTimeDriftSPerS(secularRates(body, mean, theory).nodeRadPerS, body);
      return drift ?? Number.NaN;
    },
  },
];
