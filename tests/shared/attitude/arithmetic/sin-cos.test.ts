import { describe, expect, it } from 'vitest';
import { quickSinCosDegrees, quickSinCosRadians } from '#shared/attitude/arithmetic/quick-sin-cos.gen.ts';
import { scratch } from '#shared/attitude/arithmetic/scratch.ts';
import { sinCosDegrees, sinCosRadians } from '#shared/attitude/arithmetic/sin-cos.gen.ts';
import { BigNumber, exactly, PI } from '#server/cross-check/big-number.ts';
import { fixedPointOf } from '#tests/support/exact/measure.ts';
import { Random } from '#tests/support/random.ts';

const f = fixedPointOf(1400);
type SinCos = (at: number, to: number) => void;

function at(sinCos: SinCos, hi: number, lo = 0): { sine: bigint; cosine: bigint; sineDouble: number; cosineDouble: number } {
  scratch[0] = hi;
  scratch[1] = lo;
  sinCos(0, 4);
  return {
    sine: f.of(scratch[4]!) + f.of(scratch[5]!), cosine: f.of(scratch[6]!) + f.of(scratch[7]!),
    sineDouble: scratch[4]! + scratch[5]! + 0, cosineDouble: scratch[6]! + scratch[7]! + 0,
  };
}

const radiansOf = (degrees: number): bigint => ((f.of(degrees) % (360n * f.one)) * f.pi) / (180n * f.one);
const bits = (error: bigint, size = f.one): number => (error === 0n ? -Infinity : Math.log2(Math.abs(f.toDouble(f.div(error, size)))));

function worst(sinCos: SinCos, angles: readonly number[], inRadians: (angle: number) => bigint): { absolute: number; relative: number } {
  let [absolute, relative] = [-Infinity, -Infinity];
  for (const angle of angles) {
    const [s, c] = f.sinCos(inRadians(angle));
    const got = at(sinCos, angle);
    absolute = Math.max(absolute, bits(got.sine - s), bits(got.cosine - c));
    relative = Math.max(relative, bits(got.sine - s, s), bits(got.cosine - c, c));
  }
  return { absolute, relative };
}

const random = new Random(3);
const spread = (count: number, ...sizes: readonly number[]): number[] => sizes.flatMap((size) => Array.from({ length: count }, () => random.between(-size, size)));

describe('sinCosRadians', () => {
  it('is right to 2^-93, absolute and relative, on the usual range', () => {
    const { absolute, relative } = worst(sinCosRadians, spread(150, Math.PI, 0.01, 1e-6, 100, 7999), (x) => f.of(x));
    expect(absolute).toBeLessThan(-93);
    expect(relative).toBeLessThan(-92);
  });

  it('is right next to multiples of π/2, where the reduction cancels', () => {
    const angles = [1, 2, 3, 4, 7, 100, 4001].flatMap((k) => [k * (Math.PI / 2), k * (Math.PI / 2) * (1 + 2 ** -52)]);
    expect(worst(sinCosRadians, angles, (x) => f.of(x)).relative).toBeLessThan(-80);
  });

  // 6381956970095103 × 2^797 comes closest of all doubles to a multiple of π/2: Muller, Elementary Functions (2006), 9.3.2.
  it.each([8000, 8000.5, 1e5, 1e10, 1e22, 1e100, Number.MAX_VALUE, 6381956970095103 * 2 ** 797])('reduces %d rightly', (angle) => {
    expect(worst(sinCosRadians, [angle, -angle], (x) => f.of(x)).relative).toBeLessThan(-85);
  });

  it.each([1e-300, 5e-324, 2 ** -600, 1e-20])('gives the sine of %d as itself', (angle) => {
    expect(at(sinCosRadians, angle)).toMatchObject({ sineDouble: angle, cosineDouble: 1 });
    expect(at(sinCosRadians, -angle)).toMatchObject({ sineDouble: -angle, cosineDouble: 1 });
  });

  it('takes the low part of the angle in', () => {
    const low = 2 ** -60;
    const [s] = f.sinCos(f.of(1) + f.of(low));
    expect(bits(at(sinCosRadians, 1, low).sine - s)).toBeLessThan(-93);
  });

  it('agrees with mathjs at 64 digits', () => {
    for (const angle of spread(20, 4, 500)) {
      const got = at(sinCosRadians, angle);
      expect(got.sineDouble).toBe(BigNumber.sin(exactly(angle)).toNumber());
      expect(got.cosineDouble).toBe(BigNumber.cos(exactly(angle)).toNumber());
    }
  });
});

describe('sinCosDegrees', () => {
  it('is right to 2^-93, absolute and relative', () => {
    const { absolute, relative } = worst(sinCosDegrees, spread(150, 180, 1, 1e-6, 1000, 1e9, 1e20), radiansOf);
    expect(absolute).toBeLessThan(-93);
    expect(relative).toBeLessThan(-92);
  });

  it.each([
    [0, 0, 1], [30, 0.5, null], [60, null, 0.5], [90, 1, 0], [120, null, -0.5], [150, 0.5, null], [180, 0, -1], [210, -0.5, null], [270, -1, 0],
    [300, null, 0.5], [330, -0.5, null], [360, 0, 1], [450, 1, 0], [-90, -1, 0], [-30, -0.5, null], [90 * (2 ** 46 + 1), 1, 0], [3.6e20, 0, 1],
  ])('of %d is exact', (angle, sine, cosine) => {
    const got = at(sinCosDegrees, angle);
    if (sine !== null) expect(got.sine).toBe(f.of(sine));
    if (cosine !== null) expect(got.cosine).toBe(f.of(cosine));
  });

  it('gives sine and cosine of 45° the same bits', () => {
    const got = at(sinCosDegrees, 45);
    expect(got.sine).toBe(got.cosine);
  });

  it('agrees with mathjs at 64 digits', () => {
    for (const angle of spread(20, 180, 1e5)) {
      const radians = exactly(angle).times(PI).div(180);
      expect(at(sinCosDegrees, angle).sineDouble).toBe(BigNumber.sin(radians).toNumber());
    }
  });
});

describe('the quick sine and cosine', () => {
  it('stay within their bound of 2^-71', () => {
    expect(worst(quickSinCosRadians, spread(600, Math.PI, 7.9, 0.01), (x) => f.of(x)).absolute).toBeLessThan(-71);
    expect(worst(quickSinCosDegrees, spread(600, 180, 1, 1e6), radiansOf).absolute).toBeLessThan(-71);
  });

  it('leave heads of 26 bits', () => {
    for (const angle of spread(100, 3)) {
      at(quickSinCosRadians, angle);
      for (const slot of [4, 6]) expect(Math.abs(scratch[slot]!) * 2 ** (25 - Math.floor(Math.log2(Math.abs(scratch[slot]!)))) % 1).toBe(0);
    }
  });
});
