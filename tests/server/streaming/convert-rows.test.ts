import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createConverter } from '#shared/attitude/converter.ts';
import { PRESETS } from '#shared/attitude/presets.ts';
import { startTestService, type TestService } from '#tests/support/test-service.ts';
import { listen } from './client.ts';

let service: TestService;
let server: Awaited<ReturnType<typeof listen>>;
let secret: string;
beforeAll(async () => {
  service = await startTestService();
  server = await listen(service);
  ({ secret } = await service.key('engineer'));
});
afterAll(async () => {
  await server.stop();
  await service.stop();
});

const PATH = '/api/v1/convert?from=aircraft-euler-deg&to=aircraft-quaternion';
const ROWS = [[30, 10, 20], [-120, 45, 170], [0, 0, 0]];
const preset = (id: string) => PRESETS.find((each) => each.id === id)!.convention;
const QUATERNIONS = rowsOf(createConverter(preset('aircraft-euler-deg'), preset('aircraft-quaternion')).convert(Float64Array.from(ROWS.flat())), 4);

function rowsOf(numbers: ArrayLike<number>, width: number): number[][] {
  return Array.from({ length: numbers.length / width }, (_, i) => Array.from({ length: width }, (__, k) => numbers[i * width + k]!));
}
const doubles = (bytes: Buffer) => new Float64Array(Uint8Array.from(bytes).buffer);

/** Written and read here by hand, not by the service's own code. */
const BODIES = {
  'application/x-ndjson': ROWS.map((row) => JSON.stringify(row)).join('\n'),
  'text/csv': ROWS.map((row) => row.join(',')).join('\r\n'),
  'application/octet-stream': Buffer.from(Float64Array.from(ROWS.flat()).buffer),
  'application/json': JSON.stringify({ from: { preset: 'aircraft-euler-deg' }, to: { preset: 'aircraft-quaternion' }, attitudes: ROWS }),
} as const;
const READERS = {
  'application/x-ndjson': (bytes: Buffer) => bytes.toString().trimEnd().split('\n').slice(0, -1).map((line) => JSON.parse(line) as number[]),
  'text/csv': (bytes: Buffer) => bytes.toString().trimEnd().split('\n').map((line) => line.split(',').map(Number)),
  'application/octet-stream': (bytes: Buffer) => rowsOf(doubles(bytes), 4),
  'application/json': (bytes: Buffer) => (JSON.parse(bytes.toString()) as { attitudes: number[][] }).attitudes,
} as const;
type Type = keyof typeof BODIES;
const TYPES = Object.keys(BODIES) as Type[];

const send = (type: string, accept: string | null, body: Uint8Array | string, path = PATH) => server.post(path, {
  Authorization: `Bearer ${secret}`, 'Content-Type': type, ...(accept === null ? {} : { Accept: accept }), 'Content-Length': Buffer.byteLength(body),
}, body);
const history = async (requestId: unknown) => (await service.services.database.sequelize.query(`
  SELECT r.status, r.code, r.attitudes, r.warnings, r.warning_codes, s.row, s.detail FROM requests r LEFT JOIN stream_refusals s ON s.request = r.id WHERE r.request_id = '${String(requestId)}'`))[0][0] as Record<string, unknown>;

describe('POST /convert of rows', () => {
  it.each(TYPES.flatMap((type) => TYPES.map((accept) => [type, accept] as const)))('takes %s and gives %s, the same doubles', async (type, accept) => {
    const answer = await send(type, accept, BODIES[type], type === 'application/json' ? '/api/v1/convert' : PATH);
    expect([answer.status, answer.headers['content-type']!.split(';')[0]]).toEqual([200, accept]);
    expect(READERS[accept](answer.bytes)).toEqual(QUATERNIONS);
    expect(await history(answer.headers['x-request-id'])).toMatchObject({ status: 200, code: null, attitudes: 3 });
  });

  it('keeps the SHA-256 of a long JSON body in the history, as of a short one', async () => {
    const body = JSON.stringify({ from: { preset: 'aircraft-euler-deg' }, to: { preset: 'aircraft-quaternion' }, attitudes: ROWS, options: {} }) + ' '.repeat(600_000);
    const answer = await send('application/json', null, body, '/api/v1/convert');
    expect(READERS['application/json'](answer.bytes)).toEqual(QUATERNIONS);
    const [[row]] = await service.services.database.sequelize.query(`SELECT body_sha256, body_bytes FROM requests WHERE request_id = '${String(answer.headers['x-request-id'])}'`) as unknown as [[object]];
    expect(row).toEqual({ body_sha256: createHash('sha256').update(body).digest('hex'), body_bytes: body.length });
  });

  it('answers in the content type of the body where Accept says nothing', async () => {
    expect((await send('text/csv', null, BODIES['text/csv'])).headers['content-type']).toBe('text/csv; charset=utf-8; header=absent');
    expect((await send('application/octet-stream', '*/*', BODIES['application/octet-stream'])).headers['content-type']).toBe('application/octet-stream');
  });

  it('reads and writes names of columns where the header parameter of RFC 4180 says so', async () => {
    const answer = await send('text/csv; header=present', 'text/csv;header=present', `yaw,pitch,roll\n${BODIES['text/csv']}`);
    expect(answer.text.split('\n').slice(0, 2)).toEqual(['q_w,q_x,q_y,q_z', QUATERNIONS[0]!.join(',')]);
    const unannounced = await send('text/csv', null, 'yaw,pitch,roll\n1,2,3\n');
    expect([unannounced.status, JSON.parse(unannounced.text).code]).toEqual([422, 'not-a-number']);
    expect(JSON.parse(unannounced.text).detail).toContain('header=present');
  });

  it('takes a convention as JSON in the query, and names its missing facets', async () => {
    const facets = { representation: 'quaternion', reference: 'NED', body: 'FRD', scalar: 'last', product: 'hamilton', maps: 'body-to-reference', sign: 'any' };
    const path = (to: object) => `/api/v1/convert?from=aircraft-euler-deg&to=${encodeURIComponent(JSON.stringify(to))}`;
    const { text } = await send('text/csv', null, '30,10,20', path(facets));
    const [w, x, y, z] = QUATERNIONS[0]!;
    expect(text).toBe(`${[x, y, z, w].join(',')}\n`);
    const { scalar: _scalar, ...without } = facets;
    const refused = JSON.parse((await send('text/csv', null, '30,10,20', path(without))).text);
    expect([refused.code, refused.errors[0].pointer]).toEqual(['missing-facet', '?to/scalar']);
  });

  it('says what it warned of: at the end of NDJSON, in a trailer, in the history', async () => {
    const answer = await send('application/x-ndjson', null, '[1,0,0]\n[10,90,5]\n', '/api/v1/convert?from=aircraft-euler-deg&to=aircraft-euler-rpy-deg');
    const [, , last] = answer.text.trimEnd().split('\n').map((line) => JSON.parse(line));
    expect(last).toMatchObject({ count: 2, warnings: [{ code: 'gimbal-lock', count: 1, indices: [1] }] });
    expect(answer.trailers['dextral-warnings']).toBe('gimbal-lock;count=1');
    expect(await history(answer.headers['x-request-id'])).toMatchObject({ warnings: 1, warning_codes: 'gimbal-lock' });
  });
});

