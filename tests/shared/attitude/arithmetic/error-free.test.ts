import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { split, twoProduct } from '#shared/attitude/arithmetic/two-product.ts';
import { fastTwoSum, twoSum } from '#shared/attitude/arithmetic/two-sum.ts';
import { fixedPointOf } from '#tests/support/exact/measure.ts';

const f = fixedPointOf(2200);
const anyDouble = fc.double({ noNaN: true, noDefaultInfinity: true });
const within = (low: number, high: number) => anyDouble.filter((x) => x === 0 || (Math.abs(x) >= low && Math.abs(x) <= high));
/** Doubles whose bits are near one another, so that sums cancel. */
const close = fc.tuple(fc.integer({ min: -9, max: 9 }), fc.integer({ min: -60, max: 60 })).map(([n, e]) => n * 2 ** e);

describe('twoSum', () => {
  it('is exact for all finite doubles whose sum is finite', () => {
    fc.assert(fc.property(fc.oneof(anyDouble, close), fc.oneof(anyDouble, close), (a, b) => {
      fc.pre(Math.abs(a) < 2 ** 1022 && Math.abs(b) < 2 ** 1022);
      const [sum, error] = twoSum(a, b);
      expect(sum).toBe(a + b);
      expect(f.of(sum) + f.of(error)).toBe(f.of(a) + f.of(b));
    }), { numRuns: 3000, seed: 1 });
  });

  it.each([[1, 2 ** -53], [1, -(2 ** -54)], [0, 0], [0, -0], [5e-324, -5e-324], [1e16, 1], [-1, 1 + 2 ** -52], [2 ** 52, 0.5]])('of %d and %d', (a, b) => {
    const [sum, error] = twoSum(a, b);
    expect(f.of(sum) + f.of(error)).toBe(f.of(a) + f.of(b));
  });
});

describe('fastTwoSum', () => {
  it('is exact where the first is not the smaller, or is 0', () => {
    fc.assert(fc.property(fc.oneof(anyDouble, close), fc.oneof(anyDouble, close), (a, b) => {
      fc.pre(Math.abs(a) < 2 ** 1022 && Math.abs(b) < 2 ** 1022);
      const [first, second] = Math.abs(a) >= Math.abs(b) ? [a, b] : [b, a];
      const [sum, error] = fastTwoSum(first, second);
      expect(f.of(sum) + f.of(error)).toBe(f.of(a) + f.of(b));
    }), { numRuns: 3000, seed: 2 });
    expect(fastTwoSum(0, 7)).toEqual([7, 0]);
  });
});

describe('split', () => {
  it('cuts a double into two of at most 26 bits', () => {
    fc.assert(fc.property(within(2 ** -900, 2 ** 990).filter((x) => x !== 0), (a) => {
      const [high, low] = split(a);
      expect(high + low).toBe(a);
      // Products of 26 bits are exact: squaring shows the width.
      for (const part of [high, low]) {
        const scaled = part === 0 ? 0 : part / 2 ** Math.floor(Math.log2(Math.abs(part)));
        expect(Math.abs(scaled * 2 ** 25 % 1)).toBe(0);
      }
      expect(Math.abs(low)).toBeLessThanOrEqual(Math.abs(high) * 2 ** -26);
    }), { numRuns: 3000, seed: 3 });
  });
});

describe('twoProduct', () => {
  it('is exact for factors below 2^996 and products that are 0 or not below 2^-969', () => {
    fc.assert(fc.property(within(2 ** -480, 2 ** 500), within(2 ** -480, 2 ** 500), (a, b) => {
      const [product, error] = twoProduct(a, b);
      expect(product).toBe(a * b);
      expect((f.of(product) + f.of(error)) << f.bits).toBe(f.of(a) * f.of(b));
    }), { numRuns: 3000, seed: 4 });
  });

  it.each([
    [2 ** 995, 1 + 2 ** -52], [2 ** -969, 1 - 2 ** -53], [1 + 2 ** -52, 1 + 2 ** -52], [1 - 2 ** -53, 1 + 2 ** -52],
    [134217729, 134217727], [0, 3], [-0, 3], [0.1, 0.1], [1 + 2 ** -26, 1 - 2 ** -26],
  ])('of %d and %d', (a, b) => {
    const [product, error] = twoProduct(a, b);
    expect((f.of(product) + f.of(error)) << f.bits).toBe(f.of(a) * f.of(b));
  });

  it('is out of range from 2^997 on, which is why inputs are scaled', () => expect(twoProduct(2 ** 997, 1)[1]).toBeNaN());
});
