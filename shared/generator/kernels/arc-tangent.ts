import { StraightLine, type Pair } from '../straight-line.ts';
import { DEGREES_PER_RADIAN } from '../tables.ts';

/** atan(n/d) from the arctangent of the table's tangent, for pairs 0 ≤ n ≤ d named nh, nl, dh, dl. */
function body(unit: 'rad' | 'deg'): string {
  const b = new StraightLine();
  const n: Pair = { hi: 'nh', lo: 'nl' };
  const d: Pair = { hi: 'dh', lo: 'dl' };
  const tangent = (x: Pair): Pair => {
    // The table's tangent has at most 9 bits: its low half is 0, and Dekker's product is that much shorter.
    const p = b.mul('tangent', x.hi);
    const c = b.mul('134217729', x.hi);
    const high = b.sub(c, b.sub(c, x.hi));
    const low = b.sub(x.hi, high);
    return { hi: p, lo: b.add(b.add(b.sub(b.mul('tangent', high), p), b.mul('tangent', low)), b.mul('tangent', x.lo)) };
  };
  // tan(α − τ) = (n − d tan τ) / (d + n tan τ)
  const numerator = b.minus(n, tangent(d));
  const top = b.fastTwoSum(numerator.hi, numerator.lo);
  const bottom = b.plus(d, tangent(n));
  const quotient = b.over(top, bottom);
  const u = b.fastTwoSum(quotient.hi, quotient.lo);
  const square = b.square(u);
  const cube = b.times(square, u);
  // u³/3: the quotient is only near, but what it leaves is exact.
  const third = b.mul(cube.hi, b.literal(1 / 3));
  const left = b.add(b.sub(b.sub(cube.hi, b.mul('2', third)), third), cube.lo);
  const thirdLow = b.mul(left, b.literal(1 / 3));
  const p = square.hi;
  const tail = b.mul(b.mul(cube.hi, p), b.sub(b.literal(1 / 5), b.mul(p, b.sub(b.literal(1 / 7), b.mul(p, b.sub(b.literal(1 / 9), b.mul(p, b.literal(1 / 11))))))));
  const front = b.fastTwoSum(u.hi, b.sub('0', third));
  let arc: Pair = { hi: front.hi, lo: b.add(front.lo, b.add(b.sub(u.lo, thirdLow), tail)) };
  if (unit === 'deg') arc = b.times(b.fastTwoSum(arc.hi, arc.lo), b.constant(DEGREES_PER_RADIAN));
  const base: Pair = { hi: b.load('T[row]'), lo: b.load('T[row + 1]') };
  const sum = b.fastTwoSum(base.hi, b.mul('sense', arc.hi));
  const angle = b.fastTwoSum(sum.hi, b.add(sum.lo, b.add(base.lo, b.mul('sense', arc.lo))));
  b.store('S[to]', b.mul('ySign', angle.hi));
  b.store('S[to + 1]', b.mul('ySign', angle.lo));
  return b.text();
}

const PROLOGUE = `  const yh = S[at]!;
  const xh = S[at + 2]!;
  const ySign = yh < 0 ? -1 : 1;
  const xSign = xh < 0 ? -1 : 1;
  let nh = ySign * yh;
  let nl = ySign * S[at + 1]!;
  let dh = xSign * xh;
  let dl = xSign * S[at + 3]!;
  let octant = xSign < 0 ? 1 : 0;
  if (nh > dh) {
    const h = nh;
    const l = nl;
    nh = dh;
    nl = dl;
    dh = h;
    dl = l;
    octant += 2;
  }
  const t = nh / dh;
  // About 256 tan of the angle, rounded; any table row within a step or so serves.
  const step = (t * 256 + 0.5) | 0;
  const tangent = step * 0.00390625;
  const row = (octant * 257 + step) << 1;
  const sense = SENSE[octant]!;
`;

const describe = (unit: string): string => `/**
 * The angle of (x, y) in ${unit}, in double-double: in (−π, π], with atan2(0, x < 0) = +π.
 *
 * @param at - slot of y hi, lo, x hi, lo; each normalised (hi is the double nearest to the pair), not both zero.
 * @param to - slot of the angle, a pair hi, lo.
 * Accuracy: 2^-97 relative to 1 radian and 2^-90 relative to the answer; measured by
 *   tests/shared/attitude/arithmetic/arc-tangent.test.ts.
 * Method: quotient reduced by a table of atan(k/256), short series.
 */`;

export function arcTangentSource(): string {
  return `// Written by shared/generator/write.ts from shared/generator/kernels/arc-tangent.ts. Do not edit.
import { ARCS_DEGREES, ARCS_RADIANS, SENSE } from './arc-table.ts';
import { scratch } from './scratch.ts';

${describe('radians')}
export function arcTangentRadians(at: number, to: number): void {
  const S = scratch;
  const T = ARCS_RADIANS;
${PROLOGUE}${body('rad')}
}

${describe('degrees; exact at multiples of 45°')}
export function arcTangentDegrees(at: number, to: number): void {
  const S = scratch;
  const T = ARCS_DEGREES;
${PROLOGUE}${body('deg')}
}
`;
}
