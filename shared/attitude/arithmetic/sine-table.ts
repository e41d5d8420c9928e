import { split } from './two-product.ts';
import { SINES, STEPS_PER_RIGHT_ANGLE } from './tables.gen.ts';

const HALF = STEPS_PER_RIGHT_ANGLE / 2;

/** sin and cos of jπ/1536, j = −384 … 384 (±45°), four doubles a row: sine hi, lo, cosine hi, lo. */
export const SINES_AND_COSINES: Float64Array = (() => {
  const table = new Float64Array(4 * (STEPS_PER_RIGHT_ANGLE + 1));
  for (let j = -HALF; j <= HALF; j++) {
    const row = 4 * (j + HALF);
    const size = Math.abs(j);
    const sign = j < 0 ? -1 : 1;
    table[row] = sign * SINES[2 * size]!;
    table[row + 1] = sign * SINES[2 * size + 1]!;
    table[row + 2] = SINES[2 * (STEPS_PER_RIGHT_ANGLE - size)]!;
    table[row + 3] = SINES[2 * (STEPS_PER_RIGHT_ANGLE - size) + 1]!;
  }
  return table;
})();

/** The same, each as a head of 26 bits and a tail: what the quick kernels multiply without splitting. */
export const SPLIT_SINES_AND_COSINES: Float64Array = SINES_AND_COSINES.map((value, i) => {
  const [head, rest] = split(i % 2 === 0 ? value : SINES_AND_COSINES[i - 1]!);
  return i % 2 === 0 ? head : rest + value;
});

/** Signs of what the sine and the cosine of the reduced angle are, for the quadrant of the whole one. */
export const SIGN_OF_SINE = Float64Array.of(1, -1, -1, 1);
export const SIGN_OF_COSINE = Float64Array.of(1, 1, -1, -1);
