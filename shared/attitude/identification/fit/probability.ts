/**
 * Tails of the distributions that decide whether a residual fits and whether a parameter has earned its place.
 * Source of the expansions: Press et al., Numerical Recipes, ch. 6 (incomplete gamma and beta functions, Lanczos'
 * approximation); of the quantile: Wilson & Hilferty 1931. Accuracy 1e-8 and better, far finer than any decision here.
 */
const LANCZOS = [76.1800917294715, -86.5053203294168, 24.01409824083091, -1.231739572450155, 1.20865097386618e-3, -5.395239384953e-6];

function logGamma(x: number): number {
  const t = x + 5.5;
  let sum = 1.00000000019001;
  LANCZOS.forEach((coefficient, k) => { sum += coefficient / (x + 1 + k); });
  return (x + 0.5) * Math.log(t) - t + Math.log((2.506628274631 * sum) / x);
}

/** Probability that χ² with `freedom` degrees of freedom exceeds x. */
export function chiSquareTail(x: number, freedom: number): number {
  if (x <= 0) return 1;
  const a = freedom / 2;
  const y = x / 2;
  const front = Math.exp(-y + a * Math.log(y) - logGamma(a));
  if (y < a + 1) {
    let term = 1 / a;
    let sum = term;
    for (let n = 1; n < 1000 && term > sum * 1e-15; n++) sum += term *= y / (a + n);
    return 1 - sum * front;
  }
  let b = y + 1 - a;
  let c = 1e300;
  let d = 1 / b;
  let h = d;
  for (let n = 1; n < 1000; n++) {
    const an = -n * (n - a);
    b += 2;
    d = 1 / (an * d + b);
    c = b + an / c;
    h *= d * c;
    if (Math.abs(d * c - 1) < 1e-15) break;
  }
  return front * h;
}

function betaFraction(a: number, b: number, x: number): number {
  let c = 1;
  let d = 1 / (1 - ((a + b) * x) / (a + 1));
  let h = d;
  for (let m = 1; m < 1000; m++) {
    const even = (m * (b - m) * x) / ((a + 2 * m - 1) * (a + 2 * m));
    d = 1 / (1 + even * d);
    c = 1 + even / c;
    h *= d * c;
    const odd = (-(a + m) * (a + b + m) * x) / ((a + 2 * m) * (a + 2 * m + 1));
    d = 1 / (1 + odd * d);
    c = 1 + odd / c;
    h *= d * c;
    if (Math.abs(d * c - 1) < 1e-15) break;
  }
  return h;
}

function regularisedBeta(a: number, b: number, x: number): number {
  if (x <= 0) return 0;
  if (x >= 1) return 1;
  const front = Math.exp(logGamma(a + b) - logGamma(a) - logGamma(b) + a * Math.log(x) + b * Math.log(1 - x));
  return x < (a + 1) / (a + b + 2) ? (front * betaFraction(a, b, x)) / a : 1 - (front * betaFraction(b, a, 1 - x)) / b;
}

/**
 * Probability, under the smaller of two nested models, that freeing k more parameters lowers the sum of squares from
 * `small` to `large` or further, with `freedom` degrees left: the tail of Fisher's F.
 */
export const nestedTail = (small: number, large: number, k: number, freedom: number): number =>
  freedom <= 0 ? 1 : regularisedBeta(freedom / 2, k / 2, large / small);

/** x that χ² with `freedom` degrees of freedom exceeds as rarely as a normal variable exceeds z. */
export const chiSquareQuantile = (freedom: number, z: number): number => freedom * (1 - 2 / (9 * freedom) + z * Math.sqrt(2 / (9 * freedom))) ** 3;
