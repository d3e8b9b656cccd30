/** The entry: in the form the user has, with the rarer fields folded away until they are needed. */
import { useComputed } from '@preact/signals';
import type { ComponentChildren } from 'preact';
import { useEffect, useRef } from 'preact/hooks';
import { apsidesAt, type EntryForm, type FieldId, type InputFrame } from '../../core/index';
import { Choice } from '../parts/choice';
import { later } from '../parts/later';
import { useTyping } from '../parts/useTyping';
import { useApp } from '../state/appContext';
import { switchForm, takePaste } from '../state/entryActions';
import { BodyFields, bodySummary, Pick } from './bodyFields';
import { EpochField, InclinationField, NodeField, PlaceFields, ShapeFields } from './shapeFields';
import { StateFields, StateUnitChoice } from './stateFields';
import { TwoLineField } from './twoLineField';
import { UnitChoices } from './unitChoices';

/** Solving and its words are fetched after the first readings stand. */
const ConditionPanel = later(async () => (await import('./conditionPanel')).ConditionPanel);

const forms: readonly { readonly value: EntryForm; readonly label: string }[] = [
  { value: 'altitudes', label: 'Altitudes' },
  { value: 'elements', label: 'a and e' },
  { value: 'state', label: 'State' },
  { value: 'twoLine', label: 'Two-line' },
];

export function EntryPanel() {
  const { document } = useApp();
  const form = useComputed(() => document.draft.value.entry.form).value;
  const { box, isTyping } = useTyping<HTMLElement>();
  return (
    <section
      ref={box}
      class={isTyping ? 'entry is-typing' : 'entry'}
      aria-label="The orbit as you have it"
      onPasteCapture={usePaste()}
    >
      <Choice
        label="Form of the entry"
        name="form"
        options={forms}
        value={form}
        onChoose={(next) => switchForm(document, next)}
      />
      {form === 'twoLine' && <TwoLineField />}
      {form === 'state' && <StateEntry />}
      {(form === 'altitudes' || form === 'elements') && <ElementEntry />}
      <ConditionPanel />
      <Fold title="Body and units" says={useBodySummary()} holds={bodyFieldIds}>
        <div class="field-group">
          <BodyFields />
        </div>
        <UnitChoices />
      </Fold>
    </section>
  );
}

const bodyFieldIds: readonly FieldId[] = [
  'bodyMu',
  'bodyRadius',
  'bodyJ2',
  'bodyJ3',
  'bodyJ4',
  'bodyFlattening',
  'bodyDay',
  'bodyYear',
];

function useBodySummary(): string {
  const { draft } = useApp().document;
  return useComputed(() => {
    const { body, gravitySet, entry } = draft.value;
    return `${bodySummary(body, gravitySet)}, ${entry.lengthUnit}`;
  }).value;
}

/** A paste that is a whole orbit is taken as one, wherever the finger was. */
function usePaste() {
  const { document, announcer, store } = useApp();
  return (event: ClipboardEvent) => {
    if (store.tabs.editorElsewhere.value) return;
    const before = document.draft.value;
    const outcome = takePaste(document, event.clipboardData?.getData('text') ?? '');
    if (outcome === 'notOurs') return;
    event.preventDefault();
    const undo = () => document.restoreDraft(before);
    announcer.say({
      text: outcome.said,
      tone: 'note',
      untilEdited: true,
      ...(document.draft.value === before ? {} : { action: { label: 'Undo', run: undo } }),
    });
  };
}

function ElementEntry() {
  const { draft } = useApp().document;
  const nodeForm = useComputed(() => draft.value.entry.nodeForm).value;
  const title = useComputed(() => apsidesAt('Perigee, anomaly, epoch', { id: draft.value.body })).value;
  const says = useComputed(() => {
    const { texts, elementsAre } = draft.value.entry;
    return `${texts.epoch.trim().slice(0, 10) || 'no epoch yet'}, ${elementsAre}`;
  }).value;
  return (
    <>
      <div class="field-group">
        <ShapeFields />
        <InclinationField />
        <NodeField />
      </div>
      <Fold title={title} says={says} holds={['perigee', 'meanAnomaly', 'epoch']}>
        <div class="field-group">
          <PlaceFields />
          <EpochField />
          <ElementKind />
          {nodeForm === 'raan' ? <FrameChoice frames={['meanOfDate', 'j2000', 'teme']} /> : <SunChoice />}
        </div>
      </Fold>
    </>
  );
}

function StateEntry() {
  return (
    <>
      <StateUnitChoice />
      <div class="field-group">
        <StateFields />
      </div>
      <div class="field-group">
        <EpochField />
        <FrameChoice frames={['meanOfDate', 'j2000', 'teme', 'earthFixed']} />
      </div>
    </>
  );
}

const frameNames: Readonly<Record<InputFrame, string>> = {
  meanOfDate: 'Mean equator of epoch',
  j2000: 'J2000',
  teme: 'TEME',
  earthFixed: 'Earth-fixed',
};

function FrameChoice({ frames }: { readonly frames: readonly InputFrame[] }) {
  const { document } = useApp();
  return (
    <Pick
      label="Axes"
      value={document.draft.value.entry.frame}
      options={frames.map((frame) => ({ value: frame, label: frameNames[frame] }))}
      onPick={(frame) => document.setTags({ frame: frame as InputFrame })}
    />
  );
}

function SunChoice() {
  const { document } = useApp();
  return (
    <Pick
      label="Local time by"
      value={document.draft.value.entry.sun}
      options={[
        { value: 'mean', label: 'Mean Sun' },
        { value: 'apparent', label: 'Apparent Sun' },
      ]}
      onPick={(sun) => document.setTags({ sun: sun as 'mean' | 'apparent' })}
    />
  );
}

function ElementKind() {
  const { document } = useApp();
  return (
    <Pick
      label="These elements are"
      value={document.draft.value.entry.elementsAre}
      options={[
        { value: 'mean', label: 'Mean (Brouwer)' },
        { value: 'osculating', label: 'Osculating' },
      ]}
      onPick={(kind) => document.setTags({ elementsAre: kind as 'mean' | 'osculating' })}
    />
  );
}

interface FoldProps {
  readonly title: string;
  /** What the folded fields hold, in a line. */
  readonly says: string;
  readonly holds: readonly FieldId[];
  readonly children: ComponentChildren;
}

/** Opens by itself where one of its fields is in error, since a message must not be folded away; never closes by itself. */
function Fold({ title, says, holds, children }: FoldProps) {
  const { document } = useApp();
  const inError = useComputed(() => {
    const resolution = document.entered.value;
    return !resolution.ok && holds.some((field) => resolution.errors[field]);
  }).value;
  const fold = useRef<HTMLDetailsElement>(null);
  useEffect(() => {
    if (inError && fold.current) fold.current.open = true;
  }, [inError]);
  return (
    <details class="fold" ref={fold}>
      <summary>
        <span class="fold-title">{title}</span>
        <span class="fold-says">{says}</span>
      </summary>
      {children}
    </details>
  );
}
