/**
 * How long a page of a history of a million rows takes, for every filter alone, for pairs that hardly meet, and for the
 * oldest pages; each asked first on a connection that has read nothing yet. The bar is 50 ms a page.
 *
 *   npm run bench:history                 a million rows in a file of its own, about two minutes
 *   npm run bench:history -- 200000       fewer
 */
import { randomUUID } from 'node:crypto';
import { mkdtemp, rm, stat } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { connect, disconnect } from '#server/db/database.ts';
import { historyRepository } from '#server/db/repositories/history.ts';
import type { HistoryFilter, HistoryPosition } from '#server/db/repositories/search-history.ts';
import { storeRequests, type NewRequest } from '#server/db/repositories/store-requests.ts';
import { SeededRandom } from '#server/scenario/random.ts';

const rows = Number(process.argv[2] ?? 1_000_000);
const BAR_MS = 50;
const directory = await mkdtemp(path.join(os.tmpdir(), 'dextral-history-'));
const file = path.join(directory, 'history.sqlite');
const START = Date.parse('2026-01-01T00:00:00Z');
const roles = ['administrator', 'integrator', 'engineer', 'reviewer'] as const;
const keys = Array.from({ length: 12 }, (_, i) => ({ id: `00000000-0000-4000-8000-${String(i).padStart(12, '0')}`, role: roles[i < 4 ? 1 : i === 4 ? 3 : i === 5 ? 0 : 2]! }));
const owners = roles.map((role, i) => ({ id: `10000000-0000-4000-8000-${String(i).padStart(12, '0')}`, role }));

try {
  const filling = performance.now();
  await fill();
  console.log(`${rows} rows stored in ${((performance.now() - filling) / 1000).toFixed(0)} s; the file has ${((await stat(file)).size / 2 ** 20).toFixed(0)} MiB`);
  await measure();
} finally {
  await rm(directory, { recursive: true, force: true });
}

async function fill(): Promise<void> {
  const database = await connect(file);
  await database.writes.run(async (transaction) => {
    for (const { id, role } of owners) await database.people.create({ id, email: `${role}@sallowtern.example`, name: role, role, passwordHash: '-', createdAt: START, deactivatedAt: null }, { transaction });
    for (const { id, role } of keys) {
      await database.apiKeys.create({
        id, name: `Key ${id.slice(-2)}`, prefix: `dxt_${id.slice(-8)}`, secretHash: id.replaceAll('-', '').padEnd(64, '0'), role, ownerId: ownerOf(role), createdBy: ownerOf('administrator'), createdAt: START,
        expiresAt: null, lastUsedAt: null, revokedAt: null, requestsPerMinute: null, attitudesPerMonth: null, attitudesPerCall: null, parallelRequests: null,
      }, { transaction });
    }
  });
  const random = new SeededRandom(2026);
  for (let start = 0; start < rows; start += 20_000) {
    const part = Array.from({ length: Math.min(20_000, rows - start) }, (_, i) => rowOf(start + i, random));
    await database.writes.run((transaction) => storeRequests(database.sequelize, part, transaction));
  }
  await disconnect(database);
}

function ownerOf(role: (typeof roles)[number]): string {
  return owners.find((each) => each.role === role)!.id;
}

/** Nine calls of ten convert, and most are answered; the last key never verifies, the first alone is ever refused with 413. */
function rowOf(i: number, random: SeededRandom): NewRequest {
  const k = Math.min(keys.length - 1, Math.floor(random.between(0, keys.length)));
  const key = keys[k]!;
  const verifies = k !== keys.length - 1 && random.chance(0.1);
  const status = k === 0 && random.chance(0.0005) ? 413 : random.chance(0.92) ? 200 : random.pick([401, 404, 422, 422, 429, 503]);
  const warned = status === 200 && random.chance(0.08);
  return {
    requestId: randomUUID(),
    at: START + i * 7_000, keyId: key.id, personId: null, ownerId: ownerOf(key.role), role: key.role, method: 'POST',
    route: verifies ? '/api/v1/verify' : '/api/v1/convert', status, code: status === 200 ? null : 'some-problem', durationUs: 900, attitudes: status === 200 ? 40 : 0,
    warnings: warned ? 3 : 0, warningCodes: warned ? random.pick(['near-gimbal-lock', 'near-gimbal-lock', 'near-gimbal-lock,renormalised', 'gimbal-lock']) : '',
    verdict: verifies && status === 200 ? (random.chance(0.9) ? 'pass' : 'fail') : null, bodySha256: null, bodyBytes: null,
  };
}

async function measure(): Promise<void> {
  const last = keys.at(-1)!.id;
  const middle = START + rows * 3_500;
  const anything: HistoryFilter = { ownerId: null };
  const filters: [string, HistoryFilter][] = [
    ['none', anything],
    ['key', { ...anything, keyId: last }],
    ['role', { ...anything, role: 'reviewer' }],
    ['route', { ...anything, route: '/api/v1/verify' }],
    ['status', { ...anything, status: 413 }],
    ['status class', { ...anything, statusClass: 4 }],
    ['verdict', { ...anything, verdict: 'fail' }],
    ['warning', { ...anything, warning: 'gimbal-lock' }],
    ['time range', { ...anything, from: middle, to: middle + 3_600_000 }],
    ['request id that nobody has', { ...anything, requestId: 'ffffffff-0000' }],
    ['own calls only', { ownerId: ownerOf('reviewer') }],
    ['own calls, a verdict', { ownerId: ownerOf('engineer'), verdict: 'fail' }],
    ['key and warning', { ...anything, keyId: last, warning: 'gimbal-lock' }],
    ['a key and a route that never meet', { ...anything, keyId: last, route: '/api/v1/verify' }],
    ['a key and another’s role', { ...anything, keyId: last, role: 'integrator' }],
    ['role, route, verdict, an old week', { ...anything, role: 'engineer', route: '/api/v1/verify', verdict: 'fail', to: START + 7 * 86_400_000 }],
    ['two dense ones that never meet', { ...anything, role: 'reviewer', statusClass: 2, verdict: 'fail', keyId: last }],
  ];
  console.log('\nfilter | first page, ms | next pages: median, longest, ms | pages | rows');
  let longest = 0;
  for (const [name, filter] of filters) {
    const database = await connect(file);
    const history = historyRepository(database);
    const times: number[] = [];
    let position: HistoryPosition | null = null;
    let found = 0;
    do {
      const started = performance.now();
      const page: Awaited<ReturnType<typeof history.page>> = await history.page(filter, position, 50);
      times.push(performance.now() - started);
      found += page.rows.length;
      position = page.next;
    } while (position && times.length < 40);
    const oldest = performance.now();
    await history.page(filter, { at: START + 5_000_000, id: 800 }, 50);
    times.push(performance.now() - oldest);
    const started = performance.now();
    await history.routes(filter.ownerId);
    times.push(performance.now() - started);
    await disconnect(database);
    const [first, ...rest] = times as [number, ...number[]];
    rest.sort((a, b) => a - b);
    longest = Math.max(longest, first, rest.at(-1)!);
    console.log(`${name} | ${first.toFixed(1)} | ${rest[rest.length >> 1]!.toFixed(1)}, ${rest.at(-1)!.toFixed(1)} | ${times.length - 2} | ${found}`);
  }
  console.log(`\nlongest page ${longest.toFixed(1)} ms, the bar is ${BAR_MS} ms`);
  process.exitCode = longest > BAR_MS ? 1 : 0;
}
