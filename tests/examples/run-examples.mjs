import { spawn } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import http from 'node:http';
import os from 'node:os';
import path from 'node:path';
import { startDemo } from '../support/start-demo.mjs';
import { root } from '../../server/scripts/install.mjs';

/** Runs the examples as their README says, against a demo of its own, and checks what they wrote. */
const folder = mkdtempSync(path.join(os.tmpdir(), 'dextral-examples-'));
const at = (name) => path.join(folder, name);
let passed = 0;
let failed = 0;

let demo;
try {
  demo = await startDemo();
  await convertTheRecording();
  await convertAUnit();
  await refuse();
  await diagnose();
  await waitWhenAsked();
} catch (error) {
  check('the examples run', false, error.stack);
} finally {
  await demo?.stop();
  rmSync(folder, { recursive: true, force: true });
}
console.log(`${passed} passed, ${failed} failed`);
process.exit(failed > 0 ? 1 : 0);

async function convertTheRecording() {
  const recording = await run('npm', ['run', '--silent', 'recording', '--', at('flight.csv')]);
  check('the recording is written', recording.status === 0, recording.stderr);
  const { names, rows } = read('flight.csv');
  check('it lasts at least ten minutes at 50 Hz', rows.length >= 30_000 && rows.every((row, i) => Number(row[0]) === i / 50), rows.length);

  const shell = await run('bash', ['examples/convert-recording.sh', at('flight.csv'), at('by-curl.csv')]);
  check('the shell script converts it', shell.status === 0 && shell.stdout.startsWith(`${rows.length} attitudes converted`), shell.stdout + shell.stderr);
  const node = await run(process.execPath, ['examples/convert-recording.mjs', at('flight.csv'), at('by-node.csv')]);
  check('the Node script converts it', node.status === 0 && node.stdout.startsWith(`${rows.length} attitudes converted`), node.stdout + node.stderr);

  const [byCurl, byNode] = [read('by-curl.csv'), read('by-node.csv')];
  check('both wrote every row, with its time', [byCurl, byNode].every((made) => made.rows.length === rows.length && made.rows.every((row, i) => row.length === 4 && row[0] === rows[i][0])), byCurl.rows.length);
  check('both wrote the same numbers', byCurl.rows.every((row, i) => row.every((cell, k) => Object.is(Number(cell), Number(byNode.rows[i][k])))), '');

  const stream = await run('bash', ['examples/convert-stream.sh', at('flight.csv'), at('by-stream.csv')]);
  const streamed = stream.status === 0 ? read('by-stream.csv') : { names: [], rows: [] };
  check('the streaming script converts it in one call', stream.stdout.startsWith(`${rows.length} attitudes converted`), stream.stdout + stream.stderr);
  check('it wrote every row with the angles recorded, bit for bit', streamed.rows.length === rows.length && streamed.rows.every((row, i) => row[0] === rows[i][0] && ['yaw_deg', 'pitch_deg', 'roll_deg'].every((name, k) => Number(row[k + 1]) === Number(rows[i][names.indexOf(name)]))), streamed.rows.length);

  // The recorded angles were computed by the shared core in this process's own engine: the service must agree to the last bit,
  // heading counted from 0 to 360.
  const column = (name) => names.indexOf(name);
  const [yaw, pitch, roll] = ['yaw_deg', 'pitch_deg', 'roll_deg'].map(column);
  check('pitch and roll are those of the shared core, bit for bit', rows.every((row, i) => Number(row[pitch]) === Number(byNode.rows[i][2]) && Number(row[roll]) === Number(byNode.rows[i][3])), '');
  check('heading is that of the shared core, counted from 0 to 360', rows.every((row, i) => {
    const heading = Number(byNode.rows[i][1]);
    return heading >= 0 && heading < 360 && Math.abs(heading - ((Number(row[yaw]) + 360) % 360)) < 1e-12;
  }), '');
  // Against the formulas that define the angles, with the engine's own functions (Stevens, Lewis & Johnson, Aircraft
  // Control and Simulation, sect. 1.4, from memory).
  const apart = rows.map((row, i) => {
    const [w, x, y, z] = ['q_w', 'q_x', 'q_y', 'q_z'].map((name) => Number(row[column(name)]));
    const [heading, up, bank] = byNode.rows[i].slice(1).map((cell) => (Number(cell) * Math.PI) / 180);
    const nose = [Math.cos(up) * Math.cos(heading), Math.cos(up) * Math.sin(heading), Math.sin(up)];
    const meant = [w * w + x * x - y * y - z * z, 2 * (x * y + w * z), 2 * (w * y - x * z)];
    return Math.max(...nose.map((value, k) => Math.abs(value - meant[k])), Math.abs(Math.cos(up) * Math.sin(bank) - 2 * (y * z + w * x)));
  });
  check('nose and right wing point where the quaternions say', Math.max(...apart) < 2e-15, Math.max(...apart));

  // The nearest pass from the recorded quaternions themselves: margin = asin of the nose's horizontal part.
  const margins = rows.map((row) => {
    const [w, x, y, z] = ['q_w', 'q_x', 'q_y', 'q_z'].map((name) => Number(row[column(name)]));
    return (Math.asin(Math.min(1, Math.hypot(w * w + x * x - y * y - z * z, 2 * (x * y + w * z)))) * 180) / Math.PI;
  });
  const least = Math.min(...margins);
  const near = margins.filter((margin) => margin < 1).length;
  const said = `Nearest to gimbal lock at ${rows[margins.indexOf(least)][0]} s, ${least.toFixed(4)}° from it`;
  check('the Node script tells of every attitude near gimbal lock, and of the nearest', node.stdout.includes(`Warning near-gimbal-lock: ${near} attitudes.`) && node.stdout.includes(said), `${node.stdout}; meant ${near}, ${said}`);
}

