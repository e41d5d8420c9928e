import { conjugates, transposesMatrix } from '../../kernels/frames.ts';
import type { DcmConvention, QuaternionConvention } from '../../convention.ts';
import { TURN_COUNT, turnMatrix } from '../lattice/turns.ts';
import { eulerClassOf, type EulerClass } from './euler-class.ts';
import type { RateStatement } from './rate-identification.ts';
import { turnOf } from '../lattice/turns.ts';
import { bodyPermutation, referencePermutation } from '../../axes.ts';

/**
 * What numbers a rate is, whatever it is called: angular velocity in body or reference axes turned by one of the 24 turns,
 * rates of Euler angles of one class, derivatives of quaternions and matrices between turned sets.
 */
export type RateHypothesis =
  | { readonly kind: 'body' | 'reference'; readonly turn: number; readonly degrees: boolean }
  | { readonly kind: 'euler'; readonly of: EulerClass; readonly degrees: boolean }
  | { readonly kind: 'quaternion'; readonly scalarLast: boolean; readonly conjugated: boolean; readonly bodyTurn: number; readonly referenceTurn: number }
  | { readonly kind: 'dcm'; readonly transposed: boolean; readonly bodyTurn: number; readonly referenceTurn: number };

const TURN_MATRICES = Array.from({ length: TURN_COUNT }, (_, turn) => turnMatrix(turn));
const DEG = Math.PI / 180;

/** One sample: C in standard axes, ω in standard body axes, rad/s. */
export interface RateSample {
  readonly c: ArrayLike<number>;
  readonly omega: ArrayLike<number>;
}

/** Closer than this to its gimbal lock, rad squared, the line of nodes is lost. */
const LOCK = 1e-16;

/**
 * Parts of ω along a reference line, the nodes and a body line, which are not at right angles to each other.
 * @param into - parts along the three lines, and the cosine between the reference line and the body line.
 * @returns false at lock, where there are no nodes.
 */
export function partsAlong({ c, omega }: RateSample, [i, k]: readonly [number, number], into: Float64Array): boolean {
  const u = [c[i]!, c[3 + i]!, c[6 + i]!];
  const [p, q] = [(k + 1) % 3, (k + 2) % 3];
  const sine2 = u[p]! * u[p]! + u[q]! * u[q]!;
  if (sine2 < LOCK) return false;
  into[0] = omega[0]! * u[0]! + omega[1]! * u[1]! + omega[2]! * u[2]!;
  // e_k × u: its components p and q are −u_q and u_p.
  into[1] = (omega[q]! * u[p]! - omega[p]! * u[q]!) / Math.sqrt(sine2);
  into[2] = omega[k]!;
  into[3] = u[k]!;
  return true;
}

/** The numbers that a hypothesis expects of a sample; null at its gimbal lock. */
export function expectedNumbers(hypothesis: RateHypothesis, sample: RateSample): number[] | null {
  const { c, omega } = sample;
  switch (hypothesis.kind) {
    case 'body': return turned(TURN_MATRICES[hypothesis.turn]!, [omega[0]!, omega[1]!, omega[2]!], hypothesis.degrees);
    case 'reference': return turned(TURN_MATRICES[hypothesis.turn]!, [0, 1, 2].map((j) => c[j]! * omega[0]! + c[3 + j]! * omega[1]! + c[6 + j]! * omega[2]!), hypothesis.degrees);
    case 'euler': {
      const along = new Float64Array(4);
      if (!partsAlong(sample, hypothesis.of.lines, along)) return null;
      const [first, nodes, last, g] = along as unknown as readonly [number, number, number, number];
      const parts = [(first - g * last) / (1 - g * g), nodes, (last - g * first) / (1 - g * g)];
      return hypothesis.of.listed.map((part, place) => (hypothesis.of.signs[place]! * parts[part]!) / (hypothesis.degrees ? DEG : 1));
    }
    case 'dcm': {
      const b = TURN_MATRICES[hypothesis.bodyTurn]!, r = TURN_MATRICES[hypothesis.referenceTurn]!;
      const turnedRate = product(product(b, matrixRate(c, omega)), transposed(r));
      return hypothesis.transposed ? transposed(turnedRate) : turnedRate;
    }
    case 'quaternion': {
      const b = TURN_MATRICES[hypothesis.bodyTurn]!, r = TURN_MATRICES[hypothesis.referenceTurn]!;
      const [w, x, y, z] = quaternionOf(product(product(b, [...Array.from(c)]), transposed(r)));
      const [p, q, s] = turned(b, [omega[0]!, omega[1]!, omega[2]!], false) as [number, number, number];
      const vector = [(w * p + y * s - z * q) / 2, (w * q - x * s + z * p) / 2, (w * s + x * q - y * p) / 2].map((v) => (hypothesis.conjugated ? -v : v));
      const scalar = (-x * p - y * q - z * s) / 2;
      return hypothesis.scalarLast ? [...vector, scalar] : [scalar, ...vector];
    }
  }
}

