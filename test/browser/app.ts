/** Drives the app as a user does. Its labels and statuses are known here, so that no test has to know them twice. */
import { mkdtemp, readlink, rm } from 'node:fs/promises';
import { hostname, tmpdir } from 'node:os';
import { join } from 'node:path';
import { type BrowserContext, chromium, expect, type Locator, type Page } from '@playwright/test';
import { chromiumFlags, chromiumPath } from './chromium';

export const sizes = {
  landscape: { width: 1180, height: 820 },
  portrait: { width: 820, height: 1180 },
  phone: { width: 390, height: 844 },
} as const;

export type PlaceName = 'size' | 'drift' | 'book';
export const placeNames: readonly PlaceName[] = ['size', 'drift', 'book'];

/** A folder for a browser profile; remove it with `dropProfile`. */
export const newProfile = (): Promise<string> => mkdtemp(join(tmpdir(), 'driftbook-'));
export const dropProfile = (profile: string): Promise<void> =>
  rm(profile, { recursive: true, force: true, maxRetries: 5, retryDelay: 200 });

/** Starts a browser process of its own on the profile, as switching the tablet on does. */
export function startBrowser(profile: string, options: { viewport?: { width: number; height: number } } = {}) {
  return chromium.launchPersistentContext(profile, {
    executablePath: chromiumPath,
    args: chromiumFlags,
    locale: 'en-US',
    viewport: options.viewport ?? sizes.landscape,
  });
}

/** The process that runs on the profile: Chromium names it in the lock it holds there. */
export async function processOf(profile: string): Promise<number> {
  const lock = await readlink(join(profile, 'SingletonLock'));
  const pid = Number(lock.slice(hostname().length + 1));
  if (!Number.isInteger(pid)) throw new Error(`Expected a lock that ends in a process number, got ${lock}`);
  return pid;
}

export async function openApp(context: BrowserContext, url: string): Promise<Page> {
  const page = context.pages().find((each) => each.url() === 'about:blank') ?? (await context.newPage());
  await page.goto(url);
  await expect(page.locator('.head')).toBeVisible();
  return page;
}

export const status = (page: Page): Locator => page.locator('.head-status');
export const revisionChip = (page: Page): Locator => page.locator('.chip.soft');
export const headline = (page: Page): Locator => page.getByRole('heading', { level: 1 });
export const field = (page: Page, name: string): Locator => page.getByRole('textbox', { name, exact: true });
export const select = (page: Page, name: string): Locator => page.getByRole('combobox', { name, exact: true });
export const button = (page: Page, name: string | RegExp): Locator => page.getByRole('button', { name });

/** The text that a field's `aria-describedby` points to. */
export async function saidOf(input: Locator): Promise<string> {
  return input.evaluate((element) =>
    (element.getAttribute('aria-describedby') ?? '')
      .split(' ')
      .map((id) => document.getElementById(id)?.textContent ?? '')
      .join(' ')
      .trim(),
  );
}

export async function go(page: Page, place: PlaceName): Promise<void> {
  const title = { size: 'Size', drift: 'Drift', book: 'Book' }[place];
  await page.getByRole('navigation').getByRole('link', { name: title }).click();
  await expect(page.locator(`.place-${place}`)).toBeVisible();
  await expect(headline(page)).toBeVisible();
}

/** Puts the text on the clipboard and presses the keys that paste it, so that the page sees a paste of its own. */
export async function paste(input: Locator, text: string): Promise<void> {
  const page = input.page();
  await page.context().grantPermissions(['clipboard-read', 'clipboard-write']);
  await page.evaluate((copied) => navigator.clipboard.writeText(copied), text);
  await input.focus();
  await page.keyboard.press('Control+V');
}

/** A segment of a choice: the radio itself lies invisibly over its label. */
export const choose = (page: Page, name: string): Promise<void> =>
  page.getByRole('radio', { name, exact: true }).check();

/** Unfolds a group of fields; does nothing where it is open. */
export async function unfold(page: Page, title: RegExp): Promise<void> {
  const fold = page.locator('details', { has: page.locator('summary', { hasText: title }) });
  if (!(await fold.evaluate((details: HTMLDetailsElement) => details.open))) await fold.locator('summary').click();
}

export const reading = (page: Page, label: string): Locator =>
  page.locator('.reading', { has: page.locator('.reading-label', { hasText: new RegExp(`^${label}$`) }) });

export const textOf = async (locator: Locator): Promise<string> => (await locator.textContent()) ?? '';

const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** The number in a text of the page: true minus, thin spaces, a power of ten, the unit behind. */
export function numberIn(text: string): number {
  const plain = text
    .replace(/\u2212/g, '-')
    .replace(/(\d)[\s\u00a0\u2009\u202f](?=\d{3})/g, '$1')
    .replace(/\s*×\s*10/, 'e')
    .replace('⁻', '-')
    .replace(/[⁰¹²³⁴⁵⁶⁷⁸⁹]/g, (digit) => String(superscripts.indexOf(digit)));
  const found = /[-+]?\d+(?:\.\d+)?(?:e-?\d+)?/.exec(plain);
  if (!found) throw new Error(`Expected a number in "${text}"`);
  return Number(found[0]);
}

export async function readingNumber(page: Page, label: string): Promise<number> {
  return numberIn(await textOf(reading(page, label).locator('.reading-value')));
}

/** Rows out of sight follow once the orbit has rested. */
export const restOf = (page: Page): Promise<void> => page.waitForTimeout(300);

/** Everything the list of readings says, for a comparison before and after. */
export async function readingTexts(page: Page): Promise<string[]> {
  await restOf(page);
  return page.locator('.reading-value').allInnerTexts();
}

/** Saves with the button and waits until the app says so. */
export async function save(page: Page): Promise<void> {
  await button(page, 'Save').click();
  await expect(status(page)).toHaveText(/^Saved \d\d:\d\d/);
}

/** A generator of numbers in [0, 1), the same from run to run (mulberry32). */
export function seeded(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
}
