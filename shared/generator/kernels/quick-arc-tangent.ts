import { ANGLES, BY_SIZE, POINTS } from '../../attitude/arithmetic/slots.ts';
import { headOf, headTail, product, type HeadTail } from '../head-tail.ts';
import { StraightLine, type Pair } from '../straight-line.ts';
import { DEGREES_PER_RADIAN } from '../tables.ts';

/** One point's part of the kernel; the names of its variables end in the number of the point. */
function linesOf(unit: 'rad' | 'deg', point: 0 | 1 | 2): string[] {
  const b = new StraightLine(['a', 'b', 'c'][point]);
  const [tangent, sense, row, ySign] = ['tangent', 'sense', 'row', 'ySign'].map((name) => `${name}${point}`) as [string, string, string, string];
  const n: HeadTail = { head: `nh${point}`, tail: `nt${point}` };
  const d: HeadTail = { head: `dh${point}`, tail: `dt${point}` };
  // tan(α − τ) = (n − d tan τ) / (d + n tan τ); tan τ has 9 bits, so the products of the heads and their sums are exact.
  const top = b.sub(n.head, b.mul(tangent, d.head));
  const topTail = b.sub(n.tail, b.mul(tangent, d.tail));
  const bottom = b.add(d.head, b.mul(tangent, n.head));
  const bottomTail = b.add(d.tail, b.mul(tangent, n.tail));
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
  const [base, baseTail] = [b.load(`T[${row}]`), b.load(`T[${row} + 1]`)];
  const sum = b.fastTwoSum(base, b.mul(sense, arc.hi));
  const low = b.add(sum.lo, b.add(baseTail, b.mul(sense, arc.lo)));
  b.store(`S[${ANGLES + 2 * point}]`, b.mul(ySign, sum.hi));
  b.store(`S[${ANGLES + 2 * point + 1}]`, b.mul(ySign, low));
  return [...octantLines(POINTS + 4 * point, point), ...b.text().split('\n').map((line) => line.trim())];
}

/** Three chains of dependent steps side by side, so that the processor can work on all of them at once. */
function body(unit: 'rad' | 'deg'): string {
  const [first, second, third] = [linesOf(unit, 0), linesOf(unit, 1), linesOf(unit, 2)] as const;
  return first.flatMap((line, i) => [line, second[i]!, third[i]!]).map((line) => `  ${line}`).join('\n');
}

/** The octant without a branch: signs are read off the bits, and the greater coordinate by its place. A branch on random data costs more than the rest. */
function octantLines(at: number, i: number): string[] {
  const by = BY_SIZE + 6 * i;
  return [
    // A head may have cancelled to 0: the tail has the sign then, or −180° would come out as a little more than 180°.
    `S[${by}] = S[${at}]! + S[${at + 1}]!;`,
    `S[${by + 2}] = S[${at + 2}]! + S[${at + 3}]!;`,
    `const ySign${i} = SIGNS[WORDS[HIGH + ${2 * by}]! >>> 31]!;`,
    `const xNegative${i} = WORDS[HIGH + ${2 * (by + 2)}]! >>> 31;`,
    `const xSign${i} = SIGNS[xNegative${i}]!;`,
    `const y${i} = ySign${i} * S[${at}]!;`,
    `const x${i} = xSign${i} * S[${at + 2}]!;`,
    `S[${by}] = y${i};`,
    `S[${by + 1}] = ySign${i} * S[${at + 1}]!;`,
    `S[${by + 2}] = x${i};`,
    `S[${by + 3}] = xSign${i} * S[${at + 3}]!;`,
    `S[${by + 4}] = x${i} - y${i};`,
    `const steep${i} = WORDS[HIGH + ${2 * (by + 4)}]! >>> 31;`,
    `const less${i} = ${by} + (steep${i} << 1);`,
    `const more${i} = ${by + 2} - (steep${i} << 1);`,
    `const nh${i} = S[less${i}]!;`,
    `const nt${i} = S[less${i} + 1]!;`,
    `const dh${i} = S[more${i}]!;`,
    `const dt${i} = S[more${i} + 1]!;`,
    `const octant${i} = xNegative${i} + (steep${i} << 1);`,
    `const step${i} = ((nh${i} / dh${i}) * 256 + 0.5) | 0;`,
    `const tangent${i} = step${i} * 0.00390625;`,
    `const row${i} = (octant${i} * 257 + step${i}) << 1;`,
    `const sense${i} = SENSE[octant${i}]!;`,
  ];
}

const describe = (unit: string, error: string): string => `/**
 * The angles of three points in ${unit}, quickly: within ${error}, absolute, for points known to 2^-74 of their distance.
 * Reads POINTS as heads of 26 bits and tails, none at the origin; leaves ANGLES, each hi and lo.
 */`;

export function quickArcTangentSource(): string {
  return `// Written by shared/generator/write.ts from shared/generator/kernels/quick-arc-tangent.ts. Do not edit.
import { ARCS_DEGREES, ARCS_RADIANS, SENSE } from './arc-table.ts';
import { HIGH_WORD, scratch, words } from './scratch.ts';

const SIGNS = Float64Array.of(1, -1);

${describe('radians', '2^-70')}
export function quickArcTangentsRadians(): void {
  const S = scratch;
  const WORDS = words;
  const HIGH = HIGH_WORD;
  const T = ARCS_RADIANS;
${body('rad')}
}

${describe('degrees', '2^-64')}
export function quickArcTangentsDegrees(): void {
  const S = scratch;
  const WORDS = words;
  const HIGH = HIGH_WORD;
  const T = ARCS_DEGREES;
${body('deg')}
}
`;
}
