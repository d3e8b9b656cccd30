import { afterEach, describe, expect, it, vi } from 'vitest';
import { joinTabs, type Tabs } from '../../../web/store/tabs';
import { fakeLocks } from './fakeLocks';

const open: Tabs[] = [];
afterEach(() => {
  for (const tabs of open.splice(0)) tabs.close();
});

type Parts = Partial<Parameters<typeof joinTabs>[0]>;
async function join(parts: Parts): Promise<Tabs> {
  const tabs = await joinTabs({ beforeHandOver: async () => undefined, onBookChanged: () => undefined, ...parts });
  open.push(tabs);
  return tabs;
}
const elsewhere = (tabs: readonly Tabs[]) => tabs.map(({ editorElsewhere }) => editorElsewhere.value);

describe('several tabs', () => {
  it('have one editor: the first; the others know', async () => {
    const locks = fakeLocks();
    const tabs = [await join({ locks }), await join({ locks }), await join({ locks })];
    expect(elsewhere(tabs)).toEqual([false, true, true]);
  });

  it('pass the editor on when the tab that had it closes', async () => {
    const locks = fakeLocks();
    const [first, second] = [await join({ locks }), await join({ locks })];
    first.close();
    await vi.waitFor(() => expect(second.editorElsewhere.value).toBe(false));
  });

  it('hand the editor over on request, after the draft was written', async () => {
    const locks = fakeLocks();
    const order: string[] = [];
    const first = await join({ locks, beforeHandOver: async () => order.push('draft written') });
    const second = await join({ locks });
    await second.takeOver();
    order.push('taken over');
    expect(order).toEqual(['draft written', 'taken over']);
    await vi.waitFor(() => expect(elsewhere([first, second])).toEqual([true, false]));
  });

  it('hand it back and forth', async () => {
    const locks = fakeLocks();
    const parts = { locks, answerWaitMs: 50 };
    const tabs = [await join(parts), await join(parts), await join(parts)] as const;
    await tabs[2].takeOver();
    await vi.waitFor(() => expect(elsewhere(tabs)).toEqual([true, true, false]));
    await tabs[0].takeOver();
    await vi.waitFor(() => expect(elsewhere(tabs)).toEqual([false, true, true]));
    tabs[0].close();
    await vi.waitFor(() => expect(elsewhere(tabs.slice(1))).toEqual([false, true]));
  });

  it('can take the editor from a frozen tab that does not answer', async () => {
    const locks = fakeLocks();
    await join({ locks, beforeHandOver: () => new Promise(() => undefined) });
    const second = await join({ locks, answerWaitMs: 20 });
    await second.takeOver();
    expect(second.editorElsewhere.value).toBe(false);
  });

  it('keep the editor where it was when the tab that asked for it is gone', async () => {
    const locks = fakeLocks();
    const first = await join({ locks, answerWaitMs: 50 });
    const channel = new BroadcastChannel('driftbook-tabs');
    channel.postMessage('handOver');
    await vi.waitFor(() => expect(first.editorElsewhere.value).toBe(true), { interval: 5 });
    await vi.waitFor(() => expect(first.editorElsewhere.value).toBe(false));
    channel.close();
  });

  it('all edit where the browser refuses locks', async () => {
    const request = vi.fn(async () => {
      throw new DOMException('Not here', 'SecurityError');
    });
    const refused = await join({ locks: { request } as Pick<LockManager, 'request'> });
    expect(refused.editorElsewhere.value).toBe(false);
    expect(request).toHaveBeenCalledTimes(1);
    await refused.takeOver();
  });

  it('hear of each other’s changes to the book', async () => {
    const onBookChanged = vi.fn();
    await join({ onBookChanged });
    const second = await join({});
    second.announceChange();
    await vi.waitFor(() => expect(onBookChanged).toHaveBeenCalledTimes(1));
  });
});
