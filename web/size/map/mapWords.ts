/** The pictures of the track in words: the answer above them, and what a listener hears in their place. */
import { apsidesAt, formatNumber, kmPerLengthUnit, twoPi } from '../../../core/index';
import type { AnswerSpan } from '../tracks/answer';
import type { StripProps } from './crossingStrip';
import type { CycleAtHand } from './cycleAtHand';
import type { TrackDrawn } from './trackDrawn';

type Unit = 'km' | 'NM';

const count = (many: number, one: string) => `${formatNumber(many, { digits: 0 })} ${one}${many === 1 ? '' : 's'}`;

function distance(km: number, unit: Unit, digits: number): string {
  return `${formatNumber(km / kmPerLengthUnit({ lengthUnit: unit }), { digits })} ${unit}`;
}

/** A track closes where nobody on the ground could tell the difference. */
const closedKm = 0.1;

export interface AnswerParts {
  readonly atHand: CycleAtHand;
  readonly track: TrackDrawn;
  readonly props: Pick<StripProps, 'orbit' | 'pattern'>;
  readonly unit: Unit;
}

export function mapAnswer({ atHand, track, props, unit }: AnswerParts): readonly AnswerSpan[] {
  const { cycle, nearest } = atHand;
  const flown = `${count(cycle.revolutions, 'revolution')} in ${count(cycle.days, 'day')}`;
  if (nearest && Math.abs(nearest.axisChangeKm) > 0.002) {
    const change = formatNumber(nearest.axisChangeKm / kmPerLengthUnit({ lengthUnit: unit }), {
      digits: 2,
      plus: true,
    });
    return [
      { text: 'The track does not close', strong: true },
      { text: `: after ${flown} it ${gapText(track, unit)}. A change of a by ${change} ${unit} closes it.` },
    ];
  }
  return [
    { text: 'The track closes', strong: true },
    { text: ` after ${flown}.${apsidesAt(endText(track, unit), props.orbit.body)} ${neighbourText(props, unit)}` },
  ];
}

function gapText(track: TrackDrawn, unit: Unit): string {
  if (!track.isWhole) return 'misses its start';
  return `comes ${distance(Math.abs(track.gapKm), unit, 1)} ${side(track)} of where it began`;
}

/** Perigee goes round meanwhile, which shifts where an eccentric orbit crosses. */
function endText(track: TrackDrawn, unit: Unit): string {
  if (!track.isWhole || Math.abs(track.gapKm) < closedKm) return '';
  return ` Perigee has moved by then, so that it comes ${distance(Math.abs(track.gapKm), unit, 1)} ${side(track)} of where it began.`;
}

const side = ({ gapKm }: TrackDrawn) => (gapKm < 0 ? 'west' : 'east');

function neighbourText({ orbit, pattern }: AnswerParts['props'], unit: Unit): string {
  const apart = distance((orbit.body.equatorialRadiusKm * twoPi) / (twoPi / pattern.spacingRad), unit, 1);
  const { wholeDays } = [pattern.eastNeighbour, pattern.westNeighbour].reduce((one, other) =>
    other.wholeDays < one.wholeDays ? other : one,
  );
  const when = wholeDays === 0 ? 'on the same day' : `after ${count(wholeDays, 'day')}`;
  return `Tracks lie ${apart} apart at the equator; one beside the first is passed ${when}.`;
}

const mostSpoken = 40;

export function stripText({ cycle, pattern }: StripProps): string {
  const order = pattern.dayOfSlot.slice(0, mostSpoken).map((day) => day + 1);
  const more = cycle.days > mostSpoken ? ' and so on' : '';
  return `Equator crossings over one interval of ${count(cycle.days, 'spacing')}. From west to east they are flown on day ${order.join(', ')}${more}.`;
}

export function mapText(track: TrackDrawn, name: string): string {
  const revolutions = count(Math.round(track.revolutions), 'revolution');
  const closes = track.isWhole && Math.abs(track.gapKm) < closedKm ? ' It ends where it began.' : '';
  return `Ground track of ${revolutions} over ${name}: northward solid, southward dashed.${closes}`;
}
