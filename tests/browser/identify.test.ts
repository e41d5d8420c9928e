import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { demo, launch, openPage, signIn } from '#tests/support/browser.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await launch();
});
afterAll(() => browser.close());

/** Heading, pitch and bank in degrees; and the same as a unit lists them that puts the scalar last. */
const REFERENCE = 'time_s,yaw,pitch,roll\n0,30,10,20\n1,120,-20,40\n2,250,30,-25\n3,340,5,60\n';
const OBSERVED = '0.1449 0.1277 0.2393 0.9515\n0.3097 0.2101 0.8311 0.4113\n0.0871 0.3162 -0.7404 0.5868\n0.4985 -0.0495 -0.1717 0.8483\n';

it('an integrator learns which convention a unit follows, verifies in it, and keeps the run', async () => {
  const { page, expectQuiet } = await openPage(browser);
  await signIn(page, 'integrator');
  await page.goto(`${demo.url}/identify`);
  await page.getByText('Give both the reference and what was observed.').waitFor();
  await page.getByLabel('Reference attitudes', { exact: true }).fill(REFERENCE);
  const columns = page.getByRole('group', { name: 'Columns of reference attitudes' });
  for (const [k, value] of ['1', '2', '3'].entries()) await columns.getByRole('combobox').nth(k).selectOption(value);
  expect(await page.getByLabel('Times, in seconds').inputValue()).toBe('0');
  await page.getByLabel('Times, in seconds').selectOption('');
  await page.getByLabel('Observed attitudes', { exact: true }).fill(OBSERVED);
  await page.getByLabel('Noise (1 σ)').fill('0.01');
  await page.getByRole('button', { name: 'Identify', exact: true }).click();
  await page.getByText('One explanation fits, and nothing else does.').waitFor();
  await page.getByText('Reads scalar last, stated scalar first.', { exact: true }).waitFor();
  await page.getByText(/other statements? of the same numbers/).first().click();

  await page.getByRole('button', { name: 'Verify in this convention' }).click();
  await page.getByRole('heading', { name: 'Verify', exact: true }).waitFor();
  await page.getByRole('checkbox', { name: /take the nearest rotation/ }).check();
  await page.getByLabel('Label').fill('Mast unit, scalar last');
  await page.getByRole('button', { name: 'Verify', exact: true }).click();
  await page.getByRole('heading', { name: 'Mast unit, scalar last' }).waitFor();
  await page.getByText('all 4 attitudes within 0.1°').waitFor();
  expectQuiet();
});

it('a failed verification says why, and what to test next where the data do not tell', async () => {
  const { page, expectQuiet } = await openPage(browser);
  await signIn(page, 'engineer');
  await page.goto(`${demo.url}/verify`);
  await page.getByLabel('Expected attitudes', { exact: true }).fill('30,0,0\n30,0,0\n');
  await page.getByRole('group', { name: 'Actual' }).getByLabel('Stated by').selectOption('aircraft-euler-deg');
  await page.getByLabel('Actual attitudes', { exact: true }).fill('60,0,0\n60,0,0\n');
  await page.getByLabel('Label').fill('Level bench');
  await page.getByRole('button', { name: 'Verify', exact: true }).click();
  await page.getByRole('heading', { name: 'Why' }).waitFor();
  await page.getByText(/explanations fit the data alike/).waitFor();
  await page.getByText('Only one attitude is in the data').waitFor();
  await page.getByRole('heading', { name: 'Test next' }).waitFor();
  expectQuiet();
});
