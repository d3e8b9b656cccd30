import { signal } from '@preact/signals';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { createMission } from '../../../web/state/mission';
import type { Job } from '../../../web/work/lane';
import { createMissionCalls, type MissionRequest } from '../../../web/work/missionCalls';
import type { MissionListener, MissionWork } from '../../../web/work/missionWork';
import type { SecondLook } from '../../../web/work/secondLook';
import { candidateOf, documentOf } from './support';

interface Started<Answer> {
  readonly request: MissionRequest;
  readonly listener: MissionListener;
  readonly finish: (answer: Answer) => void;
  readonly fail: (error: Error) => void;
  cancelled: boolean;
}

/** Work that stands still until the test moves it. */
function fakeWork() {
  const missions: Started<true>[] = [];
  const looks: { finish: (look: SecondLook) => void; cancelled: boolean }[] = [];
  const work: MissionWork = {
    mission: (request, listener) => {
      let settle: { finish: (answer: true | null) => void; fail: (error: Error) => void } | null = null;
      const answer = new Promise<true | null>((finish, fail) => {
        settle = { finish, fail };
      });
      const started: Started<true> = {
        request,
        listener,
        cancelled: false,
        finish: (done) => settle?.finish(done),
        fail: (error) => settle?.fail(error),
      };
      missions.push(started);
      return {
        answer,
        cancel: () => {
          started.cancelled = true;
          settle?.finish(null);
        },
      };
    },
    secondLook: (): Job<SecondLook> => {
      let finish: (look: SecondLook | null) => void = () => undefined;
      const answer = new Promise<SecondLook | null>((resolve) => {
        finish = resolve;
      });
      const look = { finish: (found: SecondLook) => finish(found), cancelled: false };
      looks.push(look);
      return {
        answer,
        cancel: () => {
          look.cancelled = true;
          finish(null);
        },
      };
    },
  };
  return { work, missions, looks };
}

const texts = { perigeeAltitude: '561', apogeeAltitude: '575', inclination: '97.68', node: '120', epoch: '2028-01-01' };

function start(given: typeof texts | Omit<typeof texts, 'epoch'> = texts) {
  const document = documentOf(candidateOf(given));
  const spanDays = signal(30);
  const { work, missions, looks } = fakeWork();
  return { document, spanDays, mission: createMission({ document, spanDays, work }), missions, looks };
}

/** Hands over what a real worker would. */
function serve({ request, listener }: Started<true>): void {
  const calls = createMissionCalls();
  listener.onHistory(calls.history(request, () => undefined));
  listener.onSky(calls.sky());
  listener.onLedger(calls.ledger(() => undefined));
}

beforeEach(() => {
  vi.useFakeTimers();
});
afterEach(() => {
  vi.useRealTimers();
});
const settle = () => vi.advanceTimersByTimeAsync(0);

