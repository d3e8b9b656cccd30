/**
 * The service worker: puts every file of a version into the cache when it is installed, and answers all requests from
 * there. A newer version installs beside the running one and waits; it takes over only when told to, or when the last
 * tab is closed. The list of files is put in at build time, each with a hash of its content unless its name has one.
 */
import { cacheNames, clientsClaim } from 'workbox-core';
import { cleanupOutdatedCaches, getCacheKeyForURL, matchPrecache, precacheAndRoute } from 'workbox-precaching';
import { type CacheReport, checkCacheMessage, takeOverMessage } from './messages';

interface PrecachedFile {
  readonly url: string;
  /** The first 16 hex digits of the content's SHA-256; null where the file's name carries a hash. */
  readonly revision: string | null;
}

declare const self: ServiceWorkerGlobalScope;

// The build puts the list in the place of this name, which workbox declares more loosely.
const files = self.__WB_MANIFEST as PrecachedFile[];

precacheAndRoute(files);
cleanupOutdatedCaches();
// So that the tab of the first visit is served from the cache too, and can lose the network without a reload.
clientsClaim();

self.addEventListener('message', (event) => {
  const type: unknown = event.data?.type;
  if (type === takeOverMessage) event.waitUntil(self.skipWaiting());
  if (type === checkCacheMessage) event.waitUntil(checkCache().then((report) => event.ports[0]?.postMessage(report)));
});

async function checkCache(): Promise<CacheReport> {
  const present = await Promise.all(files.map(async (file) => (await isCached(file)) || (await fetchAgain(file))));
  return { expected: files.length, cached: present.filter(Boolean).length };
}

async function isCached(file: PrecachedFile): Promise<boolean> {
  return (await matchPrecache(file.url))?.ok ?? false;
}

/** A browser short of space may drop single files. The host may have a newer version by now, hence the hash. */
async function fetchAgain(file: PrecachedFile): Promise<boolean> {
  const response = await fetch(file.url, { cache: 'reload' }).catch(() => null);
  const key = getCacheKeyForURL(file.url);
  if (!response?.ok || !key) return false;
  if (file.revision && file.revision !== (await revisionOf(response.clone()))) return false;
  await (await caches.open(cacheNames.precache)).put(key, response);
  return true;
}

async function revisionOf(response: Response): Promise<string> {
  const digest = await crypto.subtle.digest('SHA-256', await response.arrayBuffer());
  return Array.from(new Uint8Array(digest, 0, 8), (byte) => byte.toString(16).padStart(2, '0')).join('');
}
