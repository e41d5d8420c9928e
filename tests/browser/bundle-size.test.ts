import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { gzipSync } from 'node:zlib';
import { expect, it } from 'vitest';

const ROOT = path.resolve(import.meta.dirname, '../../dist/web');
const FIRST_LOAD = 180_000;
const EACH_PAGE = 90_000;

const files = readdirSync(path.join(ROOT, 'assets')).filter((file) => file.endsWith('.js'));
const source = (file: string): string => readFileSync(path.join(ROOT, 'assets', file), 'utf8');

/** A script and everything it imports before it can run; what it loads later does not count. */
function withImports(file: string, seen = new Set<string>()): Set<string> {
  if (seen.has(file)) return seen;
  seen.add(file);
  for (const [, imported] of source(file).matchAll(/(?:from|import)\s*["']\.\/([^"']+\.js)["']/g)) withImports(imported!, seen);
  return seen;
}

/** The built script of a page's module, by its name and a hash of eight characters; a feature's module may share the name, but exports no Component. */
function pageScript(name: string): string {
  const found = files.filter((file) => new RegExp(`^${name}-[\\w-]{8}\\.js$`).test(file) && /\bas Component\b/.test(source(file)));
  expect(found, `scripts named ${name}`).toHaveLength(1);
  return found[0]!;
}

const compressed = (scripts: Iterable<string>): number => [...scripts].reduce((sum, file) => sum + gzipSync(source(file), { level: 9 }).length, 0);

const entry = /src="\/assets\/([^"]+\.js)"/.exec(readFileSync(path.join(ROOT, 'index.html'), 'utf8'))![1]!;
const firstLoad = new Set([entry, 'sign-in', 'overview'].flatMap((name) => [...withImports(name === entry ? entry : pageScript(name))]));

it('loads sign-in and overview from at most 180 kB of compressed scripts', () => {
  expect(firstLoad.size).toBeGreaterThan(3);
  expect(compressed(firstLoad)).toBeLessThanOrEqual(FIRST_LOAD);
});

it.each(['workbench', 'verify', 'runs', 'run', 'conventions', 'convention', 'keys', 'history', 'usage', 'first-call', 'problem', 'not-found'])('loads at most 90 kB more for the page %s', (page) => {
  expect(compressed([...withImports(pageScript(page))].filter((file) => !firstLoad.has(file)))).toBeLessThanOrEqual(EACH_PAGE);
});
