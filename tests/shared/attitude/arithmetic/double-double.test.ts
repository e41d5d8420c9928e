import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { add, divide, exact, multiply, squareRoot, subtract, type DoubleDouble } from '#shared/attitude/arithmetic/double-double.ts';
import { twoSum } from '#shared/attitude/arithmetic/two-sum.ts';
import { fixedPointOf } from '#tests/support/exact/measure.ts';

const f = fixedPointOf(600);
const value = ([hi, lo]: DoubleDouble): bigint => f.of(hi) + f.of(lo);
const unit = fc.integer({ min: -(2 ** 53) + 1, max: 2 ** 53 - 1 }).map((n) => n * 2 ** -53);
const anyPair: fc.Arbitrary<DoubleDouble> = fc.tuple(unit, unit, fc.integer({ min: -40, max: 40 })).map(([a, b, e]) => twoSum(a * 2 ** e, b * 2 ** (e - 53)));

/** |got − wanted| as a share of `size`, in units of 2^-106. */
const errorOf = (got: DoubleDouble, wanted: bigint, size: bigint): number => (size === 0n ? Number(value(got) - wanted) : f.toDouble(f.div(value(got) - wanted, size)) * 2 ** 106);
const magnitude = (x: bigint): bigint => (x < 0n ? -x : x);

// Bounds: Joldes, Muller & Popescu 2017, ACM TOMS 44(2), theorems 3.1, 5.1 and 6.1 and corollaries; ours are rounded up.
describe('double-double', () => {
  it('adds within 3 units of 2^-106', () => {
    fc.assert(fc.property(anyPair, anyPair, (x, y) => {
      const wanted = value(x) + value(y);
      expect(Math.abs(errorOf(add(x, y), wanted, magnitude(wanted)))).toBeLessThanOrEqual(3.01);
      const difference = value(x) - value(y);
      expect(Math.abs(errorOf(subtract(x, y), difference, magnitude(difference)))).toBeLessThanOrEqual(3.01);
    }), { numRuns: 3000, seed: 1 });
  });

  it('multiplies within 7', () => {
    fc.assert(fc.property(anyPair, anyPair, (x, y) => {
      const wanted = f.mul(value(x), value(y));
      expect(Math.abs(errorOf(multiply(x, y), wanted, magnitude(wanted)))).toBeLessThanOrEqual(7);
    }), { numRuns: 3000, seed: 2 });
  });

  it('divides within 15', () => {
    fc.assert(fc.property(anyPair, anyPair.filter(([hi]) => hi !== 0), (x, y) => {
      const wanted = f.div(value(x), value(y));
      expect(Math.abs(errorOf(divide(x, y), wanted, magnitude(wanted)))).toBeLessThanOrEqual(15);
    }), { numRuns: 3000, seed: 3 });
  });

  it('takes roots within 8', () => {
    fc.assert(fc.property(anyPair.map(([hi, lo]): DoubleDouble => (hi < 0 ? [-hi, -lo] : [hi, lo])), (x) => {
      const wanted = f.sqrt(value(x));
      expect(Math.abs(errorOf(squareRoot(x), wanted, wanted))).toBeLessThanOrEqual(8);
    }), { numRuns: 3000, seed: 4 });
  });

  it('keeps exact results exact', () => {
    expect(squareRoot(exact(0))).toEqual([0, 0]);
    expect(squareRoot(exact(2.25))).toEqual([1.5, 0]);
    expect(divide(exact(1), exact(4))).toEqual([0.25, 0]);
    expect(subtract([1, 2 ** -60], [1, 2 ** -60])).toEqual([0, 0]);
    expect(multiply([3, 0], [1 / 4, 0])).toEqual([0.75, 0]);
  });
});
