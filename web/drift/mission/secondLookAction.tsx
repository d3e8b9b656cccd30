/** The button of the second look, and how far it has come. */
import type { Mission } from '../../state/mission';

/** The place's one action, in reach of a thumb. */
export function SecondLookAction({ mission }: { readonly mission: Mission }) {
  const { status, take, cancel } = mission.secondLook;
  const now = status.value;
  if (now.kind === 'working') {
    return (
      <div class="actions look-action">
        <progress aria-label="Second look" value={Math.round(now.share * 100)} max={100} />
        <button type="button" onClick={cancel}>
          Cancel second look
        </button>
      </div>
    );
  }
  return (
    <div class="actions">
      <button type="button" class="primary" disabled={mission.wanted.value.kind !== 'request'} onClick={take}>
        Second look
      </button>
    </div>
  );
}
