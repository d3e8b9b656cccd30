/** What a page does in each frame of a drag: script time from the browser's own trace, and how far readings lag behind the finger. */
import type { Browser, Page } from '@playwright/test';

interface TraceEvent {
  readonly name: string;
  readonly ph: string;
  /** Processor time of the thread, in microseconds, so that other work on the machine does not count. */
  readonly tts?: number;
  readonly tdur?: number;
  readonly pid: number;
  readonly tid: number;
}

export interface FrameFigures {
  readonly frames: number;
  /** Milliseconds of script in a frame, in rising order. */
  readonly scriptMs: readonly number[];
}

/** Entries of script into the main thread; those that lie within one another are counted once. */
const scriptEvents = new Set(['EventDispatch', 'FireAnimationFrame', 'FunctionCall', 'RunMicrotasks', 'TimerFire']);

export async function traced(browser: Browser, page: Page, act: () => Promise<void>): Promise<FrameFigures> {
  await browser.startTracing(page, { categories: ['devtools.timeline', 'v8.execute'] });
  await act();
  const { traceEvents } = JSON.parse((await browser.stopTracing()).toString('utf8')) as { traceEvents: TraceEvent[] };
  return figuresOf(traceEvents);
}

function figuresOf(events: readonly TraceEvent[]): FrameFigures {
  // The thread of the page is the one whose animation frames fire.
  const fired = events.filter(({ name }) => name === 'FireAnimationFrame');
  const threads = new Map<string, number>();
  for (const { pid, tid } of fired) threads.set(`${pid} ${tid}`, (threads.get(`${pid} ${tid}`) ?? 0) + 1);
  const [main] = [...threads].sort(([, one], [, other]) => other - one)[0] ?? [];
  const own = events.filter(({ pid, tid, ph }) => ph === 'X' && `${pid} ${tid}` === main).map(spanOf);
  // Painting is prepared once a frame, after its script; input is handled before.
  const ends = own.filter(({ name }) => name === 'PrePaint').map(({ from }) => from);
  ends.sort((one, other) => one - other);
  const pieces = merged(own.filter(({ name }) => scriptEvents.has(name)));
  const scriptMs = ends.slice(1).map((end, index) => {
    const start = ends[index] ?? end;
    return pieces.reduce((sum, { from, to }) => sum + Math.max(0, Math.min(to, end) - Math.max(from, start)), 0) / 1000;
  });
  return { frames: scriptMs.length, scriptMs: scriptMs.sort((one, other) => one - other) };
}

interface Span {
  readonly name: string;
  readonly from: number;
  readonly to: number;
}

const spanOf = ({ name, tts = Number.NaN, tdur = 0 }: TraceEvent): Span => ({ name, from: tts, to: tts + tdur });

function merged(spans: readonly Span[]): Span[] {
  const result: Span[] = [];
  for (const span of [...spans].sort((one, other) => one.from - other.from)) {
    const last = result.at(-1);
    if (last && span.from <= last.to) result.splice(-1, 1, { ...last, to: Math.max(last.to, span.to) });
    else result.push(span);
  }
  return result;
}

export function percentile(rising: readonly number[], share: number): number {
  return rising[Math.min(rising.length - 1, Math.floor(share * rising.length))] ?? Number.NaN;
}

export interface FrameCount {
  /** Milliseconds between frames that the page had, in rising order. */
  readonly intervalsMs: readonly number[];
  /** Frames between the latest move of the pointer and each change of a reading on the screen: told apart where moves are far between. */
  readonly lags: readonly number[];
}

/** Counts frames in the page, and changes below the selector, from now until the answer is called. */
export async function countFrames(page: Page, readings: string): Promise<() => Promise<FrameCount>> {
  await page.evaluate((selector) => {
    const figures = { intervalsMs: [] as number[], lags: [] as number[], isOn: true };
    let [frame, last, movedAt] = [0, 0, -1];
    const tick = (now: number) => {
      frame += 1;
      if (last > 0) figures.intervalsMs.push(now - last);
      last = now;
      if (figures.isOn) requestAnimationFrame(tick);
    };
    requestAnimationFrame(tick);
    const onMove = () => {
      movedAt = frame;
    };
    document.addEventListener('pointermove', onMove, true);
    const isOnScreen = ({ target }: MutationRecord) => {
      const box = (target instanceof Element ? target : target.parentElement)?.getBoundingClientRect();
      return box !== undefined && box.height > 0 && box.bottom > 0 && box.top < innerHeight;
    };
    new MutationObserver((changes) => {
      if (!figures.isOn || !changes.some(isOnScreen)) return;
      if (movedAt >= 0) figures.lags.push(frame - movedAt);
      movedAt = -1;
    }).observe(document.querySelector(selector) as Element, { subtree: true, childList: true, characterData: true });
    Reflect.set(window, 'frameFigures', figures);
  }, readings);
  return async () => {
    const { intervalsMs, lags } = await page.evaluate(() => {
      const found = Reflect.get(window, 'frameFigures') as { isOn: boolean; intervalsMs: number[]; lags: number[] };
      found.isOn = false;
      return found;
    });
    return { intervalsMs: intervalsMs.sort((one, other) => one - other), lags };
  };
}
