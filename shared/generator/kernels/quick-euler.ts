import { COSINE, MATRIX, POINTS, QUATERNION, SINES_COSINES } from '../../attitude/arithmetic/slots.ts';
import { headTail, product, root, squareOf, storeRounded, type HeadTail } from '../head-tail.ts';
import type { Pair, Scalar, StraightLine } from '../straight-line.ts';
import { kernelFile } from './kernel-file.ts';

/** Bounds of the error of a component made of these sines and cosines, and of an angle's point. */
const COMPONENT_ERROR = 2 ** -68;

const loaded = (b: StraightLine, slot: number): HeadTail => ({ head: b.load(`S[${slot}]`), tail: b.load(`S[${slot + 1}]`) });
const sine = (b: StraightLine, turn: number): HeadTail => loaded(b, SINES_COSINES + 4 * turn);
const cosine = (b: StraightLine, turn: number): HeadTail => loaded(b, SINES_COSINES + 4 * turn + 2);

function quaternionOfAngles(symmetric: boolean) {
  return (b: StraightLine): Scalar => {
    const [s1, c1, s2, c2, s3, c3] = [sine(b, 0), cosine(b, 0), sine(b, 1), cosine(b, 1), sine(b, 2), cosine(b, 2)];
    const [w, x, y, z] = [product(b, c1, c2), product(b, s1, c2), product(b, c1, s2), product(b, s1, s2)].map((p) => headTail(b, p)) as [HeadTail, HeadTail, HeadTail, HeadTail];
    const t = (p: HeadTail, q: HeadTail): Pair => product(b, p, q);
    return storeRounded(b, QUATERNION, symmetric
      ? [b.minus(t(w, c3), t(x, s3)), b.plus(t(w, s3), t(x, c3)), b.plus(t(y, c3), t(z, s3)), b.minus(t(z, c3), t(y, s3))]
      : [b.minus(t(w, c3), t(z, s3)), b.plus(t(x, c3), t(y, s3)), b.minus(t(y, c3), t(x, s3)), b.plus(t(w, s3), t(z, c3))], COMPONENT_ERROR);
  };
}

function matrixOfAngles(symmetric: boolean) {
  return (b: StraightLine): Scalar => {
    const [s1, c1, s2, c2, s3, c3] = [sine(b, 0), cosine(b, 0), sine(b, 1), cosine(b, 1), sine(b, 2), cosine(b, 2)];
    const t = (p: HeadTail, q: HeadTail): Pair => product(b, p, q);
    const whole = ({ head, tail }: HeadTail): Pair => ({ hi: head, lo: tail });
    const [s1c2, c1c2, s1s2, c1s2] = [t(s1, c2), t(c1, c2), t(s1, s2), t(c1, s2)];
    const split = (p: Pair): HeadTail => headTail(b, p);
    return storeRounded(b, MATRIX, symmetric
      ? [
        whole(c2), t(s2, s3), t(s2, c3),
        s1s2, b.minus(t(c1, c3), t(split(s1c2), s3)), b.negative(b.plus(t(c1, s3), t(split(s1c2), c3))),
        b.negative(c1s2), b.plus(t(s1, c3), t(split(c1c2), s3)), b.minus(t(split(c1c2), c3), t(s1, s3)),
      ]
      : [
        t(c2, c3), b.negative(t(c2, s3)), whole(s2),
        b.plus(t(c1, s3), t(split(s1s2), c3)), b.minus(t(c1, c3), t(split(s1s2), s3)), b.negative(s1c2),
        b.minus(t(s1, s3), t(split(c1s2), c3)), b.plus(t(s1, c3), t(split(c1s2), s3)), c1c2,
      ], COMPONENT_ERROR);
  };
}

function storePoint(b: StraightLine, slot: number, y: Pair, x: Pair): void {
  const [top, side] = [headTail(b, y), headTail(b, x)];
  b.storePair(slot, { hi: top.head, lo: top.tail });
  b.storePair(slot + 2, { hi: side.head, lo: side.tail });
}

function rootPair(b: StraightLine, x: Pair): Pair {
  const { head, tail } = root(b, x);
  return { hi: head, lo: tail };
}

