import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { BODY_SETS, LOCAL_LEVEL_SETS } from '#shared/attitude/axes.ts';
import { SEQUENCES, type Convention, type EulerConvention } from '#shared/attitude/convention.ts';
import { createConverter } from '#shared/attitude/converter.ts';
import { createRateConverter } from '#shared/attitude/rates/rate-converter.ts';
import type { Rate } from '#shared/attitude/rates/rate.ts';
import { anyRotation, DCM, EULER_DEG, QUATERNION } from '#tests/support/conventions.ts';

const BODY: Rate = { rate: 'body', unit: 'rad/s' };
const REFERENCE: Rate = { rate: 'reference', unit: 'rad/s' };
const convertRate = (attitude: Convention, from: Rate, to: Rate, numbers: readonly number[], rate: readonly number[]) =>
  Array.from(createRateConverter(attitude, from, to).convert(Float64Array.from(numbers), Float64Array.from(rate)).rates);
const distance = (a: readonly number[], b: readonly number[]) => Math.max(...a.map((value, i) => Math.abs(value - b[i]!)));

const vector = fc.tuple(...[0, 1, 2].map(() => fc.double({ min: -2, max: 2, noNaN: true })) as [fc.Arbitrary<number>, fc.Arbitrary<number>, fc.Arbitrary<number>]);
const anyEuler: fc.Arbitrary<EulerConvention> = fc.record({
  representation: fc.constant('euler' as const), reference: fc.constantFrom(...LOCAL_LEVEL_SETS), body: fc.constantFrom(...BODY_SETS), sequence: fc.constantFrom(...SEQUENCES),
  motion: fc.constantFrom('intrinsic' as const, 'extrinsic' as const), unit: fc.constantFrom('deg' as const, 'rad' as const),
  order: fc.constantFrom([1, 2, 3] as const, [3, 1, 2] as const, [2, 1, 3] as const), signs: fc.constantFrom([1, 1, 1] as const, [-1, 1, 1] as const, [1, -1, -1] as const), range: fc.constant('signed' as const),
}).filter((convention) => {
  try {
    createConverter(QUATERNION, convention);
    return true;
  } catch {
    return false;
  }
});

/** Turns an attitude on by body rates for a short while: q exp(ω t / 2), written out here. */
function turned(q: readonly number[], omega: readonly number[], time: number): number[] {
  const rate = Math.hypot(...omega) || 1;
  const s = Math.sin((rate * time) / 2) / rate;
  const [x, y, z] = omega.map((component) => component * s) as [number, number, number];
  const w = Math.cos((rate * time) / 2);
  return [
    q[0]! * w - q[1]! * x - q[2]! * y - q[3]! * z, q[0]! * x + q[1]! * w + q[2]! * z - q[3]! * y,
    q[0]! * y - q[1]! * z + q[2]! * w + q[3]! * x, q[0]! * z + q[1]! * y - q[2]! * x + q[3]! * w,
  ];
}

/** Central difference of a convention's numbers along the motion. */
function difference(convention: Convention, q: readonly number[], omega: readonly number[], half = 180): number[] | null {
  const h = 1e-5;
  const at = (time: number) => Array.from(createConverter(QUATERNION, convention).convert(Float64Array.from(turned(q, omega, time))));
  const [before, after] = [at(-h), at(h)];
  const steps = after.map((value, i) => value - before[i]!);
  return steps.some((step) => Math.abs(step) > half / 2) ? null : steps.map((step) => step / (2 * h));
}

