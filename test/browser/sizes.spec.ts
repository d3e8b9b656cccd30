import { expect, type Page, test } from '@playwright/test';
import { choose, field, go, openApp, placeNames, reading, sizes, unfold } from './app';
import { type StaticServer, startServer } from './server';

test.describe.configure({ mode: 'parallel' });

let server: StaticServer;
test.beforeAll(async () => {
  server = await startServer();
});
test.afterAll(async () => {
  await server.stop();
});

const longName = 'Skerry F, orbit for the third winter after the second launch';

/**
 * What does not fit: sideways scroll of the page or a place; text wider or higher than the box that cuts it off.
 * A box that scrolls or that says it cuts (ellipsis) is meant so. Text fields scroll by themselves.
 */
const misfits = (page: Page): Promise<string[]> =>
  page.evaluate(() => {
    const found: string[] = [];
    const nameOf = (element: Element) =>
      `${element.tagName.toLowerCase()}.${[...element.classList].join('.')} "${(element.textContent ?? '').trim().slice(0, 40)}"`;
    const areas = [
      document.documentElement,
      document.body,
      ...document.querySelectorAll('.place, .picture, .numbers, .head'),
    ];
    for (const area of areas) {
      const over = area.scrollWidth - area.clientWidth;
      // Where the contents are laid out straight into the parent there is no box to measure.
      if (area.clientWidth > 0 && over > 0) found.push(`sideways scroll of ${over} px: ${nameOf(area)}`);
    }
    const cuts = (element: Element): CSSStyleDeclaration | null => {
      const style = getComputedStyle(element);
      return style.overflowX !== 'visible' || style.overflowY !== 'visible' ? style : null;
    };
    const allowed =
      'input, textarea, select, .hidden-visually, .hidden-visually *, option, script, style, noscript, .u-legend *';
    const walker = document.createTreeWalker(document.body, NodeFilter.SHOW_TEXT);
    for (let node = walker.nextNode(); node; node = walker.nextNode()) {
      const holder = node.parentElement;
      if (!holder || !node.textContent?.trim() || holder.matches(allowed) || !holder.checkVisibility()) continue;
      const range = document.createRange();
      range.selectNodeContents(node);
      const text = range.getBoundingClientRect();
      if (text.width === 0) continue;
      if (text.left < -1 || text.right > document.documentElement.clientWidth + 1) {
        if (!holder.closest('.formula')) found.push(`off the screen: ${nameOf(holder)}`);
      }
      if (holder.closest('.hidden-visually')) continue;
      for (let box: Element | null = holder; box && box !== document.body; box = box.parentElement) {
        const style = cuts(box);
        // A clip hides on purpose.
        if (style?.clipPath !== 'none' || box.matches('svg, details')) continue;
        const { left, right, top, bottom } = box.getBoundingClientRect();
        const scrollsX = ['auto', 'scroll'].includes(style.overflowX);
        const scrollsY = ['auto', 'scroll'].includes(style.overflowY);
        const isCutX =
          !scrollsX && style.textOverflow !== 'ellipsis' && (text.left < left - 1 || text.right > right + 1);
        const isCutY =
          !scrollsY && box.scrollHeight > box.clientHeight + 1 && (text.top < top - 2 || text.bottom > bottom + 2);
        if (isCutX || isCutY) found.push(`cut off by ${nameOf(box).slice(0, 30)}: ${nameOf(holder)}`);
        if (scrollsX || scrollsY) break;
      }
    }
    return [...new Set(found)];
  });

/** Texts that lie on each other: two leaves whose boxes overlap by more than a hairline. */
const overlaps = (page: Page): Promise<string[]> =>
  page.evaluate(() => {
    const chosen =
      '.head *, .rail a, .field-label, .field-unit, .fold-title, .fold-says, .reading span, .key-readings *, .headline, figcaption *, th, td';
    const leaves = [...document.querySelectorAll(chosen)]
      .filter((element) => element.children.length === 0 && (element.textContent ?? '').trim() !== '')
      .filter((element) => element.checkVisibility() && !element.closest('.hidden-visually'))
      .map((element) => ({
        element,
        box: element.getBoundingClientRect(),
        // What scrolls under something else lies on nothing.
        area: element.closest('.head, .rail, .picture, .numbers'),
      }));
    const found: string[] = [];
    for (const [index, one] of leaves.entries()) {
      for (const other of leaves.slice(index + 1)) {
        const across = Math.min(one.box.right, other.box.right) - Math.max(one.box.left, other.box.left);
        const down = Math.min(one.box.bottom, other.box.bottom) - Math.max(one.box.top, other.box.top);
        if (one.area === other.area && across > 3 && down > 3)
          found.push(`"${one.element.textContent}" lies on "${other.element.textContent}"`);
      }
    }
    return found;
  });

