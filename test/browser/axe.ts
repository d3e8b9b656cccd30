/** axe-core in the page as it stands. */
import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import type { Page } from '@playwright/test';
import type { AxeResults } from 'axe-core';

const source = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

/** Every violation as one line, with how many elements it is found at and the first of them. */
export async function violations(page: Page, where: string): Promise<string[]> {
  // The policy of the page blocks a script element; evaluation by the browser's own tools is not under it.
  if (!(await page.evaluate(() => 'axe' in window))) await page.evaluate(source);
  // A fade that is still going on would be measured half way.
  await page.evaluate(() => Promise.all(document.getAnimations().map(({ finished }) => finished)));
  const results = (await page.evaluate(() => {
    const axe = Reflect.get(window, 'axe') as { run(): Promise<unknown> };
    return axe.run();
  })) as AxeResults;
  return results.violations.map(({ id, help, nodes }) => {
    const first = nodes[0];
    const why = [...(first?.any ?? []), ...(first?.all ?? []), ...(first?.none ?? [])].map(({ message }) => message);
    return `${where}: ${id} (${help}) at ${nodes.length}, as ${first?.target.join(' ')}: ${why.join('; ')}`;
  });
}
