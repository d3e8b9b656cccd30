import { expect, type Page, test } from '@playwright/test';
import {
  button,
  choose,
  dropProfile,
  field,
  go,
  newProfile,
  openApp,
  paste,
  placeNames,
  reading,
  sizes,
  startBrowser,
  unfold,
} from './app';
import { violations } from './axe';
import { type StaticServer, startServer } from './server';

/** axe-core on every place, in every lighting, at every size, and in the states that are seldom looked at. */
test.describe.configure({ mode: 'parallel' });

let server: StaticServer;
test.beforeAll(async () => {
  server = await startServer();
});
test.afterAll(async () => {
  await server.stop();
});

const lightings = ['room', 'sunlight', 'night'] as const;

async function nextLighting(page: Page): Promise<void> {
  await page.getByRole('button', { name: /^Lighting: / }).click();
}

/** Each place, plain and in its busiest state. */
async function inAllPlaces(page: Page, where: string): Promise<string[]> {
  const found: string[] = [];
  for (const place of placeNames) {
    await go(page, place);
    if (place === 'drift') await expect(page.locator('canvas').first()).toBeVisible();
    found.push(...(await violations(page, `${where}, ${place}`)));
  }
  await go(page, 'size');
  await reading(page, 'Node rate').click();
  await expect(page.locator('.working math').first()).toBeVisible();
  // What can be scrolled takes the focus once its size has been seen.
  await page.waitForTimeout(300);
  found.push(...(await violations(page, `${where}, working open`)));
  await page.locator('.working').getByRole('button', { name: 'Close' }).click();
  await unfold(page, /Perigee, anomaly/);
  await unfold(page, /Body and units/);
  await field(page, 'Inclination').fill('north');
  await field(page, 'Perigee altitude').fill('1,234');
  await expect(page.locator('.stale-says')).toBeVisible();
  found.push(...(await violations(page, `${where}, fields in error`)));
  await go(page, 'drift');
  found.push(...(await violations(page, `${where}, drift of the last good entry`)));
  await go(page, 'size');
  await field(page, 'Inclination').fill('97.68');
  await field(page, 'Perigee altitude').fill('561');
  return found;
}

for (const [name, viewport] of Object.entries(sizes)) {
  test(`axe finds nothing in any place and lighting (${name})`, async ({ context, page: blank }) => {
    test.setTimeout(120_000);
    await blank.setViewportSize(viewport);
    const page = await openApp(context, server.url);
    const found: string[] = [];
    for (const lighting of lightings) {
      await expect(page.locator('html')).toHaveAttribute('data-lighting', lighting);
      found.push(...(await inAllPlaces(page, `${name}, ${lighting}`)));
      await nextLighting(page);
    }
    expect(found).toEqual([]);
  });
}

test('axe finds nothing in an empty book, in the other forms, in messages and questions', async ({ context }) => {
  const page = await openApp(context, server.url);
  const found: string[] = [];
  await go(page, 'book');
  await button(page, 'Remove the demo book').click();
  found.push(...(await violations(page, 'question before the demo book goes')));
  await button(page, 'Remove for good').click();
  await expect(page.locator('.book-empty')).toBeVisible();
  found.push(...(await violations(page, 'empty book')));
  await page.locator('.shell-notice').getByRole('button', { name: 'Close' }).click();
  await page.getByRole('button', { name: 'New orbit', exact: true }).click();
  for (const form of ['a and e', 'State', 'Two-line']) {
    await choose(page, form);
    found.push(...(await violations(page, form)));
  }
  await paste(page.locator('textarea'), 'no elements at all');
  found.push(...(await violations(page, 'two-line elements in error')));
  await choose(page, 'Altitudes');
  await paste(field(page, 'Perigee altitude'), '1 2 3 4 5 6');
  await expect(page.locator('.shell-notice')).toBeVisible();
  found.push(...(await violations(page, 'a message with its undo')));
  await go(page, 'drift');
  found.push(...(await violations(page, 'drift without an orbit')));
  expect(found).toEqual([]);
});

test('axe finds nothing where storage is refused, and in a second tab', async () => {
  const profile = await newProfile();
  const context = await startBrowser(profile);
  try {
    await openApp(context, server.url);
    const second = await context.newPage();
    await second.goto(server.url);
    await expect(button(second, 'Edit here instead')).toBeVisible();
    const found = await violations(second, 'second tab');
    const refused = await context.newPage();
    await refused.addInitScript(() => {
      IDBFactory.prototype.open = () => {
        throw new DOMException('refused', 'SecurityError');
      };
    });
    await refused.goto(`${server.url}#/book`);
    await expect(refused.getByRole('alert').first()).toBeVisible();
    found.push(...(await violations(refused, 'storage refused')));
    expect(found).toEqual([]);
  } finally {
    await context.close();
    await dropProfile(profile);
  }
});
