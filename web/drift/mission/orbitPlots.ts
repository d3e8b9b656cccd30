/** Plots of the orbit's own elements over a mission. Pure. */
import { degPerRad, formatNumber } from '../../../core/index';
import type { PlotLine } from '../../parts/plotModel';
import { closeRange, valueRange } from '../../parts/plotScale';
import { spanText } from '../spans';
import {
  aheadOf,
  eccentricityVector,
  evenRates,
  heights,
  localTimeLines,
  lookAhead,
  type MethodLines,
  type MissionLines,
} from './missionLines';
import { methodLines, type PlotPart, rangeAround } from './plotPart';

const node = { hue: 'node', mark: 'square' } as const;
const perigee = { hue: 'perigee', mark: 'diamond' } as const;
const ink = { hue: 'ink', mark: 'circle' } as const;

const signed = (value: number, digits: number) => formatNumber(value, { digits, plus: true });

export function localTimePlot(all: MissionLines): PlotPart | null {
  const lines = localTimeLines(all);
  if (!lines) return null;
  const { unit, averaged, second, first } = lines;
  const box = all.result.request.boxMinutes * 60 * unit.perCore;
  const digits = unit.short === 'min' ? 1 : 2;
  const text = (k: number) =>
    `${signed(averaged[k] ?? 0, digits)}${unit.symbol} averaged, ${signed(second[k] ?? 0, digits)} second order, ` +
    `${signed(first[k] ?? 0, digits)} first`;
  const edges = Float64Array.of(-box, box);
  const look = all.look?.look;
  const points = look?.localTimeH && {
    id: 'look',
    x: look.integrated.days,
    values: look.localTimeH.map((hours) => (hours - (look.localTimeH?.[0] ?? 0)) * 3600 * unit.perCore),
    hue: node.hue,
  };
  return {
    id: 'localTime',
    title: `Local time, ${unit.name} from the start; shaded: the ±${formatNumber(all.result.request.boxMinutes, { digits: 0 })} min box`,
    hue: node.hue,
    caption: `${spanText(all.time.spanDays)}: ${text(averaged.length - 1)}.`,
    lines: methodLines(lines, node),
    range: rangeAround([averaged, edges], [second, first], 0.01),
    isSigned: true,
    band: { low: -box, high: box },
    points: points ? [points] : [],
    valueText: text,
  };
}

export function nodePlot(all: MissionLines): PlotPart {
  return aheadPlot(all, 'node');
}

export function perigeePlot(all: MissionLines): PlotPart {
  return aheadPlot(all, 'perigee');
}

function aheadPlot(all: MissionLines, element: 'node' | 'perigee'): PlotPart {
  const lines: MethodLines = aheadOf(all, element);
  const even = evenRates(all)[element];
  const { averaged, first = averaged } = lines;
  const name = element === 'node' ? 'Node' : all.apsis.charAt(0).toUpperCase() + all.apsis.slice(1);
  const text = (k: number) => `averaged ${signed(averaged[k] ?? 0, 3)}°, first order ${signed(first[k] ?? 0, 3)}°`;
  const columns = all.look?.look.integrated;
  return {
    id: element,
    title: `${name}, degrees ahead of its even drift`,
    hue: element,
    caption: `The even drift is the second order’s, ${signed(even, 4)}°/day; at the end ${text(averaged.length - 1)}.`,
    lines: methodLines(lines, element === 'node' ? node : perigee),
    range: rangeAround([averaged], [first], 0.001),
    isSigned: true,
    points: columns ? [{ id: 'look', x: columns.days, values: lookAhead(all, columns, element), hue: element }] : [],
    valueText: text,
  };
}

