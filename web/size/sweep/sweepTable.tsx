/** The sweep in about nine rows, for those who read rather than look. */
import { sweptWords } from '../../../core/index';
import { quantityText } from '../../parts/readingText';
import { useScrollFocus } from '../../parts/useScrollFocus';
import { type SweepShown, sweepRow, tableSamples } from './sweepModel';

export function SweepTable({ shown }: { readonly shown: SweepShown }) {
  const { sweep, reading, writing } = shown;
  const box = useScrollFocus<HTMLDivElement>('x');
  const { unit } = quantityText(reading.quantity, 0, writing.readingUnit);
  const hasLimits = writing.limits.length > 0;
  return (
    <div class="sweep-scroll" ref={box}>
      <table class="sweep-table">
        <caption>
          {writing.label}
          {unit === '' ? '' : `, ${unit}`}
        </caption>
        <thead>
          <tr>
            <th scope="col">{sweptWords[sweep.request.element].label}</th>
            <th scope="col">{sweep.first ? 'Second order' : 'Value'}</th>
            {sweep.first && <th scope="col">First order</th>}
            {hasLimits && <th scope="col">Limits</th>}
          </tr>
        </thead>
        <tbody>
          {tableSamples(shown.grid.length).map((sample) => {
            const row = sweepRow(shown, sample);
            return (
              <tr key={sample}>
                <th scope="row">{row.place}</th>
                <td>{row.value}</td>
                {row.first !== null && <td>{row.first}</td>}
                {hasLimits && <td>{row.broken.length > 0 ? <BrokenMark broken={row.broken} /> : 'kept'}</td>}
              </tr>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}

function BrokenMark({ broken }: { readonly broken: readonly string[] }) {
  return <span class="margin is-broken">breaks {broken.join(', ')}</span>;
}
