/**
 * The answer of the place Drift where the averaged method has spoken, in one sentence of words and numbers, and what
 * that answer holds. Claims about a mission come from here or are not made.
 */
import { isoFromJulianDate } from '../bodies/julianDate';
import { ballisticKgPerM2 } from '../forces/drag';
import type { MissionEvent } from '../mission/event';
import type { LeftOutForce } from '../mission/historyForces';
import type { HistoryForces } from '../mission/historyRequest';
import { degPerRad } from '../numerics/angles';
import type { HeadlineSpan } from './headline';
import { formatClock, formatNumber } from './units';

/** What a history came to, as the sentence needs it. */
export interface MissionOutcome {
  /** Hours, running on without wrapping; null where the body has no clock. */
  readonly localTime: {
    readonly startH: number;
    readonly endH: number;
    readonly node: 'ascending' | 'descending';
  } | null;
  readonly nodeChangeRad: number;
  readonly startInclinationRad: number;
  readonly endInclinationRad: number;
  /** To the end of the span or of the orbit. */
  readonly spanDays: number;
  readonly boxMinutes: number;
  /** Null until they are computed: nothing is said of the box before. */
  readonly events: readonly MissionEvent[] | null;
  /** Empty where the orbit lasts the span. */
  readonly endMessage: string;
}

/** Slower than this over the span, local time is told from start to end; faster, by its turns. */
const slowHours = 24;

export function missionHeadline(outcome: MissionOutcome): HeadlineSpan[] {
  const end: HeadlineSpan[] = outcome.endMessage === '' ? [] : [{ text: ` ${outcome.endMessage}`, strong: true }];
  return [...(localTimeClaim(outcome) ?? nodeSpans(outcome)), ...end];
}

/** “Local time runs from 10:30 to 10:09 in 5 years; it leaves the ±15 min box on 2032-03-24.” Null without a clock. */
export function localTimeClaim(outcome: MissionOutcome): HeadlineSpan[] | null {
  const { localTime, spanDays } = outcome;
  if (!localTime) return null;
  const { startH, endH, node } = localTime;
  const name: HeadlineSpan[] = [{ text: 'Local time', mark: 'node', strong: true }, { text: ` of the ${node} node ` }];
  const moved = endH - startH;
  if (Math.abs(moved) > slowHours) {
    const turns = Math.abs(moved) / 24;
    const digits = turns < 10 ? 1 : 0;
    return [
      ...name,
      { text: `goes round ${moved < 0 ? 'backwards ' : ''}` },
      { text: `${formatNumber(turns, { digits })} times`, mark: 'node', strong: true },
      { text: ` in ${spanWords(spanDays)}, once in ${formatNumber(spanDays / turns, { digits: 0 })} days.` },
    ];
  }
  const clocks = clockTexts(startH, endH);
  return [
    ...name,
    { text: `runs ${moved < -12 ? 'back ' : ''}from ${clocks.start} to ` },
    { text: clocks.end, mark: 'node', strong: true },
    { text: ` in ${spanWords(spanDays)}` },
    ...boxSpans(outcome),
  ];
}

/** “5 years”, “1 day”, “812 days”. */
function spanWords(spanDays: number): string {
  const years = Math.round(spanDays / 365.25);
  const isWhole = years >= 1 && Math.abs(spanDays - years * 365.25) <= 1.3;
  const [count, unit] = isWhole ? [years, 'year'] : [spanDays, 'day'];
  return `${formatNumber(count, { digits: count < 10 && !Number.isInteger(count) ? 1 : 0 })} ${unit}${count === 1 ? '' : 's'}`;
}

/** Minutes; seconds too where minutes would show no change. */
function clockTexts(startH: number, endH: number) {
  const digits = Math.abs(endH - startH) < 2 / 60 ? 8 : 5;
  const round = (hours: number) => (digits === 5 ? Math.round(hours * 60) / 60 : hours);
  return { start: formatClock(round(startH)).slice(0, digits), end: formatClock(round(endH)).slice(0, digits) };
}

function boxSpans({ boxMinutes, events }: MissionOutcome): HeadlineSpan[] {
  if (events === null) return [{ text: '.' }];
  const box = `±${formatNumber(boxMinutes, { digits: Number.isInteger(boxMinutes) ? 0 : 1 })} min box`;
  const left = events.find(({ kind }) => kind === 'boxLeft');
  if (!left) return [{ text: `; it stays in the ${box}.` }];
  const back = events.find(({ kind, days }) => kind === 'boxEntered' && days > left.days);
  return [
    { text: `; it leaves the ${box} on ` },
    { text: dateText(left.jd), strong: true },
    { text: back ? ` and is back in it on ${dateText(back.jd)}.` : '.' },
  ];
}

const dateText = (jd: number): string => isoFromJulianDate(jd).slice(0, 10);

function nodeSpans({
  nodeChangeRad,
  spanDays,
  startInclinationRad,
  endInclinationRad,
}: MissionOutcome): HeadlineSpan[] {
  const degrees = (rad: number, digits: number, plus = false) => `${formatNumber(rad * degPerRad, { digits, plus })}°`;
  return [
    { text: 'The node', mark: 'node', strong: true },
    { text: ' moves ' },
    { text: degrees(nodeChangeRad, 1, true), mark: 'node', strong: true },
    { text: ` in ${spanWords(spanDays)}; inclination goes from ${degrees(startInclinationRad, 3)} to ` },
    { text: degrees(endInclinationRad, 3), strong: true },
    { text: '.' },
  ];
}

/** “zonals to degree 14, Sun, Moon, drag at mean density”: what acted, without what was left out. */
export function forcesText(forces: HistoryForces, leftOut: readonly LeftOutForce[]): string {
  const acts = (force: LeftOutForce['force']) => !leftOut.some((each) => each.force === force);
  const { zonalDegree, sun, moon, drag } = forces;
  const density =
    typeof drag?.density === 'number' ? `${formatNumber(drag.density, { digits: 2 })} times mean` : drag?.density;
  const words = [
    zonalDegree >= 2 ? (zonalDegree === 2 ? 'J2 and its square' : `zonals to degree ${zonalDegree}`) : 'no zonals',
    sun && acts('sun') ? 'Sun' : null,
    moon && acts('moon') ? 'Moon' : null,
    drag && acts('drag')
      ? `drag at ${density} density, ${formatNumber(ballisticKgPerM2(drag), { digits: 0 })} kg/m²`
      : null,
  ];
  return words.filter((word) => word !== null).join(', ');
}