export function inclinationPlot(all: MissionLines): PlotPart {
  const averaged = all.result.history.columns.inclinationRad.map((rad) => rad * degPerRad);
  const start = averaged[0] ?? 0;
  const columns = all.look?.look.integrated;
  const text = (k: number) => `${formatNumber(averaged[k] ?? 0, { digits: 4 })}°`;
  return {
    id: 'inclination',
    title: 'Inclination, degrees',
    hue: ink.hue,
    caption: `From ${text(0)} to ${text(averaged.length - 1)}; the closed form holds it.`,
    lines: methodLines({ averaged, second: new Float64Array(averaged.length).fill(start) }, ink),
    range: closeRange([averaged], [start], 0.002),
    isSigned: false,
    points: columns
      ? [{ id: 'look', x: columns.days, values: columns.inclinationRad.map((rad) => rad * degPerRad), hue: ink.hue }]
      : [],
    valueText: text,
  };
}

/** From this e on the two lie so far apart that only their changes can be drawn on one scale. */
const farApart = 0.02;

export function heightPlot(all: MissionLines): PlotPart {
  const { perigee: low, apogee: high } = heights(all, all.result.history.columns);
  const apoapsis = all.apsis === 'perigee' ? 'apogee' : 'apoapsis';
  const unit = all.lengthUnit;
  const isChange = all.result.request.mean.eccentricity >= farApart;
  const drawn = (values: Float64Array) => (isChange ? values.map((value) => value - (values[0] ?? 0)) : values);
  const [lowDrawn, highDrawn] = [drawn(low), drawn(high)];
  const number = (value: number) => formatNumber(value, { digits: unit === 'NM' ? 2 : 1 });
  const text = (k: number) => `${all.apsis} ${number(low[k] ?? 0)}, ${apoapsis} ${number(high[k] ?? 0)} ${unit}`;
  const columns = all.look?.look.integrated;
  const seen = columns && heights(all, columns);
  return {
    id: 'altitude',
    title: `Altitude of ${all.apsis} and ${apoapsis}, ${unit}${isChange ? ' from the start' : ''}`,
    hue: ink.hue,
    caption: `Mean, above the equator’s radius. Start: ${text(0)}; end: ${text(low.length - 1)}.`,
    lines: [averagedLine(apoapsis, highDrawn, ink), averagedLine(all.apsis, lowDrawn, perigee)],
    range: closeRange([lowDrawn, highDrawn], [], 0.5),
    isSigned: isChange,
    points:
      columns && seen
        ? [
            { id: 'low', x: columns.days, values: drawn(seen.perigee), hue: perigee.hue },
            { id: 'high', x: columns.days, values: drawn(seen.apogee), hue: ink.hue },
          ]
        : [],
    valueText: text,
  };
}

const averagedLine = (id: string, values: Float64Array, look: Pick<PlotLine, 'hue' | 'mark'>): PlotLine => ({
  id,
  values,
  pattern: 'averaged',
  ...look,
  weak: false,
  label: [id, ''],
});

export function eccentricityPlot(all: MissionLines): PlotPart {
  const { along, across } = eccentricityVector(all.result.history.columns);
  const text = (k: number) => `e cos ω ${signed(along[k] ?? 0, 3)}, e sin ω ${signed(across[k] ?? 0, 3)}`;
  const { eccentricity } = all.result.history.columns;
  const [least, greatest] = [Math.min(...eccentricity), Math.max(...eccentricity)].map((e) =>
    formatNumber(e, { digits: 6 }),
  );
  const columns = all.look?.look.integrated;
  const seen = columns && eccentricityVector(columns);
  return {
    id: 'eccentricity',
    title: 'Eccentricity vector, thousandths',
    hue: perigee.hue,
    caption: `e stays between ${least} and ${greatest}; at the end ${text(lastIndex(along))}.`,
    lines: [averagedLine('e cos ω', along, ink), averagedLine('e sin ω', across, perigee)],
    range: valueRange([along, across], 0.02),
    isSigned: true,
    points:
      columns && seen
        ? [
            { id: 'along', x: columns.days, values: seen.along, hue: ink.hue },
            { id: 'across', x: columns.days, values: seen.across, hue: perigee.hue },
          ]
        : [],
    valueText: text,
  };
}

const lastIndex = (values: Float64Array): number => values.length - 1;
