/** R(q) / |q|², row by row, into nine numbers from `at`; q any norm but 0. */
export function writeRotation(w: number, x: number, y: number, z: number, m: Float64Array, at: number): void {
  const s = 2 / (w * w + x * x + y * y + z * z);
  const wx = s * w * x, wy = s * w * y, wz = s * w * z;
  const xx = s * x * x, xy = s * x * y, xz = s * x * z, yy = s * y * y, yz = s * y * z, zz = s * z * z;
  m[at] = 1 - yy - zz; m[at + 1] = xy - wz; m[at + 2] = xz + wy;
  m[at + 3] = xy + wz; m[at + 4] = 1 - xx - zz; m[at + 5] = yz - wx;
  m[at + 6] = xz - wy; m[at + 7] = yz + wx; m[at + 8] = 1 - xx - yy;
}
