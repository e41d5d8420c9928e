import { headOf, headTail, product } from '../head-tail.ts';
import { StraightLine, type Pair } from '../straight-line.ts';
import { RADIANS_PER_DEGREE } from '../tables.ts';

/** sin and cos of table angle + r with r = rh + rt, rh of 26 bits. */
function addition(b: StraightLine, rh: string, rt: string): void {
  const r = b.add(rh, rt);
  const square = b.mul(r, r);
  const sineTail = b.add(rt, b.mul(b.mul(square, r), b.add(b.literal(-1 / 6), b.mul(square, b.literal(1 / 120)))));
  const cosineLessOne = b.mul(square, b.add(b.literal(-0.5), b.mul(square, b.add(b.literal(1 / 24), b.mul(square, b.literal(-1 / 720))))));
  const [sh, st, ch, ct] = ['T[row]', 'T[row + 1]', 'T[row + 2]', 'T[row + 3]'].map((place) => b.load(place)) as [string, string, string, string];
  const s = b.add(sh, st);
  const c = b.add(ch, ct);
  const front = b.fastTwoSum(sh, b.mul(ch, rh));
  const sine: Pair = { hi: front.hi, lo: b.add(front.lo, b.add(st, b.add(b.mul(ct, rh), b.add(b.mul(c, sineTail), b.mul(s, cosineLessOne))))) };
  const back = b.fastTwoSum(ch, b.sub('0', b.mul(sh, rh)));
  const cosine: Pair = { hi: back.hi, lo: b.add(back.lo, b.add(ct, b.sub(b.mul(c, cosineLessOne), b.add(b.mul(st, rh), b.mul(s, sineTail))))) };
  const sineParts = headTail(b, sine);
  const cosineParts = headTail(b, cosine);
  b.store('S[sineTo]', b.mul('sineSign', sineParts.head));
  b.store('S[sineTo + 1]', b.mul('sineSign', sineParts.tail));
  b.store('S[cosineTo]', b.mul('cosineSign', cosineParts.head));
  b.store('S[cosineTo + 1]', b.mul('cosineSign', cosineParts.tail));
}

function radians(): string {
  const b = new StraightLine('t');
  const left = b.sub('x', b.mul('k', 'STEP_1')); // exact
  const rh = headOf(b, left);
  addition(b, rh, b.sub(b.sub(left, rh), b.mul('k', 'STEP_REST')));
  return b.text();
}

function degrees(): string {
  const b = new StraightLine('t');
  const left = b.sub('x', b.mul('k', 'STEP')); // exact
  const r = headTail(b, product(b, headTail(b, b.exact(left)), headTail(b, b.constant(RADIANS_PER_DEGREE))));
  addition(b, r.head, r.tail);
  return b.text();
}

const QUADRANT = `  const turns = k * ${1 / 768} + ROUNDER - ROUNDER;
  const row = ((k - 768 * turns + 384) | 0) << 2;
  const quadrant = turns & 3;
  const sineTo = to + ((quadrant & 1) << 1);
  const cosineTo = to + 2 - ((quadrant & 1) << 1);
  const sineSign = SIGN_OF_SINE[quadrant]!;
  const cosineSign = SIGN_OF_COSINE[quadrant]!;
`;

const doc = (unit: string, limit: string): string => `/**
 * Sine and cosine of an angle in ${unit}, quickly: errors below 2^-71, absolute.
 *
 * @param at - slot of the angle, a double of size below ${limit}.
 * @param to - slot of the answer: sine head, tail, cosine head, tail; heads have 26 bits.
 */`;

export function quickSinCosSource(): string {
  return `// Written by shared/generator/write.ts from shared/generator/kernels/quick-sin-cos.ts. Do not edit.
import { scratch } from './scratch.ts';
import { SIGN_OF_COSINE, SIGN_OF_SINE, SPLIT_SINES_AND_COSINES } from './sine-table.ts';
import { STEP_PARTS } from './tables.gen.ts';

const STEP_1 = STEP_PARTS[0];
const STEP_REST = STEP_PARTS[1] + STEP_PARTS[2];
const STEP = 15 / 128;
/** Adding and taking away 1.5 × 2^52 rounds to an integer. */
const ROUNDER = 6755399441055744;

${doc('radians', '8')}
export function quickSinCosRadians(at: number, to: number): void {
  const S = scratch;
  const T = SPLIT_SINES_AND_COSINES;
  const x = S[at]!;
  const k = x * ${1536 / Math.PI} + ROUNDER - ROUNDER;
${QUADRANT}${radians()}
}

${doc('degrees', '2^40')}
export function quickSinCosDegrees(at: number, to: number): void {
  const S = scratch;
  const T = SPLIT_SINES_AND_COSINES;
  const x = S[at]!;
  const k = x * ${128 / 15} + ROUNDER - ROUNDER;
${QUADRANT}${degrees()}
}
`;
}
