import { PROBLEMS } from '#shared/api/problems.ts';
import { ENGINE } from '#server/domain/attitude/engine.ts';
import { cutLines, NOTHING, type Encoder } from './encoder.ts';
import { textRows } from './text.ts';

/** One JSON array a line, and a last line that is an object: the count and the warnings, or the problem. Without that line the answer is not whole. */
export function ndjsonEncoder(width: number): Encoder {
  return {
    opening: NOTHING,
    rows: (numbers) => textRows(numbers, width, '[', ']\n'),
    cut: cutLines,
    closing: ({ attitudes, warnings }) => Buffer.from(`${JSON.stringify({ count: attitudes, warnings, engine: ENGINE })}\n`),
    refusal({ code, message, row, items }, requestId) {
      const { status, title } = PROBLEMS[code];
      return Buffer.from(`${JSON.stringify({ problem: { type: `/problems/${code}`, title, status, detail: message, instance: `/requests/${requestId}`, code, errors: items, row } })}\n`);
    },
  };
}
