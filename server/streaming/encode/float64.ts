import { endianness } from 'node:os';
import { NOTHING, type Encoder } from './encoder.ts';

const LITTLE = endianness() === 'LE';

/**
 * Little-endian doubles. No answer is ever NaN, so a row of NaN can only be what it is here: the place of the attitude
 * that was refused, after which nothing follows. What was wrong with it stands in the trailer and in the history.
 */
export function float64Encoder(width: number): Encoder {
  const bytesOf = (numbers: Float64Array): Uint8Array => {
    const bytes = Buffer.from(numbers.buffer, numbers.byteOffset, numbers.byteLength);
    return LITTLE ? bytes : Buffer.from(bytes).swap64();
  };
  return {
    opening: NOTHING,
    rows: bytesOf,
    cut: (encoded, rows) => encoded.subarray(0, rows * width * 8),
    closing: () => NOTHING,
    refusal: () => bytesOf(new Float64Array(width).fill(Number.NaN)),
  };
}
