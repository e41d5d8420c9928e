import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestService, type TestService } from '#tests/support/test-service.ts';

let service: TestService;
let secret: string;
beforeAll(async () => {
  service = await startTestService();
  ({ secret } = await service.key('engineer'));
});
afterAll(() => service.stop());

const convert = (body: object) => service.call().post('/api/v1/convert').set('Authorization', `Bearer ${secret}`).send(body);
const DEG = { preset: 'aircraft-euler-deg' };
const QUATERNION = { preset: 'aircraft-quaternion' };
const DCM = { preset: 'aircraft-dcm' };

describe('POST /convert', () => {
  it('answers with numbers, every facet of both conventions, and the request id', async () => {
    const { status, body, headers } = await convert({ from: DEG, to: QUATERNION, attitudes: [[30, 10, 20]], options: { readings: true } });
    expect(status).toBe(200);
    // Exact to 15 digits, from 64-digit arithmetic of tests/reference.
    for (const [i, component] of [0.9515485246437886, 0.14487812541736916, 0.12767944069578066, 0.23929833774473033].entries()) expect(body.attitudes[0][i]).toBeCloseTo(component, 15);
    expect(body.from).toEqual({ representation: 'euler', reference: 'NED', body: 'FRD', sequence: 'ZYX', motion: 'intrinsic', unit: 'deg', order: [1, 2, 3], signs: [1, 1, 1], range: 'signed' });
    expect(body.to).toMatchObject({ representation: 'quaternion', scalar: 'first', product: 'hamilton', maps: 'body-to-reference', sign: 'any' });
    expect(body.readings).toEqual(['nose 030.0° true, 10.0° up, right wing 20.0° down']);
    expect(body.warnings).toEqual([]);
    expect(headers['x-request-id']).toMatch(/^[0-9a-f-]{36}$/);
  });

  it('takes facets in place of a preset, and relabels axes: 30° NED yaw is 60° ENU yaw', async () => {
    const { body } = await convert({ from: DEG, to: { representation: 'euler', reference: 'ENU', body: 'FLU', sequence: 'ZYX', motion: 'intrinsic', unit: 'deg', order: [1, 2, 3], signs: [1, 1, 1], range: 'signed' }, attitudes: [[30, 0, 0]] });
    expect(body.attitudes[0][0]).toBeCloseTo(60, 12);
  });

  it('takes a row-major matrix as three rows', async () => {
    const flat = await convert({ from: DCM, to: DEG, attitudes: [[0, 1, 0, -1, 0, 0, 0, 0, 1]] });
    const nested = await convert({ from: DCM, to: DEG, attitudes: [[[0, 1, 0], [-1, 0, 0], [0, 0, 1]]] });
    expect(nested.body.attitudes).toEqual([[90, 0, 0]]);
    expect(nested.body.attitudes).toEqual(flat.body.attitudes);
  });

  it('warns at and near gimbal lock, with the worst case', async () => {
    const { body } = await convert({ from: DEG, to: DEG, attitudes: [[10, 90, 5], [0, 89.5, 0], [0, 45, 0]] });
    const codes = Object.fromEntries(body.warnings.map((warning: { code: string; indices: number[] }) => [warning.code, warning.indices]));
    expect(codes).toEqual({ 'gimbal-lock': [0], 'near-gimbal-lock': [1] });
    expect(body.worst).toMatchObject({ index: 0, condition: null, marginDeg: 0 });
    expect(body.attitudes[0][2]).toBe(0);
    const near = body.warnings.find(({ code }: { code: string }) => code === 'near-gimbal-lock').worst;
    expect(near.marginDeg).toBeCloseTo(0.5, 9);
    expect(near.condition).toBeCloseTo(1 / Math.cos((89.5 * Math.PI) / 180), 6);
  });

  it('repairs small defects and says so, refuses larger ones unless asked', async () => {
    const off = [1.000000001, 0, 0, 0];
    const repaired = await convert({ from: QUATERNION, to: DCM, attitudes: [off] });
    expect(repaired.body.warnings[0]).toMatchObject({ code: 'renormalised', count: 1, indices: [0] });
    const refused = await convert({ from: QUATERNION, to: DCM, attitudes: [[2, 0, 0, 0]] });
    expect(refused.status).toBe(422);
    expect(refused.body.code).toBe('not-a-rotation');
    const nearest = await convert({ from: QUATERNION, to: DCM, attitudes: [[2, 0, 0, 0]], options: { repair: 'nearest' } });
    expect(nearest.body.attitudes[0]).toEqual([1, 0, 0, 0, 1, 0, 0, 0, 1]);
  });
});

