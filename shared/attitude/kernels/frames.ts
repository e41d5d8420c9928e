import { handedness, type SignedPermutation } from '../axes.ts';
import type { Convention, EulerConvention } from '../convention.ts';

/**
 * All twelve sequences, intrinsic or extrinsic, are two canonical ones in other axes: Rx Ry Rz and Rx Ry Rx.
 * `frame` takes the convention's axes to the canonical ones (det +1); where the three axes run x z y, the third
 * points the other way, and with it the last angle.
 */
export interface CanonicalSequence {
  /** First and third axis are the same. */
  readonly symmetric: boolean;
  readonly frame: SignedPermutation;
  /** Sign of the canonical last angle against the intrinsic last one. */
  readonly lastSense: 1 | -1;
  /** Canonical place 0, 1, 2 of the first, second and third rotation applied. */
  readonly placeOfApplied: readonly [number, number, number];
}

export const IDENTITY: SignedPermutation = { column: [0, 1, 2], sign: [1, 1, 1] };

export function canonicalSequence({ sequence, motion }: EulerConvention): CanonicalSequence {
  const applied = [...sequence].map((letter) => 'XYZ'.indexOf(letter));
  // Extrinsic A-B-C with angles (a, b, c) is intrinsic C-B-A with (c, b, a).
  const [a, b, c] = (motion === 'extrinsic' ? applied.reverse() : applied) as [number, number, number];
  const symmetric = a === c;
  const cyclic = (b - a + 3) % 3 === 1;
  return {
    symmetric,
    frame: { column: [a, b, 3 - a - b], sign: [1, 1, cyclic ? 1 : -1] },
    lastSense: cyclic || symmetric ? 1 : -1,
    placeOfApplied: motion === 'extrinsic' ? [2, 1, 0] : [0, 1, 2],
  };
}

/** The permutation a b: first b, then a. */
export function compose(a: SignedPermutation, b: SignedPermutation): SignedPermutation {
  const column = a.column.map((i) => b.column[i]!) as [number, number, number];
  const sign = a.column.map((i, row) => a.sign[row]! * b.sign[i]!) as [number, number, number];
  return { column, sign };
}

export function inverse({ column, sign }: SignedPermutation): SignedPermutation {
  const from = [0, 1, 2].map((i) => column.indexOf(i)) as [number, number, number];
  return { column: from, sign: from.map((row) => sign[row]!) as [number, number, number] };
}

export const frameOf = (convention: Convention): SignedPermutation => (convention.representation === 'euler' ? canonicalSequence(convention).frame : IDENTITY);

/** How R (v_ref = R v_body) between one convention's working axes reads between another's: left R rightᵀ. */
export interface Relabelling {
  readonly left: SignedPermutation;
  readonly right: SignedPermutation;
}

export const transposesMatrix = (convention: Convention): boolean =>
  convention.representation === 'dcm' && (convention.maps === 'reference-to-body') !== (convention.layout === 'column-major');

/** Whether the numbers state the quaternion of body-to-reference (Hamilton) conjugated. */
export function conjugates(convention: Convention): boolean {
  if (convention.representation === 'euler' || convention.representation === 'dcm') return false;
  const hamilton = convention.representation !== 'quaternion' || convention.product === 'hamilton';
  return hamilton !== (convention.maps === 'body-to-reference');
}

/** Element k of one matrix is sign[k] times element index[k] of another, both row by row. */
export interface ElementMap {
  readonly index: Int32Array;
  readonly sign: Float64Array;
}

/** left R rightᵀ as a map of elements, which only moves them and changes signs; R and the answer may be listed transposed. */
export function elementMap({ left, right }: Relabelling, fromTransposed: boolean, toTransposed: boolean): ElementMap {
  const index = new Int32Array(9);
  const sign = new Float64Array(9);
  for (let i = 0; i < 3; i++) {
    for (let j = 0; j < 3; j++) {
      const to = toTransposed ? 3 * j + i : 3 * i + j;
      const [row, column] = [left.column[i]!, right.column[j]!];
      index[to] = fromTransposed ? 3 * column + row : 3 * row + column;
      sign[to] = left.sign[i]! * right.sign[j]!;
    }
  }
  return { index, sign };
}

/** Component i of one quaternion is the sum of `terms` signed components of another, over √terms. */
export interface ComponentMap {
  readonly terms: 1 | 2 | 4;
  /** `terms` numbers a component. */
  readonly index: Int32Array;
  readonly sign: Float64Array;
}

/**
 * left q right* as a map of components w, x, y, z. A signed permutation of determinant +1 is a rotation of the cube,
 * whose quaternion has components of one size and zeros, so every component of the product is a plain signed sum.
 */
export function componentMap({ left, right }: Relabelling, conjugateFrom: boolean, conjugateTo: boolean): ComponentMap {
  const [p, q] = [cubeQuaternion(left), conjugate(cubeQuaternion(right))];
  const columns = [0, 1, 2, 3].map((i) => {
    const unit = [0, 0, 0, 0];
    unit[i] = conjugateFrom && i > 0 ? -1 : 1;
    const product = multiply(multiply(p, unit), q);
    return conjugateTo ? conjugate(product) : product;
  });
  const rows = [0, 1, 2, 3].map((row) => columns.map((column) => Math.sign(column[row]!)));
  const terms = rows[0]!.filter((entry) => entry !== 0).length as 1 | 2 | 4;
  const places = rows.map((row) => row.flatMap((entry, i) => (entry === 0 ? [] : [i])));
  return { terms, index: Int32Array.from(places.flat()), sign: Float64Array.from(rows.flatMap((row) => row.filter((entry) => entry !== 0))) };
}

/** The quaternion of a signed permutation, as integers of any norm; of its negative where the determinant is −1, which serves a pair of them alike. */
function cubeQuaternion(permutation: SignedPermutation): number[] {
  const m = [0, 0, 0, 0, 0, 0, 0, 0, 0];
  permutation.column.forEach((column, row) => { m[3 * row + column] = permutation.sign[row]! * handedness(permutation); });
  const [m00, m01, m02, m10, m11, m12, m20, m21, m22] = m as [number, number, number, number, number, number, number, number, number];
  const pivots = [
    [1 + m00 + m11 + m22, m21 - m12, m02 - m20, m10 - m01],
    [m21 - m12, 1 + m00 - m11 - m22, m01 + m10, m02 + m20],
    [m02 - m20, m01 + m10, 1 - m00 + m11 - m22, m12 + m21],
    [m10 - m01, m02 + m20, m12 + m21, 1 - m00 - m11 + m22],
  ];
  return pivots.find((pivot, i) => pivot[i] !== 0)!.map((component) => Math.sign(component));
}

const conjugate = ([w, x, y, z]: readonly number[]): number[] => [w!, -x!, -y!, -z!];

function multiply([aw, ax, ay, az]: readonly number[], [bw, bx, by, bz]: readonly number[]): number[] {
  return [
    aw! * bw! - ax! * bx! - ay! * by! - az! * bz!,
    aw! * bx! + ax! * bw! + ay! * bz! - az! * by!,
    aw! * by! - ax! * bz! + ay! * bw! + az! * bx!,
    aw! * bz! + ax! * by! - ay! * bx! + az! * bw!,
  ];
}