/** Each slip is named, alone, by what a person would change. */
async function diagnose() {
  const { status, stdout, stderr } = await run(process.execPath, ['examples/diagnose-a-converter.mjs']);
  const lines = stdout.split('\n').filter((line) => line.startsWith('  '));
  const named = [/^ {2}it: reads scalar last, stated scalar first$/, /^ {2}it: reads (reference-to-body, stated body-to-reference|Shuster's product, stated Hamilton's)$/, /^ {2}it: reads body axes FLU, stated FRD$/, /^ {2}it: the north reference is off by -?5° about down$/, /^ {2}it: comes (39\.\d|40\.\d) ms late$/];
  check('the five slips are diagnosed', status === 0 && lines.length === named.length && named.every((pattern, i) => pattern.test(lines[i])), stdout + stderr);
}

/** A unit's own recording, converted back by the service with nothing but the unit's convention, is the flight again. */
async function convertAUnit() {
  const recording = await run('npm', ['run', '--silent', 'recording', '--', at('gimbal.csv'), 'camera-gimbal']);
  const { names, rows } = read('gimbal.csv');
  const flight = read('flight.csv').rows;
  check('a unit’s recording has its own columns, as many rows as the flight', recording.status === 0 && names.join() === 'time_s,q_x,q_y,q_z,q_w' && rows.length === flight.length, recording.stderr);
  const from = { representation: 'quaternion', reference: 'ENU', body: 'FLU', scalar: 'last', product: 'hamilton', maps: 'body-to-reference', sign: 'any' };
  const response = await fetch(`${demo.url}/api/v1/convert`, {
    method: 'POST', headers: { Authorization: `Bearer ${demo.keys[0].secret}`, 'Content-Type': 'application/json' },
    body: JSON.stringify({ from, to: { preset: 'aircraft-quaternion' }, attitudes: rows.slice(20_000, 30_000).map((row) => row.slice(1).map(Number)) }),
  });
  const { attitudes } = await response.json();
  const apart = attitudes.map((back, i) => {
    const q = flight[20_000 + i].slice(1, 5).map(Number);
    const sign = Math.sign(back.reduce((sum, value, k) => sum + value * q[k], 0));
    return Math.max(...back.map((value, k) => Math.abs(sign * value - q[k])));
  });
  check('its numbers, converted from its convention, are the flight’s to a 32-bit float', apart.length === 10_000 && Math.max(...apart) < 1.2e-7, Math.max(...apart));
}

