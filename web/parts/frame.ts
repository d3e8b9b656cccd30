/**
 * One animation frame for all that is drawn by hand: what is asked for twice is done once, what follows is done in the same
 * frame. While a text is being typed, drawings come after the frame that shows the numbers.
 */
import { isTextField } from './textField';

export interface Frame {
  /** Runs the task in the next frame, or in this one where it is asked for during a frame. */
  request(task: () => void): void;
  end(): void;
}

export function createFrame(): Frame {
  const tasks = new Set<() => void>();
  let handle = 0;
  let timer: ReturnType<typeof setTimeout> | undefined;
  const run = () => {
    // Tasks added on the way are visited too.
    for (const task of tasks) {
      tasks.delete(task);
      task();
    }
    handle = 0;
  };
  return {
    request: (task) => {
      tasks.add(task);
      if (handle !== 0) return;
      const later = () => {
        timer = setTimeout(run);
      };
      handle = requestAnimationFrame(isTextField(document.activeElement) ? later : run);
    },
    end: () => {
      cancelAnimationFrame(handle);
      clearTimeout(timer);
      tasks.clear();
    },
  };
}
