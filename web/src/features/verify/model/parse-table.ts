import { readNumber } from '../../../lib/read-number.ts';

/** A recording as pasted or dropped, before anybody has said which columns mean what. */
export interface ParsedTable {
  /** Names of the columns; numbered from 1 where the recording names none. */
  readonly columns: readonly string[];
  readonly rows: readonly (readonly number[])[];
  /** What is wrong with the first bad line, with its number from 1. */
  readonly error: string | null;
}

const EMPTY: ParsedTable = { columns: [], rows: [], error: null };

/**
 * Reads rows of numbers separated by commas, semicolons, tabs or blanks. The first line may name the columns; lines
 * that begin with # are remarks. Every other line must be numbers throughout: a row left out in silence would pair
 * every later attitude with the wrong one.
 */
export function parseTable(text: string): ParsedTable {
  const rows: number[][] = [];
  let columns: string[] | null = null;
  for (const [index, line] of text.replace(/^\uFEFF/, '').split(/\r?\n/).entries()) {
    const trimmed = line.trim();
    if (trimmed === '' || trimmed.startsWith('#')) continue;
    const cells = cellsOf(trimmed);
    if (columns === null) {
      if (cells.every(isName)) {
        columns = cells.map((cell) => cell.replace(/^["']|["']$/g, ''));
        continue;
      }
      columns = cells.map((_, i) => `column ${i + 1}`);
    }
    const numbers = cells.map(readNumber);
    const bad = numbers.findIndex(Number.isNaN);
    if (bad >= 0) return { columns, rows, error: `Line ${index + 1}: "${cells[bad]!.slice(0, 30)}" is not a number.` };
    if (numbers.length !== columns.length) return { columns, rows, error: `Line ${index + 1} has ${numbers.length} numbers; the lines before it have ${columns.length}.` };
    rows.push(numbers);
  }
  return columns === null ? EMPTY : { columns, rows, error: null };
}

/** Separators as the line uses them: a comma, semicolon or tab if it has one, else blanks. Brackets around a row are dropped. */
function cellsOf(line: string): string[] {
  const bare = line.replace(/^\[+/, '').replace(/\]+,?$/, '');
  return /[,;\t]/.test(bare) ? bare.replace(/,$/, '').split(/\s*[,;\t]\s*/).map((cell) => cell.trim()) : bare.trim().split(/\s+/);
}

/** NaN and Infinity are values that a recording holds, never names of columns. */
const isName = (cell: string): boolean => /^["']?[\p{L}_]/u.test(cell) && !/^["']?(nan|inf|infinity)["']?$/i.test(cell);

/** The chosen columns of every row, in the order chosen. */
export const pick = (table: ParsedTable, chosen: readonly number[]): number[][] => table.rows.map((row) => chosen.map((column) => row[column]!));
