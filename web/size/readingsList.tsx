/** The readings: value large, what would change it small, the working behind a tap. */
import { useEffect, useRef } from 'preact/hooks';
import { kmPerLengthUnit, marginText, type Reading } from '../../core/index';
import { doubtText, quantityText, roundedText, usePreferredUnit, useReadingText } from '../parts/readingText';
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
      <ul class={isStale ? 'is-stale' : ''}>
        {readings.map((reading) => (
          <ReadingRow key={reading.id} reading={reading} />
        ))}
      </ul>
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

function ReadingRow({ reading }: { readonly reading: Reading }) {
  const { openWorking } = useApp();
  const text = useReadingText(reading);
  const isOpen = openWorking.value === reading.id;
  const button = useFocusAfter(isOpen);
  return (
    <li>
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
        <Sensitivity reading={reading} />
        <Order reading={reading} />
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
  const margins = document.limits.margins.value.filter(({ entry }) => entry.reading === reading.id);
  if (margins.length === 0) return null;
  return (
    <span class="reading-margins">
      {margins.map((margin) => (
        <span key={margin.place} class={`margin is-${margin.state}`}>
          {marginText(margin, unit)}
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
  ].map(({ value, per }) => `+${per} ${roundedText(reading.quantity, value, { unitId, plus: true })}`);
  return (
    <span class="reading-sub">
      {parts.map((part) => (
        <span key={part}>{part}</span>
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
