/** Time of a call: the median of 15 runs, each over many calls. */

export interface Task {
  readonly name: string;
  /** Calls that one `run` makes. */
  readonly calls: number;
  /** Makes the calls and returns something that depends on all of them, so that none can be left out. */
  readonly run: () => number;
}

export interface Timing {
  readonly name: string;
  readonly nsPerCall: number;
}

const runs = 15;
/** Before the first run that counts: enough for the engine to have compiled every task. */
const warmUps = 4;

/** Runs the tasks by turns, so that a slow moment of the machine falls on all alike. */
export function measure(tasks: readonly Task[], nowMs: () => number): readonly Timing[] {
  const times = tasks.map((): number[] => []);
  for (let run = 0; run < warmUps + runs; run += 1) {
    tasks.forEach((task, index) => {
      const start = nowMs();
      const result = task.run();
      const elapsedMs = nowMs() - start;
      if (!Number.isFinite(result)) throw new Error(`${task.name} gave ${result}, a finite number was expected`);
      if (run >= warmUps) times[index]?.push((elapsedMs * 1e6) / task.calls);
    });
  }
  return tasks.map(({ name }, index) => ({ name, nsPerCall: median(times[index] ?? []) }));
}

function median(values: readonly number[]): number {
  return [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? Number.NaN;
}
