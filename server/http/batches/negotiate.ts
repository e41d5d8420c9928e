import type { Request } from 'express';
import { JSON_TYPE, STREAMED_TYPES, type StreamedType } from '#shared/api/media-types.ts';
import type { Format } from '#server/streaming/formats.ts';
import { HttpProblem } from '../problems.ts';

/** What a call brings and what it wants back; null stands for JSON. */
export interface Exchange {
  readonly input: Format | null;
  readonly output: Format | null;
}

/** JSON longer than this is parsed, converted and written in another thread: about 5,000 quaternions, some 5 ms each way. */
const LONG_JSON_BYTES = 512 * 1024;

/** The exchange that a call asks for, or null where it is short JSON both ways, or no content type known here: any other endpoint's business. */
export function exchangeOf(request: Request): Exchange | null {
  const isJson = Boolean(request.is([JSON_TYPE, 'application/*+json']));
  const type = isJson ? null : request.is([...STREAMED_TYPES]) as StreamedType | false | null;
  if (!isJson && !type) return null;
  const input: Format | null = type ? { type, header: /;\s*header\s*=\s*"?present/i.test(request.headers['content-type']!) } : null;
  const output = outputOf(request, input);
  return input || output || isLong(request) ? { input, output } : null;
}

const CSV_WITH_HEADER = 'text/csv;header=present';

/** What Accept prefers; where it says nothing, or anything, the content type of the body. */
function outputOf(request: Request, input: Format | null): Format | null {
  const own = input?.type ?? JSON_TYPE;
  const offered = [own, ...[JSON_TYPE, ...STREAMED_TYPES].filter((type) => type !== own), CSV_WITH_HEADER];
  // Whoever sends JSON and asks for what is not offered gets JSON, as from every other endpoint.
  const chosen = request.headers.accept === undefined ? own : request.accepts(offered) || (input ? false : JSON_TYPE);
  if (chosen === false) throw new HttpProblem('not-acceptable', `Accept is "${request.headers.accept}"; this operation answers in ${[JSON_TYPE, ...STREAMED_TYPES].join(', ')}.`);
  if (chosen === JSON_TYPE) return null;
  if (chosen === CSV_WITH_HEADER) return { type: 'text/csv', header: true };
  return { type: chosen as StreamedType, header: chosen === input?.type && input.header && request.headers.accept === undefined };
}

function isLong({ headers }: Request): boolean {
  return headers['content-encoding'] !== undefined || headers['content-length'] === undefined || Number(headers['content-length']) > LONG_JSON_BYTES;
}

export const contentTypeOf = (format: Format | null): string => {
  if (!format) return 'application/json; charset=utf-8';
  if (format.type === 'text/csv') return `text/csv; charset=utf-8; header=${format.header ? 'present' : 'absent'}`;
  return format.type;
};
