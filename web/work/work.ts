/**
 * The page's side of the worker. It is started with the first call and kept; cancelling ends it, so that it takes effect
 * at once whatever is being computed, and the next call starts another.
 */
import { proxy, type Remote, wrap } from 'comlink';
import type { RepeatRequest } from '../../core/index';
import type { TracksAnswer } from './searchTracks';
import type { WorkerCalls } from './worker';

export interface Job<Answer> {
  /** Null where the job was cancelled; rejected where the worker could not be loaded or failed. */
  readonly answer: Promise<Answer | null>;
  cancel(): void;
}

export interface Work {
  searchTracks(request: RepeatRequest, onShare: (share: number) => void): Job<TracksAnswer>;
}

interface Started {
  readonly worker: Worker;
  readonly calls: Remote<WorkerCalls>;
  /** Settles only where the worker fails, which a call then waiting would never hear. */
  readonly failure: Promise<never>;
}

export function createWork(): Work {
  let started: Started | null = null;
  const end = (which: Started) => {
    which.worker.terminate();
    if (started === which) started = null;
  };
  return {
    searchTracks: (request, onShare) => {
      started ??= start();
      const current = started;
      let cancel = () => {};
      const cancelled = new Promise<null>((resolve) => {
        cancel = () => {
          end(current);
          resolve(null);
        };
      });
      const called = current.calls.searchTracks(request, proxy(onShare));
      const answer = Promise.race([called, cancelled, current.failure]).catch((error: unknown) => {
        end(current);
        throw error;
      });
      return { answer, cancel: () => cancel() };
    },
  };
}

function start(): Started {
  const worker = new Worker(new URL('./worker.ts', import.meta.url), { type: 'module', name: 'driftbook-work' });
  const failure = new Promise<never>((_, reject) => {
    worker.addEventListener('error', (event) => reject(new Error(event.message || 'The worker could not be loaded')));
  });
  // Heard by the call that waits, if one does.
  failure.catch(() => undefined);
  return { worker, calls: wrap<WorkerCalls>(worker), failure };
}
