/** Local time at the cursor on the face of a day, with the box around where it started. */
import type { Signal } from '@preact/signals';
import { formatClock } from '../../../core/index';
import { Dial } from '../../parts/dial';
import type { MissionView } from './missionView';

export function LocalTimeDial({ view, sample }: { readonly view: MissionView; readonly sample: Signal<number> }) {
  const { history, request } = view.result;
  const { localTimeH } = history;
  if (!localTimeH) return <p class="soft small">{history.localTimeReason}</p>;
  const startH = localTimeH[0] ?? 0;
  const nowH = localTimeH[sample.value] ?? startH;
  const now = formatClock(nowH).slice(0, 5);
  const box = `box ${formatClock(startH - request.boxMinutes / 60).slice(0, 5)} to ${formatClock(startH + request.boxMinutes / 60).slice(0, 5)}`;
  const words = `Local time of the ${request.node} node at the cursor ${now}, at the start ${formatClock(startH).slice(0, 5)}; ${box}; the Sun stands at 12`;
  return (
    <figure class="dial-figure">
      <Dial startH={startH} nowH={nowH} boxH={request.boxMinutes / 60} words={words} />
      <figcaption>
        <strong class="mark-node">{now}</strong>
        <span>{request.node} node, mean Sun at 12</span>
        <span class="soft">{box}</span>
      </figcaption>
    </figure>
  );
}
