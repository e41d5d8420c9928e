/** 2^27 + 1: splits 53 bits into 26 and 26 (the sign of the low half is the missing bit). */
const SPLITTER = 134217729;

/** a = high + low, each of at most 26 bits; |a| < 2^996. Source: Veltkamp, in Dekker 1971, Numerische Mathematik 18. */
export function split(a: number): readonly [high: number, low: number] {
  const c = SPLITTER * a;
  const high = c - (c - a);
  return [high, a - high];
}

/**
 * a b as the rounded product and its rounding error, exactly, for |a|, |b| < 2^996 and a product that is finite and
 * not below 2^-969 (or is zero because a factor is): there the error itself would be less than the least double.
 * Source: Dekker 1971, Numerische Mathematik 18. No fused multiply-add is assumed, so every machine gives the same.
 */
export function twoProduct(a: number, b: number): readonly [product: number, error: number] {
  const product = a * b;
  const [ah, al] = split(a);
  const [bh, bl] = split(b);
  return [product, ah * bh - product + (ah * bl + al * bh) + al * bl];
}
