/** The page's side of the worker that searches repeat tracks. */
import type { RepeatRequest } from '../../core/index';
import { createLane, type Job } from './lane';
import type { TracksAnswer } from './searchTracks';
import type { WorkerCalls } from './worker';

export type { Job } from './lane';

export interface Work {
  searchTracks(request: RepeatRequest, onShare: (share: number) => void): Job<TracksAnswer>;
}

export function createWork(): Work {
  const lane = createLane<WorkerCalls>(
    () => new Worker(new URL('./worker.ts', import.meta.url), { type: 'module', name: 'driftbook-work' }),
  );
  return {
    searchTracks: (request, onShare) => lane.run<TracksAnswer>(async (calls) => calls.searchTracks(request, onShare)),
  };
}
