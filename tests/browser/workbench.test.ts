import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { demo, launch, openPage, signIn } from '#tests/support/browser.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await launch();
});
afterAll(() => browser.close());

it('converts as the service does, keeps its state in the address, and its curl runs as shown', async () => {
  const { page, expectQuiet } = await openPage(browser);
  await signIn(page, 'engineer');
  await page.goto(`${demo.url}/workbench?from=aircraft-euler-rpy-deg&to=aircraft-dcm&n=12&n=-34&n=56`);
  await page.getByRole('region', { name: 'Result' }).waitFor();
  const shown = await page.getByRole('region', { name: 'Result' }).locator('dd').allTextContents();

  const curl = (await page.locator('figure', { hasText: 'curl' }).locator('pre').textContent())!;
  const { execFileSync } = await import('node:child_process');
  const secret = demo.keys.find(({ role }) => role === 'engineer')!.secret;
  const answer = JSON.parse(execFileSync('bash', ['-c', curl], { encoding: 'utf8', env: { ...process.env, DEXTRAL_KEY: secret } })) as { attitudes: number[][] };
  expect(shown.map(Number)).toEqual(answer.attitudes[0]);

  await page.getByRole('button', { name: 'Compute it again by other code' }).click();
  await page.getByText('The service and this browser agree to the last bit').waitFor();

  await page.getByLabel('pitch').fill('89.6');
  await page.getByText('near-gimbal-lock').waitFor({ state: 'detached' });
  await page.getByRole('group', { name: 'To' }).getByLabel('Stated by').selectOption('aircraft-euler-deg');
  await page.getByText('near-gimbal-lock').waitFor();
  await expect.poll(() => page.getByRole('region', { name: 'Result' }).textContent()).toMatch(/0\.400° left to gimbal lock/);
  await page.reload();
  await expect.poll(() => page.getByLabel('pitch').first().inputValue()).toBe('89.6');
  await page.getByText('near-gimbal-lock').waitFor();
  expectQuiet();
});

it('spreads pasted numbers, states a convention facet by facet, and refuses what is no rotation', async () => {
  const { page, expectQuiet } = await openPage(browser);
  await signIn(page, 'engineer');
  await page.goto(`${demo.url}/workbench?from=aircraft-quaternion&to=aircraft-euler-deg&n=1&n=0&n=0&n=0`);
  await page.getByLabel('w', { exact: true }).focus();
  await page.evaluate(() => {
    const data = new DataTransfer();
    data.setData('text', '[0.5, 0.5, 0.5, 0.5]');
    document.activeElement!.dispatchEvent(new ClipboardEvent('paste', { clipboardData: data, bubbles: true, cancelable: true }));
  });
  await expect.poll(() => page.getByLabel('z', { exact: true }).inputValue()).toBe('0.5');

  const from = page.getByRole('group', { name: 'From' });
  await from.getByLabel('Stated by').selectOption('');
  await from.getByLabel('scalar', { exact: true }).selectOption('last');
  await expect.poll(() => new URL(page.url()).searchParams.get('from')).toContain('"scalar":"last"');
  await page.getByLabel('w', { exact: true }).fill('3');
  await expect.poll(() => page.getByRole('alert').textContent()).toContain('off 1 by');
  await page.getByLabel('w', { exact: true }).fill('0,5');
  await page.getByText('a number, such as -12.5').waitFor();
  expectQuiet();
});
