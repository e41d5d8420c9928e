import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { demo, launch, openPage, signIn } from '#tests/support/browser.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await launch();
});
afterAll(() => browser.close());

it('an administrator has bodies kept; a call made then can be opened in the workbench as it was sent', async () => {
  const { page, expectQuiet } = await openPage(browser);
  await signIn(page, 'administrator');
  await page.goto(`${demo.url}/history`);
  await page.getByRole('button', { name: 'What is kept' }).click();
  const dialog = page.getByRole('dialog', { name: 'What the history keeps' });
  await dialog.getByLabel('Forget calls after days').fill('0');
  await dialog.getByRole('button', { name: 'Keep so' }).click();
  await dialog.getByText('A whole number from 1 to 3650, or nothing.').waitFor();
  await dialog.getByLabel('Forget calls after days').fill('400');
  await dialog.getByRole('checkbox').check();
  await dialog.getByRole('button', { name: 'Keep so' }).click();
  await dialog.waitFor({ state: 'detached' });

  const { status, headers } = await fetch(`${demo.url}/api/v1/convert`, {
    method: 'POST', headers: { Authorization: `Bearer ${demo.keys[0]!.secret}`, 'Content-Type': 'application/json' },
    body: JSON.stringify({ from: { preset: 'aircraft-euler-deg' }, to: { preset: 'aircraft-dcm' }, attitudes: [[12, 34, 56]] }),
  });
  expect(status).toBe(200);
  await page.goto(`${demo.url}/history?id=${headers.get('x-request-id')}`);
  await page.getByRole('row').nth(1).getByRole('button').first().click();
  await page.getByRole('dialog').getByRole('link', { name: /workbench/i }).click();
  await page.getByRole('heading', { name: 'Workbench' }).waitFor();
  expect(new URL(page.url()).searchParams.getAll('n')).toEqual(['12', '34', '56']);
  expectQuiet();
});
