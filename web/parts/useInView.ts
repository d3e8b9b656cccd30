import type { RefObject } from 'preact';
import { useEffect, useRef } from 'preact/hooks';

/** Which items of a list, named by `data-reading`, are on the screen now. All count as seen before that is known. */
export function useInView(list: RefObject<HTMLElement | null>, count: number): (id: string) => boolean {
  const hidden = useRef(new Set<string>());
  useEffect(() => {
    if (!list.current || count === 0) return;
    const items = list.current.children;
    const observer = new IntersectionObserver((entries) => {
      for (const { target, isIntersecting } of entries) {
        const id = (target as HTMLElement).dataset['reading'] ?? '';
        if (isIntersecting) hidden.current.delete(id);
        else hidden.current.add(id);
      }
    });
    for (const item of items) observer.observe(item);
    return () => observer.disconnect();
  }, [list, count]);
  return (id) => !hidden.current.has(id);
}
