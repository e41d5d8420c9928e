import { twoProduct } from './two-product.ts';
import { fastTwoSum, twoSum } from './two-sum.ts';

/**
 * A number as the unevaluated sum hi + lo of two doubles, hi the double nearest to it: 106 bits and more.
 *
 * These functions are the plain reading of the rules that the generated kernels follow, and serve where speed is
 * no matter. Ranges are those of twoProduct; errors are relative to the exact result.
 * Source: Joldes, Muller & Popescu 2017, ACM TOMS 44(2), "Tight and rigorous error bounds for basic building blocks
 * of double-word arithmetic".
 */
export type DoubleDouble = readonly [hi: number, lo: number];

export const ZERO: DoubleDouble = [0, 0];

export const exact = (a: number): DoubleDouble => [a, 0];
export const negative = ([hi, lo]: DoubleDouble): DoubleDouble => [-hi, -lo];

/** x + y, within 3 · 2^-106. */
export function add(x: DoubleDouble, y: DoubleDouble): DoubleDouble {
  const [s, e] = twoSum(x[0], y[0]);
  const [t, f] = twoSum(x[1], y[1]);
  const [u, g] = fastTwoSum(s, e + t);
  return fastTwoSum(u, f + g);
}

export const subtract = (x: DoubleDouble, y: DoubleDouble): DoubleDouble => add(x, negative(y));

/** x y, within 7 · 2^-106. */
export function multiply(x: DoubleDouble, y: DoubleDouble): DoubleDouble {
  const [p, e] = twoProduct(x[0], y[0]);
  return fastTwoSum(p, e + (x[0] * y[1] + x[1] * y[0]));
}

/** x / y, within 15 · 2^-106; y ≠ 0. */
export function divide(x: DoubleDouble, y: DoubleDouble): DoubleDouble {
  const q = x[0] / y[0];
  const [p, e] = twoProduct(q, y[0]);
  return fastTwoSum(q, (x[0] - p - e + x[1] - q * y[1]) / y[0]);
}

/** √x, within 8 · 2^-106; x ≥ 0. */
export function squareRoot(x: DoubleDouble): DoubleDouble {
  const s = Math.sqrt(x[0]);
  if (s === 0) return ZERO;
  const [p, e] = twoProduct(s, s);
  return fastTwoSum(s, (x[0] - p - e + x[1]) / (s + s));
}
