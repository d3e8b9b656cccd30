/** Fingers, mouse and wheel on the chart: drag the mark, pan, pinch, double tap for the whole. */
import type { Candidate } from '../../../core/index';
import type { Frame } from '../../parts/frame';
import type { Chart } from './chartState';
import { type MarkDrag, startedDrag } from './markDrag';
import { distance, pannedBy, pinchedBy, type Spot, zoomAt } from './steering';

export interface Gestures {
  /** Puts the orbit back to where a drag took it from; false where none is going on. */
  cancelDrag(): boolean;
  end(): void;
}

export interface GestureParts {
  readonly element: HTMLElement;
  readonly chart: Chart;
  readonly frame: Frame;
  /** Told when a drag that moved the orbit is over, with the draft before it. */
  readonly onMoved: (before: Candidate) => void;
}

export function listenToGestures({ element, chart, frame, onMoved }: GestureParts): Gestures {
  const spots = new Map<number, Spot>();
  const isDoubleTap = tapCounter();
  let drag: MarkDrag | null = null;
  const finish = () => {
    const before = drag?.finish();
    drag = null;
    if (before) onMoved(before);
  };
  const cancelDrag = () => {
    const cancelled = drag;
    drag = null;
    cancelled?.cancel();
    return cancelled !== null;
  };
  const place = (event: MouseEvent): Spot => spotIn(element, event);
  const stop = listen(element, {
    ...wheelOf(chart, place),
    pointerdown: (event) => {
      if (event.button !== 0) return;
      element.setPointerCapture(event.pointerId);
      spots.set(event.pointerId, place(event));
      if (spots.size > 1) finish();
      else drag = startedDrag({ chart, frame, event, spot: place(event) });
      isDoubleTap.down(event, spots.size);
    },
    pointermove: (event) => {
      const before = spots.get(event.pointerId);
      if (!before) return;
      const now = place(event);
      spots.set(event.pointerId, now);
      if (drag) drag.follow(event);
      else steer(chart, { before, now, other: otherThan(spots, event.pointerId) });
    },
    pointerup: (event) => {
      if (!spots.delete(event.pointerId)) return;
      finish();
      if (isDoubleTap.up(event)) chart.zoom.value = null;
    },
    pointercancel: (event) => {
      if (spots.delete(event.pointerId)) cancelDrag();
    },
  });
  return {
    cancelDrag,
    end: () => {
      stop();
      finish();
    },
  };
}

function wheelOf(chart: Chart, place: (event: MouseEvent) => Spot): Handlers {
  return {
    wheel: (event) => {
      event.preventDefault();
      zoomAt(chart, Math.exp(-event.deltaY * wheelPerPx), place(event));
    },
    contextmenu: (event) => event.preventDefault(),
  };
}

const wheelPerPx = 0.002;

function spotIn(element: HTMLElement, event: MouseEvent): Spot {
  const box = element.getBoundingClientRect();
  return { x: event.clientX - box.left, y: event.clientY - box.top };
}

function otherThan(spots: ReadonlyMap<number, Spot>, id: number): Spot | undefined {
  return [...spots].find(([each]) => each !== id)?.[1];
}

interface Steering {
  readonly before: Spot;
  readonly now: Spot;
  readonly other: Spot | undefined;
}

function steer(chart: Chart, { before, now, other }: Steering): void {
  if (other) pinchedBy(chart, { before, now, other });
  else pannedBy(chart, { x: now.x - before.x, y: now.y - before.y });
}

const tapMs = 320;
const tapPx = 9;

/** Two taps, neither of which moved, soon after one another in the same place. */
function tapCounter() {
  type Moment = Spot & { readonly timeStamp: number };
  const momentOf = ({ clientX: x, clientY: y, timeStamp }: PointerEvent): Moment => ({ x, y, timeStamp });
  let down: Moment | null = null;
  let lastTap: Moment | null = null;
  const isNear = (one: Moment | null, other: Moment, px: number) =>
    one !== null && other.timeStamp - one.timeStamp < tapMs && distance(one, other) < px;
  return {
    down: (event: PointerEvent, fingers: number) => {
      down = fingers === 1 ? momentOf(event) : null;
    },
    up: (event: PointerEvent): boolean => {
      const now = momentOf(event);
      if (!isNear(down, now, tapPx)) return false;
      const isDouble = isNear(lastTap, now, 3 * tapPx);
      lastTap = isDouble ? null : now;
      return isDouble;
    },
  };
}

type Handlers = { [Name in keyof HTMLElementEventMap]?: (event: HTMLElementEventMap[Name]) => void };

/** Not passive, so that neither the page nor the system takes the gesture. */
function listen(element: HTMLElement, handlers: Handlers): () => void {
  const pairs = Object.entries(handlers) as [string, EventListener][];
  for (const [name, handler] of pairs) element.addEventListener(name, handler, { passive: false });
  return () => {
    for (const [name, handler] of pairs) element.removeEventListener(name, handler);
  };
}