describe('options.crossCheck', () => {
  it('reports how far the answer is from its independent recomputation', async () => {
    const { body } = await convert({ from: DEG, to: QUATERNION, attitudes: [[30, 10, 20], [-120, 45, 170]], options: { crossCheck: true } });
    expect(body.crossCheck.maxUlp).toBeGreaterThan(0);
    expect(body.crossCheck.maxUlp).toBeLessThanOrEqual(0.501);
    expect(body.crossCheck.methods.map(({ method }: { method: string }) => method)).toEqual(['mathjs BigNumber, 64 digits', 'quaternion package, double precision']);
  });
  it('takes a thousand attitudes at most', async () => {
    const { status, body } = await convert({ from: DEG, to: QUATERNION, attitudes: Array.from({ length: 1001 }, () => [1, 2, 3]), options: { crossCheck: true } });
    expect([status, body.code]).toEqual([413, 'batch-too-large']);
  });
});

describe('POST /convert refuses', () => {
  const facets = { representation: 'quaternion', reference: 'NED', body: 'FRD', scalar: 'first', product: 'hamilton', maps: 'body-to-reference', sign: 'any' };
  const without = (name: string) => Object.fromEntries(Object.entries(facets).filter(([facet]) => facet !== name));

  it.each(Object.keys(facets).filter((facet) => facet !== 'representation'))('a convention without %s, naming it and what it may be', async (facet) => {
    const { status, body } = await convert({ from: without(facet), to: DEG, attitudes: [[1, 0, 0, 0]] });
    expect(status).toBe(422);
    expect(body.code).toBe('missing-facet');
    expect(body.errors[0].pointer).toBe(`/from/${facet}`);
    expect(body.errors[0].message).toMatch(/is missing; it must be (one of|three letters)/);
  });

  it.each<[string, object, number, string, string]>([
    ['no representation', { from: without('representation'), to: DEG, attitudes: [[1, 0, 0, 0]] }, 422, 'missing-facet', '/from/representation'],
    ['an unknown facet', { from: { ...facets, unit: 'deg' }, to: DEG, attitudes: [[1, 0, 0, 0]] }, 422, 'unknown-facet', '/from/unit'],
    ['a facet with a value it cannot have', { from: { ...facets, scalar: 'middle' }, to: DEG, attitudes: [[1, 0, 0, 0]] }, 422, 'invalid-facet', '/from/scalar'],
    ['axes with two norths', { from: { ...facets, reference: 'NND' }, to: DEG, attitudes: [[1, 0, 0, 0]] }, 422, 'invalid-facet', '/from/reference'],
    ['an unknown preset', { from: { preset: 'aircraft' }, to: DEG, attitudes: [[1, 0, 0]] }, 422, 'unknown-preset', '/from/preset'],
    ['an unknown field', { from: DEG, to: DEG, attitudes: [[1, 0, 0]], attitude: 1 }, 422, 'unknown-field', '/attitude'],
    ['no attitudes', { from: DEG, to: DEG }, 422, 'missing-field', '/attitudes'],
    ['an empty batch', { from: DEG, to: DEG, attitudes: [] }, 422, 'count-mismatch', '/attitudes'],
    ['a wrong count of numbers', { from: DEG, to: DEG, attitudes: [[1, 0, 0], [1, 0]] }, 422, 'count-mismatch', '/attitudes/1'],
    ['null, which NaN becomes', { from: DEG, to: DEG, attitudes: [[1, null, 0]] }, 422, 'not-finite', '/attitudes/0/1'],
    ['a number as text', { from: DEG, to: DEG, attitudes: [['1', 0, 0]] }, 422, 'not-a-number', '/attitudes/0/0'],
    ['a zero quaternion', { from: QUATERNION, to: DEG, attitudes: [[0, 0, 0, 0]] }, 422, 'zero-norm', '/attitudes/0'],
    ['a reflection', { from: DCM, to: DEG, attitudes: [[1, 0, 0, 0, 1, 0, 0, 0, -1]] }, 422, 'not-a-rotation', '/attitudes/0'],
    ['a singular matrix', { from: DCM, to: DEG, attitudes: [[1, 0, 0, 0, 1, 0, 0, 0, 0]] }, 422, 'not-a-rotation', '/attitudes/0'],
    ['angles between sets of different handedness', { from: { ...facets, body: 'FLD' }, to: DEG, attitudes: [[1, 0, 0, 0]] }, 422, 'improper-axes', ''],
    ['frames that nothing relates', { from: { ...facets, reference: 'ECEF' }, to: DEG, attitudes: [[1, 0, 0, 0]] }, 422, 'unrelated-frames', ''],
    ['the Gibbs vector of a half turn', { from: QUATERNION, to: { representation: 'gibbs', reference: 'NED', body: 'FRD', maps: 'body-to-reference' }, attitudes: [[0, 1, 0, 0]] }, 422, 'not-representable', '/attitudes/0'],
  ])('%s', async (_what, sent, status, code, pointer) => {
    const { status: answered, body, headers } = await convert(sent);
    expect([answered, body.code]).toEqual([status, code]);
    expect(headers['content-type']).toContain('application/problem+json');
    expect(body).toMatchObject({ type: `/problems/${code}`, status, title: expect.any(String), detail: expect.any(String), instance: `/requests/${headers['x-request-id']}` });
    if (pointer !== '') expect(body.errors[0].pointer).toBe(pointer);
  });

  it('a number too large for a double', async () => {
    const { body } = await service.call().post('/api/v1/convert').set('Authorization', `Bearer ${secret}`).set('Content-Type', 'application/json')
      .send('{"from":{"preset":"aircraft-euler-deg"},"to":{"preset":"aircraft-quaternion"},"attitudes":[[1e400,0,0]]}');
    expect(body.code).toBe('not-finite');
  });

  it('names every bad attitude of a batch, the first hundred of them', async () => {
    const attitudes = Array.from({ length: 250 }, (_, i) => (i % 2 === 0 ? [3, 0, 0, 0] : [1, 0, 0, 0]));
    const { body } = await convert({ from: QUATERNION, to: DEG, attitudes });
    expect(body.errors).toHaveLength(100);
    expect(body.errors[99].pointer).toBe('/attitudes/198');
    expect(body.detail).toContain('125 attitudes of 250');
  });

  it('more attitudes than a call may carry', async () => {
    const { status, body } = await convert({ from: DEG, to: DEG, attitudes: Array.from({ length: 10_001 }, () => [0, 0, 0]) });
    expect([status, body.code]).toEqual([413, 'batch-too-large']);
  });
});

