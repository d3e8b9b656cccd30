/** Sweep: one reading against one element, with its limits drawn in; any point of it can be taken. */
import { useMemo, useState } from 'preact/hooks';
import { type ResolvedOrbit, sweepSentence, sweptChanges, sweptWords } from '../../../core/index';
import { Plot } from '../../parts/plot';
import { quantityText, type ReadingText } from '../../parts/readingText';
import { useApp } from '../../state/appContext';
import { takeElements } from '../../state/entryActions';
import { SweepChoices } from './sweepChoices';
import { cursorText, nearestSample, type SweepShown, sweepModel, sweepRow } from './sweepModel';
import { SweepTable } from './sweepTable';
import { useSweep } from './useSweep';
import '../../parts/plot.css';
import './sweep.css';

export function SweepView({ orbit }: { readonly orbit: ResolvedOrbit }) {
  const state = useSweep(orbit);
  const { shown, last, reason } = state;
  return (
    <section class="sweep" aria-label="Sweep">
      {last && <p class={`sweep-answer${shown ? '' : ' is-stale'}`}>{sweepSentence(last.sweep, last.writing)}</p>}
      <SweepChoices state={state} />
      {reason !== '' && (
        <p class="sweep-reason" role="status">
          {reason}
        </p>
      )}
      {last && !shown && <p class="stale-says">Below is the last sweep that could be drawn.</p>}
      {last && <SweepFigure shown={last} isStale={!shown} />}
    </section>
  );
}

interface FigureProps {
  readonly shown: SweepShown;
  readonly isStale: boolean;
}

function SweepFigure({ shown, isStale }: FigureProps) {
  const { element } = shown.sweep.request;
  const model = useMemo(() => sweepModel(shown), [shown]);
  // Held as a value of the element, so that the cursor stays where it is when the range changes.
  const [held, setHeld] = useState<{ readonly element: string; readonly value: number } | null>(null);
  const own = model.point?.x ?? 0;
  const sample = nearestSample(shown.grid, held?.element === element ? held.value : own);
  const { place } = sweepRow(shown, sample);
  const name = figureName(shown);
  return (
    <div class={isStale ? 'is-stale' : ''}>
      <figure class="plots sweep-figure">
        <figcaption>
          <h2 class={shown.reading.mark === 'none' ? '' : `mark-${shown.reading.mark}`}>{name}</h2>
          <p class="soft small">○ this orbit{shown.sweep.request.settle ? '; conditions kept at each point' : ''}</p>
        </figcaption>
        <Plot
          name={name}
          model={model}
          sample={sample}
          momentText={place}
          valueText={cursorText(shown, sample)}
          onSample={(next) => setHeld({ element, value: shown.grid[next] ?? own })}
        />
      </figure>
      <div class="sweep-cursor">
        <p>{`At ${place}: ${cursorText(shown, sample)}`}</p>
        <TakePoint shown={shown} sample={sample} isStale={isStale} />
      </div>
      <SweepTable shown={shown} />
    </div>
  );
}

/** With the units of both axes. */
function figureName({ reading, writing, sweep }: SweepShown): string {
  const { label, quantity } = sweptWords[sweep.request.element];
  const inUnit = (name: string, { unit }: ReadingText) => (unit === '' ? name : `${name},\u00a0${unit}`);
  const against = inUnit(label.toLowerCase(), quantityText(quantity, 0, writing.elementUnit));
  return `${inUnit(writing.label, quantityText(reading.quantity, 0, writing.readingUnit))}, against ${against}`;
}

function TakePoint({ shown, sample, isStale }: FigureProps & { readonly sample: number }) {
  const { document, announcer, store } = useApp();
  const { element, places, point } = shown.sweep.request;
  const exists = Number.isFinite(shown.sweep.values[sample] ?? Number.NaN);
  const take = () => {
    const before = document.draft.value;
    const isTaken = takeElements(document, sweptChanges(point, element, places[sample] ?? 0));
    const { place } = sweepRow(shown, sample);
    const label = sweptWords[element].label;
    announcer.say(
      isTaken
        ? {
            text: `${label} is now ${place}.`,
            tone: 'note',
            action: {
              label: 'Undo',
              run: () => void (document.draft.value.id === before.id && document.restoreDraft(before)),
            },
          }
        : { text: 'This point could not be written into the entry.', tone: 'caution' },
    );
  };
  return (
    <button
      type="button"
      class="primary"
      disabled={isStale || !exists || store.tabs.editorElsewhere.value}
      onClick={take}
    >
      Take this point
    </button>
  );
}
