import type { AngleUnit, Sequence } from '../convention.ts';
import type { Matrix } from './matrix.ts';
import { multiply, type Quaternion } from './quaternion.ts';
import { arcTangent, inUnit, PI, sinCos } from './trigonometry.ts';

/** Axis numbers (0, 1, 2) of an intrinsic sequence in the order applied, and the parity of its three different axes. */
export interface Turns {
  readonly axes: readonly [number, number, number];
  /** First and third axis are the same. */
  readonly symmetric: boolean;
  /** The axis that is neither the first nor the second. */
  readonly third: number;
  /** +1 where first, second, third run cyclically (x→y→z→x), else −1. */
  readonly parity: 1 | -1;
}

export function turnsOf(sequence: Sequence): Turns {
  const [a, b, c] = [...sequence].map((letter) => 'XYZ'.indexOf(letter)) as [number, number, number];
  return { axes: [a, b, c], symmetric: a === c, third: 3 - a - b, parity: (b - a + 3) % 3 === 1 ? 1 : -1 };
}

/** Angles in the order applied, and |cos| of the middle one (|sin| for symmetric sequences). */
export interface Angles {
  readonly angles: [number, number, number];
  readonly cosine: number;
}

/** q with v_ref = R(q) v_body of intrinsic angles: q_a(θ1) q_b(θ2) q_c(θ3). */
export function quaternionOfAngles({ axes }: Turns, angles: readonly [number, number, number], unit: AngleUnit): Quaternion {
  const [first, second, third] = angles.map((angle, i) => {
    const [s, c] = sinCos(angle / 2, unit);
    const q: Quaternion = [c, 0, 0, 0];
    q[axes[i]! + 1] = s;
    return q;
  }) as [Quaternion, Quaternion, Quaternion];
  return multiply(multiply(first, second), third);
}

/** R (v_ref = R v_body) of intrinsic angles; built from whole angles, so that degrees give exact elements where there are any. */
export function matrixOfAngles({ axes }: Turns, angles: readonly [number, number, number], unit: AngleUnit): Matrix {
  let product: number[] = [1, 0, 0, 0, 1, 0, 0, 0, 1];
  for (let turn = 0; turn < 3; turn++) {
    const [s, c] = sinCos(angles[turn]!, unit);
    const j = (axes[turn]! + 1) % 3;
    const k = (axes[turn]! + 2) % 3;
    const next = [...product];
    for (let row = 0; row < 3; row++) {
      next[3 * row + j] = product[3 * row + j]! * c + product[3 * row + k]! * s;
      next[3 * row + k] = product[3 * row + k]! * c - product[3 * row + j]! * s;
    }
    product = next;
  }
  return product as Matrix;
}

/**
 * Intrinsic angles of a quaternion, by the two complex half-angle products; no arcsine and no normalisation first.
 * Where |cos| of the middle angle is not above `lockAt` the last angle is 0 and the first carries the sum.
 * Source: Bernardes & Viollet 2022, doi:10.1371/journal.pone.0276302, written for the intrinsic order.
 */
export function anglesOfQuaternion(turns: Turns, q: Readonly<Quaternion>, unit: AngleUnit, lockAt: number): Angles {
  const { axes: [first, second], symmetric, third, parity } = turns;
  const [w, u, v, t] = [q[0], q[first + 1]!, q[second + 1]!, q[third + 1]!];
  // For three different axes u turns first and t last; for first = third, u is both and t is the axis left out.
  const [a, b, c, d] = symmetric ? [w, u, v, t * parity] : [w - v, t - u * parity, w + v, -u * parity - t];
  const sumNorm = Math.hypot(a, b);
  const differenceNorm = Math.hypot(c, d);
  const cosine = (2 * sumNorm * differenceNorm) / (sumNorm * sumNorm + differenceNorm * differenceNorm);
  const locked = cosine <= lockAt;
  let halfSum = arcTangent(b, a, unit);
  let halfDifference = arcTangent(d, c, unit);
  if (locked) {
    if (differenceNorm < sumNorm) halfDifference = halfSum;
    else halfSum = halfDifference;
  }
  const firstAngle = halfSum + halfDifference;
  const middle = locked
    ? (differenceNorm < sumNorm ? 0 : inUnit(PI, unit))
    : 2 * arcTangent(differenceNorm, sumNorm, unit);
  return {
    angles: [symmetric ? firstAngle : -parity * firstAngle, symmetric ? middle : middle - rightAngle(unit), halfSum - halfDifference],
    cosine,
  };
}

/**
 * Intrinsic angles of a rotation matrix R (v_ref = R v_body), straight from its elements. The last angle is taken
 * consistently with the first, so that near lock their well-conditioned combination stays right.
 */
export function anglesOfMatrix(turns: Turns, m: Readonly<Matrix>, unit: AngleUnit, lockAt: number): Angles {
  const { axes: [a, b], symmetric, third: c, parity } = turns;
  const at = (row: number, column: number): number => m[3 * row + column]!;
  const [s1, c1] = symmetric ? [at(b, a), -parity * at(c, a)] : [-parity * at(b, c), at(c, c)];
  const cosine = Math.hypot(s1, c1);
  const locked = cosine <= lockAt;
  const middle = symmetric ? arcTangent(locked ? 0 : cosine, at(a, a), unit) : arcTangent(parity * at(a, c), locked ? 0 : cosine, unit);
  if (locked) return { angles: [arcTangent(parity * at(c, b), at(b, b), unit), middle, 0], cosine };
  const last = symmetric
    ? arcTangent(at(c, a) * at(b, c) - at(b, a) * at(c, c), parity * (at(b, a) * at(c, b) - at(c, a) * at(b, b)), unit)
    : arcTangent(parity * (at(c, c) * at(b, a) - at(b, c) * at(c, a)), at(c, c) * at(b, b) - at(b, c) * at(c, b), unit);
  return { angles: [arcTangent(s1, c1, unit), middle, last], cosine };
}

const rightAngle = (unit: AngleUnit): number => (unit === 'deg' ? 90 : PI / 2);
