import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import path from 'node:path';
import { installPackages, root, run } from '../server/scripts/install.mjs';

/**
 * The one test command: installs what is missing, then types, lint, contract, unit, API, browser and example
 * checks, and closes with one plain count. Every step runs even where an earlier one failed.
 */
installPackages();
const chromium = findChromium();

const steps = [
  ['types', 'npm', ['run', '--silent', 'types']],
  ['lint', 'npm', ['run', '--silent', 'lint']],
  ['contract', 'npm', ['run', '--silent', 'contract:check']],
  ['unit', ...vitest('unit')],
  ['API', ...vitest('api')],
  ['build', 'npm', ['run', '--silent', 'build']],
  ['browser', ...vitest('browser')],
  ['examples', process.execPath, ['tests/examples/run-examples.mjs']],
];

let passed = 0;
let failed = 0;
const failures = [];
for (const [name, command, args] of steps) {
  console.log(`\n── ${name} ──`);
  const started = Date.now();
  const result = spawnSync(command, args, { cwd: root, encoding: 'utf8', stdio: ['ignore', 'pipe', 'inherit'], maxBuffer: 1 << 28, env: { ...process.env, CHROMIUM_PATH: chromium } });
  process.stdout.write(result.stdout ?? '');
  const counted = countOf(result.stdout ?? '');
  // A step without a count of its own is one check: it held or it did not.
  if (counted === null) {
    if (result.status === 0) passed++;
    else failed++;
  } else {
    passed += counted.passed;
    failed += counted.failed;
    if (result.status !== 0 && counted.failed === 0) failed++;
  }
  if (result.status !== 0) failures.push(name);
  console.log(`── ${name}: ${result.status === 0 ? 'ok' : 'FAILED'} in ${((Date.now() - started) / 1000).toFixed(0)} s`);
}
if (failures.length > 0) console.log(`\nFailed: ${failures.join(', ')}`);
console.log(`\n${passed} passed, ${failed} failed`);
process.exit(failed > 0 ? 1 : 0);

function vitest(project) {
  return [process.execPath, ['node_modules/vitest/vitest.mjs', 'run', '--project', project, '--no-color']];
}

/** Counts from vitest's closing lines, or from a plain "N passed, N failed". */
function countOf(output) {
  const summary = /^\s*Tests\s+(.+)$/m.exec(output)?.[1] ?? /^(\d+ passed, \d+ failed)$/m.exec(output)?.[1];
  if (summary === undefined) return null;
  const number = (word) => Number(new RegExp(`(\\d+) ${word}`).exec(summary)?.[1] ?? 0);
  return { passed: number('passed'), failed: number('failed') };
}

/** Debian's Chromium, installed if it is missing; elsewhere the one that CHROMIUM_PATH names. */
function findChromium() {
  const named = process.env.CHROMIUM_PATH;
  if (named) {
    if (existsSync(named)) return named;
    return giveUp(`CHROMIUM_PATH names ${named}, which does not exist.`);
  }
  const debian = '/usr/bin/chromium';
  if (existsSync(debian)) return debian;
  if (!existsSync('/usr/bin/apt-get') || process.getuid?.() !== 0) {
    return giveUp('The browser tests need Chromium: install it and set CHROMIUM_PATH to its program (on Debian: apt-get install chromium).');
  }
  console.log('Installing Chromium …');
  run('apt-get', ['-qq', 'update']);
  run('apt-get', ['-qq', 'install', '-y', '--no-install-recommends', 'chromium', 'curl'], { DEBIAN_FRONTEND: 'noninteractive' });
  return existsSync(debian) ? debian : giveUp(`apt-get installed chromium but ${path.basename(debian)} is not at ${debian}.`);
}

function giveUp(message) {
  console.error(message);
  console.log('\n0 passed, 1 failed');
  process.exit(1);
}
