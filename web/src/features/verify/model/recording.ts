import { NUMBERS_PER_ATTITUDE } from '../../../../../shared/attitude/convention.ts';
import type { Statement } from '../../workbench/model/workbench-state.ts';
import { parseTable, pick, type ParsedTable } from './parse-table.ts';

/** One side of a comparison as somebody gives it: numbers, and the convention they are stated in. */
export interface Recording {
  readonly statement: Statement;
  readonly text: string;
  /** The file the text came from; null when it was typed or pasted. */
  readonly file: string | null;
  /** Which column holds each number of an attitude; null where nobody has said. */
  readonly columns: readonly (number | null)[];
}

export const emptyRecording = (statement: Statement): Recording => ({ statement, text: '', file: null, columns: [] });

export interface ReadRecording {
  readonly table: ParsedTable;
  /** The columns in use: as chosen, or all of them where there are as many as the convention takes numbers. */
  readonly columns: readonly (number | null)[];
  readonly attitudes: readonly (readonly number[])[];
  readonly error: string | null;
}

/** Never guesses which columns are meant where there are more of them than numbers. */
export function readRecording({ statement, text, columns }: Pick<Recording, 'statement' | 'text' | 'columns'>, parsed: ParsedTable = parseTable(text)): ReadRecording {
  const width = NUMBERS_PER_ATTITUDE[statement.convention.representation];
  const had = parsed.columns.length;
  const refused = (error: string | null): ReadRecording => ({ table: parsed, columns: inUse, attitudes: [], error });
  const inUse = Array.from({ length: width }, (_, i) => (had === width ? i : (columns[i] ?? null)));
  if (parsed.error !== null || had === 0) return refused(parsed.error);
  if (had < width) return refused(`Each line has ${had} numbers; the convention takes ${width}.`);
  if (inUse.some((column) => column === null || column >= had)) return refused(`There are ${had} columns; choose the ${width} that the convention means.`);
  if (new Set(inUse).size !== width) return refused('A column is chosen twice.');
  return { table: parsed, columns: inUse, attitudes: pick(parsed, inUse as number[]), error: null };
}
