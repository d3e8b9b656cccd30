/**
 * The sentence above everything: which orbit this is, by how node and perigee move now.
 *
 * The closed form knows rates now; it says nothing here about years ahead.
 */
import { degPerRad, secondsPerDay, twoPi } from '../numerics/angles';
import { apsisName } from './bodyWords';
import { sunAndMoonDominate } from './readings/doubt';
import { stationaryYears } from './readings/drift';
import type { Reading, ReadingId, ReadingMark } from './readings/reading';
import type { ResolvedOrbit } from './resolved';
import { turnWords } from './turnWords';
import { formatNumber, unitOf } from './units';
import { isEquatorial, perigeeOffText, smallEccentricity, tinyEccentricity } from './warnings';

export interface HeadlineSpan {
  readonly text: string;
  readonly mark?: Exclude<ReadingMark, 'none'>;
  readonly strong?: boolean;
}

/** Local time drifting less than this is Sun-synchronous for a mission that trims once a year. */
const synchronousMinPerYear = 1;
const nearlySynchronousMinPerYear = 15;
/** A node slower than this takes 1000 years to go round. */
const stillDegPerDay = 360 / (stationaryYears * 365.25);

export interface HeadlineOptions {
  readonly rateUnit?: string;
  /** What the averaged method says of local time over the mission, in place of the closed form's rate of now. */
  readonly localTime?: readonly HeadlineSpan[] | null;
}

type HeadlineOrbit = Pick<ResolvedOrbit, 'body' | 'mean' | 'frozen'>;

/** Two sentences, node then perigee, in spans; joined they read as plain text. */
export function headlineOf(
  orbit: HeadlineOrbit,
  readings: readonly Reading[],
  options: HeadlineOptions = {},
): HeadlineSpan[] {
  const value = (wanted: ReadingId) => readings.find(({ id }) => id === wanted)?.value;
  const rates: Rates = { node: needed(value('nodeRate')), perigee: needed(value('perigeeRate')), ...options };
  if (sunAndMoonDominate(orbit)) return farOutSpans(rates);
  const { inclinationRad } = orbit.mean;
  if (isEquatorial(inclinationRad)) {
    const together = rates.perigee + (inclinationRad < 1 ? rates.node : -rates.node);
    return [...noNodeSpans(orbit.body), ...perigeeSpans({ ...rates, perigee: together }, orbit)];
  }
  const node = nodeSpans(
    rates,
    readings.find(({ id }) => id === 'localTimeDrift'),
  );
  return [...node, { text: ' ' }, ...perigeeSpans(rates, orbit)];
}

const noNodeSpans = (body: ResolvedOrbit['body']): HeadlineSpan[] => [
  { text: 'No node in the plane of the equator', mark: 'node', strong: true },
  { text: `: ${apsisName(body)} is counted against the stars. ` },
];

function farOutSpans(rates: Rates): HeadlineSpan[] {
  return [
    { text: 'Sun and Moon move this orbit more than J2 does', strong: true },
    { text: ': of the node J2 makes ' },
    { text: smallRateText(rates.node, rates), mark: 'node', strong: true },
    { text: ', of perigee ' },
    { text: smallRateText(rates.perigee, rates), mark: 'perigee', strong: true },
    { text: '; the rest is not in these numbers.' },
  ];
}

interface Rates extends HeadlineOptions {
  readonly node: number;
  readonly perigee: number;
}

function needed(value: number | undefined): number {
  if (value === undefined) throw new Error('Expected readings of node and perigee rate, got none');
  return value;
}

