import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { demo, launch, openPage, signIn } from '#tests/support/browser.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await launch();
});
afterAll(() => browser.close());

it('a session that ends in the middle of work costs a password and nothing else', async () => {
  const { page } = await openPage(browser);
  await signIn(page, 'integrator');
  await page.getByRole('link', { name: 'Verify', exact: false }).first().click();
  await page.getByLabel('Expected attitudes', { exact: true }).fill('30,10,20');
  await page.getByRole('group', { name: 'Actual' }).getByLabel('Stated by').selectOption('aircraft-euler-deg');
  await page.getByLabel('Actual attitudes', { exact: true }).fill('30,10,20');
  await page.getByLabel('Label').fill('After the night');

  await page.context().clearCookies();
  await page.getByRole('button', { name: 'Verify', exact: true }).click();
  const dialog = page.getByRole('dialog', { name: 'Your session has ended' });
  await dialog.waitFor();
  await page.keyboard.press('Escape');
  await page.keyboard.press('Escape');
  expect(await dialog.isVisible()).toBe(true);

  await page.getByLabel('Password').fill('wrong');
  await page.keyboard.press('Enter');
  await dialog.getByRole('alert').waitFor();
  await page.getByLabel('Password').fill(demo.accounts.find(({ role }) => role === 'integrator')!.password);
  await page.keyboard.press('Enter');
  await dialog.waitFor({ state: 'detached' });
  expect(await page.getByLabel('Expected attitudes', { exact: true }).inputValue()).toBe('30,10,20');
  await page.getByRole('button', { name: 'Verify', exact: true }).click();
  await page.getByRole('heading', { name: 'After the night' }).waitFor();
});

it('a list fetched after the end of the session is there once signed in again', async () => {
  const { page } = await openPage(browser);
  await signIn(page, 'reviewer');
  await page.context().clearCookies();
  await page.getByRole('link', { name: 'Runs', exact: false }).first().click();
  await page.getByLabel('Password').fill(demo.accounts.find(({ role }) => role === 'reviewer')!.password);
  await page.getByRole('button', { name: 'Sign in again' }).click();
  await page.getByRole('table').waitFor();
  expect(new URL(page.url()).pathname).toBe('/runs');
});
