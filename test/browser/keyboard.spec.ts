import { expect, type Locator, type Page, test } from '@playwright/test';
import { field, headline, openApp, reading, readingNumber, revisionChip, sizes, status } from './app';
import { type StaticServer, startServer } from './server';

/** The whole of the main flow without a pointer: Tab, arrows, Enter, Space, Escape and typing. */
let server: StaticServer;
test.beforeAll(async () => {
  server = await startServer();
});
test.afterAll(async () => {
  await server.stop();
});

const mostTabs = 140;

/** Presses Tab until the target has the focus, and checks that the focus can be seen there. */
async function tabTo(target: Locator, key: 'Tab' | 'Shift+Tab' = 'Tab'): Promise<void> {
  await expect(target).toBeVisible();
  const page = target.page();
  for (let presses = 0; presses < mostTabs; presses += 1) {
    if (await target.evaluate((element) => element === document.activeElement)) return expectRing(target);
    await page.keyboard.press(key);
  }
  throw new Error(`Expected ${target} to be reached within ${mostTabs} presses of ${key}`);
}

/** An outline on the control itself, or on the label around it. */
async function expectRing(target: Locator): Promise<void> {
  const widths = await target.evaluate((element) =>
    [element, element.closest('label')].map((each) => {
      const style = each ? getComputedStyle(each) : null;
      return style && style.outlineStyle !== 'none' ? Number.parseFloat(style.outlineWidth) : 0;
    }),
  );
  expect(Math.max(...widths), `focus ring of ${target}`).toBeGreaterThanOrEqual(2);
}

async function press(target: Locator, key = 'Enter'): Promise<void> {
  await tabTo(target);
  await target.page().keyboard.press(key);
}

async function typeInto(target: Locator, text: string): Promise<void> {
  await tabTo(target);
  await target.page().keyboard.press('Control+A');
  await target.page().keyboard.type(text);
  await expect(target).toHaveValue(text);
}

async function toPlace(page: Page, title: string): Promise<void> {
  await press(page.getByRole('navigation').getByRole('link', { name: title }));
  await expect(page.locator(`.place-${title.toLowerCase()}`)).toBeVisible();
  await expect(headline(page)).toBeVisible();
}

const button = (page: Page, name: string | RegExp) => page.getByRole('main').getByRole('button', { name });
const notice = (page: Page, name: string) => page.locator('.shell-notice').getByRole('button', { name });

for (const size of ['landscape', 'phone'] as const) {
  test(`enter, read, draw, save, find, rename, copy, remove, undo, restore by keyboard alone (${size})`, async ({
    page: blank,
    context,
  }) => {
    await blank.setViewportSize(sizes[size]);
    const page = await openApp(context, server.url);
    await expect(status(page)).toContainText('ready offline', { timeout: 20_000 });

    // A new orbit from the book.
    await toPlace(page, 'Book');
    if (size === 'phone') await press(button(page, /^Skerry A/));
    if (size === 'phone') await press(button(page, 'Back to the list'));
    await press(button(page, /^New orbit$/));
    await expect(page.locator('.place-size')).toBeVisible();

    // Typing; arrows step a number; the form is a group of radio buttons.
    await typeInto(field(page, 'Name of this orbit'), 'By keys');
    await typeInto(field(page, 'Perigee altitude'), '700');
    await typeInto(field(page, 'Apogee altitude'), '709');
    await page.keyboard.press('ArrowUp');
    await expect(field(page, 'Apogee altitude')).toHaveValue('710');
    await tabTo(page.getByRole('radio', { name: 'Altitudes' }), 'Shift+Tab');
    await page.keyboard.press('ArrowRight');
    await expect(page.getByRole('radio', { name: 'a and e' })).toBeChecked();
    await typeInto(field(page, 'Inclination'), '98.2');
    expect(numberOf(await field(page, 'Semi-major axis').inputValue())).toBeCloseTo(6378.137 + 705, 2);

    // A working opens, takes the focus, and gives it back.
    const nodeRate = reading(page, 'Node rate');
    await press(nodeRate);
    const working = page.locator('.working');
    await expect(working.getByRole('heading', { level: 2 })).toBeFocused();
    await page.keyboard.press('Escape');
    await expect(working).toHaveCount(0);
    await expect(nodeRate).toBeFocused();
    await page.keyboard.press('Space');
    await expect(working).toBeVisible();
    await press(working.getByRole('button', { name: 'Close' }));
    await expect(nodeRate).toBeFocused();

    // Saving twice makes two revisions to go back between.
    const before = await readingNumber(page, 'Node rate');
    await press(button(page, /^Save$/));
    await expect(status(page)).toHaveText(/^Saved \d\d:\d\d/);
    await typeInto(field(page, 'Inclination'), '98.3');
    await press(button(page, /^Save$/));
    await expect(revisionChip(page)).toHaveText('rev 2');

    // The plots: a slider each, all in step.
    await toPlace(page, 'Drift');
    await tabTo(page.getByRole('radio', { name: '5 years', exact: true }));
    await page.keyboard.press('ArrowLeft');
    await expect(page.getByRole('radio', { name: '1 year', exact: true })).toBeChecked();
    const cursor = page.getByRole('slider').first();
    await tabTo(cursor, 'Shift+Tab');
    const told = await cursor.getAttribute('aria-valuetext');
    await page.keyboard.press('ArrowLeft');
    await expect(cursor).not.toHaveAttribute('aria-valuetext', told ?? '');
    await page.keyboard.press('Home');
    const atCursor = page.getByRole('table', { name: /^At the cursor/ }).getByRole('row', { name: /^Node/ });
    await expect(atCursor.getByRole('cell').first()).toHaveText(/^0\.0+$/);

    // The book.
    await toPlace(page, 'Book');
    await press(button(page, /^By keys/));
    await press(button(page, /^Rename$/));
    await expect(field(page, 'New name')).toBeFocused();
    await page.keyboard.type('Renamed by keys');
    await page.keyboard.press('Enter');
    await expect(page.getByRole('heading', { name: 'Renamed by keys', exact: true })).toBeVisible();
    await expect(button(page, /^Rename$/)).toBeFocused();
    await press(button(page, 'Duplicate'));
    const rowOf = (name: string) => page.locator('.book-row', { has: page.getByText(name, { exact: true }) });
    const copy = rowOf('Renamed by keys, copy');
    await expect(copy).toHaveCount(1);
    if (size === 'phone' && !(await copy.isVisible())) await press(button(page, 'Back to the list'));
    await press(copy);
    await press(button(page, /^Remove$/));
    await expect(copy).toHaveCount(0);
    await press(notice(page, 'Undo'));
    await expect(copy).toHaveCount(1);

    const original = rowOf('Renamed by keys');
    if (size === 'phone' && !(await original.isVisible())) await press(button(page, 'Back to the list'));
    await press(original);
    await press(button(page, 'Restore revision 1'));
    await expect(page.getByText(/^Revision 1 of .* is back, as revision 4/)).toBeVisible();
    await press(button(page, /^(Open|Go on with it)$/));
    await expect(page.locator('.place-size')).toBeVisible();
    expect(await readingNumber(page, 'Node rate')).toBe(before);

    // The lighting.
    await press(page.getByRole('button', { name: /^Lighting: Room/ }));
    await expect(page.locator('html')).toHaveAttribute('data-lighting', 'sunlight');
  });
}

const numberOf = (text: string): number => Number(text);
