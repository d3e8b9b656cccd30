/** Pointer handlers that move the cursor: drag across, or tap. Scrolling up and down stays the browser's. */
import { useRef } from 'preact/hooks';
import { sampleAt, steersCursor } from './plotCursor';

export function useCursorDrag(last: number, onSample: (sample: number) => void) {
  const startPx = useRef<number | null>(null);
  const set = (event: PointerEvent & { readonly currentTarget: HTMLElement }) => {
    const box = event.currentTarget.getBoundingClientRect();
    onSample(sampleAt(event.clientX - box.left, box.width, last));
  };
  const isSteering = (event: PointerEvent) =>
    startPx.current !== null && steersCursor(event.pointerType, event.clientX - startPx.current);
  return {
    onPointerDown: (event: PointerEvent & { readonly currentTarget: HTMLElement }) => {
      if (event.button !== 0) return;
      startPx.current = event.clientX;
      event.currentTarget.setPointerCapture(event.pointerId);
      if (isSteering(event)) set(event);
    },
    onPointerMove: (event: PointerEvent & { readonly currentTarget: HTMLElement }) => {
      if (isSteering(event)) set(event);
    },
    onPointerUp: (event: PointerEvent & { readonly currentTarget: HTMLElement }) => {
      if (startPx.current !== null) set(event);
      startPx.current = null;
    },
    onPointerCancel: () => {
      startPx.current = null;
    },
  };
}
