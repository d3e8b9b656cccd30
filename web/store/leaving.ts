/** Writes the draft when the page may be about to go: tablets end hidden pages without further notice. */

/** Calls `flush` whenever the page is hidden or left. Answers how to stop. */
export function flushWhenLeaving(flush: () => unknown): () => void {
  if (typeof document === 'undefined') return () => undefined;
  const onVisibility = () => {
    if (document.visibilityState === 'hidden') flush();
  };
  const onHide = () => void flush();
  document.addEventListener('visibilitychange', onVisibility);
  addEventListener('pagehide', onHide);
  return () => {
    document.removeEventListener('visibilitychange', onVisibility);
    removeEventListener('pagehide', onHide);
  };
}
