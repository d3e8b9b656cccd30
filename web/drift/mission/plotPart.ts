/** What the plots of a mission are put together from. Pure. */
import type { PlotLine, PlotModel } from '../../parts/plotModel';
import { type Range, valueRange } from '../../parts/plotScale';
import type { MethodLines } from './missionLines';

export type MissionPlotId =
  | 'localTime'
  | 'node'
  | 'inclination'
  | 'altitude'
  | 'eccentricity'
  | 'perigee'
  | 'beta'
  | 'eclipse';

/** A plot without its place in the stack. */
export interface PlotPart {
  readonly id: MissionPlotId;
  readonly title: string;
  readonly hue: PlotLine['hue'];
  /** What it shows, in a line of words and numbers. */
  readonly caption: string;
  readonly lines: readonly PlotLine[];
  readonly range: Range;
  readonly isSigned: boolean;
  readonly band?: PlotModel['band'];
  readonly points?: PlotModel['points'];
  readonly valueText: (sample: number) => string;
}

type Look = Pick<PlotLine, 'hue' | 'mark'>;

/** The lines of the methods in the order they are drawn: the heavy one last. */
export function methodLines({ averaged, second, first }: MethodLines, look: Look): PlotLine[] {
  const line = (id: 'first' | 'second' | 'averaged', values: Float64Array, label: readonly [string, string]) => ({
    id,
    values,
    pattern: id,
    ...look,
    weak: false,
    label,
  });
  return [
    ...(first ? [line('first', first, ['1st', ' order'])] : []),
    ...(second ? [line('second', second, ['2nd', ' order'])] : []),
    line('averaged', averaged, ['averaged', '']),
  ];
}

/** Holds zero and the main lines; another is let out of the picture where it would widen it beyond this. */
const widest = 2.5;

export function rangeAround(main: readonly Float64Array[], others: readonly Float64Array[], smallest: number): Range {
  const narrow = valueRange(main, smallest);
  const wide = valueRange([...main, ...others], smallest);
  const width = ({ least, greatest }: Range) => greatest - least;
  return width(wide) <= widest * width(narrow) ? wide : narrow;
}
