/** A box that scrolls takes the focus, so that the arrow keys can scroll it; one that does not stays out of the way. */
import type { RefObject } from 'preact';
import { useEffect, useRef } from 'preact/hooks';

export function useScrollFocus<Box extends HTMLElement>(axis: 'x' | 'y'): RefObject<Box | null> {
  const box = useRef<Box>(null);
  useEffect(() => {
    const element = box.current;
    if (!element) return;
    const sizes = new ResizeObserver(() => look(element, axis));
    const watch = () => {
      for (const each of [element, ...element.children]) sizes.observe(each);
    };
    // Parts that are fetched later come without a render of whoever holds the box.
    const children = new MutationObserver(watch);
    children.observe(element, { childList: true });
    watch();
    return () => {
      sizes.disconnect();
      children.disconnect();
    };
  }, [axis]);
  return box;
}

function look(element: HTMLElement, axis: 'x' | 'y'): void {
  const over = axis === 'x' ? element.scrollWidth - element.clientWidth : element.scrollHeight - element.clientHeight;
  if (over > 0) element.tabIndex = 0;
  else element.removeAttribute('tabindex');
}
