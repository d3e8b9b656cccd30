import { type BrowserContext, expect, type Page, test } from '@playwright/test';
import { twoline2satrec } from 'satellite.js';
import {
  bodies,
  gravitySets,
  julianDateFromIso,
  type MeanElements,
  parseTle,
  radPerDeg,
  type SecularRates,
  secondsPerDay,
  secularRates,
  stateFromMean,
  stateFromMeanOfDate,
} from '../../core/index';
import {
  button,
  choose,
  dropProfile,
  field,
  go,
  headline,
  newProfile,
  numberIn,
  openApp,
  paste,
  reading,
  readingNumber,
  readingTexts,
  restOf,
  revisionChip,
  save,
  select,
  startBrowser,
  status,
  textOf,
} from './app';
import { type StaticServer, startServer } from './server';
import { watch } from './watch';

test.describe.configure({ mode: 'parallel' });

/** The year that rates and spans are told in. */
const yearDays = 365.25;
const degPerDay = (radPerS: number): number => (radPerS * secondsPerDay) / radPerDeg;

let server: StaticServer;
let profile: string;

test.beforeEach(async () => {
  [server, profile] = await Promise.all([startServer(), newProfile()]);
});

test.afterEach(async () => {
  await Promise.all([server.stop(), dropProfile(profile)]);
});

/**
 * EUMETSAT, EPS programme, reference orbit of 29 days / 412 revolutions (mean a, e, i; node rate in deg/day, which
 * the second order meets within 5e-5). Node, anomaly and epoch are invented.
 */
const reference = { semiMajorAxisKm: 7195.605347, eccentricity: 0.001165, inclinationDeg: 98.702198 } as const;
const referenceNodeDegPerDay = 0.98564735;
const epoch = '2027-06-18T04:41:07Z';

const mean: MeanElements = {
  semiMajorAxisKm: reference.semiMajorAxisKm,
  eccentricity: reference.eccentricity,
  inclinationRad: reference.inclinationDeg * radPerDeg,
  nodeRad: 147.2 * radPerDeg,
  perigeeRad: 90 * radPerDeg,
  meanAnomalyRad: 31 * radPerDeg,
};

/** The six numbers a launch site would send: metres, turning with the Earth. */
function separationText(): string {
  const jd = julianDateFromIso(epoch);
  if (!jd.ok) throw new Error(jd.message);
  const state = stateFromMeanOfDate(stateFromMean(bodies.earth, mean), { frame: 'earthFixed', epochJd: jd.jd });
  const [x, y, z] = state.positionKm.map((km) => (km * 1000).toFixed(3));
  const [vx, vy, vz] = state.velocityKmPerS.map((kmPerS) => (kmPerS * 1000).toFixed(6));
  return `Separation ${epoch}\nX = ${x}, Y = ${y}, Z = ${z}\nVX = ${vx}, VY = ${vy}, VZ = ${vz}\n`;
}

interface Expected {
  readonly first: SecularRates;
  readonly second: SecularRates;
  /** J2 of the gravity set as its publication rounds it. */
  readonly j2Text: string;
}

/** Opens a working, reads it, and closes it. */
async function readWorking(page: Page, rates: Expected): Promise<void> {
  await reading(page, 'Node rate').click();
  const working = page.locator('.working');
  await expect(working.getByRole('heading', { level: 2 })).toContainText('Node rate');
  expect(await working.locator('.formula math').count()).toBeGreaterThan(6);
  await expect(working.locator('.formula math mfrac').first()).toBeVisible();
  const results = await working.locator('.is-result .working-value').allInnerTexts();
  const [first = '', second = ''] = results;
  expect(numberIn(first) / rates.first.nodeRadPerS).toBeCloseTo(1, 5);
  expect(numberIn(second) / rates.second.nodeRadPerS).toBeCloseTo(1, 5);
  // The constants, with where they come from.
  await expect(working.locator('.working-table')).toContainText(rates.j2Text);
  await expect(working.locator('.working-source')).not.toBeEmpty();
  await expect(working.locator('.working-orders').first()).toContainText(/First order .* second order /);
  await working.getByRole('button', { name: 'Close' }).click();
  await expect(working).toHaveCount(0);
}

