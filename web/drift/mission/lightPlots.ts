/** Plots of light over a mission: β and the shadow of each revolution. Pure. */
import { degPerRad, formatNumber, isoFromJulianDate, type LightSummary } from '../../../core/index';
import type { PlotLine } from '../../parts/plotModel';
import { closeRange } from '../../parts/plotScale';
import type { MissionLines } from './missionLines';
import type { PlotPart } from './plotPart';

const ink = { hue: 'ink', mark: 'circle' } as const;

/** None while light is being computed, or where the Sun of the body is unknown. */
export function lightPlots(all: MissionLines): PlotPart[] {
  const light = all.result.sky?.light;
  if (!light?.ok) return [];
  const beta = light.betaRad.map((rad) => rad * degPerRad);
  const umbra = light.umbraS.map((seconds) => seconds / 60);
  const either = umbra.map((minutes, k) => minutes + (light.penumbraS[k] ?? 0) / 60);
  return [betaPlot(beta), eclipsePlot(umbra, either, captionOf(light.summary, all))];
}

function betaPlot(beta: Float64Array): PlotPart {
  const text = (k: number) => `${formatNumber(beta[k] ?? 0, { digits: 1, plus: true })}°`;
  const degrees = (value: number) => `${formatNumber(value, { digits: 1, plus: true })}°`;
  return {
    id: 'beta',
    title: 'β, the Sun’s angle from the orbit plane, degrees',
    hue: 'ink',
    caption: `Between ${degrees(Math.min(...beta))} and ${degrees(Math.max(...beta))}.`,
    lines: [{ id: 'beta', values: beta, pattern: 'averaged', ...ink, weak: false, label: ['β', ''] }],
    range: closeRange([beta], [0], 1),
    isSigned: true,
    valueText: text,
  };
}

function eclipsePlot(umbra: Float64Array, either: Float64Array, caption: string): PlotPart {
  const minutes = (value: number) => formatNumber(value, { digits: 1 });
  const line = (id: string, values: Float64Array, pattern: PlotLine['pattern']): PlotLine => ({
    id,
    values,
    pattern,
    ...ink,
    weak: false,
    label: [id === 'umbra' ? 'umbra' : '+ pen.', ''],
  });
  return {
    id: 'eclipse',
    title: 'Eclipse, minutes a revolution',
    hue: 'ink',
    caption,
    lines: [line('penumbra', either, 'geometry'), line('umbra', umbra, 'averaged')],
    range: closeRange([umbra, either], [], 1),
    isSigned: false,
    valueText: (k) => `${minutes(umbra[k] ?? 0)} min umbra, ${minutes(either[k] ?? 0)} with penumbra`,
  };
}

function captionOf(summary: LightSummary, { result }: MissionLines): string {
  const date = (days: number) => isoFromJulianDate(result.request.epochJd + days).slice(0, 10);
  const { longest, firstFreeDays, lastFreeDays, freeShare } = summary;
  if (!longest) return 'No revolution meets the shadow.';
  const share = `${formatNumber(100 * longest.umbraShare, { digits: 0 })}\u202f% of the revolution`;
  const most = `Longest umbra ${formatNumber(longest.umbraS / 60, { digits: 1 })} min, ${share}, on ${date(longest.days)}.`;
  if (firstFreeDays === null || lastFreeDays === null) return `${most} No day is free of eclipse.`;
  const free = `${formatNumber(100 * freeShare, { digits: 0 })}\u202f%`;
  return `${most} Free of eclipse ${free} of the time, first on ${date(firstFreeDays)}, last on ${date(lastFreeDays)}.`;
}
