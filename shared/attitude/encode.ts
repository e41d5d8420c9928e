import type { Convention } from './convention.ts';
import { anglesOfMatrix, anglesOfQuaternion, turnsOf } from './geometry/euler.ts';
import { matrixOf, quaternionOf, transpose, type Matrix } from './geometry/matrix.ts';
import { canonical, conjugate, type Quaternion } from './geometry/quaternion.ts';
import { inUnit, PI } from './geometry/trigonometry.ts';

/** An attitude on its way out, between the target's axes; at least one of the two is there. */
export interface Attitude {
  readonly quaternion?: Quaternion;
  readonly matrix?: Matrix;
}

/** |cos(middle angle)| where the encoder met one, for the report on gimbal lock; and what makes an attitude impossible. */
export interface Encoded {
  readonly cosine?: number;
  readonly locked?: boolean;
  readonly notRepresentable?: boolean;
}

export type Encoder = (attitude: Attitude, out: Float64Array, offset: number) => Encoded;

const NOTHING: Encoded = {};
/** Below this, numbers that went through a quaternion cannot tell a small cosine from zero: half angles are known to 2^-53 each. */
export const LOCK_FROM_QUATERNION = 8.9e-16;

/** The writer of a convention's numbers. One writer keeps the sign of successive quaternions continuous, over all its calls. */
export function encoderOf(convention: Convention): Encoder {
  switch (convention.representation) {
    case 'euler': {
      const extrinsic = convention.motion === 'extrinsic';
      const turns = turnsOf(extrinsic ? [...convention.sequence].reverse().join('') as typeof convention.sequence : convention.sequence);
      const { order, signs, unit, range } = convention;
      const half = unit === 'deg' ? 180 : PI;
      return ({ quaternion, matrix }, out, at) => {
        const lockAt = matrix ? 0 : LOCK_FROM_QUATERNION;
        const { angles, cosine } = matrix ? anglesOfMatrix(turns, matrix, unit, lockAt) : anglesOfQuaternion(turns, quaternion!, unit, lockAt);
        const locked = cosine <= lockAt;
        // At lock one angle is free: it is the last one applied, which for extrinsic motion is the first intrinsic one.
        const applied = extrinsic ? (locked ? swapAtLock(turns.symmetric, turns.parity, angles) : [angles[2], angles[1], angles[0]]) : angles;
        if (turns.symmetric && signs[1] < 0) {
          // The listed middle number lies in [0, half], so the angle lies in [−half, 0]: the other solution of the pair.
          applied[1] = -applied[1]!;
          if (!locked) {
            applied[0]! += half;
            applied[2]! += half;
          }
        }
        for (let i = 0; i < 3; i++) {
          const turn = order[i]! - 1;
          const listed = turn === 1 ? signs[1] * applied[1]! : signs[turn]! * wrap(applied[turn]!, half, signs[turn]!);
          out[at + i] = turn === 0 && range === 'positive' && listed < 0 ? listed + 2 * half : listed;
          if (out[at + i] === 2 * half && turn === 0 && range === 'positive') out[at + i] = 0;
        }
        return { cosine, locked };
      };
    }
    case 'quaternion': {
      const scalar = convention.scalar === 'first' ? 0 : 3;
      const vector = convention.scalar === 'first' ? 1 : 0;
      const conjugated = (convention.product === 'hamilton') !== (convention.maps === 'body-to-reference');
      let before: Quaternion | null = null;
      return ({ quaternion, matrix }, out, at) => {
        const q = quaternion ?? quaternionOf(matrix!);
        let sensed = canonical(conjugated ? conjugate(q) : q);
        if (convention.sign === 'continuous') {
          if (before && dot(before, sensed) < 0) sensed = [-sensed[0], -sensed[1], -sensed[2], -sensed[3]];
          before = sensed;
        }
        out[at + scalar] = sensed[0];
        for (let i = 0; i < 3; i++) out[at + vector + i] = sensed[i + 1]!;
        return NOTHING;
      };
    }
    case 'dcm': {
      const transposed = (convention.maps === 'reference-to-body') !== (convention.layout === 'column-major');
      return ({ quaternion, matrix }, out, at) => {
        const m = matrix ?? matrixOf(quaternion!);
        out.set(transposed ? transpose(m) : m, at);
        return NOTHING;
      };
    }
    case 'rotation-vector': return vectorEncoder(convention.maps, (q, out, at) => {
      const sine = Math.hypot(q[1], q[2], q[3]);
      const scale = sine === 0 ? 2 : inUnit((2 * Math.atan2(sine, q[0])) / sine, convention.unit);
      for (let i = 0; i < 3; i++) out[at + i] = sine === 0 ? 0 : q[i + 1]! * scale;
      return NOTHING;
    });
    case 'axis-angle': return vectorEncoder(convention.maps, (q, out, at) => {
      const sine = Math.hypot(q[1], q[2], q[3]);
      for (let i = 0; i < 3; i++) out[at + i] = sine === 0 ? (i === 0 ? 1 : 0) : q[i + 1]! / sine;
      out[at + 3] = q[0] === 0 ? (convention.unit === 'deg' ? 180 : PI) : inUnit(2 * Math.atan2(sine, q[0]), convention.unit);
      return NOTHING;
    });
    case 'mrp': return vectorEncoder(convention.maps, (q, out, at) => {
      for (let i = 0; i < 3; i++) out[at + i] = q[i + 1]! / (1 + q[0]);
      return NOTHING;
    });
    case 'gibbs': return vectorEncoder(convention.maps, (q, out, at) => {
      if (Math.abs(q[0]) < 1e-16) return { notRepresentable: true };
      for (let i = 0; i < 3; i++) out[at + i] = q[i + 1]! / q[0];
      return NOTHING;
    });
  }
}

function vectorEncoder(maps: 'body-to-reference' | 'reference-to-body', write: (q: Quaternion, out: Float64Array, at: number) => Encoded): Encoder {
  return ({ quaternion, matrix }, out, at) => {
    const q = quaternion ?? quaternionOf(matrix!);
    return write(canonical(maps === 'body-to-reference' ? q : conjugate(q)), out, at);
  };
}

const dot = (a: Readonly<Quaternion>, b: Readonly<Quaternion>): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2] + a[3] * b[3];

/** Into (−half, half], seen as the listed number, which is the angle times its sign. */
function wrap(angle: number, half: number, sign: number): number {
  let wrapped = angle;
  if (wrapped > half) wrapped -= 2 * half;
  else if (wrapped < -half) wrapped += 2 * half;
  if (wrapped * sign === -half) wrapped = -wrapped;
  return wrapped + 0;
}

/** At lock the first intrinsic angle carries all; seen as extrinsic motion that is the last one applied, so the load moves over. */
function swapAtLock(symmetric: boolean, parity: 1 | -1, [first, middle]: readonly [number, number, number]): [number, number, number] {
  const same = symmetric ? Math.abs(middle) < 1 : middle * parity > 0;
  return [same ? first : -first, middle, 0];
}
