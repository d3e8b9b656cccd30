/** The stack of plots of a mission: one time axis for all. Pure. */
import type { PlotEvent, PlotModel } from '../../parts/plotModel';
import { timeTicks } from '../timeAxis';
import { lightPlots } from './lightPlots';
import type { MissionLines } from './missionLines';
import { eccentricityPlot, heightPlot, inclinationPlot, localTimePlot, nodePlot, perigeePlot } from './orbitPlots';
import type { MissionPlotId, PlotPart } from './plotPart';

export interface MissionPlot extends Omit<PlotPart, 'lines' | 'range' | 'isSigned' | 'band' | 'points'> {
  readonly model: PlotModel;
}

/** From this e on perigee means more than the vector. */
const perigeeMeansMore = 0.02;

export function missionPlots(all: MissionLines): MissionPlot[] {
  const isRound = all.result.request.mean.eccentricity < perigeeMeansMore;
  const parts = [
    localTimePlot(all),
    nodePlot(all),
    inclinationPlot(all),
    heightPlot(all),
    isRound ? eccentricityPlot(all) : perigeePlot(all),
    ...lightPlots(all),
  ].filter((part) => part !== null);
  return parts.map((part, place) => inStack(part, all, place === 0 || place === parts.length - 1));
}

function inStack(
  { lines, range, isSigned, band, points, ...part }: PlotPart,
  { result, time }: MissionLines,
  hasXLabels: boolean,
) {
  const model: PlotModel = {
    x: result.history.columns.days,
    lines,
    range,
    isSigned,
    band: band ?? null,
    points: points ?? [],
    events: eventsOn(part.id, result.sky?.events.events ?? []),
    xTicks: (most) => timeTicks(time, most),
    hasXLabels,
  };
  return { ...part, model };
}

const eventPlots: Readonly<Record<MissionPlotId, RegExp>> = {
  localTime: /^(box|outsideBox|localTimeBack)/,
  node: /^never$/,
  inclination: /^never$/,
  altitude: /^(altitudeBelow|decay|escape)/,
  eccentricity: /^perigee/,
  perigee: /^perigee/,
  beta: /^beta/,
  eclipse: /^eclipses/,
};

function eventsOn(id: MissionPlotId, events: readonly { readonly kind: string; readonly days: number }[]): PlotEvent[] {
  return events
    .filter(({ kind }) => eventPlots[id].test(kind))
    .map(({ kind, days }) => ({ id: `${kind}${days}`, x: days }));
}
