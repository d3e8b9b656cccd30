/** A field of the open entry, bound to its text and its messages. */
import type { ComponentChildren } from 'preact';
import type { FieldId } from '../../core/index';
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
  const resolution = document.entered.value;
  const settled = document.settled.value[field];
  const notice = resolution.notices.find((each) => each.field === field);
  const bySize =
    stepSize === undefined ? undefined : (text: string, count: number) => stepped(text, stepSize, count, within);
  return (
    <NumberField
      {...rest}
      text={settled ?? document.draft.value.entry.texts[field]}
      isSettled={settled !== undefined}
      error={resolution.ok ? undefined : resolution.errors[field]}
      note={notice?.text}
      noteIsCaution={notice?.severity === 'caution'}
      step={step ?? bySize}
      readOnly={store.tabs.editorElsewhere.value}
      onText={(text) => document.setText(field, text)}
      onStep={alongside && ((text) => document.setTexts({ ...alongside(text), [field]: text }))}
    />
  );
}
