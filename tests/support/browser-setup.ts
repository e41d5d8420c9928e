import type { TestProject } from 'vitest/node';
import { startDemo } from './start-demo.mjs';

declare module 'vitest' {
  interface ProvidedContext {
    demo: { url: string; accounts: { email: string; password: string; role: string }[]; keys: { role: string; secret: string }[] };
  }
}

/** One built demo for all browser tests; the tests start from what it seeds. */
export default async function setup(project: TestProject) {
  const demo = await startDemo();
  project.provide('demo', { url: demo.url, accounts: demo.accounts, keys: demo.keys });
  return () => demo.stop();
}
