/** What happens, with dates: a tap brings the cursor there. Passes of perigee come many at a time and are folded away. */
import type { Signal } from '@preact/signals';
import { degPerRad, formatClock, formatNumber, isoFromJulianDate, type MissionEvent } from '../../../core/index';
import type { MissionView } from './missionView';

export interface EventsListProps {
  readonly view: MissionView;
  readonly sample: Signal<number>;
}

const groups = [
  { id: 'clock', title: 'Local time', kinds: /^(box|outsideBox|localTimeBack)/ },
  { id: 'end', title: 'Altitude and end', kinds: /^(altitudeBelow|decay|escape)/ },
  { id: 'eclipse', title: 'Eclipse seasons', kinds: /^eclipses/ },
  { id: 'beta', title: 'β', kinds: /^beta/ },
  { id: 'perigee', title: 'Perigee passes', kinds: /^perigee/ },
] as const;

/** More of one kind than this are folded. */
const mostInView = 4;

export function EventsList({ view, sample }: EventsListProps) {
  const { sky } = view.result;
  if (!sky) return <p class="soft small">Events are being looked for.</p>;
  const { events, leftOut } = sky.events;
  return (
    <section class="events" aria-label="Events">
      <h2>Events</h2>
      {events.length === 0 && <p class="soft small">Nothing of note happens in this span.</p>}
      {groups.map(({ id, title, kinds }) => (
        <EventGroup
          key={id}
          title={title}
          events={events.filter(({ kind }) => kinds.test(kind))}
          {...{ view, sample }}
        />
      ))}
      {leftOut.map(({ what, reason }) => (
        <p key={what} class="soft small">
          {reason}
        </p>
      ))}
    </section>
  );
}

interface EventGroupProps extends EventsListProps {
  readonly title: string;
  readonly events: readonly MissionEvent[];
}

function EventGroup({ title, events, view, sample }: EventGroupProps) {
  if (events.length === 0) return null;
  const list = (
    <ul>
      {events.map((event) => (
        <EventRow key={`${event.kind}${event.days}`} event={event} view={view} sample={sample} />
      ))}
    </ul>
  );
  if (events.length <= mostInView) return list;
  return (
    <details class="fold">
      <summary>
        <span class="fold-title">{title}</span>{' '}
        <span class="fold-says">
          {events.length}, first {dateText(events[0])}
        </span>
      </summary>
      {list}
    </details>
  );
}

const dateText = (event: MissionEvent | undefined): string => (event ? isoFromJulianDate(event.jd).slice(0, 10) : '–');

function EventRow({ event, view, sample }: EventsListProps & { readonly event: MissionEvent }) {
  const toCursor = () => {
    sample.value = Math.max(0, Math.min(view.last, Math.round((event.days / view.time.spanDays) * view.last)));
  };
  return (
    <li>
      <button type="button" class="plain event" onClick={toCursor}>
        <time dateTime={dateText(event)}>{dateText(event)}</time>
        <span>
          {event.words}
          {valueText(event)}
        </span>
      </button>
    </li>
  );
}

function valueText({ value }: MissionEvent): string {
  if (!value) return '';
  const { quantity, amount } = value;
  switch (quantity) {
    case 'localTimeH':
      return `, ${formatClock(amount).slice(0, 5)}`;
    case 'altitudeKm':
      return `, ${formatNumber(amount, { digits: 0 })} km`;
    case 'betaRad':
      return amount === 0 ? '' : `, ${formatNumber(amount * degPerRad, { digits: 1, plus: true })}°`;
    case 'perigeeRad':
      return '';
  }
}
