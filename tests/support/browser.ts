import { chromium, type Browser, type BrowserContextOptions, type Page } from 'playwright-core';
import { expect, inject } from 'vitest';

export const demo = inject('demo');

/** Debian's Chromium, or the one that CHROMIUM_PATH names, without its calls home. */
export function launch(): Promise<Browser> {
  return chromium.launch({
    executablePath: process.env['CHROMIUM_PATH'] ?? '/usr/bin/chromium',
    args: ['--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking', '--disable-component-update', '--disable-sync'],
  });
}

export interface WatchedPage {
  readonly page: Page;
  /** Fails if the page has logged an error, thrown, met the content security policy, or asked anything of another origin. */
  expectQuiet(): void;
}

/** A page in a context of its own that remembers everything that went wrong in it. */
export async function openPage(browser: Browser, options: BrowserContextOptions = {}): Promise<WatchedPage> {
  const context = await browser.newContext({ viewport: { width: 1440, height: 900 }, ...options });
  const page = await context.newPage();
  page.setDefaultTimeout(15_000);
  const complaints: string[] = [];
  page.on('console', (message) => {
    if (message.type() === 'error' || message.type() === 'warning') complaints.push(message.text());
  });
  page.on('pageerror', (error) => complaints.push(error.message));
  page.on('request', (request) => {
    if (!request.url().startsWith(demo.url) && !request.url().startsWith('data:')) complaints.push(`left the origin: ${request.url()}`);
  });
  return { page, expectQuiet: () => expect(complaints).toEqual([]) };
}

export async function signIn(page: Page, role: string): Promise<void> {
  const account = demo.accounts.find((each) => each.role === role)!;
  await page.goto(`${demo.url}/sign-in`);
  await page.getByLabel('E-mail').fill(account.email);
  await page.getByLabel('Password').fill(account.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.getByRole('heading', { name: 'Overview' }).waitFor();
}
