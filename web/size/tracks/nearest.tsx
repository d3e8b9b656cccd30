/** The repeat tracks next to the orbit as it is, with the change of a that closes each. */
import {
  conditionEntry,
  formatNumber,
  kmPerLengthUnit,
  type NearestRepeat,
  type ResolvedOrbit,
} from '../../../core/index';
import { useApp } from '../../state/appContext';
import { nearestCycles } from './nearestCycles';
import { useTakeTrack } from './useTaking';

export function Nearest({ orbit }: { readonly orbit: ResolvedOrbit }) {
  const { document } = useApp();
  const isSunSynchronous = document.draft.value.conditions.some(
    (each) => conditionEntry(each)?.kind === 'sunSynchronous',
  );
  const result = nearestCycles(orbit, isSunSynchronous);
  if (!result.ok) return <p class="soft small">{result.message}</p>;
  return (
    <section class="tracks-nearest" aria-label="Repeat tracks next to this orbit">
      <h2>
        Next to this orbit <span class="soft small">change of a that closes the track</span>
      </h2>
      <ul>
        {result.repeats.toReversed().map((repeat) => (
          <li key={`${repeat.revolutions}/${repeat.days}`}>
            <NearestButton repeat={repeat} isSunSynchronous={isSunSynchronous} />
          </li>
        ))}
      </ul>
    </section>
  );
}

/** Closer than this an orbit is on the track: the texts of its entry say no more. */
const onTrackKm = 0.002;

interface ButtonProps {
  readonly repeat: NearestRepeat;
  readonly isSunSynchronous: boolean;
}

function NearestButton({ repeat, isSunSynchronous }: ButtonProps) {
  const { lengthUnit } = useApp().preferences.values.value;
  const { blocked, take } = useTakeTrack();
  const { revolutions, days, axisChangeKm } = repeat;
  const change = formatNumber(axisChangeKm / kmPerLengthUnit({ lengthUnit }), { digits: 2, plus: true });
  const isOn = Math.abs(axisChangeKm) < onTrackKm;
  return (
    <button
      type="button"
      class={isOn ? 'is-current' : ''}
      disabled={blocked}
      onClick={() => take(repeat, isSunSynchronous)}
    >
      <span class="tracks-nearest-cycle">
        {revolutions}/{days}
      </span>{' '}
      <span class="soft">{isOn ? 'flown now' : `${change} ${lengthUnit}`}</span>
    </button>
  );
}