describe('a mission', () => {
  it('is computed only while somebody looks', async () => {
    const { mission, missions } = start();
    await vi.advanceTimersByTimeAsync(1000);
    expect(missions.length).toBe(0);
    mission.watch();
    await settle();
    expect(missions.length).toBe(1);
    expect(mission.status.value.kind).toBe('working');
  });

  it('needs an epoch, and says so', async () => {
    const { epoch: _, ...rest } = texts;
    const { mission, missions } = start(rest);
    mission.watch();
    await vi.advanceTimersByTimeAsync(1000);
    expect(mission.wanted.value.kind).toBe('needsEpoch');
    expect(missions.length).toBe(0);
  });

  it('keeps what it came to with the request it came from, and claims local time for it', async () => {
    const { mission, missions } = start();
    mission.watch();
    await settle();
    const [first] = missions;
    if (!first) throw new Error('Expected a mission under way');
    serve(first);
    first.finish(true);
    await settle();
    expect(mission.status.value).toEqual({ kind: 'done' });
    expect(mission.stale.value).toBe(false);
    expect(mission.result.value?.ledger?.rows.length).toBeGreaterThan(4);
    expect(mission.claim.value?.map(({ text }) => text).join('')).toMatch(
      /^Local time of the ascending node runs from/,
    );
  });

  it('ends an older request at once and starts the newer when typing rests; the old result stays, stale and without a claim', async () => {
    const { document, mission, missions } = start();
    mission.watch();
    await settle();
    const [first] = missions;
    if (!first) throw new Error('Expected a mission under way');
    serve(first);
    document.setText('inclination', '97.7');
    expect(first.cancelled).toBe(true);
    expect(mission.stale.value).toBe(true);
    expect(mission.claim.value).toBeNull();
    await vi.advanceTimersByTimeAsync(200);
    document.setText('inclination', '97.75');
    await vi.advanceTimersByTimeAsync(200);
    expect(missions.length).toBe(1);
    await vi.advanceTimersByTimeAsync(200);
    expect(missions.length).toBe(2);
    const known = mission.result.value;
    if (!known?.sky) throw new Error('Expected the old result to stay');
    first.listener.onSky({ ...known.sky, tookMs: 0 });
    expect(mission.result.value).toBe(known);
  });

  it('is not computed again for what it came to already, nor for a name', async () => {
    const { document, mission, missions } = start();
    mission.watch();
    await settle();
    missions[0]?.finish(true);
    document.setCandidate({ name: 'Other' });
    await vi.advanceTimersByTimeAsync(1000);
    expect(missions.length).toBe(1);
  });

  it('is computed anew when the box or a force changes, and keeps both with the candidate', async () => {
    const { document, mission, missions } = start();
    mission.watch();
    await settle();
    mission.change({ moon: false, texts: { boxMinutes: '5' } });
    await vi.advanceTimersByTimeAsync(400);
    expect(missions.at(-1)?.request).toMatchObject({ boxMinutes: 5, forces: { moon: false } });
    expect(document.draft.value.plans).toEqual({ drift: { moon: false, texts: { boxMinutes: '5' } } });
    expect(document.changed.value).toBe(true);
  });

  it('waits for settings that can be read', async () => {
    const { mission, missions } = start();
    mission.watch();
    await settle();
    mission.change({ texts: { zonalDegree: '99' } });
    await vi.advanceTimersByTimeAsync(1000);
    expect(mission.wanted.value.kind).toBe('needsSettings');
    expect(missions.length).toBe(1);
    expect(missions[0]?.cancelled).toBe(true);
  });

  it('refuses a span out of range with a message', () => {
    const { mission, spanDays } = start();
    spanDays.value = 6000;
    const wanted = mission.wanted.value;
    expect(wanted.kind === 'refused' && wanted.problems[0]?.message).toMatch(/15 years/);
  });

  it('stops when it is told to, stays stopped, and starts again when asked', async () => {
    const { mission, missions } = start();
    mission.watch();
    await settle();
    mission.cancel();
    expect(missions[0]?.cancelled).toBe(true);
    expect(mission.status.value).toEqual({ kind: 'stopped' });
    await vi.advanceTimersByTimeAsync(1000);
    expect(missions.length).toBe(1);
    mission.again();
    expect(missions.length).toBe(2);
  });

  it('says why it failed', async () => {
    const { mission, missions } = start();
    mission.watch();
    await settle();
    missions[0]?.fail(new Error('no memory'));
    await settle();
    expect(mission.status.value).toEqual({ kind: 'failed', message: 'no memory' });
  });
});

describe('the second look', () => {
  it('is taken when asked for, over 30 days, and goes stale with the orbit', async () => {
    const { document, mission, looks } = start();
    expect(looks.length).toBe(0);
    mission.secondLook.take();
    expect(mission.secondLook.status.value).toEqual({ kind: 'working', share: 0 });
    looks[0]?.finish({} as SecondLook);
    await settle();
    expect(mission.secondLook.taken.value?.request.spanDays).toBe(30);
    expect(mission.secondLook.stale.value).toBe(false);
    document.setText('inclination', '98');
    expect(mission.secondLook.stale.value).toBe(true);
  });

  it('is ended at once', () => {
    const { mission, looks } = start();
    mission.secondLook.take();
    mission.secondLook.cancel();
    expect(looks[0]?.cancelled).toBe(true);
    expect(mission.secondLook.status.value).toEqual({ kind: 'stopped' });
  });
});
