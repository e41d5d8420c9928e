import type { Decoder } from './decoder.ts';
import { lineDecoder, type LineFault } from './lines.ts';

/** One JSON array of numbers a line; a row-major matrix may also stand as three rows of three. */
export function ndjsonDecoder(width: number, mayNest: boolean): Decoder {
  const readLine = (line: string, into: Float64Array, at: number): LineFault | null => {
    let row: unknown;
    try {
      row = JSON.parse(line);
    } catch {
      return { code: 'malformed-json', message: 'is not valid JSON; NaN and Infinity are not JSON' };
    }
    if (mayNest && Array.isArray(row) && row.length === 3 && row.every((part) => Array.isArray(part) && part.length === 3)) row = row.flat();
    if (!Array.isArray(row)) return { code: 'not-a-number', message: `must be an array of ${width} numbers` };
    if (row.length !== width) return { code: 'count-mismatch', message: `has ${row.length} numbers, not ${width}` };
    for (let column = 0; column < width; column++) {
      const value: unknown = row[column];
      if (typeof value !== 'number') return value === null ? { code: 'not-finite', message: 'has null; it must be a finite number', column } : { code: 'not-a-number', message: 'has something else where a number belongs', column };
      if (!Number.isFinite(value)) return { code: 'not-finite', message: 'has a number too large for a double', column };
      into[at + column] = value;
    }
    return null;
  };
  return lineDecoder(width, readLine);
}