/** Sees node, perigee and local time drawn over five years, and their values as text. */
async function readDrift(page: Page, { first, second }: Expected): Promise<void> {
  await go(page, 'drift');
  await expect(page.locator('canvas').first()).toBeVisible();
  const inkOf = () =>
    page.locator('canvas').evaluateAll((canvases) =>
      (canvases as HTMLCanvasElement[]).map((canvas) => {
        const pixels = canvas.getContext('2d')?.getImageData(0, 0, canvas.width, canvas.height).data ?? [];
        return pixels.filter((value, index) => index % 4 === 3 && value > 0).length;
      }),
    );
  await expect.poll(async () => Math.min(...(await inkOf()))).toBeGreaterThan(300);
  await expect.poll(async () => (await inkOf()).length).toBeGreaterThanOrEqual(3);
  const span = page.getByRole('table', { name: /^Over the span/ });
  expect(await span.getByRole('row').count()).toBeGreaterThanOrEqual(6);
  for (const { label, days } of [
    { label: '1 day', days: 1 },
    { label: '1 year', days: yearDays },
    { label: '15 years', days: 15 * yearDays },
  ]) {
    await choose(page, label);
    // The mission is computed anew for each span.
    for (const [order, rate] of [
      ['2nd order', second.nodeRadPerS],
      ['1st order', first.nodeRadPerS],
    ] as const) {
      const expected = degPerDay(rate) * days;
      await expect
        .poll(
          async () => {
            const { deg, unit } = await nodeDrift(page, order);
            return Math.abs(deg - expected) / unit ** 0.5;
          },
          { timeout: 30_000 },
        )
        .toBeLessThan(0.005);
    }
  }
}

/** Node at the cursor by one of the closed forms, from the start, whichever other columns the table has. */
async function nodeDrift(page: Page, order: string): Promise<{ deg: number; unit: number }> {
  const table = page.getByRole('table', { name: /^At the cursor/ });
  const headers = await table.getByRole('columnheader').allInnerTexts();
  const row = table.getByRole('row', { name: /^Node/ });
  const cells = await row.getByRole('cell').allInnerTexts();
  const column = headers.indexOf(order) - (headers.length - cells.length);
  // Long drifts are told in turns.
  const unit = (await textOf(row)).includes('turns') ? 360 : 1;
  return { deg: numberIn(cells[column] ?? '') * unit, unit };
}

/** Ends the browser, starts it again with the server gone, and finds the orbit as it was. */
async function findAgain(context: BrowserContext, page: Page, name: string): Promise<void> {
  await go(page, 'size');
  const before = await readingTexts(page);
  const letters = await textOf(page.locator('.fingerprint'));
  await context.close();
  await server.stop();

  const restarted = await startBrowser(profile);
  try {
    const again = await openApp(restarted, `${server.url}#/book`);
    const row = again.getByRole('button', { name: new RegExp(name) });
    await expect(row).toContainText(letters);
    await again.getByRole('button', { name: /^Skerry altimeter/ }).click();
    await button(again, /^Open$/).click();
    await expect(again.locator('.head-name')).toHaveValue('Skerry altimeter');
    await go(again, 'book');
    await row.click();
    await button(again, /^Open$/).click();
    await expect(again.locator('.head-name')).toHaveValue(name);
    await expect(again.locator('.fingerprint')).toHaveText(letters);
    await expect(revisionChip(again)).toHaveText('rev 1');
    expect(await readingTexts(again)).toEqual(before);
  } finally {
    await restarted.close();
  }
}

