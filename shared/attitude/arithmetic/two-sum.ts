/**
 * a + b as the rounded sum and its rounding error, exactly; for all finite a, b whose sum is finite.
 * Source: Knuth, The Art of Computer Programming 2, theorem 4.2.2B.
 */
export function twoSum(a: number, b: number): readonly [sum: number, error: number] {
  const sum = a + b;
  const bb = sum - a;
  return [sum, a - (sum - bb) + (b - bb)];
}

/** As twoSum, for |a| ≥ |b| or a = 0. Source: Dekker 1971, Numerische Mathematik 18. */
export function fastTwoSum(a: number, b: number): readonly [sum: number, error: number] {
  const sum = a + b;
  return [sum, b - (sum - a)];
}
