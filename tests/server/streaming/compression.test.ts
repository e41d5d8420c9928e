import zlib from 'node:zlib';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
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
const ROWS = Array.from({ length: 2000 }, (_, i) => [(i % 360) - 180, (i % 170) - 85, i % 30]);
const CSV = ROWS.map((row) => `${row.join(',')}\n`).join('');
const JSON_BODY = JSON.stringify({ from: { preset: 'aircraft-euler-deg' }, to: { preset: 'aircraft-quaternion' }, attitudes: ROWS });
const PACK = { gzip: zlib.gzipSync, br: zlib.brotliCompressSync, deflate: zlib.deflateSync } as const;
const UNPACK = { gzip: zlib.gunzipSync, br: zlib.brotliDecompressSync } as const;
const post = (type: string, body: Buffer | string, more: Record<string, string> = {}, path = type === 'application/json' ? '/api/v1/convert' : PATH) =>
  server.post(path, { 'Authorization': `Bearer ${secret}`, 'Content-Type': type, ...more }, body);

describe('compressed bodies', () => {
  it.each(['gzip', 'br', 'deflate'] as const)('in %s are read, JSON and rows alike', async (encoding) => {
    const plain = await post('text/csv', CSV);
    const rows = await post('text/csv', PACK[encoding](CSV), { 'Content-Encoding': encoding });
    expect([rows.status, rows.text]).toEqual([200, plain.text]);
    const json = await post('application/json', PACK[encoding](JSON_BODY), { 'Content-Encoding': encoding });
    expect(JSON.parse(json.text).attitudes.map((row: number[]) => `${row.join(',')}\n`).join('')).toBe(plain.text);
  });

  it('that are not what they say are refused', async () => {
    for (const [encoding, body] of [['gzip', CSV], ['br', CSV], ['gzip', zlib.gzipSync(CSV).subarray(0, 500)], ['br', zlib.brotliCompressSync(CSV).subarray(0, 500)]] as const) {
      const { status, text } = await post('text/csv', Buffer.from(body), { 'Content-Encoding': encoding });
      expect([status, JSON.parse(text).code]).toEqual([400, 'malformed-request']);
    }
    const unknown = await post('text/csv', CSV, { 'Content-Encoding': 'zip' });
    expect([unknown.status, JSON.parse(unknown.text).code]).toEqual([415, 'unsupported-encoding']);
  });

  it.each(['gzip', 'br'] as const)('in %s that unpack out of all proportion are refused early: JSON whole, rows in mid-stream', async (encoding) => {
    // 128 MiB of zeros from 130 kB of gzip or 100 bytes of brotli: level and roll of an aircraft that never moves.
    const bomb = PACK[encoding](Buffer.alloc(128 * 1024 * 1024));
    const before = process.memoryUsage.rss();
    const json = await post('application/json', bomb, { 'Content-Encoding': encoding });
    expect([json.status, JSON.parse(json.text).code]).toEqual([413, 'body-too-large']);
    const rows = await post('application/octet-stream', bomb, { 'Content-Encoding': encoding });
    const problem = rows.status === 200 ? rows.trailers['dextral-problem'] : JSON.parse(rows.text).code;
    expect(problem).toBe('body-too-large');
    expect(rows.bytes.length).toBeLessThan(40 * 1024 * 1024);
    expect(process.memoryUsage.rss() - before).toBeLessThan(200 * 1024 * 1024);
  }, 30_000);
});

describe('compressed answers', () => {
  it.each(['gzip', 'br'] as const)('in %s where the caller takes it: JSON, rows, problems and lists', async (encoding) => {
    const plain = await post('text/csv', CSV);
    const rows = await post('text/csv', CSV, { 'Accept-Encoding': encoding });
    expect(rows.headers['content-encoding']).toBe(encoding);
    expect(UNPACK[encoding](rows.bytes).toString()).toBe(plain.text);
    expect(rows.bytes.length).toBeLessThan(plain.bytes.length / 2);
    const json = await post('application/json', JSON_BODY, { 'Accept-Encoding': encoding });
    expect([json.headers['content-encoding'], JSON.parse(UNPACK[encoding](json.bytes).toString()).attitudes.length]).toEqual([encoding, 2000]);
    const list = await service.call().get('/api/v1/conventions').set('Authorization', `Bearer ${secret}`).set('Accept-Encoding', encoding).buffer(true).parse((response, done) => {
      const chunks: Buffer[] = [];
      response.on('data', (chunk: Buffer) => chunks.push(chunk)).on('end', () => { done(null, Buffer.concat(chunks)); });
    });
    expect(list.headers['content-encoding']).toBe(encoding);
  });

  it('are left alone where they are doubles, short, or not asked for compressed', async () => {
    expect((await post('text/csv', CSV)).headers['content-encoding']).toBeUndefined();
    expect((await post('text/csv', '1,2,3\n', { 'Accept-Encoding': 'gzip' })).text).not.toBe('');
    expect((await post('text/csv', CSV, { 'Accept-Encoding': 'gzip', 'Accept': 'application/octet-stream' })).headers['content-encoding']).toBeUndefined();
  });
});
