/** [w, x, y, z], Hamilton's product; as an attitude, v_ref = R(q) v_body with R(q) = (w² − v·v) I + 2 v vᵀ + 2 w [v×]. */
export type Quaternion = [number, number, number, number];

/** Hamilton's product a b: the rotation b, then the rotation a, of vectors u ↦ q u q*. */
export function multiply(a: Readonly<Quaternion>, b: Readonly<Quaternion>): Quaternion {
  return [
    a[0] * b[0] - a[1] * b[1] - a[2] * b[2] - a[3] * b[3],
    a[0] * b[1] + a[1] * b[0] + a[2] * b[3] - a[3] * b[2],
    a[0] * b[2] - a[1] * b[3] + a[2] * b[0] + a[3] * b[1],
    a[0] * b[3] + a[1] * b[2] - a[2] * b[1] + a[3] * b[0],
  ];
}

export const conjugate = ([w, x, y, z]: Readonly<Quaternion>): Quaternion => [w, -x, -y, -z];

/** The quaternion of norm 1 in the same direction. The largest component is divided out first, so that no square over- or underflows. */
export function normalise(q: Readonly<Quaternion>): Quaternion {
  const scale = Math.max(Math.abs(q[0]), Math.abs(q[1]), Math.abs(q[2]), Math.abs(q[3]));
  const [w, x, y, z] = [q[0] / scale, q[1] / scale, q[2] / scale, q[3] / scale];
  const norm = Math.sqrt(w * w + x * x + y * y + z * z);
  return [w / norm, x / norm, y / norm, z / norm];
}

/** The same attitude with a non-negative scalar part; where that is 0, with its first non-zero component positive. */
export function canonical(q: Readonly<Quaternion>): Quaternion {
  const first = q.find((component) => component !== 0) ?? 0;
  return first < 0 ? [-q[0], -q[1], -q[2], -q[3]] : [q[0], q[1], q[2], q[3]];
}
