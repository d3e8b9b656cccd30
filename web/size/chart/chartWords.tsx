/** Under the chart: what is near, in words, and the one tap that holds what the orbit snapped to. */
import { useComputed } from '@preact/signals';
import { useEffect, useState } from 'preact/hooks';
import type { Candidate } from '../../../core/index';
import type { ShownCurve } from './chartCurvesShown';
import type { Chart } from './chartState';
import { curveName } from './curveNames';
import { heldCurve, holdCurves } from './moveOrbit';
import { curvesUnder, nearText } from './nearText';

interface WordsProps {
  readonly chart: Chart;
  /** The draft before the last drag; null where there is nothing to put back. */
  readonly before: Candidate | null;
  readonly onPutBack: () => void;
}

export function ChartWords({ chart, before, onPutBack }: WordsProps) {
  const { document, store } = chart.app;
  const words = useComputed(() => {
    const { mapping, point, curves } = {
      mapping: chart.mapping.value,
      point: chart.point.value,
      curves: chart.curves.value,
    };
    if (!mapping || !point) return '';
    const near = nearText(point, curves, mapping.scale, chart.app.preferences.values.value);
    return chart.held.value && heldCurve(chart).isFixed
      ? `${near} Conditions settle both altitude and inclination.`
      : near;
  });
  const canPutBack = before !== null && before.id === document.draft.value.id && before !== document.draft.value;
  return (
    <div class="rate-map-words">
      <p class="small">{words.value}</p>
      <Spoken text={words.value} />
      {!store.tabs.editorElsewhere.value && (
        <div class="rate-map-holds">
          <Holds chart={chart} />
          {canPutBack && (
            <button
              type="button"
              onClick={() => {
                if (before) document.restoreDraft(before);
                onPutBack();
              }}
            >
              Put back
            </button>
          )}
        </div>
      )}
    </div>
  );
}

const quietMs = 600;

/** Said once the orbit has come to rest, not at every step of a drag. */
function Spoken({ text }: { readonly text: string }) {
  const [said, setSaid] = useState('');
  useEffect(() => {
    const timer = setTimeout(() => setSaid(text), quietMs);
    return () => clearTimeout(timer);
  }, [text]);
  return (
    <p class="hidden-visually" role="status">
      {said}
    </p>
  );
}

function Holds({ chart }: { readonly chart: Chart }) {
  const point = chart.point.value;
  const under = point ? curvesUnder(point, chart.curves.value).filter(({ isHeld }) => !isHeld) : [];
  const isTrack = ({ curve }: ShownCurve) => curve.condition.kind === 'repeat';
  const free = [...under.filter(isTrack), ...under.filter((each) => !isTrack(each))];
  if (free.length === 0) return null;
  const units = chart.app.preferences.values.value;
  const names = free.map(({ curve }) => curveName(curve.condition, units)).join(' and ');
  return (
    <button type="button" onClick={() => holdCurves(chart, free)}>
      Hold {names}
    </button>
  );
}
