import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestService, type TestService } from '#tests/support/test-service.ts';

let service: TestService;
let secret: string;
beforeAll(async () => {
  service = await startTestService();
  ({ secret } = await service.key('engineer'));
});
afterAll(() => service.stop());

const DEG = { preset: 'aircraft-euler-deg' };
const verify = (body: object, by = secret) => service.call().post('/api/v1/verify').set('Authorization', `Bearer ${by}`).send(body);
const get = (path: string, by = secret) => service.call().get(`/api/v1${path}`).set('Authorization', `Bearer ${by}`);
const comparison = (actual: number[][], more: object = {}) => ({
  expected: { convention: DEG, attitudes: [[30, 10, 20], [80, -5, 0], [200, 20, -40]] },
  actual: { convention: DEG, attitudes: actual }, tolerance: { angle: 0.1, unit: 'deg' }, label: 'Autopilot <attitude>', commit: '4f9d2c1a', ...more,
});

describe('POST /verify', () => {
  it('passes what agrees, across conventions', async () => {
    const { status, body } = await verify(comparison([[20, 10, 30], [0, -5, 80], [-40, 20, 200]], { actual: { convention: { preset: 'aircraft-euler-rpy-deg' }, attitudes: [[20, 10, 30], [0, -5, 80], [-40, 20, 200]] } }));
    expect([status, body.verdict, body.count, body.failed, body.failures]).toEqual([200, 'pass', 3, 0, []]);
    expect(body.statistics.max).toBeLessThan(1e-13);
  });

  it('fails what does not, and says where, by how much, and about which axis', async () => {
    const { body } = await verify(comparison([[30, 10, 20], [80, -3, 0], [200, 20, -40.05]]));
    expect([body.verdict, body.failed, body.worst.index]).toEqual(['fail', 1, 1]);
    expect(body.worst.angle).toBeCloseTo(2, 10);
    expect(body.worst.axisBody[1]).toBeCloseTo(1, 10);
    expect(body.failures).toEqual([{ index: 1, angle: body.worst.angle }]);
    expect(body.statistics.median).toBeCloseTo(0.05, 10);
    expect(body.summary).toBe('Worst at attitude 1: 2 deg about the right axis: the actual attitude is pitched up from the expected one.');
  });

  it('takes the tolerance in any unit', async () => {
    const off = [[30, 10, 20], [80, -5, 0], [200, 20, -40 + 5 / 3600]];
    expect((await verify(comparison(off, { tolerance: { angle: 4, unit: 'arcsec' } }))).body).toMatchObject({ verdict: 'fail', worst: { unit: 'arcsec' } });
    expect((await verify(comparison(off, { tolerance: { angle: 6, unit: 'arcsec' } }))).body.verdict).toBe('pass');
    expect((await verify(comparison(off, { tolerance: { angle: 1e-4, unit: 'rad' } }))).body.verdict).toBe('pass');
  });

  it.each<[string, object, string, string]>([
    ['lists of different length', comparison([[1, 2, 3]]), 'count-mismatch', '/actual/attitudes'],
    ['a tolerance of nothing', comparison([[1, 2, 3]], { tolerance: { angle: 0, unit: 'deg' } }), 'invalid-field', '/tolerance/angle'],
    ['a bad number', comparison([[30, 10, 20], [80, null as never, 0], [1, 2, 3]]), 'not-finite', '/actual/attitudes/1/1'],
    ['a commit that is none', comparison([[30, 10, 20]], { commit: 'main' }), 'invalid-field', '/commit'],
    ['a missing facet', comparison([], { actual: { convention: { representation: 'gibbs', reference: 'NED', body: 'FRD' }, attitudes: [[1, 2, 3]] } }), 'missing-facet', '/actual/convention/maps'],
  ])('refuses %s', async (_what, body, code, pointer) => {
    const answer = await verify(body);
    expect([answer.status, answer.body.code, answer.body.errors[0].pointer]).toEqual([422, code, pointer]);
  });
});

