/** Products and eigenvectors of a few rows and columns, row by row in flat arrays. */

export function multiply(a: ArrayLike<number>, b: ArrayLike<number>): Float64Array {
  const out = new Float64Array(9);
  for (let i = 0; i < 3; i++) for (let j = 0; j < 3; j++) out[3 * i + j] = a[3 * i]! * b[j]! + a[3 * i + 1]! * b[3 + j]! + a[3 * i + 2]! * b[6 + j]!;
  return out;
}

export const transposed = (m: ArrayLike<number>): Float64Array => Float64Array.of(m[0]!, m[3]!, m[6]!, m[1]!, m[4]!, m[7]!, m[2]!, m[5]!, m[8]!);

export const applied = (m: ArrayLike<number>, x: number, y: number, z: number): [number, number, number] =>
  [m[0]! * x + m[1]! * y + m[2]! * z, m[3]! * x + m[4]! * y + m[5]! * z, m[6]! * x + m[7]! * y + m[8]! * z];

/** exp(−[v×]): the frame rotation R(axis, angle) with v = angle · axis; R3 for an axis along z. */
export function frameRotation(x: number, y: number, z: number): Float64Array {
  const angle = Math.sqrt(x * x + y * y + z * z);
  const s = angle < 1e-8 ? 1 : Math.sin(angle) / angle;
  const half = angle < 1e-8 ? 0.5 : 2 * (Math.sin(angle / 2) / angle) ** 2;
  const k = [0, z, -y, -z, 0, x, y, -x, 0];
  return Float64Array.from(multiply(k, k), (kk, i) => (i % 4 === 0 ? 1 : 0) + s * k[i]! + half * kk);
}

/** v with frameRotation(v) = m, its length in [0, π]. */
export function rotationVectorOf(m: ArrayLike<number>): [number, number, number] {
  const x = (m[5]! - m[7]!) / 2, y = (m[6]! - m[2]!) / 2, z = (m[1]! - m[3]!) / 2;
  const sine = Math.sqrt(x * x + y * y + z * z);
  const cosine = (m[0]! + m[4]! + m[8]! - 1) / 2;
  const angle = Math.atan2(sine, cosine);
  if (cosine > -0.9) {
    const scale = sine < 1e-12 ? 1 : angle / sine;
    return [scale * x, scale * y, scale * z];
  }
  // Near a half turn the axis is in the symmetric part: n nᵀ = (sym(M) − cos a I) / (1 − cos a).
  const pivot = m[0]! >= m[4]! && m[0]! >= m[8]! ? 0 : m[4]! >= m[8]! ? 1 : 2;
  const column = [0, 1, 2].map((i) => (m[3 * i + pivot]! + m[3 * pivot + i]!) / 2 - (i === pivot ? cosine : 0));
  const norm = Math.hypot(...column);
  const sense = column[0]! * x + column[1]! * y + column[2]! * z < 0 ? -1 : 1;
  return column.map((entry) => (sense * angle * entry) / norm) as [number, number, number];
}

/** Eigenvector of the largest eigenvalue of a symmetric n × n matrix, by Jacobi's rotations; overwrites m. */
export function dominantEigenvector(m: Float64Array, n: number): Float64Array {
  const v = new Float64Array(n * n);
  for (let i = 0; i < n; i++) v[i * n + i] = 1;
  for (let sweep = 0; sweep < 12; sweep++) {
    let off = 0;
    let size = 0;
    for (let p = 0; p < n; p++) for (let q = 0; q < n; q++) if (p === q) size += m[p * n + q]! ** 2; else off += m[p * n + q]! ** 2;
    if (off <= 1e-30 * size) break;
    for (let p = 0; p < n - 1; p++) for (let q = p + 1; q < n; q++) {
      const apq = m[p * n + q]!;
      if (apq === 0) continue;
      const theta = (m[q * n + q]! - m[p * n + p]!) / (2 * apq);
      const t = (theta >= 0 ? 1 : -1) / (Math.abs(theta) + Math.sqrt(theta * theta + 1));
      const c = 1 / Math.sqrt(t * t + 1);
      const s = t * c;
      for (let k = 0; k < n; k++) {
        const kp = m[k * n + p]!, kq = m[k * n + q]!;
        m[k * n + p] = c * kp - s * kq;
        m[k * n + q] = s * kp + c * kq;
      }
      for (let k = 0; k < n; k++) {
        const pk = m[p * n + k]!, qk = m[q * n + k]!;
        m[p * n + k] = c * pk - s * qk;
        m[q * n + k] = s * pk + c * qk;
        const vp = v[k * n + p]!, vq = v[k * n + q]!;
        v[k * n + p] = c * vp - s * vq;
        v[k * n + q] = s * vp + c * vq;
      }
    }
  }
  let best = 0;
  for (let i = 1; i < n; i++) if (m[i * n + i]! > m[best * n + best]!) best = i;
  return Float64Array.from({ length: n }, (_, k) => v[k * n + best]!);
}
