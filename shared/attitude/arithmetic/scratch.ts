/**
 * Where the kernels leave their double-double results for one another, as pairs hi, lo at agreed slots.
 *
 * A double that crosses a call is boxed, and an object per attitude is garbage per attitude; slots of one typed
 * array are neither. Nothing outlives one conversion here: each kernel says what it reads and what it leaves.
 */
export const scratch = new Float64Array(128);
