/** One drag of the candidate's mark, from finger down to finger up. */
import type { Candidate, ChartPoint } from '../../../core/index';
import type { Frame } from '../../parts/frame';
import type { Chart } from './chartState';
import { dragMotion } from './dragGain';
import { moveTo } from './moveOrbit';
import { distance, type Spot } from './steering';

export interface MarkDrag {
  follow(event: PointerEvent): void;
  /** Answers the draft before the drag; null where the drag changed nothing. */
  finish(): Candidate | null;
  cancel(): void;
}

/** Half of the 48 px that a finger needs. */
const touchRadius = 24;
const mouseRadius = 16;

export interface DragStart {
  readonly chart: Chart;
  readonly frame: Frame;
  readonly event: PointerEvent;
  readonly spot: Spot;
}

/** Null where the mark was not hit, or nothing may be changed. */
export function startedDrag({ chart, frame, event, spot }: DragStart): MarkDrag | null {
  const mapping = chart.mapping.peek();
  const start = chart.point.peek();
  if (!mapping || !start || chart.app.store.tabs.editorElsewhere.peek()) return null;
  const radius = event.pointerType === 'mouse' ? mouseRadius : touchRadius;
  const mark = { x: mapping.x(start.inclinationRad), y: mapping.y(start.altitudeKm) };
  if (distance(spot, mark) > radius) return null;
  const before = chart.app.document.draft.peek();
  const motion = dragMotion(event);
  /** Where the finger has brought the orbit, before snapping. */
  let at: ChartPoint = start;
  let gain = 1;
  let isMoved = false;
  // Events come faster than frames; the orbit moves once a frame.
  const apply = () => {
    if (isMoved) moveTo(chart, at, gain);
    isMoved = false;
  };
  const end = () => {
    isMoved = false;
    chart.isDragging.value = false;
  };
  chart.isDragging.value = true;
  return {
    follow: (moved) => {
      const { x, y, gain: now } = motion.move(moved);
      gain = now;
      at = {
        inclinationRad: within(
          at.inclinationRad + x / mapping.scale.perRad,
          mapping.window.fromRad,
          mapping.window.toRad,
        ),
        altitudeKm: within(at.altitudeKm - y / mapping.scale.perKm, mapping.window.fromKm, mapping.window.toKm),
      };
      isMoved = true;
      frame.request(apply);
    },
    finish: () => {
      apply();
      end();
      return chart.app.document.draft.peek() === before ? null : before;
    },
    cancel: () => {
      end();
      chart.app.document.restoreDraft(before);
    },
  };
}

function within(value: number, least: number, greatest: number): number {
  return Math.min(greatest, Math.max(least, value));
}
