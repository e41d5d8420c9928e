/** Three-by-three matrices, written out: what the tests of identification reckon with, apart from the engine's own. */
export type Matrix = readonly (readonly number[])[];

export const IDENTITY: Matrix = [[1, 0, 0], [0, 1, 0], [0, 0, 1]];
export const transpose = (m: Matrix): Matrix => [0, 1, 2].map((i) => m.map((row) => row[i]!));
export const multiply = (...factors: Matrix[]): Matrix => factors.reduce((a, b) => a.map((row) => [0, 1, 2].map((j) => row.reduce((sum, entry, k) => sum + entry * b[k]![j]!, 0))));

/** R1, R2, R3 of the convention formulas: rotations of the frame. */
export function elementary(axis: number, angle: number): Matrix {
  const [c, s] = [Math.cos(angle), Math.sin(angle)];
  if (axis === 0) return [[1, 0, 0], [0, c, s], [0, -s, c]];
  if (axis === 1) return [[c, 0, -s], [0, 1, 0], [s, 0, c]];
  return [[c, s, 0], [-s, c, 0], [0, 0, 1]];
}

/** R(q) = (w² − v·v) I + 2 v vᵀ + 2 w [v×], over |q|². */
export function ofQuaternion(w: number, x: number, y: number, z: number): Matrix {
  const norm = w * w + x * x + y * y + z * z;
  const v = [x, y, z];
  const cross = [[0, -z, y], [z, 0, -x], [-y, x, 0]];
  return v.map((a, i) => v.map((b, j) => ((i === j ? w * w - (x * x + y * y + z * z) : 0) + 2 * a * b + 2 * w * cross[i]![j]!) / norm));
}

/** Frame rotation about an axis, exactly R3 for z: the transpose of turning vectors. */
export function frameRotation(axis: readonly number[], angle: number): Matrix {
  const norm = Math.hypot(...axis) || 1;
  const s = Math.sin(angle / 2) / norm;
  return transpose(ofQuaternion(Math.cos(angle / 2), axis[0]! * s, axis[1]! * s, axis[2]! * s));
}

/** [w, x, y, z], w ≥ 0, with ofQuaternion(q) = m. */
export function toQuaternion(m: Matrix): [number, number, number, number] {
  const k = [
    [m[0]![0]! + m[1]![1]! + m[2]![2]!, m[2]![1]! - m[1]![2]!, m[0]![2]! - m[2]![0]!, m[1]![0]! - m[0]![1]!],
    [m[2]![1]! - m[1]![2]!, m[0]![0]! - m[1]![1]! - m[2]![2]!, m[0]![1]! + m[1]![0]!, m[0]![2]! + m[2]![0]!],
    [m[0]![2]! - m[2]![0]!, m[0]![1]! + m[1]![0]!, m[1]![1]! - m[0]![0]! - m[2]![2]!, m[1]![2]! + m[2]![1]!],
    [m[1]![0]! - m[0]![1]!, m[0]![2]! + m[2]![0]!, m[1]![2]! + m[2]![1]!, m[2]![2]! - m[0]![0]! - m[1]![1]!],
  ];
  // K + I = 4 q qᵀ: the longest column is the best known.
  const columns = k.map((row, i) => row.map((entry, j) => entry + (i === j ? 1 : 0)));
  const longest = columns.reduce((a, b) => (Math.hypot(...a) >= Math.hypot(...b) ? a : b));
  const norm = Math.hypot(...longest) * (longest[0]! < 0 ? -1 : 1);
  return longest.map((entry) => entry / norm) as [number, number, number, number];
}

/** Angle of the rotation between two attitudes, rad. */
export function angleBetween(a: Matrix, b: Matrix): number {
  const squares = a.flatMap((row, i) => row.map((entry, j) => (entry - b[i]![j]!) ** 2)).reduce((sum, square) => sum + square, 0);
  return 2 * Math.asin(Math.min(1, Math.sqrt(squares / 8)));
}
