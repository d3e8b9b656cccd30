/** The two canvases: curves below, drawn anew only when they change; marks above, drawn in every frame of a drag. */
import { effect, type ReadonlySignal } from '@preact/signals';
import type { ChartCurve } from '../../../core/index';
import { type ChartSurface, chartLayer } from '../../parts/chartCanvas';
import type { Frame } from '../../parts/frame';
import type { Chart } from './chartState';
import { curveName } from './curveNames';
import { drawCurves } from './drawCurves';
import { drawFrame, drawGround, labelRegions, nameAltitudes } from './drawGround';
import { drawOutside, labelOutside, runsOutside } from './drawLimits';
import { drawMarks } from './drawMarks';
import { type LabelBox, labelPlaces } from './labels';
import { nameAtTop } from './nameAtTop';
import { nameRates, nameRepeats } from './nameCurves';
import type { OtherOrbit } from './otherOrbits';

export interface LayerInput {
  readonly chart: Chart;
  readonly frame: Frame;
  readonly curves: HTMLCanvasElement;
  readonly marks: HTMLCanvasElement;
  readonly others: ReadonlySignal<readonly OtherOrbit[]>;
}

export function drawLayers({ chart, frame, curves, marks, others }: LayerInput): () => void {
  let written: readonly LabelBox[] = [];
  const below = chartLayer({
    canvas: curves,
    frame,
    draw: (surface) => {
      written = drawBelow(chart, surface);
    },
    onSize: ({ widthPx, heightPx, ink }) => {
      const before = chart.size.peek();
      const isSame = before?.widthPx === widthPx && before.heightPx === heightPx && before.fontPx === ink.fontPx;
      if (!isSame) chart.size.value = { widthPx, heightPx, fontPx: ink.fontPx };
    },
  });
  const above = chartLayer({
    canvas: marks,
    frame,
    draw: (surface) => drawAbove(surface, { chart, others: others.peek(), written }),
  });
  const stops = [
    effect(() => {
      // Read, so that a change of any draws; the curves themselves wait for the frame.
      void [
        chart.mapping.value,
        chart.body.value,
        chart.shape.value,
        chart.held.value,
        chart.limits.value,
        chart.mark.value,
        chart.app.preferences.values.value,
      ];
      below.invalidate();
    }),
    effect(() => {
      void [chart.point.value, chart.mapping.value, chart.held.value, chart.isDragging.value, others.value];
      above.invalidate();
    }),
    effect(() => {
      void chart.app.document.stale.value;
      below.relight();
      above.relight();
    }),
  ];
  return () => {
    for (const stop of stops) stop();
    below.end();
    above.end();
  };
}

/** Answers where it wrote, so that the lines of the layer above keep clear. */
function drawBelow(chart: Chart, surface: ChartSurface): readonly LabelBox[] {
  const [mapping, body, shape] = [chart.mapping.peek(), chart.body.peek(), chart.shape.peek()];
  if (!mapping || !body || !shape) return [];
  const units = chart.app.preferences.values.peek();
  const shown = chart.curves.peek();
  const ground = {
    mapping,
    body,
    shape,
    lengthUnit: units.lengthUnit,
    ending: shown.flatMap(({ curve, isHeld }) => (isHeld ? [curve] : [])),
    nameOf: (curve: ChartCurve) => curveName(curve.condition, units),
  };
  const places = labelPlaces();
  drawGround(surface, ground);
  const limits = chart.limits.peek();
  const runs = limits ? runsOutside({ mapping, body, shape, ground: limits, mark: chart.mark.peek() }) : [];
  drawOutside(surface, mapping, runs);
  nameAltitudes(surface, ground, places);
  const drawn = drawCurves(surface, mapping, shown);
  drawFrame(surface, mapping);
  labelRegions(surface, ground, places);
  const names = { mapping, drawn, places, rateUnit: units.rateUnit };
  nameAtTop(surface, names);
  nameRepeats(surface, names);
  nameRates(surface, names);
  labelOutside(surface, mapping, { runs, places });
  return places.taken;
}

interface AboveParts {
  readonly chart: Chart;
  readonly others: readonly OtherOrbit[];
  readonly written: readonly LabelBox[];
}

function drawAbove(surface: ChartSurface, { chart, others, written }: AboveParts): void {
  const [mapping, point] = [chart.mapping.peek(), chart.point.peek()];
  if (!mapping || !point) return;
  const units = chart.app.preferences.values.peek();
  const isDragging = chart.isDragging.peek();
  const under = chart.under.peek();
  // At rest what is held needs no name here: it stands beside the entry.
  const on = under.filter(({ isHeld }) => isDragging || !isHeld).map(({ curve }) => curveName(curve.condition, units));
  const isOn = under.length > 0;
  drawMarks(surface, { mapping, point, others, written, on, isOn, isDragging, lengthUnit: units.lengthUnit });
}