describe('POST /convert of rows refuses', () => {
  it.each<[string, string, string | Buffer, number, string, string]>([
    ['a missing number', 'text/csv', '1,2,3\n1,2\n', 422, 'count-mismatch', '/1'],
    ['an empty cell, which is no zero', 'text/csv', '1,2,3\n1,,3\n', 422, 'not-a-number', '/1/1'],
    ['a hexadecimal number', 'text/csv', '0x10,2,3\n', 422, 'not-a-number', '/0/0'],
    ['NaN', 'text/csv', '1,NaN,3\n', 422, 'not-finite', '/0/1'],
    ['a number too large', 'text/csv', '1,1e400,3\n', 422, 'not-finite', '/0/1'],
    ['a line that is no JSON', 'application/x-ndjson', '[1,2,3]\n[1,NaN,3]\n', 400, 'malformed-json', '/1'],
    ['null', 'application/x-ndjson', '[1,2,3]\n[1,null,3]\n', 422, 'not-finite', '/1/1'],
    ['a number as text', 'application/x-ndjson', '["1",2,3]', 422, 'not-a-number', '/0/0'],
    ['half a double', 'application/octet-stream', Buffer.alloc(28), 422, 'count-mismatch', '/1'],
    ['NaN among doubles', 'application/octet-stream', Buffer.from(Float64Array.of(1, 2, 3, 4, NaN, 6).buffer), 422, 'not-finite', '/1/1'],
    ['nothing at all', 'text/csv', '', 422, 'count-mismatch', ''],
    ['bytes that are no UTF-8', 'text/csv', Buffer.from([0x31, 0xff, 0x0a]), 400, 'malformed-request', '/0'],
  ])('%s', async (_what, type, body, status, code, pointer) => {
    const answer = await send(type, null, body);
    const problem = JSON.parse(answer.text);
    expect([answer.status, problem.code, problem.errors[0]?.pointer]).toEqual([status, code, pointer]);
    expect(answer.headers['content-type']).toContain('application/problem+json');
    expect(await history(answer.headers['x-request-id'])).toMatchObject({ status, code, attitudes: 0 });
  });

  it('a body of rows without a convention, and a JSON body with two', async () => {
    const none = await send('text/csv', null, '1,2,3', '/api/v1/convert?to=aircraft-quaternion');
    expect(JSON.parse(none.text)).toMatchObject({ status: 422, code: 'missing-field', errors: [{ pointer: '?from' }] });
    const twice = await send('application/json', null, BODIES['application/json'], PATH);
    expect(JSON.parse(twice.text)).toMatchObject({ status: 422, code: 'invalid-field', errors: [{ pointer: '?from' }] });
  });

  it('content types it cannot give, unknown keys, and presets that are none', async () => {
    expect((await send('text/csv', 'image/png', '1,2,3')).status).toBe(406);
    expect((await send('text/csv', null, '1,2,3', '/api/v1/convert?from=x&to=aircraft-quaternion')).status).toBe(422);
    const stranger = await server.post(PATH, { 'Content-Type': 'text/csv' }, '1,2,3');
    expect(stranger.status).toBe(401);
    expect(await history(stranger.headers['x-request-id'])).toMatchObject({ status: 401, code: 'missing-key' });
  });

  it('more rows than a JSON answer may hold for this caller', async () => {
    const { status, text } = await send('text/csv', 'application/json', '1,2,3\n'.repeat(10_001));
    expect([status, JSON.parse(text).code]).toEqual([413, 'batch-too-large']);
  });
});
