import { StraightLine, type Pair } from '../straight-line.ts';
import { RADIANS_PER_DEGREE } from '../tables.ts';

/** r = x − kπ/1536 by Cody and Waite's reduction in four parts, from names x, low and k. */
function reductionOfRadians(): string {
  const b = new StraightLine('a');
  const k = 'k';
  const first = b.sub('x', b.mul(k, 'STEP_1')); // exact: k STEP_1 has at most 53 bits, and the difference is short
  const second = b.twoDifference(first, b.mul(k, 'STEP_2'));
  const third = b.twoDifference(second.hi, b.mul(k, 'STEP_3'));
  const rest = b.add(b.sub(b.add(second.lo, third.lo), b.mul(k, 'STEP_4')), 'low');
  const r = b.twoSum(third.hi, rest);
  b.store('rh', r.hi);
  b.store('rl', r.lo);
  return b.text('    ');
}

/** r in radians of x − k·15/128 in degrees, which is exact. */
function reductionOfDegrees(): string {
  const b = new StraightLine('a');
  const rest = b.twoSum(b.sub('x', b.mul('k', 'STEP')), 'low');
  const r = b.times(rest, b.constant(RADIANS_PER_DEGREE));
  const n = b.fastTwoSum(r.hi, r.lo);
  b.store('rh', n.hi);
  b.store('rl', n.lo);
  return b.text();
}

/** sin and cos of table angle + r, |r| ≤ π/3072, by short series and the addition theorems. */
function addition(): string {
  const b = new StraightLine('t');
  const r: Pair = { hi: 'rh', lo: 'rl' };
  const square = b.square(r);
  const cube = b.times(square, r);
  // r³/6: the quotient is only near, but what it leaves is exact (c − 4h and that − 2h lose nothing).
  const sixth = b.mul(cube.hi, b.literal(1 / 6));
  const left = b.add(b.sub(b.sub(cube.hi, b.mul('4', sixth)), b.mul('2', sixth)), cube.lo);
  const sixthLow = b.mul(left, b.literal(1 / 6));
  const p = square.hi;
  const tail = b.mul(b.mul(cube.hi, p), b.sub(b.literal(1 / 120), b.mul(p, b.sub(b.literal(1 / 5040), b.mul(p, b.literal(1 / 362880))))));
  const front = b.fastTwoSum(r.hi, b.sub('0', sixth));
  const sine: Pair = b.fastTwoSum(front.hi, b.add(front.lo, b.add(b.sub(r.lo, sixthLow), tail)));
  const half = b.scale(square, -0.5);
  const fourth = b.mul(b.mul(p, p), b.sub(b.literal(1 / 24), b.mul(p, b.sub(b.literal(1 / 720), b.mul(p, b.literal(1 / 40320))))));
  const cosineLessOne: Pair = b.fastTwoSum(half.hi, b.add(half.lo, fourth));

  const tableSine: Pair = { hi: b.load('T[row]'), lo: b.load('T[row + 1]') };
  const tableCosine: Pair = { hi: b.load('T[row + 2]'), lo: b.load('T[row + 3]') };
  const s = b.plus(b.times(tableCosine, sine), b.times(tableSine, cosineLessOne));
  const c = b.minus(b.times(tableCosine, cosineLessOne), b.times(tableSine, sine));
  const sh = b.fastTwoSum(tableSine.hi, s.hi);
  const ch = b.fastTwoSum(tableCosine.hi, c.hi);
  const sinePair = b.fastTwoSum(sh.hi, b.add(sh.lo, b.add(tableSine.lo, s.lo)));
  const cosinePair = b.fastTwoSum(ch.hi, b.add(ch.lo, b.add(tableCosine.lo, c.lo)));
  b.store('S[sineTo]', b.mul('sineSign', sinePair.hi));
  b.store('S[sineTo + 1]', b.mul('sineSign', sinePair.lo));
  b.store('S[cosineTo]', b.mul('cosineSign', cosinePair.hi));
  b.store('S[cosineTo + 1]', b.mul('cosineSign', cosinePair.lo));
  return b.text();
}

const QUADRANT = `  const turns = k * ${1 / 768} + ROUNDER - ROUNDER;
  const row = ((k - 768 * turns + 384) | 0) << 2;
  const quadrant = turns & 3;
  // What the series calls sine is ±cosine of the whole angle in every other quadrant.
  const sineTo = to + ((quadrant & 1) << 1);
  const cosineTo = to + 2 - ((quadrant & 1) << 1);
  const sineSign = SIGN_OF_SINE[quadrant]!;
  const cosineSign = SIGN_OF_COSINE[quadrant]!;
`;

export function sinCosSource(): string {
  return `// Written by shared/generator/write.ts from shared/generator/kernels/sin-cos.ts. Do not edit.
import { reduceLargeAngle, REDUCED } from './large-angle.ts';
import { scratch } from './scratch.ts';
import { SIGN_OF_COSINE, SIGN_OF_SINE, SINES_AND_COSINES } from './sine-table.ts';
import { STEP_PARTS } from './tables.gen.ts';

const [STEP_1, STEP_2, STEP_3, STEP_4] = STEP_PARTS;
const STEP = 15 / 128;
/** Adding and taking away 1.5 × 2^52 rounds to an integer. */
const ROUNDER = 6755399441055744;

/**
 * Sine and cosine of an angle in radians, in double-double.
 *
 * @param at - slot of the angle, a pair hi, lo.
 * @param to - slot of the answer: sine hi, lo, cosine hi, lo.
 * Accuracy: 2^-98 relative to 1 and 2^-88 relative to the answer, for every finite double;
 *   measured by tests/shared/attitude/arithmetic/sin-cos.test.ts.
 * Method: Cody & Waite's reduction to a table step of π/1536, short series, addition theorems; beyond 8000 rad the
 *   reduction is done in integers.
 */
export function sinCosRadians(at: number, to: number): void {
  const S = scratch;
  const T = SINES_AND_COSINES;
  const x = S[at]!;
  const low = S[at + 1]!;
  let k: number;
  let rh: number;
  let rl: number;
  if (x < 8000 && x > -8000) {
    k = x * ${1536 / Math.PI} + ROUNDER - ROUNDER;
${reductionOfRadians()}
  } else {
    reduceLargeAngle(at);
    k = S[REDUCED]!;
    rh = S[REDUCED + 1]!;
    rl = S[REDUCED + 2]!;
  }
${QUADRANT}${addition()}
}

/**
 * Sine and cosine of an angle in degrees, in double-double; exact wherever they are doubles.
 *
 * @param at - slot of the angle, a pair hi, lo.
 * @param to - slot of the answer: sine hi, lo, cosine hi, lo.
 * Accuracy: as sinCosRadians. The reduction is exact, since the table step of 15/128° is a double.
 */
export function sinCosDegrees(at: number, to: number): void {
  const S = scratch;
  const T = SINES_AND_COSINES;
  let x = S[at]!;
  const low = S[at + 1]!;
  if (!(x < 1099511627776 && x > -1099511627776)) x %= 360;
  const k = x * ${128 / 15} + ROUNDER - ROUNDER;
  let rh: number;
  let rl: number;
${reductionOfDegrees()}
${QUADRANT}${addition()}
}
`;
}
