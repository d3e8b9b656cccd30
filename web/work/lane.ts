/**
 * A worker of one kind of work and the page's side of it. It is started with the first call and kept; cancelling ends
 * it, so that it takes effect at once whatever is being computed, and the next call starts another.
 */
import { type Remote, remoteCalls } from './calls';

export interface Job<Answer> {
  /** Null where the job was cancelled; rejected where the worker could not be loaded or failed. */
  readonly answer: Promise<Answer | null>;
  cancel(): void;
}

export interface Lane<Calls> {
  run<Answer>(call: (calls: Remote<Calls>) => Promise<Answer>): Job<Answer>;
}

interface Started<Calls> {
  readonly worker: Worker;
  readonly calls: Remote<Calls>;
  /** Settles only where the worker fails, which a call then waiting would never hear. */
  readonly failure: Promise<never>;
}

export function createLane<Calls>(newWorker: () => Worker): Lane<Calls> {
  let started: Started<Calls> | null = null;
  const end = (which: Started<Calls>) => {
    which.worker.terminate();
    if (started === which) started = null;
  };
  return {
    run: (call) => {
      started ??= start<Calls>(newWorker());
      const current = started;
      let cancel = () => {};
      const cancelled = new Promise<null>((resolve) => {
        cancel = () => {
          end(current);
          resolve(null);
        };
      });
      const answer = Promise.race([call(current.calls), cancelled, current.failure]).catch((error: unknown) => {
        end(current);
        throw error;
      });
      return { answer, cancel: () => cancel() };
    },
  };
}

function start<Calls>(worker: Worker): Started<Calls> {
  const failure = new Promise<never>((_, reject) => {
    worker.addEventListener('error', (event) => reject(new Error(event.message || 'The worker could not be loaded')));
  });
  // Heard by the call that waits, if one does.
  failure.catch(() => undefined);
  return { worker, calls: remoteCalls<Calls>(worker), failure };
}
