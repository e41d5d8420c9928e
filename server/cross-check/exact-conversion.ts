import { bodyPermutation, referencePermutation, type SignedPermutation } from '#shared/attitude/axes.ts';
import type { AngleUnit, Convention, EulerConvention } from '#shared/attitude/convention.ts';
import { BigNumber, exactly, ONE, PI, TWO, ZERO } from './big-number.ts';

/**
 * The conversion once more, by independent code: written from the definitions of the facets, in decimal arithmetic of
 * 64 digits, by way of rotation matrices alone. It shares nothing with the core but the letters of the axis sets.
 */
export type Matrix = BigNumber[][];

const PLACES = [0, 1, 2] as const;
/** Below this the service answers as at gimbal lock where the attitude came as a quaternion. */
const LOCK = 8.9e-16;
const product = (a: Matrix, b: Matrix): Matrix => a.map((row) => PLACES.map((j) => row.reduce((sum, value, k) => sum.plus(value.times(b[k]![j]!)), ZERO)));
const transpose = (m: Matrix): Matrix => PLACES.map((i) => m.map((row) => row[i]!));
const diagonal = (value: BigNumber): Matrix => PLACES.map((i) => PLACES.map((j) => (i === j ? value : ZERO)));
const dot = (v: readonly BigNumber[]): BigNumber => v.reduce((sum, value) => sum.plus(value.times(value)), ZERO);
const radians = (angle: BigNumber, unit: AngleUnit): BigNumber => (unit === 'deg' ? angle.times(PI).div(180) : angle);
const inUnit = (angle: BigNumber, unit: AngleUnit): BigNumber => (unit === 'deg' ? angle.times(180).div(PI) : angle);

/** R with v_ref = R v_body, as the numbers state it; a given matrix as it stands. */
export function meaningOf(convention: Convention, numbers: readonly number[]): Matrix {
  const n = numbers.map(exactly);
  switch (convention.representation) {
    case 'euler': return [1, 2, 3].reduce((before, turn) => {
      const angle = radians(n[convention.order.indexOf(turn as 1 | 2 | 3)]!.times(convention.signs[turn - 1]!), convention.unit);
      const turned = elementary('XYZ'.indexOf(convention.sequence[turn - 1]!), angle);
      return convention.motion === 'intrinsic' ? product(before, turned) : product(turned, before);
    }, diagonal(ONE));
    case 'quaternion': {
      const [w, x, y, z] = convention.scalar === 'first' ? n : [n[3]!, n[0]!, n[1]!, n[2]!];
      const r = matrixOf([w!, x!, y!, z!]);
      return (convention.maps === 'body-to-reference') === (convention.product === 'hamilton') ? r : transpose(r);
    }
    case 'dcm': {
      const listed = [n.slice(0, 3), n.slice(3, 6), n.slice(6, 9)];
      const m = convention.layout === 'row-major' ? listed : transpose(listed);
      return convention.maps === 'body-to-reference' ? m : transpose(m);
    }
    case 'rotation-vector': return sensed(convention.maps, aboutAxis(n, radians(BigNumber.sqrt(dot(n)), convention.unit)));
    case 'axis-angle': return sensed(convention.maps, aboutAxis(n.slice(0, 3), radians(n[3]!, convention.unit)));
    case 'mrp': return sensed(convention.maps, matrixOf([ONE.minus(dot(n)), ...n.map((value) => value.times(TWO))]));
    case 'gibbs': return sensed(convention.maps, matrixOf([ONE, ...n]));
  }
}

const sensed = (maps: 'body-to-reference' | 'reference-to-body', r: Matrix): Matrix => (maps === 'body-to-reference' ? r : transpose(r));

/** The matrix that turns vectors about a coordinate axis. */
function elementary(axis: number, angle: BigNumber): Matrix {
  const [s, c] = [BigNumber.sin(angle), BigNumber.cos(angle)];
  const [j, k] = [(axis + 1) % 3, (axis + 2) % 3];
  return PLACES.map((row) => PLACES.map((column) => {
    if (row === column) return row === axis ? ONE : c;
    return row === j && column === k ? s.neg() : row === k && column === j ? s : ZERO;
  }));
}