describe('createRateConverter', () => {
  it('gives Euler rates that are the derivatives of the angles, for every sequence, motion, order, sign and axis set', () => {
    fc.assert(fc.property(anyEuler, anyRotation, vector, (angles, q, omega) => {
      const half = angles.unit === 'deg' ? 180 : Math.PI;
      const expected = difference(angles, q, omega, half);
      const converter = createRateConverter(QUATERNION, BODY, { rate: 'euler', unit: angles.unit === 'deg' ? 'deg/s' : 'rad/s', angles });
      const { rates, conditions } = converter.convert(Float64Array.from(q), Float64Array.from(omega));
      fc.pre(expected !== null && conditions[0]! < 20);
      expect(distance(Array.from(rates), expected!)).toBeLessThan(1e-5 * (half / Math.PI) * conditions[0]! ** 2);
    }), { numRuns: 1500, seed: 3 });
  });

  it('gives quaternion and matrix rates that are the derivatives of the numbers', () => {
    const quaternions: Convention[] = [QUATERNION, { ...QUATERNION, scalar: 'last', product: 'shuster', sign: 'continuous' }, { ...QUATERNION, maps: 'reference-to-body' }];
    const matrices: Convention[] = [DCM, { ...DCM, layout: 'column-major' } as Convention, { ...DCM, maps: 'body-to-reference' } as Convention];
    fc.assert(fc.property(fc.constantFrom(...quaternions, ...matrices), anyRotation, vector, (convention, q, omega) => {
      fc.pre(Math.abs(q[0]) > 1e-3);
      const numbers = Array.from(createConverter(QUATERNION, convention).convert(Float64Array.from(q)));
      const rate: Rate = { rate: convention.representation as 'quaternion' | 'dcm' };
      const out = convertRate(convention, BODY, rate, numbers, omega);
      expect(distance(out, difference(convention, q, omega, 1e9)!)).toBeLessThan(1e-8);
      expect(distance(convertRate(convention, rate, BODY, numbers, out), omega)).toBeLessThan(1e-14);
    }), { numRuns: 500, seed: 4 });
  });

  it('comes back from Euler rates to the body rates', () => {
    fc.assert(fc.property(anyEuler, anyRotation, vector, (angles, q, omega) => {
      const rate: Rate = { rate: 'euler', unit: 'deg/s', angles };
      const { rates, conditions } = createRateConverter(QUATERNION, BODY, rate).convert(Float64Array.from(q), Float64Array.from(omega));
      fc.pre(conditions[0]! < 1e6);
      expect(distance(convertRate(QUATERNION, rate, BODY, q, Array.from(rates)), omega)).toBeLessThan(1e-14 * conditions[0]! + 1e-13);
    }), { numRuns: 500, seed: 5 });
  });

  it('resolves the same angular velocity in reference axes', () => {
    fc.assert(fc.property(anyRotation, vector, (q, omega) => {
      const c = Array.from(createConverter(QUATERNION, DCM).convert(Float64Array.from(q)));
      const expected = [0, 1, 2].map((j) => [0, 1, 2].reduce((sum, i) => sum + c[3 * i + j]! * omega[i]!, 0));
      const out = convertRate(QUATERNION, BODY, REFERENCE, q, omega);
      expect(distance(out, expected)).toBeLessThan(1e-14);
      expect(distance(convertRate(QUATERNION, REFERENCE, BODY, q, out), omega)).toBeLessThan(1e-14);
    }), { numRuns: 300, seed: 6 });
  });

  it('takes vee(C Ċᵀ) of the matrix as it stands, also between sets of different handedness', () => {
    const mixed: Convention = { ...DCM, body: 'FLD' } as Convention;
    const c = [0.8528685319524432, 0.492403876506104, -0.17364817766693036, 0.4184120444167326, -0.843493268656316, -0.33682408883346515, 0.3123245560187264, -0.21461017714275643, 0.9254165783983234];
    const omega = [0.1, -0.2, 0.3];
    const rate = convertRate(mixed, BODY, { rate: 'dcm' }, c, omega);
    // Ċ = −[ω×] C, written out.
    const expected = [0, 1, 2].flatMap((i) => [0, 1, 2].map((j) => {
      const cross = [[0, -omega[2]!, omega[1]!], [omega[2]!, 0, -omega[0]!], [-omega[1]!, omega[0]!, 0]];
      return -[0, 1, 2].reduce((sum, k) => sum + cross[i]![k]! * c[3 * k + j]!, 0);
    }));
    expect(distance(rate, expected)).toBeLessThan(1e-15);
    expect(distance(convertRate(mixed, REFERENCE, BODY, c, convertRate(mixed, BODY, REFERENCE, c, omega)), omega)).toBeLessThan(1e-14);
  });

  it('answers the level-turn case: ψ̇ = g tan φ / V gives p = 0, q = ψ̇ sin φ, r = ψ̇ cos φ', () => {
    // Source: the kinematic relations of Stevens, Lewis & Johnson, Aircraft Control and Simulation, sect. 1.4 (from memory); level flight.
    const turn = (9.80665 * Math.tan(Math.PI / 6)) / 70;
    const rate: Rate = { rate: 'euler', unit: 'rad/s', angles: EULER_DEG as EulerConvention };
    const body = convertRate(EULER_DEG, rate, BODY, [200, 0, 30], [turn, 0, 0]);
    expect(distance(body, [0, turn * Math.sin(Math.PI / 6), turn * Math.cos(Math.PI / 6)])).toBeLessThan(1e-16);
  });

  it('at lock gives the middle rate, and says that the others do not exist', () => {
    const rate: Rate = { rate: 'euler', unit: 'deg/s', angles: EULER_DEG as EulerConvention };
    const converter = createRateConverter(EULER_DEG, { rate: 'body', unit: 'deg/s' }, rate);
    const { rates, conditions } = converter.convert(Float64Array.of(10, 90, 0, 10, 89, 0), Float64Array.of(1, 2, 3, 1, 2, 3));
    expect(rates[0]).toBeNaN();
    expect(rates[1]).toBeCloseTo(2, 14);
    expect(rates[2]).toBeNaN();
    expect(conditions[0]).toBe(Infinity);
    expect(conditions[1]).toBeCloseTo(57.29868849855063, 9);
    expect(converter.warnings().map(({ code, indices }) => [code, indices])).toEqual([['gimbal-lock', [0]]]);
    expect(Array.from(createRateConverter(EULER_DEG, rate, BODY).convert(Float64Array.of(10, 90, 0), Float64Array.of(5, 1, 2)).rates).every(Number.isFinite)).toBe(true);
  });

  it('refuses rates that the attitude does not have, and numbers that are none', () => {
    expect(() => createRateConverter(EULER_DEG, { rate: 'quaternion' }, BODY)).toThrow(expect.objectContaining({ code: 'invalid-convention' }));
    expect(() => createRateConverter(QUATERNION, BODY, REFERENCE).convert(Float64Array.of(1, 0, 0, 0), Float64Array.of(1, NaN, 0))).toThrow(expect.objectContaining({ code: 'not-finite' }));
    expect(() => createRateConverter(QUATERNION, BODY, REFERENCE).convert(Float64Array.of(1, 0, 0, 0), Float64Array.of(1, 0))).toThrow(expect.objectContaining({ code: 'count-mismatch' }));
    expect(() => createRateConverter(QUATERNION, BODY, REFERENCE).convert(Float64Array.of(3, 0, 0, 0), Float64Array.of(1, 0, 0))).toThrow(expect.objectContaining({ code: 'not-a-rotation' }));
  });
});
