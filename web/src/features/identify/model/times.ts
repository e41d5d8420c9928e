import type { ParsedTable } from '../../verify/model/parse-table.ts';

/** The column that names itself times, if it is not one of the attitude's: its place as a select has it, or ''. */
export function timesIn({ columns }: ParsedTable, used: readonly (number | null)[]): string {
  const place = columns.findIndex((title, k) => /^t(ime)?([ _]?\(?s(ec(onds)?)?\)?)?$/i.test(title.trim()) && !used.includes(k));
  return place < 0 ? '' : String(place);
}

/** The times of a column, or null where none is chosen. */
export function timesOf({ rows, columns }: ParsedTable, column: string): number[] | null {
  if (column === '' || Number(column) >= columns.length) return null;
  return rows.map((row) => row[Number(column)]!);
}
