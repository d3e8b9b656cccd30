/**
 * The mission of the candidate: its settings, and what the averaged method makes of orbit, span and settings. Computed in
 * a worker while somebody looks on; a newer request ends an older one. What was computed last stays, named by its key,
 * until something newer is there.
 */
import { batch, computed, effect, type ReadonlySignal, type Signal, signal } from '@preact/signals';
import {
  changedPlans,
  type HeadlineSpan,
  localTimeClaim,
  type MissionChange,
  type MissionSettings,
  type ResolvedOrbit,
  readMissionSettings,
} from '../../core/index';
import type { Job } from '../work/lane';
import type { HistoryPart, LedgerPart, MissionRequest, SkyPart } from '../work/missionCalls';
import type { MissionWork } from '../work/missionWork';
import type { OrbitDocument } from './document';
import { outcomeOf } from './missionOutcome';
import { type Wanted, wantedOf } from './missionRequest';
import { createSecondLook, type SecondLookState } from './secondLook';

export interface MissionResult {
  readonly key: string;
  readonly request: MissionRequest;
  readonly orbit: ResolvedOrbit;
  readonly history: HistoryPart;
  /** Null while they are being computed. */
  readonly sky: SkyPart | null;
  readonly ledger: LedgerPart | null;
}

export type MissionStatus =
  | { readonly kind: 'idle' | 'done' | 'stopped' }
  /** `isNoticed` once it has gone on for so long that people notice. */
  | { readonly kind: 'working'; readonly share: number; readonly isNoticed: boolean }
  | { readonly kind: 'failed'; readonly message: string };

export interface Mission {
  readonly settings: ReadonlySignal<MissionSettings>;
  readonly wanted: ReadonlySignal<Wanted>;
  readonly status: ReadonlySignal<MissionStatus>;
  readonly result: ReadonlySignal<MissionResult | null>;
  /** True where the result is not what is wanted now. */
  readonly stale: ReadonlySignal<boolean>;
  /** What Size may say about local time; null where no history of the orbit at hand is there. */
  readonly claim: ReadonlySignal<readonly HeadlineSpan[] | null>;
  readonly secondLook: SecondLookState;
  change(change: MissionChange): void;
  /** Computes while somebody looks; answers a call that ends the looking. */
  watch(): () => void;
  cancel(): void;
  again(): void;
}

export interface MissionParts {
  readonly document: OrbitDocument;
  readonly spanDays: ReadonlySignal<number>;
  readonly work: MissionWork;
}

/** Time without a change after which the work starts, ms. */
const restMs = 300;
const noticedMs = 200;

export function createMission({ document, spanDays, work }: MissionParts): Mission {
  const settings = computed(() => readMissionSettings(document.draft.value.plans));
  const wanted = computed(() =>
    wantedOf({
      orbit: document.orbit.value,
      nodeForm: document.draft.value.entry.nodeForm,
      spanDays: spanDays.value,
      settings: settings.value,
    }),
  );
  const key = computed(() => (wanted.value.kind === 'request' ? wanted.value.key : null));
  const runner = createRunner(work);
  const watchers = signal(0);
  followWanted({ wanted, key, runner, watchers });
  const { result, status } = runner;
  const stale = computed(() => result.value !== null && result.value.key !== key.value);
  return {
    settings,
    wanted,
    status,
    result,
    stale,
    claim: computed(() => claimOf(result.value, stale.value)),
    secondLook: createSecondLook({ wanted, work }),
    change: (change) => {
      const draft = document.draft.value;
      document.restoreDraft({ ...draft, plans: changedPlans(draft.plans, change) });
    },
    watch: () => {
      watchers.value += 1;
      return () => {
        watchers.value -= 1;
      };
    },
    cancel: runner.stop,
    again: () => {
      const now = wanted.value;
      if (now.kind === 'request') runner.start(now);
    },
  };
}

function claimOf(result: MissionResult | null, isStale: boolean): readonly HeadlineSpan[] | null {
  if (!result?.sky || isStale) return null;
  return localTimeClaim(outcomeOf(result.request, result.history, result.sky));
}

type WantedRequest = Extract<Wanted, { kind: 'request' }>;

