import { afterEach, describe, expect, it, vi } from 'vitest';
import { flushWhenLeaving } from '../../../web/store/leaving';

function fakePage() {
  const page = new EventTarget();
  const document = Object.assign(new EventTarget(), { visibilityState: 'visible' });
  vi.stubGlobal('document', document);
  vi.stubGlobal('addEventListener', page.addEventListener.bind(page));
  vi.stubGlobal('removeEventListener', page.removeEventListener.bind(page));
  return { page, document };
}

describe('a page that may be about to go', () => {
  afterEach(() => void vi.unstubAllGlobals());

  it('writes when it is hidden or left, not when it is shown again', () => {
    const { page, document } = fakePage();
    const flush = vi.fn();
    flushWhenLeaving(flush);
    document.dispatchEvent(new Event('visibilitychange'));
    expect(flush).toHaveBeenCalledTimes(0);
    document.visibilityState = 'hidden';
    document.dispatchEvent(new Event('visibilitychange'));
    page.dispatchEvent(new Event('pagehide'));
    expect(flush).toHaveBeenCalledTimes(2);
  });

  it('stops when told', () => {
    const { page } = fakePage();
    const flush = vi.fn();
    flushWhenLeaving(flush)();
    page.dispatchEvent(new Event('pagehide'));
    expect(flush).not.toHaveBeenCalled();
  });
});
