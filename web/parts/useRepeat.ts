/** A button that repeats while it is held down. */
import { useEffect, useRef } from 'preact/hooks';

const firstPauseMs = 420;
const pauseMs = 70;

/** Handlers for a button: one step at a tap or key, more while a finger rests on it. */
export function useRepeat(step: () => void) {
  const latest = useRef(step);
  latest.current = step;
  const timer = useRef<ReturnType<typeof setTimeout> | undefined>(undefined);
  const repeated = useRef(false);
  const stop = () => clearTimeout(timer.current);
  useEffect(() => stop, []);
  const again = () => {
    repeated.current = true;
    latest.current();
    timer.current = setTimeout(again, pauseMs);
  };
  return {
    // A field that is being typed in keeps the focus, and the keyboard stays.
    onMouseDown: (event: Event) => event.preventDefault(),
    onPointerDown: () => {
      repeated.current = false;
      stop();
      timer.current = setTimeout(again, firstPauseMs);
    },
    onPointerUp: stop,
    onPointerLeave: stop,
    onPointerCancel: stop,
    onContextMenu: (event: Event) => event.preventDefault(),
    // A long press has stepped already; the click that ends it is not one more.
    onClick: () => {
      if (!repeated.current) latest.current();
      repeated.current = false;
    },
  };
}
