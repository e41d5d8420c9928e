import { describe, expect, it } from 'vitest';
import { arcTangentDegrees, arcTangentRadians } from '#shared/attitude/arithmetic/arc-tangent.gen.ts';
import { quickArcTangentsDegrees, quickArcTangentsRadians } from '#shared/attitude/arithmetic/quick-arc-tangent.gen.ts';
import { scratch } from '#shared/attitude/arithmetic/scratch.ts';
import { ANGLES, POINTS } from '#shared/attitude/arithmetic/slots.ts';
import { split } from '#shared/attitude/arithmetic/two-product.ts';
import { BigNumber, exactly } from '#server/cross-check/big-number.ts';
import { fixedPointOf } from '#tests/support/exact/measure.ts';
import { Random } from '#tests/support/random.ts';

const f = fixedPointOf(400);
type ArcTangent = (at: number, to: number) => void;
type Point = readonly [yHigh: number, yLow: number, xHigh: number, xLow: number];

function angle(arcTangent: ArcTangent, point: Point): bigint {
  scratch.set(point, 0);
  arcTangent(0, 8);
  return f.of(scratch[8]!) + f.of(scratch[9]!);
}
/** The quick kernel takes three points at a time: here the one asked for, in each place by turns. */
let place = 0;
function quickAngle(arcTangents: () => void, point: Point): bigint {
  place = (place + 1) % 3;
  for (let i = 0; i < 3; i++) scratch.set(i === place ? point : [0.5, 0, -0.5, 0], POINTS + 4 * i);
  arcTangents();
  return f.of(scratch[ANGLES + 2 * place]!) + f.of(scratch[ANGLES + 2 * place + 1]!);
}
const exact = ([yh, yl, xh, xl]: Point): bigint => f.atan2(f.of(yh) + f.of(yl), f.of(xh) + f.of(xl));
const inDegrees = (radians: bigint): bigint => (radians * 180n * f.one) / f.pi;
const bits = (error: bigint, size = f.one): number => (error === 0n ? -Infinity : Math.log2(Math.abs(f.toDouble(f.div(error, size)))));

const random = new Random(7);
/** Points all around, on every table step and between, near both axes too. */
const points: Point[] = Array.from({ length: 1500 }, (_, i) => {
  const [y, x] = [random.between(-1, 1), random.between(-1, 1) * 10 ** -(i % 5 === 0 ? random.between(0, 15) : 0)];
  const low = (value: number) => value * 2 ** -54 * random.between(-1, 1);
  const point: Point = [y, low(y), x, low(x)];
  return i % 2 === 0 ? point : [point[2], point[3], point[0], point[1]];
});

describe('the arctangent of pairs', () => {
  it('is right to 2^-96 of a radian and to 2^-89 of itself', () => {
    let [absolute, relative, degrees] = [-Infinity, -Infinity, -Infinity];
    for (const point of points) {
      const wanted = exact(point);
      const error = angle(arcTangentRadians, point) - wanted;
      absolute = Math.max(absolute, bits(error));
      relative = Math.max(relative, bits(error, wanted));
      degrees = Math.max(degrees, bits(angle(arcTangentDegrees, point) - inDegrees(wanted), inDegrees(wanted)));
    }
    expect(absolute).toBeLessThan(-96);
    expect(relative).toBeLessThan(-89);
    expect(degrees).toBeLessThan(-89);
  });

  it.each([
    [0, 1, 0], [-0, 1, 0], [1, 1, 45], [1, 0, 90], [1, -0, 90], [1, -1, 135], [0, -1, 180], [-0, -1, 180], [-1, -1, -135], [-1, 0, -90], [-1, 1, -45],
    [2 ** -300, 2 ** -300, 45], [2 ** 300, -(2 ** 300), 135],
  ])('of (y %d, x %d) is exactly %d°', (y, x, wanted) => {
    angle(arcTangentDegrees, [y, 0, x, 0]);
    expect(scratch[8]! + 0).toBe(wanted);
    expect(scratch[9]! + 0).toBe(0);
  });

  it('keeps small angles to the last bit', () => {
    for (const y of [1e-300, 2 ** -500, 3e-200]) {
      angle(arcTangentRadians, [y, 0, 1, 0]);
      expect(scratch[8]! + scratch[9]!).toBe(y);
    }
  });

  it('agrees with mathjs at 64 digits', () => {
    for (const [y, , x] of points.slice(0, 40)) {
      angle(arcTangentRadians, [y, 0, x, 0]);
      expect(scratch[8]! + scratch[9]!).toBe(BigNumber.atan2(exactly(y), exactly(x)).toNumber());
    }
  });
});

describe('the quick arctangent', () => {
  it('stays within its bounds of 2^-70 rad and 2^-64°', () => {
    let [radians, degrees] = [-Infinity, -Infinity];
    for (const point of points) {
      const headed: Point = [split(point[0])[0], split(point[0])[1], split(point[2])[0], split(point[2])[1]];
      const wanted = exact(headed);
      radians = Math.max(radians, bits(quickAngle(quickArcTangentsRadians, headed) - wanted));
      degrees = Math.max(degrees, bits(quickAngle(quickArcTangentsDegrees, headed) - inDegrees(wanted)));
    }
    expect(radians).toBeLessThan(-70);
    expect(degrees).toBeLessThan(-64);
  });

  it.each([[0, -1e-12], [0, 1e-12]])('goes by the tail for the sign where the head is %d and the tail %d', (head, tail) => {
    for (let i = 0; i < 3; i++) {
      const degrees = f.toDouble(quickAngle(quickArcTangentsDegrees, [head, tail, -1, 0]));
      expect(Math.abs(degrees)).toBeLessThanOrEqual(180);
      expect(Math.sign(degrees)).toBe(Math.sign(tail));
    }
  });
});