function anglesOfQuaternion(symmetric: boolean) {
  return (b: StraightLine): Scalar => {
    const [w, x, y, z] = [0, 1, 2, 3].map((i) => b.loadPair(QUATERNION + 2 * i)) as [Pair, Pair, Pair, Pair];
    const [pr, pi, nr, ni] = (symmetric ? [w, x, y, z] : [b.plus(w, y), b.plus(x, z), b.minus(w, y), b.minus(x, z)]).map((p) => headTail(b, p)) as [HeadTail, HeadTail, HeadTail, HeadTail];
    const [rr, ii, ri, ir] = [product(b, pr, nr), product(b, pi, ni), product(b, pr, ni), product(b, pi, nr)];
    storePoint(b, POINTS, b.plus(ri, ir), b.minus(rr, ii));
    storePoint(b, POINTS + 8, b.minus(ir, ri), b.plus(rr, ii));
    const positive = b.plus(squareOf(b, pr), squareOf(b, pi));
    const negative = b.plus(squareOf(b, nr), squareOf(b, ni));
    const middle = rootPair(b, product(b, headTail(b, positive), headTail(b, negative)));
    const difference = b.minus(positive, negative);
    if (symmetric) storePoint(b, POINTS + 4, b.scale(middle, 2), difference);
    else storePoint(b, POINTS + 4, b.scale(difference, 0.5), middle);
    const near = ({ hi, lo }: Pair): Scalar => b.add(hi, lo);
    const cosine = b.div(b.mul('2', near(middle)), b.add(near(positive), near(negative)));
    b.store(`S[${COSINE}]`, cosine);
    return b.let(`${cosine} > 1e-14`, cosine);
  };
}

function anglesOfMatrix(symmetric: boolean) {
  return (b: StraightLine): Scalar => {
    const at = (row: number, column: number): Pair => b.loadPair(MATRIX + 2 * (3 * row + column));
    const [sp, cp] = symmetric ? [at(1, 0), b.negative(at(2, 0))] : [b.negative(at(1, 2)), at(2, 2)];
    const [s, c] = [headTail(b, sp), headTail(b, cp)];
    storePoint(b, POINTS, sp, cp);
    const middle = rootPair(b, b.plus(squareOf(b, s), squareOf(b, c)));
    if (symmetric) storePoint(b, POINTS + 4, middle, at(0, 0));
    else storePoint(b, POINTS + 4, at(0, 2), middle);
    const row = (column: number): Pair => b.plus(product(b, c, headTail(b, at(1, column))), product(b, s, headTail(b, at(2, column))));
    if (symmetric) storePoint(b, POINTS + 8, b.negative(row(2)), row(1));
    else storePoint(b, POINTS + 8, row(0), row(1));
    const cosine = b.add(middle.hi, middle.lo);
    b.store(`S[${COSINE}]`, cosine);
    return b.let(`${cosine} > 1e-14`, cosine);
  };
}

const HEADS = 'heads of 26 bits and tails';
const ANSWER = 'Answers whether the rounding is settled; if not, the double-double kernel of the same name must be asked.';
const AWAY = 'Answers whether the attitude is away from lock; if not, the double-double kernel must be asked.';

export function quickEulerSource(): string {
  return kernelFile('quick-euler.ts', [
    { name: 'quickQuaternionOfThree', doc: `Reads SINES_COSINES as ${HEADS}; leaves QUATERNION, rounded. ${ANSWER}`, test: quaternionOfAngles(false) },
    { name: 'quickQuaternionOfSame', doc: `Reads SINES_COSINES as ${HEADS}; leaves QUATERNION, rounded. ${ANSWER}`, test: quaternionOfAngles(true) },
    { name: 'quickMatrixOfThree', doc: `Reads SINES_COSINES as ${HEADS}; leaves MATRIX, rounded. ${ANSWER}`, test: matrixOfAngles(false) },
    { name: 'quickMatrixOfSame', doc: `Reads SINES_COSINES as ${HEADS}; leaves MATRIX, rounded. ${ANSWER}`, test: matrixOfAngles(true) },
    { name: 'quickAnglesOfQuaternionThree', doc: `Reads QUATERNION; leaves POINTS as ${HEADS}, and COSINE. ${AWAY}`, test: anglesOfQuaternion(false) },
    { name: 'quickAnglesOfQuaternionSame', doc: `Reads QUATERNION; leaves POINTS as ${HEADS}, and COSINE. ${AWAY}`, test: anglesOfQuaternion(true) },
    { name: 'quickAnglesOfMatrixThree', doc: `Reads MATRIX; leaves POINTS as ${HEADS}, and COSINE. ${AWAY}`, test: anglesOfMatrix(false) },
    { name: 'quickAnglesOfMatrixSame', doc: `Reads MATRIX; leaves POINTS as ${HEADS}, and COSINE. ${AWAY}`, test: anglesOfMatrix(true) },
  ]);
}
