import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Role } from '#shared/api/roles.ts';
import { startTestService, type TestService } from '#tests/support/test-service.ts';

let service: TestService;
let engineer: { secret: string; id: string };
let integrator: { secret: string; id: string };
const agents = new Map<Role, ReturnType<TestService['signedIn']>>();
/** Signed in once each: sign-ins are limited by the minute. */
const signedIn = (role: Role) => agents.get(role) ?? agents.set(role, service.signedIn(role)).get(role)!;
beforeAll(async () => {
  service = await startTestService();
  for (const role of ['engineer', 'integrator'] as const) {
    const { key, secret } = await service.key(role);
    if (role === 'engineer') engineer = { secret, id: key.id };
    else integrator = { secret, id: key.id };
  }
});
afterAll(() => service.stop());

const convert = (secret: string | null, attitudes: unknown) => {
  const call = service.call().post('/api/v1/convert');
  if (secret !== null) call.set('Authorization', `Bearer ${secret}`);
  return call.send({ from: { preset: 'aircraft-euler-deg' }, to: { preset: 'aircraft-euler-rpy-deg' }, attitudes });
};
const history = async (query = '') => (await (await signedIn('administrator')).get(`/api/v1/history${query}`).expect(200)).body;

describe('the history', () => {
  it('holds every call by the time its answer arrives, with what it used', async () => {
    const answer = await convert(engineer.secret, [[0, 89.7, 0], [1, 2, 3]]);
    const entry = (await history()).items[0];
    expect(entry).toMatchObject({
      id: answer.headers['x-request-id'], method: 'POST', route: '/api/v1/convert', status: 200, code: null, attitudes: 2, warnings: 1, warningCodes: ['near-gimbal-lock'],
      key: { id: engineer.id, name: 'engineer key' }, person: null,
    });
    expect(entry.durationMs).toBeGreaterThan(0);
  });

  it.each<[string, () => Promise<{ headers: Record<string, string> }>, Record<string, unknown>]>([
    ['a refused batch', async () => convert(engineer.secret, [[1]]), { status: 422, code: 'count-mismatch', attitudes: 0 }],
    ['a call without a key', async () => convert(null, [[1, 2, 3]]), { status: 401, code: 'missing-key', key: null }],
    ['an unknown route', async () => service.call().get('/api/v1/nowhere').set('Authorization', `Bearer ${engineer.secret}`), { status: 404, code: 'unknown-route', route: 'unknown' }],
    ['a wrong method', async () => service.call().put('/api/v1/convert').set('Authorization', `Bearer ${engineer.secret}`), { status: 405, code: 'method-not-allowed', route: '/api/v1/convert' }],
    ['malformed JSON', async () => service.call().post('/api/v1/convert').set('Authorization', `Bearer ${engineer.secret}`).set('Content-Type', 'application/json').send('{'), { status: 400, code: 'malformed-json' }],
    ['a read with a key', async () => service.call().get('/api/v1/conventions').set('Authorization', `Bearer ${engineer.secret}`), { status: 200, route: '/api/v1/conventions' }],
  ])('holds %s', async (_what, call, expected) => {
    const answer = await call();
    expect((await history()).items[0]).toMatchObject({ id: answer.headers['x-request-id'], ...expected });
  });

  it('does not fill up with the console reading its own lists', async () => {
    const before = (await history()).items[0].id;
    expect((await history()).items[0].id).toBe(before);
  });

  it('holds what a person computes in the console', async () => {
    const agent = await signedIn('integrator');
    const answer = await agent.post('/api/v1/convert').send({ from: { preset: 'aircraft-euler-deg' }, to: { preset: 'aircraft-dcm' }, attitudes: [[1, 2, 3]] }).expect(200);
    expect((await history()).items[0]).toMatchObject({ id: answer.headers['x-request-id'], person: { name: 'A integrator' }, key: null });
  });

  it('filters by key, status, route and time, and pages without loss or repetition', async () => {
    for (let i = 0; i < 7; i++) await convert(integrator.secret, [[1, 2, i]]);
    const mine = await history(`?key=${integrator.id}&limit=3`);
    expect(mine.items).toHaveLength(3);
    const pages = [mine];
    while (pages.at(-1).nextCursor) pages.push(await history(`?key=${integrator.id}&limit=3&cursor=${pages.at(-1).nextCursor}`));
    const ids = pages.flatMap(({ items }) => items.map(({ id }: { id: string }) => id));
    expect(ids).toHaveLength(7);
    expect(new Set(ids).size).toBe(7);

    expect((await history('?status=4xx')).items.every(({ status }: { status: number }) => status >= 400 && status < 500)).toBe(true);
    expect((await history('?status=422')).items.every(({ status }: { status: number }) => status === 422)).toBe(true);
    expect((await history('?route=/api/v1/conventions')).items.map(({ route }: { route: string }) => route)).toEqual(['/api/v1/conventions']);
    expect((await history()).routes).toEqual(expect.arrayContaining(['/api/v1/convert', '/api/v1/conventions']));

    service.time.now += 60_000;
    const from = new Date(service.time.now).toISOString();
    expect((await history(`?from=${from}`)).items).toEqual([]);
    await convert(integrator.secret, [[1, 2, 3]]);
    expect((await history(`?from=${from}`)).items).toHaveLength(1);
    expect((await history(`?to=${from}&key=${integrator.id}`)).items).toHaveLength(7);
  });

  it('filters by role, verdict, warning code and request id', async () => {
    const warned = await convert(engineer.secret, [[0, 90, 0]]);
    const verify = (actual: number[]) => service.call().post('/api/v1/verify').set('Authorization', `Bearer ${engineer.secret}`).send({
      expected: { convention: { preset: 'aircraft-euler-deg' }, attitudes: [[30, 10, 20]] }, actual: { convention: { preset: 'aircraft-euler-deg' }, attitudes: [actual] }, tolerance: { angle: 0.1, unit: 'deg' },
    }).expect(200);
    const passed = await verify([30, 10, 20]);
    const failed = await verify([31, 10, 20]);
    const ids = async (query: string) => (await history(query)).items.map(({ id }: { id: string }) => id);
    expect(await ids('?warning=gimbal-lock')).toEqual([warned.headers['x-request-id']]);
    expect(await ids('?verdict=pass')).toEqual([passed.headers['x-request-id']]);
    expect(await ids('?verdict=fail&role=engineer')).toEqual([failed.headers['x-request-id']]);
    expect(await ids('?verdict=fail&role=integrator')).toEqual([]);
    expect(await ids(`?id=${warned.headers['x-request-id']!.toUpperCase()}`)).toEqual([warned.headers['x-request-id']]);
    expect(await ids(`?id=${warned.headers['x-request-id']!.slice(0, 8)}`)).toEqual([warned.headers['x-request-id']]);
    expect((await history(`?id=${failed.headers['x-request-id']}`)).items[0]).toMatchObject({ verdict: 'fail', role: 'engineer', route: '/api/v1/verify' });
    expect((await history('?role=integrator')).items.every(({ role }: { role: string }) => role === 'integrator')).toBe(true);
  });

  it('comes as CSV, filtered the same, whole, and without a formula in it', async () => {
    const administrator = await signedIn('administrator');
    const { secret } = (await administrator.post('/api/v1/keys').send({ name: '=HYPERLINK("https://elsewhere.example")', role: 'engineer', expiresAt: null }).expect(201)).body;
    const named = await convert(secret, [[1, 2, 3]]);
    const { text, headers } = await administrator.get('/api/v1/history.csv').expect(200);
    expect(headers['content-type']).toBe('text/csv; charset=utf-8');
    expect(headers['content-disposition']).toBe('attachment; filename="history-2026-03-02.csv"');
    const lines = text.split('\r\n');
    expect(lines[0]).toBe('time,request id,key,key prefix,person,role,method,route,status,problem,verdict,duration in ms,attitudes,warnings,warning codes');
    expect(lines.at(-1)).toBe('');
    expect(lines.find((line) => line.includes(named.headers['x-request-id']!))).toContain(`,"'=HYPERLINK(""https://elsewhere.example"")",`);
    const [{ n }] = (await service.services.database.sequelize.query('SELECT COUNT(*) AS n FROM requests'))[0] as [{ n: number }];
    expect(lines.length - 2).toBe(n);

    const refused = (await administrator.get('/api/v1/history.csv?status=401').expect(200)).text.trim().split('\r\n').slice(1);
    expect(refused.length).toBeGreaterThan(0);
    expect(refused.every((line) => line.includes(',401,'))).toBe(true);
    const own = (await (await signedIn('engineer')).get('/api/v1/history.csv').expect(200)).text;
    expect(own).not.toContain('integrator key');
    await administrator.get('/api/v1/history.csv?limit=3').expect(422);
    await service.call().get('/api/v1/history.csv').expect(401);
  });

  it('shows an engineer their own calls only, a reviewer all of them', async () => {
    const own = (await (await signedIn('engineer')).get('/api/v1/history?limit=200').expect(200)).body.items;
    expect(own.length).toBeGreaterThan(3);
    expect(own.every(({ key }: { key: { id: string } | null }) => key?.id === engineer.id)).toBe(true);
    const all = (await (await signedIn('reviewer')).get('/api/v1/history?limit=200').expect(200)).body.items;
    expect(all.length).toBeGreaterThan(own.length);
  });

  it.each(['?status=9xx', '?limit=0', '?limit=999', '?from=yesterday', '?colour=red', '?cursor=abc', '?cursor=12', '?role=pilot', '?verdict=maybe', '?warning=none', '?id=abc'])('refuses %s', async (query) => {
    const { status, body } = await (await signedIn('administrator')).get(`/api/v1/history${query}`);
    expect([400, 422]).toContain(status);
    expect(body.errors[0].pointer).toBe(`?${query.slice(1).split('=')[0]}`);
  });
});