describe('runs', () => {
  it('keep the verdict with its conventions, and are found by verdict and label', async () => {
    const { body: answer, headers } = await verify(comparison([[30, 10, 20], [80, -3, 0], [200, 20, -40]]));
    const { body: run } = await get(`/runs/${answer.run}`).expect(200);
    expect(run).toMatchObject({
      id: answer.run, verdict: 'fail', label: 'Autopilot <attitude>', commit: '4f9d2c1a', count: 3, failed: 1, worst: answer.worst, statistics: answer.statistics,
      tolerance: { angle: 0.1, unit: 'deg' }, expected: { representation: 'euler' }, key: { name: 'engineer key' }, summary: answer.summary,
    });
    const failed = (await get('/runs?verdict=fail&label=Autopilot%20%3Cattitude%3E&limit=1').expect(200)).body;
    expect(failed.items[0].id).toBe(answer.run);
    expect(failed.nextCursor).not.toBeNull();
    const older = (await get(`/runs?verdict=fail&limit=1&cursor=${failed.nextCursor}`).expect(200)).body;
    expect(older.items[0].id).not.toBe(answer.run);
    const [rows] = await service.services.database.sequelize.query(`SELECT request_id FROM runs WHERE id = '${answer.run}'`);
    expect(rows).toEqual([{ request_id: headers['x-request-id'] }]);
  });

  it('come as JUnit XML: unique names, counts that add up, text escaped', async () => {
    const { body: answer } = await verify(comparison([[31, 10, 20], [80, -3, 0], [200, 20, -40]]));
    const { text, headers } = await get(`/runs/${answer.run}.junit.xml`).expect(200);
    expect(headers['content-type']).toContain('application/xml');
    expect(text).toContain('<testsuite name="Autopilot &lt;attitude&gt;" tests="3" failures="3" errors="0" time="0.000"');
    const names = [...text.matchAll(/<testcase [^>]* name="([^"]*)"/g)].map(([, name]) => name);
    expect(names).toEqual(['all 3 attitudes within 0.1 deg', 'attitude 0 within 0.1 deg', 'attitude 1 within 0.1 deg']);
    expect(text.match(/<failure /g)).toHaveLength(3);
    expect(text).not.toMatch(/ line=|skipped/);
  });

  it('are seen by their owner, by integrators and reviewers, and by no other engineer', async () => {
    const { body: answer } = await verify(comparison([[30, 10, 20], [80, -5, 0], [200, 20, -40]]));
    await (await service.signedIn('reviewer')).get(`/api/v1/runs/${answer.run}`).expect(200);
    await get(`/runs/${answer.run}`, (await service.key('integrator')).secret).expect(200);
    const { secret: other } = await service.key('integrator');
    const { body: foreign } = await verify(comparison([[30, 10, 20], [80, -5, 0], [200, 20, -40]]), other);
    const hidden = await get(`/runs/${foreign.run}`);
    expect([hidden.status, hidden.body.code]).toEqual([404, 'not-found']);
    expect((await get('/runs?limit=200').expect(200)).body.items.some(({ id }: { id: string }) => id === foreign.run)).toBe(false);
    await get('/runs/nowhere').expect(404);
    await get('/runs/nowhere.junit.xml').expect(404);
  });

  it('refuse numbers of few digits unless the nearest rotation is asked for, which is then said; each side by its own place', async () => {
    const rounded = { ...comparison([[30, 10, 20]]), expected: { convention: { preset: 'aircraft-quaternion' }, attitudes: [[0.9515, 0.1449, 0.1277, 0.2393]] }, actual: { convention: { preset: 'aircraft-euler-deg' }, attitudes: [[30, 10, 20]] } };
    const refused = await verify(rounded);
    expect([refused.status, refused.body.code, refused.body.errors[0].pointer]).toEqual([422, 'not-a-rotation', '/expected/attitudes/0']);
    const swapped = await verify({ ...rounded, expected: rounded.actual, actual: rounded.expected });
    expect(swapped.body.errors[0].pointer).toBe('/actual/attitudes/0');
    const { body } = await verify({ ...rounded, repair: 'nearest' }).expect(200);
    expect(body.verdict).toBe('pass');
    expect(body.warnings).toMatchObject([{ code: 'renormalised', count: 1, indices: [0] }]);
  });

  it('are not left behind by refused calls', async () => {
    const count = async () => ((await service.services.database.sequelize.query('SELECT COUNT(*) AS n FROM runs'))[0] as { n: number }[])[0]!.n;
    const before = await count();
    await verify(comparison([[1, 2, 3]])).expect(422);
    expect(await count()).toBe(before);
  });
});

