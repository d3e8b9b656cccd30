/** The rate chart: inclination over mean altitude, the curves of the conditions, the candidate as a mark to drag. */
import { type Signal, useComputed } from '@preact/signals';
import { useEffect, useMemo, useRef, useState } from 'preact/hooks';
import { type Candidate, type ChartShape, formatNumber, unitOf } from '../../../core/index';
import { Choice } from '../../parts/choice';
import { createFrame } from '../../parts/frame';
import { useApp } from '../../state/appContext';
import type { AppState } from '../../state/appState';
import './chart.css';
import { drawLayers } from './chartLayers';
import { type Chart, createChart } from './chartState';
import { ChartWords } from './chartWords';
import { type Gestures, listenToGestures } from './gestures';
import { moveByKey } from './keys';
import { useOtherOrbits } from './otherOrbits';
import { zoomAt } from './steering';

/** Drawn once: whatever moves in it follows the signals of the chart by itself. */
export function ChartView() {
  const app = useApp();
  const chart = useMemo(() => createChart(app), [app]);
  const [before, setBefore] = useState<Candidate | null>(null);
  return useMemo(
    () => (
      <figure class="rate-map">
        <figcaption>
          <span class="figure-title">Rate chart</span>
          <ChartTools chart={chart} />
        </figcaption>
        <Plot chart={chart} onMoved={setBefore} />
        <ChartWords chart={chart} before={before} onPutBack={() => setBefore(null)} />
      </figure>
    ),
    [chart, before],
  );
}

const zoomStep = 1.8;

function ChartTools({ chart }: { readonly chart: Chart }) {
  const eccentricity = useComputed(
    () => `e ${formatNumber(chart.app.document.orbit.value?.mean.eccentricity ?? 0, { digits: 4 })}`,
  );
  const perigee = useComputed(() => perigeeText(chart.app));
  const options: readonly { readonly value: ChartShape['kind']; readonly label: string }[] = [
    { value: 'eccentricity', label: eccentricity.value },
    { value: 'perigeeAltitude', label: perigee.value },
  ];
  return (
    <div class="rate-map-tools">
      <Choice
        label="What the chart holds"
        name="chart-holds"
        options={options}
        value={chart.holds.value}
        onChoose={choose(chart.holds)}
      />
      <div class="rate-map-zoom">
        <button type="button" aria-label="Show less, closer" onClick={() => zoomAt(chart, zoomStep)}>
          +
        </button>
        <button type="button" aria-label="Show more, from further off" onClick={() => zoomAt(chart, 1 / zoomStep)}>
          −
        </button>
        <button type="button" disabled={chart.zoom.value === null} onClick={() => choose(chart.zoom)(null)}>
          Whole
        </button>
      </div>
    </div>
  );
}

function perigeeText({ document, preferences }: AppState): string {
  const orbit = document.orbit.value;
  if (!orbit) return 'perigee';
  const { symbol, perCore } = unitOf('length', preferences.values.value.lengthUnit);
  const { semiMajorAxisKm: a, eccentricity: e } = orbit.mean;
  const altitude = formatNumber((a * (1 - e) - orbit.body.equatorialRadiusKm) * perCore, { digits: 0 });
  return `${orbit.body.id === 'earth' ? 'perigee' : 'periapsis'} ${altitude} ${symbol}`;
}

function choose<Value>(target: Signal<Value>): (value: Value) => void {
  return (value) => {
    target.value = value;
  };
}

interface PlotProps {
  readonly chart: Chart;
  readonly onMoved: (before: Candidate) => void;
}

function Plot({ chart, onMoved }: PlotProps) {
  const box = useRef<HTMLDivElement>(null);
  const curves = useRef<HTMLCanvasElement>(null);
  const marks = useRef<HTMLCanvasElement>(null);
  const gestures = useRef<Gestures | null>(null);
  const others = useOtherOrbits();
  useEffect(() => {
    if (!box.current || !curves.current || !marks.current) return;
    // The keys are its own, as the role says.
    box.current.tabIndex = 0;
    const frame = createFrame();
    const endLayers = drawLayers({ chart, frame, curves: curves.current, marks: marks.current, others });
    gestures.current = listenToGestures({ element: box.current, chart, frame, onMoved });
    return () => {
      gestures.current?.end();
      endLayers();
      frame.end();
    };
  }, [chart, others, onMoved]);
  const alsoHere = others.value.map(({ name }) => name).join(', ');
  return (
    <>
      <div
        ref={box}
        class="rate-map-box"
        role="application"
        aria-label="Rate chart. Arrow keys move the orbit, with Shift coarsely; Enter snaps it to the nearest curve."
        onKeyDown={(event) => {
          if (event.key === 'Escape' && gestures.current?.cancelDrag()) event.preventDefault();
          else if (moveByKey(chart, event)) event.preventDefault();
        }}
      >
        <div aria-hidden="true">
          <canvas ref={curves} />
          <canvas ref={marks} />
        </div>
      </div>
      {alsoHere !== '' && <p class="hidden-visually">Also on the chart: {alsoHere}.</p>}
    </>
  );
}
