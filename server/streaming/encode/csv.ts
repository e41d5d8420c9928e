import { cutLines, NOTHING, type Encoder } from './encoder.ts';

/** Comma-separated numbers (RFC 4180 but for LF line ends), one attitude a line; each the shortest text that reads back to the same double. */
export function csvEncoder(width: number, names: readonly string[] | null): Encoder {
  return {
    opening: names ? Buffer.from(`${names.join(',')}\n`) : NOTHING,
    rows(numbers) {
      let text = '';
      for (let i = 0; i < numbers.length; i += width) {
        text += numbers[i]!;
        for (let k = 1; k < width; k++) text += `,${numbers[i + k]!}`;
        text += '\n';
      }
      return Buffer.from(text, 'latin1');
    },
    cut: cutLines,
    closing: () => NOTHING,
    // A line that no reader of numbers can take for an attitude.
    refusal: ({ code, row, message }) => Buffer.from(`problem,${code},${row ?? ''},"${message.replaceAll('"', '""')}"\n`),
  };
}
