import { COSINE, LOCKED_FIRST, LOCKED_LAST, MATRIX, POINTS, QUATERNION, SINES_COSINES } from '../../attitude/arithmetic/slots.ts';
import type { Pair, StraightLine } from '../straight-line.ts';
import { kernelFile } from './kernel-file.ts';

const sine = (b: StraightLine, turn: number): Pair => b.loadPair(SINES_COSINES + 4 * turn);
const cosine = (b: StraightLine, turn: number): Pair => b.loadPair(SINES_COSINES + 4 * turn + 2);
const element = (b: StraightLine, row: number, column: number): Pair => b.loadPair(MATRIX + 2 * (3 * row + column));

/** A point, each coordinate with its nearest double in front, as the arctangent wants it. */
function storePoint(b: StraightLine, slot: number, y: Pair, x: Pair): void {
  b.storePair(slot, b.normalised(y));
  b.storePair(slot + 2, b.normalised(x));
}

function quaternionOfAngles(symmetric: boolean) {
  return (b: StraightLine): void => {
    const [s1, c1, s2, c2, s3, c3] = [sine(b, 0), cosine(b, 0), sine(b, 1), cosine(b, 1), sine(b, 2), cosine(b, 2)];
    const [w, x, y, z] = [b.times(c1, c2), b.times(s1, c2), b.times(c1, s2), b.times(s1, s2)].map((p) => b.fastTwoSum(p.hi, p.lo)) as [Pair, Pair, Pair, Pair];
    const answer = symmetric
      ? [b.minus(b.times(w, c3), b.times(x, s3)), b.plus(b.times(w, s3), b.times(x, c3)), b.plus(b.times(y, c3), b.times(z, s3)), b.minus(b.times(z, c3), b.times(y, s3))]
      : [b.minus(b.times(w, c3), b.times(z, s3)), b.plus(b.times(x, c3), b.times(y, s3)), b.minus(b.times(y, c3), b.times(x, s3)), b.plus(b.times(w, s3), b.times(z, c3))];
    answer.forEach((component, i) => b.storePair(QUATERNION + 2 * i, b.normalised(component)));
  };
}

function matrixOfAngles(symmetric: boolean) {
  return (b: StraightLine): void => {
    const [s1, c1, s2, c2, s3, c3] = [sine(b, 0), cosine(b, 0), sine(b, 1), cosine(b, 1), sine(b, 2), cosine(b, 2)];
    const [s1c2, c1c2, s1s2, c1s2] = [b.times(s1, c2), b.times(c1, c2), b.times(s1, s2), b.times(c1, s2)].map((p) => b.fastTwoSum(p.hi, p.lo)) as [Pair, Pair, Pair, Pair];
    const answer = symmetric
      ? [
        c2, b.times(s2, s3), b.times(s2, c3),
        s1s2, b.minus(b.times(c1, c3), b.times(s1c2, s3)), b.negative(b.plus(b.times(c1, s3), b.times(s1c2, c3))),
        b.negative(c1s2), b.plus(b.times(s1, c3), b.times(c1c2, s3)), b.minus(b.times(c1c2, c3), b.times(s1, s3)),
      ]
      : [
        b.times(c2, c3), b.negative(b.times(c2, s3)), s2,
        b.plus(b.times(c1, s3), b.times(s1s2, c3)), b.minus(b.times(c1, c3), b.times(s1s2, s3)), b.negative(s1c2),
        b.minus(b.times(s1, s3), b.times(c1s2, c3)), b.plus(b.times(s1, c3), b.times(c1s2, s3)), c1c2,
      ];
    answer.forEach((component, i) => b.storePair(MATRIX + 2 * i, b.normalised(component)));
  };
}

function anglesOfQuaternion(symmetric: boolean) {
  return (b: StraightLine): void => {
    const [w, x, y, z] = [0, 1, 2, 3].map((i) => b.loadPair(QUATERNION + 2 * i)) as [Pair, Pair, Pair, Pair];
    const [pr, pi, nr, ni] = (symmetric ? [w, x, y, z] : [b.plus(w, y), b.plus(x, z), b.minus(w, y), b.minus(x, z)].map((p) => b.normalised(p))) as [Pair, Pair, Pair, Pair];
    const [rr, ii, ri, ir] = [b.times(pr, nr), b.times(pi, ni), b.times(pr, ni), b.times(pi, nr)];
    storePoint(b, POINTS, b.plus(ri, ir), b.minus(rr, ii));
    storePoint(b, POINTS + 8, b.minus(ir, ri), b.plus(rr, ii));
    const positive = b.plus(b.square(pr), b.square(pi));
    const negative = b.plus(b.square(nr), b.square(ni));
    const root = b.root(b.times(positive, negative));
    if (symmetric) storePoint(b, POINTS + 4, b.scale(root, 2), b.minus(positive, negative));
    else storePoint(b, POINTS + 4, b.scale(b.plus(b.times(w, y), b.times(x, z)), 2), root);
    b.store(`S[${COSINE}]`, b.div(b.mul('2', root.hi), b.add(positive.hi, negative.hi)));
    // At lock one of the two complex numbers is all but 0, and the square of the other turns by the whole angle that is left.
    const greater = b.let(`${positive.hi} >= ${negative.hi}`, positive.hi, negative.hi);
    const pick = (p: Pair, n: Pair): Pair => ({ hi: b.let(`${greater} ? ${p.hi} : ${n.hi}`, greater, p.hi, n.hi), lo: b.let(`${greater} ? ${p.lo} : ${n.lo}`, greater, p.lo, n.lo) });
    const [re, im] = [pick(pr, nr), pick(pi, ni)];
    const double: readonly [Pair, Pair] = [b.scale(b.times(re, im), 2), b.minus(b.square(re), b.square(im))];
    storePoint(b, LOCKED_FIRST, double[0], double[1]);
    const sense = b.let(`${greater} ? 1 : -1`, greater);
    storePoint(b, LOCKED_LAST, { hi: b.mul(sense, double[0].hi), lo: b.mul(sense, double[0].lo) }, double[1]);
  };
}

