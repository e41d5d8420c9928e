import { headOf, headTail, product, type HeadTail } from '../head-tail.ts';
import { StraightLine, type Pair } from '../straight-line.ts';
import { DEGREES_PER_RADIAN } from '../tables.ts';

function body(unit: 'rad' | 'deg'): string {
  const b = new StraightLine();
  const n: HeadTail = { head: 'nh', tail: 'nt' };
  const d: HeadTail = { head: 'dh', tail: 'dt' };
  // tan(α − τ) = (n − d tan τ) / (d + n tan τ); tan τ has 9 bits, so the products of the heads and their sums are exact.
  const top = b.sub(n.head, b.mul('tangent', d.head));
  const topTail = b.sub(n.tail, b.mul('tangent', d.tail));
  const bottom = b.add(d.head, b.mul('tangent', n.head));
  const bottomTail = b.add(d.tail, b.mul('tangent', n.tail));
  const whole = b.add(bottom, bottomTail);
  const reciprocal = b.div('1', whole);
  const quotient = headOf(b, b.mul(b.add(top, topTail), reciprocal));
  const divisor = headOf(b, whole);
  const divisorTail = b.add(b.sub(bottom, divisor), bottomTail);
  const rest = b.add(b.sub(b.sub(top, b.mul(quotient, divisor)), b.mul(quotient, divisorTail)), topTail);
  const quotientTail = b.mul(rest, reciprocal);
  const u = b.add(quotient, quotientTail);
  const square = b.mul(u, u);
  const series = b.mul(b.mul(u, square), b.add(b.literal(-1 / 3), b.mul(square, b.add(b.literal(1 / 5), b.mul(square, b.add(b.literal(-1 / 7), b.mul(square, b.literal(1 / 9))))))));
  let arc: Pair = { hi: quotient, lo: b.add(quotientTail, series) };
  if (unit === 'deg') arc = product(b, { head: arc.hi, tail: arc.lo }, headTail(b, b.constant(DEGREES_PER_RADIAN)));
  const [base, baseTail] = [b.load('T[row]'), b.load('T[row + 1]')];
  const sum = b.fastTwoSum(base, b.mul('sense', arc.hi));
  const low = b.add(sum.lo, b.add(baseTail, b.mul('sense', arc.lo)));
  b.store('S[to]', b.mul('ySign', sum.hi));
  b.store('S[to + 1]', b.mul('ySign', low));
  return b.text();
}

const PROLOGUE = `  const yh = S[at]!;
  const xh = S[at + 2]!;
  // A head may have cancelled to 0: the tail has the sign then, or −180° would come out as a little more than 180°.
  const ySign = yh + S[at + 1]! < 0 ? -1 : 1;
  const xSign = xh + S[at + 3]! < 0 ? -1 : 1;
  let nh = ySign * yh;
  let nt = ySign * S[at + 1]!;
  let dh = xSign * xh;
  let dt = xSign * S[at + 3]!;
  let octant = xSign < 0 ? 1 : 0;
  if (nh > dh) {
    const h = nh;
    const l = nt;
    nh = dh;
    nt = dt;
    dh = h;
    dt = l;
    octant += 2;
  }
  const step = ((nh / dh) * 256 + 0.5) | 0;
  const tangent = step * 0.00390625;
  const row = (octant * 257 + step) << 1;
  const sense = SENSE[octant]!;
`;

const describe = (unit: string, error: string): string => `/**
 * The angle of (x, y) in ${unit}, quickly: within ${error}, absolute, for a point known to 2^-74 of its distance.
 *
 * @param at - slot of y head, tail, x head, tail; heads have 26 bits and x and y are not both 0.
 * @param to - slot of the angle, hi and lo.
 */`;

export function quickArcTangentSource(): string {
  return `// Written by shared/generator/write.ts from shared/generator/kernels/quick-arc-tangent.ts. Do not edit.
import { ARCS_DEGREES, ARCS_RADIANS, SENSE } from './arc-table.ts';
import { scratch } from './scratch.ts';

${describe('radians', '2^-70')}
export function quickArcTangentRadians(at: number, to: number): void {
  const S = scratch;
  const T = ARCS_RADIANS;
${PROLOGUE}${body('rad')}
}

${describe('degrees', '2^-64')}
export function quickArcTangentDegrees(at: number, to: number): void {
  const S = scratch;
  const T = ARCS_DEGREES;
${PROLOGUE}${body('deg')}
}
`;
}
