/** A field of the open entry, bound to its text and its messages. */
import { useComputed } from '@preact/signals';
import type { ComponentChildren } from 'preact';
import { type FieldErrors, type FieldId, type Resolution, readNumber } from '../../core/index';
import { NumberField } from '../parts/numberField';
import { stepped } from '../parts/stepping';
import { useApp } from '../state/appContext';

export interface EntryFieldProps {
  readonly field: FieldId;
  readonly label: string;
  readonly labelControl?: ComponentChildren;
  readonly unit?: string;
  /** Step of the buttons and the drag, in the field's unit. */
  readonly stepSize?: number;
  /** Stepping stops here; what is typed is judged by the reader of the entry. */
  readonly within?: readonly [number, number];
  /** What else a step moves, given the field's new text. */
  readonly alongside?: (text: string) => Partial<Record<FieldId, string>>;
  /** In place of `stepSize` where the text is no plain number. */
  readonly step?: (text: string, count: number) => string | null;
  readonly signed?: boolean;
  readonly keyboard?: 'decimal' | 'text';
  readonly placeholder?: string;
}

export function EntryField({ field, stepSize, within, step, alongside, ...rest }: EntryFieldProps) {
  const { document, store } = useApp();
  // Each on its own, so that a drag on the chart draws only the fields that change.
  const text = useComputed(() => document.draft.value.entry.texts[field]);
  const settled = useComputed(() => document.settled.value[field]).value;
  const error = useComputed(() => errorsIn(document.entered.value)[field]);
  const notice = useComputed(() => document.entered.value.notices.find((each) => each.field === field));
  const note = useComputed(() => notice.value?.text);
  const isCaution = useComputed(() => notice.value?.severity === 'caution');
  const bySize =
    stepSize === undefined ? undefined : (text: string, count: number) => stepped(text, stepSize, count, within);
  return (
    <NumberField
      {...rest}
      text={settled === undefined ? text.value : shortened(field, settled)}
      isSettled={settled !== undefined}
      error={error.value}
      note={note.value}
      noteIsCaution={isCaution.value}
      step={step ?? bySize}
      readOnly={store.tabs.editorElsewhere.value}
      onText={(text) => document.setText(field, text)}
      onStep={alongside && ((text) => document.setTexts({ ...alongside(text), [field]: text }))}
    />
  );
}

function errorsIn(resolution: Resolution): FieldErrors {
  return resolution.ok ? {} : resolution.errors;
}

/** Decimals that tell orbits apart; the solution itself keeps all of its digits. */
const settledDecimals: Partial<Record<FieldId, number>> = { inclination: 5, perigee: 5, eccentricity: 7 };

function shortened(field: FieldId, text: string): string {
  const number = readNumber(text);
  return number.ok ? String(Number(number.value.toFixed(settledDecimals[field] ?? 4))) : text;
}
