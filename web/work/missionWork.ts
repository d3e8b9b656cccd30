/** The page's side of missions: one job of each kind at a time, each ended by ending its worker. */
import { createLane, type Job } from './lane';
import type { HistoryPart, LedgerPart, MissionRequest, SkyPart } from './missionCalls';
import type { MissionWorkerCalls } from './missionWorker';
import type { SecondLook, SecondLookRequest } from './secondLook';

export interface MissionListener {
  onHistory(part: HistoryPart): void;
  onSky(part: SkyPart): void;
  onLedger(part: LedgerPart): void;
  /** Of everything, 0 to 1. */
  onShare(share: number): void;
}

export interface MissionWork {
  /** History, then light and events, then the ledger; answers true once all of it was handed over. */
  mission(request: MissionRequest, listener: MissionListener): Job<true>;
  secondLook(request: SecondLookRequest, onShare: (share: number) => void): Job<SecondLook>;
}

/** What each stage takes of the whole, roughly: light and events begin and end here. */
const shares = { sky: 0.2, ledger: 0.35 } as const;

export function createMissionWork(): MissionWork {
  const newWorker = (name: string) =>
    new Worker(new URL('./missionWorker.ts', import.meta.url), { type: 'module', name });
  const missions = createLane<MissionWorkerCalls>(() => newWorker('driftbook-mission'));
  const looks = createLane<MissionWorkerCalls>(() => newWorker('driftbook-second-look'));
  return {
    mission: (request, listener) =>
      missions.run(async (calls) => {
        const { onShare } = listener;
        listener.onHistory(await calls.history(request, (share) => onShare(share * shares.sky)));
        onShare(shares.sky);
        listener.onSky(await calls.sky());
        onShare(shares.ledger);
        const left = 1 - shares.ledger;
        listener.onLedger(await calls.ledger((share) => onShare(shares.ledger + share * left)));
        return true as const;
      }),
    secondLook: (request, onShare) => looks.run(async (calls) => calls.secondLook(request, onShare)),
  };
}
