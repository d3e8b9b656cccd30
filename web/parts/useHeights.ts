import type { RefObject } from 'preact';
import { useLayoutEffect, useState } from 'preact/hooks';

/** Height of an element and of a line of its text, in px, as the page is laid out now. */
export function useHeights(element: RefObject<HTMLElement | null>) {
  const [heights, setHeights] = useState({ heightPx: 0, linePx: 0 });
  useLayoutEffect(() => {
    const box = element.current;
    if (!box) return;
    const measure = () =>
      setHeights({ heightPx: box.clientHeight, linePx: Number.parseFloat(getComputedStyle(box).lineHeight) || 18 });
    const sizes = new ResizeObserver(measure);
    sizes.observe(box);
    measure();
    return () => sizes.disconnect();
  }, [element]);
  return heights;
}
