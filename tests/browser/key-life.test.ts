import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { demo, launch, openPage, signIn } from '#tests/support/browser.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await launch();
});
afterAll(() => browser.close());

const call = (secret: string) => fetch(`${demo.url}/api/v1/convert`, {
  method: 'POST', headers: { Authorization: `Bearer ${secret}`, 'Content-Type': 'application/json' },
  body: JSON.stringify({ from: { preset: 'aircraft-euler-deg' }, to: { preset: 'aircraft-quaternion' }, attitudes: [[30, 10, 20]] }),
});

it('an administrator issues a key, calls with it, finds the call, revokes it, and the next call is refused', async () => {
  const { page, expectQuiet } = await openPage(browser);
  await signIn(page, 'administrator');

  await page.getByRole('link', { name: 'Keys', exact: false }).first().click();
  await page.getByRole('button', { name: 'Issue a key' }).click();
  await page.getByLabel('Name').fill('Release pipeline');
  await page.getByLabel('Role').selectOption('integrator');
  await page.getByRole('button', { name: 'Issue key' }).click();
  await page.getByRole('heading', { name: 'Key issued: Release pipeline' }).waitFor();
  const secret = (await page.locator('figure', { hasText: 'Secret' }).first().locator('pre').textContent())!;
  expect(secret).toMatch(/^dxt_/);
  await page.getByRole('button', { name: 'I have copied it' }).click();
  expect(await page.content()).not.toContain(secret);

  const answered = await call(secret);
  expect(answered.status).toBe(200);
  const requestId = answered.headers.get('x-request-id')!;

  await page.getByRole('link', { name: 'History' }).first().click();
  await page.getByLabel('Key', { exact: true }).selectOption({ label: 'Release pipeline' });
  const row = page.getByRole('row', { name: new RegExp(requestId.slice(0, 8)) });
  await expect.poll(() => page.getByRole('row').count(), { timeout: 10_000 }).toBe(2);
  await row.getByRole('button', { name: `Open the record of ${requestId}` }).click();
  const record = page.getByRole('dialog', { name: 'Record of a call' });
  expect(await record.textContent()).toContain(requestId);
  expect(await record.textContent()).toContain('200 answered');
  await record.getByRole('button', { name: 'Close' }).click();

  await page.getByRole('link', { name: 'Keys' }).first().click();
  await page.getByRole('button', { name: 'Revoke Release pipeline' }).click();
  const confirm = page.getByRole('button', { name: 'Revoke key' });
  expect(await confirm.isDisabled()).toBe(true);
  await page.getByLabel('Type the name to confirm').fill('Release pipeline');
  await confirm.click();
  await page.getByRole('row', { name: /Release pipeline/ }).getByText('revoked').waitFor();

  const refused = await call(secret);
  expect([refused.status, (await refused.json()).code]).toEqual([401, 'revoked-key']);
  expectQuiet();
});

it('signing out ends the session and leads back to the page asked for', async () => {
  const { page, expectQuiet } = await openPage(browser);
  await signIn(page, 'reviewer');
  await page.getByRole('button', { name: 'Reva Lindqvist' }).click();
  await page.getByRole('button', { name: 'Sign out' }).click();
  await page.getByRole('button', { name: 'Sign in' }).waitFor();
  await page.goto(`${demo.url}/history?status=4xx`);
  await page.getByRole('button', { name: 'Sign in' }).waitFor();
  const account = demo.accounts.find(({ role }) => role === 'reviewer')!;
  await page.getByLabel('E-mail').fill(account.email);
  await page.getByLabel('Password').fill(account.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.getByRole('heading', { name: 'Request history' }).waitFor();
  expect(new URL(page.url()).search).toBe('?status=4xx');
  expectQuiet();
});

it('a wrong password is refused in plain words', async () => {
  const { page } = await openPage(browser);
  await page.goto(`${demo.url}/sign-in`);
  await page.getByLabel('E-mail').fill('nobody@sallowtern.example');
  await page.getByLabel('Password').fill('wrong');
  await page.getByRole('button', { name: 'Sign in' }).click();
  expect(await page.getByRole('alert').textContent()).toContain('E-mail address or password is wrong');
});
