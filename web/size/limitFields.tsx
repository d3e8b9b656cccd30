/** The limits of one reading: its bounds as typed, what is left of each, and a way to set another. */
import { useEffect, useRef } from 'preact/hooks';
import {
  displayUnits,
  type LimitBound,
  type LimitEntry,
  limitInUnit,
  marginText,
  type Quantity,
  type Reading,
  type ReadLimit,
  signedQuantities,
  unitOf,
} from '../../core/index';
import { NumberField } from '../parts/numberField';
import { quantityText, usePreferredUnit } from '../parts/readingText';
import { stepped, steppedClock } from '../parts/stepping';
import { useApp } from '../state/appContext';
import './limits.css';

const boundNames: Readonly<Record<LimitBound, string>> = { atLeast: 'at least', atMost: 'at most' };
const bounds = ['atLeast', 'atMost'] as const;

export function LimitFields({ reading }: { readonly reading: Reading }) {
  const { document, store } = useApp();
  const blocked = store.tabs.editorElsewhere.value;
  const preferred = usePreferredUnit()(reading.quantity);
  const limits = document.limits.read.value.flatMap((each) =>
    each.entry?.reading === reading.id ? [{ ...each, entry: each.entry }] : [],
  );
  const offered = bounds.filter((bound) => !limits.some(({ entry }) => entry.bound === bound));
  const box = useFocusOnNew(limits.length);
  const set = (bound: LimitBound) =>
    document.limits.add({ reading: reading.id, bound, text: '', unit: unitOf(reading.quantity, preferred).id });
  return (
    <section class="limits" aria-label={`Limits of ${reading.label}`} ref={box}>
      {limits.map((limit) => (
        <LimitRow key={limit.place} limit={limit} reading={reading} blocked={blocked} />
      ))}
      <div class="limits-add">
        {offered.map((bound) => (
          <button key={bound} type="button" disabled={blocked} onClick={() => set(bound)}>
            Set a limit: {boundNames[bound]}
          </button>
        ))}
      </div>
    </section>
  );
}

/** A limit just set is typed in next. */
function useFocusOnNew(count: number) {
  const box = useRef<HTMLElement>(null);
  const before = useRef(count);
  useEffect(() => {
    if (count > before.current) [...(box.current?.querySelectorAll('input') ?? [])].at(-1)?.focus();
    before.current = count;
  }, [count]);
  return box;
}

interface RowProps {
  readonly limit: ReadLimit & { readonly entry: LimitEntry };
  readonly reading: Reading;
  readonly blocked: boolean;
}

function LimitRow({ limit, reading, blocked }: RowProps) {
  const { document } = useApp();
  const { entry, place } = limit;
  const unit = quantityText(reading.quantity, 0, entry.unit).unit;
  const isEmpty = entry.text.trim() === '';
  const error = limit.ok ? undefined : limit.error;
  return (
    <div class="limit">
      <LimitHead limit={limit} reading={reading} blocked={blocked} />
      <div class="field-group">
        <NumberField
          label={`${boundNames[entry.bound].replace('at', 'At')}`}
          text={entry.text}
          unit={unit}
          error={isEmpty ? undefined : error}
          note={isEmpty ? error?.message : undefined}
          step={(text, count) => stepIn(reading.quantity, text, count)}
          signed={signedQuantities.has(reading.quantity) || reading.quantity === 'ratio'}
          keyboard={reading.quantity === 'localTime' ? 'text' : 'decimal'}
          readOnly={blocked}
          onText={(text) => document.limits.change(place, { ...entry, text })}
        />
      </div>
      <Margin place={place} quantity={reading.quantity} />
    </div>
  );
}

const stepSizes: Readonly<Record<Exclude<Quantity, 'localTime'>, number>> = {
  length: 1,
  angle: 0.01,
  smallAngle: 0.001,
  angleRate: 0.001,
  duration: 0.1,
  longDuration: 1,
  localTimeDrift: 0.1,
  speed: 0.01,
  revolutions: 0.01,
  ratio: 0.0001,
};

function stepIn(quantity: Quantity, text: string, count: number): string | null {
  return quantity === 'localTime' ? steppedClock(text, count) : stepped(text, stepSizes[quantity], count);
}

function LimitHead({ limit: { entry, place }, reading, blocked }: RowProps) {
  const { document, announcer } = useApp();
  const units: readonly { readonly id: string }[] = displayUnits[reading.quantity];
  const remove = () => {
    const { id } = document.draft.value;
    document.limits.remove(place);
    const undo = () => document.draft.value.id === id && document.limits.add(entry);
    announcer.say({
      text: 'The limit was taken out.',
      tone: 'note',
      action: { label: 'Undo', run: () => void undo() },
    });
  };
  return (
    <div class="limit-head">
      <span class="limit-name">Limit</span>
      {units.length > 1 && (
        <select
          aria-label={`Unit of the limit ${boundNames[entry.bound]}`}
          value={entry.unit}
          disabled={blocked}
          onChange={(event) => document.limits.change(place, limitInUnit(entry, event.currentTarget.value))}
        >
          {units.map(({ id }) => (
            <option key={id} value={id}>
              {quantityText(reading.quantity, 0, id).unit}
            </option>
          ))}
        </select>
      )}
      <button
        type="button"
        class="plain"
        disabled={blocked}
        aria-label={`Take out the limit ${boundNames[entry.bound]}`}
        onClick={remove}
      >
        ×
      </button>
    </div>
  );
}

function Margin({ place, quantity }: { readonly place: number; readonly quantity: Quantity }) {
  const { document } = useApp();
  const unit = usePreferredUnit()(quantity);
  const margin = document.limits.margins.value.find((each) => each.place === place);
  if (!margin) return null;
  return <p class={`margin is-${margin.state}`}>{marginText(margin, unit)}</p>;
}
