import { expect, type Page, test } from '@playwright/test';
import {
  button,
  choose,
  dropProfile,
  field,
  newProfile,
  openApp,
  reading,
  save,
  select,
  sizes,
  startBrowser,
  textOf,
} from './app';
import { type StaticServer, startServer } from './server';
import { watch } from './watch';

/** Wishes as conditions: settled, saved, opened again; what there is where no orbit meets them. */
test.describe.configure({ mode: 'parallel' });

let server: StaticServer;
test.beforeAll(async () => {
  server = await startServer();
});
test.afterAll(async () => {
  await server.stop();
});

const add = (page: Page, kind: string) => select(page, 'Add a condition').selectOption(kind);
const message = (page: Page) => page.locator('.condition-outcome .condition-message');
const fingerprint = (page: Page) => page.locator('.fingerprint');
const settledFields = (page: Page) => page.locator('.field.is-settled .field-input');
const chartWords = (page: Page) => page.locator('.rate-map-words');

async function addRepeat(page: Page, revolutions: string, days: string): Promise<void> {
  await add(page, 'repeat');
  await field(page, 'Revolutions').fill(revolutions);
  await field(page, 'Days').fill(days);
}

/** Texts of fields that are wider than what shows of them. */
const cutTexts = (page: Page): Promise<string[]> =>
  page
    .locator('.field-input')
    .evaluateAll((inputs) =>
      (inputs as HTMLInputElement[]).flatMap((input) => (input.scrollWidth > input.clientWidth ? [input.value] : [])),
    );

test('wishes come to an orbit that is saved and comes back the same', async () => {
  const profile = await newProfile();
  try {
    const first = await startBrowser(profile);
    const page = await openApp(first, server.url);
    await add(page, 'sunSynchronous');
    await addRepeat(page, '143', '10');
    await add(page, 'frozen');
    // Both altitudes, the inclination, and the perigee that freezes.
    await expect(settledFields(page)).toHaveCount(4);
    await expect(field(page, 'Inclination')).toHaveValue(/^98\.\d{1,5}$/);
    await expect(field(page, 'Inclination')).not.toBeEditable();
    await expect(field(page, 'Perigee altitude')).toHaveValue(/^7\d\d\.\d{1,4}$/);
    expect(await cutTexts(page)).toEqual([]);
    const values = await settledFields(page).evaluateAll((all) =>
      (all as HTMLInputElement[]).map(({ value }) => value),
    );

    await button(page, /^Repeat ground track$/).click();
    const working = page.locator('.condition-working');
    await expect(working).toContainText('14.300000 a nodal day');
    await expect(working).toContainText('Residual');
    await button(page, /^Repeat ground track$/).click();
    await expect(working).toHaveCount(0);

    await save(page);
    const letters = await textOf(fingerprint(page));
    await first.close();
    const second = await startBrowser(profile, { viewport: sizes.phone });
    const again = await openApp(second, server.url);
    await expect(fingerprint(again)).toHaveText(letters);
    await expect(settledFields(again)).toHaveCount(4);
    const after = await settledFields(again).evaluateAll((all) =>
      (all as HTMLInputElement[]).map(({ value }) => value),
    );
    expect(after).toEqual(values);
    expect(await cutTexts(again)).toEqual([]);
    await second.close();
  } finally {
    await dropProfile(profile);
  }
});

test('where no orbit meets a wish, the reason has its numbers and the nearest can be taken', async ({ context }) => {
  const page = await openApp(context, server.url);
  await add(page, 'nodeRate');
  await field(page, 'Rate').fill('25');
  await expect(message(page)).toHaveText(/reaches at most 7\.44\d* ?°\/day/);
  const take = button(page, 'Take the nearest');
  const inclination = await field(page, 'Inclination').inputValue();
  await take.click();
  await expect(take).toHaveCount(0);
  await expect(page.locator('.condition-outcome')).toContainText('The entry is the nearest that exists');
  await expect(field(page, 'Inclination')).not.toHaveValue(inclination);
  await expect(page.locator('.answer-stale')).toBeVisible();
});

test('saved without a solution, the place of the headline says why when it is opened again', async ({ context }) => {
  const page = await openApp(context, server.url);
  await add(page, 'nodeRate');
  await field(page, 'Rate').fill('25');
  await expect(message(page)).not.toBeEmpty();
  const why = await textOf(message(page));
  await save(page);
  await page.reload();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText(why);
});

test('a state vector is the start of what its conditions settle', async ({ context }) => {
  const page = await openApp(context, server.url);
  await choose(page, 'State');
  await add(page, 'sunSynchronous');
  await addRepeat(page, '143', '10');
  await expect(page.locator('.conditions')).toContainText(
    /Conditions settle a and i; what is typed is the start\. Settled: [\d.]+ × [\d.]+ km, 98\.\d+°/,
  );
});

test('half-typed revolutions leave the chart alive', async ({ context }) => {
  const watched = await watch(context, server.url);
  const page = await openApp(context, server.url);
  await expect(chartWords(page)).toContainText('Near:');
  await addRepeat(page, '0', '10');
  await expect(page.locator('.conditions')).toContainText('whole');
  await field(page, 'Revolutions').fill('14.3');
  await field(page, 'Revolutions').fill('143');
  await expect(reading(page, 'Node rate')).toBeVisible();
  await expect(page.locator('.stale-says')).toHaveCount(0);
  const before = await textOf(chartWords(page));
  await page.getByRole('application', { name: /Rate chart/ }).press('Shift+ArrowRight');
  await expect(chartWords(page)).not.toHaveText(before);
  expect(watched.pageErrors).toEqual([]);
});
