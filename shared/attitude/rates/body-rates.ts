import type { DcmConvention, QuaternionConvention } from '../convention.ts';
import { conjugates, transposesMatrix } from '../kernels/frames.ts';

/** Angular velocity of the body axes relative to the reference axes, components in body axes, rad/s. */
export type BodyRates = [number, number, number];

/** C, nine numbers row by row: v_body = C v_ref. */
export type Components = Float64Array;

/**
 * ω_ref of ω_body: vee(Ċᵀ C) = det(C) Cᵀ ω_body. The determinant matters only between sets of different handedness.
 * Accuracy: plain double precision, a few units in the last place of |ω|.
 */
export function toReference(c: Components, [p, q, r]: BodyRates, determinant: number): [number, number, number] {
  return [0, 1, 2].map((j) => determinant * (c[j]! * p + c[3 + j]! * q + c[6 + j]! * r)) as [number, number, number];
}

/** ω_body of ω_ref: det(C) C ω_ref. */
export function fromReference(c: Components, [x, y, z]: readonly [number, number, number], determinant: number): BodyRates {
  return [0, 1, 2].map((i) => determinant * (c[3 * i]! * x + c[3 * i + 1]! * y + c[3 * i + 2]! * z)) as BodyRates;
}


interface Listing {
  readonly scalar: number;
  readonly vector: number;
  /** −1 where the numbers state the conjugate of Hamilton's body-to-reference quaternion. */
  readonly sense: 1 | -1;
}

function listingOf(convention: QuaternionConvention): Listing {
  const first = convention.scalar === 'first';
  return { scalar: first ? 0 : 3, vector: first ? 1 : 0, sense: conjugates(convention) ? -1 : 1 };
}

/**
 * ω_body = 2 vec(q* q̇) / |q|² of a quaternion and its derivative as listed. A part of q̇ along q changes the norm only
 * and is left out.
 */
export function fromQuaternionRate(convention: QuaternionConvention, n: Float64Array, at: number, d: Float64Array, dAt: number): BodyRates {
  const { scalar, vector, sense } = listingOf(convention);
  const [w, x, y, z] = [n[at + scalar]!, sense * n[at + vector]!, sense * n[at + vector + 1]!, sense * n[at + vector + 2]!];
  const [dw, dx, dy, dz] = [d[dAt + scalar]!, sense * d[dAt + vector]!, sense * d[dAt + vector + 1]!, sense * d[dAt + vector + 2]!];
  const scale = 2 / (w * w + x * x + y * y + z * z);
  return [
    scale * (w * dx - x * dw - y * dz + z * dy),
    scale * (w * dy + x * dz - y * dw - z * dx),
    scale * (w * dz - x * dy + y * dx - z * dw),
  ];
}

/** q̇ = ½ q ω as listed: the derivative at constant norm of the numbers as they are given. */
export function toQuaternionRate(convention: QuaternionConvention, n: Float64Array, at: number, [p, q, r]: BodyRates, out: Float64Array, outAt: number): void {
  const { scalar, vector, sense } = listingOf(convention);
  const [w, x, y, z] = [n[at + scalar]!, sense * n[at + vector]!, sense * n[at + vector + 1]!, sense * n[at + vector + 2]!];
  out[outAt + scalar] = (-x * p - y * q - z * r) / 2;
  out[outAt + vector] = (sense * (w * p + y * r - z * q)) / 2;
  out[outAt + vector + 1] = (sense * (w * q - x * r + z * p)) / 2;
  out[outAt + vector + 2] = (sense * (w * r + x * q - y * p)) / 2;
}

/** Where element (i, j) of C stands in the listed matrix. */
const elementOf = (convention: DcmConvention) => (transposesMatrix(convention) ? (i: number, j: number) => 3 * i + j : (i: number, j: number) => 3 * j + i);

/** ω_body = vee(C Ċᵀ) of a matrix and its derivative as listed; the symmetric part, which no rotation has, is left out. */
export function fromMatrixRate(convention: DcmConvention, c: Components, d: Float64Array, dAt: number): BodyRates {
  const element = elementOf(convention);
  const product = (i: number, j: number): number => [0, 1, 2].reduce((sum, k) => sum + c[3 * i + k]! * d[dAt + element(j, k)]!, 0);
  return [(product(2, 1) - product(1, 2)) / 2, (product(0, 2) - product(2, 0)) / 2, (product(1, 0) - product(0, 1)) / 2];
}

/** Ċ = −[ω×] C as listed. */
export function toMatrixRate(convention: DcmConvention, c: Components, [p, q, r]: BodyRates, out: Float64Array, outAt: number): void {
  const element = elementOf(convention);
  for (let j = 0; j < 3; j++) {
    const [x, y, z] = [c[j]!, c[3 + j]!, c[6 + j]!];
    out[outAt + element(0, j)] = r * y - q * z;
    out[outAt + element(1, j)] = p * z - r * x;
    out[outAt + element(2, j)] = q * x - p * y;
  }
}
