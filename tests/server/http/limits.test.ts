import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { Quota } from '#server/domain/limits/quota.ts';
import { startTestService, type TestService } from '#tests/support/test-service.ts';

let service: TestService;
beforeAll(async () => {
  service = await startTestService();
});
afterAll(() => service.stop());

const convert = (secret: string, count = 1) => service.call().post('/api/v1/convert').set('Authorization', `Bearer ${secret}`)
  .send({ from: { preset: 'aircraft-euler-deg' }, to: { preset: 'aircraft-quaternion' }, attitudes: Array.from({ length: count }, () => [1, 2, 3]) });
const NO_LIMITS = { requestsPerMinute: null, attitudesPerMonth: null, attitudesPerCall: null, parallelRequests: null };
const tighten = async (id: string, limits: object) => (await service.signedIn('administrator')).put(`/api/v1/keys/${id}/limits`).send({ ...NO_LIMITS, ...limits }).expect(200);
const sum = async (sql: string) => ((await service.services.database.sequelize.query(sql))[0] as { n: number }[])[0]!.n;

describe('limits', () => {
  it('of a role are changed by an administrator and in force on the next request', async () => {
    const { secret } = await service.key('integrator');
    await convert(secret, 20).expect(200);
    const administrator = await service.signedIn('administrator');
    await administrator.put('/api/v1/limits/integrator').send({ requestsPerMinute: 1000, attitudesPerMonth: 1000, attitudesPerCall: 10, parallelRequests: 8 }).expect(200);
    const refused = await convert(secret, 20);
    expect([refused.status, refused.body.code]).toEqual([413, 'batch-too-large']);
    await convert(secret, 10).expect(200);
    const { body } = await administrator.get('/api/v1/limits').expect(200);
    expect(body.items.find(({ role }: { role: string }) => role === 'integrator')).toEqual({ role: 'integrator', requestsPerMinute: 1000, attitudesPerMonth: 1000, attitudesPerCall: 10, parallelRequests: 8 });
  });

  it('are refused when they make no sense, and to everybody but administrators', async () => {
    const administrator = await service.signedIn('administrator');
    const wrong = await administrator.put('/api/v1/limits/engineer').send({ requestsPerMinute: 0, attitudesPerMonth: 1, attitudesPerCall: 1, parallelRequests: 1 });
    expect([wrong.status, wrong.body.errors[0]]).toEqual([422, { pointer: '/requestsPerMinute', message: 'is 0; it must be a whole number from 1 to 1000000' }]);
    const engineer = await service.signedIn('engineer');
    await engineer.put('/api/v1/limits/engineer').send({ requestsPerMinute: 9, attitudesPerMonth: 9, attitudesPerCall: 9, parallelRequests: 9 }).expect(403);
  });

  it('let a key have tighter ones, never looser', async () => {
    const { key, secret } = await service.key('engineer');
    await tighten(key.id, { attitudesPerCall: 5, requestsPerMinute: 1_000_000 });
    expect((await convert(secret, 6)).body.code).toBe('batch-too-large');
    const { body } = await service.call().get('/api/v1/usage').set('Authorization', `Bearer ${secret}`).expect(200);
    expect(body.limits).toMatchObject({ attitudesPerCall: 5, requestsPerMinute: 600 });
  });

  it('of requests a minute answer 429 with Retry-After and RateLimit headers, and are recorded', async () => {
    const { key, secret } = await service.key('engineer');
    await tighten(key.id, { requestsPerMinute: 3 });
    const answers = [];
    for (let i = 0; i < 5; i++) answers.push(await convert(secret));
    expect(answers.map(({ status }) => status)).toEqual([200, 200, 200, 429, 429]);
    const last = answers.at(-1)!;
    expect(last.body).toMatchObject({ code: 'too-many-requests', status: 429 });
    expect(Number(last.headers['retry-after'])).toBeGreaterThan(0);
    expect(answers[0]!.headers['ratelimit']).toMatch(/"requests-per-minute"; r=2; t=\d+/);
    expect(answers[0]!.headers['ratelimit-policy']).toMatch(/"requests-per-minute"; q=3; w=60/);
    expect(await sum(`SELECT COUNT(*) AS n FROM requests WHERE key_id = '${key.id}' AND code = 'too-many-requests'`)).toBe(2);
  });

  it('of requests at once refuse the rest', async () => {
    const { key, secret } = await service.key('engineer');
    await tighten(key.id, { parallelRequests: 2 });
    const answers = await Promise.all(Array.from({ length: 12 }, () => convert(secret)));
    expect(answers.filter(({ status }) => status === 200).length).toBeGreaterThanOrEqual(2);
    const refused = answers.filter(({ status }) => status === 429);
    expect(refused.length).toBeGreaterThan(0);
    expect(refused.every(({ body }) => body.code === 'too-many-parallel')).toBe(true);
    await convert(secret).expect(200);
  });
});