async function refuse() {
  const lines = readFileSync(at('flight.csv'), 'utf8').split('\n').slice(0, 11);
  const spoilt = lines.map((line, i) => (i === 4 ? line.replace(/^([^,]*),[^,]*/, '$1,0.9') : line)).join('\n');
  writeFileSync(at('spoilt.csv'), `${spoilt}\n`);
  writeFileSync(at('unnamed.csv'), 'a,b,c\n1,2,3\n');
  for (const [name, command, script] of [['shell', 'bash', 'examples/convert-recording.sh'], ['Node', process.execPath, 'examples/convert-recording.mjs']]) {
    const wrongKey = await run(command, [script, at('flight.csv'), at('none.csv')], { DEXTRAL_URL: demo.url, DEXTRAL_KEY: 'wrong' });
    check(`the ${name} script stops at a wrong key and shows the problem`, wrongKey.status === 1 && wrongKey.stderr.includes('answered 401') && wrongKey.stderr.includes('invalid-key'), wrongKey.stderr);
    const bad = await run(command, [script, at('spoilt.csv'), at('none.csv')]);
    check(`the ${name} script shows which attitude is no rotation`, bad.status === 1 && bad.stderr.includes('not-a-rotation') && bad.stderr.includes('/attitudes/3'), bad.stderr);
    const unnamed = await run(command, [script, at('unnamed.csv'), at('none.csv')]);
    check(`the ${name} script wants the columns it names`, unnamed.status !== 0 && unnamed.stderr.includes('time_s'), unnamed.stderr);
    const nobody = await run(command, [script, at('spoilt.csv'), at('none.csv')], { DEXTRAL_URL: 'http://127.0.0.1:9', DEXTRAL_KEY: 'any' });
    check(`the ${name} script says that nobody answers`, nobody.status !== 0 && nobody.stderr.includes('127.0.0.1'), nobody.stderr);
  }
  check('a refused conversion leaves no file behind', !existsSync(at('none.csv')), '');
}

/** A stand-in that turns the first call away, as a service under load does. */
async function waitWhenAsked() {
  let calls = 0;
  const server = http.createServer((request, response) => {
    request.resume().on('end', () => {
      calls++;
      if (calls === 1) response.writeHead(429, { 'Retry-After': '1', 'Content-Type': 'application/problem+json' }).end('{"status":429}');
      else response.writeHead(200, { 'Content-Type': 'application/json' }).end(JSON.stringify({ attitudes: Array.from({ length: 10 }, () => [1, 2, 3]), warnings: [] }));
    });
  });
  await new Promise((resolve) => server.listen(0, '127.0.0.1', resolve));
  const started = Date.now();
  writeFileSync(at('ten.csv'), `${readFileSync(at('flight.csv'), 'utf8').split('\n').slice(0, 11).join('\n')}\n`);
  const node = await run(process.execPath, ['examples/convert-recording.mjs', at('ten.csv'), at('waited.csv')], { DEXTRAL_URL: `http://127.0.0.1:${server.address().port}`, DEXTRAL_KEY: 'any' });
  check('the Node script waits as long as Retry-After says and tries again', node.status === 0 && calls === 2 && Date.now() - started >= 1000 && read('waited.csv').rows.length === 10, `${calls} calls; ${node.stdout}${node.stderr}`);
  server.close();
}

/** Runs a command in the project's folder without blocking this process, whose stand-in server must answer meanwhile. */
function run(command, args, more = {}) {
  const environment = { ...process.env, DEXTRAL_DATA_DIR: demo.dataDirectory, ...more };
  if (!('DEXTRAL_URL' in more)) delete environment.DEXTRAL_URL;
  if (!('DEXTRAL_KEY' in more)) delete environment.DEXTRAL_KEY;
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { cwd: root, env: environment, stdio: ['ignore', 'pipe', 'pipe'] });
    const result = { status: null, stdout: '', stderr: '' };
    child.stdout.setEncoding('utf8').on('data', (text) => { result.stdout += text; });
    child.stderr.setEncoding('utf8').on('data', (text) => { result.stderr += text; });
    child.on('error', reject).on('close', (status) => resolve({ ...result, status }));
  });
}

function read(name) {
  const [header, ...lines] = readFileSync(at(name), 'utf8').trimEnd().split('\n');
  return { names: header.split(','), rows: lines.map((line) => line.split(',')) };
}

function check(what, held, shown) {
  if (held) passed++;
  else failed++;
  console.log(`${held ? '✓' : '✗'} ${what}${held ? '' : `: ${String(shown).slice(0, 2000)}`}`);
}