function nodeSpans(rates: Rates, drift: Reading | undefined): HeadlineSpan[] {
  const { perCore } = unitOf('localTimeDrift');
  const minutes = drift === undefined ? Number.NaN : drift.value * perCore;
  const rate: HeadlineSpan = { text: rateText(rates.node, rates), mark: 'node', strong: true };
  if (Math.abs(minutes) < nearlySynchronousMinPerYear) {
    const spans = synchronousSpans(rate, minutes, (drift?.doubt?.size ?? 0) * perCore);
    return rates.localTime ? [...spans.slice(0, 3), { text: '. ' }, ...rates.localTime] : spans;
  }
  if (isStill(rates.node)) return [{ text: 'The node stands still now', mark: 'node', strong: true }, { text: '.' }];
  const sense = rates.node < 0 ? 'regresses' : 'advances';
  return [{ text: `The node ${sense} now, ` }, rate, { text: `: once round in ${turnWords(turnDays(rates.node))}.` }];
}

function synchronousSpans(rate: HeadlineSpan, minutes: number, doubt: number): HeadlineSpan[] {
  const name = Math.abs(minutes) < synchronousMinPerYear ? 'Sun-synchronous' : 'Nearly Sun-synchronous';
  // With a doubt above the threshold the closed form cannot tell.
  const isOpen = doubt > synchronousMinPerYear;
  const give = ` by the closed form, give or take ${formatNumber(doubt, { digits: doubt < 10 ? 1 : 0 })} min a year`;
  const spread = isOpen || doubt < 0.05 ? '' : ` ± ${formatNumber(doubt, { digits: 1 })}`;
  return [
    { text: isOpen ? name + give : `${name} now`, strong: true },
    { text: ': the node moves ' },
    rate,
    { text: ', its local time ' },
    { text: `${formatNumber(minutes, { digits: 1, plus: true })}${spread} min a year`, mark: 'node', strong: true },
    { text: ' at this rate.' },
  ];
}

function perigeeSpans(rates: Rates, orbit: HeadlineOrbit): HeadlineSpan[] {
  const apsis = apsisName(orbit.body);
  const name = apsis.charAt(0).toUpperCase() + apsis.slice(1);
  const { eccentricity, perigeeRad } = orbit.mean;
  if (orbit.frozen) {
    const place = `${formatNumber(perigeeRad * degPerRad, { digits: 0 })}°`;
    return [
      { text: 'Frozen', strong: true },
      { text: `: ${apsis} rests at ` },
      { text: place, mark: 'perigee', strong: true },
      { text: '.' },
    ];
  }
  if (eccentricity < tinyEccentricity) {
    const size = formatNumber(eccentricity, { digits: eccentricity < 0.001 ? 6 : 4 });
    return [
      { text: `At e ${size} ` },
      { text: `${apsis} drift means little`, mark: 'perigee', strong: true },
      { text: ': watch the eccentricity vector.' },
    ];
  }
  if (isStill(rates.perigee)) {
    return [{ text: `${name} stands still now`, mark: 'perigee', strong: true }, { text: '.' }];
  }
  return [
    { text: `${name} moves ` },
    { text: rateText(rates.perigee, rates), mark: 'perigee', strong: true },
    { text: ` now${eccentricity < smallEccentricity ? `, off by ${perigeeOffText(orbit)} at this e` : ''}: ` },
    { text: `once round in ${turnWords(turnDays(rates.perigee))}.` },
  ];
}

function isStill(radPerS: number): boolean {
  return Math.abs(radPerS * degPerRad * secondsPerDay) < stillDegPerDay;
}

function rateText(radPerS: number, { rateUnit }: Rates): string {
  const { perCore, symbol } = unitOf('angleRate', rateUnit);
  return `${formatNumber(radPerS * perCore, { digits: symbol === 'deg/day' ? 4 : 2, plus: true })} ${symbol}`;
}

/** Two figures, for rates that fixed digits would show as zero. */
function smallRateText(radPerS: number, { rateUnit }: Rates): string {
  const { perCore, symbol } = unitOf('angleRate', rateUnit);
  const digits = 1 - Math.floor(Math.log10(Math.abs(radPerS * perCore) || 1));
  return `${formatNumber(radPerS * perCore, { digits: Math.min(12, Math.max(0, digits)), plus: true })} ${symbol}`;
}

const turnDays = (radPerS: number): number => twoPi / (Math.abs(radPerS) * secondsPerDay);
