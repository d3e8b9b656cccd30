/**
 * Whether Driftbook works without a network, and whether a newer version waits.
 *
 * `status`
 * - `installing`: the start; the service worker is being fetched, or the cache is being checked.
 * - `ready`: the active worker has just found every file of its version in the cache. Never said before that.
 * - `failed`: the worker could not be installed, or files are missing and could not be fetched; the page works online.
 * - `unsupported`: no service worker here (plain http, some private windows); the page works online.
 *
 * `updateWaiting`: a newer version is on the device and this tab does not run it yet. Either it waits, or another tab
 * has applied it: a worker serves all tabs, so the others keep what they have loaded and may reload when it suits them.
 * No tab is ever reloaded except by its own `applyUpdate`, and that only if the app agrees, twice: before the new
 * version takes over and, since typing may have gone on meanwhile, just before the reload.
 */
import { type ReadonlySignal, type Signal, signal } from '@preact/signals';
import type { Workbox } from 'workbox-window';
import { type CacheReport, checkCacheMessage } from './messages';

export type OfflineStatus = 'unsupported' | 'installing' | 'ready' | 'failed';

/** Resolves to true when nothing is being edited and the draft has been written. */
export type CanReload = () => Promise<boolean>;

export interface Offline {
  readonly status: ReadonlySignal<OfflineStatus>;
  readonly updateWaiting: ReadonlySignal<boolean>;
  /** False if there is nothing to apply or `canReload` said no; true if the reload is under way. */
  applyUpdate(): Promise<boolean>;
}

export interface OfflineParts {
  readonly canReload: CanReload;
  /** Relative to the page. */
  readonly scriptUrl?: string;
}

const checkTimeoutMs = 20_000;

/** Registers the service worker. Never throws or rejects: what goes wrong ends up in `status`. */
export function createOffline({ canReload, scriptUrl = './serviceWorker.js' }: OfflineParts): Offline {
  const status = signal<OfflineStatus>('installing');
  const updateWaiting = signal(false);
  if (!('serviceWorker' in navigator)) {
    status.value = 'unsupported';
    return { status, updateWaiting, applyUpdate: async () => false };
  }

  let applyUpdate: Offline['applyUpdate'] = async () => false;
  // Loaded apart: the page has its readings before it looks after its cache.
  const start = async () => {
    const { Workbox, messageSW } = await import('workbox-window');
    const workbox = new Workbox(scriptUrl);
    watchWorker(workbox, status, updateWaiting);
    const container = navigator.serviceWorker;
    applyUpdate = followUpdates({ container, workbox, updateWaiting, canReload });
    status.value = await install(container, workbox, messageSW);
  };
  start().catch(() => {
    status.value = 'failed';
  });
  return { status, updateWaiting, applyUpdate: () => applyUpdate() };
}

function watchWorker(workbox: Workbox, status: Signal<OfflineStatus>, updateWaiting: Signal<boolean>): void {
  workbox.addEventListener('waiting', () => {
    updateWaiting.value = true;
  });
  workbox.addEventListener('redundant', () => {
    if (status.value === 'installing') status.value = 'failed';
  });
}

type Ask = typeof import('workbox-window').messageSW;

async function install(container: ServiceWorkerContainer, workbox: Workbox, ask: Ask): Promise<OfflineStatus> {
  try {
    await workbox.register();
    const { active } = await container.ready;
    return active && (await everythingCached(active, ask)) ? 'ready' : 'failed';
  } catch {
    return 'failed';
  }
}

async function everythingCached(worker: ServiceWorker, ask: Ask): Promise<boolean> {
  const answer: Promise<CacheReport> = ask(worker, { type: checkCacheMessage });
  const silence = new Promise<null>((resolve) => setTimeout(resolve, checkTimeoutMs, null));
  const report = await Promise.race([answer, silence]);
  return report !== null && report.expected > 0 && report.cached === report.expected;
}

interface UpdateParts {
  readonly container: ServiceWorkerContainer;
  readonly workbox: Workbox;
  readonly updateWaiting: Signal<boolean>;
  readonly canReload: CanReload;
}

/** Watches for newer versions, those applied by other tabs included, and gives the call that applies one. */
function followUpdates({ container, workbox, updateWaiting, canReload }: UpdateParts): Offline['applyUpdate'] {
  let served = container.controller !== null;
  let takenOver = false;
  let asked = false;

  const reload = async () => {
    asked = false;
    if (!(await canReload())) return false;
    location.reload();
    return true;
  };
  container.addEventListener('controllerchange', () => {
    // The first worker of a first visit replaces nothing.
    takenOver = served;
    served = true;
    if (!takenOver) return;
    updateWaiting.value = true;
    if (asked) void reload();
  });
  // An app on a home screen may stay open for weeks.
  document.addEventListener('visibilitychange', () => {
    if (document.visibilityState === 'visible' && navigator.onLine) void workbox.update().catch(() => undefined);
  });

  return async () => {
    if (!updateWaiting.value) return false;
    if (takenOver) return reload();
    if (!(await canReload())) return false;
    asked = true;
    workbox.messageSkipWaiting();
    return true;
  };
}