describe('the monthly quota', () => {
  it('gives exactly N answers to 2N parallel calls with N left', async () => {
    const { key, secret } = await service.key('engineer');
    await tighten(key.id, { attitudesPerMonth: 100 });
    await convert(secret, 80).expect(200);
    const answers = await Promise.all(Array.from({ length: 40 }, () => convert(secret)));
    const counted = (status: number) => answers.filter((answer) => answer.status === status).length;
    // More than the key may have at once are refused for that; of those admitted, exactly 20 are answered.
    let answered = counted(200);
    while (answered < 20) {
      const next = await convert(secret);
      expect(next.status).toBe(200);
      answered++;
    }
    const over = await convert(secret);
    expect([answered, over.status, over.body.code]).toEqual([20, 429, 'quota-exceeded']);
    expect(Number(over.headers['retry-after'])).toBe((Date.parse('2026-04-01T00:00:00Z') - service.time.now) / 1000);
    expect(await sum(`SELECT SUM(attitudes) AS n FROM usage_by_day WHERE subject = '${key.id}'`)).toBe(100);
  });

  it('costs nothing for what is refused', async () => {
    const { key, secret } = await service.key('engineer');
    await tighten(key.id, { attitudesPerMonth: 3 });
    for (let i = 0; i < 5; i++) {
      await service.call().post('/api/v1/convert').set('Authorization', `Bearer ${secret}`).send({ from: { preset: 'aircraft-euler-deg' }, to: { preset: 'aircraft-quaternion' }, attitudes: [[1, 2]] }).expect(422);
    }
    await convert(secret, 3).expect(200);
    await convert(secret, 1).expect(429);
  });

  it('is not forgotten by a restart, and starts anew with the month', async () => {
    const { key, secret } = await service.key('engineer');
    await tighten(key.id, { attitudesPerMonth: 5 });
    await convert(secret, 5).expect(200);
    const restarted = new Quota(service.services.usage, service.services.clock);
    await restarted.open(key.id);
    expect(restarted.reserve(key.id, 1, 5)).toBeNull();
    const now = service.time.now;
    service.time.now = Date.parse('2026-04-01T00:00:00Z');
    await convert(secret, 5).expect(200);
    service.time.now = now;
  });

  it('is metered in the transaction of the history: the two are equal', async () => {
    const meter = await service.services.database.sequelize.query('SELECT subject, day, requests, attitudes FROM usage_by_day ORDER BY 1, 2');
    const history = await service.services.database.sequelize.query(`
      SELECT COALESCE(key_id, person_id) AS subject, strftime('%Y-%m-%d', at / 1000, 'unixepoch') AS day, COUNT(*) AS requests, SUM(attitudes) AS attitudes
      FROM requests WHERE COALESCE(key_id, person_id) IS NOT NULL GROUP BY 1, 2 ORDER BY 1, 2`);
    expect(meter[0]).toEqual(history[0]);
    expect(meter[0].length).toBeGreaterThan(3);
  });

  it('is reported by key and role, to each what they may see', async () => {
    const all = (await (await service.signedIn('administrator')).get('/api/v1/usage/keys').expect(200)).body;
    expect(all.month).toBe('2026-03');
    expect(all.roles.map(({ role }: { role: string }) => role)).toEqual(['integrator', 'engineer']);
    const own = (await (await service.signedIn('engineer')).get('/api/v1/usage/keys?month=2026-03').expect(200)).body;
    expect(own.keys.every(({ role }: { role: string }) => role === 'engineer')).toBe(true);
    expect(own.keys.length).toBeLessThan(all.keys.length);
    const wrong = await (await service.signedIn('engineer')).get('/api/v1/usage/keys?month=2026-13');
    expect([wrong.status, wrong.body.errors[0].pointer]).toEqual([422, '?month']);
  });
});
