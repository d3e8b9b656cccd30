/**
 * The strip of equator crossings: one fundamental interval, from a pass to the next revolution's, and the day on which each
 * of its D places is flown. With a swath each crossing has its width, and the lowest line shows what is covered.
 */
import { type Cycle, type ResolvedOrbit, type TrackPattern, type TrackStep, trackSpacingAt } from '../../../core/index';
import { niceTicks } from '../../parts/drawing';
import { useWidth } from '../../parts/useWidth';
import { stripText } from './mapWords';
import { longitudeText } from './trackDrawn';

export interface StripProps {
  readonly orbit: ResolvedOrbit;
  readonly cycle: Cycle;
  readonly pattern: TrackPattern;
  readonly tracksStep: TrackStep;
  /** Of the first ascending crossing; null where it is not known. */
  readonly firstNodeRad: number | null;
  readonly swathKm: number | null;
}

const inset = { left: 48, right: 14, top: 10, bottom: 30 };
const mostHeightPx = 300;

export function CrossingStrip(props: StripProps) {
  const { ref, width } = useWidth<HTMLDivElement>();
  const { days } = props.cycle;
  const coverPx = props.swathKm === null ? 0 : 26;
  const height = Math.min(mostHeightPx, Math.max(60, days * 24)) + inset.top + inset.bottom + coverPx;
  const plot: Plot = {
    width,
    height,
    daysPx: height - inset.top - inset.bottom - coverPx,
    xOf: (slot) => inset.left + (slot / days) * Math.max(0, width - inset.left - inset.right),
  };
  return (
    <div class="map-strip" ref={ref}>
      {width > 0 && (
        <svg width={width} height={height} role="img" aria-label={stripText(props)}>
          <Days plot={plot} days={days} />
          <Longitudes plot={plot} {...props} />
          <Crossings plot={plot} {...props} />
        </svg>
      )}
    </div>
  );
}

interface Plot {
  readonly width: number;
  readonly height: number;
  readonly daysPx: number;
  /** Of a place in the interval, counted in spacings. */
  readonly xOf: (slot: number) => number;
}

const yOf = ({ daysPx }: Plot, day: number, days: number) => inset.top + ((day + 0.5) / days) * daysPx;

function Days({ plot, days }: { readonly plot: Plot; readonly days: number }) {
  const shown =
    days * 15 <= plot.daysPx
      ? Array.from({ length: days }, (_, index) => index + 1)
      : niceTicks(1, days, plot.daysPx / 34).filter((day) => day >= 1);
  return (
    <g>
      {shown.map((day) => {
        const y = yOf(plot, day - 1, days);
        return (
          <g key={day}>
            <path class="map-grid" d={`M${inset.left} ${y}H${plot.width - inset.right}`} />
            <text class="map-label" x={inset.left - 8} y={y} dy="0.35em" text-anchor="end">
              {day}
            </text>
          </g>
        );
      })}
    </g>
  );
}

/** The mark of a node is a square. */
function Crossings({ plot, cycle, pattern, ...props }: StripProps & { readonly plot: Plot }) {
  const { days } = cycle;
  const half = Math.min(4.5, Math.max(1, (plot.daysPx / days) * 0.35));
  const swathSlots = slotsOf({ ...props, cycle });
  const coverY = plot.height - inset.bottom - 8;
  return (
    <g>
      {pattern.dayOfSlot.map((day, slot) => {
        const [x, y] = [plot.xOf(slot), yOf(plot, day, days)];
        const reach = swathSlots === null ? [] : clipped(plot, slot, swathSlots, days);
        return (
          // A place of the interval is what it is known by.
          <g key={slot}>
            {reach.map((each, part) => (
              <path key={part} class="map-swath" d={each(y)} />
            ))}
            {reach.map((each, part) => (
              <path key={part} class="map-cover" d={each(coverY)} />
            ))}
            <rect class="map-crossing" x={x - half} y={y - half} width={2 * half} height={2 * half} />
          </g>
        );
      })}
      {swathSlots !== null && (
        <text class="map-label" x={inset.left - 8} y={coverY} dy="0.35em" text-anchor="end">
          all
        </text>
      )}
    </g>
  );
}

/** Width of a swath along the equator, in spacings. */
function slotsOf({ orbit, cycle, tracksStep, swathKm }: Omit<StripProps, 'pattern'>): number | null {
  if (swathKm === null) return null;
  const grid = { ...cycle, inclinationRad: orbit.mean.inclinationRad, tracksStep };
  const spacing = trackSpacingAt(orbit.body, grid, 0);
  return spacing && swathKm / spacing.acrossTrackKm;
}

/** The swath around a place as lines; what reaches over one end of the interval comes in at the other. */
function clipped(plot: Plot, slot: number, width: number, days: number): readonly ((y: number) => string)[] {
  const [from, to] = [slot - width / 2, slot + width / 2];
  return [-days, 0, days].flatMap((shift) => {
    const [low, high] = [Math.max(0, from + shift), Math.min(days, to + shift)];
    return high > low ? [(y: number) => `M${plot.xOf(low)} ${y}H${plot.xOf(high)}`] : [];
  });
}

function Longitudes({ plot, cycle, pattern, firstNodeRad }: StripProps & { readonly plot: Plot }) {
  const count = Math.max(1, Math.floor((plot.width - inset.left - inset.right) / 90));
  const every = Math.max(1, Math.ceil(cycle.days / count));
  const slots = Array.from({ length: Math.floor(cycle.days / every) + 1 }, (_, index) => index * every);
  const y = plot.height - 8;
  return (
    <g>
      {slots.map((slot) => {
        const eastRad = slot * pattern.spacingRad;
        const text = firstNodeRad === null ? degreesEast(eastRad) : longitudeText(firstNodeRad + eastRad, 2);
        const x = plot.xOf(slot);
        const anchor = x < inset.left + 20 ? 'start' : x > plot.width - inset.right - 30 ? 'end' : 'middle';
        return (
          <g key={slot}>
            <path class="map-grid" d={`M${x} ${inset.top}V${plot.height - inset.bottom + 4}`} />
            <text class="map-label" x={x} y={y} text-anchor={anchor}>
              {text}
            </text>
          </g>
        );
      })}
    </g>
  );
}

function degreesEast(rad: number): string {
  return `+${((rad * 180) / Math.PI).toFixed(2)}°`;
}
