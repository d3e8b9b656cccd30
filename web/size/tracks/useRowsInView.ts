/** Which rows of a long list are in view, and the keys that walk through it. */
import type { RefObject } from 'preact';
import { useEffect, useLayoutEffect, useRef, useState } from 'preact/hooks';

/** Rows kept above and below those in view, so that a flick shows no blank. */
const spare = 6;

interface Window {
  readonly scrollPx: number;
  /** Below the head. */
  readonly heightPx: number;
  readonly rowPx: number;
}

export interface RowsInView {
  readonly box: RefObject<HTMLDivElement | null>;
  readonly places: readonly number[];
  readonly rowPx: number;
  /** The place at which the Tab key stops. */
  readonly stop: number;
  onScroll(): void;
  onKeyDown(event: KeyboardEvent): void;
}

/** The box scrolls a table with a head that stays; when the list changes, it goes back to its top. */
export function useRowsInView(list: Uint32Array): RowsInView {
  const count = list.length;
  const box = useRef<HTMLDivElement>(null);
  const [seen, setSeen] = useState<Window>({ scrollPx: 0, heightPx: 0, rowPx: 48 });
  const [stop, setStop] = useState(0);
  const look = () => {
    if (box.current) setSeen(windowOf(box.current));
  };
  const isThere = count > 0;
  useEffect(() => {
    if (!isThere || !box.current) return;
    const watcher = new ResizeObserver(look);
    watcher.observe(box.current);
    return () => watcher.disconnect();
  }, [isThere]);
  useLayoutEffect(() => {
    if (box.current) box.current.scrollTop = 0;
    setStop(0);
    look();
  }, [list]);
  const focusOn = useFocusOnRow(box);
  const { scrollPx, heightPx, rowPx } = seen;
  const first = Math.max(0, Math.floor(scrollPx / rowPx) - spare);
  const last = Math.min(count - 1, Math.ceil((scrollPx + heightPx) / rowPx) + spare);
  const go = (place: number) => {
    setStop(place);
    focusOn(place);
    if (box.current) scrollTo(box.current, place, seen);
    look();
  };
  return {
    box,
    places: Array.from({ length: Math.max(0, last - first + 1) }, (_, index) => first + index),
    rowPx,
    stop: stop >= first && stop <= last ? stop : Math.min(last, Math.ceil(scrollPx / rowPx)),
    onScroll: look,
    onKeyDown: (event) => {
      const from = placeOf(event.target);
      const pageRows = Math.max(1, Math.floor(heightPx / rowPx) - 1);
      const to = from === null ? null : placeAfter(event.key, from, pageRows, count);
      if (to === null) return;
      event.preventDefault();
      go(to);
    },
  };
}

/** Gives the focus to a row once it has been drawn. */
function useFocusOnRow(box: RefObject<HTMLDivElement | null>): (place: number) => void {
  const wanted = useRef<number | null>(null);
  useEffect(() => {
    if (wanted.current === null) return;
    const button = box.current?.querySelector<HTMLElement>(`[data-place="${wanted.current}"]`);
    if (!button) return;
    wanted.current = null;
    button.focus({ preventScroll: true });
  });
  return (place) => {
    wanted.current = place;
  };
}

function scrollTo(element: HTMLElement, place: number, { heightPx, rowPx }: Window): void {
  const topPx = place * rowPx;
  element.scrollTop = Math.max(topPx + rowPx - heightPx, Math.min(topPx, element.scrollTop));
}

function windowOf(element: HTMLElement): Window {
  const headPx = element.querySelector('thead')?.clientHeight ?? 0;
  return {
    scrollPx: element.scrollTop,
    heightPx: Math.max(0, element.clientHeight - headPx),
    rowPx: rowPxOf(element),
  };
}

function rowPxOf(element: HTMLElement): number {
  const rem = Number.parseFloat(getComputedStyle(document.documentElement).fontSize);
  const rows = Number.parseFloat(getComputedStyle(element).getPropertyValue('--row-rem'));
  return Math.max(48, Math.round(rem * (rows || 3)));
}

function placeOf(target: EventTarget | null): number | null {
  const text = target instanceof HTMLElement ? target.dataset['place'] : undefined;
  return text === undefined ? null : Number(text);
}

/** Where a key leads from a place; null for other keys. */
export function placeAfter(key: string, from: number, pageRows: number, count: number): number | null {
  const steps: Readonly<Record<string, number>> = {
    ArrowDown: 1,
    ArrowUp: -1,
    PageDown: pageRows,
    PageUp: -pageRows,
    Home: -count,
    End: count,
  };
  const step = steps[key];
  return step === undefined ? null : Math.min(count - 1, Math.max(0, from + step));
}
