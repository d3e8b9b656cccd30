import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { bodies, type RepeatRequest } from '../../../../core/index';
import { createTrackSearch, keyOf } from '../../../../web/size/tracks/trackSearch';
import { columnsOf, type TracksAnswer } from '../../../../web/work/searchTracks';
import type { Job } from '../../../../web/work/work';

const requestOf = (maxDays: number): RepeatRequest => ({
  body: bodies.earth,
  theory: 'second',
  eccentricity: 0,
  inclination: { kind: 'sunSynchronous' },
  minAltitudeKm: 500,
  maxAltitudeKm: 700,
  maxDays,
});
const empty: TracksAnswer = { ok: true, columns: columnsOf([]), searched: [], tookMs: 1 };

/** A worker that answers when it is told to. */
function fakeWork() {
  const calls: {
    request: RepeatRequest;
    share: (share: number) => void;
    answer: (answer: TracksAnswer) => void;
    fail: () => void;
    cancelled: boolean;
  }[] = [];
  return {
    calls,
    searchTracks(request: RepeatRequest, share: (share: number) => void): Job<TracksAnswer> {
      let settle: (answer: TracksAnswer | null) => void = () => {};
      let fail = () => {};
      const answer = new Promise<TracksAnswer | null>((resolve, reject) => {
        settle = resolve;
        fail = () => reject(new Error('the worker is gone'));
      });
      const call = { request, share, answer: settle, fail, cancelled: false };
      calls.push(call);
      const cancel = () => {
        call.cancelled = true;
        settle(null);
      };
      return { answer, cancel };
    },
  };
}

const settled = () => vi.advanceTimersByTimeAsync(1);

beforeEach(() => {
  vi.useFakeTimers();
});
afterEach(() => {
  vi.useRealTimers();
});

describe('the search behind the list', () => {
  it('keeps what was found until something newer is', async () => {
    const work = fakeWork();
    const search = createTrackSearch(work);
    search.want(requestOf(12));
    work.calls[0]?.answer(empty);
    await settled();
    expect(search.found.value?.key).toBe(keyOf(requestOf(12)));
    expect(search.running.value).toBeNull();
    search.want(requestOf(13));
    expect(search.found.value?.key).toBe(keyOf(requestOf(12)));
    search.want(requestOf(12));
    work.calls[1]?.answer(empty);
    await settled();
    expect(work.calls).toHaveLength(2);
  });

  it('lets a quick search end, and then runs the newest that was wanted meanwhile', async () => {
    const work = fakeWork();
    const search = createTrackSearch(work);
    for (const days of [10, 11, 12]) search.want(requestOf(days));
    expect(work.calls.map(({ request }) => request.maxDays)).toEqual([10]);
    work.calls[0]?.answer(empty);
    await settled();
    expect(work.calls.map(({ request }) => request.maxDays)).toEqual([10, 12]);
    expect(work.calls[0]?.cancelled).toBe(false);
  });

  it('breaks off a long search for a newer one', () => {
    const work = fakeWork();
    const search = createTrackSearch(work);
    search.want(requestOf(400));
    search.want(requestOf(12));
    expect(work.calls.map(({ cancelled }) => cancelled)).toEqual([true, false]);
    expect(search.running.value?.request.maxDays).toBe(12);
  });

  it('shows that it runs only once it has gone on for a while, with how far it is', async () => {
    const work = fakeWork();
    const search = createTrackSearch(work);
    search.want(requestOf(400));
    expect(search.running.value?.isNoticed).toBe(false);
    await vi.advanceTimersByTimeAsync(200);
    work.calls[0]?.share(0.25);
    expect(search.running.value).toMatchObject({ isNoticed: true, share: 0.25 });
  });

  it('stops when cancelled, does not start by itself again, and does when asked', async () => {
    const work = fakeWork();
    const search = createTrackSearch(work);
    search.want(requestOf(400));
    search.cancel();
    expect(work.calls[0]?.cancelled).toBe(true);
    expect(search.running.value).toBeNull();
    await settled();
    search.want(requestOf(400));
    expect(work.calls).toHaveLength(1);
    search.again();
    expect(work.calls).toHaveLength(2);
    work.calls[1]?.answer(empty);
    await settled();
    expect(search.found.value?.request.maxDays).toBe(400);
  });

  it('tells what was refused, and that a worker failed', async () => {
    const work = fakeWork();
    const search = createTrackSearch(work);
    search.want(requestOf(0));
    work.calls[0]?.answer({ ok: false, reason: 'badInput', field: 'maxDays', message: 'Days from 1 to 400.' });
    await settled();
    expect(search.refused.value?.problem.field).toBe('maxDays');
    search.want(requestOf(5));
    work.calls[1]?.fail();
    await settled();
    expect(search.stopped.value?.text).toContain('failed');
    expect(search.running.value).toBeNull();
  });
});
