import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestService, type TestService } from '#tests/support/test-service.ts';

let service: TestService;
let secret: string;
beforeAll(async () => {
  service = await startTestService();
  ({ secret } = await service.key('engineer'));
});
afterAll(() => service.stop());

const rates = (body: object) => service.call().post('/api/v1/rates').set('Authorization', `Bearer ${secret}`).send(body);
const DEG = { preset: 'aircraft-euler-deg' };
const BODY = { rate: 'body', unit: 'deg/s' };
const EULER = { rate: 'euler', unit: 'deg/s' };

describe('POST /rates', () => {
  it('answers the level-turn case: a field called yaw speed that holds r is not the Euler rate', async () => {
    // Source: tests/reference, case level-turn-rates: 35° bank, ψ̇ = 9°/s, so q = 5.162 and r = 7.372°/s.
    const { status, body } = await rates({ attitude: DEG, from: EULER, to: BODY, samples: [{ attitude: [0, 0, 35], rate: [9, 0, 0] }] });
    expect(status).toBe(200);
    for (const [i, rate] of [0, 5.162187927159414, 7.372368398600926].entries()) expect(body.rates[0][i]).toBeCloseTo(rate, 9);
    expect(body.conditions).toEqual([1]);
    expect(body.from).toMatchObject({ rate: 'euler', unit: 'deg/s', angles: { representation: 'euler', sequence: 'ZYX' } });
  });

  it('at lock gives null for the rates that do not exist, the middle one still, and the warning', async () => {
    const { body } = await rates({ attitude: DEG, from: BODY, to: EULER, samples: [{ attitude: [10, 90, 0], rate: [1, 2, 3] }] });
    expect(body.rates[0][0]).toBeNull();
    expect(body.rates[0][1]).toBeCloseTo(2, 12);
    expect(body.rates[0][2]).toBeNull();
    expect(body.conditions).toEqual([null]);
    expect(body.warnings[0]).toMatchObject({ code: 'gimbal-lock', indices: [0] });
  });

  it('takes quaternion rates of a quaternion, and Euler rates with their angles named', async () => {
    const { body } = await rates({ attitude: { preset: 'aircraft-quaternion' }, from: { rate: 'quaternion' }, to: { ...EULER, angles: DEG }, samples: [{ attitude: [1, 0, 0, 0], rate: [0, 0, 0, 0.5] }] });
    expect(body.rates[0][0]).toBeCloseTo(180 / Math.PI, 12);
  });

  it.each<[string, object, string, string]>([
    ['Euler rates beside a quaternion without their angles', { attitude: { preset: 'aircraft-quaternion' }, from: EULER, to: BODY, samples: [{ attitude: [1, 0, 0, 0], rate: [1, 2, 3] }] }, 'missing-facet', '/from/angles'],
    ['angles that are none', { attitude: DEG, from: { ...EULER, angles: { preset: 'aircraft-dcm' } }, to: BODY, samples: [{ attitude: [1, 0, 0], rate: [1, 2, 3] }] }, 'invalid-facet', '/from/angles'],
    ['matrix rates beside angles', { attitude: DEG, from: BODY, to: { rate: 'dcm' }, samples: [{ attitude: [1, 0, 0], rate: [1, 2, 3] }] }, 'invalid-facet', '/to/rate'],
    ['a rate without its unit', { attitude: DEG, from: { rate: 'body' }, to: BODY, samples: [{ attitude: [1, 0, 0], rate: [1, 2, 3] }] }, 'missing-field', '/from/unit'],
    ['a sample that is none', { attitude: DEG, from: BODY, to: EULER, samples: [{ attitude: [1, 0, 0] }] }, 'invalid-field', '/samples/0'],
    ['a rate with a number too few', { attitude: DEG, from: BODY, to: EULER, samples: [{ attitude: [1, 0, 0], rate: [1, 2] }] }, 'count-mismatch', '/samples/0/rate'],
    ['a number that is none', { attitude: DEG, from: BODY, to: EULER, samples: [{ attitude: [1, 0, 0], rate: [1, null, 2] }] }, 'not-finite', '/samples/0/rate/1'],
    ['a rate too large to compute with', { attitude: DEG, from: BODY, to: EULER, samples: [{ attitude: [1, 0, 0], rate: [1, 1e101, 2] }] }, 'out-of-range', '/samples/0/rate/1'],
    ['no rotation', { attitude: { preset: 'aircraft-quaternion' }, from: BODY, to: BODY, samples: [{ attitude: [2, 0, 0, 0], rate: [1, 2, 3] }] }, 'not-a-rotation', '/samples/0'],
  ])('refuses %s', async (_what, sent, code, pointer) => {
    const { status, body } = await rates(sent);
    expect([status, body.code]).toEqual([422, code]);
    expect(body.errors[0].pointer).toBe(pointer);
  });
});
