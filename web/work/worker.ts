/** The worker: what takes longer than a frame runs here, one call at a time. */
import { answerCalls } from './calls';
import { buffersOf, searchTracks, type TracksAnswer } from './searchTracks';

const calls = { searchTracks };

export type WorkerCalls = typeof calls;

answerCalls(calls, (answer) => {
  const tracks = answer as TracksAnswer;
  return tracks.ok ? buffersOf(tracks.columns) : [];
});
