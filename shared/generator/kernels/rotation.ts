import { LENGTH, MATRIX, POINTS, QUATERNION, SEED, SINES_COSINES, VECTOR } from '../../attitude/arithmetic/slots.ts';
import type { Pair, StraightLine } from '../straight-line.ts';
import { kernelFile, sum } from './kernel-file.ts';
import { davenportPlusOne } from './quick-rotation.ts';

type Four = [Pair, Pair, Pair, Pair];
type Three = [Pair, Pair, Pair];

const quaternion = (b: StraightLine, slot = QUATERNION): Four => [0, 1, 2, 3].map((i) => b.loadPair(slot + 2 * i)) as Four;
const vector = (b: StraightLine): Three => [0, 1, 2].map((i) => b.exact(b.load(`S[${VECTOR + i}]`))) as Three;
const store = (b: StraightLine, slot: number, pairs: readonly Pair[]): void => pairs.forEach((pair, i) => b.storePair(slot + 2 * i, b.normalised(pair)));
const squares = (b: StraightLine, [first, ...rest]: readonly [Pair, ...Pair[]]): Pair => sum(b, b.square(first), ...rest.map((p) => b.square(p)));
const ONE: Pair = { hi: '1', lo: '0' };

function matrixOfQuaternion(b: StraightLine): void {
  const [w, x, y, z] = quaternion(b);
  const [ww, xx, yy, zz] = [w, x, y, z].map((p) => b.square(p)) as Four;
  const reciprocal = b.over(ONE, sum(b, ww, xx, yy, zz));
  const twice = b.scale(reciprocal, 2);
  const [xy, xz, yz, wx, wy, wz] = [b.times(x, y), b.times(x, z), b.times(y, z), b.times(w, x), b.times(w, y), b.times(w, z)];
  const [front, back] = [b.minus(ww, zz), b.minus(xx, yy)];
  const [all, rest] = [b.plus(ww, zz), b.plus(xx, yy)];
  store(b, MATRIX, [
    b.times(b.plus(front, back), reciprocal), b.times(b.minus(xy, wz), twice), b.times(b.plus(xz, wy), twice),
    b.times(b.plus(xy, wz), twice), b.times(b.minus(front, back), reciprocal), b.times(b.minus(yz, wx), twice),
    b.times(b.minus(xz, wy), twice), b.times(b.plus(yz, wx), twice), b.times(b.minus(all, rest), reciprocal),
  ]);
}

function normalise(b: StraightLine): void {
  const q = quaternion(b);
  const reciprocal = b.over(ONE, b.root(squares(b, q)));
  store(b, QUATERNION, q.map((p) => b.times(p, reciprocal)));
}

function nearestQuaternion(b: StraightLine): void {
  const seed = [0, 1, 2, 3].map((i) => b.exact(b.load(`S[${SEED + i}]`))) as Four;
  store(b, QUATERNION, davenportPlusOne(b).map((row) => sum(b, ...row.map((entry, i) => b.times(entry, seed[i]!)) as Four)));
}

function length(b: StraightLine): void {
  b.storePair(LENGTH, b.normalised(b.root(squares(b, vector(b)))));
}

function quaternionAboutVector(b: StraightLine): void {
  const [s, c] = [b.loadPair(SINES_COSINES), b.loadPair(SINES_COSINES + 2)];
  const ratio = b.over(s, b.loadPair(LENGTH));
  store(b, QUATERNION, [c, ...vector(b).map((p) => b.times(p, ratio))]);
}

function quaternionOfMrp(b: StraightLine): void {
  // (t² − |t p|², 2 t (t p)) for a power of two t that keeps every square in range; the vector holds t p, the seed t.
  const p = vector(b);
  const t = b.exact(b.load(`S[${SEED}]`));
  store(b, QUATERNION, [b.minus(b.square(t), squares(b, p)), ...p.map((x) => b.scale(b.times(t, x), 2))]);
}

function vectorLength(b: StraightLine): void {
  const [w, x, y, z] = quaternion(b);
  const root = b.normalised(b.root(squares(b, [x, y, z])));
  b.storePair(LENGTH, root);
  b.storePair(POINTS, root);
  b.storePair(POINTS + 2, w);
}

function rotationVector(b: StraightLine): void {
  const [, x, y, z] = quaternion(b);
  const ratio = b.over(b.scale(b.loadPair(POINTS), 2), b.loadPair(LENGTH));
  store(b, POINTS, [x, y, z].map((p) => b.times(p, ratio)));
}

function axis(b: StraightLine): void {
  const [, x, y, z] = quaternion(b);
  const reciprocal = b.over(ONE, b.loadPair(LENGTH));
  store(b, POINTS + 4, [x, y, z].map((p) => b.times(p, reciprocal)));
}

function mrp(b: StraightLine): void {
  const [w, x, y, z] = quaternion(b);
  const reciprocal = b.over(ONE, b.plus(b.root(squares(b, [w, x, y, z])), w));
  store(b, POINTS, [x, y, z].map((p) => b.times(p, reciprocal)));
}

function gibbs(b: StraightLine): void {
  const [w, x, y, z] = quaternion(b);
  store(b, POINTS, [x, y, z].map((p) => b.over(p, w)));
}

export function rotationSource(): string {
  return kernelFile('rotation.ts', [
    { name: 'matrixOfQuaternion', doc: 'R(q) / |q|². Reads QUATERNION, of any norm near 1; leaves MATRIX.', body: matrixOfQuaternion },
    { name: 'normaliseQuaternion', doc: 'q / |q|. Reads and leaves QUATERNION.', body: normalise },
    {
      name: 'nearestQuaternion', body: nearestQuaternion,
      doc: 'The quaternion of the rotation nearest to a matrix of orthogonality defect ε ≤ 1e-12, to ε²: (K + I) times the seed,\nK being Davenport\'s matrix, whose other eigenvalues are −1 to ε. Reads DOUBLES and SEED (the quaternion to ε, of any norm);\nleaves QUATERNION, of any norm.\nSource: Bar-Itzhack 2000, J. Guidance, Control and Dynamics 23(6), "New method for extracting the quaternion from a rotation matrix".',
    },
    { name: 'lengthOfVector', doc: '|v|. Reads VECTOR; leaves LENGTH.', body: length },
    { name: 'quaternionAboutVector', doc: 'q = (c, s v/|v|). Reads VECTOR, LENGTH and the first of SINES_COSINES (of the half angle); leaves QUATERNION.', body: quaternionAboutVector },
    { name: 'quaternionOfMrp', doc: 'q = (1 − |p|², 2 p), scaled. Reads VECTOR (t p) and the first of SEED (t, a power of two); leaves QUATERNION.', body: quaternionOfMrp },
    { name: 'lengthOfVectorPart', doc: 'Reads QUATERNION with w ≥ 0; leaves LENGTH |v| and the first of POINTS (|v|, w), whose angle is half the rotation\'s.', body: vectorLength },
    { name: 'rotationVectorOfAngle', doc: 'v 2a/|v|. Reads QUATERNION, LENGTH and the half angle a as the pair at POINTS; leaves three pairs at POINTS.', body: rotationVector },
    { name: 'axisOfVectorPart', doc: 'v/|v|. Reads QUATERNION and LENGTH; leaves three pairs at POINTS + 4.', body: axis },
    { name: 'mrpOfQuaternion', doc: 'v/(|q| + w). Reads QUATERNION with w ≥ 0; leaves three pairs at POINTS.', body: mrp },
    { name: 'gibbsOfQuaternion', doc: 'v/w. Reads QUATERNION with w > 0; leaves three pairs at POINTS.', body: gibbs },
  ]);
}
