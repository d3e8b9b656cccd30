/** The whole span at five moments, so that every plot can be read without pointing at it. */
import { numbersAt } from './changes';
import type { DriftView } from './driftView';

const parts = [0, 0.25, 0.5, 0.75, 1] as const;

export function SpanTable({ view, stale }: { readonly view: DriftView; readonly stale: string }) {
  const last = view.drift.days.length - 1;
  const samples = parts.map((part) => Math.round(part * last));
  return (
    <section class={`drift-table drift-table-span${stale}`}>
      <table>
        <caption>
          <span>Over the span</span> <span class="soft small">second order, first order below</span>
        </caption>
        <thead>
          <tr>
            <th scope="col">{view.time.epochJd === null ? 'day' : 'date'}</th>
            {view.changes.map(({ id, title, unit }) => (
              <th key={id} scope="col">
                {title} <span class="unit">{unit.short}</span>
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {samples.map((sample) => (
            <tr key={sample}>
              <th scope="row">
                <Moment text={view.moment(sample).replace(/^day /, '')} />
              </th>
              {view.changes.map((change) => (
                <TwoOrders
                  key={change.id}
                  label={`${change.title} ${change.unit.short}`}
                  {...numbersAt(change, sample)}
                />
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}

interface TwoOrdersProps {
  readonly label: string;
  readonly first: string;
  readonly second: string;
}

function TwoOrders({ label, first, second }: TwoOrdersProps) {
  return (
    <td data-label={label}>
      <span class="drift-main">{second}</span>
      <span class="soft small">
        <span class="hidden-visually">first order </span>
        {first}
      </span>
    </td>
  );
}

/** A date and its time stay whole; the line breaks between them. */
function Moment({ text }: { readonly text: string }) {
  const [date, time] = text.split(' ');
  return (
    <>
      <span>{date}</span> {time && <span>{time}</span>}
    </>
  );
}
