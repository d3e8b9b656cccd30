/**
 * One animation frame for all that is drawn by hand: what is asked for twice is done once, what follows is done in the same
 * frame. While a text is being typed, drawings wait until the fingers rest: the numbers come first.
 */
import { isTextField } from './textField';

export interface Frame {
  /** Runs the task in the next frame, or in this one where it is asked for during a frame. */
  request(task: () => void): void;
  end(): void;
}

/** Longer than the pause between two keystrokes of a quick hand. */
const restMs = 160;

export function createFrame(): Frame {
  const tasks = new Set<() => void>();
  let handle = 0;
  let timer: ReturnType<typeof setTimeout> | undefined;
  let isRunning = false;
  const soon = () => {
    if (handle === 0) handle = requestAnimationFrame(run);
  };
  const run = () => {
    handle = 0;
    isRunning = true;
    try {
      // Tasks added on the way are visited too.
      for (const task of tasks) {
        tasks.delete(task);
        task();
      }
    } finally {
      isRunning = false;
      // One that fails takes nothing from those behind it.
      if (tasks.size > 0) soon();
    }
  };
  return {
    request: (task) => {
      tasks.add(task);
      if (isRunning) return;
      clearTimeout(timer);
      if (isTextField(document.activeElement)) timer = setTimeout(soon, restMs);
      else soon();
    },
    end: () => {
      cancelAnimationFrame(handle);
      clearTimeout(timer);
      tasks.clear();
    },
  };
}
