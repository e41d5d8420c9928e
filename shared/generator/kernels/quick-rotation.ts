import { DOUBLES, MATRIX, QUATERNION, SEED } from '../../attitude/arithmetic/slots.ts';
import { headOf, headTail, product, reciprocalOf, root, squareOf, storeRounded, type HeadTail } from '../head-tail.ts';
import type { Pair, Scalar, StraightLine } from '../straight-line.ts';
import { kernelFile, sum } from './kernel-file.ts';

type Four = [Pair, Pair, Pair, Pair];
const ONE: Pair = { hi: '1', lo: '0' };
const COMPONENT_ERROR = 2 ** -67;

/** Davenport's K + I of DOUBLES, each entry within a bit of 2^-105. */
export function davenportPlusOne(b: StraightLine): readonly Four[] {
  const m = (row: number, column: number): Pair => b.exact(b.load(`S[${DOUBLES + 3 * row + column}]`));
  const [dx, dy, dz] = [b.minus(m(2, 1), m(1, 2)), b.minus(m(0, 2), m(2, 0)), b.minus(m(1, 0), m(0, 1))];
  const [sxy, sxz, syz] = [b.plus(m(0, 1), m(1, 0)), b.plus(m(0, 2), m(2, 0)), b.plus(m(1, 2), m(2, 1))];
  const [onePlus, oneLess] = [b.plus(ONE, m(0, 0)), b.minus(ONE, m(0, 0))];
  const [plus, less] = [b.plus(m(1, 1), m(2, 2)), b.minus(m(1, 1), m(2, 2))];
  return [
    [b.plus(onePlus, plus), dx, dy, dz],
    [dx, b.minus(onePlus, plus), sxy, sxz],
    [dy, sxy, b.plus(oneLess, less), syz],
    [dz, sxz, syz, b.minus(oneLess, less)],
  ];
}

function nearestQuaternion(b: StraightLine): Scalar {
  const seed = [0, 1, 2, 3].map((i): HeadTail => ({ head: headOf(b, b.load(`S[${SEED + i}]`)), tail: '0' }));
  const q = davenportPlusOne(b).map((row) => {
    const terms = row.map((entry, i) => product(b, headTail(b, entry), seed[i]!));
    return headTail(b, sum(b, terms[0]!, ...terms.slice(1)));
  });
  const squares = q.map((component) => squareOf(b, component));
  const reciprocal = reciprocalOf(b, root(b, sum(b, squares[0]!, ...squares.slice(1))));
  return storeRounded(b, QUATERNION, q.map((component) => product(b, component, reciprocal)), COMPONENT_ERROR);
}

function matrixOfQuaternion(b: StraightLine): Scalar {
  const [w, x, y, z] = [0, 1, 2, 3].map((i) => headTail(b, b.loadPair(QUATERNION + 2 * i))) as [HeadTail, HeadTail, HeadTail, HeadTail];
  const [ww, xx, yy, zz] = [w, x, y, z].map((component) => squareOf(b, component)) as Four;
  const [all, rest] = [b.plus(ww, zz), b.plus(xx, yy)];
  const once = reciprocalOf(b, headTail(b, b.plus(all, rest)));
  const twice: HeadTail = { head: b.mul('2', once.head), tail: b.mul('2', once.tail) };
  const [xy, xz, yz, wx, wy, wz] = [product(b, x, y), product(b, x, z), product(b, y, z), product(b, w, x), product(b, w, y), product(b, w, z)];
  const [front, back] = [b.minus(ww, zz), b.minus(xx, yy)];
  const over = (p: Pair, divisor: HeadTail): Pair => product(b, headTail(b, p), divisor);
  return storeRounded(b, MATRIX, [
    over(b.plus(front, back), once), over(b.minus(xy, wz), twice), over(b.plus(xz, wy), twice),
    over(b.plus(xy, wz), twice), over(b.minus(front, back), once), over(b.minus(yz, wx), twice),
    over(b.minus(xz, wy), twice), over(b.plus(yz, wx), twice), over(b.minus(all, rest), once),
  ], COMPONENT_ERROR);
}

export function quickRotationSource(): string {
  return kernelFile('quick-rotation.ts', [
    {
      name: 'quickNearestQuaternion', test: nearestQuaternion,
      doc: 'As nearestQuaternion and normaliseQuaternion, for a defect up to 1e-13. Reads DOUBLES and SEED; leaves QUATERNION of norm 1, rounded.\nAnswers whether the rounding is settled; if not, the double-double kernels must be asked.',
    },
    {
      name: 'quickMatrixOfQuaternion', test: matrixOfQuaternion,
      doc: 'As matrixOfQuaternion. Reads QUATERNION, of any norm near 1; leaves MATRIX, rounded.\nAnswers whether the rounding is settled; if not, the double-double kernel must be asked.',
    },
  ]);
}
