import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { pruneHistory } from '#server/jobs/prune-history.ts';
import { startTestService, type TestService } from '#tests/support/test-service.ts';

let service: TestService;
let administrator: Awaited<ReturnType<TestService['signedIn']>>;
let secret: string;
beforeAll(async () => {
  service = await startTestService();
  administrator = await service.signedIn('administrator');
  ({ secret } = await service.key('engineer'));
});
afterAll(() => service.stop());

const body = (count = 1) => JSON.stringify({ from: { preset: 'aircraft-euler-deg' }, to: { preset: 'aircraft-euler-rpy-deg' }, attitudes: Array.from({ length: count }, (_, i) => [i / 7, 2, 3]) });
const convert = async (text: string) => (await service.call().post('/api/v1/convert').set('Authorization', `Bearer ${secret}`).set('Content-Type', 'application/json').send(text)).headers['x-request-id']!;
const recordOf = async (id: string) => (await administrator.get(`/api/v1/history/${id}`).expect(200)).body;
const keep = (settings: object) => administrator.put('/api/v1/history/settings').send(settings);
const sum = async (sql: string) => ((await service.services.database.sequelize.query(sql))[0] as { n: number }[])[0]!.n;
const sha256 = (text: string) => createHash('sha256').update(text).digest('hex');

describe('bodies in the history', () => {
  it('are kept as their SHA-256 only, until an administrator says otherwise', async () => {
    expect((await administrator.get('/api/v1/history/settings').expect(200)).body).toEqual({ keepBodies: false, retentionDays: null });
    const text = body();
    const id = await convert(text);
    expect((await recordOf(id)).body).toEqual({ sha256: sha256(text), bytes: text.length, text: null });
    expect(await sum('SELECT COUNT(*) AS n FROM request_bodies')).toBe(0);
  });

  it('are kept whole up to 64 KiB where the workspace keeps them, refused calls’ too', async () => {
    await keep({ keepBodies: true, retentionDays: null }).expect(200);
    const text = body(3);
    expect((await recordOf(await convert(text))).body).toEqual({ sha256: sha256(text), bytes: text.length, text });
    const refused = body(1).replace('[0,2,3]', '[0,2]');
    expect(await recordOf(await convert(refused))).toMatchObject({ status: 422, body: { text: refused } });

    const padded = (bytes: number) => body().padEnd(bytes, ' ');
    expect((await recordOf(await convert(padded(65_536)))).body.text).toHaveLength(65_536);
    expect((await recordOf(await convert(padded(65_537)))).body).toMatchObject({ bytes: 65_537, text: null });
  });

  it('are never those of calls that may carry a secret', async () => {
    const password = 'correct horse battery wrong';
    await service.call().post('/api/v1/sessions').send({ email: 'engineer@sallowtern.example', password }).expect(401);
    expect(await sum(`SELECT COUNT(*) AS n FROM request_bodies WHERE body LIKE '%battery%'`)).toBe(0);
    const { body: { items } } = await administrator.get('/api/v1/history?route=/api/v1/sessions').expect(200);
    expect((await recordOf(items[0].id)).body).toBeNull();
  });

  it('are shown to those who may see the call', async () => {
    const id = await convert(body());
    const other = await service.key('reviewer');
    await service.call().get(`/api/v1/history/${id}`).set('Authorization', `Bearer ${other.secret}`).expect(200);
    const { secret: foreign } = await service.key('integrator');
    const theirs = (await service.call().post('/api/v1/convert').set('Authorization', `Bearer ${foreign}`).send(JSON.parse(body())).expect(200)).headers['x-request-id'];
    await service.call().get(`/api/v1/history/${theirs}`).set('Authorization', `Bearer ${secret}`).expect(404);
    await service.call().get('/api/v1/history/none').set('Authorization', `Bearer ${secret}`).expect(404);
  });

  it('are an administrator’s to decide on', async () => {
    const refused = await (await service.signedIn('integrator')).put('/api/v1/history/settings').send({ keepBodies: true, retentionDays: 1 });
    expect([refused.status, refused.body.code]).toEqual([403, 'not-allowed']);
    for (const retentionDays of [0, 3651, 1.5, '7']) expect((await keep({ keepBodies: true, retentionDays })).body.errors[0].pointer).toBe('/retentionDays');
    await keep({ keepBodies: true }).expect(422);
  });
});

describe('retention', () => {
  it('forgets calls older than it with all that hangs on them, and neither the meter nor younger calls', async () => {
    await convert(body().replace('[0,2,3]', '[0,90,3]'));
    const metered = await sum('SELECT SUM(requests) AS n FROM usage_by_day');
    await keep({ keepBodies: true, retentionDays: 30 }).expect(200);
    expect(await pruneHistory(service.services, 2)).toBe(0);

    service.time.now += 30 * 86_400_000 + 1;
    administrator = await service.signedIn('administrator');
    const before = await sum('SELECT COUNT(*) AS n FROM requests');
    expect(before).toBeGreaterThan(5);
    const young = await convert(body().replace('[0,2,3]', '[0,89.5,3]'));
    expect(await pruneHistory(service.services, 2)).toBe(before);
    expect(await sum('SELECT COUNT(*) AS n FROM requests')).toBe(1);
    expect(await sum('SELECT COUNT(*) AS n FROM request_bodies')).toBe(1);
    expect(await sum('SELECT COUNT(*) AS n FROM request_warnings')).toBe(1);
    expect((await recordOf(young)).warningCodes).toEqual(['near-gimbal-lock']);
    expect(await sum('SELECT SUM(requests) AS n FROM usage_by_day')).toBe(metered + 1);
  });

  it('forgets nothing while it is not set', async () => {
    await keep({ keepBodies: false, retentionDays: null }).expect(200);
    service.time.now += 4000 * 86_400_000;
    expect(await pruneHistory(service.services)).toBe(0);
  });
});
