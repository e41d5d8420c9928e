import type { Decoder } from './decoder.ts';
import { lineDecoder, type LineFault } from './lines.ts';

const NUMBER = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?$/;
const SPECIAL = /^[+-]?(?:nan|inf|infinity)$/i;

/** Comma-separated numbers (RFC 4180), one attitude a line; a number may stand in quotes. */
export function csvDecoder(width: number, header: boolean): Decoder {
  const readLine = (line: string, into: Float64Array, at: number): LineFault | null => {
    let start = 0;
    for (let column = 0; ; column++) {
      const comma = line.indexOf(',', start);
      const cell = comma < 0 ? line.slice(start) : line.slice(start, comma);
      if (column >= width) return wrongCount(line, width);
      const value = numberIn(cell);
      if (typeof value !== 'number') return { ...value, column };
      into[at + column] = value;
      if (comma < 0) return column === width - 1 ? null : wrongCount(line, width);
      start = comma + 1;
    }
  };
  return lineDecoder(width, readLine, header ? 1 : 0);
}

const wrongCount = (line: string, width: number): LineFault => ({ code: 'count-mismatch', message: `has ${line.split(',').length} numbers, not ${width}` });

function numberIn(cell: string): number | LineFault {
  const value = Number(cell);
  // Number() takes an empty cell for 0, and hexadecimal digits, which no other reader of CSV does: look closer at what is not plainly a number.
  if (Number.isFinite(value) && isPlain(cell)) return value;
  const bare = cell.trim().replace(/^"(.*)"$/, '$1').trim();
  if (NUMBER.test(bare)) {
    const quoted = Number(bare);
    return Number.isFinite(quoted) ? quoted : { code: 'not-finite', message: `has ${bare.slice(0, 40)}, which is too large for a double` };
  }
  if (SPECIAL.test(bare)) return { code: 'not-finite', message: `has "${bare}"; it must be a finite number` };
  return { code: 'not-a-number', message: `has ${JSON.stringify(cell.slice(0, 40))} where a number belongs; a line of names is announced by "text/csv; header=present"` };
}

/** Only digits, point, signs and e. */
function isPlain(cell: string): boolean {
  if (cell.length === 0) return false;
  for (let i = 0; i < cell.length; i++) {
    const c = cell.charCodeAt(i);
    if (!((c >= 48 && c <= 57) || c === 46 || c === 45 || c === 43 || c === 101 || c === 69)) return false;
  }
  return true;
}
