/** Round values along the chart's axes, as many as there is room for, with their labels. */
import { degPerRad, formatNumber, unitOf } from '../../../core/index';
import { niceTicks } from '../../parts/drawing';
import type { Mapping } from './plotBox';

export interface Tick {
  /** In core units: rad or km. */
  readonly at: number;
  readonly text: string;
}

const degreeSteps = [0.001, 0.002, 0.005, 0.01, 0.02, 0.05, 0.1, 0.2, 0.5, 1, 2, 5, 10, 30, 60] as const;

export function inclinationTicks({ box, window }: Mapping, fontPx: number): Tick[] {
  const [from, to] = [window.fromRad * degPerRad, window.toRad * degPerRad];
  const perDegree = (box.right - box.left) / (to - from);
  const step = degreeSteps.find((each) => each * perDegree >= 4.4 * fontPx) ?? 90;
  const digits = decimalsOf(step);
  const first = Math.ceil(from / step - 1e-9);
  const count = Math.floor(to / step + 1e-9) - first + 1;
  return Array.from({ length: Math.max(0, count) }, (_, index) => {
    const degrees = (first + index) * step;
    return { at: degrees / degPerRad, text: `${formatNumber(degrees, { digits })}°` };
  });
}

export function altitudeTicks({ box, window }: Mapping, fontPx: number, lengthUnit: 'km' | 'NM'): Tick[] {
  const { perCore } = unitOf('length', lengthUnit);
  const count = Math.max(2, Math.floor((box.bottom - box.top) / (2.8 * fontPx)));
  const ticks = niceTicks(window.fromKm * perCore, window.toKm * perCore, count).filter((tick) => tick >= 0);
  const digits = decimalsOf((ticks[1] ?? 1) - (ticks[0] ?? 0));
  return ticks.map((tick) => ({ at: tick / perCore, text: formatNumber(tick, { digits }) }));
}

function decimalsOf(step: number): number {
  return Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
}
