/** What a plot draws, in the unit it is drawn in. The same line language in every plot. */
import type { Range, Tick } from './plotScale';

export interface PlotLine {
  readonly id: string;
  /** NaN where there is nothing to draw. */
  readonly values: Float64Array;
  /** By which method: averaged is heavy and solid, first order dotted, second order dashed; what needs no theory is thin. */
  readonly pattern: 'averaged' | 'first' | 'second' | 'geometry';
  /** What it is: hue and mark together, so that colour alone never says it. */
  readonly hue: 'node' | 'perigee' | 'ink';
  readonly mark: 'square' | 'diamond' | 'circle';
  /** Drawn pale: the value means little for this orbit. */
  readonly weak: boolean;
  /** Written at the line's end; the second part is dropped where there is little room. */
  readonly label: readonly [string, string];
}

/** A bound across the plot; the side beyond it is hatched. */
export interface PlotLevel {
  readonly id: string;
  readonly at: number;
  readonly beyond: 'above' | 'below';
  readonly label: string;
}

/** A stretch of values between two bounds, shaded. */
export interface PlotBand {
  readonly low: number;
  readonly high: number;
}

/** Separate points: the orbit integrated. */
export interface PlotPoints {
  readonly id: string;
  readonly x: Float64Array;
  readonly values: Float64Array;
  readonly hue: PlotLine['hue'];
}

/** A moment marked on the upper edge. */
export interface PlotEvent {
  readonly id: string;
  readonly x: number;
}

/** A point of its own, such as the orbit at hand. */
export interface PlotPoint {
  readonly x: number;
  readonly value: number;
}

export interface PlotModel {
  /** Rising evenly: days of a span, or the element of a sweep. */
  readonly x: Float64Array;
  readonly lines: readonly PlotLine[];
  readonly range: Range;
  readonly levels?: readonly PlotLevel[];
  readonly point?: PlotPoint | null;
  readonly band?: PlotBand | null;
  readonly points?: readonly PlotPoints[];
  readonly events?: readonly PlotEvent[];
  /** Ticks of the axis along the foot, at most so many. */
  readonly xTicks: (most: number) => readonly Tick[];
  /** Written below the plot; the others of a stack only have the grid. */
  readonly hasXLabels: boolean;
  /** Values are changes or directions: ticks are written with a plus too. */
  readonly isSigned: boolean;
}
