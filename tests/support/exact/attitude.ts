import { bodyPermutation, referencePermutation, type SignedPermutation } from '#shared/attitude/axes.ts';
import type { Convention } from '#shared/attitude/convention.ts';
import type { FixedPoint } from './fixed-point.ts';

/**
 * Conversions in exact-as-wanted arithmetic, written from the definitions of the convention facets and by other routes
 * than the core's: every attitude becomes a matrix by multiplying elementary rotations or by u ↦ q u q*, axis sets act
 * as full matrix products.
 */

export type Matrix = bigint[][];

export const transpose = (m: Matrix): Matrix => [0, 1, 2].map((i) => m.map((row) => row[i]!));

const permutationMatrix = ({ column, sign }: SignedPermutation): number[][] => column.map((c, row) => [0, 1, 2].map((j) => (j === c ? sign[row]! : 0)));

function applyIntegers(left: number[][], m: Matrix, right: number[][]): Matrix {
  const half = left.map((row) => [0, 1, 2].map((j) => row.reduce((sum, entry, k) => sum + BigInt(entry) * m[k]![j]!, 0n)));
  return half.map((row) => [0, 1, 2].map((j) => [0, 1, 2].reduce((sum, k) => sum + row[k]! * BigInt(right[j]![k]!), 0n)));
}

/** What numbers mean, between their own axis sets: v_ref = R v_body; a quaternion too where the numbers are not a matrix. */
export interface Meaning {
  readonly matrix: Matrix;
  /** The matrix is as given, not known to be orthogonal. */
  readonly given: boolean;
  readonly quaternion: bigint[] | null;
}

export class ExactAttitude {
  readonly f: FixedPoint;

  constructor(f: FixedPoint) {
    this.f = f;
  }

  inRadians = (angle: bigint, unit: 'deg' | 'rad'): bigint => (unit === 'deg' ? (angle * this.f.pi) / (180n * this.f.one) : angle);
  inUnit = (radians: bigint, unit: 'deg' | 'rad'): bigint => (unit === 'deg' ? (radians * 180n * this.f.one) / this.f.pi : radians);

  product(a: Matrix, b: Matrix): Matrix {
    return a.map((row) => [0, 1, 2].map((j) => row.reduce((sum, entry, k) => sum + this.f.mul(entry, b[k]![j]!), 0n)));
  }

  /** R(q)/|q|² with R(q) = (w² − v·v) I + 2 v vᵀ + 2 w [v×]. */
  matrixOf([w, x, y, z]: readonly bigint[]): Matrix {
    const { f } = this;
    const v = [x!, y!, z!];
    const vv = v.reduce((sum, entry) => sum + f.square(entry), 0n);
    const norm = f.square(w!) + vv;
    const cross = [[0n, -z!, y!], [z!, 0n, -x!], [-y!, x!, 0n]];
    return v.map((vi, i) => v.map((vj, j) => f.div((i === j ? f.square(w!) - vv : 0n) + 2n * f.mul(vi, vj) + 2n * f.mul(w!, cross[i]![j]!), norm)));
  }

  meaning(convention: Convention, numbers: readonly number[]): Meaning {
    const { f } = this;
    const n = numbers.map((number) => f.of(number));
    switch (convention.representation) {
      case 'euler': {
        let matrix: Matrix = [[f.one, 0n, 0n], [0n, f.one, 0n], [0n, 0n, f.one]];
        for (let turn = 0; turn < 3; turn++) {
          const listed = convention.order.indexOf((turn + 1) as 1 | 2 | 3);
          const [s, c] = f.sinCos(this.inRadians(BigInt(convention.signs[turn]!) * n[listed]!, convention.unit));
          const axis = 'XYZ'.indexOf(convention.sequence[turn]!);
          const [j, k] = [(axis + 1) % 3, (axis + 2) % 3];
          const elementary: Matrix = [0, 1, 2].map((row) => [0, 1, 2].map((column) => (row === column ? (row === axis ? f.one : c) : row === j && column === k ? -s : row === k && column === j ? s : 0n)));
          matrix = convention.motion === 'intrinsic' ? this.product(matrix, elementary) : this.product(elementary, matrix);
        }
        return { matrix, given: false, quaternion: null };
      }
      case 'quaternion': {
        const [w, x, y, z] = convention.scalar === 'first' ? n : [n[3], n[0], n[1], n[2]];
        return this.#turned([w!, x!, y!, z!], (convention.product === 'hamilton') !== (convention.maps === 'body-to-reference'));
      }
      case 'dcm': {
        const listed = [n.slice(0, 3), n.slice(3, 6), n.slice(6, 9)];
        const matrix = convention.layout === 'row-major' ? listed : transpose(listed);
        return { matrix: convention.maps === 'body-to-reference' ? matrix : transpose(matrix), given: true, quaternion: null };
      }
      case 'rotation-vector': {
        const length = f.sqrt(n.reduce((sum, entry) => sum + f.square(entry), 0n));
        return this.#turned(this.#about(n, length, length, convention.unit), convention.maps === 'reference-to-body');
      }
      case 'axis-angle': {
        const axis = n.slice(0, 3);
        return this.#turned(this.#about(axis, f.sqrt(axis.reduce((sum, entry) => sum + f.square(entry), 0n)), n[3]!, convention.unit), convention.maps === 'reference-to-body');
      }
      case 'mrp': return this.#turned([f.one - n.reduce((sum, entry) => sum + f.square(entry), 0n), ...n.map((entry) => 2n * entry)], convention.maps === 'reference-to-body');
      case 'gibbs': return this.#turned([f.one, ...n], convention.maps === 'reference-to-body');
    }
  }