/** Rodrigues' formula. */
function aboutAxis(axis: readonly BigNumber[], angle: BigNumber): Matrix {
  const length = BigNumber.sqrt(dot(axis));
  if (length.isZero()) return diagonal(ONE);
  const [x, y, z] = axis.map((value) => value.div(length)) as [BigNumber, BigNumber, BigNumber];
  const cross: Matrix = [[ZERO, z.neg(), y], [z, ZERO, x.neg()], [y.neg(), x, ZERO]];
  const square = product(cross, cross);
  const [s, v] = [BigNumber.sin(angle), ONE.minus(BigNumber.cos(angle))];
  return PLACES.map((i) => PLACES.map((j) => (i === j ? ONE : ZERO).plus(cross[i]![j]!.times(s)).plus(square[i]![j]!.times(v))));
}

/** R(q)/|q|², R(q) = (w² − v·v) I + 2 v vᵀ + 2 w [v×]. */
function matrixOf([w, x, y, z]: readonly BigNumber[]): Matrix {
  const v = [x!, y!, z!];
  const cross: Matrix = [[ZERO, z!.neg(), y!], [z!, ZERO, x!.neg()], [y!.neg(), x!, ZERO]];
  const norm = w!.times(w!).plus(dot(v));
  const scalar = w!.times(w!).minus(dot(v));
  return PLACES.map((i) => PLACES.map((j) => (i === j ? scalar : ZERO).plus(TWO.times(v[i]!).times(v[j]!)).plus(TWO.times(w!).times(cross[i]![j]!)).div(norm)));
}

/** S R Tᵀ for the changes of axes. */
export function relabelled(r: Matrix, from: Convention, to: Convention): Matrix {
  const change = (a: SignedPermutation, b: SignedPermutation): Matrix => product(matrixOfPermutation(b), transpose(matrixOfPermutation(a)));
  const reference = change(referencePermutation(from.reference), referencePermutation(to.reference));
  return product(product(reference, r), transpose(change(bodyPermutation(from.body), bodyPermutation(to.body))));
}

const matrixOfPermutation = ({ column, sign }: SignedPermutation): Matrix => PLACES.map((row) => PLACES.map((j) => (column[row] === j ? new BigNumber(sign[row]!) : ZERO)));

/** The nearest rotation: Newton's iteration for the polar factor, X ← (X + X⁻ᵀ)/2 (Higham 1986). */
export function nearest(m: Matrix): Matrix {
  let x = m;
  for (let step = 0; step < 100; step++) {
    const back = transpose(inverse(x));
    const next = x.map((row, i) => row.map((value, j) => value.plus(back[i]![j]!).div(TWO)));
    const change = next.flat().reduce((most, value, i) => BigNumber.max(most, value.minus(x.flat()[i]!).abs()), ZERO);
    x = next;
    if (change.lt('1e-40')) return x;
  }
  return x;
}

function inverse(m: Matrix): Matrix {
  const cofactor = (i: number, j: number): BigNumber => {
    const [a, b, c, d] = [(i + 1) % 3, (i + 2) % 3, (j + 1) % 3, (j + 2) % 3];
    return m[a]![c]!.times(m[b]![d]!).minus(m[a]![d]!.times(m[b]![c]!));
  };
  const determinant = PLACES.reduce((sum, j) => sum.plus(m[0]![j]!.times(cofactor(0, j))), ZERO);
  return PLACES.map((i) => PLACES.map((j) => cofactor(j, i).div(determinant)));
}

/** Largest element of |M Mᵀ − I|. */
export function defectOf(m: Matrix): number {
  return product(m, transpose(m)).flatMap((row, i) => row.map((value, j) => value.minus(i === j ? ONE : ZERO).abs().toNumber())).reduce((a, b) => Math.max(a, b));
}

/** Norm 1; scalar part not negative. */
function quaternionOf(m: Matrix): BigNumber[] {
  const at = (i: number, j: number): BigNumber => m[i]![j]!;
  const trace = at(0, 0).plus(at(1, 1)).plus(at(2, 2));
  const pivots = [ONE.plus(trace), ...PLACES.map((i) => ONE.plus(TWO.times(at(i, i))).minus(trace))];
  const largest = pivots.reduce((best, pivot, i) => (pivot.gt(pivots[best]!) ? i : best), 0);
  const skew = [at(2, 1).minus(at(1, 2)), at(0, 2).minus(at(2, 0)), at(1, 0).minus(at(0, 1))];
  const q = largest === 0 ? [pivots[0]!, ...skew]
    : [skew[largest - 1]!, ...PLACES.map((i) => (i === largest - 1 ? pivots[largest]! : at(i, largest - 1).plus(at(largest - 1, i))))];
  const norm = BigNumber.sqrt(dot(q));
  const sign = (q.find((value) => !value.isZero()) ?? ONE).isNeg() ? -1 : 1;
  return q.map((value) => value.div(norm).times(sign));
}

