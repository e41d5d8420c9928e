import { variedSamples } from '../search/samples.ts';
import type { Motion } from '../fit/motion.ts';
import { dominantEigenvector } from '../fit/small-matrix.ts';

/** What kind of motion a recording holds, as far as identification cares. */
export type MotionCharacter = 'one-attitude' | 'single-axis' | 'right-angles' | 'general';

/**
 * @param slack - how far, rad, attitudes may be apart and still be called one.
 */
export function motionCharacter(motion: Motion, slack: number): { readonly character: MotionCharacter; /** First sample's C. */ readonly first: Float64Array; /** Axis of a single-axis motion, in body axes of the first sample. */ readonly axis: readonly [number, number, number] | null } {
  const { matrices, places } = variedSamples(motion);
  const first = matrices.slice(0, 9);
  const scatter = new Float64Array(9);
  let largest = 0;
  let rightAngles = true;
  for (let i = 0; i < places.length; i++) for (let j = 0; j < i; j++) {
    const x = relative(matrices, i, j);
    const cosine = (x[0]! + x[4]! + x[8]! - 1) / 2;
    // At a half turn the sine vanishes and the axis is in the symmetric part: x + xᵀ covers both.
    const v = [(x[5]! - x[7]!) / 2, (x[6]! - x[2]!) / 2, (x[1]! - x[3]!) / 2];
    largest = Math.max(largest, Math.acos(Math.max(-1, Math.min(1, cosine))));
    for (let k = 0; k < 3; k++) for (let l = 0; l < 3; l++) scatter[3 * k + l]! += v[k]! * v[l]! + 0.5 * (1 - cosine) * ((x[3 * k + l]! + x[3 * l + k]!) / 2 - (k === l ? cosine : 0));
    if (x.some((entry) => Math.min(Math.abs(entry), Math.abs(Math.abs(entry) - 1)) > slack)) rightAngles = false;
  }
  if (largest <= slack) return { character: 'one-attitude', first, axis: null };
  const axis = dominantEigenvector(scatter.slice(), 3) as unknown as [number, number, number];
  const along = [0, 1, 2].reduce((sum, k) => sum + [0, 1, 2].reduce((row, l) => row + axis[k]! * scatter[3 * k + l]! * axis[l]!, 0), 0);
  const across = scatter[0]! + scatter[4]! + scatter[8]! - along;
  // The square of the off-axis angle, against noise and against the motion itself.
  const pairCount = (places.length * (places.length - 1)) / 2;
  if (across <= Math.max(1e-6 * along, pairCount * slack * slack)) return { character: 'single-axis', first, axis: [axis[0], axis[1], axis[2]] };
  return { character: rightAngles ? 'right-angles' : 'general', first, axis: null };
}

/** X_i X_jᵀ. */
function relative(m: Float64Array, i: number, j: number): Float64Array {
  const out = new Float64Array(9);
  for (let r = 0; r < 3; r++) for (let c = 0; c < 3; c++) {
    out[3 * r + c] = m[9 * i + 3 * r]! * m[9 * j + 3 * c]! + m[9 * i + 3 * r + 1]! * m[9 * j + 3 * c + 1]! + m[9 * i + 3 * r + 2]! * m[9 * j + 3 * c + 2]!;
  }
  return out;
}