  #about(axis: readonly bigint[], length: bigint, angle: bigint, unit: 'deg' | 'rad'): bigint[] {
    if (length === 0n) return [this.f.one, 0n, 0n, 0n];
    const [s, c] = this.f.sinCos(this.inRadians(angle, unit) / 2n);
    return [c, ...axis.map((entry) => (entry * s) / length)];
  }

  #turned([w, x, y, z]: readonly bigint[], conjugated: boolean): Meaning {
    const quaternion = conjugated ? [w!, -x!, -y!, -z!] : [w!, x!, y!, z!];
    return { matrix: this.matrixOf(quaternion), given: false, quaternion };
  }

  /** C_to = P_b C P_rᵀ, here for R = Cᵀ. */
  relabelled(matrix: Matrix, from: Convention, to: Convention): Matrix {
    const between = (a: number[][], b: number[][]): number[][] => a.map((row) => b.map((other) => row.reduce((sum, entry, k) => sum + entry * other[k]!, 0)));
    const reference = between(permutationMatrix(referencePermutation(to.reference)), permutationMatrix(referencePermutation(from.reference)));
    const body = between(permutationMatrix(bodyPermutation(to.body)), permutationMatrix(bodyPermutation(from.body)));
    return applyIntegers(reference, matrix, body);
  }

  /** The rotation nearest to a matrix near one: Newton's iteration for the polar factor (Higham 1986), not Davenport's K. */
  nearest(matrix: Matrix): Matrix {
    let x = matrix;
    for (let step = 0; step < 60; step++) {
      const inverse = transpose(this.#inverse(x));
      const next = x.map((row, i) => row.map((entry, j) => (entry + inverse[i]![j]!) / 2n));
      const change = next.flat().reduce((most, entry, k) => { const d = entry - x[Math.trunc(k / 3)]![k % 3]!; const size = d < 0n ? -d : d; return size > most ? size : most; }, 0n);
      x = next;
      if (change < 1n << (this.f.bits / 2n - 8n)) break;
    }
    return x;
  }

  #inverse(m: Matrix): Matrix {
    const { f } = this;
    const minor = (i: number, j: number): bigint => {
      const [a, b] = [0, 1, 2].filter((row) => row !== i) as [number, number];
      const [c, d] = [0, 1, 2].filter((column) => column !== j) as [number, number];
      return (f.mul(m[a]![c]!, m[b]![d]!) - f.mul(m[a]![d]!, m[b]![c]!)) * ((i + j) % 2 === 0 ? 1n : -1n);
    };
    const determinant = [0, 1, 2].reduce((sum, j) => sum + f.mul(m[0]![j]!, minor(0, j)), 0n);
    return [0, 1, 2].map((i) => [0, 1, 2].map((j) => f.div(minor(j, i), determinant)));
  }

  /** Norm 1, scalar part not negative. Pivot of Shepperd. */
  quaternionOf(m: Matrix): bigint[] {
    const { f } = this;
    const at = (i: number, j: number): bigint => m[i]![j]!;
    const trace = at(0, 0) + at(1, 1) + at(2, 2);
    const candidates = [
      [f.one + trace, at(2, 1) - at(1, 2), at(0, 2) - at(2, 0), at(1, 0) - at(0, 1)],
      [at(2, 1) - at(1, 2), f.one + 2n * at(0, 0) - trace, at(0, 1) + at(1, 0), at(0, 2) + at(2, 0)],
      [at(0, 2) - at(2, 0), at(0, 1) + at(1, 0), f.one + 2n * at(1, 1) - trace, at(1, 2) + at(2, 1)],
      [at(1, 0) - at(0, 1), at(0, 2) + at(2, 0), at(1, 2) + at(2, 1), f.one + 2n * at(2, 2) - trace],
    ];
    const pivot = [0, 1, 2, 3].reduce((best, i) => (candidates[i]![i]! > candidates[best]![best]! ? i : best), 0);
    const q = candidates[pivot]!;
    const norm = f.sqrt(q.reduce((sum, entry) => sum + f.square(entry), 0n));
    const sign = (q.find((entry) => entry !== 0n) ?? 1n) < 0n ? -1n : 1n;
    return q.map((entry) => sign * f.div(entry, norm));
  }

  /** The exact attitude between the target's axes; a given matrix as it stands where it is clean and goes to a matrix or angles. */
  rotation(from: Convention, to: Convention, numbers: readonly number[]): Matrix {
    const meaning = this.meaning(from, numbers);
    const asGiven = !meaning.given || (this.#isClean(meaning.matrix) && (to.representation === 'euler' || to.representation === 'dcm'));
    return this.relabelled(asGiven ? meaning.matrix : this.nearest(meaning.matrix), from, to);
  }

  /** The exact answer in the target's numbers. `sign` "continuous" is taken as "any"; at lock, null. */
  convert(from: Convention, to: Convention, numbers: readonly number[]): bigint[] | null {
    const { f } = this;
    const matrix = this.rotation(from, to, numbers);
    const transposed = (maps: 'body-to-reference' | 'reference-to-body'): Matrix => (maps === 'body-to-reference' ? matrix : transpose(matrix));
    switch (to.representation) {
      case 'dcm': {
        const m = transposed(to.maps);
        return (to.layout === 'row-major' ? m : transpose(m)).flat();
      }
      case 'euler': return this.#angles(matrix, to);
      case 'quaternion': {
        const turned = (to.product === 'hamilton') === (to.maps === 'body-to-reference') ? matrix : transpose(matrix);
        const [w, x, y, z] = this.quaternionOf(turned);
        return to.scalar === 'first' ? [w!, x!, y!, z!] : [x!, y!, z!, w!];
      }
      case 'rotation-vector': case 'axis-angle': {
        const [w, ...v] = this.quaternionOf(transposed(to.maps));
        const sine = f.sqrt(v.reduce((sum, entry) => sum + f.square(entry), 0n));
        const angle = this.inUnit(2n * f.atan2(sine, w!), to.unit);
        if (to.representation === 'rotation-vector') return sine === 0n ? v : v.map((entry) => (entry * angle) / sine);
        return sine === 0n ? [f.one, 0n, 0n, 0n] : [...v.map((entry) => f.div(entry, sine)), angle];
      }
      case 'mrp': {
        const [w, ...v] = this.quaternionOf(transposed(to.maps));
        return v.map((entry) => f.div(entry, f.one + w!));
      }
      case 'gibbs': {
        const [w, ...v] = this.quaternionOf(transposed(to.maps));
        return w === 0n ? null : v.map((entry) => f.div(entry, w!));
      }
    }
  }

  #isClean(m: Matrix): boolean {
    const product = this.product(m, transpose(m));
    return product.every((row, i) => row.every((entry, j) => Math.abs(this.f.toDouble(entry - (i === j ? this.f.one : 0n))) <= 1e-12));
  }

  /** Listed angles, by C = R3 R2 R1 carried to the sequence's axes. Null where the middle angle locks exactly. */
  #angles(matrix: Matrix, to: Convention & { representation: 'euler' }): bigint[] | null {
    const { f } = this;
    const intrinsic = to.motion === 'intrinsic' ? [...to.sequence] : [...to.sequence].reverse();
    const [a, b, c] = intrinsic.map((letter) => 'XYZ'.indexOf(letter)) as [number, number, number];
    const parity = (b - a + 3) % 3 === 1 ? 1n : -1n;
    const at = (i: number, j: number): bigint => matrix[i]![j]!;
    const third = 3 - a - b;
    const [s1, c1] = a === c ? [at(b, a), -parity * at(third, a)] : [-parity * at(b, c), at(c, c)];
    const cosine = f.sqrt(f.square(s1) + f.square(c1));
    if (cosine === 0n) return null;
    const e = a === c ? third : c;
    const first = f.atan2(s1, c1);
    // The first turn taken back, to read the last off the second row.
    const turnedBack = (j: number): bigint => f.div(f.mul(c1, at(b, j)) + parity * f.mul(s1, at(e, j)), cosine);
    let angles = a === c
      ? [first, f.atan2(cosine, at(a, a)), f.atan2(-parity * turnedBack(third), turnedBack(b))]
      : [first, f.atan2(parity * at(a, c), cosine), f.atan2(parity * turnedBack(a), turnedBack(b))];
    if (to.motion === 'extrinsic') angles = angles.toReversed();
    if (a === c && to.signs[1] < 0) angles = [angles[0]! + f.pi, -angles[1]!, angles[2]! + f.pi];
    return to.order.map((turn) => {
      let listed = BigInt(to.signs[turn - 1]!) * angles[turn - 1]!;
      if (turn !== 2) {
        while (listed > f.pi) listed -= 2n * f.pi;
        while (listed <= -f.pi) listed += 2n * f.pi;
        if (turn === 1 && to.range === 'positive' && listed < 0n) listed += 2n * f.pi;
      }
      return this.inUnit(listed, to.unit);
    });
  }
}

