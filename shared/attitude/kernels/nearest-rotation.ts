import { add, divide, exact, multiply, squareRoot, subtract, ZERO, type DoubleDouble } from '../arithmetic/double-double.ts';
import { scratch as S } from '../arithmetic/scratch.ts';
import { DOUBLES, QUATERNION } from '../arithmetic/slots.ts';

type Vector = DoubleDouble[];

/**
 * The quaternion of the rotation nearest to DOUBLES in the Frobenius norm, for any matrix of positive determinant:
 * the eigenvector of Davenport's K for its largest eigenvalue. Reads DOUBLES, leaves QUATERNION with norm 1.
 *
 * A seed in double precision by repeated squaring, then Newton's correction with a residual in double-double.
 * Accuracy: 2^-100 over the gap between the two largest eigenvalues. Not for the fast path: it allocates.
 * Source: Davenport's q-method, in Wertz (ed.) 1978, Spacecraft Attitude Determination and Control, 12.2.2.
 */
export function nearestRotation(): void {
  const k = davenport();
  let q: Vector = seedOf(k).map(exact);
  for (let step = 0; step < 8; step++) {
    const kq = k.map((row) => dot(row, q));
    const lambda = divide(dot(q, kq), dot(q, q));
    const residual = kq.map((component, i) => subtract(component, multiply(lambda, q[i]!)));
    const correction = correct(k, lambda[0], q, residual);
    q = normalised(q.map((component, i) => add(component, exact(correction[i]!))));
    if (Math.max(...correction.map(Math.abs)) < 1e-24) break;
  }
  q.forEach(([hi, lo], i) => {
    S[QUATERNION + 2 * i] = hi;
    S[QUATERNION + 2 * i + 1] = lo;
  });
}

/** Davenport's K of DOUBLES, brought near size 1 by a power of two; qᵀ K q = trace(R(q)ᵀ M). */
function davenport(): DoubleDouble[][] {
  let scale = 1;
  const largest = Math.max(...Array.from(S.subarray(DOUBLES, DOUBLES + 9), Math.abs));
  while (largest * scale > 2) scale /= 2;
  while (largest * scale < 0.5) scale *= 2;
  const m = (row: number, column: number): DoubleDouble => exact(S[DOUBLES + 3 * row + column]! * scale);
  const [xx, yy, zz] = [m(0, 0), m(1, 1), m(2, 2)];
  const [dx, dy, dz] = [subtract(m(2, 1), m(1, 2)), subtract(m(0, 2), m(2, 0)), subtract(m(1, 0), m(0, 1))];
  const [xy, xz, yz] = [add(m(0, 1), m(1, 0)), add(m(0, 2), m(2, 0)), add(m(1, 2), m(2, 1))];
  return [
    [add(add(xx, yy), zz), dx, dy, dz],
    [dx, subtract(subtract(xx, yy), zz), xy, xz],
    [dy, xy, subtract(subtract(yy, xx), zz), yz],
    [dz, xz, yz, subtract(subtract(zz, xx), yy)],
  ];
}

const dot = (a: readonly DoubleDouble[], b: readonly DoubleDouble[]): DoubleDouble => a.reduce<DoubleDouble>((sum, entry, i) => add(sum, multiply(entry, b[i]!)), ZERO);

function normalised(q: Vector): Vector {
  const norm = squareRoot(dot(q, q));
  return q.map((component) => divide(component, norm));
}

/** The dominant eigenvector of K + cI ≥ 0 to double precision: the largest column of a high power. */
function seedOf(k: readonly (readonly DoubleDouble[])[]): number[] {
  const shift = Math.sqrt(k.flat().reduce((sum, [entry]) => sum + entry * entry, 0));
  let power = k.map((row, i) => row.map(([entry], j) => entry + (i === j ? shift : 0)));
  for (let step = 0; step < 50; step++) {
    const size = Math.max(...power.flat().map(Math.abs));
    const scaled = power.map((row) => row.map((entry) => entry / size));
    power = scaled.map((row) => [0, 1, 2, 3].map((j) => row.reduce((sum, entry, n) => sum + entry * scaled[n]![j]!, 0)));
  }
  const pivot = [0, 1, 2, 3].reduce((best, i) => (power[i]![i]! > power[best]![best]! ? i : best), 0);
  const column = power.map((row) => row[pivot]!);
  const norm = Math.sqrt(column.reduce((sum, entry) => sum + entry * entry, 0));
  return column.map((entry) => entry / norm);
}

/** Newton's step for (K − λ) q = 0 at fixed norm: [K − λ, q; qᵀ, 0] (d, μ) = (−residual, 0), by elimination with pivoting. */
function correct(k: readonly (readonly DoubleDouble[])[], lambda: number, q: Vector, residual: Vector): number[] {
  const rows = [0, 1, 2, 3].map((i) => [...k[i]!.map(([entry], j) => entry - (i === j ? lambda : 0)), q[i]![0], -residual[i]![0]]);
  rows.push([...q.map(([component]) => component), 0, 0]);
  for (let column = 0; column < 5; column++) {
    let pivot = column;
    for (let row = column + 1; row < 5; row++) if (Math.abs(rows[row]![column]!) > Math.abs(rows[pivot]![column]!)) pivot = row;
    [rows[column], rows[pivot]] = [rows[pivot]!, rows[column]!];
    for (let row = 0; row < 5; row++) {
      if (row === column) continue;
      const factor = rows[row]![column]! / rows[column]![column]!;
      for (let j = column; j < 6; j++) rows[row]![j]! -= factor * rows[column]![j]!;
    }
  }
  return [0, 1, 2, 3].map((i) => rows[i]![5]! / rows[i]![i]!);
}
