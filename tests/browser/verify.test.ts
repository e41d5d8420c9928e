import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { demo, launch, openPage, signIn } from '#tests/support/browser.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await launch();
});
afterAll(() => browser.close());

it('an integrator verifies a pasted recording, reads the verdict, and a reviewer reads the run later', async () => {
  const { page, expectQuiet } = await openPage(browser);
  await signIn(page, 'integrator');
  await page.goto(`${demo.url}/verify`);
  await page.getByLabel('Expected attitudes', { exact: true }).fill('yaw,pitch,roll\n30,10,20\n80,-5,0\n');
  await page.getByLabel('Actual attitudes', { exact: true }).fill('1,2,3\n');
  await page.getByText('Each line has 3 numbers; the convention takes 4.').waitFor();
  await page.getByRole('group', { name: 'Actual' }).getByLabel('Stated by').selectOption('ros-roll-pitch-yaw');
  await page.getByLabel('Actual attitudes', { exact: true }).fill('0.3490658503988659, -0.17453292519943295, 1.0471975511965979\n0 0.05235987755982989 0.17453292519943295');
  await page.getByLabel('Label').fill('Gimbal import');
  await page.getByRole('button', { name: 'Verify', exact: true }).click();
  await page.getByRole('heading', { name: 'Gimbal import' }).waitFor();
  await page.getByText('1 of 2 attitudes off by more than the tolerance of 0.1°').waitFor();
  await page.getByText('2 deg about the right axis: the actual attitude is pitched up from the expected one.').waitFor();
  const address = page.url();
  expectQuiet();

  const reviewer = await openPage(browser);
  await signIn(reviewer.page, 'reviewer');
  await reviewer.page.goto(`${demo.url}/runs?verdict=fail`);
  await reviewer.page.getByRole('link', { name: 'Gimbal import' }).click();
  await reviewer.page.getByRole('heading', { name: 'Gimbal import' }).waitFor();
  expect(reviewer.page.url()).toBe(address);
  const download = reviewer.page.waitForEvent('download');
  await reviewer.page.getByRole('link', { name: 'JUnit XML' }).click();
  expect((await download).suggestedFilename()).toMatch(/^run-.*\.junit\.xml$/);
  reviewer.expectQuiet();
});
