import { isNamedFrame } from '../axes.ts';
import type { Convention, QuaternionConvention } from '../convention.ts';
import { createConverter } from '../converter.ts';
import { AttitudeError } from '../errors.ts';
import { errorRotation } from '../rotations/error-rotation.ts';
import type { AttitudeWarning } from '../warnings.ts';
import type { Quaternion } from '../rotations/quaternion.ts';
import { statisticsOf, type Statistics } from './statistics.ts';

/** Attitudes as a convention lists them, flat. */
export interface StatedAttitudes {
  readonly convention: Convention;
  readonly numbers: Float64Array;
}

export interface Verification {
  readonly count: number;
  /** How many attitudes are off by more than the tolerance. */
  readonly failed: number;
  /** Error angle of each attitude, rad. */
  readonly angles: Float64Array;
  readonly worst: {
    readonly index: number;
    readonly angle: number;
    /** Unit axis in FRD about which the rotation by `angle` carries the expected attitude into the actual one. */
    readonly axisBody: readonly [number, number, number];
  };
  readonly statistics: Statistics;
  /** What was repaired on either side; near-lock warnings have no place here, since no angle is compared. */
  readonly repaired: readonly AttitudeWarning[];
}

/**
 * Compares two lists of attitudes, each in its own convention, pair by pair. The error is the angle of the rotation
 * between the two attitudes, never a difference of angles: it does not depend on either representation.
 *
 * @param tolerance - rad.
 * @param repair - what to do with numbers that are no rotation by more than 1e-6, such as those of a few digits: refuse them, or take the nearest rotation.
 * @throws AttitudeError for attitudes that cannot be used, and `count-mismatch` where the lists differ in length.
 * Accuracy: 2.5e-16 rad beyond that of the numbers given.
 */
export function verifyAttitudes(expected: StatedAttitudes, actual: StatedAttitudes, tolerance: number, repair: 'none' | 'nearest' = 'none'): Verification {
  const common = commonConvention(expected.convention);
  const converters = [expected, actual].map(({ convention }) => createConverter(convention, common, { repair, warnWithinDeg: 0 }));
  const [e, a] = [expected, actual].map(({ numbers }, side) => converters[side]!.convert(numbers)) as [Float64Array, Float64Array];
  if (e.length !== a.length) throw new AttitudeError('count-mismatch', `${e.length / 4} expected attitudes cannot be compared with ${a.length / 4} actual ones.`);
  const count = e.length / 4;
  const angles = new Float64Array(count);
  let worst: Verification['worst'] = { index: 0, angle: -1, axisBody: [1, 0, 0] };
  let failed = 0;
  for (let i = 0; i < count; i++) {
    const { angle, axis } = errorRotation(at(e, i), at(a, i));
    angles[i] = angle;
    if (angle > tolerance) failed++;
    if (angle > worst.angle) worst = { index: i, angle, axisBody: axis };
  }
  return { count, failed, angles, worst, statistics: statisticsOf(angles), repaired: converters.flatMap((converter) => converter.warnings()).filter(({ code }) => code === 'renormalised' || code === 'reorthonormalised') };
}

/** Quaternions between NED, or the named frame that is meant, and FRD. */
const commonConvention = ({ reference }: Convention): QuaternionConvention => ({
  representation: 'quaternion', reference: isNamedFrame(reference) ? reference : 'NED', body: 'FRD', scalar: 'first', product: 'hamilton', maps: 'body-to-reference', sign: 'any',
});

const at = (q: Float64Array, i: number): Quaternion => [q[4 * i]!, q[4 * i + 1]!, q[4 * i + 2]!, q[4 * i + 3]!];
