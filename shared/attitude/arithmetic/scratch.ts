/**
 * Where the kernels leave their double-double results for one another, as pairs hi, lo at agreed slots.
 *
 * A double that crosses a call is boxed, and an object per attitude is garbage per attitude; slots of one typed
 * array are neither. Nothing outlives one conversion here: each kernel says what it reads and what it leaves.
 */
export const scratch = new Float64Array(160);

/** The same memory as 32-bit words, where a sign bit can be read without a branch. */
export const words = new Uint32Array(scratch.buffer);

/** Which of a double's two words holds its sign and exponent: 1, or 0 on machines of the other byte order. */
export const HIGH_WORD = new Uint8Array(Float64Array.of(1).buffer)[7] === 0x3f ? 1 : 0;
