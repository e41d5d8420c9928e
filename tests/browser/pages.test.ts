import AxeBuilder from '@axe-core/playwright';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { demo, launch, openPage, signIn } from '#tests/support/browser.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await launch();
});
afterAll(() => browser.close());

const PAGES = ['/', '/workbench', '/workbench?from=aircraft-quaternion&to=aircraft-dcm&n=1&n=0&n=0&n=0', '/verify', '/identify', '/runs', '/conventions', '/conventions/aircraft-dcm', '/keys', '/history', '/usage', '/first-call', '/problems/missing-facet', '/nowhere'];

describe.each(['light', 'dark'] as const)('in the %s theme', (colorScheme) => {
  it.each([360, 768, 1440])('every page at %i pixels is accessible, quiet, and never scrolls sideways', async (width) => {
    const { page, expectQuiet } = await openPage(browser, { colorScheme, viewport: { width, height: 900 } });
    await page.goto(`${demo.url}/sign-in`);
    await page.getByRole('button', { name: 'Sign in' }).waitFor();
    await inspect('/sign-in');
    await signIn(page, 'administrator');
    for (const path of PAGES) {
      await page.goto(demo.url + path);
      await page.getByRole('heading', { level: 1 }).waitFor();
      await page.locator('[role=status][aria-label^="Fetching"]').first().waitFor({ state: 'detached' });
      await inspect(path);
    }
    expectQuiet();

    async function inspect(path: string) {
      expect(await page.evaluate(() => document.documentElement.dataset['theme'])).toBe(colorScheme === 'dark' ? 'blueprint' : 'paper');
      expect(await page.evaluate(() => document.documentElement.scrollWidth <= innerWidth), `${path} scrolls sideways`).toBe(true);
      const { violations } = await new AxeBuilder({ page }).withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice']).analyze();
      expect(violations.map(({ id, nodes }) => `${path}: ${id}: ${nodes[0]?.html}`)).toEqual([]);
    }
  }, 300_000);
});

it('the API reference answers a call tried with a key, within the content security policy', async () => {
  const { page, expectQuiet } = await openPage(browser);
  await page.goto(`${demo.url}/docs`);
  await page.getByRole('button', { name: 'Authorize' }).click();
  await page.locator('#auth-bearer-value').fill(demo.keys[0]!.secret);
  await page.getByRole('button', { name: 'Apply credentials' }).first().click();
  await page.getByRole('button', { name: 'Close' }).first().click();
  await page.locator('#operations-Attitude-convertAttitudes').getByRole('button').first().click();
  await page.locator('#operations-Attitude-convertAttitudes').getByRole('button', { name: 'Execute' }).click();
  await page.locator('#operations-Attitude-convertAttitudes .live-responses-table .response-col_status').getByText('200').waitFor();
  expectQuiet();
});
