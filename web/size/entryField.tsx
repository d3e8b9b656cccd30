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
  /** In place of `stepSize` where the text is no plain number. */
  readonly step?: (text: string, count: number) => string | null;
  readonly signed?: boolean;
  readonly keyboard?: 'decimal' | 'text';
  readonly placeholder?: string;
}

export function EntryField({ field, stepSize, step, ...rest }: EntryFieldProps) {
  const { document, store } = useApp();
  const resolution = document.entered.value;
  const settled = document.settled.value[field];
  const bySize = stepSize === undefined ? undefined : (text: string, count: number) => stepped(text, stepSize, count);
  return (
    <NumberField
      {...rest}
      text={settled ?? document.draft.value.entry.texts[field]}
      isSettled={settled !== undefined}
      error={resolution.ok ? undefined : resolution.errors[field]}
      note={resolution.notices.find((notice) => notice.field === field)?.text}
      step={step ?? bySize}
      readOnly={store.tabs.editorElsewhere.value}
      onText={(text) => document.setText(field, text)}
    />
  );
}
