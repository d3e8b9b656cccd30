/** The stack of plots: what each draws and says. Pure. */
import type { ClosedFormDrift } from '../../core/index';
import type { PlotLine, PlotModel } from '../parts/plotModel';
import { valueRange } from '../parts/plotScale';
import { type Change, type ChangeId, changeCaption, changesOf, ordersText } from './changes';
import { differenceCaption, differenceOf, differenceText } from './difference';
import { type TimeSpan, timeTicks } from './timeAxis';

export interface DriftPlot {
  readonly id: ChangeId | 'difference';
  readonly title: string;
  readonly hue: 'node' | 'perigee' | 'ink';
  readonly caption: string;
  readonly model: PlotModel;
  readonly valueText: (sample: number) => string;
}

export interface PlotInputs {
  readonly drift: ClosedFormDrift;
  readonly time: TimeSpan;
  readonly spanText: string;
  /** The orbit is too round for its perigee to mean much. */
  readonly isRound: boolean;
  /** What the point nearest to the body is called there. */
  readonly apsis: string;
}

/** Narrower than this nothing is drawn as a slope: a thousandth of a degree, and what that is in minutes. */
const smallestRange = { degrees: 0.001, minutes: 0.004 } as const;

export function driftPlots(inputs: PlotInputs): DriftPlot[] {
  return [...changesOf(inputs.drift, inputs.apsis).map((change) => changePlot(change, inputs)), differencePlot(inputs)];
}

const looks = {
  localTime: { hue: 'node', mark: 'square' },
  node: { hue: 'node', mark: 'square' },
  perigee: { hue: 'perigee', mark: 'diamond' },
} as const;

function changePlot(change: Change, { drift, time, spanText, isRound }: PlotInputs): DriftPlot {
  const weak = change.id === 'perigee' && isRound;
  const look = looks[change.id];
  const lines: PlotLine[] = [
    { id: 'first', values: change.first, pattern: 'first', ...look, weak, label: ['1st', ' order'] },
    { id: 'second', values: change.second, pattern: 'second', ...look, weak, label: ['2nd', ' order'] },
  ];
  const smallest = change.id === 'localTime' ? smallestRange.minutes : smallestRange.degrees;
  return {
    id: change.id,
    title: `${change.title}${weak ? ' (means little at this e)' : ''}, ${change.unit.name} from the start`,
    hue: look.hue,
    caption: changeCaption(change, spanText),
    model: modelOf(drift, time, lines, { smallest, hasXLabels: false }),
    valueText: (sample) => ordersText(change, sample),
  };
}

function differencePlot({ drift, time, spanText, isRound, apsis }: PlotInputs): DriftPlot {
  const difference = differenceOf(drift, apsis);
  const lines: PlotLine[] = (['node', 'perigee'] as const).map((id) => ({
    id,
    values: difference[id],
    pattern: 'second',
    ...looks[id],
    weak: id === 'perigee' && isRound,
    label: [id === 'node' ? 'node' : apsis, ''],
  }));
  return {
    id: 'difference',
    title: 'Second order minus first, degrees',
    hue: 'ink',
    caption: differenceCaption(drift, difference, spanText),
    model: modelOf(drift, time, lines, { smallest: smallestRange.degrees, hasXLabels: true }),
    valueText: (sample) => differenceText(difference, sample),
  };
}

function modelOf(
  { days }: ClosedFormDrift,
  time: TimeSpan,
  lines: readonly PlotLine[],
  { smallest, hasXLabels }: { readonly smallest: number; readonly hasXLabels: boolean },
): PlotModel {
  return {
    x: days,
    lines,
    range: valueRange(
      lines.map(({ values }) => values),
      smallest,
    ),
    xTicks: (most) => timeTicks(time, most),
    hasXLabels,
    isSigned: true,
  };
}
