import { writeRotation } from '../lattice/rotation-of-quaternion.ts';
import { dominantEigenvector } from './small-matrix.ts';

const k4 = new Float64Array(16);

/** The rotation R that makes Σ G[k,l] R[k,l] largest: Davenport's eigenvector, so a reflection never comes out. */
export function bestRotation(g: ArrayLike<number>): Float64Array {
  const trace = g[0]! + g[4]! + g[8]!;
  const u = [g[7]! - g[5]!, g[2]! - g[6]!, g[3]! - g[1]!];
  k4[0] = trace;
  for (let i = 0; i < 3; i++) {
    k4[i + 1] = k4[4 * (i + 1)] = u[i]!;
    for (let j = 0; j < 3; j++) k4[4 * (i + 1) + j + 1] = g[3 * i + j]! + g[3 * j + i]! - (i === j ? trace : 0);
  }
  const q = dominantEigenvector(k4, 4);
  const out = new Float64Array(9);
  writeRotation(q[0]!, q[1]!, q[2]!, q[3]!, out, 0);
  return out;
}

export const dot9 = (a: ArrayLike<number>, b: ArrayLike<number>): number => {
  let sum = 0;
  for (let k = 0; k < 9; k++) sum += a[k]! * b[k]!;
  return sum;
};
