/** Wishes stated as conditions, what each settles, and what came of them. */
import { useComputed } from '@preact/signals';
import { useRef, useState } from 'preact/hooks';
import {
  type ConditionEntry,
  conditionWords,
  newCondition,
  type ReadCondition,
  readConditions,
  type Settlement,
  settledElements,
} from '../../core/index';
import { later } from '../parts/later';
import { useApp } from '../state/appContext';
import { ConditionRow, elementSymbols } from './conditionRow';
import { Solutions, useMeanText } from './solutions';
import './conditions.css';

export function ConditionPanel() {
  const { document } = useApp();
  // Not the whole draft: an orbit dragged over the chart changes no condition.
  const stored = useComputed(() => document.draft.value.conditions).value;
  const lengthUnit = useComputed(() => document.draft.value.entry.lengthUnit).value;
  const settlement = document.conditions.settlement.value;
  const entry = { ...document.draft.peek().entry, lengthUnit };
  const conditions = settlement?.conditions ?? readConditions({ conditions: stored, entry });
  return (
    <section class="conditions" aria-label="Conditions">
      {conditions.map((condition, place) => (
        <ConditionRow key={rowKey(condition, place)} condition={condition} place={place} />
      ))}
      <StartSays settlement={settlement} />
      <AddCondition conditions={conditions} />
      <Outcome settlement={settlement} />
    </section>
  );
}

type Kind = ConditionEntry['kind'];

/** A condition has no name of its own: its place is what it is known by. A rate that is typed anew keeps the focus. */
function rowKey({ entry }: ReadCondition, place: number): string {
  return `${place}${entry?.kind === 'sameNodeRate' ? 'nodeRate' : entry?.kind}`;
}

const OtherOrbitPicker = later(async () => (await import('./otherOrbit')).OtherOrbitPicker);

function AddCondition({ conditions }: { readonly conditions: readonly ReadCondition[] }) {
  const { document, store } = useApp();
  const [isPicking, setPicking] = useState(false);
  const select = useRef<HTMLSelectElement>(null);
  const present = conditions.flatMap(({ entry }) => (entry ? [entry] : []));
  // Taking the same wish twice would be refused.
  const offered = (Object.keys(conditionWords) as Kind[]).filter(
    (kind) => !present.some((entry) => entry.kind === kind),
  );
  const add = (kind: Kind) => {
    if (kind === 'sameNodeRate') setPicking(true);
    else document.conditions.add(newCondition(kind, present));
  };
  const stopPicking = () => {
    setPicking(false);
    select.current?.focus();
  };
  return (
    <>
      <label class="add-condition">
        <span class="hidden-visually">Add a condition</span>
        <select
          ref={select}
          value=""
          disabled={store.tabs.editorElsewhere.value}
          onChange={(event) => {
            const { value } = event.currentTarget;
            event.currentTarget.value = '';
            if (value) add(value as Kind);
          }}
        >
          <option value="">+ condition</option>
          {offered.map((kind) => (
            <option key={kind} value={kind}>
              {kind === 'sameNodeRate' ? `${conditionWords[kind].label} …` : conditionWords[kind].label}
            </option>
          ))}
        </select>
      </label>
      {isPicking && <OtherOrbitPicker present={present} onClose={stopPicking} />}
    </>
  );
}

/** Where the form has no fields of elements to show them in. */
function StartSays({ settlement }: { readonly settlement: Settlement | null }) {
  const { document } = useApp();
  const form = useComputed(() => document.draft.value.entry.form).value;
  const meanText = useMeanText();
  if (!settlement?.ok || (form !== 'state' && form !== 'twoLine')) return null;
  const symbols = settledElements
    .filter((each) => settlement.settled.includes(each))
    .map((each) => elementSymbols[each]);
  return (
    <p class="soft small">
      Conditions settle {listed(symbols)}; what is typed is the start. Settled: {meanText(settlement.orbit.mean)}
    </p>
  );
}

function listed(words: readonly string[]): string {
  const last = words.at(-1) ?? '';
  return words.length > 1 ? `${words.slice(0, -1).join(', ')} and ${last}` : last;
}

function Outcome({ settlement }: { readonly settlement: Settlement | null }) {
  if (!settlement) return null;
  return (
    <div class="condition-outcome" role="status">
      {!settlement.ok && settlement.message && <p class="condition-message">{settlement.message}</p>}
      <Solutions settlement={settlement} />
    </div>
  );
}
