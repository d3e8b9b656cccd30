/**
 * Asks the browser to keep the storage when space runs short. Asked once, at the user's first save, since
 * some browsers put the question to the user and it makes sense only then.
 */
import { computed, type ReadonlySignal } from '@preact/signals';
import type { SettingsKeeper } from './settings';

export type PersistenceAnswer = 'granted' | 'refused' | 'unsupported' | 'notAsked';

export interface StorageEstimateBytes {
  readonly usedBytes: number;
  readonly availableBytes: number;
}

export interface Persistence {
  readonly answer: ReadonlySignal<PersistenceAnswer>;
  /** Asks at the first call ever on this device; later calls return the remembered answer. */
  askAtFirstSave(): Promise<PersistenceAnswer>;
  /** Looks, without asking, whether a remembered refusal has been lifted, as some browsers do once the app is installed. */
  look(): Promise<PersistenceAnswer>;
  /** Rough use and room of this origin; null where the browser does not tell. */
  estimate(): Promise<StorageEstimateBytes | null>;
}

type StorageAsk = Partial<Pick<StorageManager, 'persist' | 'persisted' | 'estimate'>>;

const browserStorage = (): StorageAsk | undefined =>
  typeof navigator === 'undefined' ? undefined : (navigator.storage as StorageAsk | undefined);

async function ask(storage: StorageAsk | undefined): Promise<Exclude<PersistenceAnswer, 'notAsked'>> {
  if (!storage?.persist) return 'unsupported';
  try {
    if (await storage.persisted?.()) return 'granted';
    return (await storage.persist()) ? 'granted' : 'refused';
  } catch {
    return 'refused';
  }
}

async function lookAt(storage: StorageAsk | undefined): Promise<boolean> {
  try {
    return (await storage?.persisted?.()) ?? false;
  } catch {
    return false;
  }
}

async function estimateOf(storage: StorageAsk | undefined): Promise<StorageEstimateBytes | null> {
  try {
    const { usage, quota } = (await storage?.estimate?.()) ?? {};
    return usage === undefined || quota === undefined ? null : { usedBytes: usage, availableBytes: quota - usage };
  } catch {
    return null;
  }
}

export function createPersistence(
  settings: SettingsKeeper,
  storage: StorageAsk | undefined = browserStorage(),
): Persistence {
  const answer = computed<PersistenceAnswer>(() => settings.values.value.persistence ?? 'notAsked');
  // Two quick saves share one question.
  let asking: Promise<PersistenceAnswer> | null = null;
  const askNow = async () => {
    await settings.set('persistence', await ask(storage));
    return answer.value;
  };
  return {
    answer,
    askAtFirstSave: async () => {
      if (answer.value !== 'notAsked') return answer.value;
      asking ??= askNow();
      return asking;
    },
    look: async () => {
      if (answer.value === 'refused' && (await lookAt(storage))) await settings.set('persistence', 'granted');
      return answer.value;
    },
    estimate: () => estimateOf(storage),
  };
}
