/**
 * What batches cost, end to end on the loopback against the built service in a process of its own: memory and throughput
 * of a long stream of doubles and of CSV, 100,000 quaternions as doubles and as JSON, and how soon /health answers meanwhile.
 *
 *   npm run build:server && npm run bench:batches                 ten million attitudes each way, a minute or two
 *   npm run build:server && npm run bench:batches -- 1000000      fewer
 */
import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { readFileSync } from 'node:fs';
import http from 'node:http';
import { startDemo } from '#tests/support/start-demo.mjs';

const attitudes = Number(process.argv[2] ?? 10_000_000);
const BATCH = 100_000;
const demo = await startDemo();
// The demo's own process has just flown its scenario; what is measured is the service as it starts in production, on the same data.
const url = new URL(`http://127.0.0.1:${Number(new URL(demo.url).port) + 1}`);
const { hostname, port } = url;
const service = spawn(process.execPath, ['dist/server/main.js'], {
  env: { ...process.env, PORT: port, DEXTRAL_DATA_DIR: demo.dataDirectory, DEXTRAL_SESSION_SECRET: 'for this measurement only, thirty-two', DEXTRAL_LOG_LEVEL: 'warn', DEXTRAL_PUBLIC_URL: url.origin }, stdio: 'ignore',
});
while (!(await fetch(`${url.origin}/api/v1/health`).then(({ ok }) => ok, () => false))) await new Promise((resolve) => { setTimeout(resolve, 100); });
const secret = demo.keys.find(({ role }) => role === 'integrator')!.secret;
const agent = new http.Agent({ keepAlive: true });
const PATH = '/api/v1/convert?from=aircraft-quaternion&to=aircraft-euler-deg';

try {
  await raiseLimits();
  console.log(`service at rest: ${memory('VmRSS')} MB`);
  const block = quaternions(50_000);
  await stream('application/octet-stream', Buffer.from(block.buffer));
  await stream('text/csv', Buffer.from(rowsOf(block).map((row) => `${row.join(',')}\n`).join('')));
  await binaryBatch();
  await jsonBatch();
} finally {
  agent.destroy();
  service.kill('SIGTERM');
  await once(service, 'exit');
  await demo.stop();
}

/** Random unit quaternions of full precision, from a generator of its own (Park & Miller, minimal standard). */
function quaternions(count: number): Float64Array {
  const numbers = new Float64Array(count * 4);
  let state = 20261201;
  const random = () => (state = (state * 48271) % 2147483647) / 2147483647 - 0.5;
  for (let i = 0; i < numbers.length; i += 4) {
    const q = [random(), random(), random(), random()];
    const norm = Math.hypot(...q);
    for (let k = 0; k < 4; k++) numbers[i + k] = q[k]! / norm;
  }
  return numbers;
}

function rowsOf(numbers: Float64Array): number[][] {
  return Array.from({ length: numbers.length / 4 }, (_, i) => Array.from(numbers.subarray(i * 4, i * 4 + 4)));
}

/** Of the service's process, worker threads included; VmHWM is the peak since it began. */
function memory(field: 'VmRSS' | 'VmHWM'): number {
  return Math.round(Number(new RegExp(`${field}:\\s+(\\d+)`).exec(readFileSync(`/proc/${service.pid!}/status`, 'utf8'))![1]) / 1024);
}

function post(path: string, headers: http.OutgoingHttpHeaders): http.ClientRequest {
  return http.request({ agent, hostname, port, path, method: 'POST', headers: { Authorization: `Bearer ${secret}`, ...headers } });
}

/** Sends the same block again and again, and reads while it sends. */
async function stream(type: string, block: Buffer): Promise<void> {
  const blocks = Math.ceil(attitudes / 50_000);
  const request = post(PATH, { 'Content-Type': type });
  const health = watchHealth();
  const started = performance.now();
  void (async () => {
    for (let i = 0; i < blocks; i++) if (!request.write(block)) await once(request, 'drain');
    request.end();
  })();
  const [response] = await once(request, 'response') as [http.IncomingMessage];
  let received = 0;
  let most = 0;
  for await (const chunk of response) {
    received += (chunk as Buffer).length;
    most = Math.max(most, memory('VmRSS'));
  }
  const seconds = (performance.now() - started) / 1000;
  const problem = response.trailers['dextral-problem'];
  if (response.statusCode !== 200 || problem) throw new Error(`${type}: ${response.statusCode} ${problem ?? ''}`);
  const count = blocks * 50_000;
  console.log(`${type}: ${count} attitudes in ${seconds.toFixed(1)} s, ${Math.round(count / seconds / 1000)} thousand a second, ${((block.length * blocks + received) / seconds / 2 ** 20).toFixed(0)} MiB/s in and out; service at most ${most} MB (peak ${memory('VmHWM')}); /health at most ${(await health.stop()).toFixed(0)} ms`);
}

