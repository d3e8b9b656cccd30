import { expect, test } from '@playwright/test';
import {
  choose,
  dropProfile,
  newProfile,
  numberIn,
  openApp,
  reading,
  readingNumber,
  startBrowser,
  textOf,
  unfold,
} from './app';
import { startServer } from './server';

test('lighting and units change the page and outlast a restart', async () => {
  const [server, profile] = await Promise.all([startServer(), newProfile()]);
  try {
    const context = await startBrowser(profile);
    const page = await openApp(context, server.url);
    const paper = () => page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor);
    const roomPaper = await paper();
    const [perDay, altitudeKm] = [
      await readingNumber(page, 'Node rate'),
      await readingNumber(page, 'Perigee altitude'),
    ];
    for (const [name, lighting] of [
      ['Room', 'sunlight'],
      ['Sunlight', 'night'],
    ] as const) {
      await page.getByRole('button', { name: new RegExp(`^Lighting: ${name}`) }).click();
      await expect(page.locator('html')).toHaveAttribute('data-lighting', lighting);
      expect(await paper()).not.toBe(roomPaper);
    }
    const nightPaper = await paper();
    await unfold(page, /Body and units/);
    await choose(page, 'NM');
    await choose(page, '°/yr');
    // 1 international nautical mile is 1.852 km; rates are told for a year of 365.25 days.
    await expect(reading(page, 'Perigee altitude')).toContainText('NM');
    expect((await readingNumber(page, 'Perigee altitude')) * 1.852).toBeCloseTo(altitudeKm, 2);
    expect((await readingNumber(page, 'Node rate')) / 365.25).toBeCloseTo(perDay, 4);
    await context.close();

    const restarted = await startBrowser(profile);
    const again = await openApp(restarted, server.url);
    await expect(again.locator('html')).toHaveAttribute('data-lighting', 'night');
    expect(await again.evaluate(() => getComputedStyle(document.documentElement).backgroundColor)).toBe(nightPaper);
    await expect(reading(again, 'Node rate')).toContainText('°/yr');
    expect(numberIn(await textOf(reading(again, 'Perigee altitude').locator('.reading-value'))) * 1.852).toBeCloseTo(
      altitudeKm,
      2,
    );
    await restarted.close();
  } finally {
    await server.stop();
    await dropProfile(profile);
  }
});
