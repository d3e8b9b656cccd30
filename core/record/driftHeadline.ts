/**
 * The answer of the place Drift, in one sentence of words and numbers. It speaks of rates now: the
 * closed form knows nothing of what Sun, Moon and drag make of them over a mission.
 */
import { secondsPerDay } from '../numerics/angles';
import type { Theory } from '../orbit/elements';
import { localTimeDriftSPerS } from '../orbit/localTime';
import { secularRates } from '../orbit/secularRates';
import { apsisName, inSentence } from './bodyWords';
import type { HeadlineSpan } from './headline';
import { doubtOf, sunAndMoonDominate } from './readings/doubt';
import type { ResolvedOrbit } from './resolved';
import { turnWords } from './turnWords';
import { formatNumber, unitOf } from './units';
import { perigeeOffText, smallEccentricity, tinyEccentricity } from './warnings';

export type RateUnitId = 'degPerDay' | 'degPerYear';

const yearDays = 365.25;

/** Faster than a turn of the clock in so many days, local time is said a day, with the time of a turn. */
const slowTurnDays = 3 * yearDays;

/** Rates now, second order, of node, perigee and local time. */
export function driftHeadline(orbit: ResolvedOrbit, rateUnit: RateUnitId): HeadlineSpan[] {
  const rates = ratesIn(orbit, 'second', rateUnit);
  return [
    ...(sunAndMoonDominate(orbit) ? [{ text: 'Sun and Moon move this orbit more than J2 does. By J2 alone, ' }] : []),
    { text: sunAndMoonDominate(orbit) ? 'node' : 'Node', mark: 'node', strong: true },
    { text: ' moves ' },
    { text: `${rates.node} ${rates.per}`, mark: 'node', strong: true },
    { text: ', ' },
    { text: apsisName(orbit.body), mark: 'perigee', strong: true },
    { text: ' ' },
    { text: rates.perigee, mark: 'perigee', strong: true },
    { text: '. ' },
    ...localTimeSpans(orbit),
  ];
}

/** What first order alone would say, beside the headline's second order, and whether perigee means anything. */
export function firstOrderSentence(orbit: ResolvedOrbit, rateUnit: RateUnitId): string {
  const { node, perigee, per } = ratesIn(orbit, 'first', rateUnit);
  const perDay = localTimePerDayMin(orbit, 'first');
  const localTime = perDay === null ? '' : `, local time ${localTimeText(perDay)}`;
  const apsis = apsisName(orbit.body);
  const e = orbit.mean.eccentricity;
  const worth = e < tinyEccentricity ? 'means little' : `is off by ${perigeeOffText(orbit)}`;
  const round = e < smallEccentricity ? ` At e\u00a0${formatNumber(e, { digits: 4 })} the ${apsis} rate ${worth}.` : '';
  return `First order alone: node ${node} ${per}, ${apsis} ${perigee}${localTime}.${round}`;
}

function ratesIn(orbit: ResolvedOrbit, theory: Theory, rateUnit: RateUnitId) {
  const { nodeRadPerS, perigeeRadPerS } = secularRates(orbit.body, orbit.mean, theory);
  const isPerYear = rateUnit === 'degPerYear';
  const { perCore } = unitOf('angleRate', isPerYear ? 'deg/yr' : 'deg/day');
  const text = (radPerS: number) => `${formatNumber(radPerS * perCore, { digits: isPerYear ? 2 : 4, plus: true })}°`;
  return { node: text(nodeRadPerS), perigee: text(perigeeRadPerS), per: isPerYear ? 'a year' : 'a day' };
}

function localTimePerDayMin(orbit: ResolvedOrbit, theory: Theory): number | null {
  const drift = localTimeDriftSPerS(secularRates(orbit.body, orbit.mean, theory).nodeRadPerS, orbit.body);
  return drift === null ? null : (drift * secondsPerDay) / 60;
}

const turnMin = 24 * 60;

function localTimeText(perDayMin: number, doubtPerDayMin = 0): string {
  const isFast = turnMin / Math.abs(perDayMin) < slowTurnDays;
  const days = isFast ? 1 : yearDays;
  const spread = doubtPerDayMin * days < 0.05 ? '' : ` ± ${formatNumber(doubtPerDayMin * days, { digits: 1 })}`;
  return `${formatNumber(perDayMin * days, { digits: 1, plus: true })}${spread} min a ${isFast ? 'day' : 'year'}`;
}

function localTimeSpans(orbit: ResolvedOrbit): HeadlineSpan[] {
  const perDayMin = localTimePerDayMin(orbit, 'second');
  if (perDayMin === null) return [{ text: `Local time needs the year and the spin of ${inSentence(orbit.body)}.` }];
  const doubtPerDayMin = ((doubtOf('localTimeDrift', orbit, 'second')?.size ?? 0) * secondsPerDay) / 60;
  const turnDays = turnMin / Math.abs(perDayMin);
  const turn = `, once round in ${turnWords(turnDays)}.`;
  return [
    { text: 'Local time', mark: 'node', strong: true },
    { text: ' drifts ' },
    { text: localTimeText(perDayMin, doubtPerDayMin), mark: 'node', strong: true },
    { text: turnDays < slowTurnDays ? turn : ' at today’s rate.' },
  ];
}
