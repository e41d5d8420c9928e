/**
 * Elementary functions in fixed-point integers, 2^320 to the unit: what the tables are made from.
 * Plain series on BigInt, slow and obviously right; the error is a few hundred units of 2^-320.
 */

export const FRACTION_BITS = 320n;
export const ONE = 1n << FRACTION_BITS;

export const multiply = (a: bigint, b: bigint): bigint => (a * b) >> FRACTION_BITS;
export const divide = (a: bigint, b: bigint): bigint => (a << FRACTION_BITS) / b;

/** atan(1/n) = Σ (−1)^k / ((2k+1) n^(2k+1)). */
function arcTangentOfReciprocal(n: bigint): bigint {
  let power = ONE / n;
  let sum = 0n;
  for (let k = 1n; power !== 0n; k += 2n) {
    sum += k % 4n === 1n ? power / k : -power / k;
    power /= n * n;
  }
  return sum;
}

/** π = 16 atan(1/5) − 4 atan(1/239). Machin 1706. */
export const PI = 16n * arcTangentOfReciprocal(5n) - 4n * arcTangentOfReciprocal(239n);

/** sin x by its series, |x| ≤ 2. */
export function sine(x: bigint): bigint {
  const square = multiply(x, x);
  let term = x;
  let sum = 0n;
  for (let k = 1n; term !== 0n && term !== -1n; k += 2n) {
    sum += term;
    term = -multiply(term, square) / ((k + 1n) * (k + 2n));
  }
  return sum;
}

/** atan x for 0 ≤ x ≤ 1: halved twice by atan x = 2 atan(x / (1 + √(1 + x²))), then by its series. */
export function arcTangent(x: bigint): bigint {
  let reduced = x;
  for (let i = 0; i < 3; i++) reduced = divide(reduced, ONE + squareRoot(ONE + multiply(reduced, reduced)));
  const square = multiply(reduced, reduced);
  let power = reduced;
  let sum = 0n;
  for (let k = 1n; power !== 0n; k += 2n) {
    sum += k % 4n === 1n ? power / k : -power / k;
    power = multiply(power, square);
  }
  return 8n * sum;
}

/** √x by Newton's iteration on integers. */
export function squareRoot(x: bigint): bigint {
  if (x === 0n) return 0n;
  const radicand = x << FRACTION_BITS;
  let guess = 1n << (BigInt(radicand.toString(2).length + 1) / 2n + 1n);
  for (;;) {
    const next = (guess + radicand / guess) >> 1n;
    if (next >= guess) return guess;
    guess = next;
  }
}

/** The double nearest to a fixed-point number. */
export function toDouble(x: bigint): number {
  if (x < 0n) return -toDouble(-x);
  const length = x === 0n ? 0 : x.toString(2).length;
  const excess = Math.max(0, length - 53);
  const kept = excess === 0 ? x : (x + (1n << BigInt(excess - 1))) >> BigInt(excess);
  return Number(kept) * 2 ** (excess - Number(FRACTION_BITS));
}

/** A double as a fixed-point number; exact for multiples of 2^-320. */
export function fromDouble(value: number): bigint {
  let integer = value;
  let shift = 0n;
  while (!Number.isInteger(integer)) {
    integer *= 2;
    shift++;
  }
  return (BigInt(integer) << FRACTION_BITS) >> shift;
}

/** x as the unevaluated sum of two doubles, the first the nearest to x. */
export function toPair(x: bigint): readonly [number, number] {
  const hi = toDouble(x);
  return [hi, toDouble(x - fromDouble(hi))];
}

/** x cut to its `bits` leading bits, as a double. */
export function leadingBits(x: bigint, bits: number): number {
  const length = (x < 0n ? -x : x).toString(2).length;
  const cut = BigInt(Math.max(0, length - bits));
  return toDouble((x >> cut) << cut);
}
