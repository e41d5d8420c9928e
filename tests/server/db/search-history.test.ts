import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { searchHistory, type HistoryFilter, type HistoryPosition } from '#server/db/repositories/search-history.ts';
import { storeRequests, type NewRequest } from '#server/db/repositories/store-requests.ts';
import { startTestService, type TestService } from '#tests/support/test-service.ts';

const ROLES = ['administrator', 'engineer', 'reviewer', null] as const;
const ROUTES = ['/api/v1/convert', '/api/v1/verify', '/api/v1/history'];
const STATUSES = [200, 200, 200, 404, 422, 503];
const WARNINGS = ['', '', 'near-gimbal-lock', 'gimbal-lock,renormalised'];
const COUNT = 600;

let service: TestService;
let keys: string[];
const stored: NewRequest[] = [];
beforeAll(async () => {
  service = await startTestService();
  keys = [(await service.key('engineer')).key.id, (await service.key('integrator')).key.id];
  const owner = service.people.get('engineer')!;
  for (let i = 0; i < COUNT; i++) {
    const pick = <T>(list: readonly T[], step: number): T => list[Math.floor(i / step) % list.length]!;
    stored.push({
      // Many rows at one time, and one stretch whose clock was set back.
      requestId: `${String(i).padStart(8, '0')}-0000-4000-8000-000000000000`, at: 1_000_000 + (i > 400 ? -90 : 0) + Math.floor(i / 3),
      keyId: pick([...keys, null], 1), personId: null, ownerId: pick([owner, service.people.get('integrator')!, null], 1), role: pick(ROLES, 2),
      method: 'POST', route: pick(ROUTES, 7), status: pick(STATUSES, 5), code: null, durationUs: i, attitudes: 1, warnings: 1, warningCodes: pick(WARNINGS, 11), verdict: pick([null, 'pass', 'fail'] as const, 13), bodySha256: null, bodyBytes: null,
    });
  }
  await service.services.database.writes.run((transaction) => storeRequests(service.services.database.sequelize, stored, transaction));
});
afterAll(() => service.stop());

/** The same filter in plain words, over the rows as they were stored. */
function expected(filter: HistoryFilter): string[] {
  return stored.map((row, i) => ({ ...row, i })).filter((row) =>
    (filter.ownerId === null || row.ownerId === filter.ownerId) && (filter.keyId === undefined || row.keyId === filter.keyId)
    && (filter.role === undefined || row.role === filter.role) && (filter.route === undefined || row.route === filter.route)
    && (filter.status === undefined || row.status === filter.status) && (filter.statusClass === undefined || Math.floor(row.status / 100) === filter.statusClass)
    && (filter.verdict === undefined || row.verdict === filter.verdict) && (filter.warning === undefined || row.warningCodes.split(',').includes(filter.warning))
    && (filter.requestId === undefined || row.requestId.startsWith(filter.requestId))
    && (filter.from === undefined || row.at >= filter.from) && (filter.to === undefined || row.at < filter.to),
  ).sort((a, b) => b.at - a.at || b.i - a.i).map(({ requestId }) => requestId);
}

async function everyPage(filter: HistoryFilter, limit: number, lookedAtMost: number): Promise<string[]> {
  const ids: string[] = [];
  let position: HistoryPosition | null = null;
  for (let pages = 0; pages < 2 * COUNT; pages++) {
    const { rows, next } = await searchHistory(service.services.database.sequelize, filter, position, limit, lookedAtMost);
    expect(rows.length).toBeLessThanOrEqual(limit);
    ids.push(...rows.map(({ requestId }) => requestId));
    if (!next) return ids;
    position = next;
  }
  throw new Error('The pages never ended.');
}

describe('searchHistory', () => {
  it('finds what any combination of filters lets through, in order, once, however little a page may look at', async () => {
    const optional = <T>(...values: T[]) => fc.constantFrom<(T | undefined)[]>(undefined, ...values);
    await fc.assert(fc.asyncProperty(fc.record({
      ownerId: fc.constantFrom(null, null, service.people.get('engineer')!),
      keyId: optional(...keys), role: optional('engineer', 'reviewer', 'integrator'), route: optional(...ROUTES), status: optional(200, 422, 500), statusClass: optional(4, 5),
      verdict: optional('pass', 'fail'), warning: optional('near-gimbal-lock', 'renormalised'), requestId: optional('00000012', '00000400-0000', 'ffffffff'),
      from: optional(1_000_050, 1_000_100), to: optional(1_000_090, 1_000_150),
    }), fc.integer({ min: 1, max: 60 }), fc.constantFrom(8, 100, 5_000), async (filter, limit, lookedAtMost) => {
      expect(await everyPage(filter, limit, lookedAtMost)).toEqual(expected(filter));
    }), { numRuns: 120 });
  });

  it('reads every page off an index of the filter, never the whole table', async () => {
    const { database } = service.services;
    const seen: string[] = [];
    const { options } = database.sequelize as unknown as { options: { logging: unknown } };
    const before = options.logging;
    options.logging = (sql: string) => seen.push(sql.replace(/^Executing \(.*?\): /, ''));
    const filters: HistoryFilter[] = [
      { ownerId: null }, { ownerId: 'x' }, { ownerId: null, keyId: 'x' }, { ownerId: null, role: 'engineer' }, { ownerId: null, route: 'x' }, { ownerId: null, status: 404 }, { ownerId: null, statusClass: 4 },
      { ownerId: null, verdict: 'fail' }, { ownerId: null, warning: 'gimbal-lock' }, { ownerId: null, requestId: '00000001' }, { ownerId: 'x', keyId: 'y', status: 404, from: 5, to: 9 },
    ];
    for (const filter of filters) await searchHistory(database.sequelize, filter, { at: 9, id: 9 }, 10);
    options.logging = before;
    expect(seen.length).toBeGreaterThan(filters.length);
    for (const sql of seen) {
      const statement = sql.replace(/(;)? \{.*$/s, '').replaceAll(/\$\w+/g, '1');
      const [plan] = await database.sequelize.query(`EXPLAIN QUERY PLAN ${statement}`) as [{ detail: string }[], unknown];
      const scans = plan.map(({ detail }) => detail).filter((detail) => /^SCAN /.test(detail) && !/^SCAN (c|CONSTANT ROW)|USING INDEX|USING COVERING INDEX/.test(detail) && !detail.includes('(subquery'));
      expect(scans, statement).toEqual([]);
    }
  });
});