describe('POST /verify-rates', () => {
  const rates = (change: object = {}) => service.call().post('/api/v1/verify-rates').set('Authorization', `Bearer ${secret}`).send({
    attitude: { convention: DEG, attitudes: [[0, 0, 35], [0, 0, 0]] },
    expected: { rate: { rate: 'euler', unit: 'deg/s' }, rates: [[9, 0, 0], [9, 0, 0]] },
    actual: { rate: { rate: 'body', unit: 'deg/s' }, rates: [[0, 9 * Math.sin((35 * Math.PI) / 180), 9 * Math.cos((35 * Math.PI) / 180)], [0, 0, 9.5]] },
    tolerance: { rate: 0.1, unit: 'deg/s' }, label: 'Rate gyros', ...change,
  });

  it('keeps a run of rates, told apart from runs of attitudes, with its JUnit report', async () => {
    const { status, body } = await rates();
    expect([status, body.verdict, body.count, body.failed]).toEqual([200, 'fail', 2, 1]);
    expect(body.failures[0].index).toBe(1);
    expect(body.failures[0].rate).toBeCloseTo(0.5, 12);
    expect(body.worst).toMatchObject({ index: 1, unit: 'deg/s', axisBody: [0, 0, 1] });
    expect(body.summary).toBe('Worst at sample 1: 0.5 deg/s about the down axis: beside the expected rate the actual one turns right.');
    const { body: run } = await get(`/runs/${body.run}`).expect(200);
    expect(run).toMatchObject({ kind: 'rates', label: 'Rate gyros', tolerance: { rate: 0.1, unit: 'deg/s' }, attitude: { representation: 'euler' }, expected: { rate: 'euler', angles: { sequence: 'ZYX' } }, actual: { rate: 'body', unit: 'deg/s' } });
    const { text } = await get(`/runs/${body.run}.junit.xml`).expect(200);
    expect(text).toContain('name="all 2 rates within 0.1 deg/s"');
    expect(text).toContain('name="rate 1 within 0.1 deg/s"');
  });

  it.each<[string, object, string, string]>([
    ['too few rates', { actual: { rate: { rate: 'body', unit: 'deg/s' }, rates: [[1, 2, 3]] } }, 'count-mismatch', '/actual/rates'],
    ['a rate of two numbers', { actual: { rate: { rate: 'body', unit: 'deg/s' }, rates: [[1, 2, 3], [1, 2]] } }, 'count-mismatch', '/actual/rates/1'],
    ['a rate too large to compute with', { actual: { rate: { rate: 'body', unit: 'rad/s' }, rates: [[1, 2, 3], [1e308, 0, 0]] } }, 'out-of-range', '/actual/rates/1/0'],
    ['a tolerance in degrees', { tolerance: { rate: 1, unit: 'deg' } }, 'invalid-field', '/tolerance/unit'],
    ['a derivative that the attitude does not have', { actual: { rate: { rate: 'dcm' }, rates: [[1], [2]] } }, 'invalid-facet', '/actual/rate/rate'],
  ])('refuses %s', async (_what, change, code, pointer) => {
    const { status, body } = await rates(change);
    expect([status, body.code, body.errors[0].pointer]).toEqual([422, code, pointer]);
  });
});
