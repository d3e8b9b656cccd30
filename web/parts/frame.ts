/** One animation frame for all that is drawn by hand: what is asked for twice is done once, what follows is done in the same frame. */
export interface Frame {
  /** Runs the task in the next frame, or in this one where it is asked for during a frame. */
  request(task: () => void): void;
  end(): void;
}

export function createFrame(): Frame {
  const tasks = new Set<() => void>();
  let handle = 0;
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
      if (handle === 0) handle = requestAnimationFrame(run);
    },
    end: () => {
      cancelAnimationFrame(handle);
      tasks.clear();
    },
  };
}