test('a separation vector pasted in metres, Earth-fixed: read, worked, drawn, saved, found after a restart', async () => {
  const context = await startBrowser(profile);
  const watched = await watch(context, server.url);
  const page = await openApp(context, server.url);
  await expect(status(page)).toContainText('ready offline', { timeout: 20_000 });
  await go(page, 'book');
  await button(page, 'New orbit').click();
  await field(page, 'Name of this orbit').fill('Launch site vector');
  await choose(page, 'State');
  await paste(field(page, 'Position x'), separationText());
  await expect(page.getByText('Read as a state vector in m and m/s.')).toBeVisible();
  await expect(page.getByRole('radio', { name: 'm, m/s' })).toBeChecked();
  await expect(field(page, 'Epoch, UTC')).toHaveValue(epoch);
  await select(page, 'Axes').selectOption('Earth-fixed');

  const rates = {
    first: secularRates(bodies.earth, mean, 'first'),
    second: secularRates(bodies.earth, mean, 'second'),
    j2Text: '0.0010826',
  };
  await expect(page.locator('.stale-says')).toHaveCount(0);
  await restOf(page);
  const nodeRate = await readingNumber(page, 'Node rate');
  expect(Math.abs(nodeRate - referenceNodeDegPerDay)).toBeLessThan(5e-5);
  expect(nodeRate).toBeCloseTo(degPerDay(rates.second.nodeRadPerS), 5);
  expect(await readingNumber(page, 'Perigee rate')).toBeCloseTo(degPerDay(rates.second.perigeeRadPerS), 5);
  // Positions to 1 mm and velocities to 1 µm/s leave a to within metres, e and i to their last digit.
  expect(Math.abs((await readingNumber(page, 'Mean semi-major axis')) - mean.semiMajorAxisKm)).toBeLessThan(0.002);
  expect(await readingNumber(page, 'Mean eccentricity')).toBeCloseTo(mean.eccentricity, 5);
  expect(await readingNumber(page, 'Mean inclination')).toBeCloseTo(reference.inclinationDeg, 3);
  expect(await readingNumber(page, 'Node at epoch')).toBeCloseTo(147.2, 3);
  await expect(headline(page)).toContainText('Sun-synchronous');

  await readWorking(page, rates);
  await readDrift(page, rates);
  await go(page, 'size');
  await expect(revisionChip(page)).toHaveText('not saved');
  await save(page);
  await expect(revisionChip(page)).toHaveText('rev 1');
  expect(watched).toEqual({ strayRequests: [], cspViolations: [], pageErrors: [] });
  await findAgain(context, page, 'Launch site vector');
});

/**
 * The first set of the verification list in Vallado, Crawford, Hujsak, Kelso, "Revisiting Spacetrack Report #3",
 * AIAA 2006-6753: an old satellite on an ellipse, here with Windows line ends as a mail would bring it.
 */
const line1 = '1 00005U 58002B   00179.78495062  .00000023  00000-0  28098-4 0  4753';
const line2 = '2 00005  34.2682 348.7242 1859667 331.7664  19.3264 10.82419157413667';

test('two-line elements pasted with Windows line ends: the same way through', async () => {
  const context = await startBrowser(profile);
  const watched = await watch(context, server.url);
  const page = await openApp(context, server.url);
  await expect(status(page)).toContainText('ready offline', { timeout: 20_000 });
  await go(page, 'book');
  await button(page, 'New orbit').click();
  await field(page, 'Name of this orbit').fill('Mailed lines');
  await paste(field(page, 'Perigee altitude'), `${line1}\r\n${line2}\r\n`);
  await expect(page.getByRole('radio', { name: 'Two-line' })).toBeChecked();

  const parsed = parseTle(`${line1}\n${line2}`);
  if (!parsed.ok) throw new Error(parsed.errors.map(({ message }) => message).join('\n'));
  const rates = {
    first: secularRates(gravitySets.WGS72, parsed.elements, 'first'),
    second: secularRates(gravitySets.WGS72, parsed.elements, 'second'),
    j2Text: '0.001082616',
  };
  // satellite.js 7.1.0: SGP4's own initial rates. It leaves e² out of the second order, here about 5e-5 of the rate.
  const theirs = twoline2satrec(line1, line2);
  await restOf(page);
  const nodeRate = await readingNumber(page, 'Node rate');
  expect(Math.abs(nodeRate / degPerDay(theirs.nodedot / 60) - 1)).toBeLessThan(1e-4);
  expect(nodeRate).toBeCloseTo(degPerDay(rates.second.nodeRadPerS), 5);
  const perigeeRate = await readingNumber(page, 'Perigee rate');
  expect(Math.abs(perigeeRate / degPerDay(theirs.argpdot / 60) - 1)).toBeLessThan(1e-4);
  expect(await readingNumber(page, 'Mean eccentricity')).toBeCloseTo(0.1859667, 6);
  expect(await readingNumber(page, 'Mean inclination')).toBeCloseTo(34.2682, 4);
  expect(Math.abs((await readingNumber(page, 'Mean semi-major axis')) - parsed.elements.semiMajorAxisKm)).toBeLessThan(
    1e-3,
  );

  await readWorking(page, rates);
  await readDrift(page, rates);
  await go(page, 'size');
  await save(page);
  expect(watched).toEqual({ strayRequests: [], cspViolations: [], pageErrors: [] });
  await findAgain(context, page, 'Mailed lines');
});
