/** The mission in numbers: where the cursor stands, and over the span at five moments. */
import { type Signal, useSignalEffect } from '@preact/signals';
import { useState } from 'preact/hooks';
import type { MissionView } from './missionView';
import type { Quantity } from './quantities';

/** A moving cursor is not read out; where it comes to rest is. */
const restMs = 900;

interface TableProps {
  readonly view: MissionView;
  readonly sample: Signal<number>;
}

export function MissionCursorTable({ view, sample }: TableProps) {
  const at = sample.value;
  return (
    <section class="drift-table" aria-label="Values at the cursor">
      <table>
        <caption>
          <span>At the cursor</span> <strong>{view.moment(at)}</strong>
        </caption>
        <thead>
          <tr>
            <th scope="col">quantity</th>
            <th scope="col">averaged</th>
            <th scope="col">2nd order</th>
            <th scope="col">1st order</th>
          </tr>
        </thead>
        <tbody>
          {view.quantities.map((quantity) => (
            <tr key={quantity.id}>
              <Name quantity={quantity} />
              <td class="drift-main" data-label="averaged">
                {quantity.averaged(at)}
              </td>
              <td data-label="2nd order">{quantity.second?.(at) ?? ''}</td>
              <td data-label="1st order">{quantity.first?.(at) ?? ''}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <RestingCursor view={view} sample={sample} />
    </section>
  );
}

function Name({ quantity: { title, unit, hue } }: { readonly quantity: Quantity }) {
  return (
    <th scope="row" class={`mark-${hue}`}>
      {title} <span class="unit">{unit}</span>
    </th>
  );
}

/** Says for a screen reader where a finger left the cursor; the slider itself speaks to the keyboard. */
function RestingCursor({ view, sample }: TableProps) {
  const [said, setSaid] = useState('');
  useSignalEffect(() => {
    const at = sample.value;
    const timer = setTimeout(() => {
      const values = view.quantities.map(({ title, unit, averaged }) => `${title} ${averaged(at)} ${unit}`);
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

const parts = [0, 0.25, 0.5, 0.75, 1] as const;

/** So that every plot can be read without pointing at it. */
export function MissionSpanTable({ view }: { readonly view: MissionView }) {
  const samples = parts.map((part) => Math.round(part * view.last));
  return (
    <section class="drift-table mission-span" aria-label="Values over the span">
      <table>
        <caption>
          <span>Over the span</span> <span class="soft small">averaged</span>
        </caption>
        <thead>
          <tr>
            <th scope="col">quantity</th>
            {samples.map((at) => (
              <th key={at} scope="col">
                <Moment text={view.moment(at)} />
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {view.quantities.map((quantity) => (
            <tr key={quantity.id}>
              <Name quantity={quantity} />
              {samples.map((at) => (
                <td key={at} data-label={view.moment(at)}>
                  {quantity.averaged(at)}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}

/** Year above month and day: five dates stand side by side. */
function Moment({ text }: { readonly text: string }) {
  const [date = '', time] = text.split(' ');
  return (
    <>
      <span>{date.slice(0, 4)}</span> <span>{date.slice(5)}</span> {time && <span>{time}</span>}
    </>
  );
}
