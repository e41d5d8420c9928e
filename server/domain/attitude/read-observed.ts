import { DomainError } from '../errors.ts';
import { readRows } from './read-attitudes.ts';

/** Rows of 3, 4 or 9 numbers, all as the first one; one for each reference attitude. */
export function readObserved(rows: readonly unknown[], count: number, pointer: string, most = Infinity): Float64Array {
  if (rows.length !== count) {
    throw new DomainError('count-mismatch', `${pointer} holds ${rows.length} rows for ${count} reference attitudes.`, [{ pointer, message: `must hold one row for each of the ${count} attitudes in /reference/attitudes` }]);
  }
  const [first] = rows;
  const nested = Array.isArray(first) && first.length === 3 && first.every(Array.isArray);
  const width = nested ? 9 : Array.isArray(first) ? first.length : 0;
  if (width !== 3 && width !== 4 && width !== 9) {
    const message = Array.isArray(first) ? `has ${width} numbers; an attitude or a rate is listed by 3, 4 or 9` : 'must be an array of 3, 4 or 9 numbers';
    throw new DomainError('count-mismatch', `${pointer}/0 ${message}.`, [{ pointer: `${pointer}/0`, message }]);
  }
  return readRows(rows, { width, mayNest: width === 9, taker: 'each row, as the first one,', pointer, within: '', most });
}
