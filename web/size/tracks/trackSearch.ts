/**
 * The search behind the list: one at a time, always for the newest request. What was found last stays until something
 * newer is found, so that a half-typed number or a search that was stopped leaves the list in place.
 */
import { batch, type ReadonlySignal, type Signal, signal } from '@preact/signals';
import type { RepeatProblem, RepeatRequest } from '../../../core/index';
import type { TracksAnswer, TracksFound } from '../../work/searchTracks';
import type { Job, Work } from '../../work/work';

export interface Found {
  readonly key: string;
  readonly request: RepeatRequest;
  readonly answer: TracksFound;
}

export interface Running {
  readonly request: RepeatRequest;
  /** 0 to 1. */
  readonly share: number;
  /** False until it has gone on for so long that people notice. */
  readonly isNoticed: boolean;
}

export interface TrackSearch {
  readonly found: ReadonlySignal<Found | null>;
  readonly running: ReadonlySignal<Running | null>;
  /** What the search refused, for the request with this key. */
  readonly refused: ReadonlySignal<{ readonly key: string; readonly problem: RepeatProblem } | null>;
  /** The key of a request whose search was stopped or failed, with what to say. */
  readonly stopped: ReadonlySignal<{
    readonly key: string;
    readonly request: RepeatRequest;
    readonly text: string;
  } | null>;
  /** Searches unless that is done, refused, stopped or under way. */
  want(request: RepeatRequest): void;
  cancel(): void;
  again(): void;
}

export const keyOf = (request: RepeatRequest): string => JSON.stringify(request);

/** Cycles up to so long are found within a few frames: they run to their end rather than being broken off. */
const quickDays = 60;
const noticedMs = 150;

interface Current {
  readonly key: string;
  readonly request: RepeatRequest;
  readonly job: Job<TracksAnswer>;
}

type Told = {
  readonly [Name in 'found' | 'running' | 'refused' | 'stopped']: Signal<TrackSearch[Name]['value']>;
};

export function createTrackSearch(work: Pick<Work, 'searchTracks'>): TrackSearch {
  const told: Told = { found: signal(null), running: signal(null), refused: signal(null), stopped: signal(null) };
  let current: Current | null = null;
  let next: RepeatRequest | null = null;

  const drop = () => {
    const { job } = current ?? {};
    current = null;
    told.running.value = null;
    job?.cancel();
  };
  const start = (request: RepeatRequest) => {
    const job = runTold(work, told, request);
    current = { key: keyOf(request), request, job };
    void job.answer.finally(() => {
      if (current?.job !== job) return;
      current = null;
      if (next) want(next);
    });
  };
  const want = (request: RepeatRequest) => {
    const key = keyOf(request);
    const isKnown = [told.found, told.refused, told.stopped].some((each) => each.peek()?.key === key);
    next = null;
    if (current?.key === key) return;
    if (current && (isKnown || current.request.maxDays > quickDays)) drop();
    if (isKnown) return;
    if (current) next = request;
    else start(request);
  };
  const cancel = () => {
    if (!current) return;
    const { key, request } = current;
    drop();
    told.stopped.value = { key, request, text: 'The search was stopped.' };
  };
  const again = () => {
    const request = told.stopped.peek()?.request;
    told.stopped.value = null;
    if (request) want(request);
  };
  return { ...told, want, cancel, again };
}

/** Starts a search and tells how it goes and what came of it; its answer never rejects. */
function runTold(work: Pick<Work, 'searchTracks'>, told: Told, request: RepeatRequest): Job<TracksAnswer> {
  const key = keyOf(request);
  const running = { request, share: 0, isNoticed: false };
  let latest: Running = running;
  const note = (change: Partial<Running>) => {
    if (told.running.peek() !== latest) return;
    latest = { ...latest, ...change };
    told.running.value = latest;
  };
  told.running.value = latest;
  const job = work.searchTracks(request, (share) => note({ share }));
  const timer = setTimeout(() => note({ isNoticed: true }), noticedMs);
  const take = (answer: TracksAnswer | null) =>
    batch(() => {
      clearTimeout(timer);
      if (told.running.peek() === latest) told.running.value = null;
      if (answer?.ok) told.found.value = { key, request, answer };
      if (answer) told.refused.value = answer.ok ? null : { key, problem: answer };
      return answer;
    });
  const answer = job.answer.then(take, () => {
    told.stopped.value = { key, request, text: 'The search failed; try it again.' };
    return take(null);
  });
  return { answer, cancel: job.cancel };
}
