import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type BrowserContext, chromium, expect, type Page, test } from '@playwright/test';
import { chromiumFlags, chromiumPath } from './chromium';
import { buildVersionOf, distDir, type StaticServer, startServer } from './server';
import { watch } from './watch';

let server: StaticServer;

test.beforeEach(async () => {
  server = await startServer();
});

test.afterEach(async () => {
  await server.stop();
});

const statusOf = (page: Page) => page.getByRole('status').filter({ hasText: /offline/ });
const ready = /(?<!not )ready offline/;
const notReady = /not ready offline/;

async function openAndGetReady(context: BrowserContext): Promise<Page> {
  const page = await context.newPage();
  await page.goto(server.url);
  await expect(statusOf(page)).toHaveText(ready, { timeout: 20_000 });
  return page;
}

test('can be installed: the browser has no objection', async () => {
  const profile = await mkdtemp(join(tmpdir(), 'driftbook-'));
  const context = await chromium.launchPersistentContext(profile, {
    executablePath: chromiumPath,
    args: chromiumFlags,
  });
  try {
    const page = await openAndGetReady(context);
    const session = await context.newCDPSession(page);
    const { installabilityErrors } = await session.send('Page.getInstallabilityErrors');
    expect(installabilityErrors).toEqual([]);
    const { errors } = await session.send('Page.getAppManifest');
    expect(errors).toEqual([]);
  } finally {
    await context.close();
    await rm(profile, { recursive: true, force: true });
  }
});

test('starts again with the server gone, and asks nothing of any other origin', async ({ context }) => {
  const watched = await watch(context, server.url);
  const page = await openAndGetReady(context);
  await server.stop();
  await page.reload();
  await expect(statusOf(page)).toHaveText(ready);
  const notices = await page.evaluate(async () => (await fetch('./notices.txt')).text());
  expect(notices).toContain('preact');
  const second = await context.newPage();
  await second.goto(`${server.url}#/book`);
  await expect(statusOf(second)).toHaveText(ready);
  expect(watched).toEqual({ strayRequests: [], cspViolations: [], pageErrors: [] });
});

test('a file whose fetch fails keeps it from being called ready', async ({ context }) => {
  await context.route(/notices\.txt/, (route) => route.abort());
  const page = await context.newPage();
  await page.goto(server.url);
  await expect(statusOf(page)).toHaveText(notReady, { timeout: 20_000 });
});

test('a file that the browser dropped is fetched again, and missed when that is impossible', async ({ context }) => {
  const page = await openAndGetReady(context);
  await dropFromCache(page, 'notices.txt');
  await page.reload();
  await expect(statusOf(page)).toHaveText(ready);
  await dropFromCache(page, 'notices.txt');
  await server.stop();
  await page.reload();
  await expect(statusOf(page)).toHaveText(notReady);
});

async function dropFromCache(page: Page, name: string): Promise<void> {
  const dropped = await page.evaluate(async (fileName) => {
    const [cacheName] = (await caches.keys()).filter((key) => key.includes('precache'));
    const cache = await caches.open(cacheName ?? '');
    const keys = (await cache.keys()).filter((request) => request.url.includes(fileName));
    return Promise.all(keys.map((key) => cache.delete(key)));
  }, name);
  expect(dropped).toEqual([true]);
}

test.describe('a new version', () => {
  let newDir = '';
  test.beforeAll(async () => {
    newDir = await buildVersionOf('9.9.9+newer');
  });

  const updateButton = (page: Page) => page.getByRole('button', { name: 'Load the new version' });
  const loadsOf = (page: Page) => page.evaluate(() => performance.timeOrigin);
  const scriptsOf = (page: Page) => page.evaluate(() => [...document.scripts].map((script) => script.src));

  test('waits through a reload, is applied when asked for, and keeps what was just typed', async ({ context }) => {
    const page = await openAndGetReady(context);
    const oldScripts = await scriptsOf(page);
    server.serve(newDir);
    await page.reload();
    await expect(updateButton(page)).toBeVisible({ timeout: 15_000 });
    expect(await scriptsOf(page)).toEqual(oldScripts);
    const loaded = await loadsOf(page);
    const field = page.getByRole('textbox', { name: 'Perigee altitude' });
    await field.fill('555,5');
    await page.waitForTimeout(1_500);
    expect(await loadsOf(page)).toBe(loaded);

    await field.fill('543,21');
    await updateButton(page).click();
    await expect.poll(() => scriptsOf(page).catch(() => oldScripts), { timeout: 15_000 }).not.toEqual(oldScripts);
    await expect(statusOf(page)).toHaveText(ready);
    await expect(updateButton(page)).toHaveCount(0);
    await expect(field).toHaveValue('543,21');
    await server.stop();
    await page.reload();
    await expect(statusOf(page)).toHaveText(ready);
  });

  test('applied in one tab, leaves the other as it is until that one asks too', async ({ context }) => {
    const first = await openAndGetReady(context);
    const second = await openAndGetReady(context);
    const loaded = await loadsOf(second);
    server.serve(newDir);
    await first.reload();
    await expect(updateButton(second)).toBeVisible({ timeout: 15_000 });
    await updateButton(first).click();
    await expect(updateButton(first)).toHaveCount(0, { timeout: 15_000 });
    expect(await loadsOf(second)).toBe(loaded);
    await expect(updateButton(second)).toBeVisible();
    await updateButton(second).click();
    await expect(updateButton(second)).toHaveCount(0, { timeout: 15_000 });
    expect(await loadsOf(second)).not.toBe(loaded);
  });
});

test('the folder works below any path', async ({ context }) => {
  const parent = await startServer({ dir: join(distDir, '..') });
  const watched = await watch(context, parent.url);
  const page = await context.newPage();
  await page.goto(`${parent.url}dist/`);
  await expect(statusOf(page)).toHaveText(ready, { timeout: 20_000 });
  await parent.stop();
  await page.reload();
  await expect(statusOf(page)).toHaveText(ready);
  expect(watched.cspViolations).toEqual([]);
});
