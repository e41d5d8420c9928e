import { once } from 'node:events';
import type { IncomingMessage } from 'node:http';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createConverter } from '#shared/attitude/converter.ts';
import { PRESETS } from '#shared/attitude/presets.ts';
import { startTestService, type TestService } from '#tests/support/test-service.ts';
import { answerOf, listen } from './client.ts';

let service: TestService;
let server: Awaited<ReturnType<typeof listen>>;
let secret: string;
let keyId: string;
beforeAll(async () => {
  service = await startTestService();
  server = await listen(service);
  const issued = await service.key('engineer');
  secret = issued.secret;
  keyId = issued.key.id;
});
afterAll(async () => {
  await server.stop();
  await service.stop();
});

const PATH = '/api/v1/convert?from=aircraft-euler-deg&to=aircraft-quaternion';
const COUNT = 120_000;
const row = (i: number): [number, number, number] => [(i % 360) - 179.5, (i % 178) - 88.5, (i % 51) - 25];
const preset = (id: string) => PRESETS.find((each) => each.id === id)!.convention;
const angles = Float64Array.from({ length: COUNT * 3 }, (_, k) => row(Math.floor(k / 3))[k % 3]!);
const quaternions = createConverter(preset('aircraft-euler-deg'), preset('aircraft-quaternion')).convert(angles);

const headers = (type: string, key = secret) => ({ 'Authorization': `Bearer ${key}`, 'Content-Type': type });
const history = async (requestId: unknown) => (await service.services.database.sequelize.query(`
  SELECT r.status, r.code, r.attitudes, s.row, s.detail FROM requests r LEFT JOIN stream_refusals s ON s.request = r.id WHERE r.request_id = '${String(requestId)}'`))[0][0] as { status: number; code: string | null; attitudes: number; row: number | null; detail: string | null };
const csv = (count: number, spoilt = -1) => Array.from({ length: count }, (_, i) => (i === spoilt ? '1,2,x\n' : `${row(i).join(',')}\n`)).join('');
const doubles = (bytes: Buffer) => new Float64Array(Uint8Array.from(bytes).buffer);

describe('a stream of several parts', () => {
  it('is the same doubles as one batch of the core, over all its parts', async () => {
    const answer = await server.post(PATH, headers('application/octet-stream'), Buffer.from(angles.buffer));
    expect(answer.status).toBe(200);
    expect(Buffer.compare(answer.bytes, Buffer.from(quaternions.buffer))).toBe(0);
    expect(await history(answer.headers['x-request-id'])).toMatchObject({ status: 200, code: null, attitudes: COUNT, row: null });
  });

  it('keeps a continuous sign going from part to part', async () => {
    const to = { ...preset('aircraft-quaternion'), sign: 'continuous' };
    const answer = await server.post(`/api/v1/convert?from=aircraft-euler-deg&to=${encodeURIComponent(JSON.stringify(to))}`, headers('application/octet-stream'), Buffer.from(angles.buffer));
    const q = doubles(answer.bytes);
    expect(q.length).toBe(COUNT * 4);
    for (let i = 4; i < q.length; i += 4) {
      const dot = q[i]! * q[i - 4]! + q[i + 1]! * q[i - 3]! + q[i + 2]! * q[i - 2]! + q[i + 3]! * q[i - 1]!;
      if (dot < 0) expect.fail(`attitude ${i / 4} turns over`);
    }
  });

  it('is answered while it arrives: the first rows are there before the last are sent', async () => {
    const request = server.open(PATH, headers('text/csv'));
    const rows = csv(COUNT);
    request.write(rows);
    const [response] = await once(request, 'response') as [IncomingMessage];
    const [first] = await once(response, 'data') as [Buffer];
    expect(first.length).toBeGreaterThan(0);
    const open = await history(response.headers['x-request-id']);
    expect(open).toMatchObject({ status: 200, code: 'unfinished' });
    expect(open.attitudes).toBeGreaterThan(0);
    response.resume();
    request.end(rows);
    await once(response, 'end');
    expect(await history(response.headers['x-request-id'])).toMatchObject({ code: null, attitudes: 2 * COUNT });
  });
});

