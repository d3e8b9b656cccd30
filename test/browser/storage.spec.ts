import { expect, type Page, test } from '@playwright/test';
import {
  button,
  dropProfile,
  field,
  go,
  newProfile,
  openApp,
  readingNumber,
  readingTexts,
  save,
  startBrowser,
} from './app';
import { type StaticServer, startServer } from './server';
import { watch } from './watch';

test.describe.configure({ mode: 'parallel' });

let server: StaticServer;
test.beforeAll(async () => {
  server = await startServer();
});
test.afterAll(async () => {
  await server.stop();
});

/** The ways in which browsers keep a site from its storage. */
const refusals: Readonly<Record<string, () => void>> = {
  'throws at once': () => {
    IDBFactory.prototype.open = () => {
      throw new DOMException('The operation is insecure.', 'SecurityError');
    };
  },
  'fails its request': () => {
    const open = IDBFactory.prototype.open;
    IDBFactory.prototype.open = function (name) {
      const request = open.call(this, `${name}-refused`, 1);
      // An opening that is broken off ends as an error of the request.
      request.addEventListener('upgradeneeded', (event) => {
        event.stopImmediatePropagation();
        request.transaction?.abort();
      });
      return request;
    };
  },
  'is not there': () => {
    Object.defineProperty(window, 'indexedDB', { value: undefined });
  },
};

for (const [how, refuse] of Object.entries(refusals)) {
  test(`storage that ${how}: it says so, and works until the tab closes`, async ({ context, page }) => {
    const watched = await watch(context, server.url);
    await page.addInitScript(refuse);
    await page.goto(server.url);
    await expect(page.getByRole('alert').filter({ hasText: /gone when this tab closes/ })).toBeVisible();
    const before = await readingTexts(page);
    await field(page, 'Inclination').fill('63.4');
    await expect.poll(() => readingTexts(page)).not.toEqual(before);
    await save(page);
    await go(page, 'book');
    await expect(page.locator('.book-caution').first()).toContainText(/before the tab closes/);
    await expect(page.getByRole('button', { name: /^Skerry A/ })).toContainText('63.4');
    await go(page, 'drift');
    await expect(page.locator('canvas').first()).toBeVisible();
    expect(watched.pageErrors).toEqual([]);
  });
}

/** The text of the field as the other tab, or the next start, finds it. */
const inclination = (page: Page) => field(page, 'Inclination');

test('a second tab may look, and takes the editor over with what the first one typed', async () => {
  const profile = await newProfile();
  const context = await startBrowser(profile);
  try {
    const first = await openApp(context, server.url);
    await inclination(first).fill('97.11');
    const second = await context.newPage();
    await second.goto(server.url);
    await expect(second.getByText('This book is being edited in another tab.')).toBeVisible();
    await expect(inclination(second)).toHaveAttribute('readonly');
    await expect(button(second, 'Saved').or(button(second, 'Save'))).toBeDisabled();
    expect(await readingNumber(second, 'Mean inclination')).toBeGreaterThan(90);

    await inclination(first).fill('97.22');
    await button(second, 'Edit here instead').click();
    await expect(second.getByText('This book is being edited in another tab.')).toHaveCount(0);
    await expect(inclination(second)).toHaveValue('97.22');
    await expect(first.getByText('This book is being edited in another tab.')).toBeVisible();
    await expect(inclination(first)).toHaveAttribute('readonly');
    await inclination(second).fill('97.33');
    await save(second);

    await second.close();
    await expect(first.getByText('This book is being edited in another tab.')).toHaveCount(0);
    await expect(inclination(first)).toHaveValue('97.33');
    await expect(inclination(first)).not.toHaveAttribute('readonly');
  } finally {
    await context.close();
    await dropProfile(profile);
  }
});
