import { ZERO, type Pair, type Scalar, type StraightLine } from './straight-line.ts';

/**
 * x = head + tail with a head of at most 26 bits: products of heads are exact in one multiplication, and the tails
 * need no more than double precision. Some 2^-76 relative, at a third of the price of a pair.
 *
 * The quick kernels work in this and test at the end whether the error could change the rounding (Ziv 1991, ACM TOMS
 * 17(3), "Fast evaluation of elementary mathematical functions with correctly rounded last bit"); if it could, the
 * double-double kernels answer instead.
 */
export interface HeadTail {
  readonly head: Scalar;
  readonly tail: Scalar;
}

const SPLITTER = '134217729';

/** The leading 26 bits of a double. */
export function headOf(b: StraightLine, a: Scalar): Scalar {
  const c = b.mul(SPLITTER, a);
  return b.sub(c, b.sub(c, a));
}

export function headTail(b: StraightLine, { hi, lo }: Pair): HeadTail {
  if (hi === ZERO) return { head: ZERO, tail: lo };
  const head = headOf(b, hi);
  return { head, tail: b.add(b.sub(hi, head), lo) };
}

/** x y as an exact product of the heads and what is left of it. */
export function product(b: StraightLine, x: HeadTail, y: HeadTail): Pair {
  const cross = b.add(b.mul(x.head, y.tail), b.mul(x.tail, b.add(y.head, y.tail)));
  return { hi: b.mul(x.head, y.head), lo: cross };
}

export function squareOf(b: StraightLine, x: HeadTail): Pair {
  return { hi: b.mul(x.head, x.head), lo: b.mul(x.tail, b.add(b.add(x.head, x.head), x.tail)) };
}

/** Whether hi + lo rounds to the same double all over lo ± error, and that double. */
export function roundingTest(b: StraightLine, { hi, lo }: Pair, error: Scalar): { rounded: Scalar; settled: Scalar } {
  const lower = b.add(hi, b.sub(lo, error));
  const upper = b.add(hi, b.add(lo, error));
  return { rounded: lower, settled: b.let(`${lower} === ${upper}`, lower, upper) };
}

/** √x by one correction of the root of the high part, which is cut to 26 bits so that its square is exact. */
export function root(b: StraightLine, x: Pair): HeadTail {
  const sum = b.fastTwoSum(x.hi, x.lo);
  const head = headOf(b, b.sqrt(sum.hi));
  const rest = b.add(b.sub(sum.hi, b.mul(head, head)), sum.lo);
  // The next term of the series, −tail²/2 head, is 2^-54 of the root: one more correction.
  const twice = b.add(head, head);
  const reciprocal = b.div('1', twice);
  const tail = b.mul(rest, reciprocal);
  return { head, tail: b.sub(tail, b.mul(b.mul(tail, tail), reciprocal)) };
}

export function reciprocalOf(b: StraightLine, x: HeadTail): HeadTail {
  const near = b.div('1', b.add(x.head, x.tail));
  const head = headOf(b, near);
  const rest = b.sub(b.sub('1', b.mul(head, x.head)), b.mul(head, x.tail));
  return { head, tail: b.mul(rest, near) };
}

/** Stores what the pairs round to, and answers whether all of them are settled, being known to within `error`. */
export function storeRounded(b: StraightLine, slot: number, answer: readonly Pair[], error: number): Scalar {
  const tests = answer.map((pair) => roundingTest(b, pair, b.literal(error)));
  tests.forEach(({ rounded }, i) => b.storePair(slot + 2 * i, { hi: rounded, lo: '0' }));
  return b.let(tests.map(({ settled }) => settled).join(' && '), ...tests.map(({ settled }) => settled));
}
