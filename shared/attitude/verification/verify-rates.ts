import { bodyPermutation, handedness } from '../axes.ts';
import type { Convention } from '../convention.ts';
import { AttitudeError } from '../errors.ts';
import { createRateConverter } from '../rates/rate-converter.ts';
import type { Rate } from '../rates/rate.ts';
import { statisticsOf, type Statistics } from './statistics.ts';

/** Rates of one form, flat, each at the attitude of the same index. */
export interface StatedRates {
  readonly rate: Rate;
  readonly numbers: Float64Array;
}

export interface RateVerification {
  readonly count: number;
  readonly failed: number;
  /** |Δω| of each sample, rad/s. */
  readonly sizes: Float64Array;
  readonly worst: {
    readonly index: number;
    readonly size: number;
    /** Unit direction of ω actual less ω expected, in FRD. */
    readonly axisBody: readonly [number, number, number];
  };
  readonly statistics: Statistics;
}

/**
 * Compares two lists of rates at given attitudes, each in its own form, sample by sample. The error is the length of the
 * difference of the two angular velocities, which is the same in body and in reference axes; never a difference of Euler
 * rates, which grows without bound near gimbal lock.
 *
 * @param tolerance - rad/s.
 * @throws AttitudeError as createRateConverter, and `count-mismatch` where the lists differ in length.
 * Accuracy: plain double precision, a few units in the last place of |ω|.
 */
export function verifyRates(attitude: Convention, attitudes: Float64Array, expected: StatedRates, actual: StatedRates, tolerance: number): RateVerification {
  const [e, a] = [expected, actual].map(({ rate, numbers }) => createRateConverter(attitude, rate, { rate: 'body', unit: 'rad/s' }).convert(attitudes, numbers).rates) as [Float64Array, Float64Array];
  if (e.length !== a.length) throw new AttitudeError('count-mismatch', `${e.length / 3} expected rates cannot be compared with ${a.length / 3} actual ones.`);
  const count = e.length / 3;
  const sizes = new Float64Array(count);
  let [failed, worst] = [0, 0];
  for (let i = 0; i < count; i++) {
    sizes[i] = Math.hypot(a[3 * i]! - e[3 * i]!, a[3 * i + 1]! - e[3 * i + 1]!, a[3 * i + 2]! - e[3 * i + 2]!);
    if (sizes[i]! > tolerance) failed++;
    if (sizes[i]! > sizes[worst]!) worst = i;
  }
  const size = sizes[worst]!;
  const own = [0, 1, 2].map((k) => (size === 0 ? Number(k === 0) : (a[3 * worst + k]! - e[3 * worst + k]!) / size));
  return { count, failed, sizes, worst: { index: worst, size, axisBody: inForwardRightDown(own, attitude.body) }, statistics: statisticsOf(sizes) };
}

/** An angular velocity changes axes as an axial vector: ω_FRD = det(S) Sᵀ ω_set. */
function inForwardRightDown(vector: readonly number[], body: string): [number, number, number] {
  const set = bodyPermutation(body);
  const hand = handedness(set);
  const out: [number, number, number] = [0, 0, 0];
  set.column.forEach((axis, i) => { out[axis] = hand * set.sign[i]! * vector[i]! + 0; });
  return out;
}
