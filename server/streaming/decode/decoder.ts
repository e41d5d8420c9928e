import type { Refusal } from '../refusal.ts';

/** Turns the bytes of a stream into numbers, part by part; what is left of an unfinished row waits for the next part. */
export interface Decoder {
  /**
   * @param last - Whether the body ends with these bytes.
   * @returns whole rows as flat numbers, those before the fault where there is one; good until the next call.
   */
  decode(bytes: Uint8Array, last: boolean): { readonly numbers: Float64Array; readonly refusal: Refusal | null };
}
