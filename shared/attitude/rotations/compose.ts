import type { Quaternion } from './quaternion.ts';

/**
 * Hamilton's product a b: of maps u ↦ q u q*, the rotation b and then the rotation a. With a turning B-components into
 * A-components and b turning C-components into B-components, a b turns C-components into A-components.
 *
 * @param a - [w, x, y, z], any norm. @param b - likewise.
 * @returns the product; its norm is the product of the norms.
 * Accuracy: plain double precision, 4 units of 2^-53 of |a||b|.
 */
export function compose(a: Readonly<Quaternion>, b: Readonly<Quaternion>): Quaternion {
  return [
    a[0] * b[0] - a[1] * b[1] - a[2] * b[2] - a[3] * b[3],
    a[0] * b[1] + a[1] * b[0] + a[2] * b[3] - a[3] * b[2],
    a[0] * b[2] - a[1] * b[3] + a[2] * b[0] + a[3] * b[1],
    a[0] * b[3] + a[1] * b[2] - a[2] * b[1] + a[3] * b[0],
  ];
}
