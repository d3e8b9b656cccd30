/** The worker: what takes longer than a frame runs here, one call at a time. */
import { expose, transfer } from 'comlink';
import type { RepeatRequest } from '../../core/index';
import { buffersOf, searchTracks, type TracksAnswer } from './searchTracks';

const calls = {
  searchTracks(request: RepeatRequest, onShare: (share: number) => void): TracksAnswer {
    const answer = searchTracks(request, onShare);
    return answer.ok ? transfer(answer, buffersOf(answer.columns)) : answer;
  },
};

export type WorkerCalls = typeof calls;

expose(calls);
