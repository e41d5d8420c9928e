const DECIMAL = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i;

/**
 * A decimal number as typed, read without guessing: NaN for an empty text, a decimal comma, a unit, a hexadecimal
 * number, or one too large for a double.
 */
export function readNumber(text: string): number {
  const value = DECIMAL.test(text) ? Number(text) : NaN;
  return Number.isFinite(value) ? value : NaN;
}
