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

/** Signs of what the sine and the cosine of the reduced angle are, for the quadrant of the whole one. */
export const SIGN_OF_SINE = Float64Array.of(1, -1, -1, 1);
export const SIGN_OF_COSINE = Float64Array.of(1, 1, -1, -1);
