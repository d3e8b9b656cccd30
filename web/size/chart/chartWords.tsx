/** Under the chart: what is near, in words, and the one tap that holds what the orbit snapped to. */
import { effect, type ReadonlySignal, useComputed } from '@preact/signals';
import { useEffect, useState } from 'preact/hooks';
import type { Candidate } from '../../../core/index';
import type { ShownCurve } from './chartCurvesShown';
import type { Chart } from './chartState';
import { curveName } from './curveNames';
import { heldCurve, holdCurves } from './moveOrbit';
import { nearText } from './nearText';

interface WordsProps {
  readonly chart: Chart;
  /** The draft before the last drag; null where there is nothing to put back. */
  readonly before: Candidate | null;
  readonly onPutBack: () => void;
}

export function ChartWords({ chart, before, onPutBack }: WordsProps) {
  const { store } = chart.app;
  const words = useComputed(() => wordsOf(chart));
  return (
    <div class="rate-map-words">
      <p class="small">{words}</p>
      <Spoken chart={chart} words={words} />
      {!store.tabs.editorElsewhere.value && (
        <div class="rate-map-holds">
          <Hold chart={chart} />
          {before && <PutBack chart={chart} before={before} onPutBack={onPutBack} />}
        </div>
      )}
    </div>
  );
}

function wordsOf(chart: Chart): string {
  const [mapping, point] = [chart.mapping.value, chart.point.value];
  if (!mapping || !point) return '';
  const around = { point, shown: chart.curves.value, under: chart.under.value, scale: mapping.scale };
  const near = nearText(around, chart.app.preferences.values.value);
  const { isFixed } = heldCurve(chart, chart.held.value);
  return isFixed ? `${near} Conditions settle both altitude and inclination.` : near;
}

const quietMs = 600;

/** Said once the orbit has come to rest, not at every step of a drag. */
function Spoken({ chart, words }: { readonly chart: Chart; readonly words: ReadonlySignal<string> }) {
  const [said, setSaid] = useState('');
  useEffect(
    () =>
      effect(() => {
        if (chart.isDragging.value) return;
        const text = words.value;
        const timer = setTimeout(() => setSaid(text), quietMs);
        return () => clearTimeout(timer);
      }),
    [chart, words],
  );
  return (
    <p class="hidden-visually" role="status">
      {said}
    </p>
  );
}

/** Repeat tracks first: that is how the pair is spoken of. */
function Hold({ chart }: { readonly chart: Chart }) {
  const free = chart.under.value.filter(({ isHeld }) => !isHeld);
  const isTrack = ({ curve }: ShownCurve) => curve.condition.kind === 'repeat';
  const offered = [...free.filter(isTrack), ...free.filter((each) => !isTrack(each))];
  if (offered.length === 0) return null;
  const units = chart.app.preferences.values.value;
  const names = offered.map(({ curve }) => curveName(curve.condition, units)).join(' and ');
  return (
    <button type="button" onClick={() => holdCurves(chart, offered)}>
      Hold {names}
    </button>
  );
}

function PutBack({ chart, before, onPutBack }: WordsProps & { readonly before: Candidate }) {
  const { document } = chart.app;
  const canPutBack = useComputed(() => before.id === document.draft.value.id && before !== document.draft.value);
  if (!canPutBack.value) return null;
  return (
    <button
      type="button"
      onClick={() => {
        document.restoreDraft(before);
        onPutBack();
      }}
    >
      Put back
    </button>
  );
}
