/** What a plot draws, in the unit it is drawn in. The same line language in every plot. */
import type { Range, Tick } from './plotScale';

export interface PlotLine {
  readonly id: string;
  readonly values: Float64Array;
  /** By which method: first order is dotted, second order has long dashes. */
  readonly pattern: 'first' | 'second';
  /** What it is: hue and mark together, so that colour alone never says it. */
  readonly hue: 'node' | 'perigee';
  readonly mark: 'square' | 'diamond';
  /** Drawn pale: the value means little for this orbit. */
  readonly weak: boolean;
  /** Written at the line's end; the second part is dropped where there is little room. */
  readonly label: readonly [string, string];
}

export interface PlotModel {
  readonly days: Float64Array;
  readonly lines: readonly PlotLine[];
  readonly range: Range;
  /** Ticks of the time axis, at most so many. */
  readonly timeTicks: (most: number) => readonly Tick[];
  /** Written below the plot; the others of a stack only have the grid. */
  readonly hasTimeLabels: boolean;
}
