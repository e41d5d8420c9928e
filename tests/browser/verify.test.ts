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

it('a run of rates is read with its own units, and says in which form each side was given', async () => {
  const answer = await fetch(`${demo.url}/api/v1/verify-rates`, {
    method: 'POST', headers: { Authorization: `Bearer ${demo.keys[0]!.secret}`, 'Content-Type': 'application/json' },
    body: JSON.stringify({
      attitude: { convention: { preset: 'aircraft-euler-deg' }, attitudes: [[0, 0, 0]] },
      expected: { rate: { rate: 'euler', unit: 'deg/s' }, rates: [[9, 0, 0]] }, actual: { rate: { rate: 'body', unit: 'deg/s' }, rates: [[0, 0, 9.5]] }, tolerance: { rate: 0.1, unit: 'deg/s' }, label: 'Rate gyros',
    }),
  });
  expect(answer.status).toBe(200);
  const { page, expectQuiet } = await openPage(browser);
  await signIn(page, 'reviewer');
  await page.goto(`${demo.url}/runs`);
  await page.getByRole('link', { name: 'Rate gyros' }).click();
  await page.getByText('1 of 1 rates off by more than the tolerance of 0.1°/s').waitFor();
  await page.getByText('Worst at sample 0: 0.5 deg/s about the down axis').waitFor();
  await page.getByText('Rates of Euler angles, deg/s').waitFor();
  await page.getByText('Angular velocity in body axes, deg/s').waitFor();
  expectQuiet();
});
