import { NUMBERS_PER_ATTITUDE, type Convention } from '#shared/attitude/convention.ts';
import { LISTED_AT_MOST } from '#shared/attitude/errors.ts';
import type { ProblemCode, ProblemItem } from '#shared/api/problems.ts';
import { DomainError } from '../errors.ts';

/**
 * The numbers of a batch as one flat array, checked by hand: a row must hold the count of numbers that its
 * convention states, each a finite number. Nothing is coerced: "1" is not a number here.
 *
 * @param rows - As parsed from JSON; a row-major matrix may also stand as three rows of three.
 * @param pointer - JSON pointer of the rows in the body.
 * @throws DomainError `count-mismatch`, `not-a-number`, `not-finite`, naming every bad row (first 100).
 */
export function readAttitudes(rows: readonly unknown[], convention: Convention, pointer: string, within = ''): Float64Array {
  const mayNest = convention.representation === 'dcm' && convention.layout === 'row-major';
  return readRows(rows, { width: NUMBERS_PER_ATTITUDE[convention.representation], mayNest, taker: `the representation "${convention.representation}"`, pointer, within });
}

/** What a row must look like, and where it stands in the body: at `pointer`/index`within`. */
export interface RowShape {
  readonly width: number;
  readonly mayNest: boolean;
  /** What takes that many numbers, for the error. */
  readonly taker: string;
  readonly pointer: string;
  readonly within: string;
  /** Largest size of a number; any finite one where absent. */
  readonly most?: number;
}

export function readRows(rows: readonly unknown[], { width, mayNest, taker, pointer, within, most = Infinity }: RowShape): Float64Array {
  const faults = new Faults();
  if (rows.length === 0) faults.add('count-mismatch', pointer, 'must hold at least one attitude');
  const numbers = new Float64Array(rows.length * width);
  for (let index = 0; index < rows.length; index++) {
    let row = rows[index];
    let places = (column: number) => `${pointer}/${index}${within}/${column}`;
    if (mayNest && Array.isArray(row) && row.length === 3 && row.every(Array.isArray)) {
      if (row.every((part) => (part as unknown[]).length === 3)) {
        row = row.flat();
        places = (column) => `${pointer}/${index}${within}/${Math.floor(column / 3)}/${column % 3}`;
      }
    }
    if (!Array.isArray(row)) {
      faults.add('not-a-number', `${pointer}/${index}${within}`, `must be an array of ${width} numbers`);
      continue;
    }
    if (row.length !== width) {
      faults.add('count-mismatch', `${pointer}/${index}${within}`, `has ${row.length} numbers; ${taker} takes ${width}`);
      continue;
    }
    for (let column = 0; column < width; column++) {
      const value: unknown = row[column];
      if (typeof value === 'number' && Number.isFinite(value)) {
        numbers[index * width + column] = value;
        if (Math.abs(value) > most) faults.add('out-of-range', places(column), `is ${value}; it must be within ±${most}`);
      }
      else if (typeof value === 'number') faults.add('not-finite', places(column), 'is too large for a double');
      else if (value === null) faults.add('not-finite', places(column), 'is null, which is what NaN and infinity become in JSON; it must be a finite number');
      else faults.add('not-a-number', places(column), `is ${Array.isArray(value) ? 'an array' : typeof value === 'string' ? `the text ${JSON.stringify(value.slice(0, 40))}` : `of type ${typeof value}`}; it must be a number`);
    }
  }
  faults.throwIfAny();
  return numbers;
}

/** Collects what is wrong with a batch; the first kind of fault names the error. */
class Faults {
  #code: ProblemCode | null = null;
  #count = 0;
  readonly #items: ProblemItem[] = [];

  add(code: ProblemCode, pointer: string, message: string): void {
    this.#code ??= code;
    this.#count++;
    if (this.#items.length < LISTED_AT_MOST) this.#items.push({ pointer, message });
  }

  throwIfAny(): void {
    if (this.#code === null) return;
    const [first] = this.#items;
    const others = this.#count > 1 ? `; and ${this.#count - 1} more` : '';
    throw new DomainError(this.#code, `${first!.pointer} ${first!.message}${others}.`, this.#items);
  }
}
