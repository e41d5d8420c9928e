import { rowRefusal, type Refusal } from '../refusal.ts';
import type { Decoder } from './decoder.ts';

/** Longer lines are refused before they are complete: nine numbers at full precision take 230 characters. */
const LONGEST_LINE = 16_384;

/** What is wrong with a line: the row is added by whoever counts them. */
export interface LineFault {
  readonly code: Refusal['code'];
  readonly message: string;
  readonly column?: number;
}

/** Reads one line's numbers into `into` from `at` on; says what is wrong with it, if anything. */
export type ReadLine = (line: string, into: Float64Array, at: number) => LineFault | null;

/**
 * Text with one attitude a line, lines ending in LF or CRLF, the last one with or without. Empty lines are passed over.
 * @param headerLines - How many lines at the beginning are no data.
 */
export function lineDecoder(width: number, read: ReadLine, headerLines = 0): Decoder {
  const text = new TextDecoder('utf-8', { fatal: true });
  let rest = '';
  let lines = 0;
  let rows = 0;
  let numbers = new Float64Array(1024);
  return {
    decode(bytes, last) {
      let all: string;
      try {
        all = rest + text.decode(bytes, { stream: !last });
      } catch {
        return { numbers: new Float64Array(0), refusal: rowRefusal('malformed-request', rows, 'or one soon after it is not valid UTF-8') };
      }
      let used = 0;
      let start = 0;
      let refusal: Refusal | null = null;
      while (start < all.length) {
        let end = all.indexOf('\n', start);
        if (end < 0) {
          if (!last) break;
          end = all.length;
        }
        const line = all.slice(start, all.charCodeAt(end - 1) === 13 && end > start ? end - 1 : end);
        start = end + 1;
        lines++;
        if (lines <= headerLines || line.trim() === '') continue;
        if (used + width > numbers.length) numbers = grown(numbers);
        const fault = line.length > LONGEST_LINE ? tooLong : read(line, numbers, used);
        if (fault) {
          refusal = rowRefusal(fault.code, rows, fault.message, { where: `, line ${lines},`, ...(fault.column === undefined ? {} : { column: fault.column }) });
          break;
        }
        used += width;
        rows++;
      }
      rest = all.slice(start);
      if (!refusal && rest.length > LONGEST_LINE) refusal = rowRefusal(tooLong.code, rows, tooLong.message, { where: `, line ${lines + 1},` });
      return { numbers: numbers.subarray(0, used), refusal };
    },
  };
}

const tooLong: LineFault = { code: 'malformed-request', message: `has more than ${LONGEST_LINE} characters` };

function grown(numbers: Float64Array): Float64Array<ArrayBuffer> {
  const twice = new Float64Array(numbers.length * 2);
  twice.set(numbers);
  return twice;
}
