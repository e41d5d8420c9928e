import type { Quaternion } from './quaternion.ts';

/** Nine numbers, row by row. */
export type Matrix = [number, number, number, number, number, number, number, number, number];

export const transpose = (m: Readonly<Matrix>): Matrix => [m[0], m[3], m[6], m[1], m[4], m[7], m[2], m[5], m[8]];

export const determinant = (m: Readonly<Matrix>): number =>
  m[0] * (m[4] * m[8] - m[5] * m[7]) - m[1] * (m[3] * m[8] - m[5] * m[6]) + m[2] * (m[3] * m[7] - m[4] * m[6]);

/** Largest element of |M Mᵀ − I|. */
export function orthogonalityDefect(m: Readonly<Matrix>): number {
  let worst = 0;
  for (let i = 0; i < 3; i++) {
    for (let j = i; j < 3; j++) {
      const dot = m[3 * i]! * m[3 * j]! + m[3 * i + 1]! * m[3 * j + 1]! + m[3 * i + 2]! * m[3 * j + 2]!;
      worst = Math.max(worst, Math.abs(dot - (i === j ? 1 : 0)));
    }
  }
  return worst;
}

/** R(q) for a unit quaternion: v_ref = R v_body. */
export function matrixOf([w, x, y, z]: Readonly<Quaternion>): Matrix {
  return [
    w * w + x * x - y * y - z * z, 2 * (x * y - w * z), 2 * (x * z + w * y),
    2 * (x * y + w * z), w * w - x * x + y * y - z * z, 2 * (y * z - w * x),
    2 * (x * z - w * y), 2 * (y * z + w * x), w * w - x * x - y * y + z * z,
  ];
}

/**
 * The quaternion of a rotation matrix R (v_ref = R v_body), of norm 1 and any sign.
 * Source: Shepperd 1978, J. Guidance and Control 1(3): the largest of the four pivots avoids cancellation.
 */
export function quaternionOf(m: Readonly<Matrix>): Quaternion {
  const trace = m[0] + m[4] + m[8];
  const pivot = [trace, m[0], m[4], m[8]];
  const largest = pivot.indexOf(Math.max(...pivot));
  const q: Quaternion = largest === 0 ? [1 + trace, m[7] - m[5], m[2] - m[6], m[3] - m[1]]
    : largest === 1 ? [m[7] - m[5], 1 + m[0] - m[4] - m[8], m[1] + m[3], m[2] + m[6]]
      : largest === 2 ? [m[2] - m[6], m[1] + m[3], 1 - m[0] + m[4] - m[8], m[5] + m[7]]
        : [m[3] - m[1], m[2] + m[6], m[5] + m[7], 1 - m[0] - m[4] + m[8]];
  const norm = Math.hypot(...q);
  return [q[0] / norm, q[1] / norm, q[2] / norm, q[3] / norm];
}

/**
 * The nearest orthogonal matrix in the Frobenius norm: the orthogonal factor of the polar decomposition.
 * Source: Higham 1986, SIAM J. Sci. Stat. Comput. 7(4), Newton's iteration M ← (M + M⁻ᵀ)/2; converges for every
 * non-singular M and keeps the sign of its determinant.
 */
export function nearestOrthogonal(m: Readonly<Matrix>): Matrix {
  let x: Matrix = [...m];
  for (let step = 0; step < 60; step++) {
    const d = determinant(x);
    const cofactors: Matrix = [
      x[4] * x[8] - x[5] * x[7], x[5] * x[6] - x[3] * x[8], x[3] * x[7] - x[4] * x[6],
      x[2] * x[7] - x[1] * x[8], x[0] * x[8] - x[2] * x[6], x[1] * x[6] - x[0] * x[7],
      x[1] * x[5] - x[2] * x[4], x[2] * x[3] - x[0] * x[5], x[0] * x[4] - x[1] * x[3],
    ];
    const next = x.map((element, i) => (element + cofactors[i]! / d) / 2) as Matrix;
    const change = Math.max(...next.map((element, i) => Math.abs(element - x[i]!)));
    x = next;
    if (change < 1e-16) break;
  }
  return x;
}
