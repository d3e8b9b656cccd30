/** One condition: its numbers, the element it settles, and its message. */
import { useState } from 'preact/hooks';
import {
  type ConditionEntry,
  type ConditionField,
  type ConditionFieldWords,
  conditionWords,
  type ReadCondition,
  type SettledElement,
  settledElements,
} from '../../core/index';
import { later } from '../parts/later';
import { NumberField } from '../parts/numberField';
import { stepped } from '../parts/stepping';
import { useApp } from '../state/appContext';

const ConditionWorkingView = later(async () => (await import('./conditionWorking')).ConditionWorkingView);

interface RowProps {
  readonly condition: ReadCondition;
  readonly place: number;
}

export function ConditionRow({ condition, place }: RowProps) {
  const { document, store } = useApp();
  const { entry } = condition;
  const [isOpen, setOpen] = useState(false);
  const blocked = store.tabs.editorElsewhere.value;
  return (
    <div class="condition">
      <div class="condition-head">
        {condition.ok ? (
          <button type="button" class="plain condition-name" aria-expanded={isOpen} onClick={() => setOpen(!isOpen)}>
            {conditionName(condition.entry)}
          </button>
        ) : (
          <span class="condition-name">{entry ? conditionName(entry) : 'Unknown condition'}</span>
        )}
        {entry && <Settles entry={entry} place={place} />}
        <button
          type="button"
          class="plain"
          disabled={blocked}
          aria-label={`Drop the condition ${entry ? conditionWords[entry.kind].label : ''}`}
          onClick={() => document.conditions.remove(place)}
        >
          ×
        </button>
      </div>
      {condition.ok && isOpen && <ConditionWorkingView condition={condition.condition} />}
      {entry && <ConditionFields entry={entry} place={place} condition={condition} />}
      {!condition.ok && condition.message && <p class="condition-message">{condition.message}</p>}
    </div>
  );
}

function conditionName({ kind, texts }: ConditionEntry): string {
  const { label } = conditionWords[kind];
  return kind === 'sameNodeRate' ? `${label} ${texts.of ?? 'the other orbit'}` : label;
}

interface EntryProps {
  readonly entry: ConditionEntry;
  readonly place: number;
}

/** The trade's symbols: short enough to stand beside the condition's name. */
export const elementSymbols: Readonly<Record<SettledElement, string>> = {
  semiMajorAxisKm: 'a',
  eccentricity: 'e',
  inclinationRad: 'i',
};

function Settles({ entry, place }: EntryProps) {
  const { document } = useApp();
  return (
    <select
      class="condition-settles"
      aria-label={`What ${conditionName(entry)} settles`}
      value={entry.settles}
      onChange={(event) =>
        document.conditions.change(place, { ...entry, settles: event.currentTarget.value as SettledElement })
      }
    >
      {settledElements.map((element) => (
        <option key={element} value={element}>
          settles {elementSymbols[element]}
        </option>
      ))}
    </select>
  );
}

function ConditionFields({ entry, place, condition }: EntryProps & { readonly condition: ReadCondition }) {
  const { document } = useApp();
  const { lengthUnit } = document.draft.value.entry;
  const { fields } = conditionWords[entry.kind];
  if (fields.length === 0) return null;
  return (
    <div class="field-group">
      {fields.map((words) => (
        <NumberField
          key={words.field}
          label={words.label}
          text={entry.texts[words.field] ?? ''}
          unit={words.unit === 'length' ? lengthUnit : words.unit}
          error={condition.ok ? undefined : condition.errors[words.field]}
          step={stepOf(words)}
          signed={words.signed ?? false}
          onText={(text) => document.conditions.change(place, retyped(entry, words.field, text))}
        />
      ))}
    </div>
  );
}

/** A rate that is typed anew is no longer that of the other orbit. */
function retyped(entry: ConditionEntry, field: ConditionField, text: string): ConditionEntry {
  if (entry.kind === 'sameNodeRate' && field === 'rate') return { ...entry, kind: 'nodeRate', texts: { rate: text } };
  return { ...entry, texts: { ...entry.texts, [field]: text } };
}

function stepOf({ stepSize }: ConditionFieldWords) {
  if (stepSize === undefined) return undefined;
  return (text: string, count: number) => stepped(text, stepSize, count);
}
