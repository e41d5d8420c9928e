import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { demo, launch, openPage, signIn } from '#tests/support/browser.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await launch();
});
afterAll(() => browser.close());

it('an administrator tightens a role, and the next call of its keys is held to that', async () => {
  const { page } = await openPage(browser);
  await signIn(page, 'administrator');
  await page.goto(`${demo.url}/usage`);
  await page.getByRole('button', { name: 'Change the limits of the role integrator' }).click();
  const call = () => fetch(`${demo.url}/api/v1/convert`, {
    method: 'POST', headers: { Authorization: `Bearer ${demo.keys.find(({ role }) => role === 'integrator')!.secret}`, 'Content-Type': 'application/json' },
    body: JSON.stringify({ from: { preset: 'aircraft-euler-deg' }, to: { preset: 'aircraft-dcm' }, attitudes: [[1, 2, 3], [4, 5, 6]] }),
  });
  expect((await call()).status).toBe(200);
  const perCall = page.getByLabel('Attitudes a call');
  await perCall.fill('none');
  await page.getByRole('button', { name: 'Change limits' }).click();
  await page.getByText('A whole number from 1 to 100000.').waitFor();
  await perCall.fill('1');
  await page.getByRole('button', { name: 'Change limits' }).click();
  await page.getByRole('dialog').waitFor({ state: 'detached' });
  const refused = await call();
  expect([refused.status, (await refused.json()).code]).toEqual([413, 'batch-too-large']);

  await page.getByRole('button', { name: 'Change the limits of the role integrator' }).click();
  await page.getByLabel('Attitudes a call').fill('10000');
  await page.getByRole('button', { name: 'Change limits' }).click();
  await page.getByRole('dialog').waitFor({ state: 'detached' });
  expect((await call()).status).toBe(200);
});
