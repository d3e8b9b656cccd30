import { useEffect, useRef, useState } from 'preact/hooks';

/** Width of an element in CSS pixels, followed as it changes; 0 before it is known. */
export function useWidth<Target extends Element>() {
  const ref = useRef<Target>(null);
  const [width, setWidth] = useState(0);
  useEffect(() => {
    const target = ref.current;
    if (!target) return;
    const observer = new ResizeObserver(([entry]) => setWidth(Math.round(entry?.contentRect.width ?? 0)));
    observer.observe(target);
    return () => observer.disconnect();
  }, []);
  return { ref, width };
}
