import { type BrowserContext, expect, type Page, test } from '@playwright/test';
import { button, choose, field, go, headline, openApp, save, textOf, unfold } from './app';
import { type StaticServer, startServer } from './server';

/** From an orbit with an epoch to the mission: history, box, ledger, light, second look, and how each is ended. */
let server: StaticServer;
test.beforeAll(async () => {
  server = await startServer();
});
test.afterAll(() => server.stop());

async function openOrbit(context: BrowserContext, epoch = '2028-01-01'): Promise<Page> {
  const page = await openApp(context, server.url);
  await field(page, 'Perigee altitude').fill('561');
  await field(page, 'Apogee altitude').fill('575');
  await field(page, 'Inclination').fill('97.68');
  await unfold(page, /Perigee, anomaly/);
  await field(page, 'Epoch, UTC').fill(epoch);
  return page;
}

const ledgerRow = (page: Page, name: string) =>
  page
    .locator('.ledger-table')
    .first()
    .locator('tr', { has: page.getByRole('rowheader', { name, exact: true }) });

test('the mission of an orbit with an epoch: history, the date it leaves the box, effects, second look', async ({
  context,
}) => {
  const page = await openOrbit(context);
  await go(page, 'drift');
  await choose(page, '5 years');
  await expect(headline(page)).toContainText(
    /Local time of the \w+ node runs from \d\d:\d\d to \d\d:\d\d in 5 years; it leaves the ±15 min box on \d{4}-\d\d-\d\d/,
  );
  const leaving = /on (\d{4}-\d\d-\d\d)/.exec(await textOf(headline(page)))?.[1] ?? '';
  await expect(page.locator('.drift-answer')).toContainText('By the averaged method: zonals to degree 14, Sun, Moon.');

  // The event stands in the list with the same date, on the plot, and brings the cursor there.
  const event = page.locator('.event', { hasText: 'Local time leaves the box' }).first();
  await expect(event).toContainText(leaving);
  await expect(page.locator('.of-localTime .plot-event').first()).toBeAttached();
  await event.click();
  await expect(page.getByRole('region', { name: 'Values at the cursor' })).toContainText(leaving.slice(0, 7));
  await expect(page.getByRole('img', { name: /Local time of the \w+ node at the cursor/ })).toBeVisible();

  // Rows in the order in which the effects are switched on; the sum is what the plots end with.
  const names = await page.locator('.ledger-table').first().getByRole('rowheader').allTextContents();
  expect(names).toEqual([
    'J2',
    'J2² and J4',
    'higher even zonals',
    'odd zonals',
    'Sun',
    'Moon',
    'precession of the equinox',
    'all',
    'left out, at most',
  ]);
  const cells = async (name: string) =>
    (await ledgerRow(page, name).getByRole('cell').allTextContents()).map((text) =>
      Number(text.replace('\u2212', '-')),
    );
  const rows = await Promise.all(names.slice(0, 7).map(cells));
  const sum = await cells('all');
  for (const column of [0, 1, 2]) {
    expect(rows.reduce((total, row) => total + (row[column] ?? 0), 0)).toBeCloseTo(sum[column] ?? Number.NaN, 0);
  }
  for (const id of ['localTime', 'node', 'inclination', 'altitude', 'eccentricity', 'beta', 'eclipse']) {
    await expect(page.locator(`.of-${id} canvas`)).toBeAttached();
    expect((await textOf(page.locator(`.of-${id} figcaption p`))).length).toBeGreaterThan(10);
  }

  await button(page, 'Second look').click();
  const judged = page.locator('.drift-answer [role=status]');
  await expect(judged).toContainText(/After 30 days the closed form’s node is .*second order; first order/, {
    timeout: 30_000,
  });
  await expect(page.getByRole('region', { name: 'Second look' }).getByRole('row')).toHaveCount(6);
  await expect(page.locator('.of-node .plot-points i').first()).toBeAttached();

  // Size takes its claim from here, until the orbit is another.
  await go(page, 'size');
  await expect(headline(page)).toContainText(`it leaves the ±15 min box on ${leaving}`);
  await field(page, 'Inclination').fill('97.7');
  await expect(headline(page)).not.toContainText('box');
});

test('forces and box are saved with the candidate, refused in words, and computed with', async ({ context }) => {
  const page = await openOrbit(context);
  await go(page, 'drift');
  await expect(headline(page)).toContainText('box');
  await unfold(page, /Forces and box/);
  await field(page, 'Box of local time ±').fill('0');
  await expect(page.getByText(/Box of local time: type minutes to either side, above 0/)).toBeVisible();
  await expect(page.locator('.mission-says')).toContainText('cannot be read');
  await field(page, 'Box of local time ±').fill('5');
  await expect(headline(page)).toContainText('±5 min box');
  await page.getByRole('checkbox', { name: 'Drag' }).check();
  await choose(page, 'm/(Cd·A)');
  await field(page, 'm/(Cd·A)').fill('-4');
  await expect(page.getByText(/m\/\(Cd·A\) must be above 0/)).toBeVisible();
  await field(page, 'm/(Cd·A)').fill('0.004');
  await expect(page.getByText(/satellites lie between 1 and 2000/)).toBeVisible();
  await field(page, 'm/(Cd·A)').fill('60');
  await expect(page.locator('.drift-answer')).toContainText('drag at mean density, 60 kg/m²');
  await expect(page.locator('.ledger-notes')).toContainText('uncertain by a factor of two');
  await go(page, 'size');
  await save(page);
  await page.reload();
  await go(page, 'drift');
  await expect(page.locator('.drift-answer')).toContainText('drag at mean density, 60 kg/m²');
});

test('spans out of range are refused, low perigees decay at once, and an orbit without an epoch keeps the rates of now', async ({
  context,
}) => {
  const page = await openOrbit(context);
  await page.locator('select', { has: page.locator('option', { hasText: 'LTDN' }) }).selectOption('raan');
  await field(page, 'Epoch, UTC').fill('');
  await go(page, 'drift');
  await expect(headline(page)).toContainText('Node moves');
  await expect(page.locator('.mission-says')).toContainText('type an epoch in Size');
  for (const span of ['0', '-3', '5500', 'long']) {
    await field(page, 'Any span').fill(span);
    await expect(page.getByText(/Type a span from 1 to/)).toBeVisible();
  }
  await choose(page, '30 days');
  await go(page, 'size');
  await unfold(page, /Perigee, anomaly/);
  await field(page, 'Epoch, UTC').fill('2028-01-01');
  await field(page, 'Perigee altitude').fill('90');
  await go(page, 'drift');
  await unfold(page, /Forces and box/);
  await page.getByRole('checkbox', { name: 'Drag' }).check();
  await expect(page.locator('.mission-says')).toContainText('over as it begins');
});

test('what runs long can be cancelled and started again', async ({ context }) => {
  const page = await openOrbit(context);
  await go(page, 'drift');
  await choose(page, '15 years');
  const cancel = page.getByRole('button', { name: 'Cancel', exact: true });
  await cancel.click();
  await expect(page.locator('.mission-says')).toContainText('stopped');
  await button(page, 'Compute the mission').click();
  await expect(page.locator('.ledger-sum').first()).toBeVisible({ timeout: 60_000 });
  await expect(headline(page)).toContainText('in 15 years');
});
