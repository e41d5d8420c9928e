import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createConverter } from '#shared/attitude/converter.ts';
import type { Convention } from '#shared/attitude/convention.ts';
import { PRESETS } from '#shared/attitude/presets.ts';
import { startTestService, type TestService } from '#tests/support/test-service.ts';

let service: TestService;
let secret: string;
beforeAll(async () => {
  service = await startTestService();
  ({ secret } = await service.key('integrator'));
});
afterAll(() => service.stop());

const post = (path: string, body: object) => service.call().post(`/api/v1${path}`).set('Authorization', `Bearer ${secret}`).send(body);
const preset = (id: string): Convention => PRESETS.find((each) => each.id === id)!.convention;
const EULER = { preset: 'aircraft-euler-deg' };

/** A sortie's worth of attitudes that repeat nothing. */
const ATTITUDES = Array.from({ length: 60 }, (_, i) => [((i * 37) % 360) - 180 + 0.5, 35 * Math.sin(i / 7), 50 * Math.sin(i / 5 + 1)]);
function rowsOf(convention: Convention, attitudes: readonly (readonly number[])[] = ATTITUDES): number[][] {
  const numbers = createConverter(preset('aircraft-euler-deg'), convention).convert(Float64Array.from(attitudes.flat()));
  const width = numbers.length / attitudes.length;
  return attitudes.map((_, i) => [...numbers.subarray(i * width, (i + 1) * width)]);
}
const question = (observed: object, more: object = {}) => ({ reference: { convention: EULER, attitudes: ATTITUDES }, observed, noise: { angle: 0, unit: 'deg' }, ...more });

describe('POST /identify', () => {
  it('names a slip of the scalar, with every facet of the convention and what else says the same', async () => {
    const { status, body } = await post('/identify', question({ representation: 'quaternion', numbers: rowsOf({ ...preset('aircraft-quaternion'), scalar: 'last' } as Convention), stated: { preset: 'aircraft-quaternion' } }));
    expect(status).toBe(200);
    expect([body.outcome, body.remaining]).toEqual(['unique', 1]);
    expect(body.explanations[0]).toMatchObject({ convention: { representation: 'quaternion', scalar: 'last', reference: 'NED', body: 'FRD' }, edits: ['reads scalar last, stated scalar first'], residual: { unit: 'deg' } });
    expect(body.explanations[0].residual.rms).toBeLessThan(1e-5);
    expect(body.explanations[0].sameNumbersAs.length).toBeGreaterThan(0);
    expect(body.runnerUp.timesNoise).toBeGreaterThan(10);
  });

  it('takes matrices as rows of three, and finds a transpose', async () => {
    const numbers = rowsOf({ ...preset('aircraft-dcm'), layout: 'column-major' } as Convention).map((row) => [row.slice(0, 3), row.slice(3, 6), row.slice(6, 9)]);
    const { body } = await post('/identify', question({ representation: 'dcm', numbers, stated: { preset: 'aircraft-dcm' } }));
    expect([body.outcome, body.explanations[0].edits.length]).toEqual(['unique', 1]);
  });

  it('says what the data leave open, and which attitude would tell', async () => {
    const level = [[0, 0, 0], [0, 0, 0]];
    const { body } = await post('/identify', { reference: { convention: EULER, attitudes: level }, observed: { representation: 'euler', numbers: level, stated: EULER }, noise: { angle: 0, unit: 'deg' } });
    expect(body.outcome).toBe('ambiguous');
    expect(body.explanations.length).toBeLessThanOrEqual(100);
    expect(body.remaining).toBeGreaterThan(100);
    expect(body.unobservable.join(' ')).toContain('Only one attitude');
    expect(body.discriminating[0].attitude).toHaveLength(3);
  });

  it('is metered and recorded like every computation', async () => {
    await post('/identify', question({ representation: 'euler', numbers: ATTITUDES, stated: EULER })).expect(200);
    const { body: history } = await service.call().get('/api/v1/history').set('Authorization', `Bearer ${secret}`);
    expect(history.items[0]).toMatchObject({ route: '/api/v1/identify', status: 200, attitudes: 60 });
  });

  it.each<[string, object, string, string]>([
    ['rows that are short of the reference', question({ representation: 'euler', numbers: ATTITUDES.slice(1) }), 'count-mismatch', '/observed/numbers'],
    ['rows of five numbers', question({ representation: 'euler', numbers: ATTITUDES.map(() => [1, 2, 3, 4, 5]) }), 'count-mismatch', '/observed/numbers/0'],
    ['a row that is not like the first', question({ representation: 'euler', numbers: [...ATTITUDES.slice(1), [1, 2, 3, 4]] }), 'count-mismatch', '/observed/numbers/59'],
    ['times that stand still', question({ representation: 'euler', numbers: ATTITUDES }, { times: ATTITUDES.map(() => 1) }), 'invalid-field', '/times/1'],
    ['too few times', question({ representation: 'euler', numbers: ATTITUDES }, { times: [1, 2] }), 'count-mismatch', '/times'],
    ['negative noise', question({ representation: 'euler', numbers: ATTITUDES }, { noise: { angle: -1, unit: 'deg' } }), 'invalid-field', '/noise/angle'],
    ['frames that cannot be related', question({ representation: 'quaternion', numbers: rowsOf(preset('aircraft-quaternion')), stated: { ...preset('aircraft-quaternion'), reference: 'ECEF' } }), 'unrelated-frames', '/observed/stated/reference'],
    ['a reference that is no rotation', { reference: { convention: { preset: 'aircraft-quaternion' }, attitudes: [[2, 0, 0, 0]] }, observed: { representation: 'euler', numbers: [[1, 2, 3]] }, noise: { angle: 0, unit: 'deg' } }, 'not-a-rotation', '/reference/attitudes/0'],
  ])('refuses %s', async (_what, sent, code, pointer) => {
    const { status, body } = await post('/identify', sent);
    expect([status, body.code]).toEqual([422, code]);
    expect(body.errors[0].pointer).toBe(pointer);
  });
});

