/** Moments of the span in words and as axis ticks: UTC dates where the epoch is known, else days. Pure. */
import { formatNumber, isoFromJulianDate } from '../../core/index';
import { roundStep, type Tick } from '../parts/plotScale';

export interface TimeSpan {
  /** UTC Julian date, null where no epoch was typed. */
  readonly epochJd: number | null;
  readonly spanDays: number;
}

/** A moment so many days from the start, as finely as the samples of its span deserve. */
export function momentText({ epochJd, spanDays }: TimeSpan, days: number): string {
  if (epochJd === null) return `day ${formatNumber(days, { digits: spanDays >= 500 ? 0 : spanDays >= 50 ? 1 : 2 })}`;
  const iso = isoFromJulianDate(epochJd + days);
  return spanDays >= 200 ? iso.slice(0, 10) : `${iso.slice(0, 10)} ${iso.slice(11, 16)}`;
}

const monthDays = 30.44;
/** Finest first; the first that leaves room for its labels is taken. */
const monthSteps = [1, 2, 3, 6, 12, 24, 36, 60] as const;
const daySteps = [1 / 24, 2 / 24, 3 / 24, 6 / 24, 12 / 24, 1, 2, 5, 10, 15] as const;

/** At most `most` ticks, at round dates or round days. Their places are days from the start. */
export function timeTicks(span: TimeSpan, most: number): Tick[] {
  if (span.epochJd === null) return dayCountTicks(span.spanDays, most);
  const fits = (stepDays: number) => span.spanDays / stepDays <= most - 0.5;
  const days = daySteps.find(fits);
  if (days !== undefined) return dateTicks(span.epochJd, span.spanDays, days);
  return monthTicks(span.epochJd, span.spanDays, monthSteps.find((months) => fits(months * monthDays)) ?? 120);
}

function dayCountTicks(spanDays: number, most: number): Tick[] {
  const step = roundStep(spanDays, most - 0.5);
  const digits = Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
  const count = Math.floor(spanDays / step + 1e-9) + 1;
  return Array.from({ length: count }, (_, k) => ({ at: k * step, text: `${formatNumber(k * step, { digits })} d` }));
}

/** Ticks at whole multiples of a step counted from midnight UTC. */
function dateTicks(epochJd: number, spanDays: number, step: number): Tick[] {
  const midnightJd = Math.floor(epochJd + 0.5) - 0.5;
  const ticks: Tick[] = [];
  for (let k = Math.ceil((epochJd - midnightJd) / step - 1e-9); ; k += 1) {
    const at = midnightJd + k * step - epochJd;
    if (at > spanDays) return ticks;
    const iso = isoFromJulianDate(midnightJd + k * step);
    ticks.push({ at, text: step < 1 ? iso.slice(11, 16) : iso.slice(5, 10) });
  }
}

const unixEpochJd = 2_440_587.5;

/** Ticks at the first of a month, every so many months counted from January. */
function monthTicks(epochJd: number, spanDays: number, step: number): Tick[] {
  const [year = 2000, month = 1] = isoFromJulianDate(epochJd).split('-').map(Number);
  const ticks: Tick[] = [];
  for (let index = Math.floor((year * 12 + month - 1) / step) * step; ; index += step) {
    const jd = unixEpochJd + Date.UTC(Math.floor(index / 12), index % 12) / 86_400_000;
    if (jd - epochJd > spanDays) return ticks;
    if (jd < epochJd) continue;
    ticks.push({ at: jd - epochJd, text: isoFromJulianDate(jd).slice(0, step < 12 ? 7 : 4) });
  }
}
