/** Drag sideways on a label to change its value; up and down still scrolls the page. */
import { useRef } from 'preact/hooks';

/** A step for so many pixels; a slow drag passes few pixels and so steps finely. */
const pixelsPerStep = 9;

export function useDragSteps(step: (count: number) => void) {
  const start = useRef<{ readonly x: number; taken: number } | null>(null);
  return {
    onPointerDown: (event: PointerEvent) => {
      start.current = { x: event.clientX, taken: 0 };
      (event.currentTarget as Element).setPointerCapture(event.pointerId);
    },
    onPointerMove: (event: PointerEvent) => {
      if (!start.current) return;
      const steps = Math.trunc((event.clientX - start.current.x) / pixelsPerStep);
      if (steps === start.current.taken) return;
      step(steps - start.current.taken);
      start.current.taken = steps;
    },
    onPointerUp: () => {
      start.current = null;
    },
    onPointerCancel: () => {
      start.current = null;
    },
  };
}
