/** How far the mark follows the finger: all the way when quick, an eighth of it when slow, for a fine drag. */
const slowPxPerMs = 0.015;
const quickPxPerMs = 0.12;
const finest = 0.125;

export function dragGain(speedPxPerMs: number): number {
  const share = Math.min(1, Math.max(0, (speedPxPerMs - slowPxPerMs) / (quickPxPerMs - slowPxPerMs)));
  return finest + (1 - finest) * share;
}

export interface DragMotion {
  /** One movement of the pointer; answers what the mark moves by, and the gain, 0 to 1. */
  move(event: Pick<PointerEvent, 'clientX' | 'clientY' | 'timeStamp'>): {
    readonly x: number;
    readonly y: number;
    readonly gain: number;
  };
}

/** Share of a new speed in the speed that counts: hands tremble, and events bunch. */
const freshness = 0.4;

export function dragMotion(start: Pick<PointerEvent, 'clientX' | 'clientY' | 'timeStamp'>): DragMotion {
  let last = start;
  let speed = quickPxPerMs;
  return {
    move: (event) => {
      const [x, y] = [event.clientX - last.clientX, event.clientY - last.clientY];
      const elapsedMs = Math.max(1, event.timeStamp - last.timeStamp);
      speed += freshness * (Math.hypot(x, y) / elapsedMs - speed);
      last = event;
      const gain = dragGain(speed);
      return { x: gain * x, y: gain * y, gain };
    },
  };
}
