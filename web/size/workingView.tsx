/** The working of a reading: formula, numbers put in, constants with their source, first against second order. */
import { useEffect, useRef } from 'preact/hooks';
import { type Reading, type ResolvedOrbit, type Working, workingOf } from '../../core/index';
import { doubtText, quantityText, usePreferredUnit, useReadingText } from '../parts/readingText';
import { useApp } from '../state/appContext';
import { LimitFields } from './limitFields';
import { WorkingLines, WorkingTables } from './workingLines';
import './working.css';

export function WorkingView({ orbit, reading }: { readonly orbit: ResolvedOrbit; readonly reading: Reading }) {
  const { openWorking } = useApp();
  const title = useRef<HTMLHeadingElement>(null);
  const { id } = reading;
  useEffect(() => {
    if (id) title.current?.focus();
  }, [id]);
  const text = useReadingText(reading);
  const working = workingOf(orbit, reading.id);
  const close = () => {
    openWorking.value = null;
  };
  return (
    <article class="working" onKeyDown={(event) => event.key === 'Escape' && close()}>
      <header class="working-head">
        <h2 ref={title} tabIndex={-1}>
          {reading.label}{' '}
          <span class="working-result">
            {text.value} <span class="unit">{text.unit}</span>
          </span>
        </h2>
        <button type="button" onClick={close}>
          Close
        </button>
      </header>
      <OtherUnits reading={reading} />
      <LimitFields reading={reading} />
      <WorkingTables working={working} />
      <WorkingLines
        title={working.secondLines.length > 0 ? 'First order, J2 alone' : 'Line by line'}
        lines={working.lines}
        working={working}
      />
      <WorkingLines title="Second order, J2 + J2² + J4" lines={working.secondLines} working={working} />
      <Orders reading={reading} working={working} />
      <DoubtSentence reading={reading} />
      <p class="working-note">{working.note}</p>
    </article>
  );
}

function OtherUnits({ reading }: { readonly reading: Reading }) {
  if (reading.alternates.length === 0) return null;
  return (
    <ul class="working-others">
      {reading.alternates.map(({ label, quantity, value, unit }) => {
        const text = quantityText(quantity, value, unit);
        return (
          <li key={label}>
            <span class="soft">{label}</span> {text.value} <span class="unit">{text.unit}</span>
          </li>
        );
      })}
    </ul>
  );
}

/** What the method leaves out, and how much that may come to. */
function DoubtSentence({ reading }: { readonly reading: Reading }) {
  const unit = usePreferredUnit()(reading.quantity);
  const text = doubtText(reading, unit);
  if (!reading.doubt || text === '') return null;
  return (
    <p class="working-orders">
      {reading.doubt.reason} The {reading.label.toLowerCase()} now is good to{' '}
      <strong>
        {text} {quantityText(reading.quantity, 0, unit).unit}
      </strong>
      .
    </p>
  );
}

function Orders({ reading, working }: { readonly reading: Reading; readonly working: Working }) {
  const unit = usePreferredUnit()(reading.quantity);
  if (working.secondOrder === null || !Number.isFinite(working.secondOrder)) return null;
  const write = (value: number) => {
    const text = quantityText(reading.quantity, value, unit);
    return `${text.value} ${text.unit}`;
  };
  return (
    <p class="working-orders">
      First order {write(working.firstOrder)}; second order {write(working.secondOrder)}. The second changes the first
      by <strong>{write(working.secondOrder - working.firstOrder)}</strong>.
    </p>
  );
}