async function binaryBatch(): Promise<void> {
  const body = Buffer.from(quaternions(BATCH).buffer);
  const times = [];
  for (let i = 0; i < 25; i++) times.push(await timed('application/octet-stream', '/api/v1/convert?from=aircraft-quaternion&to=aircraft-dcm', body));
  console.log(`${BATCH} quaternions to matrices as doubles: ${summary(times)}`);
  const same = [];
  for (let i = 0; i < 25; i++) same.push(await timed('application/octet-stream', `/api/v1/convert?from=aircraft-quaternion&to=${encodeURIComponent(JSON.stringify({ representation: 'quaternion', reference: 'ENU', body: 'FLU', scalar: 'last', product: 'hamilton', maps: 'body-to-reference', sign: 'any' }))}`, body));
  console.log(`${BATCH} quaternions to quaternions in other axes as doubles: ${summary(same)}`);
}

async function jsonBatch(): Promise<void> {
  const document = { from: { preset: 'aircraft-quaternion' }, to: { representation: 'quaternion', reference: 'ENU', body: 'FLU', scalar: 'last', product: 'hamilton', maps: 'body-to-reference', sign: 'any' }, attitudes: rowsOf(quaternions(BATCH)) };
  const text = JSON.stringify(document);
  const bare = [];
  for (let i = 0; i < 10; i++) {
    const started = performance.now();
    JSON.stringify(JSON.parse(text));
    bare.push(performance.now() - started);
  }
  const health = watchHealth();
  const times = [];
  for (let i = 0; i < 15; i++) times.push(await timed('application/json', '/api/v1/convert', Buffer.from(text)));
  console.log(`${BATCH} quaternions as JSON: ${summary(times)}; JSON.parse and JSON.stringify of the same alone: ${summary(bare)}; /health meanwhile at most ${(await health.stop()).toFixed(0)} ms`);
}

async function timed(type: string, path: string, body: Buffer): Promise<number> {
  const started = performance.now();
  const request = post(path, { 'Content-Type': type, 'Content-Length': body.length });
  request.end(body);
  const [response] = await once(request, 'response') as [http.IncomingMessage];
  let received = 0;
  for await (const chunk of response) received += (chunk as Buffer).length;
  if (response.statusCode !== 200 || received < body.length / 2) throw new Error(`${type}: ${response.statusCode}, ${received} bytes`);
  return performance.now() - started;
}

/** Asks /health every 20 ms; tells the longest wait. */
function watchHealth(): { stop(): Promise<number> } {
  let longest = 0;
  let going = true;
  const watching = (async () => {
    while (going) {
      const started = performance.now();
      await fetch(`${url.origin}/api/v1/health`).then((response) => response.arrayBuffer());
      longest = Math.max(longest, performance.now() - started);
      await new Promise((resolve) => { setTimeout(resolve, 20); });
    }
  })();
  return { stop: async () => { going = false; await watching; return longest; } };
}

async function raiseLimits(): Promise<void> {
  const { email, password } = demo.accounts.find(({ role }) => role === 'administrator')!;
  const headers = { 'Content-Type': 'application/json', 'Origin': url.origin };
  const session = await fetch(`${url.origin}/api/v1/sessions`, { method: 'POST', headers, body: JSON.stringify({ email, password }) });
  const cookie = session.headers.get('Set-Cookie')!.split(';')[0]!;
  const changed = await fetch(`${url.origin}/api/v1/limits/integrator`, { method: 'PUT', headers: { ...headers, Cookie: cookie }, body: JSON.stringify({ requestsPerMinute: 100_000, attitudesPerMonth: 1_000_000_000, attitudesPerCall: BATCH, parallelRequests: 32 }) });
  if (!changed.ok) throw new Error(`The limits could not be raised: ${changed.status} ${await changed.text()}`);
}

function summary(times: readonly number[]): string {
  const sorted = [...times].sort((a, b) => a - b);
  return `median ${sorted[Math.floor(sorted.length / 2)]!.toFixed(1)} ms, least ${sorted[0]!.toFixed(1)} ms, most ${sorted.at(-1)!.toFixed(1)} ms`;
}
