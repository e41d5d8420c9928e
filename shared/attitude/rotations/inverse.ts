import type { Quaternion } from './quaternion.ts';

/** The inverse of a rotation: exact. For a quaternion of norm 1 it is its inverse under Hamilton's product too. */
export const inverse = ([w, x, y, z]: Readonly<Quaternion>): Quaternion => [w, 0 - x, 0 - y, 0 - z];
