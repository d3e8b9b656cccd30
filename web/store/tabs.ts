/**
 * Several tabs, one editor. A web lock says which tab edits; a channel carries the request to hand over and
 * the news that the book has changed. Without web locks every tab may edit, and the book's own check for
 * newer revisions still keeps one from writing over the other.
 */
import { type ReadonlySignal, signal } from '@preact/signals';

const lockName = 'driftbook-editor';
const channelName = 'driftbook-tabs';

type Message = 'handOver' | 'handedOver' | 'bookChanged';
type LocksPart = Pick<LockManager, 'request'>;

export interface Tabs {
  /** True while another tab holds the editor. When it turns false, load the draft again: the other tab may have typed. */
  readonly editorElsewhere: ReadonlySignal<boolean>;
  /** Lets the other tab write its draft, then moves the editor here. */
  takeOver(): Promise<void>;
  /** Tells the other tabs that the book has changed. */
  announceChange(): void;
  close(): void;
}

export interface TabsParts {
  /** Writes what is pending before the editor leaves this tab. */
  readonly beforeHandOver: () => Promise<unknown>;
  readonly onBookChanged: () => void;
  readonly locks?: LocksPart | undefined;
  /** How long to wait for the other tab's answer; a frozen tab gives none. */
  readonly answerWaitMs?: number;
}

class LockedTabs implements Tabs {
  readonly #elsewhere = signal(false);
  readonly editorElsewhere: ReadonlySignal<boolean> = this.#elsewhere;
  readonly #channel = typeof BroadcastChannel === 'undefined' ? null : new BroadcastChannel(channelName);
  /** Undefined where the browser has no locks, or refuses them to this page. */
  #locks: LocksPart | undefined;
  readonly #answerWaitMs: number;
  /** Lets go of the lock; null while this tab does not hold it. */
  #release: (() => void) | null = null;
  readonly #waiting = new AbortController();
  #onHandedOver: (() => void) | null = null;

  constructor(readonly parts: TabsParts) {
    this.#locks = parts.locks;
    this.#answerWaitMs = parts.answerWaitMs ?? 1500;
    this.#channel?.addEventListener('message', ({ data }: MessageEvent<Message>) => void this.#hear(data));
  }

  /** Resolves once it is known whether this tab edits. */
  async start(): Promise<void> {
    if (!this.#locks) return;
    const got = await this.#request({ ifAvailable: true });
    if (got || !this.#locks) return;
    this.#elsewhere.value = true;
    this.#queue();
  }

  /** Waits behind the other tabs, so that the editor comes here when they close. */
  #queue(): void {
    void this.#request({ signal: this.#waiting.signal });
  }

  /** Asks for the lock; answers whether it came, and holds it until it is released or taken. */
  #request(options: LockOptions): Promise<boolean> {
    return new Promise((resolve) => {
      const hold = (lock: Lock | null): Promise<void> | void => {
        resolve(lock !== null);
        if (!lock || this.#release || this.#waiting.signal.aborted) return;
        this.#elsewhere.value = false;
        return new Promise((release) => {
          this.#release = release;
        });
      };
      const lost = (error: unknown) => {
        const taken = error instanceof DOMException && error.name === 'AbortError';
        if (!taken) this.#locks = undefined;
        resolve(false);
        if (!taken || this.#waiting.signal.aborted) return;
        this.#release = null;
        this.#elsewhere.value = true;
        this.#queue();
      };
      this.#locks?.request(lockName, options, hold).catch(lost);
    });
  }

  async #hear(message: Message): Promise<void> {
    if (message === 'bookChanged') this.parts.onBookChanged();
    if (message === 'handedOver') this.#onHandedOver?.();
    if (message === 'handOver') await this.#handOver();
  }

  async #handOver(): Promise<void> {
    const held = this.#release;
    if (!held) return;
    await this.parts.beforeHandOver();
    this.#elsewhere.value = true;
    this.#channel?.postMessage('handedOver');
    // The tab that asked may be gone, or may have asked the holder before this one: then nobody takes the lock.
    setTimeout(() => {
      if (this.#release === held) this.#elsewhere.value = false;
    }, this.#answerWaitMs);
  }

  async takeOver(): Promise<void> {
    if (!this.#locks) return;
    if (this.#release) {
      this.#elsewhere.value = false;
      return;
    }
    await this.#askToHandOver();
    await this.#request({ steal: true });
  }

  #askToHandOver(): Promise<void> {
    if (!this.#channel) return Promise.resolve();
    return new Promise((resolve) => {
      const timer = setTimeout(resolve, this.#answerWaitMs);
      this.#onHandedOver = () => {
        clearTimeout(timer);
        resolve();
      };
      this.#channel?.postMessage('handOver');
    });
  }

  announceChange(): void {
    this.#channel?.postMessage('bookChanged');
  }

  close(): void {
    this.#waiting.abort();
    this.#release?.();
    this.#release = null;
    this.#channel?.close();
  }
}

/** Joins the other tabs; `editorElsewhere` is settled when the promise resolves. */
export async function joinTabs(parts: Omit<TabsParts, 'locks'> & { readonly locks?: LocksPart }): Promise<Tabs> {
  const locks = parts.locks ?? (typeof navigator === 'undefined' ? undefined : navigator.locks);
  const tabs = new LockedTabs({ ...parts, locks });
  await tabs.start();
  return tabs;
}