describe('a bad row in mid-stream ends the answer where its row would stand', () => {
  const spoilt = COUNT - 10;
  const spent = async (requestId: unknown) => expect(await history(requestId)).toMatchObject({ status: 200, attitudes: spoilt, row: spoilt + 1 });

  it('in CSV with a line that is no attitude', async () => {
    const answer = await server.post(PATH, headers('text/csv'), csv(COUNT, spoilt));
    const lines = answer.text.trimEnd().split('\n');
    expect(lines).toHaveLength(spoilt + 1);
    expect(lines.at(-1)).toContain(`problem,not-a-number,${spoilt + 1},"Row ${spoilt + 1}, line ${spoilt + 1}, has ""x"" where a number belongs`);
    expect(lines.at(-2)!.split(',').map(Number)).toEqual([...quaternions.slice((spoilt - 1) * 4, spoilt * 4)]);
    expect(answer.trailers['dextral-problem']).toBe(`not-a-number;row=${spoilt + 1}`);
    await spent(answer.headers['x-request-id']);
  });

  it('in NDJSON with a problem document', async () => {
    const body = csv(COUNT, spoilt).trimEnd().split('\n').map((line) => `[${line}]`).join('\n').replace('[1,2,x]', '[1,2,null]');
    const answer = await server.post(PATH, headers('application/x-ndjson'), body);
    const lines = answer.text.trimEnd().split('\n');
    expect(lines).toHaveLength(spoilt + 1);
    expect(JSON.parse(lines.at(-1)!)).toMatchObject({ problem: { code: 'not-finite', status: 422, row: spoilt + 1, instance: `/requests/${String(answer.headers['x-request-id'])}`, errors: [{ pointer: `/${spoilt}/2` }] } });
    await spent(answer.headers['x-request-id']);
  });

  it('among doubles with NaN', async () => {
    const body = angles.slice();
    body[spoilt * 3 + 1] = Infinity;
    const answer = await server.post(PATH, headers('application/octet-stream'), Buffer.from(body.buffer));
    const numbers = doubles(answer.bytes);
    expect(numbers.length).toBe((spoilt + 1) * 4);
    expect(numbers.slice(0, -4)).toEqual(quaternions.slice(0, spoilt * 4));
    expect([...numbers.slice(-4)]).toEqual([NaN, NaN, NaN, NaN]);
    expect(answer.trailers['dextral-problem']).toBe(`not-finite;row=${spoilt + 1}`);
    await spent(answer.headers['x-request-id']);
  });
});

describe('the quota of a stream', () => {
  it('is spent to the last attitude, and the answer ends there', async () => {
    const { key, secret: tight } = await service.key('engineer');
    await (await service.signedIn('administrator')).put(`/api/v1/keys/${key.id}/limits`).send({ requestsPerMinute: null, attitudesPerMonth: 100_000, attitudesPerCall: null, parallelRequests: null }).expect(200);
    const answer = await server.post(PATH, headers('text/csv', tight), csv(COUNT));
    const lines = answer.text.trimEnd().split('\n');
    expect(lines).toHaveLength(100_001);
    expect(lines.at(-1)).toMatch(/^problem,quota-exceeded,100001,/);
    expect(await history(answer.headers['x-request-id'])).toMatchObject({ code: 'quota-exceeded', attitudes: 100_000, row: 100_001 });
    const [[{ n }]] = await service.services.database.sequelize.query(`SELECT SUM(attitudes) AS n FROM usage_by_day WHERE subject = '${key.id}'`) as unknown as [[{ n: number }]];
    expect(n).toBe(100_000);
    const over = await server.post(PATH, headers('text/csv', tight), '1,2,3\n');
    expect([over.status, JSON.parse(over.text).code]).toEqual([429, 'quota-exceeded']);
  });

  it('is shared exactly by streams at the same time', async () => {
    const { key, secret: tight } = await service.key('engineer');
    await (await service.signedIn('administrator')).put(`/api/v1/keys/${key.id}/limits`).send({ requestsPerMinute: null, attitudesPerMonth: 150_000, attitudesPerCall: null, parallelRequests: null }).expect(200);
    const answers = await Promise.all([1, 2, 3].map(() => server.post(PATH, headers('application/octet-stream', tight), Buffer.from(angles.buffer))));
    const rows = answers.filter(({ status }) => status === 200).map(({ bytes, trailers }) => bytes.length / 32 - ('dextral-problem' in trailers ? 1 : 0));
    expect(rows.reduce((sum, count) => sum + count, 0)).toBe(150_000);
  });
});

