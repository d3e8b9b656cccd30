/** The values where the cursor stands. */
import { type Signal, useSignalEffect } from '@preact/signals';
import { useState } from 'preact/hooks';
import { type Change, numbersAt, ordersText } from './changes';
import type { DriftView } from './driftView';

/** A moving cursor is not read out; where it comes to rest is. */
const restMs = 900;

export interface CursorTableProps {
  readonly view: DriftView;
  readonly sample: Signal<number>;
  readonly stale: string;
}

export function CursorTable({ view, sample, stale }: CursorTableProps) {
  return (
    <section class={`drift-table${stale}`}>
      <table>
        <caption>
          <span>At the cursor</span> <strong>{view.moment(sample.value)}</strong>
        </caption>
        <thead>
          <tr>
            <th scope="col">from the start</th>
            <th scope="col">2nd order</th>
            <th scope="col">1st order</th>
            <th scope="col">2nd − 1st</th>
          </tr>
        </thead>
        <tbody>
          {view.changes.map((change) => (
            <CursorRow key={change.id} change={change} sample={sample.value} />
          ))}
        </tbody>
      </table>
      <RestingCursor view={view} sample={sample} />
    </section>
  );
}

function CursorRow({ change, sample }: { readonly change: Change; readonly sample: number }) {
  const { first, second, difference } = numbersAt(change, sample);
  return (
    <tr>
      <th scope="row" class={change.id === 'perigee' ? 'mark-perigee' : 'mark-node'}>
        {change.title} <span class="unit">{change.unit.short}</span>
      </th>
      <td class="drift-main" data-label="2nd order">
        {second}
      </td>
      <td data-label="1st order">{first}</td>
      <td data-label="2nd − 1st">{difference}</td>
    </tr>
  );
}

/** Says for a screen reader where a finger left the cursor; the slider itself speaks to the keyboard. */
function RestingCursor({ view, sample }: Omit<CursorTableProps, 'stale'>) {
  const [said, setSaid] = useState('');
  useSignalEffect(() => {
    const at = sample.value;
    const timer = setTimeout(() => {
      const values = view.changes.map((change) => `${change.title} ${ordersText(change, at)}`);
      setSaid(`${view.moment(at)}: ${values.join(', ')}`);
    }, restMs);
    return () => clearTimeout(timer);
  });
  return (
    <p class="hidden-visually" aria-live="polite">
      {said}
    </p>
  );
}
