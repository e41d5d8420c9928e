import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { createConverter } from '#shared/attitude/converter.ts';
import { compose } from '#shared/attitude/rotations/compose.ts';
import { errorRotation } from '#shared/attitude/rotations/error-rotation.ts';
import { inverse } from '#shared/attitude/rotations/inverse.ts';
import { nearestRotation } from '#shared/attitude/rotations/nearest-rotation.ts';
import { normalise } from '#shared/attitude/rotations/normalise.ts';
import { relative } from '#shared/attitude/rotations/relative.ts';
import { anyRotation, EULER_DEG, QUATERNION } from '#tests/support/conventions.ts';

const distance = (a: ArrayLike<number>, b: ArrayLike<number>) => Math.max(...Array.from(a, (value, i) => Math.abs(value - b[i]!)));
const same = (a: readonly number[], b: readonly number[]) => Math.min(distance(a, b), distance(a, b.map((value) => -value)));
const ofAngles = (...angles: number[]) => Array.from(createConverter(EULER_DEG, QUATERNION).convert(Float64Array.from(angles))) as [number, number, number, number];

describe('the rotation group', () => {
  it('is associative, has inverses and a neutral element', () => {
    fc.assert(fc.property(anyRotation, anyRotation, anyRotation, (a, b, c) => {
      expect(distance(compose(compose(a, b), c), compose(a, compose(b, c)))).toBeLessThan(1e-15);
      expect(distance(compose(a, inverse(a)), [1, 0, 0, 0])).toBeLessThan(1e-15);
      expect(distance(compose(a, [1, 0, 0, 0]), a)).toBe(0);
      expect(distance(inverse(compose(a, b)), compose(inverse(b), inverse(a)))).toBeLessThan(1e-15);
    }), { numRuns: 300, seed: 7 });
  });

  it('composes yaw, pitch and roll into the attitude', () => {
    expect(same(compose(compose(ofAngles(30, 0, 0), ofAngles(0, 10, 0)), ofAngles(0, 0, 20)), ofAngles(30, 10, 20))).toBeLessThan(3e-16);
  });

  it('relates two bodies: a camera pitched down on an aircraft with a heading', () => {
    expect(same(relative(ofAngles(30, 0, 0), ofAngles(30, -40, 0)), ofAngles(0, -40, 0))).toBeLessThan(3e-16);
  });
});

describe('errorRotation', () => {
  it('finds an injected error with its axis, from 1e-12 rad to π', () => {
    fc.assert(fc.property(anyRotation, anyRotation, fc.double({ min: -12, max: 0.49, noNaN: true }), (q, direction, exponent) => {
      const angle = 10 ** exponent;
      const length = Math.hypot(direction[1], direction[2], direction[3]);
      fc.pre(length > 0.1);
      const axis = [direction[1] / length, direction[2] / length, direction[3] / length] as const;
      const [s, c] = [Math.sin(angle / 2), Math.cos(angle / 2)];
      const error = errorRotation(q, compose(q, [c, axis[0] * s, axis[1] * s, axis[2] * s]));
      expect(Math.abs(error.angle - angle)).toBeLessThan(1e-15);
      expect(distance(error.axis, axis)).toBeLessThan(2e-15 / angle + 1e-15);
    }), { numRuns: 500, seed: 8 });
  });
  it('does not depend on the sign of either quaternion, nor on the order but for the axis', () => {
    fc.assert(fc.property(fc.noBias(anyRotation), fc.noBias(anyRotation), (a, b) => {
      const { angle, axis } = errorRotation(a, b);
      fc.pre(angle < 3.1 && angle > 0.01);
      const negated = errorRotation(a, b.map((value) => -value) as typeof b);
      expect(negated.angle).toBeCloseTo(angle, 14);
      expect(distance(negated.axis, axis)).toBeLessThan(1e-12);
      expect(errorRotation(b, a).angle).toBeCloseTo(angle, 14);
      expect(distance(errorRotation(b, a).axis.map((value) => -value), axis)).toBeLessThan(1e-12);
    }), { numRuns: 200, seed: 9 });
  });
  it('is exactly zero for the same attitude', () => expect(errorRotation([1, 0, 0, 0], [1, 0, 0, 0])).toEqual({ angle: 0, axis: [1, 0, 0] }));
});

describe('normalise and nearestRotation', () => {
  it.each([1e-300, 1e-150, 1, 1e150, 1e300])('take any norm: %d', (scale) => {
    expect(distance(normalise([0.5 * scale, -0.5 * scale, 0.5 * scale, 0.5 * scale]), [0.5, -0.5, 0.5, 0.5])).toBeLessThan(1.2e-16);
  });
  it('refuse what has no direction', () => {
    expect(() => normalise([0, 0, 0, 0])).toThrow(expect.objectContaining({ code: 'zero-norm' }));
    expect(() => normalise([NaN, 0, 0, 1])).toThrow(expect.objectContaining({ code: 'not-finite' }));
    expect(() => nearestRotation(Float64Array.of(1, 0, 0, 0, 1, 0, 0, 0, -1))).toThrow(expect.objectContaining({ code: 'not-a-rotation' }));
  });
  it('find the polar factor of a sheared matrix', () => {
    // [[1, e], [0, 1]]: the rotation by atan(e/2). Source: Higham 1986, SIAM J. Sci. Stat. Comput. 7(4), the 2 × 2 polar factor.
    const angle = Math.atan(0.2);
    expect(distance(nearestRotation(Float64Array.of(1, 0.4, 0, 0, 1, 0, 0, 0, 1)), [Math.cos(angle), Math.sin(angle), 0, -Math.sin(angle), Math.cos(angle), 0, 0, 0, 1])).toBeLessThan(2e-16);
  });
});