/**
 * The numbers that a convention gives an attitude. Ranges are left to the comparison, which knows angles to whole turns
 * and quaternions to their sign; at gimbal lock the angles are null, since any split of the sum is as exact.
 */
export function numbersOf(convention: Convention, r: Matrix): BigNumber[] | null {
  switch (convention.representation) {
    case 'euler': return anglesOf(convention, r);
    case 'dcm': {
      const m = convention.maps === 'body-to-reference' ? r : transpose(r);
      return (convention.layout === 'row-major' ? m : transpose(m)).flat();
    }
    case 'quaternion': {
      const [w, x, y, z] = quaternionOf((convention.maps === 'body-to-reference') === (convention.product === 'hamilton') ? r : transpose(r));
      return convention.scalar === 'first' ? [w!, x!, y!, z!] : [x!, y!, z!, w!];
    }
    default: {
      const [w, ...v] = quaternionOf(sensed(convention.maps, r)) as [BigNumber, BigNumber, BigNumber, BigNumber];
      const sine = BigNumber.sqrt(dot(v));
      switch (convention.representation) {
        case 'mrp': return v.map((value) => value.div(ONE.plus(w)));
        case 'gibbs': return v.map((value) => value.div(w));
        case 'axis-angle': return sine.isZero() ? [ONE, ZERO, ZERO, ZERO] : [...v.map((value) => value.div(sine)), inUnit(TWO.times(BigNumber.atan2(sine, w)), convention.unit)];
        case 'rotation-vector': return sine.isZero() ? [ZERO, ZERO, ZERO] : v.map((value) => inUnit(value.times(TWO).times(BigNumber.atan2(sine, w)).div(sine), convention.unit));
      }
    }
  }
}

/** Intrinsic angles straight from the matrix of R_a(θ1) R_b(θ2) R_c(θ3). */
function anglesOf({ sequence, motion, order, signs, unit }: EulerConvention, r: Matrix): BigNumber[] | null {
  const applied = [...sequence].map((letter) => 'XYZ'.indexOf(letter));
  const [a, b, last] = (motion === 'extrinsic' ? [...applied].reverse() : applied) as [number, number, number];
  const symmetric = a === last;
  const c = 3 - a - b;
  const e = new BigNumber((b - a + 3) % 3 === 1 ? 1 : -1);
  const at = (i: number, j: number): BigNumber => r[i]![j]!;
  // sin θ1 and cos θ1 times the cosine (sine, where first = third) of the middle angle.
  const [s1, c1] = symmetric ? [at(b, a), e.neg().times(at(c, a))] : [e.neg().times(at(b, c)), at(c, c)];
  const across = BigNumber.sqrt(s1.times(s1).plus(c1.times(c1)));
  if (across.lt(LOCK)) return null;
  const first = BigNumber.atan2(s1, c1);
  const middle = symmetric ? BigNumber.atan2(across, at(a, a)) : BigNumber.atan2(e.times(at(a, c)), across);
  const third = symmetric
    ? BigNumber.atan2(at(c, a).times(at(b, c)).minus(at(b, a).times(at(c, c))), e.times(at(b, a).times(at(c, b)).minus(at(c, a).times(at(b, b)))))
    : BigNumber.atan2(e.times(at(c, c).times(at(b, a)).minus(at(b, c).times(at(c, a)))), at(c, c).times(at(b, b)).minus(at(b, c).times(at(c, b))));
  let angles = [first, middle, third];
  // The listed middle number of a symmetric sequence lies in [0, 180]: under a negative sign the other solution is meant.
  if (symmetric && signs[1] < 0) angles = [first.plus(PI), middle.neg(), third.plus(PI)];
  const inOrder = motion === 'extrinsic' ? [angles[2]!, angles[1]!, angles[0]!] : angles;
  return order.map((turn) => inUnit(inOrder[turn - 1]!.times(signs[turn - 1]!), unit));
}

/** Angle of the rotation between two matrices, rad: from their distance, which a trace near 3 could not tell. */
export function angleBetween(a: Matrix, b: Matrix): number {
  const square = a.flatMap((row, i) => row.map((value, j) => value.minus(b[i]![j]!))).reduce((sum, value) => sum.plus(value.times(value)), ZERO);
  const halfSine = BigNumber.sqrt(square.div(8)).toNumber();
  return halfSine >= 1 ? Math.PI : 2 * Math.asin(halfSine);
}
