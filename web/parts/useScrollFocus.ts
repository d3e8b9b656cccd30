/** A box that scrolls takes the focus, so that the arrow keys can scroll it; one that does not stays out of the way. */
import type { RefObject } from 'preact';
import { useEffect, useRef } from 'preact/hooks';

export function useScrollFocus<Box extends HTMLElement>(axis: 'x' | 'y'): RefObject<Box | null> {
  const box = useRef<Box>(null);
  useEffect(() => {
    const element = box.current;
    if (!element) return;
    const watcher = new ResizeObserver(() => look(element, axis));
    watcher.observe(element);
    return () => watcher.disconnect();
  }, [axis]);
  // After every render too: what is in the box changes its scroll, but not its size.
  useEffect(() => {
    if (box.current) look(box.current, axis);
  });
  return box;
}

function look(element: HTMLElement, axis: 'x' | 'y'): void {
  const over = axis === 'x' ? element.scrollWidth - element.clientWidth : element.scrollHeight - element.clientHeight;
  if (over > 0) element.tabIndex = 0;
  else element.removeAttribute('tabindex');
}
