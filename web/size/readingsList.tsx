/** The readings: value large, what would change it small, the working behind a tap. */
import { useEffect, useRef } from 'preact/hooks';
import { kmPerLengthUnit, type Reading } from '../../core/index';
import { doubtText, quantityText, roundedText, usePreferredUnit, useReadingText } from '../parts/readingText';
import { useInView } from '../parts/useInView';
import { useRested } from '../parts/useRested';
import { useApp } from '../state/appContext';

const levelNames = { geometry: '', first: 'first order', second: 'second order' } as const;

export function ReadingsList() {
  const { document } = useApp();
  const readings = document.readings.value;
  const absent = document.absentReadings.value;
  const isStale = document.stale.value;
  if (readings.length === 0) {
    return <p class="readings-empty">No readings yet: the entry above does not come to an orbit.</p>;
  }
  return (
    <section class="readings" aria-label="Readings">
      {isStale && <p class="stale-says">Readings of the last good entry; the one above is being changed.</p>}
      <Rows readings={readings} isStale={isStale} />
      {absent.length > 0 && (
        <ul class="readings-absent">
          {absent.map(({ label, reason }) => (
            <li key={label}>
              <span>{label}:</span> {reason}
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}

interface RowsProps {
  readonly readings: readonly Reading[];
  readonly isStale: boolean;
}

/**
 * While the orbit moves, rows in view follow every step; rows out of view, and what would change each number, wait until
 * it rests, so that a drag stays ahead of the finger on a slow tablet.
 */
function Rows({ readings, isStale }: RowsProps) {
  const list = useRef<HTMLUListElement>(null);
  const rested = useRested(useApp().document.readings);
  const isInView = useInView(list, readings.length);
  return (
    <ul ref={list} class={isStale ? 'is-stale' : ''}>
      {readings.map((reading) => {
        const calm = rested.find(({ id }) => id === reading.id) ?? reading;
        return <ReadingRow key={reading.id} reading={isInView(reading.id) ? reading : calm} calm={calm} />;
      })}
    </ul>
  );
}

interface RowProps {
  readonly reading: Reading;
  /** As of when the orbit last rested. */
  readonly calm: Reading;
}

function ReadingRow({ reading, calm }: RowProps) {
  const { openWorking } = useApp();
  const text = useReadingText(reading);
  const isOpen = openWorking.value === reading.id;
  const button = useFocusAfter(isOpen);
  return (
    <li data-reading={reading.id}>
      <button
        ref={button}
        type="button"
        class={`reading mark-of-${reading.mark}`}
        aria-expanded={isOpen}
        onClick={() => {
          openWorking.value = isOpen ? null : reading.id;
        }}
      >
        <span class="reading-label">{reading.label}</span>
        <span class="reading-value">
          {text.value} <span class="unit">{text.unit}</span>
        </span>
        <Sensitivity reading={calm} />
        <Order reading={calm} />
        <Margins reading={reading} />
        {reading.remark && <span class="reading-remark">{reading.remark}</span>}
      </button>
    </li>
  );
}

/** What is left of each limit of this reading; a broken one has its mark and its word. */
function Margins({ reading }: { readonly reading: Reading }) {
  const { document } = useApp();
  const unit = usePreferredUnit()(reading.quantity);
  const reader = document.limits.reader.value;
  const margins = document.limits.margins.value.filter(({ entry }) => entry.reading === reading.id);
  if (!reader || margins.length === 0) return null;
  return (
    <span class="reading-margins">
      {margins.map((margin) => (
        <span key={margin.place} class={`margin is-${margin.state}`}>
          {reader.marginText(margin, unit)}
        </span>
      ))}
    </span>
  );
}

/** When its working is closed and no other takes its place, the row has the focus again. */
function useFocusAfter(isOpen: boolean) {
  const { openWorking } = useApp();
  const button = useRef<HTMLButtonElement>(null);
  const wasOpen = useRef(isOpen);
  useEffect(() => {
    if (wasOpen.current && openWorking.peek() === null) button.current?.focus();
    wasOpen.current = isOpen;
  }, [isOpen, openWorking]);
  return button;
}

/** What one more kilometre, hundredth of a degree or thousandth of e would do. */
function Sensitivity({ reading }: { readonly reading: Reading }) {
  const unitId = usePreferredUnit()(reading.quantity);
  const { lengthUnit } = useApp().preferences.values.value;
  const sensitivities = reading.sensitivities();
  if (!sensitivities) return null;
  const { perKm, perHundredthDegree, perThousandth } = sensitivities;
  const kmPerUnit = kmPerLengthUnit({ lengthUnit });
  const parts = [
    { value: perKm * kmPerUnit, per: `1 ${lengthUnit}` },
    { value: perHundredthDegree, per: '0.01°' },
    { value: perThousandth, per: '0.001 e' },
  ]
    // What changes nothing is not worth a figure.
    .filter(({ value }) => value !== 0)
    .map(({ value, per }) => ({
      per,
      text: `+${per} ${roundedText(reading.quantity, value, { unitId, plus: true })}`,
    }));
  return (
    <span class="reading-sub">
      {parts.map(({ per, text }) => (
        <span key={per}>{text}</span>
      ))}
    </span>
  );
}

function Order({ reading }: { readonly reading: Reading }) {
  const unit = usePreferredUnit()(reading.quantity);
  if (!reading.orders) return null;
  const first = quantityText(reading.quantity, reading.orders.first, unit).value;
  return (
    <span class="reading-order">
      {[levelNames[reading.level], doubtText(reading, unit)].filter(Boolean).join(' ')}; first order {first}
    </span>
  );
}
