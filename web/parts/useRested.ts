import { useEffect, useRef, useState } from 'preact/hooks';

const restMs = 120;

/** The value as it last stood still for a moment; the newest where it has not changed since. */
export function useRested<Value>(value: Value): Value {
  const [rested, setRested] = useState(value);
  const latest = useRef({ value, sinceMs: 0 });
  const timer = useRef(0);
  if (latest.current.value !== value) latest.current = { value, sinceMs: performance.now() };
  useEffect(() => {
    if (rested === value || timer.current !== 0) return;
    // One timer for a whole drag, not one for each of its steps.
    const look = () => {
      const leftMs = latest.current.sinceMs + restMs - performance.now();
      timer.current = leftMs > 0 ? window.setTimeout(look, leftMs) : 0;
      if (leftMs <= 0) setRested(latest.current.value);
    };
    timer.current = window.setTimeout(look, restMs);
  }, [value, rested]);
  useEffect(() => () => clearTimeout(timer.current), []);
  return rested;
}
