/** How the computation stands: progress with cancel, stopped, failed, or why there is none. */
import type { Mission } from '../../state/mission';
import { hashOf } from '../../state/route';

export function MissionStatusLine({ mission }: { readonly mission: Mission }) {
  const status = mission.status.value;
  if (status.kind === 'working' && status.isNoticed) {
    const percent = Math.round(status.share * 100);
    return (
      <div class="mission-status">
        <progress aria-label="Mission by the averaged method" value={percent} max={100} />
        <button type="button" onClick={mission.cancel}>
          Cancel
        </button>
      </div>
    );
  }
  return (
    <div role="status" class="mission-says">
      <Says mission={mission} />
    </div>
  );
}

function Says({ mission }: { readonly mission: Mission }) {
  const status = mission.status.value;
  const wanted = mission.wanted.value;
  if (wanted.kind === 'needsEpoch') return <NeedsEpoch />;
  if (wanted.kind === 'needsSettings') {
    return <p class="is-caution">A field under “Forces and box” cannot be read yet.</p>;
  }
  if (wanted.kind === 'refused') {
    return wanted.problems.map(({ field, message }) => (
      <p key={field} class="is-caution">
        {message}
      </p>
    ));
  }
  if (status.kind === 'stopped' || status.kind === 'failed') {
    return (
      <div class="mission-status">
        <p class="soft">{status.kind === 'failed' ? `It failed: ${status.message}` : 'The computation was stopped.'}</p>
        <button type="button" onClick={mission.again}>
          Compute the mission
        </button>
      </div>
    );
  }
  const isOver = mission.result.value?.history.columns.days.length === 1;
  return isOver ? (
    <p class="is-caution">
      {mission.result.value?.history.endMessage} The orbit is over as it begins: it has no history.
    </p>
  ) : null;
}

function NeedsEpoch() {
  return (
    <p class="soft">
      Rates of now only: type an epoch in <a href={hashOf('size')}>Size</a>, and the mission is computed over dates,
      with Sun, Moon, drag, light and events.
    </p>
  );
}
