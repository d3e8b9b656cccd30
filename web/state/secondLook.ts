/** The second look at the mission's first days: taken when asked for, ended at once, kept until the next. */
import { computed, type ReadonlySignal, signal } from '@preact/signals';
import type { Job } from '../work/lane';
import type { MissionWork } from '../work/missionWork';
import type { SecondLook, SecondLookRequest } from '../work/secondLook';
import type { Wanted } from './missionRequest';

export interface TakenLook {
  readonly key: string;
  readonly request: SecondLookRequest;
  readonly look: SecondLook;
}

export type LookStatus =
  | { readonly kind: 'idle' | 'stopped' }
  | { readonly kind: 'working'; readonly share: number }
  | { readonly kind: 'failed'; readonly message: string };

export interface SecondLookState {
  readonly status: ReadonlySignal<LookStatus>;
  readonly taken: ReadonlySignal<TakenLook | null>;
  /** True where what was taken is of another orbit or other forces than those at hand. */
  readonly stale: ReadonlySignal<boolean>;
  take(): void;
  cancel(): void;
}

/** Long enough for a month's worth of every force, short enough to wait for. */
export const secondLookDays = 30;

export function createSecondLook({
  wanted,
  work,
}: {
  readonly wanted: ReadonlySignal<Wanted>;
  readonly work: Pick<MissionWork, 'secondLook'>;
}): SecondLookState {
  const status = signal<LookStatus>({ kind: 'idle' });
  const taken = signal<TakenLook | null>(null);
  const request = computed(() => requestOf(wanted.value));
  const key = computed(() => request.value && JSON.stringify(request.value));
  let current: Job<SecondLook> | null = null;
  const end = (next: LookStatus) => {
    const job = current;
    current = null;
    status.value = next;
    job?.cancel();
  };
  const take = () => {
    const asked = request.value;
    if (!asked) return;
    end({ kind: 'working', share: 0 });
    const job = work.secondLook(asked, (share) => {
      if (current === job) status.value = { kind: 'working', share };
    });
    current = job;
    job.answer.then(
      (look) => {
        if (current !== job || !look) return;
        current = null;
        taken.value = { key: JSON.stringify(asked), request: asked, look };
        status.value = { kind: 'idle' };
      },
      (error: unknown) => {
        if (current !== job) return;
        current = null;
        status.value = { kind: 'failed', message: error instanceof Error ? error.message : String(error) };
      },
    );
  };
  return {
    status,
    taken,
    stale: computed(() => taken.value !== null && taken.value.key !== key.value),
    take,
    cancel: () => {
      if (current) end({ kind: 'stopped' });
    },
  };
}

function requestOf(wanted: Wanted): SecondLookRequest | null {
  if (wanted.kind !== 'request') return null;
  const { stretches: _stretches, boxMinutes: _box, ...rest } = wanted.request;
  return { ...rest, spanDays: secondLookDays };
}
