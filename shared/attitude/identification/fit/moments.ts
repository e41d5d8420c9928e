import type { Reader } from '../lattice/decoder.ts';
import type { Motion } from './motion.ts';

/**
 * What a reader's matrices M_i and the reference C_i have in common, as sums. Σ |M − B C A|² is linear in Σ M ⊗ C for
 * rotations B and A on either side, so one pass over the samples scores every pair of axis sets, fits every constant
 * offset, and (with Σ M ⊗ Ċ) every small lag.
 */
export interface Moments {
  readonly count: number;
  /** Σ |M|² + Σ |C|². */
  readonly squares: number;
  /** Σ M[k,l] C[m,n] at 9 (3k + l) + 3m + n. */
  readonly cross: Float64Array;
  /** Σ M[k,l] Ċ[m,n], or null where there are no times. */
  readonly crossRate: Float64Array | null;
}

/** Samples read at once: the matrices stay in the cache, and rounding does not gather over the whole recording. */
const BLOCK = 512;

/** @returns null where the reader cannot read these numbers. */
export function momentsOf(reader: Reader, numbers: Float64Array, factor: number, motion: Motion): Moments | null {
  const count = motion.matrices.length / 9;
  const { width } = reader;
  const matrices = new Float64Array(9 * BLOCK);
  const cross = new Float64Array(81);
  const crossRate = motion.derivatives ? new Float64Array(81) : null;
  const part = new Float64Array(81);
  let squares = 0;
  for (let from = 0; from < count; from += BLOCK) {
    const size = Math.min(BLOCK, count - from);
    if (!reader.read(numbers.subarray(width * from, width * (from + size)), size, factor, matrices)) return null;
    squares += squareSum(matrices, 9 * size) + squareSum(motion.matrices.subarray(9 * from), 9 * size);
    addOuter(matrices, motion.matrices, 9 * from, size, part, cross);
    if (crossRate) addOuter(matrices, motion.derivatives!, 9 * from, size, part, crossRate);
  }
  return { count, squares, cross, crossRate };
}

function squareSum(values: Float64Array, length: number): number {
  let sum = 0;
  for (let k = 0; k < length; k++) sum += values[k]! * values[k]!;
  return sum;
}

function addOuter(m: Float64Array, c: Float64Array, cFrom: number, size: number, part: Float64Array, into: Float64Array): void {
  part.fill(0);
  for (let i = 0; i < size; i++) {
    const at = cFrom + 9 * i;
    const c0 = c[at]!, c1 = c[at + 1]!, c2 = c[at + 2]!, c3 = c[at + 3]!, c4 = c[at + 4]!, c5 = c[at + 5]!, c6 = c[at + 6]!, c7 = c[at + 7]!, c8 = c[at + 8]!;
    for (let k = 0; k < 9; k++) {
      const x = m[9 * i + k]!;
      const to = 9 * k;
      part[to]! += x * c0; part[to + 1]! += x * c1; part[to + 2]! += x * c2;
      part[to + 3]! += x * c3; part[to + 4]! += x * c4; part[to + 5]! += x * c5;
      part[to + 6]! += x * c6; part[to + 7]! += x * c7; part[to + 8]! += x * c8;
    }
  }
  for (let k = 0; k < 81; k++) into[k]! += part[k]!;
}

const transposeSums = (sums: Float64Array): Float64Array => {
  const out = new Float64Array(81);
  for (let k = 0; k < 3; k++) for (let l = 0; l < 3; l++) out.set(sums.subarray(9 * (3 * k + l), 9 * (3 * k + l) + 9), 9 * (3 * l + k));
  return out;
};

/** Σ |M₊ − M₋|² / 8, M₊ and M₋ with the numbers divided by e^step and by e^−step: Σ of the squared turn a step makes. */
export function squaredTurn(reader: Reader, numbers: Float64Array, factor: number, count: number, step: number): number {
  const { width } = reader;
  const up = new Float64Array(9 * BLOCK);
  const down = new Float64Array(9 * BLOCK);
  let sum = 0;
  for (let from = 0; from < count; from += BLOCK) {
    const size = Math.min(BLOCK, count - from);
    const part = numbers.subarray(width * from, width * (from + size));
    reader.read(part, size, factor * Math.exp(-step), up);
    reader.read(part, size, factor * Math.exp(step), down);
    for (let k = 0; k < 9 * size; k++) sum += (up[k]! - down[k]!) ** 2;
  }
  return sum / 8;
}

/** The sums for the transposes of the same matrices. */
export const transposedMoments = (moments: Moments): Moments => ({
  ...moments,
  cross: transposeSums(moments.cross),
  crossRate: moments.crossRate && transposeSums(moments.crossRate),
});
