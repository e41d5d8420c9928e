import { scratch as S } from '../arithmetic/scratch.ts';
import { QUATERNION } from '../arithmetic/slots.ts';
import type { QuaternionConvention } from '../convention.ts';
import { normaliseQuaternion } from './rotation.gen.ts';
import { FINE, type Writer } from './status.ts';

/** Scalar parts below this, of a quaternion whose parts came out of rounded steps, cannot be told from 0. */
const INDISTINCT = 2 ** -97;

/**
 * Makes the scalar part of QUATERNION non-negative, and where it is 0 the first non-zero component of the vector part
 * positive; the attitude is the same.
 * @param rounded - the components carry errors of double-double steps.
 */
export function makeCanonical(rounded: boolean): void {
  const w = S[QUATERNION]!;
  if (w > INDISTINCT) return;
  if (rounded && w >= -INDISTINCT) {
    S[QUATERNION] = 0;
    S[QUATERNION + 1] = 0;
  }
  for (let i = QUATERNION; i < QUATERNION + 8; i += 2) {
    const component = S[i]!;
    if (component > 0) return;
    if (component < 0) {
      for (let k = QUATERNION; k < QUATERNION + 8; k++) S[k] = 0 - S[k]!;
      return;
    }
  }
}

/**
 * Writes QUATERNION in a convention's order and sign. One writer keeps the sign continuous over all its calls.
 * @param norm - whether it must be divided by its norm, or is to be written as it stands (of norm 1 already, or as given).
 */
export function quaternionWriter(convention: QuaternionConvention, norm: 'divide' | 'keep', rounded: boolean): Writer {
  const scalar = convention.scalar === 'first' ? 0 : 3;
  const vector = convention.scalar === 'first' ? 1 : 0;
  const continuous = convention.sign === 'continuous';
  const before = new Float64Array(4);
  return (numbers, at) => {
    makeCanonical(rounded);
    if (norm === 'divide') normaliseQuaternion();
    let sign = 1;
    if (continuous) {
      let product = 0;
      for (let i = 0; i < 4; i++) product += before[i]! * S[QUATERNION + 2 * i]!;
      if (product < 0) sign = -1;
      for (let i = 0; i < 4; i++) before[i] = sign * S[QUATERNION + 2 * i]!;
    }
    numbers[at + scalar] = sign * S[QUATERNION]! + 0;
    numbers[at + vector] = sign * S[QUATERNION + 2]! + 0;
    numbers[at + vector + 1] = sign * S[QUATERNION + 4]! + 0;
    numbers[at + vector + 2] = sign * S[QUATERNION + 6]! + 0;
    return FINE;
  };
}
