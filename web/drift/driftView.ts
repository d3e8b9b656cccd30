/** All that the place shows, computed once for an orbit and a span. */
import { useMemo } from 'preact/hooks';
import { apsisName, type ClosedFormDrift, type ResolvedOrbit, tinyEccentricity } from '../../core/index';
import { useApp } from '../state/appContext';
import { type Change, changesOf } from './changes';
import { type DriftPlot, driftPlots } from './plotModels';
import { spanText } from './spans';
import { momentText, type TimeSpan } from './timeAxis';

export interface DriftView {
  readonly orbit: ResolvedOrbit;
  readonly drift: ClosedFormDrift;
  readonly time: TimeSpan;
  readonly changes: readonly Change[];
  readonly plots: readonly DriftPlot[];
  /** The moment of a sample in words. */
  readonly moment: (sample: number) => string;
}

/** Null while there is no orbit yet. */
export function useDriftView(): DriftView | null {
  const app = useApp();
  const orbit = app.document.orbit.value;
  const drift = app.drift.value;
  return useMemo(() => (orbit && drift ? viewOf(orbit, drift) : null), [orbit, drift]);
}

function viewOf(orbit: ResolvedOrbit, drift: ClosedFormDrift): DriftView {
  const spanDays = drift.days.at(-1) ?? 0;
  const time = { epochJd: orbit.epochJd, spanDays };
  const apsis = apsisName(orbit.body);
  const isRound = orbit.mean.eccentricity < tinyEccentricity;
  return {
    orbit,
    drift,
    time,
    changes: changesOf(drift, apsis),
    plots: driftPlots({ drift, time, spanText: spanText(spanDays), isRound, apsis }),
    moment: (sample) => momentText(time, drift.days[sample] ?? 0),
  };
}
