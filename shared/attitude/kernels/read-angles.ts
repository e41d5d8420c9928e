import { quickSinCosDegrees, quickSinCosRadians } from '../arithmetic/quick-sin-cos.gen.ts';
import { scratch as S } from '../arithmetic/scratch.ts';
import { sinCosDegrees, sinCosRadians } from '../arithmetic/sin-cos.gen.ts';
import { ANGLES, SINES_COSINES } from '../arithmetic/slots.ts';
import type { EulerConvention } from '../convention.ts';
import { matrixOfSame, matrixOfThree, quaternionOfSame, quaternionOfThree } from './euler.gen.ts';
import { canonicalSequence } from './frames.ts';
import { quickMatrixOfSame, quickMatrixOfThree, quickQuaternionOfSame, quickQuaternionOfThree } from './quick-euler.gen.ts';
import { FINE, REFUSED, type Reader } from './status.ts';

/**
 * Reads Euler angles of any convention as the QUATERNION (half angles) or the MATRIX of its canonical sequence.
 * Any finite angle is read; degrees are reduced in degrees.
 * @param precision - "rounded" where only the nearest doubles are wanted: the quick kernels answer whenever they can
 *   tell those. "pairs" where the answer goes on as double-doubles.
 */
export function angleReader(convention: EulerConvention, into: 'quaternion' | 'matrix', precision: 'rounded' | 'pairs'): Reader {
  const { symmetric, lastSense, placeOfApplied } = canonicalSequence(convention);
  const { order, signs } = convention;
  const degrees = convention.unit === 'deg';
  const share = into === 'quaternion' ? 0.5 : 1;
  const listedAt = (place: number): number => order.findIndex((turn) => placeOfApplied[turn - 1] === place);
  const factorOf = (place: number): number => signs[order[listedAt(place)]! - 1]! * share * (place === 2 ? lastSense : 1);
  const [first, second, third] = [listedAt(0), listedAt(1), listedAt(2)];
  const factors = Float64Array.of(factorOf(0), factorOf(1), factorOf(2));
  const build = into === 'quaternion' ? (symmetric ? quaternionOfSame : quaternionOfThree) : symmetric ? matrixOfSame : matrixOfThree;
  const quick = into === 'quaternion' ? (symmetric ? quickQuaternionOfSame : quickQuaternionOfThree) : symmetric ? quickMatrixOfSame : quickMatrixOfThree;
  const limit = precision === 'pairs' ? -1 : degrees ? 2 ** 40 : 8;

  return (numbers, at) => {
    const a = numbers[at + first]!;
    const b = numbers[at + second]!;
    const c = numbers[at + third]!;
    if (!(Math.abs(a) < Infinity && Math.abs(b) < Infinity && Math.abs(c) < Infinity)) return REFUSED;
    S[ANGLES] = a * factors[0]!;
    S[ANGLES + 1] = 0;
    S[ANGLES + 2] = b * factors[1]!;
    S[ANGLES + 3] = 0;
    S[ANGLES + 4] = c * factors[2]!;
    S[ANGLES + 5] = 0;
    if (Math.abs(a) < limit && Math.abs(b) < limit && Math.abs(c) < limit) {
      if (degrees) {
        quickSinCosDegrees(ANGLES, SINES_COSINES);
        quickSinCosDegrees(ANGLES + 2, SINES_COSINES + 4);
        quickSinCosDegrees(ANGLES + 4, SINES_COSINES + 8);
      } else {
        quickSinCosRadians(ANGLES, SINES_COSINES);
        quickSinCosRadians(ANGLES + 2, SINES_COSINES + 4);
        quickSinCosRadians(ANGLES + 4, SINES_COSINES + 8);
      }
      if (quick()) return FINE;
    }
    if (degrees) {
      sinCosDegrees(ANGLES, SINES_COSINES);
      sinCosDegrees(ANGLES + 2, SINES_COSINES + 4);
      sinCosDegrees(ANGLES + 4, SINES_COSINES + 8);
    } else {
      sinCosRadians(ANGLES, SINES_COSINES);
      sinCosRadians(ANGLES + 2, SINES_COSINES + 4);
      sinCosRadians(ANGLES + 4, SINES_COSINES + 8);
    }
    build();
    return FINE;
  };
}
