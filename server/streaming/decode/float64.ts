import { endianness } from 'node:os';
import { rowRefusal } from '../refusal.ts';
import type { Decoder } from './decoder.ts';

const DOUBLE = 8;
const LITTLE = endianness() === 'LE';

/** Little-endian doubles, `width` an attitude and nothing between them. */
export function float64Decoder(width: number): Decoder {
  const rowBytes = width * DOUBLE;
  let rest = new Uint8Array(0);
  let rows = 0;
  // Made once and used for every part: memory made anew for each would pile up between collections.
  let part = new Uint8Array(0);
  return {
    decode(bytes, last) {
      const whole = Math.floor((rest.length + bytes.length) / rowBytes) * rowBytes;
      if (part.length < whole) part = new Uint8Array(whole);
      if (whole === 0) {
        rest = joined(rest, bytes);
      } else {
        // What was left over is less than a row, so it all fits.
        part.set(rest);
        part.set(bytes.subarray(0, whole - rest.length), rest.length);
        rest = bytes.slice(whole - rest.length);
      }
      if (!LITTLE) Buffer.from(part.buffer, 0, whole).swap64();
      rows += whole / rowBytes;
      const refusal = last && rest.length > 0
        ? rowRefusal('count-mismatch', rows, `ends after ${rest.length} of its ${rowBytes} bytes; an attitude is ${width} doubles`)
        : null;
      return { numbers: new Float64Array(part.buffer, 0, whole / DOUBLE), refusal };
    },
  };
}

function joined(a: Uint8Array, b: Uint8Array): Uint8Array<ArrayBuffer> {
  const both = new Uint8Array(a.length + b.length);
  both.set(a);
  both.set(b, a.length);
  return both;
}
