/**
 * Slots of the scratch, shared by the kernels. A pair takes two (hi, lo), so slot numbers go up in twos.
 * What a kernel reads and leaves is named in its docstring by these names.
 */

/** Three angles, in the order of the canonical sequence. */
export const ANGLES = 0;
/** Sine and cosine of each: sine hi, lo, cosine hi, lo, three times over. */
export const SINES_COSINES = 8;
/** A quaternion w, x, y, z of any norm. */
export const QUATERNION = 24;
/** A matrix, nine pairs row by row. */
export const MATRIX = 32;
/** Three points y, x whose angles are wanted: y hi, lo, x hi, lo, three times over. */
export const POINTS = 56;
/** |cos| of the middle angle (|sin| where first = third axis), a double. */
export const COSINE = 72;
/** Where an angle that stays at lock is a point too: y hi, lo, x hi, lo, carried by the first or by the last angle. */
export const LOCKED_FIRST = 76;
export const LOCKED_LAST = 80;
/** A vector of three doubles, and its length as a pair. */
export const VECTOR = 84;
export const LENGTH = 88;
/** Four doubles: a seed for the quaternion of a matrix. */
export const SEED = 92;
/** Defect of norm or orthogonality where an input is repaired. */
export const DEFECT = 96;
/** The matrix as nine doubles, row by row. */
export const DOUBLES = 98;
/** Three times two pairs put in order of size and their difference, six slots each: within the arctangents alone. */
export const BY_SIZE = 128;
