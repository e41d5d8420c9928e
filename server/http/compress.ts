import compression from 'compression';
import type { RequestHandler } from 'express';

/** Streamed text is worth compressing too; doubles are left alone, since their low bits are noise and cost more than they save. */
const COMPRESSED = /^(?:application\/(?:[\w.+-]*json|x-ndjson|yaml)|text\/|image\/svg)/i;

/** Answers in gzip or brotli where the caller takes them, beyond 1 KiB; streams included, with their back-pressure. */
export function compressAnswers(): RequestHandler {
  return compression({
    threshold: 1024,
    filter: (_request, response) => COMPRESSED.test(String(response.getHeader('Content-Type') ?? '')),
  }) as RequestHandler;
}
