/** Repeat tracks: searched in the worker, picked from the list, held, drawn as a closed track, and saved. */
import { expect, type Page, test } from '@playwright/test';
import { button, choose, field, numberIn, openApp, reading, save, sizes, status, textOf, unfold } from './app';
import { violations } from './axe';
import { type StaticServer, startServer } from './server';
import { watch } from './watch';

let server: StaticServer;

test.beforeEach(async () => {
  server = await startServer();
});

test.afterEach(async () => {
  await server.stop();
});

const ready = /(?<!not )ready offline/;
const sentence = (page: Page) => page.locator('.tracks-sentence');
const rows = (page: Page) => page.locator('.tracks-row');
const track = (page: Page, cycle: string) => page.locator('.tracks-take', { hasText: new RegExp(`^${cycle}$`) });
const count = (page: Page) => page.locator('.tracks-count');

async function openTracks(page: Page): Promise<void> {
  await field(page, 'Perigee altitude').fill('600');
  await field(page, 'Apogee altitude').fill('600');
  await field(page, 'Inclination').fill('97.8');
  await choose(page, 'Tracks');
  await expect(sentence(page)).toBeVisible();
}

/** Story: 500 to 700 km, a swath of 290 km, cycles of 12 days or less. */
async function ask(page: Page, { longest = '12', from = '500', to = '700' } = {}): Promise<void> {
  await field(page, 'From altitude').fill(from);
  await field(page, 'To altitude').fill(to);
  await field(page, 'Longest cycle').fill(longest);
}

test('a track picked from the list is held, drawn as a closed track, and saved', async ({ context }) => {
  const watched = await watch(context, server.url);
  const page = await openApp(context, server.url);
  await openTracks(page);
  await ask(page);
  await field(page, 'Swath').fill('290');
  await expect(sentence(page)).toHaveText(
    '13 repeat cycles of 12 days or less leave no gap at the equator with a 290 km swath; the lowest is 167/11 at 505 km.',
  );
  await expect(rows(page)).toHaveCount(13);
  await track(page, '151/10').click();
  await expect(track(page, '151/10')).toHaveAttribute('aria-current', 'true');
  await expect(page.locator('.condition-name')).toHaveText(['Repeat ground track', 'Sun-synchronous']);
  await expect(reading(page, 'Mean inclination').locator('.reading-value')).toContainText('97.5409');

  await choose(page, 'Map');
  await expect(page.locator('.map-sentence')).toContainText('The track closes after 151 revolutions in 10 days.');
  const map = page.getByRole('img', { name: /Ground track of 151 revolutions.*It ends where it began\./ });
  await expect(map).toBeVisible();
  await expect.poll(() => inkShare(page)).toBeGreaterThan(0.1);
  await expect(page.getByRole('img', { name: /Equator crossings over one interval of 10 spacings/ })).toBeVisible();

  await save(page);
  await page.reload();
  await choose(page, 'Map');
  await expect(page.locator('.map-sentence')).toContainText('The track closes after 151 revolutions in 10 days.');
  expect(watched).toEqual({ strayRequests: [], cspViolations: [], pageErrors: [] });
});

/** Share of the map's pixels that are nearly as dark as the ink of the track. */
function inkShare(page: Page): Promise<number> {
  return page.locator('.map-canvas').evaluate((canvas: HTMLCanvasElement) => {
    const { data } = canvas.getContext('2d')?.getImageData(0, 0, canvas.width, canvas.height) ?? { data: [] };
    let dark = 0;
    for (let index = 0; index < data.length; index += 4) if ((data[index] ?? 255) < 150) dark += 1;
    return dark / (data.length / 4);
  });
}

test('taking a track can be undone, and the nearest one is offered', async ({ context }) => {
  const page = await openApp(context, server.url);
  await openTracks(page);
  await ask(page, { longest: '3' });
  await track(page, '15/1').click();
  await expect(page.locator('.condition')).toHaveCount(2);
  await button(page, 'Undo').click();
  await expect(page.locator('.condition')).toHaveCount(0);
  await expect(field(page, 'Perigee altitude')).toHaveValue('600');
  const nearest = page.getByRole('region', { name: 'Repeat tracks next to this orbit' }).getByRole('button');
  await nearest.first().click();
  await expect(nearest.first()).toContainText('flown now');
});

test('a search of 400 days shows its progress, ends at once when cancelled, and scrolls lightly when done', async ({
  context,
}) => {
  const page = await openApp(context, server.url);
  await openTracks(page);
  await ask(page, { from: '300', to: '1500', longest: '60' });
  await expect(count(page)).toContainText('3840 found');
  const before = await textOf(count(page));
  const seen = progressThenCancel(page);
  await field(page, 'Longest cycle').fill('400');
  expect(await seen).toMatch(/^cycles up to 400 days, \d+ %$/);
  await expect(page.getByRole('progressbar')).toHaveCount(0);
  await expect(page.locator('.stale-says')).toContainText('The search was stopped.');
  expect(await textOf(count(page))).toBe(before);
  await button(page, 'Search again').click();
  await expect
    .poll(async () => numberIn((await textOf(count(page))).split('of').at(-1) ?? ''), { timeout: 30_000 })
    .toBeGreaterThan(160_000);
  await expect(page.locator('.stale-says')).toHaveCount(0);
  expect(await rows(page).count()).toBeLessThan(60);
  const last = () => page.locator('.tracks-scroll').evaluate((box) => box.scrollTo(0, box.scrollHeight));
  await last();
  await expect.poll(() => textOf(rows(page).last())).toMatch(/\/400/);
  expect(await rows(page).count()).toBeLessThan(60);
});