describe('POST /identify with rates', () => {
  const times = Array.from({ length: 200 }, (_, i) => i / 50);
  const attitudes = times.map((t) => [40 * t, 25 * Math.sin(t), 35 * Math.sin(0.7 * t + 1)]);
  /** ψ̇, θ̇, φ̇ of the same, °/s. */
  const angleRates = times.map((t) => [40, 25 * Math.cos(t), 24.5 * Math.cos(0.7 * t + 1)]);
  const stated = { attitude: EULER, rate: { rate: 'body', unit: 'deg/s' } };
  const rates = (observed: object, more: object = {}) => post('/identify', { reference: { convention: EULER, attitudes }, observed, times, noise: { angle: 0, unit: 'deg', rate: 0.001, rateUnit: 'deg/s' }, ...more });

  it('tells Euler rates from body rates', async () => {
    const { status, body } = await rates({ rates: angleRates, stated });
    expect(status).toBe(200);
    expect([body.outcome, body.remaining]).toEqual(['unique', 1]);
    expect(body.explanations[0]).toMatchObject({ attitude: { representation: 'euler' }, rate: { rate: 'euler', unit: 'deg/s', angles: { sequence: 'ZYX' } }, edits: ['reads rates of Euler angles, stated the angular velocity in body axes'], residual: { unit: 'deg/s' } });
  });

  it.each<[string, object, object, string, string]>([
    ['rates without times', { rates: angleRates, stated }, { times: undefined }, 'missing-field', '/times'],
    ['noise of rates without its unit', { rates: angleRates, stated }, { noise: { angle: 0, unit: 'deg', rate: 1 } }, 'missing-field', '/noise/rateUnit'],
    ['rates without what was stated', { rates: angleRates }, {}, 'missing-field', '/observed/stated'],
    ['rates that are short', { rates: angleRates.slice(1), stated }, {}, 'count-mismatch', '/observed/rates'],
    ['an unknown field', { rates: angleRates, stated, representation: 'euler' }, {}, 'unknown-field', '/observed/representation'],
    ['an unknown field beside numbers', { representation: 'euler', numbers: attitudes, claimed: 1 }, {}, 'unknown-field', '/observed/claimed'],
    ['a rate that does not fit its attitude', { rates: angleRates, stated: { attitude: EULER, rate: { rate: 'dcm' } } }, {}, 'invalid-facet', '/observed/stated/rate/rate'],
  ])('refuses %s', async (_what, observed, more, code, pointer) => {
    const { status, body } = await rates(observed, more);
    expect([status, body.code]).toEqual([422, code]);
    expect(body.errors[0].pointer).toBe(pointer);
  });
});

describe('POST /verify with diagnose', () => {
  const verification = (numbers: number[][], more: object = {}) => ({
    expected: { convention: EULER, attitudes: ATTITUDES }, actual: { convention: { preset: 'aircraft-dcm' }, attitudes: numbers }, tolerance: { angle: 0.1, unit: 'deg' }, diagnose: true, label: 'Hull unit', ...more,
  });

  it('names the mistake where the verdict is fail, in the answer, in the run and in its JUnit report', async () => {
    const { body } = await post('/verify', verification(rowsOf({ ...preset('aircraft-dcm'), maps: 'body-to-reference' } as Convention)));
    expect(body.verdict).toBe('fail');
    expect(body.diagnosis).toMatchObject({ outcome: 'unique', remaining: 1 });
    const [edit] = body.diagnosis.explanations[0].edits;
    expect(edit).toMatch(/reads (body-to-reference|column-major)/);
    const { body: run } = await service.call().get(`/api/v1/runs/${body.run}`).set('Authorization', `Bearer ${secret}`);
    expect(run.diagnosis).toEqual(body.diagnosis);
    const { text } = await service.call().get(`/api/v1/runs/${body.run}.junit.xml`).set('Authorization', `Bearer ${secret}`);
    expect(text).toContain(`Explained by: ${edit}.`);
  });

  it('says nothing of a pass, and nothing unasked', async () => {
    const { body } = await post('/verify', verification(rowsOf(preset('aircraft-dcm'))));
    expect([body.verdict, body.diagnosis]).toEqual(['pass', undefined]);
    const { body: unasked } = await post('/verify', verification(rowsOf({ ...preset('aircraft-dcm'), maps: 'body-to-reference' } as Convention), { diagnose: false }));
    expect([unasked.verdict, unasked.diagnosis]).toEqual(['fail', undefined]);
  });

  it('finds a lag where times are given', async () => {
    const rate = 20;
    const at = (t: number) => [20 * t, 20 * Math.sin(t), 30 * Math.sin(0.7 * t)];
    const times = Array.from({ length: 200 }, (_, i) => i / rate);
    const { body } = await post('/verify', {
      expected: { convention: EULER, attitudes: times.map(at) }, actual: { convention: EULER, attitudes: times.map((t) => at(t - 0.04)) }, tolerance: { angle: 0.1, unit: 'deg' }, diagnose: true, times,
    });
    expect(body.diagnosis.outcome).toBe('unique');
    expect(body.diagnosis.explanations[0].timeLag.seconds).toBeCloseTo(0.04, 3);
  });
});
