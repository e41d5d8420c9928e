import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { launch } from '#tests/support/browser.ts';
import { DIGESTED } from '#tests/support/digest.ts';
import { digestBundle } from '#tests/support/digest-bundle.ts';
import pinned from '#tests/support/digests.json' with { type: 'json' };

let browser: Browser;
beforeAll(async () => {
  browser = await launch();
});
afterAll(() => browser.close());

it('answers the same bits in the browser as in Node', async () => {
  const page = await browser.newPage();
  await page.addScriptTag({ content: await digestBundle() });
  const answered = await page.evaluate((count) => (globalThis as unknown as { core: { digests(count: number): Record<string, string> } }).core.digests(count), DIGESTED);
  expect(answered).toEqual(pinned);
}, 120_000);
