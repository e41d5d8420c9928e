import type { Motion } from '../fit/motion.ts';

/** A few samples that show as much of the motion as the recording holds, and pairs of them. */
export interface VariedSamples {
  /** Places among the used samples of the motion. */
  readonly places: Int32Array;
  readonly matrices: Float64Array;
  /** Places in `places`, two by two. */
  readonly pairs: Int32Array;
  /** |C_i − C_j|² of each pair. */
  readonly chords: Float64Array;
}

/** Varied samples are chosen out of so many. */
export const POOL = 400;
const MOST = 48;

/** Farthest first: each next sample is the one farthest from all before it, out of an even selection. */
export function variedSamples({ matrices }: Pick<Motion, 'matrices'>): VariedSamples {
  const count = matrices.length / 9;
  const pool = Math.min(POOL, count);
  const placeOf = (k: number): number => (pool === 1 ? 0 : Math.round((k * (count - 1)) / (pool - 1)));
  const nearest = new Float64Array(pool).fill(Infinity);
  const chosen: number[] = [];
  let next = 0;
  while (chosen.length < Math.min(MOST, pool)) {
    chosen.push(next);
    let farthest = -1;
    let best = next;
    for (let k = 0; k < pool; k++) {
      const distance = squaredChord(matrices, placeOf(k), placeOf(next));
      if (distance < nearest[k]!) nearest[k] = distance;
      if (nearest[k]! > farthest && !(nearest[k] === 0 && chosen.includes(k))) {
        farthest = nearest[k]!;
        best = k;
      }
    }
    if (best === next) break;
    next = best;
  }
  return withPairs(Int32Array.from(chosen, placeOf), matrices);
}

function withPairs(places: Int32Array, all: Float64Array): VariedSamples {
  const n = places.length;
  const matrices = new Float64Array(9 * n);
  places.forEach((place, k) => matrices.set(all.subarray(9 * place, 9 * place + 9), 9 * k));
  const pairs: number[] = [];
  for (let k = 0; k < n; k++) for (const step of [1, 2, 5]) if (k + step < n) pairs.push(k, k + step);
  const chords = Float64Array.from({ length: pairs.length / 2 }, (_, p) => squaredChord(matrices, pairs[2 * p]!, pairs[2 * p + 1]!));
  return { places, matrices, pairs: Int32Array.from(pairs), chords };
}

export function squaredChord(m: Float64Array, i: number, j: number): number {
  let sum = 0;
  for (let k = 0; k < 9; k++) sum += (m[9 * i + k]! - m[9 * j + k]!) ** 2;
  return sum;
}

/** The numbers of some samples, side by side. */
export function numbersAt(numbers: Float64Array, width: number, places: ArrayLike<number>): Float64Array {
  const out = new Float64Array(width * places.length);
  for (let k = 0; k < places.length; k++) for (let j = 0; j < width; j++) out[width * k + j] = numbers[width * places[k]! + j]!;
  return out;
}

/**
 * How far chords may differ: |M_i − M_j| is the same whatever the axis sets and the constant offsets, so it differs
 * from |C_i − C_j| by no more than √2 (|r_i| + |r_j|); errors beyond nine standard deviations do not happen.
 */
export const chordSlack = (sigma: number): number => Math.SQRT2 * 2 * 9 * sigma;

/** Largest difference of chords over the pairs, and the sum of their squares. */
export function chordMismatch(m: Float64Array, pairs: Int32Array, chords: Float64Array): { readonly largest: number; readonly squares: number } {
  let largest = 0;
  let squares = 0;
  for (let p = 0; p < chords.length; p++) {
    const difference = Math.abs(Math.sqrt(squaredChord(m, pairs[2 * p]!, pairs[2 * p + 1]!)) - Math.sqrt(chords[p]!));
    if (difference > largest) largest = difference;
    squares += difference * difference;
  }
  return { largest, squares };
}
