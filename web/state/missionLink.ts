/** The mission's place in the app's state: fetched with its worker when Drift is first looked at, kept from then on. */
import { type ReadonlySignal, signal } from '@preact/signals';
import type { Mission, MissionParts } from './mission';

export interface MissionLink {
  /** Null until somebody asked for it. */
  readonly mission: ReadonlySignal<Mission | null>;
  /** Answers whether it could be had. */
  open(): Promise<boolean>;
}

export function createMissionLink(
  parts: Omit<MissionParts, 'work'>,
  load: () => Promise<(parts: Omit<MissionParts, 'work'>) => Mission>,
): MissionLink {
  const mission = signal<Mission | null>(null);
  return {
    mission,
    open: async () => {
      if (mission.peek()) return true;
      try {
        const create = await load();
        mission.value ??= create(parts);
        return true;
      } catch {
        // Out of reach for now: the next visit tries again.
        return false;
      }
    },
  };
}
