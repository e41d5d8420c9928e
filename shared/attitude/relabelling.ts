import { betweenBodies, betweenReferences, bodyPermutation, handedness, referencePermutation, type SignedPermutation } from './axes.ts';
import type { Convention } from './convention.ts';
import { AttitudeError } from './errors.ts';
import { quaternionOf, type Matrix } from './geometry/matrix.ts';
import { conjugate, multiply, type Quaternion } from './geometry/quaternion.ts';

/** How an attitude between one pair of axis sets reads between another: C_to = P_b C_from P_rᵀ. */
export interface Relabelling {
  readonly reference: SignedPermutation;
  readonly body: SignedPermutation;
}

/** det of the component matrix between a convention's two sets: −1 where they differ in handedness. */
export const determinantOf = ({ reference, body }: Convention): 1 | -1 =>
  (handedness(referencePermutation(reference)) * handedness(bodyPermutation(body))) as 1 | -1;

/** @throws AttitudeError `unrelated-frames`, `improper-axes`, `invalid-convention`. */
export function relabellingBetween(from: Convention, to: Convention): Relabelling {
  for (const convention of [from, to]) {
    if (determinantOf(convention) < 0 && convention.representation !== 'dcm') {
      throw new AttitudeError('improper-axes', `${convention.reference} and ${convention.body} differ in handedness: their component matrix has determinant −1, which the representation "${convention.representation}" cannot express. Use "dcm", or two sets of the same handedness.`);
    }
  }
  const relabelling = { reference: betweenReferences(from.reference, to.reference), body: betweenBodies(from.body, to.body) };
  return relabelling;
}

/** P as a matrix, row by row. */
export function matrixOfPermutation({ column, sign }: SignedPermutation): Matrix {
  const matrix: Matrix = [0, 0, 0, 0, 0, 0, 0, 0, 0];
  for (let row = 0; row < 3; row++) matrix[3 * row + column[row]!] = sign[row]!;
  return matrix;
}

/** R_to of R_from, both v_ref = R v_body: P_r R P_bᵀ, which only moves elements and changes signs. */
export function relabelMatrix({ reference, body }: Relabelling, r: Readonly<Matrix>): Matrix {
  const out: Matrix = [0, 0, 0, 0, 0, 0, 0, 0, 0];
  for (let i = 0; i < 3; i++) {
    for (let j = 0; j < 3; j++) out[3 * i + j] = reference.sign[i]! * body.sign[j]! * r[3 * reference.column[i]! + body.column[j]!]!;
  }
  return out;
}

/**
 * The quaternions that relabelling multiplies with on either side: q_to = left q_from right. Between sets that
 * change handedness together both permutations are negated, which leaves P_r R P_bᵀ as it is and makes them rotations.
 */
export function relabellingQuaternions({ reference, body }: Relabelling): { left: Quaternion; right: Quaternion } | null {
  const sign = handedness(reference);
  if (handedness(body) !== sign) return null;
  const rotation = (permutation: SignedPermutation): Quaternion => quaternionOf(matrixOfPermutation(permutation).map((element) => element * sign) as Matrix);
  return { left: rotation(reference), right: conjugate(rotation(body)) };
}

export const relabelQuaternion = ({ left, right }: { left: Quaternion; right: Quaternion }, q: Readonly<Quaternion>): Quaternion => multiply(multiply(left, q), right);
