/** What reading one attitude came to. */
export const FINE = 0;
/** The nearest rotation was taken; its defect is at DEFECT. */
export const REPAIRED = 1;
/** No rotation, or not a number; refusal.ts says which. */
export const REFUSED = 2;
/** The target cannot express the attitude. */
export const NOT_REPRESENTABLE = 3;
/** Fine, and at gimbal lock. */
export const LOCKED = 4;
/** A quick kernel cannot tell the rounding: the double-double ones must. */
export const UNSETTLED = 5;

/** Reads the attitude whose numbers start at `at` into the scratch. */
export type Reader = (numbers: Float64Array, at: number) => number;
/** Writes the attitude in the scratch as numbers from `at` on. */
export type Writer = (numbers: Float64Array, at: number) => number;

/** Defects up to here are rounding and are said nothing of; from here on they are repaired and reported. */
export const REPORTED_DEFECT = 1e-12;
/** Defects beyond this are refused unless repair is asked for. */
export const REFUSED_DEFECT = 1e-6;
