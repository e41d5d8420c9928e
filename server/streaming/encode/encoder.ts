import type { AttitudeWarning } from '#shared/attitude/warnings.ts';
import type { Refusal } from '../refusal.ts';

/** What an answer says at its end. */
export interface Closing {
  readonly attitudes: number;
  readonly warnings: readonly AttitudeWarning[];
}

/** Writes attitudes in one content type. Everything it gives is bytes that can be sent one after another. */
export interface Encoder {
  /** Before the first row. */
  readonly opening: Uint8Array;
  rows(numbers: Float64Array): Uint8Array;
  /** The first so many rows of what `rows` gave. */
  cut(encoded: Uint8Array, rows: number): Uint8Array;
  /** After the last row. */
  closing(closing: Closing): Uint8Array;
  /** In place of the row refused. */
  refusal(refusal: Refusal, requestId: string): Uint8Array;
}

export const NOTHING = new Uint8Array(0);
const NEW_LINE = 10;

/** The first so many lines of a text. */
export function cutLines(encoded: Uint8Array, lines: number): Uint8Array {
  let end = 0;
  for (let i = 0; i < lines; i++) end = encoded.indexOf(NEW_LINE, end) + 1;
  return encoded.subarray(0, end);
}
