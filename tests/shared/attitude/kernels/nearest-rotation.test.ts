import { describe, expect, it } from 'vitest';
import { scratch } from '#shared/attitude/arithmetic/scratch.ts';
import { DOUBLES, QUATERNION } from '#shared/attitude/arithmetic/slots.ts';
import { nearestRotation } from '#shared/attitude/kernels/nearest-rotation.ts';
import { quaternionOfCleanMatrix } from '#shared/attitude/kernels/read-matrix.ts';
import { ExactAttitude } from '#tests/support/exact/attitude.ts';
import { fixedPointOf } from '#tests/support/exact/measure.ts';
import { Random } from '#tests/support/random.ts';

const f = fixedPointOf(300);
const exact = new ExactAttitude(f);
const random = new Random(11);

/** Largest difference from the quaternion of the polar factor, which is the nearest rotation (Higham 1986), after the same scaling. */
function error(elements: readonly number[]): number {
  const polar = exact.quaternionOf(exact.nearest([0, 3, 6].map((row) => elements.slice(row, row + 3).map((element) => f.of(element)))));
  const got = [0, 1, 2, 3].map((i) => f.of(scratch[QUATERNION + 2 * i]!) + f.of(scratch[QUATERNION + 2 * i + 1]!));
  const norm = f.sqrt(got.reduce((sum, component) => sum + f.square(component), 0n));
  const sign = got.reduce((sum, component, i) => sum + f.mul(component, polar[i]!), 0n) < 0n ? -1n : 1n;
  return Math.max(...got.map((component, i) => Math.abs(f.toDouble(sign * f.div(component, norm) - polar[i]!))));
}

function bent(by: number): number[] {
  const m = exact.matrixOf(random.rotation().map((component) => f.of(component)));
  return m.flat().map((element) => f.toDouble(element) + random.between(-by, by));
}

describe('nearestRotation', () => {
  it.each([1e-12, 1e-9, 1e-6, 1e-2, 0.3])('is the polar factor of matrices bent by %d', (by) => {
    for (let i = 0; i < 15; i++) {
      const elements = bent(by);
      scratch.set(elements, DOUBLES);
      nearestRotation();
      expect(error(elements)).toBeLessThan(1e-28);
    }
  });

  it('does not mind the scale', () => {
    const elements = bent(1e-3);
    for (const scale of [2 ** -500, 2 ** 400]) {
      scratch.set(elements.map((element) => element * scale), DOUBLES);
      nearestRotation();
      expect(error(elements)).toBeLessThan(1e-28);
    }
  });
});

describe('quaternionOfCleanMatrix', () => {
  it.each([[0, 1e-31], [1e-16, 1e-31], [1e-13, 1e-25]])('is the same to the square of a defect of %d', (by, bound) => {
    for (let i = 0; i < 30; i++) {
      const elements = bent(by);
      scratch.set(elements, DOUBLES);
      quaternionOfCleanMatrix();
      expect(error(elements)).toBeLessThan(bound);
    }
  });

  it.each([[[1, 0, 0, 0, 1, 0, 0, 0, 1]], [[1, 0, 0, 0, -1, 0, 0, 0, -1]], [[-1, 0, 0, 0, 1, 0, 0, 0, -1]], [[0, 0, 1, 1, 0, 0, 0, 1, 0]]])('is exact for %j', (elements) => {
    scratch.set(elements, DOUBLES);
    quaternionOfCleanMatrix();
    expect(error(elements)).toBeLessThan(1e-80);
  });
});
