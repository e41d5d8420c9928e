import { cutLines, NOTHING, type Encoder } from './encoder.ts';
import { textRows } from './text.ts';

/** Comma-separated numbers (RFC 4180 but for LF line ends), one attitude a line; each the shortest text that reads back to the same double. */
export function csvEncoder(width: number, names: readonly string[] | null): Encoder {
  return {
    opening: names ? Buffer.from(`${names.join(',')}\n`) : NOTHING,
    rows: (numbers) => textRows(numbers, width, '', '\n'),
    cut: cutLines,
    closing: () => NOTHING,
    // A line that no reader of numbers can take for an attitude.
    refusal: ({ code, row, message }) => Buffer.from(`problem,${code},${row ?? ''},"${message.replaceAll('"', '""')}"\n`),
  };
}