/** Controls that are smaller than a thumb. A radio counts with its label, a link in a sentence is text. */
const smallTargets = (page: Page): Promise<string[]> =>
  page.evaluate(() => {
    const leastPx = 44;
    const controls = document.querySelectorAll<HTMLElement>(
      'button, input, select, textarea, summary, nav a, [role=slider]',
    );
    return [...controls]
      .map((control) => (control.matches('[type=radio]') ? (control.closest('label') ?? control) : control))
      .map((control) => ({ control, box: control.getBoundingClientRect() }))
      .filter(({ box }) => box.width > 0 && (box.height < leastPx - 0.5 || box.width < leastPx - 0.5))
      .map(({ control, box }) => {
        const name = control.getAttribute('aria-label') ?? control.textContent ?? '';
        return `${control.tagName.toLowerCase()}.${control.className} "${name.slice(0, 30)}": ${box.width.toFixed(0)} × ${box.height.toFixed(0)} px`;
      });
  });

async function faults(page: Page, where: string): Promise<string[]> {
  const found = [...(await misfits(page)), ...(await overlaps(page)), ...(await smallTargets(page))];
  return found.map((fault) => `${where}: ${fault}`);
}

/** All places with a long name, the forms, a working, errors and a message. */
async function walk(page: Page, where: string): Promise<string[]> {
  const found: string[] = [];
  const look = async (state: string) => found.push(...(await faults(page, `${where}, ${state}`)));
  await field(page, 'Name of this orbit').fill(longName);
  for (const place of placeNames) {
    await go(page, place);
    if (place === 'drift') await expect(page.locator('canvas').first()).toBeVisible();
    await look(place);
  }
  await page.getByRole('button', { name: /^Skerry relay/ }).click();
  await look('details in the book');
  await go(page, 'size');
  await reading(page, 'Node rate').click();
  await expect(page.locator('.working math').first()).toBeVisible();
  await look('working');
  await page.locator('.working').getByRole('button', { name: 'Close' }).click();
  await unfold(page, /Perigee, anomaly/);
  await unfold(page, /Body and units/);
  await field(page, 'Inclination').fill('north');
  await field(page, 'Perigee altitude').fill('1,234');
  await look('errors');
  await field(page, 'Inclination').fill('97.68');
  await field(page, 'Perigee altitude').fill('561');
  for (const form of ['a and e', 'State', 'Two-line']) {
    await choose(page, form);
    await look(form);
  }
  await choose(page, 'Altitudes');
  return found;
}

for (const [name, viewport] of Object.entries(sizes)) {
  test(`nothing is cut off and nothing scrolls sideways (${name})`, async ({ context, page: blank }) => {
    await blank.setViewportSize(viewport);
    const page = await openApp(context, server.url);
    expect(await walk(page, name)).toEqual([]);
  });

  test(`nor with text at twice its size (${name})`, async ({ context, page: blank }) => {
    await blank.setViewportSize(viewport);
    const page = await openApp(context, server.url);
    await page.evaluate(() => {
      document.documentElement.style.fontSize = '200%';
    });
    expect(await walk(page, `${name}, 200 %`)).toEqual([]);
  });
}

/** What is left of each screen when the on-screen keyboard is open. */
const withKeyboard = {
  landscape: { width: 1180, height: 400 },
  portrait: { width: 820, height: 600 },
  phone: { width: 390, height: 400 },
} as const;

for (const [name, viewport] of Object.entries(withKeyboard)) {
  test(`the key readings stay in view while the keyboard is open (${name})`, async ({ context, page: blank }) => {
    await blank.setViewportSize(sizes[name as keyof typeof sizes]);
    const page = await openApp(context, server.url);
    await unfold(page, /Perigee, anomaly/);
    for (const label of ['Perigee altitude', 'Inclination', 'Epoch, UTC']) {
      await page.setViewportSize(sizes[name as keyof typeof sizes]);
      await field(page, label).focus();
      await page.setViewportSize(viewport);
      await field(page, label).evaluate((input) => input.scrollIntoView({ block: 'nearest' }));
      await page.keyboard.press('End');
      const seen = await page.evaluate(() => {
        const isInView = (element: Element | null) => {
          if (!element) return false;
          const { left, top, width, height } = element.getBoundingClientRect();
          const [x, y] = [left + width / 2, top + height / 2];
          const atMiddle = document.elementFromPoint(x, y);
          return (
            top >= 0 &&
            top + height <= innerHeight &&
            atMiddle !== null &&
            (element.contains(atMiddle) || atMiddle.contains(element))
          );
        };
        const readings = [...document.querySelectorAll('.key-readings dd')];
        return {
          field: isInView(document.activeElement),
          count: readings.length,
          inView: readings.filter(isInView).length,
        };
      });
      expect(seen, `${label} in ${viewport.width} × ${viewport.height}`).toEqual({ field: true, count: 4, inView: 4 });
    }
  });
}