/** Presses Cancel as soon as it is there, which no driver from outside is quick enough for; answers what the progress said. */
function progressThenCancel(page: Page): Promise<string> {
  return page.evaluate(
    () =>
      new Promise<string>((resolve) => {
        const watcher = new MutationObserver(() => {
          const progress = document.querySelector('.tracks-progress:has(progress)');
          if (!progress) return;
          watcher.disconnect();
          resolve(progress.querySelector('span')?.textContent ?? '');
          progress.querySelector('button')?.click();
        });
        watcher.observe(document.body, { childList: true, subtree: true });
      }),
  );
}

test('bad fields have their message, and the list stays, marked as older', async ({ context }) => {
  const page = await openApp(context, server.url);
  await openTracks(page);
  await ask(page, { from: '800', to: '500' });
  await expect(page.getByText('The band is upside down')).toBeVisible();
  await expect(page.locator('.stale-says')).toBeVisible();
  await ask(page, { longest: '0' });
  await expect(page.getByText('whole number of days from 1 to 400')).toBeVisible();
  await ask(page);
  await field(page, 'Swath').fill('-5');
  await expect(page.getByText('Swath has to be above 0')).toBeVisible();
  await field(page, 'Swath').fill('');
  await page.locator('.tracks-more summary').click();
  await field(page, 'Only N/D').fill('15/0');
  await expect(page.getByText('Days of a cycle have to be a whole number')).toBeVisible();
  await field(page, 'Only N/D').fill('30/2');
  await expect(page.getByText('close already after 15 in 1')).toBeVisible();
  await expect(rows(page)).toHaveCount(1);
  await expect(page.locator('.stale-says')).toHaveCount(0);
});

test('arrow keys walk through the list and Enter takes a track', async ({ context }) => {
  const page = await openApp(context, server.url);
  await openTracks(page);
  await ask(page);
  await expect(rows(page).first()).toBeVisible();
  await page.locator('.tracks-take[tabindex="0"]').focus();
  await page.keyboard.press('End');
  await expect(page.locator('.tracks-take:focus')).toHaveText(/\/12$/);
  const last = await textOf(page.locator('.tracks-take:focus'));
  await page.keyboard.press('ArrowUp');
  await expect(page.locator('.tracks-take:focus')).not.toHaveText(last);
  await page.keyboard.press('Enter');
  await expect(page.locator('.tracks-take[aria-current]')).toHaveCount(1);
  await expect(page.locator('.tracks-take:focus')).toHaveAttribute('aria-current', 'true');
});

test('search, map and land are there with the server gone', async ({ context }) => {
  const first = await openApp(context, server.url);
  await expect(status(first)).toHaveText(ready, { timeout: 20_000 });
  await server.stop();
  await first.reload();
  await openTracks(first);
  await ask(first);
  await expect(rows(first).first()).toBeVisible();
  await choose(first, 'Map');
  await expect(first.locator('.map-canvas')).toBeVisible();
  await expect
    .poll(() =>
      first.evaluate(() => performance.getEntriesByType('resource').some(({ name }) => /land-110m/.test(name))),
    )
    .toBe(true);
  await expect(first.getByText('could not be read')).toHaveCount(0);
});

for (const [name, viewport] of Object.entries(sizes)) {
  test(`list and map fit without sideways scrolling, and axe finds nothing (${name})`, async ({ context }) => {
    const page = await openApp(context, server.url);
    await page.setViewportSize(viewport);
    await openTracks(page);
    await ask(page);
    await field(page, 'Swath').fill('290');
    for (const large of [false, true]) {
      await page.evaluate(
        (size) => {
          document.documentElement.style.fontSize = size;
        },
        large ? '200%' : '',
      );
      for (const view of ['Tracks', 'Map']) {
        await choose(page, view);
        await expect(page.locator(view === 'Map' ? '.map-canvas' : '.tracks-row').first()).toBeVisible();
        expect(await overflowing(page), `${view}${large ? ' at 200 %' : ''}`).toEqual([]);
        expect(await violations(page, view)).toEqual([]);
      }
    }
  });
}

/** Boxes that can be scrolled sideways. */
function overflowing(page: Page): Promise<string[]> {
  return page.evaluate(() =>
    [...document.querySelectorAll('html, .place, .picture, .numbers, .tracks-scroll')]
      .filter((box) => box.scrollWidth > box.clientWidth)
      .map((box) => `${box.className || box.tagName}: ${box.scrollWidth} in ${box.clientWidth}`),
  );
}

test('other bodies have the list and the strip, and say what is missing', async ({ context }) => {
  const page = await openApp(context, server.url);
  await openTracks(page);
  await unfold(page, /Body and units/);
  const body = page.getByRole('combobox', { name: 'Body' });
  await body.selectOption({ label: 'Mars' });
  await expect(count(page)).toBeVisible();
  await choose(page, 'Map');
  await expect(page.locator('.map-strip svg')).toBeVisible();
  await expect(page.locator('.map-canvas')).toHaveCount(0);
  await choose(page, 'Tracks');
  await body.selectOption({ label: 'Venus' });
  await expect(page.locator('.tracks-trouble')).toContainText('No orbit above the surface of Venus is Sun-synchronous');
  // Tracks around Mars are no older answer to it.
  await expect(rows(page)).toHaveCount(0);
  await body.selectOption({ label: 'A body of your own' });
  await field(page, 'Gravity parameter μ').fill('398600');
  await field(page, 'Equatorial radius').fill('6378');
  await field(page, 'J2').fill('0.00108');
  await expect(page.locator('.tracks-none')).toContainText('has no known day');
});