function anglesOfMatrix(symmetric: boolean) {
  return (b: StraightLine): void => {
    const at = (row: number, column: number): Pair => element(b, row, column);
    // The sine and the cosine of the first angle, each times that of the middle one.
    const [s, c] = symmetric ? [at(1, 0), b.negative(at(2, 0))] : [b.negative(at(1, 2)), at(2, 2)];
    storePoint(b, POINTS, s, c);
    const root = b.root(b.plus(b.square(s), b.square(c)));
    if (symmetric) storePoint(b, POINTS + 4, root, at(0, 0));
    else storePoint(b, POINTS + 4, at(0, 2), root);
    // Turned back by the first angle, the second row holds the last angle's sine and cosine.
    const row = (column: number): Pair => b.plus(b.times(c, at(1, column)), b.times(s, at(2, column)));
    if (symmetric) storePoint(b, POINTS + 8, b.negative(row(2)), row(1));
    else storePoint(b, POINTS + 8, row(0), row(1));
    b.store(`S[${COSINE}]`, root.hi);
    storePoint(b, LOCKED_FIRST, at(2, 1), at(1, 1));
    storePoint(b, LOCKED_LAST, symmetric ? b.negative(at(1, 2)) : at(1, 0), at(1, 1));
  };
}

const THREE = 'three different axes, R = Rx(a) Ry(b) Rz(c)';
const SAME = 'first = third axis, R = Rx(a) Ry(b) Rx(c)';
const LOCK = 'LOCKED_FIRST and LOCKED_LAST: the points of the angle left at lock, where the first or the last intrinsic angle carries all.';

export function eulerSource(): string {
  return kernelFile('euler.ts', [
    { name: 'quaternionOfThree', doc: `The quaternion of intrinsic angles about ${THREE}.\nReads SINES_COSINES of the half angles; leaves QUATERNION, of norm 1 to 2^-97.`, body: quaternionOfAngles(false) },
    { name: 'quaternionOfSame', doc: `The quaternion of intrinsic angles, ${SAME}.\nReads SINES_COSINES of the half angles; leaves QUATERNION, of norm 1 to 2^-97.`, body: quaternionOfAngles(true) },
    { name: 'matrixOfThree', doc: `The matrix of intrinsic angles about ${THREE}.\nReads SINES_COSINES; leaves MATRIX. A zero element comes out exact where a factor is zero.`, body: matrixOfAngles(false) },
    { name: 'matrixOfSame', doc: `The matrix of intrinsic angles, ${SAME}.\nReads SINES_COSINES; leaves MATRIX. A zero element comes out exact where a factor is zero.`, body: matrixOfAngles(true) },
    { name: 'anglesOfQuaternionThree', doc: `Intrinsic angles of a quaternion, ${THREE}, as points.\nWith p = (w + y) + i (x + z) and n = (w − y) + i (x − z): a = arg(p n), c = arg(p n*), b = atan2(2 (w y + x z), |p| |n|).\nReads QUATERNION, of any norm near 1; leaves POINTS a, b, c, COSINE |cos b|, ${LOCK}\nNo arcsine and no normalisation; near lock p or n is a difference of given numbers, hence exact.\nSource: Bernardes & Viollet 2022, doi:10.1371/journal.pone.0276302.`, body: anglesOfQuaternion(false) },
    { name: 'anglesOfQuaternionSame', doc: `Intrinsic angles of a quaternion, ${SAME}, as points.\nWith p = w + i x and n = y + i z: a = arg(p n), c = arg(p n*), b = atan2(2 |p| |n|, |p|² − |n|²).\nReads QUATERNION, of any norm near 1; leaves POINTS a, b, c, COSINE |sin b|, ${LOCK}\nSource: Bernardes & Viollet 2022, doi:10.1371/journal.pone.0276302.`, body: anglesOfQuaternion(true) },
    { name: 'anglesOfMatrixThree', doc: `Intrinsic angles of a matrix, ${THREE}, as points, straight from the elements:\na = atan2(−r12, r22), b = atan2(r02, hypot(r12, r22)), c = atan2(r22 r10 − r12 r20, r22 r11 − r12 r21), indices from 0.\nReads MATRIX; leaves POINTS a, b, c, COSINE |cos b|, ${LOCK}\nThe last angle is that of the matrix turned back by the first, so their well-conditioned combination holds near lock.`, body: anglesOfMatrix(false) },
    { name: 'anglesOfMatrixSame', doc: `Intrinsic angles of a matrix, ${SAME}, as points, straight from the elements:\na = atan2(r10, −r20), b = atan2(hypot(r10, r20), r00), c = atan2(r20 r12 − r10 r22, r10 r21 − r20 r11), indices from 0.\nReads MATRIX; leaves POINTS a, b, c, COSINE |sin b|, ${LOCK}`, body: anglesOfMatrix(true) },
  ]);
}