describe('a caller that goes away', () => {
  it('is on record with what was answered to it, and holds no place', async () => {
    const request = server.open(PATH, headers('text/csv'));
    request.on('error', () => undefined);
    request.write(csv(COUNT));
    const [response] = await once(request, 'response') as [IncomingMessage];
    response.on('error', () => undefined);
    await once(response, 'data');
    request.destroy();
    const id = response.headers['x-request-id'];
    await expect.poll(async () => (await history(id)).code, { timeout: 5000 }).toBe('broken-off');
    expect((await history(id)).attitudes).toBeGreaterThan(0);
  });

  it('and does not read is not read from either: what is under way stays small', async () => {
    const request = server.open(PATH, headers('application/octet-stream'));
    request.on('error', () => undefined);
    const part = Buffer.from(angles.buffer);
    let taken = 0;
    void (async () => {
      for (let i = 0; i < 60; i++) {
        if (!request.write(part)) await once(request, 'drain');
        taken += part.length;
      }
    })().catch(() => undefined);
    const [response] = await once(request, 'response') as [IncomingMessage];
    response.pause();
    await new Promise((resolve) => { setTimeout(resolve, 1500); });
    // 173 MB were offered; what fits the sockets and one part on either side was taken.
    expect(taken).toBeLessThan(60 * part.length * 0.3);
    request.destroy();
  });

  it('leaves meter and history equal', async () => {
    await expect.poll(async () => ((await service.services.database.sequelize.query("SELECT COUNT(*) AS n FROM requests WHERE code = 'unfinished'"))[0][0] as { n: number }).n, { timeout: 5000 }).toBe(0);
    const [[{ metered }]] = await service.services.database.sequelize.query(`SELECT SUM(attitudes) AS metered FROM usage_by_day WHERE subject = '${keyId}'`) as unknown as [[{ metered: number }]];
    const [[{ recorded }]] = await service.services.database.sequelize.query(`SELECT SUM(attitudes) AS recorded FROM requests WHERE key_id = '${keyId}'`) as unknown as [[{ recorded: number }]];
    expect(metered).toBe(recorded);
    expect(metered).toBeGreaterThan(5 * COUNT);
  });
});

it('a stream is one call: with the limit of calls at once reached, it is refused', async () => {
  const { key, secret: tight } = await service.key('engineer');
  await (await service.signedIn('administrator')).put(`/api/v1/keys/${key.id}/limits`).send({ requestsPerMinute: null, attitudesPerMonth: null, attitudesPerCall: null, parallelRequests: 1 }).expect(200);
  const request = server.open(PATH, headers('text/csv', tight));
  const whole = answerOf(request);
  request.write(csv(COUNT));
  await once(request, 'response');
  const second = await server.post(PATH, headers('text/csv', tight), '1,2,3\n');
  expect([second.status, JSON.parse(second.text).code]).toEqual([429, 'too-many-parallel']);
  request.end();
  expect((await whole).text.trimEnd().split('\n')).toHaveLength(COUNT);
  expect((await server.post(PATH, headers('text/csv', tight), '1,2,3\n')).status).toBe(200);
});
