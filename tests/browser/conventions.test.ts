import AxeBuilder from '@axe-core/playwright';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { demo, launch, openPage, signIn } from '#tests/support/browser.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await launch();
});
afterAll(() => browser.close());

it.each(['light', 'dark'] as const)('compares two conventions, keeps the pair in the address, and hands it to the workbench (%s theme)', async (colorScheme) => {
  const { page, expectQuiet } = await openPage(browser, { colorScheme });
  await signIn(page, 'engineer');
  await page.goto(`${demo.url}/conventions?left=aircraft-euler-deg&right=aircraft-euler-rad`);
  const comparison = page.getByRole('region', { name: 'Compare two conventions' });
  await comparison.getByText('1 of 9 facets differs.').waitFor();
  for (const width of [360, 768, 1440]) {
    await page.setViewportSize({ width, height: 900 });
    expect(await page.evaluate(() => document.documentElement.scrollWidth <= innerWidth), `scrolls sideways at ${width}`).toBe(true);
    const { violations } = await new AxeBuilder({ page }).analyze();
    expect(violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`)).toEqual([]);
    if (process.env['SCREENSHOTS']) await comparison.screenshot({ path: `${process.env['SCREENSHOTS']}/${colorScheme}-${width}.png` });
  }
  await comparison.getByLabel('Second').selectOption('aircraft-euler-deg');
  await comparison.getByText('Every facet is the same.').waitFor();
  await comparison.getByLabel('Second').selectOption('aircraft-euler-rpy-deg');
  await expect.poll(() => new URL(page.url()).searchParams.get('right')).toBe('aircraft-euler-rpy-deg');
  await comparison.getByRole('link', { name: /in the workbench/ }).click();
  await expect.poll(() => page.getByRole('region', { name: 'Result' }).locator('dd').allTextContents()).toEqual(['20', '10', '30']);
  expectQuiet();
});
