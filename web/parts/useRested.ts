import { effect, type ReadonlySignal, useSignal } from '@preact/signals';
import { useEffect } from 'preact/hooks';

const restMs = 220;

/** What the signal held when it last stood still for a moment. */
export function useRested<Value>(source: ReadonlySignal<Value>): Value {
  const rested = useSignal(source.peek());
  useEffect(() => {
    let timer = 0;
    let changedMs = 0;
    // One timer for a whole drag, not one for each of its steps.
    const look = () => {
      const leftMs = changedMs + restMs - performance.now();
      timer = leftMs > 0 ? window.setTimeout(look, leftMs) : 0;
      if (leftMs <= 0) rested.value = source.peek();
    };
    const stop = effect(() => {
      if (source.value === rested.peek()) return;
      changedMs = performance.now();
      if (timer === 0) timer = window.setTimeout(look, restMs);
    });
    return () => {
      clearTimeout(timer);
      stop();
    };
  }, [source, rested]);
  return rested.value;
}
