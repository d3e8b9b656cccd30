/** The second look: every force integrated over the first month, and what that says of the other methods. */
import { apsisName } from '../../../core/index';
import { useApp } from '../../state/appContext';
import type { Mission } from '../../state/mission';
import { secondLookDays, type TakenLook } from '../../state/secondLook';
import { judgedOf, type LookRow } from './lookWords';

interface OfMission {
  readonly mission: Mission;
}

export function SecondLookView({ mission }: OfMission) {
  const { status, taken, stale } = mission.secondLook;
  const now = status.value;
  return (
    <section class="look" aria-label="Second look">
      <h2>Second look</h2>
      <div role="status">
        {now.kind === 'stopped' && <p class="soft small">The second look was stopped.</p>}
        {now.kind === 'failed' && <p class="is-caution small">The second look failed: {now.message}</p>}
      </div>
      {taken.value ? (
        <Judged taken={taken.value} isStale={stale.value} />
      ) : (
        <p class="soft small">
          Integrates the same orbit with the same forces over {secondLookDays} days, and judges the other methods by it.
        </p>
      )}
    </section>
  );
}

function Judged({ taken, isStale }: { readonly taken: TakenLook; readonly isStale: boolean }) {
  const { preferences } = useApp();
  const judged = judgedOf(taken, apsisName(taken.request.body));
  const { endedBy } = taken.look;
  if (!judged) return <p class="is-caution small">The orbit is over as it begins.</p>;
  const isLonger = preferences.values.value.spanDays > 3 * judged.days;
  return (
    <div class={isStale ? 'is-stale' : ''}>
      {isStale && <p class="stale-says">Of an earlier orbit or other forces: take it again.</p>}
      <p class="look-says">
        {judged.sentence}
        {endedBy === 'decay' && ' There the orbit decays.'}
        {endedBy === 'escape' && ' There the ellipse opens.'}
      </p>
      <LookTable rows={judged.rows} days={judged.days} />
      {isLonger && (
        <button type="button" onClick={() => void preferences.set('spanDays', secondLookDays)}>
          Show these {secondLookDays} days in the plots
        </button>
      )}
    </div>
  );
}

function LookTable({ rows, days }: { readonly rows: readonly LookRow[]; readonly days: number }) {
  return (
    <div class="drift-table look-table">
      <table>
        <caption>
          <span>Change in {Math.round(days)} days</span> <span class="soft small">others less integrated</span>
        </caption>
        <thead>
          <tr>
            <th scope="col">mean</th>
            <th scope="col">integrated</th>
            <th scope="col">averaged</th>
            <th scope="col">2nd order</th>
            <th scope="col">1st order</th>
          </tr>
        </thead>
        <tbody>
          {rows.map(({ id, title, unit, hue, ...row }) => (
            <tr key={id}>
              <th scope="row" class={`mark-${hue}`}>
                {title} <span class="unit">{unit}</span>
              </th>
              <td data-label="integrated">{row.integrated}</td>
              <td class="drift-main" data-label="averaged">
                {row.averaged}
              </td>
              <td data-label="2nd order">{row.second}</td>
              <td data-label="1st order">{row.first}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
