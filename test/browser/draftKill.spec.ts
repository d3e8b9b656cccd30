import { expect, type Page, test } from '@playwright/test';
import { button, dropProfile, field, newProfile, openApp, processOf, seeded, startBrowser, status } from './app';
import { type StaticServer, startServer } from './server';

/**
 * The browser's process is killed outright at random moments while somebody types and saves. Whatever the page had
 * called saved must be there afterwards, and of the typing at most its last second may be gone.
 */
test.describe.configure({ mode: 'parallel', timeout: 240_000 });

const killsPerWorker = 25;
const longestLossMs = 1000;
/** A quick typist on glass; quicker only loads the machine. */
const keyMs = 35;

let server: StaticServer;
test.beforeAll(async () => {
  server = await startServer();
});
test.afterAll(async () => {
  await server.stop();
});

interface Typed {
  /** The text of the field after this keystroke. */
  readonly text: string;
  /** When the page saw it, in ms of the clock. */
  readonly atMs: number;
}

/** What the page showed up to its end. */
interface Seen {
  readonly typed: Typed[];
  readonly revisions: number[];
}

interface Life {
  readonly seen: Seen;
  readonly killedAtMs: number;
}

/** Has the page tell of each keystroke, and of each save as soon as the status or the chip shows it. */
async function listen(page: Page, seen: Seen): Promise<void> {
  await page.exposeFunction('noteTyped', (text: string, atMs: number) => seen.typed.push({ text, atMs }));
  await page.exposeFunction('noteRevision', (revision: number) => seen.revisions.push(revision));
  await page.evaluate(() => {
    const tell = (name: string, ...values: unknown[]) =>
      (Reflect.get(window, name) as (...of: unknown[]) => void)(...values);
    addEventListener(
      'input',
      ({ target, timeStamp }) =>
        tell('noteTyped', (target as HTMLInputElement).value, performance.timeOrigin + timeStamp),
      true,
    );
    const look = () => {
      const shown = /rev (\d+)/.exec(document.querySelector('.chip.soft')?.textContent ?? '')?.[1];
      const saved = /^Saved \d\d:\d\d/.test(document.querySelector('.head-status')?.textContent ?? '');
      if (shown && saved) tell('noteRevision', Number(shown));
    };
    const head = document.querySelector('.head');
    if (!head) throw new Error('Expected the head of the page, got none');
    new MutationObserver(look).observe(head, { childList: true, subtree: true, characterData: true });
  });
}

/** The revisions that the database holds of the orbit with this name. */
const storedRevisions = (page: Page): Promise<readonly number[]> =>
  page.evaluate(async () => {
    const settled = <T>(request: IDBRequest<T>) =>
      new Promise<T>((resolve, reject) => {
        request.onsuccess = () => resolve(request.result);
        request.onerror = () => reject(request.error);
      });
    const database = await settled(indexedDB.open('driftbook'));
    const store = database.transaction('revisions').objectStore('revisions');
    const rows = (await settled(store.getAll())) as { candidateId: string; revision: number }[];
    database.close();
    return rows.filter(({ candidateId }) => candidateId === 'skerry-a').map(({ revision }) => revision);
  });

/** One life of the browser: it looks at what the last one left, then somebody types until the process is killed. */
async function liveAndDie(profile: string, random: () => number, look: (page: Page) => Promise<void>): Promise<Life> {
  const context = await startBrowser(profile);
  const page = await openApp(context, server.url);
  await look(page);
  const seen: Seen = { typed: [], revisions: [] };
  await listen(page, seen);
  const pid = await processOf(profile);
  await field(page, 'Apogee altitude').fill('');
  const typingMs = 150 + random() * 1500;
  const killAfterMs = typingMs + (random() < 0.5 ? 0 : random() * 1000);
  const saveAtMs = random() < 0.4 ? random() * typingMs : Number.POSITIVE_INFINITY;
  const typing = typeUntil(page, random, { typingMs, saveAtMs }).catch(() => undefined);
  await new Promise((resolve) => setTimeout(resolve, killAfterMs));
  const killedAtMs = Date.now();
  process.kill(pid, 'SIGKILL');
  await Promise.all([typing, context.close().catch(() => undefined)]);
  return { seen, killedAtMs };
}

interface Plan {
  readonly typingMs: number;
  readonly saveAtMs: number;
}

async function typeUntil(page: Page, random: () => number, { typingMs, saveAtMs }: Plan): Promise<void> {
  const start = Date.now();
  let isSaved = false;
  // A good number first, so that most moments have something to save.
  const digits = ['5', '7', '5', '.'];
  while (Date.now() - start < typingMs) {
    await page.keyboard.press(digits.shift() ?? String(Math.floor(random() * 10)));
    if (!isSaved && Date.now() - start >= saveAtMs) {
      isSaved = true;
      await button(page, 'Save').click({ noWaitAfter: true, timeout: 500 });
      await field(page, 'Apogee altitude').focus();
    }
    await page.waitForTimeout(keyMs * (0.5 + random()));
  }
}

/** How much of the typing was gone, in ms back from the kill; zero if nothing was. */
function lossMs(text: string, { typed }: Seen, killedAtMs: number): number {
  const kept = typed.findLastIndex((each) => each.text === text);
  const firstLost = typed[kept + 1];
  return firstLost ? killedAtMs - firstLost.atMs : 0;
}

for (const seed of [1, 2]) {
  test(`killed ${killsPerWorker} times while typing, it loses no save and at most a second (seed ${seed})`, async () => {
    const random = seeded(seed);
    const profile = await newProfile();
    const losses: number[] = [];
    let keystrokes = 0;
    let saves = 0;
    try {
      const first = await startBrowser(profile);
      const opened = await openApp(first, server.url);
      await expect(status(opened)).toContainText('ready offline', { timeout: 20_000 });
      await first.close();
      let life: Life | null = null;
      const look = async (page: Page) => {
        if (!life) return;
        const { seen, killedAtMs } = life;
        const text = await field(page, 'Apogee altitude').inputValue();
        const loss = lossMs(text, seen, killedAtMs);
        losses.push(loss);
        keystrokes += seen.typed.length;
        saves += seen.revisions.length > 0 ? 1 : 0;
        expect(loss, `typed ${seen.typed.at(-1)?.text}, found ${text}`).toBeLessThanOrEqual(longestLossMs);
        expect(await storedRevisions(page)).toEqual(expect.arrayContaining(seen.revisions));
      };
      for (let kill = 0; kill < killsPerWorker; kill += 1) life = await liveAndDie(profile, random, look);
      const last = await startBrowser(profile);
      await look(await openApp(last, server.url));
      await last.close();
    } finally {
      await dropProfile(profile);
    }
    const worst = Math.max(...losses).toFixed(0);
    console.log(
      `seed ${seed}: ${losses.length} kills, ${keystrokes} keystrokes, ${saves} saves; worst loss ${worst} ms`,
    );
    expect(saves).toBeGreaterThan(0);
  });
}