interface Runner {
  readonly status: ReadonlySignal<MissionStatus>;
  readonly result: ReadonlySignal<MissionResult | null>;
  /** The key under way or finished, whether done, stopped or failed; null before the first. */
  known(): string | null;
  start(wanted: WantedRequest): void;
  /** Ends what runs because something else is wanted. */
  drop(): void;
  stop(): void;
}

interface Following {
  readonly wanted: ReadonlySignal<Wanted>;
  readonly key: ReadonlySignal<string | null>;
  readonly runner: Runner;
  readonly watchers: ReadonlySignal<number>;
}

/** What runs for an older request ends at once; the newer one starts when typing rests and somebody looks. */
function followWanted({ wanted, key, runner, watchers }: Following): void {
  let timer: ReturnType<typeof setTimeout> | undefined;
  const isWatched = computed(() => watchers.value > 0);
  effect(() => {
    const next = key.value;
    const looked = isWatched.value;
    clearTimeout(timer);
    if (runner.known() === next) return;
    runner.drop();
    if (next === null || !looked) return;
    const isFirst = runner.result.peek() === null;
    timer = setTimeout(
      () => {
        const now = wanted.peek();
        if (now.kind === 'request' && now.key === next) runner.start(now);
      },
      isFirst ? 0 : restMs,
    );
  });
}

function createRunner(work: MissionWork): Runner {
  const status = signal<MissionStatus>({ kind: 'idle' });
  const result = signal<MissionResult | null>(null);
  let current: { readonly key: string; readonly job: Job<true> } | null = null;
  let known: string | null = null;
  const drop = () => {
    const { job } = current ?? {};
    current = null;
    known = null;
    if (job) status.value = { kind: 'idle' };
    job?.cancel();
  };
  const start = (wanted: WantedRequest) => {
    drop();
    known = wanted.key;
    const job = runTold(work, { status, result }, wanted, () => current?.job === job);
    current = { key: wanted.key, job };
    void job.answer.finally(() => {
      if (current?.job === job) current = null;
    });
  };
  const stop = () => {
    const stopped = current;
    if (!stopped) return;
    drop();
    known = stopped.key;
    status.value = { kind: 'stopped' };
  };
  return { status, result, known: () => known, start, drop, stop };
}

type Told = { readonly status: Signal<MissionStatus>; readonly result: Signal<MissionResult | null> };

/** Starts a mission and tells how it goes and what came of it; its answer never rejects. */
function runTold(work: MissionWork, told: Told, wanted: WantedRequest, isCurrent: () => boolean): Job<true> {
  const { key, request, orbit } = wanted;
  let working = { kind: 'working' as const, share: 0, isNoticed: false };
  const note = (change: Partial<typeof working>) => {
    if (told.status.peek() !== working) return;
    working = { ...working, ...change };
    told.status.value = working;
  };
  const add = (part: Partial<MissionResult>) => {
    const { value } = told.result;
    if (isCurrent() && value?.key === key) told.result.value = { ...value, ...part };
  };
  let history: HistoryPart | null = null;
  told.status.value = working;
  const timer = setTimeout(() => note({ isNoticed: true }), noticedMs);
  const end = (status: MissionStatus) =>
    batch(() => {
      clearTimeout(timer);
      if (told.status.peek() === working) told.status.value = status;
    });
  const job = work.mission(request, {
    onHistory: (part) => {
      history = part;
      // The first lines there are come at once; later ones with their light, so that all is drawn anew only once.
      if (isCurrent() && !told.result.peek())
        told.result.value = { key, request, orbit, history, sky: null, ledger: null };
    },
    onSky: (sky) => {
      if (isCurrent() && history) told.result.value = { key, request, orbit, history, sky, ledger: null };
    },
    onLedger: (ledger) => add({ ledger }),
    onShare: (share) => note({ share }),
  });
  const answer = job.answer.then(
    (done) => {
      end(done ? { kind: 'done' } : { kind: 'idle' });
      return done;
    },
    (error: unknown) => {
      end({ kind: 'failed', message: error instanceof Error ? error.message : String(error) });
      return null;
    },
  );
  return { answer, cancel: job.cancel };
}
