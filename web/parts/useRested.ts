import { useEffect, useState } from 'preact/hooks';

const restMs = 120;

/** The value as it last stood still for a moment; the newest where it has not changed since. */
export function useRested<Value>(value: Value): Value {
  const [rested, setRested] = useState(value);
  useEffect(() => {
    if (rested === value) return;
    const timer = setTimeout(() => setRested(value), restMs);
    return () => clearTimeout(timer);
  }, [value, rested]);
  return rested;
}
