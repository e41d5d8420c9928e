import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestService, type TestService } from '#tests/support/test-service.ts';

let service: TestService;
let secret: string;
beforeAll(async () => {
  service = await startTestService();
  ({ secret } = await service.key('engineer'));
});
afterAll(() => service.stop());

const post = (path: string, body: object) => service.call().post(`/api/v1${path}`).set('Authorization', `Bearer ${secret}`).send(body);
const EULER = { preset: 'aircraft-euler-deg' };

describe('POST /resolve', () => {
  it('resolves the weight of a banked aircraft in its body axes', async () => {
    const { status, body } = await post('/resolve', { attitude: EULER, from: 'reference', samples: [{ attitude: [77, 10, 20], vector: [0, 0, 9.80665] }] });
    expect(status).toBe(200);
    expect(body).toMatchObject({ from: 'reference', to: 'body', attitude: { representation: 'euler' } });
    for (const [k, each] of [-1.7029, 3.3032, 9.0752].entries()) expect(body.vectors[0][k]).toBeCloseTo(each, 3);
    expect(body.derivatives).toBeUndefined();
  });

  it('adds ω × v seen from outside, the angular velocity in any form', async () => {
    const sample = { attitude: [0, 0, 0], vector: [10, 0, 0], derivative: [1, 0, 0] };
    for (const [rate, numbers] of [[{ rate: 'body', unit: 'deg/s' }, [0, 0, 90]], [{ rate: 'euler', unit: 'rad/s' }, [Math.PI / 2, 0, 0]]] as const) {
      const { body } = await post('/resolve', { attitude: EULER, from: 'body', rate, samples: [{ ...sample, rate: numbers }] });
      expect(body.derivatives[0][0]).toBeCloseTo(1, 12);
      expect(body.derivatives[0][1]).toBeCloseTo(5 * Math.PI, 12);
    }
  });

  it.each<[string, object, string, string]>([
    ['a derivative without a rate stated', { samples: [{ attitude: [0, 0, 0], vector: [1, 2, 3], derivative: [1, 0, 0], rate: [1, 2, 3] }] }, 'invalid-field', '/samples/0'],
    ['a rate stated without derivatives', { rate: { rate: 'body', unit: 'deg/s' }, samples: [{ attitude: [0, 0, 0], vector: [1, 2, 3] }] }, 'invalid-field', '/samples/0'],
    ['a vector of two', { samples: [{ attitude: [0, 0, 0], vector: [1, 2] }] }, 'count-mismatch', '/samples/0/vector'],
    ['a vector that is not finite', { samples: [{ attitude: [0, 0, 0], vector: [1, null, 2] }] }, 'not-finite', '/samples/0/vector/1'],
    ['a vector too large to compute with', { samples: [{ attitude: [0, 0, 0], vector: [1, -1.7e308, 2] }] }, 'out-of-range', '/samples/0/vector/1'],
    ['no side', { from: 'wing', samples: [] }, 'invalid-field', '/from'],
    ['no samples', { samples: [] }, 'count-mismatch', '/samples'],
  ])('refuses %s', async (_what, change, code, pointer) => {
    const { status, body } = await post('/resolve', { attitude: EULER, from: 'body', ...change });
    expect([status, body.code, body.errors[0].pointer]).toEqual([422, code, pointer]);
  });
});

describe('POST /rigid-body', () => {
  const INERTIA = [[12875, 0, -1331], [0, 75674, 0], [-1331, 0, 85552]];
  const STATE = { velocity: [120, 3, 9], angularVelocity: [0.31, -0.12, 0.07], velocityDerivative: [0.4, -0.2, 1.1], angularVelocityDerivative: [0.4, -0.05, 0.02] };

  it('computes forces and moments, names the symmetry, and compares with those given', async () => {
    const { status, body } = await post('/rigid-body', { mass: 9300, inertia: INERTIA, symmetricAircraft: true, states: [STATE, { ...STATE, moment: [5000, -5000, 0] }] });
    expect(status).toBe(200);
    expect(body.forces[0][0]).toBeCloseTo(9300 * (0.4 - 0.12 * 9 - 0.07 * 3), 6);
    expect(body.inertia).toMatchObject({ symmetricAircraft: true });
    expect(body.inertia.statement).toContain('Ixy = Iyz = 0');
    expect(body.residuals[0]).toEqual({ force: null, moment: null });
    expect(body.residuals[1].moment[0]).toBeCloseTo(5000 - body.moments[1][0], 9);
  });

  it('stays within a double for the largest numbers it takes', async () => {
    const huge = [1e100, -1e100, 1e100];
    const { status, text } = await post('/rigid-body', { mass: 1e100, inertia: [[1e100, 0, 0], [0, 1e100, 0], [0, 0, 1e100]], states: [{ velocity: huge, angularVelocity: [-1e100, 1e100, 1e100], velocityDerivative: huge, angularVelocityDerivative: huge, force: huge, moment: huge }] });
    expect(status).toBe(200);
    expect(text).not.toContain('null');
  });

  it.each<[string, object, string, string]>([
    ['a matrix that is not symmetric', { inertia: [[12875, 0, -1331], [0, 75674, 0], [1331, 0, 85552]] }, 'impossible-inertia', '/inertia/2/0'],
    ['a matrix that is not positive definite', { inertia: [[1, 0, 2], [0, 5, 0], [2, 0, 1]] }, 'impossible-inertia', '/inertia'],
    ['principal moments that no body has', { inertia: [[1, 0, 0], [0, 1, 0], [0, 0, 3]] }, 'impossible-inertia', '/inertia'],
    ['a product Ixy where symmetry is asked for', { inertia: [[12875, -50, 0], [-50, 75674, 0], [0, 0, 85552]], symmetricAircraft: true }, 'impossible-inertia', '/inertia/0/1'],
    ['no mass', { mass: 0 }, 'invalid-field', '/mass'],
    ['a velocity too large to compute with', { states: [{ ...STATE, velocity: [1e308, 1, 1] }] }, 'invalid-field', '/states/0/velocity/0'],
  ])('refuses %s', async (_what, change, code, pointer) => {
    const { status, body } = await post('/rigid-body', { mass: 9300, inertia: INERTIA, states: [STATE], ...change });
    expect([status, body.code, body.errors[0].pointer]).toEqual([422, code, pointer]);
  });
});
