/** What page and service worker say to each other. Every later version must go on answering these. */

/** Asks the worker whether everything it should hold is in the cache; answered with a `CacheReport`. */
export const checkCacheMessage = 'CHECK_CACHE';

/** Tells a waiting worker to take over. The name is the one workbox-window sends. */
export const takeOverMessage = 'SKIP_WAITING';

export interface CacheReport {
  /** Files of this version. */
  readonly expected: number;
  /** Those that are in the cache now. */
  readonly cached: number;
}
