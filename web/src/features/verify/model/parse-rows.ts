/** Rows of numbers as pasted or dropped: separated by commas, semicolons, tabs or blanks; lines that begin with a letter are headings. */
export interface ParsedRows {
  readonly rows: readonly (readonly number[])[];
  /** What is wrong with the first bad line, with its number from 1. */
  readonly error: string | null;
}

export function parseRows(text: string, width: number): ParsedRows {
  const rows: number[][] = [];
  for (const [index, line] of text.split(/\r?\n/).entries()) {
    const trimmed = line.trim();
    if (trimmed === '' || trimmed.startsWith('#') || /^["']?[A-Za-z_]/.test(trimmed)) continue;
    const cells = trimmed.replace(/^\[|\],?$/g, '').split(/\s*[,;\t]\s*|\s+/).filter((cell) => cell !== '');
    const numbers = cells.map(Number);
    const bad = numbers.findIndex((number) => !Number.isFinite(number));
    if (bad >= 0) return { rows, error: `Line ${index + 1}: "${cells[bad]!.slice(0, 30)}" is not a number.` };
    if (numbers.length !== width) return { rows, error: `Line ${index + 1} has ${numbers.length} numbers; the convention takes ${width}.` };
    rows.push(numbers);
  }
  return { rows, error: null };
}
