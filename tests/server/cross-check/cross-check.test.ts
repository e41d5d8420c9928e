import fc from 'fast-check';
import { afterAll, describe, expect, it } from 'vitest';
import type { Convention } from '#shared/attitude/convention.ts';
import { createConverter } from '#shared/attitude/converter.ts';
import { crossCheck } from '#server/cross-check/cross-check.ts';
import { CrossChecker } from '#server/cross-check/cross-checker.ts';
import { crossChecked } from '#server/domain/attitude/cross-checked.ts';
import { exactly, ulpsBetween } from '#server/cross-check/big-number.ts';
import { anyConvention, anyRotation, DCM, EULER_DEG, QUATERNION } from '#tests/support/conventions.ts';

const answered = (from: Convention, to: Convention, ...numbers: number[]) => {
  const input = Float64Array.from(numbers);
  return { from, to, input, output: createConverter(from, to).convert(input) };
};

describe('exactly', () => {
  it.each([1, 0.1, -1e-300, 5e-324, 1.7976931348623157e308, 2 ** -1074 * 3])('takes %d at its exact value', (double) => {
    expect(exactly(double).toNumber()).toBe(double);
    expect(ulpsBetween(double, exactly(double))).toBe(0);
  });
  it('is not the shortest decimal', () => expect(exactly(0.1).toString()).toBe('0.1000000000000000055511151231257827021181583404541015625'));
});

describe('crossCheck', () => {
  it('agrees with the core on every pair of conventions, to half a unit in the last place', () => {
    // Components of attitudes in general position; cancelled ones and those at gimbal lock are the accuracy program's.
    const general = fc.noBias(anyRotation).filter((q) => q.every((component) => Math.abs(component) > 1e-3));
    let compared = 0;
    fc.assert(fc.property(fc.noBias(anyConvention), fc.noBias(anyConvention), general, (from, to, q) => {
      const { input, output } = { ...answered(from, to, ...createConverter(QUATERNION, from).convert(Float64Array.from(q))) };
      const { maxUlp, maxAngleRad, methods } = crossCheck({ from, to, input, output });
      expect(maxUlp).toBeLessThanOrEqual(0.501);
      expect(maxAngleRad).toBeLessThan(5.5e-16);
      expect(methods[1]!.maxAngleRad).toBeLessThan(1e-14);
      compared++;
    }), { numRuns: 400, seed: 12 });
    expect(compared).toBe(400);
  }, 30_000);

  it('finds a component that is off by one unit in its last place', () => {
    const request = answered(EULER_DEG, QUATERNION, 30, 10, 20);
    request.output[2]! += 2 ** -56;
    const { maxUlp } = crossCheck(request);
    expect(maxUlp).toBeGreaterThan(0.5);
    expect(maxUlp).toBeLessThan(1.51);
  });

  it('finds a transposed answer by both methods', () => {
    const request = answered(EULER_DEG, DCM, 30, 10, 20);
    const m = request.output;
    const transposed = Float64Array.of(m[0]!, m[3]!, m[6]!, m[1]!, m[4]!, m[7]!, m[2]!, m[5]!, m[8]!);
    for (const { maxAngleRad } of crossCheck({ ...request, output: transposed }).methods) expect(maxAngleRad).toBeGreaterThan(0.5);
  });

  it('compares attitudes only at gimbal lock, where any split of the angles is right', () => {
    const { maxUlp, maxAngleRad } = crossCheck(answered(EULER_DEG, EULER_DEG, 30, 90, 20));
    expect(maxUlp).toBe(0);
    expect(maxAngleRad).toBeLessThan(1e-30);
  });
});

describe('the cross-check of an answer', () => {
  const checker = new CrossChecker();
  afterAll(() => checker.close());

  it('runs in a thread of its own', async () => {
    const checks = await Promise.all([30, 40, 50].map((yaw) => checker.check(answered(EULER_DEG, QUATERNION, yaw, 10, 20))));
    for (const { maxUlp } of checks) expect(maxUlp).toBeLessThanOrEqual(0.501);
  }, 20_000);

  it('refuses to give an answer that its recomputation contradicts', async () => {
    const request = answered(EULER_DEG, QUATERNION, 30, 10, 20);
    request.output[1]! += 1e-12;
    await expect(crossChecked({ check: async (asked) => crossCheck(asked) }, request)).rejects.toMatchObject({ code: 'cross-check-failed' });
  });
});
