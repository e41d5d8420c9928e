import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { startDemo } from '../support/start-demo.mjs';
import { root } from '../../server/scripts/install.mjs';

/** Runs the examples as their README says, against a demo of its own, and checks what they wrote. */
const folder = mkdtempSync(path.join(os.tmpdir(), 'dextral-examples-'));
const demo = await startDemo();
let passed = 0;
let failed = 0;

try {
  const environment = { ...process.env, DEXTRAL_DATA_DIR: demo.dataDirectory };
  delete environment.DEXTRAL_URL;
  delete environment.DEXTRAL_KEY;
  const at = (name) => path.join(folder, name);
  const run = (command, args, more = {}) => spawnSync(command, args, { cwd: root, encoding: 'utf8', env: { ...environment, ...more } });

  const recording = run('npm', ['run', '--silent', 'recording', '--', at('flight.csv')]);
  check('the recording is written', recording.status === 0, recording.stderr);
  const rows = readFileSync(at('flight.csv'), 'utf8').trimEnd().split('\n');
  check('it lasts at least ten minutes at 50 Hz', rows.length - 1 >= 30_000, rows.length);

  const shell = run('bash', ['examples/convert-recording.sh', at('flight.csv'), at('by-curl.csv')]);
  check('the shell script converts it', shell.status === 0 && shell.stdout.startsWith(`${rows.length - 1} attitudes converted`), shell.stdout + shell.stderr);
  const node = run(process.execPath, ['examples/convert-recording.mjs', at('flight.csv'), at('by-node.csv')]);
  check('the Node script converts it', node.status === 0 && node.stdout.startsWith(`${rows.length - 1} attitudes converted`), node.stdout + node.stderr);
  check('it reports the pass near gimbal lock', /\d+ near gimbal lock; nearest at 50\d\.\d\d s, 0\.\d{3}° from it/.test(node.stdout), node.stdout);

  const [byCurl, byNode] = ['by-curl.csv', 'by-node.csv'].map((name) => readFileSync(at(name), 'utf8').trimEnd().split('\n'));
  check('both wrote every row', byCurl.length === rows.length && byNode.length === rows.length, `${byCurl.length} and ${byNode.length}`);
  check('both wrote the same numbers', byCurl.every((line, i) => sameNumbers(line, byNode[i])), '');
  check('pitch agrees with its defining formula, sin(pitch) = 2(wy − xz)', rows.slice(1).every((row, i) => {
    const [, w, x, y, z] = row.split(',').map(Number);
    return Math.abs(Math.sin((Number(byNode[i + 1].split(',')[2]) * Math.PI) / 180) - 2 * (w * y - x * z)) < 1e-14;
  }), '');

  const refused = run('bash', ['examples/convert-recording.sh', at('flight.csv'), at('none.csv')], { DEXTRAL_URL: demo.url, DEXTRAL_KEY: 'wrong' });
  check('the shell script stops at a refusal and shows it', refused.status === 1 && refused.stderr.includes('invalid-key'), refused.stderr);
  // Source: Gleason & Gebre-Egziabher, GNSS Applications and Methods (Artech House 2009), ch. 7, eul2Cbn: six digits.
  const published = [0.121771, -0.991747, -0.040132, 0.968207, 0.109785, 0.22477, -0.218509, -0.066226, 0.973585];
  const command = /## A first call[\s\S]*?```sh\n([\s\S]*?)```/.exec(readFileSync(path.join(root, 'README.md'), 'utf8'))[1]
    .replaceAll('http://127.0.0.1:8787', demo.url).replaceAll('data/demo.json', path.join(demo.dataDirectory, 'demo.json'));
  const firstCall = run('bash', ['-c', command]);
  const answer = JSON.parse(firstCall.stdout);
  check("the README's first call answers the published matrix to its six digits", answer.attitudes[0].every((element, i) => Math.abs(element - published[i]) <= 0.5e-6), firstCall.stdout);
  check('and says it in a sentence', answer.readings[0] === 'nose 277.0° true, 2.3° up, right wing 13.0° down', answer.readings);
} catch (error) {
  check('the examples run', false, error);
} finally {
  await demo.stop();
  rmSync(folder, { recursive: true, force: true });
}
console.log(`${passed} passed, ${failed} failed`);
process.exit(failed > 0 ? 1 : 0);

/** Numbers may be written differently ("-0" and "0"), but must be the same doubles. */
function sameNumbers(a, b) {
  const [left, right] = [a, b].map((line) => line.split(','));
  return left.length === right.length && left.every((cell, i) => cell === right[i] || Number(cell) === Number(right[i]));
}

function check(what, held, shown) {
  if (held) passed++;
  else failed++;
  console.log(`${held ? '✓' : '✗'} ${what}${held ? '' : `: ${String(shown)}`}`);
}

