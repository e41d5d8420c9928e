/**
 * Rows of RFC 4180. A text that a spreadsheet would take for a formula is given an apostrophe in front, as OWASP advises
 * ("CSV Injection", cited from memory); numbers are written as they are, negative ones too, and stay numbers.
 */
export function csvRow(cells: readonly (string | number | null)[]): string {
  return `${cells.map((cell) => (cell === null ? '' : typeof cell === 'number' ? String(cell) : textCell(cell))).join(',')}\r\n`;
}

function textCell(text: string): string {
  // Some readers drop blanks before they look for a formula.
  const harmless = /^[\s\0]*[=+\-@|%＝＋－＠]|^[\t\r\n]/u.test(text) ? `'${text}` : text;
  return /[",\r\n]/.test(harmless) || harmless !== harmless.trim() ? `"${harmless.replaceAll('"', '""')}"` : harmless;
}