function turned(m: ArrayLike<number>, v: readonly number[], degrees: boolean): number[] {
  return [0, 1, 2].map((i) => (m[3 * i]! * v[0]! + m[3 * i + 1]! * v[1]! + m[3 * i + 2]! * v[2]!) / (degrees ? DEG : 1));
}

/** Ċ = −[ω×] C. */
export function matrixRate(c: ArrayLike<number>, omega: ArrayLike<number>): number[] {
  const [p, q, r] = [omega[0]!, omega[1]!, omega[2]!];
  return [0, 1, 2].map((j) => r * c[3 + j]! - q * c[6 + j]!)
    .concat([0, 1, 2].map((j) => p * c[6 + j]! - r * c[j]!), [0, 1, 2].map((j) => q * c[j]! - p * c[3 + j]!));
}

const product = (a: ArrayLike<number>, b: ArrayLike<number>): number[] => Array.from({ length: 9 }, (_, at) => {
  const [i, j] = [Math.floor(at / 3), at % 3];
  return a[3 * i]! * b[j]! + a[3 * i + 1]! * b[3 + j]! + a[3 * i + 2]! * b[6 + j]!;
});
const transposed = (m: ArrayLike<number>): number[] => [m[0]!, m[3]!, m[6]!, m[1]!, m[4]!, m[7]!, m[2]!, m[5]!, m[8]!];

/** Hamilton's body-to-reference quaternion of C (v_body = C v_ref), of either sign. */
function quaternionOf(c: readonly number[]): [number, number, number, number] {
  const [m00, m01, m02, m10, m11, m12, m20, m21, m22] = c as [number, number, number, number, number, number, number, number, number];
  const squares = [1 + m00 + m11 + m22, 1 + m00 - m11 - m22, 1 - m00 + m11 - m22, 1 - m00 - m11 + m22];
  const largest = squares.indexOf(Math.max(...squares));
  const s = 1 / (2 * Math.sqrt(squares[largest]!));
  const rows: readonly [number, number, number, number][] = [
    [squares[0]!, m12 - m21, m20 - m02, m01 - m10], [m12 - m21, squares[1]!, m01 + m10, m02 + m20],
    [m20 - m02, m01 + m10, squares[2]!, m12 + m21], [m01 - m10, m02 + m20, m12 + m21, squares[3]!],
  ];
  return rows[largest]!.map((entry) => entry * s) as [number, number, number, number];
}

/** The hypothesis that a statement is. */
export function hypothesisOf({ attitude, rate }: RateStatement): RateHypothesis {
  const turns = { bodyTurn: turnOf(bodyPermutation(attitude.body)), referenceTurn: turnOf(referencePermutation(attitude.reference)) };
  switch (rate.rate) {
    case 'body': return { kind: 'body', turn: turns.bodyTurn, degrees: rate.unit === 'deg/s' };
    case 'reference': return { kind: 'reference', turn: turns.referenceTurn, degrees: rate.unit === 'deg/s' };
    case 'euler': return { kind: 'euler', of: eulerClassOf(rate.angles), degrees: rate.unit === 'deg/s' };
    case 'quaternion': return { kind: 'quaternion', ...turns, scalarLast: (attitude as QuaternionConvention).scalar === 'last', conjugated: conjugates(attitude as QuaternionConvention) };
    case 'dcm': return { kind: 'dcm', ...turns, transposed: !transposesMatrix(attitude as DcmConvention) };
  }
}