describe('a body that is none', () => {
  const raw = (type: string, text: string | Buffer) => service.call().post('/api/v1/convert').set('Authorization', `Bearer ${secret}`).set('Content-Type', type).send(text);

  it.each([
    ['malformed JSON', 'application/json', '{"from":', 400, 'malformed-json'],
    ['NaN, which is not JSON', 'application/json', '{"attitudes":[[NaN]]}', 400, 'malformed-json'],
    ['an empty body', 'application/json', '', 400, 'malformed-json'],
    ['a wrong content type', 'text/plain', '{}', 415, 'unsupported-media-type'],
  ])('%s', async (_what, type, text, status, code) => {
    const answer = await raw(type, text);
    expect([answer.status, answer.body.code]).toEqual([status, code]);
  });

  it('one larger than a body may be', async () => {
    const answer = await raw('application/json', `{"x":"${'a'.repeat(33 * 1024 * 1024)}"}`);
    expect([answer.status, answer.body.code]).toEqual([413, 'body-too-large']);
  });

  it('an encoding nobody knows', async () => {
    const answer = await service.call().post('/api/v1/convert').set('Authorization', `Bearer ${secret}`).set('Content-Type', 'application/json').set('Content-Encoding', 'zip').send('{}');
    expect([answer.status, answer.body.code]).toEqual([415, 'unsupported-encoding']);
  });
});
